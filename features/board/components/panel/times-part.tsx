'use client';

import { isUnconditional } from '@/lib/domain/plans/conditions';
import type { SendTarget } from '@/lib/domain/plans/targets';
import { targetKey } from '@/lib/domain/plans/targets';
import { anyCondition } from '@/lib/domain/site/plan';
import { useBoard, useSettings } from '../board-context';
import { RuleForm } from '../rule-form';
import { useMakeEdit } from '../use-make-edit';
import { PanelPart } from './panel-part';
import { RuleList } from './rule-list';

/** Where the same dishes print when they are ordered in another way, from another area or another till. */
export function TimesPart({ target }: { readonly target: SendTarget }) {
  const rules = useBoard((state) => state.content.rules);
  const { stations } = useSettings();
  const make = useMakeEdit();
  const here = rules.filter((rule) => rule.kind === 'send' && targetKey(rule.target) === targetKey(target) && !isUnconditional(rule.conditions));
  return (
    <PanelPart title="Prints elsewhere at times">
      <RuleList
        rules={here}
        none="The same for every order type, area and till."
        add={{
          label: 'Add a time when it prints elsewhere',
          form: (done) => (
            <RuleForm
              label="Add this rule"
              stations={stations.filter((station) => station.kind === 'prep')}
              stationsLegend="Then it prints at"
              start={{ conditions: anyCondition, stations: [], keep: false }}
              needsCondition
              submit={(draft) => {
                make({ kind: 'send', targets: [target], conditions: draft.conditions, how: 'replace', stations: draft.stations });
                done();
              }}
              cancel={done}
            />
          ),
        }}
      />
    </PanelPart>
  );
}
