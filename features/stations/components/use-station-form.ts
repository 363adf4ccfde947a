'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm, useWatch, type FieldPath } from 'react-hook-form';
import type { Station } from '@/lib/domain/site/station';
import { codeClash, suggestCode } from '@/lib/domain/stations/codes';
import { stationDifferences } from '@/lib/domain/stations/station-differences';
import { stationFindings } from '@/lib/domain/stations/station-findings';
import { ProblemError } from '@/lib/http/client';
import { addStation, saveStation } from '../api/stations';
import { stationInput, type StationInput } from '../schema';
import { inputOfStation, newStationInput } from '../station-form-values';
import { newStationId, stationOfInput } from '../station-of-input';
import type { StationView } from '../station-view';

type Done = { readonly saved: () => void; readonly readAgain: () => void };

/** The form of one station: what is typed, what the checks say of it, and saving it against the version it came from. */
export const useStationForm = (view: StationView, { saved, readAgain }: Done) => {
  const [base, setBase] = useState<Station | null>(view.station);
  const [refused, setRefused] = useState<{ readonly words: string; readonly stale: boolean } | null>(null);
  const others = view.stations.filter((one) => one.id !== base?.id);
  const form = useForm<StationInput>({
    resolver: zodResolver(stationInput),
    defaultValues: base === null ? newStationInput(others) : inputOfStation(base),
    mode: 'onTouched',
  });
  const typed = useWatch({ control: form.control }) as StationInput;
  const draft = stationOfInput(typed, base?.id ?? newStationId, base);
  const naming = { stations: view.stations, printers: view.printers };
  const theirs = base === null || view.station === null || view.station.version === base.version ? null : stationDifferences(base, view.station, naming);
  const clash = codeClash(typed.code, others);

  const refuse = (error: unknown): void => {
    if (!(error instanceof ProblemError)) throw error;
    const { problem } = error;
    for (const { field, reason } of problem.fields ?? []) form.setError(field as FieldPath<StationInput>, { message: reason });
    setRefused({ words: problem.detail, stale: problem.code === 'stale' });
    if (problem.code === 'stale') readAgain();
  };

  const saveFrom = (from: Station | null) => form.handleSubmit(async (input) => {
    setRefused(null);
    try {
      await (from === null ? addStation(view.siteId, input) : saveStation(view.siteId, from.id, from.version, input));
      saved();
    } catch (error) {
      refuse(error);
    }
  });

  return {
    form, base, others, typed, draft, refused, theirs, clash,
    findings: stationFindings([...others, draft], draft),
    /** A code that would be free; null when the one that is typed is. */
    betterCode: clash === null ? null : suggestCode(typed.name, others),
    /** Until somebody types a code, it is read out of the name. */
    nameTyped: (name: string): void => {
      if (base === null && !form.formState.dirtyFields.code) form.setValue('code', suggestCode(name, others) ?? '', { shouldDirty: false });
    },
    save: saveFrom(base),
    /** Saves what was typed on top of what somebody else saved; what was not touched stays theirs. */
    keepMine: (): void => {
      if (base === null || view.station === null) return;
      const typedNow = form.getValues();
      const touched = stationDifferences(base, stationOfInput(typedNow, base.id, base), naming).map(({ field }) => field);
      setBase(view.station);
      form.reset(inputOfStation(view.station));
      for (const field of touched) form.setValue(field, typedNow[field], { shouldDirty: true });
      void saveFrom(view.station)();
    },
    takeTheirs: (): void => {
      if (view.station === null) return;
      setBase(view.station);
      setRefused(null);
      form.reset(inputOfStation(view.station));
    },
  };
};

export type StationForm = ReturnType<typeof useStationForm>;
