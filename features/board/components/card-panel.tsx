'use client';

import { useState } from 'react';
import { SidePanel } from '@/components/side-panel';
import type { Card } from '@/lib/domain/plans/board';
import type { BoardState } from '../store/board-state';
import { allCards } from '../store/lift';
import { makeStep } from '../store/make-edit';
import { sayStationChange, stationEdits } from '../store/station-edits';
import { newRuleId, useBoard, useSettings, useStore } from './board-context';
import { PanelNotice } from './panel-notice';
import { CopiesPart } from './panel/copies-part';
import { ItemsPart } from './panel/items-part';
import { OfferPart } from './panel/offer-part';
import { SplitsPart } from './panel/splits-part';
import { TimesPart } from './panel/times-part';
import { StationRows } from './station-rows';

/** Moving a card gives it another id; the panel stays with what it was opened about. */
const stillAbout = (state: BoardState, opened: Card): Card =>
  allCards(state).find((card) => card.id === opened.id)
  ?? allCards(state).find((card) => card.kind === opened.kind && JSON.stringify([card.target, card.conditions]) === JSON.stringify([opened.target, opened.conditions]))
  ?? { ...opened, rule: null, station: null };

function CooksAt({ card }: { readonly card: Card }) {
  const store = useStore();
  const { stations, mayWrite } = useSettings();
  const ticked = useBoard((state) => state.content.rules.find((rule) => rule.id === card.rule)?.stations) ?? [];
  const choices = stations.filter((station) => card.kind === 'copy' || station.kind === 'prep');
  if (!mayWrite) {
    const names = choices.filter((station) => ticked.includes(station.id)).map((station) => station.name);
    return <p>{names.length === 0 ? 'Prints nowhere yet.' : `Prints at ${names.join(' and ')}.`}</p>;
  }
  return (
    <StationRows
      legend={card.kind === 'copy' ? 'A copy goes to' : 'Prints at'}
      stations={choices}
      ticked={ticked}
      change={(station, on) => store.set((state) => {
        const change = { how: on ? 'add' : 'remove', stations: [station] } as const;
        return makeStep(state, stationEdits(state, [card], change, store.site), sayStationChange(state, [card], change, store.site), store.site, newRuleId);
      })}
    />
  );
}

/** Everything about one paper on the board: where it cooks, when it does not, its items, its options and its copies. */
export function CardPanel({ cardId, close }: { readonly cardId: string; readonly close: () => void }) {
  const store = useStore();
  const { mayWrite } = useSettings();
  const [opened] = useState(() => allCards(store.get()).find((card) => card.id === cardId) ?? null);
  const board = useBoard((state) => state);
  if (opened === null) return null;
  const card = stillAbout(board, opened);
  const target = card.target.kind === 'option' ? null : card.target;
  return (
    <SidePanel title={card.name} close={close}>
      <div className="grid gap-5">
        <PanelNotice />
        <p className="text-[13px] text-soft">
          {card.under}
          {card.tags.length === 0 ? null : `, only ${card.tags.join(', ')}`}
          {mayWrite ? null : '. Your role may look at the board, not change it.'}
        </p>
        <CooksAt card={card} />
        {card.kind === 'copy' || target === null ? null : (
          <>
            {target.kind === 'section' ? <ItemsPart section={target.section} /> : null}
            <TimesPart target={target} />
            <SplitsPart target={target} />
            <CopiesPart target={target} />
            {target.kind === 'section' ? <OfferPart section={target.section} name={card.name} close={close} /> : null}
          </>
        )}
      </div>
    </SidePanel>
  );
}

