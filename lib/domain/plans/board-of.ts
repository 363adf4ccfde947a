import type { SectionId, StationId } from '../site/ids';
import type { PlanContent, Rule } from '../site/plan';
import { anyCondition } from '../site/plan';
import type { Board, Card, NotOffered, Rail } from './board';
import type { BoardSite, BoardStation } from './board-site';
import type { RuleIndex } from './card-notes';
import { indexRules, notesOf, sayStations, splitConcerns } from './card-notes';
import { conditionTags, conditionsKey, isUnconditional, sayConditions } from './conditions';
import { unconditionalWinners } from './hanging';
import type { CopyTarget, SendTarget } from './targets';
import { sayTarget, sectionTarget, targetKey } from './targets';
import { countWords } from './words';

type Reading = {
  readonly site: BoardSite;
  readonly content: PlanContent;
  readonly index: RuleIndex;
  readonly itemsOf: ReadonlyMap<Rule, number>;
};

const layoutWords: Readonly<Record<BoardStation['layout'], string>> = { 'by-seat': 'copy, by seat', 'by-course': 'copy, by course' };

const isOffered = (rule: Rule, { content, index, site }: Reading): boolean => {
  const { target } = rule;
  const offered = (section: SectionId | undefined): boolean =>
    section !== undefined && site.menu.sections.some((candidate) => candidate.id === section) && (content.offers?.includes(section) ?? true);
  if (target.kind === 'section') return offered(target.section);
  if (target.kind === 'item') return offered(index.items.get(target.item)?.section);
  return target.kind === 'everything' || site.menu.options.some((option) => option.id === target.option);
};

const underOf = (rule: Rule, station: BoardStation, items: number, { index, site }: Reading): string => {
  if (rule.kind === 'copy') return layoutWords[station.layout];
  if (!isUnconditional(rule.conditions)) return 'only then';
  if (rule.target.kind !== 'item') return countWords(items, 'item');
  const section = index.items.get(rule.target.item)?.section;
  return `of ${site.menu.sections.find((candidate) => candidate.id === section)?.name ?? 'no menu section'}`;
};

const cardOf = (rule: Rule, station: BoardStation, reading: Reading): Card => {
  const target = rule.target as SendTarget | CopyTarget;
  const { site } = reading;
  const items = reading.itemsOf.get(rule) ?? 0;
  return {
    id: [rule.kind, targetKey(target), conditionsKey(rule.conditions), station.id].join('/'),
    kind: rule.kind === 'copy' ? 'copy' : 'send',
    target,
    rule: rule.id,
    station: station.id,
    conditions: rule.conditions,
    name: sayTarget(target, site),
    under: underOf(rule, station, items, reading),
    items,
    tags: conditionTags(rule.conditions, site),
    notes: notesOf(rule, reading.index, site),
    alsoAt: rule.kind === 'copy' ? [] : site.stations.filter((other) => other.id !== station.id && rule.stations.includes(other.id)).map((other) => other.code),
  };
};

const targetRank: Readonly<Record<Rule['target']['kind'], number>> = {
  everything: 0, section: 1, item: 2, option: 3, 'option-on-section': 4, 'option-on-item': 5,
};

/** Sections in the menu's order, their exceptions after them, then what holds only at times, copies last. */
const byReadingOrder = (site: BoardSite) => {
  const places = new Map<string, number>([...site.menu.sections, ...site.menu.items, ...site.menu.options].map((named, place) => [named.id, place]));
  const placeOf = (rule: Rule): number => {
    const { target } = rule;
    return target.kind === 'everything' ? 0 : places.get(target.kind === 'section' ? target.section : target.kind === 'item' ? target.item : target.option) ?? 0;
  };
  return (left: Rule, right: Rule): number =>
    Number(left.kind === 'copy') - Number(right.kind === 'copy')
    || Number(!isUnconditional(left.conditions)) - Number(!isUnconditional(right.conditions))
    || targetRank[left.target.kind] - targetRank[right.target.kind]
    || placeOf(left) - placeOf(right);
};

