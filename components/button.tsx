import type { ComponentProps } from 'react';

export type ButtonKind = 'primary' | 'plain' | 'hot' | 'wait';

/** The main button of a screen is ink; hot is for "an order would be lost", wait for what cannot be done yet. */
const kinds: Readonly<Record<ButtonKind, string>> = {
  primary: 'border-ink bg-ink text-on-ink hover:opacity-90',
  plain: 'border-line-strong bg-raised text-ink hover:border-ink',
  hot: 'border-hot bg-hot text-white hover:opacity-90',
  wait: 'border-[1.5px] border-hot-text bg-raised text-hot-text hover:bg-hot-tint',
};

export const buttonClass = (kind: ButtonKind = 'plain', more = ''): string =>
  `inline-flex min-h-9 items-center justify-center gap-2 rounded-[7px] border px-[15px] py-[7px] text-[13.5px] font-semibold leading-tight disabled:opacity-50 pointer-coarse:min-h-11 ${kinds[kind]} ${more}`;

export function Button({ kind = 'plain', type = 'button', className, ...rest }: ComponentProps<'button'> & { readonly kind?: ButtonKind }) {
  return <button type={type} className={buttonClass(kind, className)} {...rest} />;
}
