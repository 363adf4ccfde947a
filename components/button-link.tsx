import Link from 'next/link';
import type { ComponentProps } from 'react';
import { buttonClass, type ButtonKind } from './button';

/** A link that looks like a button: it goes somewhere, and says so to those who cannot see it. */
export function ButtonLink({ kind = 'plain', className, ...rest }: ComponentProps<typeof Link> & { readonly kind?: ButtonKind }) {
  return <Link className={buttonClass(kind, className)} {...rest} />;
}
