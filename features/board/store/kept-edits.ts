import type { PlanEdit } from '@/lib/domain/plans/edit';
import type { MadeEdit } from './board-state';

/** What was not saved yet, kept in this browser so that closing the page loses nothing. */
export type KeptEdits = { readonly version: number; readonly edits: readonly MadeEdit[] };

const keyOf = (site: string, plan: string): string => `tamis.board.${site}.${plan}`;

const isMade = (value: unknown): value is { edit: PlanEdit; words: string } =>
  typeof value === 'object' && value !== null && 'edit' in value && 'words' in value && typeof value.words === 'string';

/** Null when nothing is kept, or when what is kept cannot be read. */
export const readKept = (storage: Storage, site: string, plan: string): KeptEdits | null => {
  try {
    const kept: unknown = JSON.parse(storage.getItem(keyOf(site, plan)) ?? 'null');
    if (typeof kept !== 'object' || kept === null || !('edits' in kept) || !('version' in kept)) return null;
    if (!Array.isArray(kept.edits) || typeof kept.version !== 'number' || !kept.edits.every(isMade)) return null;
    return { version: kept.version, edits: kept.edits };
  } catch {
    return null;
  }
};

/** A browser that refuses to store (private mode, full) only loses the second safety, so its refusal is let pass. */
export const keep = (storage: Storage, site: string, plan: string, kept: KeptEdits): void => {
  try {
    if (kept.edits.length === 0) storage.removeItem(keyOf(site, plan));
    else storage.setItem(keyOf(site, plan), JSON.stringify(kept));
  } catch {
    return;
  }
};
