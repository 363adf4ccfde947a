'use client';

import { useMemo, useState } from 'react';
import { indexRules, splitConcerns } from '@/lib/domain/plans/card-notes';
import type { BoardSite } from '@/lib/domain/plans/board-site';
import type { SendTarget, SplitTarget } from '@/lib/domain/plans/targets';
import { sayTarget } from '@/lib/domain/plans/targets';
import type { OptionId } from '@/lib/domain/site/ids';
import { anyCondition } from '@/lib/domain/site/plan';
import { useBoard, useSettings, useStore } from '../board-context';
import { RuleForm } from '../rule-form';
import { useMakeEdit } from '../use-make-edit';
import { PanelPart } from './panel-part';
import { RuleList } from './rule-list';

const optionsOf = (site: BoardSite, target: SendTarget): BoardSite['menu']['options'] => {
  const items = site.menu.items.filter((item) =>
    target.kind === 'everything' || (target.kind === 'section' ? item.section === target.section : item.id === target.item));
  const groups = new Set(items.flatMap((item) => item.optionGroups));
  const offered = new Set(site.menu.optionGroups.filter((group) => groups.has(group.id)).flatMap((group) => group.options));
  return site.menu.options.filter((option) => offered.has(option.id));
};

/** A split of one option, on its own or narrowed to the card's section or item. */
const splitTarget = (option: OptionId, narrowTo: SendTarget | null): SplitTarget => {
  if (narrowTo?.kind === 'section') return { kind: 'option-on-section', option, section: narrowTo.section };
  if (narrowTo?.kind === 'item') return { kind: 'option-on-item', option, item: narrowTo.item };
  return { kind: 'option', option };
};

function NewSplit({ target, options, done }: { readonly target: SendTarget; readonly options: BoardSite['menu']['options']; readonly done: () => void }) {
  const { site } = useStore();
  const { stations } = useSettings();
  const make = useMakeEdit();
  const [option, setOption] = useState(options[0]?.id);
  const [narrow, setNarrow] = useState(target.kind !== 'everything');
  if (option === undefined) return null;
  return (
    <div className="grid gap-3">
      <label className="grid gap-1 text-[12.5px] font-semibold text-soft">
        Option
        <select className="min-h-9 rounded-md border border-line-strong bg-raised px-2 text-[14px] font-normal text-ink" value={option} onChange={(event) => setOption(event.target.value as OptionId)}>
          {options.map((each) => <option key={each.id} value={each.id}>{each.name}</option>)}
        </select>
      </label>
      {target.kind === 'everything' ? null : (
        <label className="flex min-h-8 items-center gap-2.5">
          <input type="checkbox" className="size-4.5 accent-ink" checked={narrow} onChange={(event) => setNarrow(event.target.checked)} />
          Only with {sayTarget(target, site)}
        </label>
      )}
      <RuleForm
        label="Split this option"
        stations={stations.filter((station) => station.kind === 'prep')}
        stationsLegend="It prints at"
        start={{ conditions: anyCondition, stations: [], keep: false }}
        needsCondition={false}
        keepLabel="Its dish shows it too"
        submit={(draft) => {
          make({ kind: 'split', target: splitTarget(option, narrow ? target : null), ...draft });
          done();
        }}
        cancel={done}
      />
    </div>
  );
}

/** Options that another station makes: they become a line of their own there. */
export function SplitsPart({ target }: { readonly target: SendTarget }) {
  const { site } = useStore();
  const content = useBoard((state) => state.content);
  const options = useMemo(() => optionsOf(site, target), [site, target]);
  const splits = useMemo(() => {
    const index = indexRules(site, content);
    return index.splits.filter((split) => splitConcerns(split, target, index, site));
  }, [site, content, target]);
  if (options.length === 0 && splits.length === 0) return null;
  return (
    <PanelPart title="Options made elsewhere">
      <RuleList
        rules={splits}
        none="Every option stays with its dish."
        {...(options.length === 0 ? {} : { add: { label: 'Split an option', form: (done: () => void) => <NewSplit target={target} options={options} done={done} /> } })}
      />
    </PanelPart>
  );
}
