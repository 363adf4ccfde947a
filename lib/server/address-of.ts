import 'server-only';

/** Where a request came from, as the nearest proxy saw it: what stands before that in the list, anybody can write. */
export const addressOf = (forwardedFor: string | null | undefined): string => forwardedFor?.split(',').at(-1)?.trim() ?? '';
