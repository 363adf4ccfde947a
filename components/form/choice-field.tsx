import type { ComponentProps } from 'react';
import { controlClass, describedBy, Field, type FieldProps } from './field';

export type Choice = { readonly value: string; readonly words: string };

type ChoiceFieldProps = Omit<FieldProps, 'children'> & Omit<ComponentProps<'select'>, 'id'> & {
  readonly choices: readonly Choice[];
  /** The words for choosing nothing; without them something has to be chosen. */
  readonly none?: string;
};

/** One of several, in the system's own list. */
export function ChoiceField({ id, label, hint, error, notes, choices, none, className, ...select }: ChoiceFieldProps) {
  return (
    <Field id={id} label={label} {...(hint === undefined ? {} : { hint })} error={error} notes={notes}>
      <select id={id} aria-describedby={describedBy(id)} aria-invalid={error !== undefined} className={`${controlClass} ${className ?? ''}`} {...select}>
        {none === undefined ? null : <option value="">{none}</option>}
        {choices.map(({ value, words }) => <option key={value} value={value}>{words}</option>)}
      </select>
    </Field>
  );
}
