'use client';

import { useState } from 'react';
import type { Card } from '@/lib/domain/plans/board';
import { dropEdit, sayCards, sayDropped } from '@/lib/domain/plans/drop';
import { describeEdit } from '@/lib/domain/plans/describe-edit';
import type { StationId } from '@/lib/domain/site/ids';
import { cardsNamed, landed } from '../store/lift';
import { makeStep } from '../store/make-edit';
import type { StationChange } from '../store/station-edits';
import { sayStationChange, stationEdits, stationsOf } from '../store/station-edits';
import { newRuleId, useBoard, useSettings, useStore } from './board-context';
import { BesidePopover } from './beside-popover';
import { useOpened } from './opened';
import { StationRows } from './station-rows';

type SendMenuProps = { readonly cards: readonly string[]; readonly beside: HTMLElement; readonly close: () => void };

/** Cards keep their id only while they hang where they hang: what the menu is about is remembered by target. */
const sameCards = (all: readonly Card[], about: readonly Card[]): readonly Card[] => {
  const keyOf = (card: Card): string => JSON.stringify([card.kind, card.target, card.conditions]);
  const wanted = new Set(about.map(keyOf));
  const seen = new Set<string>();
  return all.filter((card) => wanted.has(keyOf(card)) && !seen.has(keyOf(card)) && seen.add(keyOf(card)));
};

/** The way to send without dragging: one press on a station moves there, a tick sends there as well. */
export function SendMenu({ cards: ids, beside, close }: SendMenuProps) {
  const store = useStore();
  const opened = useOpened();
  const { stations } = useSettings();
  const [about] = useState(() => cardsNamed(store.get(), ids));
  const board = useBoard((state) => state.board);
  const cards = sameCards([...board.tray, ...board.rails.flatMap((rail) => rail.cards)], about);
  const copies = about.every((card) => card.kind === 'copy');
  const ticked = [...new Set(cards.flatMap((card) => stationsOf(store.get(), card)))];
  const cooking = stations.filter((station) => copies || station.kind === 'prep');
  const passes = copies ? [] : stations.filter((station) => station.kind === 'pass');
  const copied = passes.filter((pass) => about.every((card) => board.rails.some((rail) => rail.station === pass.id
    && rail.cards.some((hung) => hung.kind === 'copy' && JSON.stringify(hung.target) === JSON.stringify(card.target)))));

  const [first] = cards;
  const send = (change: StationChange): void => store.set((state) =>
    makeStep(state, stationEdits(state, cards, change, store.site), sayStationChange(state, cards, change, store.site), store.site, newRuleId));

  const copyTo = (station: StationId, on: boolean): void => store.set((state) => {
    const edit = on ? dropEdit(cards, station, store.site) : {
      kind: 'copy' as const, targets: about.map((card) => card.target), conditions: { orderTypes: [], areas: [], tills: [] }, how: 'remove' as const, stations: [station],
    };
    if (edit === null) return state;
    const words = describeEdit(edit, store.site, state.content);
    return makeStep(state, [{ edit, words }], on ? sayDropped(cards, station, store.site) : words, store.site, newRuleId);
  });

  return (
    <BesidePopover beside={beside} label={`Send ${sayCards(about)} to`} close={close}>
      <StationRows
        legend="Press one, or tick several"
        stations={cooking}
        ticked={ticked}
        change={(station, on) => send({ how: on ? 'add' : 'remove', stations: [station] })}
        only={(station) => {
          send({ how: 'replace', stations: [station] });
          store.set((state) => ({ ...state, focus: first === undefined ? null : landed(state, first.target, station) }));
          close();
        }}
      />
      {passes.length === 0 ? null : (
        <div className="mt-3"><StationRows legend="A copy to" stations={passes} ticked={copied.map((pass) => pass.id)} change={copyTo} /></div>
      )}
      <div className="mt-2 grid border-t border-line pt-2">
        {ticked.length === 0 ? null : (
          <button
            type="button"
            className="min-h-9 rounded-md px-2 text-left font-semibold hover:bg-ground"
            onClick={() => {
              send({ how: 'replace', stations: [] });
              close();
            }}
          >
            {copies ? 'No copy' : 'Prints nowhere'}
          </button>
        )}
        {about.length === 1 && first !== undefined ? (
          <button type="button" className="min-h-9 rounded-md px-2 text-left font-semibold hover:bg-ground" onClick={() => opened.open({ kind: 'card', card: first.id })}>
            Items, conditions and splits
          </button>
        ) : null}
      </div>
    </BesidePopover>
  );
}
