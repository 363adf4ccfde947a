'use client';

import { useState, type ComponentProps } from 'react';
import { controlClass, describedBy, Field, type FieldProps } from './field';

type PasswordFieldProps = Omit<FieldProps, 'children'> & Omit<ComponentProps<'input'>, 'id' | 'type'> & { readonly autoComplete: 'current-password' | 'new-password' };

/** A password, which can be looked at while it is typed: on a tablet in a kitchen that is worth more than dots. */
export function PasswordField({ id, label, hint, error, notes, className, ...input }: PasswordFieldProps) {
  const [shown, setShown] = useState(false);
  return (
    <Field id={id} label={label} {...(hint === undefined ? {} : { hint })} error={error} notes={notes}>
      <span className="flex gap-2">
        <input
          id={id}
          type={shown ? 'text' : 'password'}
          spellCheck={false}
          autoCapitalize="off"
          aria-describedby={describedBy(id)}
          aria-invalid={error !== undefined}
          className={`${controlClass} min-h-12 text-[16px] ${className ?? ''}`}
          {...input}
        />
        <button type="button" aria-pressed={shown} aria-label={`Show what is typed in ${label}`} onClick={() => setShown(!shown)} className="min-h-12 rounded-md px-3 text-[13.5px] font-semibold underline underline-offset-3">
          {shown ? 'Hide' : 'Show'}
        </button>
      </span>
    </Field>
  );
}
