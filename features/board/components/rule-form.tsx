'use client';

import { useId, useState } from 'react';
import { Button } from '@/components/button';
import { isUnconditional } from '@/lib/domain/plans/conditions';
import type { Rule } from '@/lib/domain/site/plan';
import { ConditionsFields } from './conditions-fields';
import type { RailStation } from './rail-station';
import { StationRows } from './station-rows';

export type RuleDraft = Pick<Rule, 'conditions' | 'stations' | 'keep'>;

type RuleFormProps = {
  readonly label: string;
  readonly stations: readonly RailStation[];
  readonly start: RuleDraft;
  readonly stationsLegend: string;
  /** A rule "only at times" says when. */
  readonly needsCondition: boolean;
  /** Shown for a split. */
  readonly keepLabel?: string;
  readonly submit: (draft: RuleDraft) => void;
  readonly cancel: () => void;
};

const missing = (draft: RuleDraft, needsCondition: boolean): string => {
  if (draft.stations.length === 0) return 'Tick at least one station: a rule sends somewhere.';
  if (needsCondition && isUnconditional(draft.conditions)) return 'Tick when it holds: an order type, an area or a till.';
  return '';
};

/** When a rule holds and where it sends. */
export function RuleForm({ label, stations, start, stationsLegend, needsCondition, keepLabel, submit, cancel }: RuleFormProps) {
  const [draft, setDraft] = useState(start);
  const [refused, setRefused] = useState('');
  const id = useId();
  return (
    <form
      aria-label={label}
      aria-describedby={refused === '' ? undefined : id}
      className="grid gap-4 rounded-lg border border-line-strong bg-panel p-3"
      onSubmit={(event) => {
        event.preventDefault();
        const reason = missing(draft, needsCondition);
        setRefused(reason);
        if (reason === '') submit(draft);
      }}
    >
      <ConditionsFields value={draft.conditions} change={(conditions) => setDraft({ ...draft, conditions })} />
      <StationRows
        legend={stationsLegend}
        stations={stations}
        ticked={draft.stations}
        change={(station, on) => setDraft({ ...draft, stations: on ? [...draft.stations, station] : draft.stations.filter((other) => other !== station) })}
      />
      {keepLabel === undefined ? null : (
        <label className="flex min-h-8 items-center gap-2.5">
          <input type="checkbox" className="size-4.5 accent-ink" checked={draft.keep} onChange={(event) => setDraft({ ...draft, keep: event.target.checked })} />
          {keepLabel}
        </label>
      )}
      <p id={id} role="alert" className="text-[13px] font-semibold text-hot-text empty:hidden">{refused}</p>
      <div className="flex gap-2">
        <Button type="submit" kind="primary">{label}</Button>
        <Button type="button" onClick={cancel}>Cancel</Button>
      </div>
    </form>
  );
}
