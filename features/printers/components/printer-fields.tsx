'use client';

import type { FieldPath, RegisterOptions } from 'react-hook-form';
import { ChoiceField, type Choice } from '@/components/form/choice-field';
import { FieldFindings } from '@/components/form/field-findings';
import { TextField } from '@/components/form/text-field';
import { printerFieldWords, type PrinterField } from '@/lib/domain/devices/printer-differences';
import type { PrinterInput } from '../schema';
import type { PrinterForm } from './use-printer-form';

type FieldName = FieldPath<PrinterInput> & PrinterField;
type BoundProps = { readonly of: PrinterForm; readonly name: FieldName; readonly hint?: string };

const idOf = (name: string): string => `printer-${name}`;

const bound = ({ of, name, hint }: BoundProps, options: RegisterOptions<PrinterInput, FieldName> = {}) => ({
  id: idOf(name),
  label: printerFieldWords[name],
  ...(hint === undefined ? {} : { hint }),
  error: of.form.formState.errors[name]?.message,
  notes: <FieldFindings findings={of.findingsOf(name)} fixIn={of.fixIn} />,
  ...of.form.register(name, options),
});

export function BoundText({ mono = false, number = false, ...props }: BoundProps & { readonly mono?: boolean; readonly number?: boolean }) {
  return <TextField mono={mono} {...(number ? { inputMode: 'numeric' as const } : {})} {...bound(props, number ? { setValueAs: (value: unknown) => (value === '' ? Number.NaN : Number(value)) } : {})} />;
}

/** Choosing nothing is null, never the empty text. */
export function BoundChoice({ choices, none, number = false, ...props }: BoundProps & { readonly choices: readonly Choice[]; readonly none?: string; readonly number?: boolean }) {
  const options = number ? { setValueAs: Number } : none === undefined ? {} : { setValueAs: (value: unknown) => (value === '' ? null : value) };
  return <ChoiceField choices={choices} {...(none === undefined ? {} : { none })} {...bound(props, options)} />;
}
