import type { Fix } from '@/lib/domain/findings/finding';

/** Fixes of a plan are edits on the board, where they can be undone; a test is printed by hand. */
export type RowFix = Exclude<Fix, { readonly kind: 'send-sections' | 'remove-rule' | 'print-test' }>;

/** Whether a press changes a row here and now. */
export const isRowFix = (fix: Fix): fix is RowFix => fix.kind !== 'send-sections' && fix.kind !== 'remove-rule' && fix.kind !== 'print-test';