const railsOf = (reading: Reading): readonly Rail[] => {
  const hanging = new Map<StationId, Map<string, Card>>(reading.site.stations.map((station) => [station.id, new Map()]));
  const stations = new Map(reading.site.stations.map((station) => [station.id, station]));
  const shown = reading.content.rules
    .filter((rule) => rule.kind !== 'split' && isOffered(rule, reading))
    .toSorted(byReadingOrder(reading.site));
  for (const rule of shown) {
    for (const id of rule.stations) {
      const station = stations.get(id);
      if (station === undefined) continue;
      const card = cardOf(rule, station, reading);
      // Of several equal rules the later one wins; the beaten one stands in the list of rules.
      hanging.get(id)?.set(card.id, card);
    }
  }
  return reading.site.stations.map((station) => {
    const cards = [...(hanging.get(station.id)?.values() ?? [])];
    return {
      station: station.id,
      items: cards.reduce((sum, card) => sum + card.items, 0),
      wholeOrder: cards.some((card) => card.kind === 'copy' && card.target.kind === 'everything' && isUnconditional(card.conditions)),
      cards,
    };
  });
};

const trayCard = (section: BoardSite['menu']['sections'][number], items: number, { index, site }: Reading): Card => {
  const target = sectionTarget(section.id);
  return {
    id: `tray/${section.id}`,
    kind: 'send',
    target,
    rule: null,
    station: null,
    conditions: anyCondition,
    name: section.name,
    under: items === 0 ? 'no items yet' : countWords(items, 'item'),
    items,
    tags: [],
    notes: (index.sends.get(targetKey(target)) ?? [])
      .filter((rule) => !isUnconditional(rule.conditions))
      .map((rule) => `only ${sayConditions(rule.conditions, site)}, at ${sayStations(site, rule.stations)}`),
    alsoAt: [],
  };
};

const trayOf = (reading: Reading, winners: ReturnType<typeof unconditionalWinners>): readonly Card[] => {
  const { site, content, index } = reading;
  return site.menu.sections
    .filter((section) => content.offers?.includes(section.id) ?? true)
    .flatMap((section) => {
      const all = site.menu.items.filter((item) => item.section === section.id);
      const lost = all.filter((item) => winners.get(item.id) === null).length;
      const emptyAndFree = all.length === 0 && !index.sends.has(`section:${section.id}`) && !index.sends.has('everything');
      return lost > 0 || emptyAndFree ? [trayCard(section, lost, reading)] : [];
    });
};

const notOfferedOf = (site: BoardSite, content: PlanContent): readonly NotOffered[] =>
  site.menu.sections
    .filter((section) => content.offers !== null && !content.offers.includes(section.id))
    .map((section) => ({ section: section.id, name: section.name, items: site.menu.items.filter((item) => item.section === section.id).length }));

const unseenOf = (reading: Reading): Board['unseen'] =>
  reading.content.rules
    .filter((rule) => (rule.kind === 'split' ? !splitConcerns(rule, { kind: 'everything' }, reading.index, reading.site) && !splitShows(rule, reading) : !isOffered(rule, reading)))
    .map((rule) => rule.id);

const splitShows = (rule: Rule, { index, site, content }: Reading): boolean =>
  site.menu.sections.some((section) =>
    (content.offers?.includes(section.id) ?? true) && splitConcerns(rule, { kind: 'section', section: section.id }, index, site));

/** A plan as it hangs: which papers on which rail, what lies in the tray, what is left out. */
export const boardOf = (site: BoardSite, content: PlanContent): Board => {
  const winners = unconditionalWinners(site, content);
  const itemsOf = new Map<Rule, number>();
  for (const winner of winners.values()) if (winner !== null) itemsOf.set(winner, (itemsOf.get(winner) ?? 0) + 1);
  const reading: Reading = { site, content, index: indexRules(site, content), itemsOf };
  return { rails: railsOf(reading), tray: trayOf(reading, winners), notOffered: notOfferedOf(site, content), unseen: unseenOf(reading) };
};
