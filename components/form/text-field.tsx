import type { ComponentProps } from 'react';
import { controlClass, describedBy, Field, type FieldProps } from './field';

type TextFieldProps = Omit<FieldProps, 'children'> & Omit<ComponentProps<'input'>, 'id'> & { readonly mono?: boolean };

/** A line of text; `mono` for names and addresses, which are read letter by letter. */
export function TextField({ id, label, hint, error, notes, mono = false, className, ...input }: TextFieldProps) {
  return (
    <Field id={id} label={label} {...(hint === undefined ? {} : { hint })} error={error} notes={notes}>
      <input
        id={id}
        type="text"
        autoComplete="off"
        spellCheck={!mono}
        {...(mono ? { autoCapitalize: 'off' } : {})}
        aria-describedby={describedBy(id)}
        aria-invalid={error !== undefined}
        className={`${controlClass} ${mono ? 'font-mono' : ''} ${className ?? ''}`}
        {...input}
      />
    </Field>
  );
}
