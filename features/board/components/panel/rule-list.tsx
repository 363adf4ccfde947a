'use client';

import type { ReactNode } from 'react';
import { useState } from 'react';
import { Button } from '@/components/button';
import { sayRule } from '@/lib/domain/plans/say-rule';
import type { Rule } from '@/lib/domain/site/plan';
import { useSettings, useStore } from '../board-context';
import type { RuleDraft } from '../rule-form';
import { RuleForm } from '../rule-form';
import { useMakeEdit } from '../use-make-edit';

type RuleListProps = {
  readonly rules: readonly Rule[];
  readonly none: string;
  /** How a new rule of this list is made; receives what ends it. */
  readonly add?: { readonly label: string; readonly form: (done: () => void) => ReactNode };
};

function OneRule({ rule, edit }: { readonly rule: Rule; readonly edit: () => void }) {
  const { site } = useStore();
  const { mayWrite } = useSettings();
  const make = useMakeEdit();
  const words = sayRule(rule, site);
  return (
    <div className="flex flex-wrap items-center gap-x-3 gap-y-1 rounded-md border border-line bg-raised px-3 py-2">
      <span className="min-w-0 flex-1">{words}</span>
      {mayWrite ? (
        <>
          <button type="button" aria-label={`Change: ${words}`} className="min-h-6 text-[13px] font-semibold underline underline-offset-3" onClick={edit}>Change</button>
          <button
            type="button"
            aria-label={`Remove: ${words}`}
            className="min-h-6 text-[13px] font-semibold underline underline-offset-3"
            onClick={() => make({ kind: 'remove-rules', rules: [rule.id] }, `No longer: ${words}`)}
          >
            Remove
          </button>
        </>
      ) : null}
    </div>
  );
}

/** Rules as sentences, each changed or removed where it stands, and one way to add another. */
export function RuleList({ rules, none, add }: RuleListProps) {
  const { stations, mayWrite } = useSettings();
  const make = useMakeEdit();
  const [editing, setEditing] = useState<string | null>(null);
  const change = (rule: Rule, draft: RuleDraft): void => {
    make({ kind: 'change-rule', rule: rule.id, ...draft });
    setEditing(null);
  };
  return (
    <div className="grid gap-2">
      {rules.length === 0 ? <p className="text-[13px] text-quiet">{none}</p> : null}
      {rules.map((rule) => (editing === rule.id ? (
        <RuleForm
          key={rule.id}
          label="Save this rule"
          stations={stations.filter((station) => rule.kind === 'copy' || station.kind === 'prep')}
          stationsLegend={rule.kind === 'copy' ? 'Copied to' : 'Prints at'}
          start={rule}
          needsCondition={false}
          {...(rule.kind === 'split' ? { keepLabel: 'Its dish shows it too' } : {})}
          submit={(draft) => change(rule, draft)}
          cancel={() => setEditing(null)}
        />
      ) : <OneRule key={rule.id} rule={rule} edit={() => setEditing(rule.id)} />))}
      {add === undefined || !mayWrite ? null : editing === 'new'
        ? add.form(() => setEditing(null))
        : <div><Button onClick={() => setEditing('new')}>{add.label}</Button></div>}
    </div>
  );
}
