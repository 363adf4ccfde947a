import type { Fix } from '@/lib/domain/findings/finding';
import { ProblemError, send } from '@/lib/http/client';

export type FixAnswer = { readonly kind: 'done' } | { readonly kind: 'refused'; readonly words: string };

/** Makes the one change of a row that a fix stands for. */
export const applyFix = async (siteId: string, fix: Fix): Promise<FixAnswer> => {
  try {
    await send('POST', `/api/sites/${encodeURIComponent(siteId)}/fixes`, { body: { fix } });
    return { kind: 'done' };
  } catch (error) {
    if (error instanceof ProblemError) return { kind: 'refused', words: error.problem.detail };
    throw error;
  }
};
