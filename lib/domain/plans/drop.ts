import type { StationId } from '../site/ids';
import { anyCondition } from '../site/plan';
import type { Card } from './board';
import type { BoardSite } from './board-site';
import type { PlanEdit } from './edit';
import { countWords, listWords, readsAsPlural } from './words';

/** Where a lifted card may be let go: a rail, or the tray of what prints nowhere. */
export type DropPlace = StationId | 'tray';

/**
 * The edit that dropping cards makes, or null when it would change nothing. A pass cooks nothing: what is dropped
 * there is copied to it and keeps its own rails.
 */
export const dropEdit = (cards: readonly Card[], place: DropPlace, site: BoardSite): PlanEdit | null => {
  const moved = cards.filter((card) => (place === 'tray' ? card.station !== null : card.station !== place));
  if (moved.length === 0) return null;
  if (place === 'tray') return { kind: 'hang', cards: moved.map(({ target, rule, station }) => ({ target, rule, from: station })), to: null };
  const isPass = site.stations.some((station) => station.id === place && station.kind === 'pass');
  const cooking = moved.filter((card) => card.kind === 'send');
  if (isPass && cooking.length > 0) {
    return { kind: 'copy', targets: cooking.map((card) => card.target), conditions: anyCondition, how: 'add', stations: [place] };
  }
  return { kind: 'hang', cards: moved.map(({ target, rule, station }) => ({ target, rule, from: station })), to: place };
};

/** "Oysters", "Oysters and Late menu", "3 cards". */
export const sayCards = (cards: readonly Card[]): string =>
  (cards.length <= 2 ? listWords(cards.map((card) => card.name)) : countWords(cards.length, 'card'));

/** What the person reads once cards were let go: "Oysters now print at Larder". */
export const sayDropped = (cards: readonly Card[], place: DropPlace, site: BoardSite): string => {
  const names = sayCards(cards);
  const plural = cards.length > 1 || cards.some((card) => readsAsPlural(card.name));
  const copies = cards.every((card) => card.kind === 'copy');
  if (place === 'tray') {
    return copies ? `${names} no longer copied there` : `${names} no longer ${plural ? 'print' : 'prints'} there`;
  }
  const station = site.stations.find((candidate) => candidate.id === place);
  if (station === undefined) return `${names} moved`;
  if (copies || station.kind === 'pass') return `${station.name} now gets a copy of ${names.replace(/^Everything$/, 'everything')}`;
  return `${names} now ${plural ? 'print' : 'prints'} at ${station.name}`;
};
