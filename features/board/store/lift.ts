import type { Card } from '@/lib/domain/plans/board';
import type { DropPlace } from '@/lib/domain/plans/drop';
import { dropEdit, sayCards, sayDropped } from '@/lib/domain/plans/drop';
import { describeEdit } from '@/lib/domain/plans/describe-edit';
import type { BoardState, Lifted } from './board-state';
import type { BoardStore } from './create-board-store';
import type { NewRuleId, Site } from './make-edit';
import { makeStep } from './make-edit';

const say = (state: BoardState, words: string): BoardState['said'] => ({ id: state.said.id + 1, words });

export const allCards = (state: BoardState): readonly Card[] => [...state.board.tray, ...state.board.rails.flatMap((rail) => rail.cards)];

export const cardsNamed = (state: BoardState, ids: readonly string[]): readonly Card[] => allCards(state).filter((card) => ids.includes(card.id));

export const placeOf = (card: Card): DropPlace => card.station ?? 'tray';

/** The tray first, then the rails from the top. */
export const dropPlaces = (site: Site): readonly DropPlace[] => ['tray', ...site.stations.map((station) => station.id)];

export const sayPlace = (place: DropPlace, site: Site): string =>
  (place === 'tray' ? 'Prints nowhere yet' : site.stations.find((station) => station.id === place)?.name ?? 'a station that has gone');

/** Lifting one of several chosen cards lifts them all. */
export const lift = (state: BoardState, id: string, by: Lifted['by'], site: Site): BoardState => {
  const cards = state.chosen.has(id) ? [id, ...[...state.chosen].filter((other) => other !== id)] : [id];
  const [card] = cardsNamed(state, [id]);
  if (card === undefined) return state;
  const names = sayCards(cardsNamed(state, cards));
  const words = by === 'keyboard'
    ? `${names} lifted from ${sayPlace(placeOf(card), site)}. Arrow keys choose a rail, Space drops, Escape cancels.`
    : `${names} lifted`;
  return { ...state, lifted: { cards, over: placeOf(card), by }, said: say(state, words) };
};

export const moveOver = (state: BoardState, over: DropPlace | null, site: Site): BoardState => {
  if (state.lifted === null || state.lifted.over === over) return state;
  const moved = { ...state, lifted: { ...state.lifted, over } };
  if (state.lifted.by === 'pointer') return moved;
  return { ...moved, said: say(state, over === null ? 'Over no rail' : `Over ${sayPlace(over, site)}`) };
};

/** To the next rail up or down, from the last to the first. */
export const moveBy = (state: BoardState, steps: number, site: Site): BoardState => {
  const places = dropPlaces(site);
  const now = places.indexOf(state.lifted?.over ?? 'tray');
  return moveOver(state, places[(now + steps + places.length) % places.length] ?? 'tray', site);
};

export const cancelLift = (state: BoardState): BoardState => {
  if (state.lifted === null) return state;
  const [first] = state.lifted.cards;
  return {
    ...state, lifted: null, focus: state.lifted.by === 'keyboard' ? (first ?? null) : null,
    said: say(state, `${sayCards(cardsNamed(state, state.lifted.cards))} put back`),
  };
};

/** The card that shows after the drop what was lifted, so that the focus can follow it. */
export const landed = (state: BoardState, target: Card['target'], place: DropPlace): string | null =>
  allCards(state).find((card) => placeOf(card) === place && JSON.stringify(card.target) === JSON.stringify(target))?.id ?? null;

/** Drops onto any place, by whatever way it was chosen: drag, keys or the list. */
export const dropCards = (state: BoardState, ids: readonly string[], place: DropPlace, site: Site, newId: NewRuleId): BoardState => {
  const cards = cardsNamed(state, ids);
  const edit = dropEdit(cards, place, site);
  const [first] = cards;
  if (edit === null || first === undefined) return { ...cancelLift(state), said: say(state, `${sayCards(cards)} put back, nothing changed`) };
  const byKeys = state.lifted?.by === 'keyboard';
  const after = makeStep({ ...state, lifted: null }, [{ edit, words: describeEdit(edit, site, state.content) }], sayDropped(cards, place, site), site, newId);
  const settled = landed(after, first.target, place);
  return { ...after, settled, focus: byKeys ? settled : null };
};

export const drop = (store: BoardStore, newId: NewRuleId): void => {
  store.set((state) => {
    if (state.lifted === null) return state;
    return state.lifted.over === null ? cancelLift(state) : dropCards(state, state.lifted.cards, state.lifted.over, store.site, newId);
  });
};

export const choose = (state: BoardState, id: string): BoardState => {
  const chosen = new Set(state.chosen);
  if (!chosen.delete(id)) chosen.add(id);
  const [card] = cardsNamed(state, [id]);
  const words = card === undefined ? '' : `${card.name} ${chosen.has(id) ? 'chosen' : 'no longer chosen'}, ${chosen.size} in all`;
  return { ...state, chosen, said: say(state, words) };
};

/** All cards between the last chosen and this one, in reading order; with none chosen, this one. */
export const chooseThrough = (state: BoardState, id: string): BoardState => {
  const ids = allCards(state).map((card) => card.id);
  const last = [...state.chosen].at(-1);
  if (last === undefined) return choose(state, id);
  const [from, to] = [ids.indexOf(last), ids.indexOf(id)].toSorted((left, right) => left - right);
  const chosen = new Set([...state.chosen, ...ids.slice(from, (to ?? 0) + 1)]);
  return { ...state, chosen, said: say(state, `${chosen.size} cards chosen`) };
};
