import type { PlanContent } from '@/lib/domain/site/plan';

export type SaveRequest = { readonly version: number; readonly content: PlanContent; readonly summary: string };

/** What becomes of a save, whichever way it went. */
export type SaveAnswer =
  | { readonly kind: 'saved'; readonly version: number }
  | { readonly kind: 'stale'; readonly version: number; readonly content: PlanContent; readonly by: string }
  | { readonly kind: 'refused'; readonly words: string }
  | { readonly kind: 'unreachable' };
