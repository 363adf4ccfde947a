const own = 'http://own.invalid';

/** The path of ours that was asked for, else "/". Read as a browser reads it, which takes "/\t/elsewhere" for another site. */
export const ownPath = (wanted: string | null | undefined): string => {
  if (wanted === null || wanted === undefined || !wanted.startsWith('/') || !URL.canParse(wanted, own)) return '/';
  const { origin, pathname, search } = new URL(wanted, own);
  return origin === own && !pathname.startsWith('//') ? `${pathname}${search}` : '/';
};
