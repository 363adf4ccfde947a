'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useDeferredValue, useMemo, useState } from 'react';
import { useForm, useWatch, type FieldPath } from 'react-hook-form';
import { checkTillDraft } from '@/lib/domain/checks/check-draft';
import { tillDifferences } from '@/lib/domain/devices/till-differences';
import type { Finding, Fix } from '@/lib/domain/findings/finding';
import type { Till } from '@/lib/domain/site/till';
import { ProblemError } from '@/lib/http/client';
import { addTill, saveTill } from '../api/tills';
import type { PanelView } from '../panel-view';
import { tillInput, type TillInput } from '../schema';
import { fieldsOfFix, newTillInput } from '../till-form-values';
import { inputOfTill, newTillId, tillOfInput } from '../till-of-input';

export const namingOf = (view: PanelView) => ({ areas: view.areas, tills: view.site.tills, printers: view.site.printers, sharedPoints: view.sharedPoints });

/** What the form stands on: a newer version that changed none of its fields is no reason to ask. */
const sinceThen = (opened: Till | null, view: PanelView): Till | null =>
  (opened !== null && view.till !== null && tillDifferences(opened, view.till, namingOf(view)).length === 0 ? view.till : opened);

type Done = { readonly saved: () => void; readonly readAgain: () => void };

/** The form of one till and all that is installed on it, checked while it is typed. */
export const useTillForm = (view: PanelView, { saved, readAgain }: Done) => {
  const [opened, setBase] = useState<Till | null>(view.till);
  const base = sinceThen(opened, view);
  const [refused, setRefused] = useState<{ readonly words: string; readonly stale: boolean } | null>(null);
  const form = useForm<TillInput>({
    resolver: zodResolver(tillInput),
    defaultValues: opened === null ? newTillInput(view.site, view.areas[0]?.id ?? '') : inputOfTill(opened),
    mode: 'onTouched',
  });
  const typed = useDeferredValue(useWatch({ control: form.control }) as TillInput);
  const findings = useMemo(() => checkTillDraft(view.site, tillOfInput(typed, base?.id ?? newTillId, base?.version ?? 1)), [view.site, typed, base]);

  const theirs = base === null || view.till === null || view.till.version === base.version ? null : tillDifferences(base, view.till, namingOf(view));

  const findingsOf = (field: string): readonly Finding[] => findings.filter((finding) => finding.subject.field === field);
  const fixIn = (fix: Fix): (() => void) | null => {
    if (fieldsOfFix(fix, typed) === null) return null;
    return () => {
      for (const [field, value] of Object.entries(fieldsOfFix(fix, form.getValues()) ?? {})) form.setValue(field as FieldPath<TillInput>, value, { shouldDirty: true, shouldValidate: true });
    };
  };

  const refuse = (error: unknown): void => {
    if (!(error instanceof ProblemError)) throw error;
    const { problem } = error;
    for (const { field, reason } of problem.fields ?? []) form.setError(field as FieldPath<TillInput>, { message: reason });
    setRefused({ words: problem.detail, stale: problem.code === 'stale' });
    if (problem.code === 'stale') readAgain();
  };

  const saveFrom = (from: Till | null) => form.handleSubmit(async (input) => {
    setRefused(null);
    try {
      await (from === null ? addTill(view.siteId, input) : saveTill(view.siteId, from.id, from.version, input));
      saved();
    } catch (error) {
      refuse(error);
    }
  });

  return {
    form,
    base,
    refused,
    findingsOf,
    fixIn,
    save: saveFrom(base),
    theirs,
    /** Saves what was typed on top of what somebody else saved; what was not touched stays theirs. */
    keepMine: () => {
      if (base === null || view.till === null) return;
      const typedNow = form.getValues();
      const touched = tillDifferences(base, tillOfInput(typedNow, base.id, base.version), namingOf(view)).map(({ field }) => field);
      setBase(view.till);
      form.reset(inputOfTill(view.till));
      for (const field of touched) form.setValue(field, typedNow[field], { shouldDirty: true });
      void saveFrom(view.till)();
    },
    takeTheirs: () => {
      if (view.till === null) return;
      setBase(view.till);
      setRefused(null);
      form.reset(inputOfTill(view.till));
    },
  };
};

export type TillForm = ReturnType<typeof useTillForm>;
