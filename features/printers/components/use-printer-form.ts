'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useDeferredValue, useMemo, useState } from 'react';
import { useForm, useWatch, type FieldPath } from 'react-hook-form';
import { checkPrinterDraft } from '@/lib/domain/checks/check-draft';
import { printerTestsStand } from '@/lib/domain/checks/test-stands';
import { printerDifferences } from '@/lib/domain/devices/printer-differences';
import type { Finding, Fix } from '@/lib/domain/findings/finding';
import type { Printer } from '@/lib/domain/site/printer';
import { ProblemError } from '@/lib/http/client';
import { addPrinter, savePrinter } from '../api/printers';
import type { PanelView } from '../panel-view';
import { fieldsOfFix, inputOfPrinter, newPrinterInput } from '../printer-form-values';
import { newPrinterId, printerOfInput } from '../printer-of-input';
import { printerInput, type PrinterInput } from '../schema';

/** What the form stands on: a newer version that changed none of its fields is no reason to ask. */
const sinceThen = (opened: Printer | null, { printer, site, sharedPoints }: PanelView): Printer | null =>
  (opened !== null && printer !== null && printerDifferences(opened, printer, { ...site, sharedPoints }).length === 0 ? printer : opened);

type Done = { readonly saved: () => void; readonly readAgain: () => void };

/** The form of one printer: what is typed, what the checks say of it, and saving it against the version it came from. */
export const usePrinterForm = (view: PanelView, { saved, readAgain }: Done) => {
  const [opened, setBase] = useState<Printer | null>(view.printer);
  const base = sinceThen(opened, view);
  const [refused, setRefused] = useState<{ readonly words: string; readonly stale: boolean } | null>(null);
  const form = useForm<PrinterInput>({
    resolver: zodResolver(printerInput),
    defaultValues: base === null ? newPrinterInput(view.site) : inputOfPrinter(base),
    mode: 'onTouched',
  });
  const typed = useDeferredValue(useWatch({ control: form.control }) as PrinterInput);
  const untouchedNew = base === null && typed.name === '';
  const findings = useMemo(() => {
    const found = checkPrinterDraft(view.site, printerOfInput(typed, base?.id ?? newPrinterId, base));
    return untouchedNew ? found.filter((finding) => finding.subject.field !== 'name') : found;
  }, [view.site, typed, base, untouchedNew]);

  const naming = { ...view.site, sharedPoints: view.sharedPoints };
  const theirs = base === null || view.printer === null || view.printer.version === base.version ? null : printerDifferences(base, view.printer, naming);

  const findingsOf = (field: FieldPath<PrinterInput>): readonly Finding[] => findings.filter((finding) => finding.subject.field === field);
  const fixIn = (fix: Fix): (() => void) | null => {
    const fields = fieldsOfFix(fix);
    return fields === null ? null : () => {
      for (const [field, value] of Object.entries(fields)) form.setValue(field as FieldPath<PrinterInput>, value, { shouldDirty: true, shouldValidate: true });
    };
  };

  const refuse = (error: unknown): void => {
    if (!(error instanceof ProblemError)) throw error;
    const { problem } = error;
    for (const { field, reason } of problem.fields ?? []) form.setError(field as FieldPath<PrinterInput>, { message: reason });
    setRefused({ words: problem.detail, stale: problem.code === 'stale' });
    if (problem.code === 'stale') readAgain();
  };

  const saveFrom = (from: Printer | null) => form.handleSubmit(async (input) => {
    setRefused(null);
    try {
      await (from === null ? addPrinter(view.siteId, input) : savePrinter(view.siteId, from.id, from.version, input));
      saved();
    } catch (error) {
      refuse(error);
    }
  });

  const testsFall = base !== null && view.tests.some((test) => test.testPrintedAt !== null) && !printerTestsStand(base, printerOfInput(typed, base.id, base));

  return {
    form,
    /** True while saving would make the printed tests count for nothing. */
    testsFall,
    base,
    refused,
    findingsOf,
    fixIn,
    save: saveFrom(base),
    /** Saves what is typed on top of what somebody else saved. */
    theirs,
    /** Saves what was typed on top of what somebody else saved; what was not touched stays theirs. */
    keepMine: () => {
      if (base === null || view.printer === null) return;
      const typedNow = form.getValues();
      const touched = printerDifferences(base, printerOfInput(typedNow, base.id, base), naming).map(({ field }) => field);
      setBase(view.printer);
      form.reset(inputOfPrinter(view.printer));
      for (const field of touched) form.setValue(field, typedNow[field], { shouldDirty: true });
      void saveFrom(view.printer)();
    },
    takeTheirs: () => {
      if (view.printer === null) return;
      setBase(view.printer);
      setRefused(null);
      form.reset(inputOfPrinter(view.printer));
    },
  };
};

export type PrinterForm = ReturnType<typeof usePrinterForm>;
