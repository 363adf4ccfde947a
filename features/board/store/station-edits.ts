import type { Card } from '@/lib/domain/plans/board';
import { describeEdit } from '@/lib/domain/plans/describe-edit';
import type { PlanEdit } from '@/lib/domain/plans/edit';
import { sayCards } from '@/lib/domain/plans/drop';
import { sayStations } from '@/lib/domain/plans/card-notes';
import { readsAsPlural } from '@/lib/domain/plans/words';
import type { StationId } from '@/lib/domain/site/ids';
import { anyCondition } from '@/lib/domain/site/plan';
import type { BoardState, MadeEdit } from './board-state';
import type { Site } from './make-edit';

export type StationChange = { readonly how: 'replace' | 'add' | 'remove'; readonly stations: readonly StationId[] };

/** Where the rule behind a card sends now; nowhere from the tray. */
export const stationsOf = (state: BoardState, card: Card): readonly StationId[] =>
  state.content.rules.find((rule) => rule.id === card.rule)?.stations ?? [];

const changed = (now: readonly StationId[], { how, stations }: StationChange): readonly StationId[] => {
  if (how === 'replace') return stations;
  return how === 'add' ? [...new Set([...now, ...stations])] : now.filter((station) => !stations.includes(station));
};

const editOf = (state: BoardState, card: Card, change: StationChange): PlanEdit | null => {
  if (card.rule !== null) return { kind: 'change-rule', rule: card.rule, stations: changed(stationsOf(state, card), change) };
  if (card.target.kind === 'option' || change.how === 'remove') return null;
  return { kind: 'send', targets: [card.target], conditions: anyCondition, how: change.how, stations: change.stations };
};

/** The edits that change where all these cards go; one for each rule, however many rails it hangs on. */
export const stationEdits = (state: BoardState, cards: readonly Card[], change: StationChange, site: Site): readonly MadeEdit[] => {
  const once = cards.filter((card, place) => card.rule === null || cards.findIndex((other) => other.rule === card.rule) === place);
  return once.flatMap((card) => {
    const edit = editOf(state, card, change);
    if (edit === null) return [];
    const words = edit.kind === 'change-rule' && (edit.stations?.length ?? 0) === 0
      ? `${card.name} off every station`
      : describeEdit(edit, site, state.content);
    return [{ edit, words }];
  });
};

/** "Oysters now print at Larder and Bar". */
export const sayStationChange = (state: BoardState, cards: readonly Card[], change: StationChange, site: Site): string => {
  const names = sayCards(cards);
  const plural = cards.length > 1 || cards.some((card) => readsAsPlural(card.name));
  const [first] = cards;
  const after = first === undefined ? [] : changed(stationsOf(state, first), change);
  const copies = cards.every((card) => card.kind === 'copy');
  if (cards.length > 1 && change.how !== 'replace') return `${names} ${change.how === 'add' ? 'now also print' : 'no longer print'} at ${sayStations(site, change.stations)}`;
  if (after.length === 0) return copies ? `${names} no longer copied` : `${names} now ${plural ? 'print' : 'prints'} nowhere`;
  if (copies) return `Copy of ${names} now goes to ${sayStations(site, after)}`;
  return `${names} now ${plural ? 'print' : 'prints'} at ${sayStations(site, after)}`;
};
