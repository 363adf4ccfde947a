'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm, useWatch, type DefaultValues, type FieldValues, type Path, type PathValue } from 'react-hook-form';
import type { z } from 'zod';
import { ProblemError } from '@/lib/http/client';

/** What the server holds, at the version it was read at. */
export type Stored<Values> = { readonly values: Values; readonly version: number };

export type Difference = { readonly label: string; readonly from: string; readonly to: string };

type SavedFormOptions<Values extends FieldValues> = {
  /** One schema for form and server, whose output can be typed in again. */
  readonly schema: z.ZodType<Values, Values>;
  readonly stored: Stored<Values>;
  /** What a person would call different. */
  readonly differences: (before: Values, after: Values) => readonly Difference[];
  readonly save: (values: Values, version: number) => Promise<unknown>;
  readonly saved: () => void;
  /** Asks for what the server holds now; it comes in as `stored`. */
  readonly readAgain: () => void;
};

const isSame = (left: unknown, right: unknown): boolean => JSON.stringify(left) === JSON.stringify(right);

/** A form over something that others may save meanwhile: nothing typed is lost, and nothing of theirs is overwritten unseen. */
export const useSavedForm = <Values extends FieldValues>({ schema, stored, differences, save, saved, readAgain }: SavedFormOptions<Values>) => {
  const [opened, setOpened] = useState(stored);
  // A newer version that changed none of these fields is no reason to ask.
  const base = isSame(opened.values, stored.values) ? stored : opened;
  const [refused, setRefused] = useState<{ readonly words: string; readonly stale: boolean } | null>(null);
  const form = useForm<Values>({ resolver: zodResolver(schema), defaultValues: opened.values as DefaultValues<Values>, mode: 'onTouched' });
  const typed = useWatch({ control: form.control }) as Values;

  const refuse = (error: unknown): void => {
    if (!(error instanceof ProblemError)) throw error;
    const { problem } = error;
    for (const { field, reason } of problem.fields ?? []) form.setError(field as Path<Values>, { message: reason });
    setRefused({ words: problem.detail, stale: problem.code === 'stale' });
    if (problem.code === 'stale') readAgain();
  };

  const saveAt = (version: number) => form.handleSubmit(async (values) => {
    setRefused(null);
    try {
      await save(values, version);
      saved();
    } catch (error) {
      refuse(error);
    }
  });

  return {
    form,
    typed,
    refused,
    save: saveAt(base.version),
    theirs: isSame(base.values, stored.values) ? null : differences(base.values, stored.values),
    /** Puts what was typed on top of what somebody else saved; what was not touched stays theirs. */
    keepMine: () => {
      const touched = Object.entries(form.getValues()).filter(([field, value]) => !isSame(value, base.values[field]));
      setOpened(stored);
      form.reset(stored.values);
      for (const [field, value] of touched) form.setValue(field as Path<Values>, value as PathValue<Values, Path<Values>>, { shouldDirty: true });
      void saveAt(stored.version)();
    },
    takeTheirs: () => {
      setOpened(stored);
      setRefused(null);
      form.reset(stored.values);
    },
  };
};

export type SavedForm<Values extends FieldValues> = ReturnType<typeof useSavedForm<Values>>;
