'use client';

import { SidePanel } from '@/components/side-panel';
import { sayRule } from '@/lib/domain/plans/say-rule';
import type { Rule } from '@/lib/domain/site/plan';
import { PanelNotice } from './panel-notice';
import { useBoard, useSettings, useStore } from './board-context';
import { useMakeEdit } from './use-make-edit';

const kinds: readonly { readonly kind: Rule['kind']; readonly title: string }[] = [
  { kind: 'send', title: 'Cooks' }, { kind: 'split', title: 'Options made elsewhere' }, { kind: 'copy', title: 'Copies' },
];

const quietButton = 'min-h-6 text-[13px] font-semibold underline underline-offset-3 disabled:text-quiet disabled:no-underline';

function RuleLine({ rule, before, after, unseen }: { readonly rule: Rule; readonly before: Rule | undefined; readonly after: Rule | undefined; readonly unseen: boolean }) {
  const { site } = useStore();
  const { mayWrite } = useSettings();
  const make = useMakeEdit();
  const words = sayRule(rule, site);
  return (
    <li className="flex flex-wrap items-center gap-x-3 gap-y-1 bg-raised px-3 py-2">
      <span className="min-w-0 flex-1">
        {words}
        {unseen ? <span className="block text-[12px] font-semibold text-look-text">Covers nothing that this plan offers.</span> : null}
      </span>
      {mayWrite ? (
        <span className="flex gap-3">
          <button type="button" aria-label={`Up: ${words}`} disabled={before === undefined} className={quietButton} onClick={() => before && make({ kind: 'reorder', rule: rule.id, above: before.id })}>Up</button>
          <button type="button" aria-label={`Down: ${words}`} disabled={after === undefined} className={quietButton} onClick={() => after && make({ kind: 'reorder', rule: after.id, above: rule.id })}>Down</button>
          <button type="button" aria-label={`Remove: ${words}`} className={quietButton} onClick={() => make({ kind: 'remove-rules', rules: [rule.id] }, `No longer: ${words}`)}>Remove</button>
        </span>
      ) : null}
    </li>
  );
}

/** Every rule of the plan in order: when two are equally narrow, the lower one wins. */
export function RulesPanel({ close }: { readonly close: () => void }) {
  const rules = useBoard((state) => state.content.rules);
  const unseen = useBoard((state) => state.board.unseen);
  const { planName } = useSettings();
  return (
    <SidePanel title={`Rules of ${planName}`} close={close}>
      <PanelNotice />
      <p className="mt-3 text-[13px] text-soft">The narrowest rule wins: an item over its section, a till over an area, an area over an order type. Of two equals the lower one wins.</p>
      {kinds.map(({ kind, title }) => {
        const ofKind = rules.filter((rule) => rule.kind === kind);
        return ofKind.length === 0 ? null : (
          <section key={kind} className="mt-5 grid gap-2">
            <h3 className="text-[13.5px] font-[640] font-stretch-[106%]">{title}</h3>
            <ol className="grid gap-px overflow-hidden rounded-md border border-line bg-line">
              {ofKind.map((rule, place) => (
                <RuleLine key={rule.id} rule={rule} before={ofKind[place - 1]} after={ofKind[place + 1]} unseen={unseen.includes(rule.id)} />
              ))}
            </ol>
          </section>
        );
      })}
      {rules.length === 0 ? <p className="mt-4">No rule yet: everything prints nowhere. Send a section to a station to make the first.</p> : null}
    </SidePanel>
  );
}
