'use client';

import type { CopyTarget } from '@/lib/domain/plans/targets';
import { targetKey } from '@/lib/domain/plans/targets';
import { anyCondition } from '@/lib/domain/site/plan';
import { useBoard, useSettings } from '../board-context';
import { RuleForm } from '../rule-form';
import { useMakeEdit } from '../use-make-edit';
import { PanelPart } from './panel-part';
import { RuleList } from './rule-list';

/** Who else reads the same lines without cooking them. */
export function CopiesPart({ target }: { readonly target: CopyTarget }) {
  const rules = useBoard((state) => state.content.rules);
  const { stations } = useSettings();
  const make = useMakeEdit();
  const here = rules.filter((rule) => rule.kind === 'copy' && (targetKey(rule.target) === targetKey(target) || rule.target.kind === 'everything'));
  return (
    <PanelPart title="Copies">
      <RuleList
        rules={here}
        none="No station gets a copy."
        add={{
          label: 'Add a copy',
          form: (done) => (
            <RuleForm
              label="Add this copy"
              stations={stations}
              stationsLegend="A copy goes to"
              start={{ conditions: anyCondition, stations: [], keep: false }}
              needsCondition={false}
              submit={(draft) => {
                make({ kind: 'copy', targets: [target], conditions: draft.conditions, how: 'add', stations: draft.stations });
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
