'use client';

import type { FieldPath } from 'react-hook-form';
import { ChoiceField, type Choice } from '@/components/form/choice-field';
import { FieldFindings } from '@/components/form/field-findings';
import { TextField } from '@/components/form/text-field';
import { tillFieldWords, type TillField } from '@/lib/domain/devices/till-differences';
import type { TillInput } from '../schema';
import type { TillForm } from './use-till-form';

type FieldName = Exclude<FieldPath<TillInput> & TillField, 'queues' | 'orderTypes' | 'sharedPoints'>;
type BoundProps = { readonly of: TillForm; readonly name: FieldName; readonly hint?: string };

const bound = ({ of, name, hint }: BoundProps, emptyIsNull = false) => ({
  id: `till-${name}`,
  label: tillFieldWords[name],
  ...(hint === undefined ? {} : { hint }),
  error: of.form.formState.errors[name]?.message,
  notes: <FieldFindings findings={of.findingsOf(name)} fixIn={of.fixIn} />,
  ...of.form.register(name, emptyIsNull ? { setValueAs: (value: unknown) => (value === '' ? null : value) } : {}),
});

export function BoundText({ mono = false, ...props }: BoundProps & { readonly mono?: boolean }) {
  return <TextField mono={mono} {...bound(props)} />;
}

/** Choosing nothing is null, never the empty text. */
export function BoundChoice({ choices, none, ...props }: BoundProps & { readonly choices: readonly Choice[]; readonly none?: string }) {
  return <ChoiceField choices={choices} {...(none === undefined ? {} : { none })} {...bound(props, none !== undefined)} />;
}
