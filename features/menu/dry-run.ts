import type { Mapping } from '@/lib/domain/menu-file/fields';
import type { LineError } from '@/lib/domain/menu-file/read-items';

/** What the wizard shows: the columns, what would happen, and the menu it was checked against. */
export type DryRun = {
  readonly headings: readonly string[];
  readonly sample: readonly (readonly string[])[];
  readonly mapping: Mapping;
  readonly creates: number;
  readonly updates: number;
  readonly unchanged: number;
  readonly sections: readonly string[];
  readonly groups: readonly string[];
  /** The first items that would change, and what of them. */
  readonly changes: readonly { readonly name: string; readonly what: string }[];
  readonly errors: readonly LineError[];
  readonly errorCount: number;
  readonly digest: string;
  readonly applied: boolean;
};
