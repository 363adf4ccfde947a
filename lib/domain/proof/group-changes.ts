import { listed, namesOf, type Names } from '@/lib/domain/routing/names-of';
import type { Context } from '@/lib/domain/routing/compile-plan';
import type { ItemId, TillId } from '@/lib/domain/site/ids';
import { orderTypeWords, type OrderType } from '@/lib/domain/site/order-types';
import type { Site } from '@/lib/domain/site/site';
import { changeKinds, type Change, type ChangeKind, type End } from './compare';

/** Many changes as one sentence: "all Desserts from Terrace: Pastry to Larder". */
export type ChangeGroup = {
  readonly kind: ChangeKind;
  readonly words: string;
  readonly items: readonly ItemId[];
  /** Ways to order that it stands for. */
  readonly ways: number;
};

const endWords = (end: End, names: Names): string =>
  end.length === 0 ? 'nowhere' : listed(end.map(({ station, printer }) => (printer === null ? `${names.station(station)}, which prints nowhere` : names.station(station))));

const printerWords = (end: End, names: Names): string =>
  end.length === 0 ? 'nowhere' : listed(end.map(({ printer }) => (printer === null ? 'nowhere' : names.printer(printer))));

const sameStations = (left: End, right: End): boolean =>
  left.length === right.length && left.every(({ station }, index) => station === right[index]?.station);

const pathWords = ({ before, after }: Change, names: Names): string =>
  sameStations(before, after)
    ? `${printerWords(before, names)} to ${printerWords(after, names)}`
    : `${endWords(before, names)} to ${endWords(after, names)}`;

/** The tills as areas where they fill one, else by name; nothing when they are all. */
const tillWords = (site: Site, tills: ReadonlySet<TillId>): string => {
  if (site.tills.every((till) => tills.has(till.id))) return '';
  const areas = site.areas.filter((area) => {
    const own = site.tills.filter((till) => till.area === area.id);
    return own.length > 0 && own.every((till) => tills.has(till.id));
  });
  const inAreas = new Set(site.tills.filter((till) => areas.some((area) => area.id === till.area)).map((till) => till.id));
  const loose = site.tills.filter((till) => tills.has(till.id) && !inAreas.has(till.id));
  return `from ${listed([...areas, ...loose].map(({ name }) => name))}`;
};

const contextWords = (site: Site, contexts: readonly Context[]): readonly string[] => {
  const byTypes = new Map<string, { readonly types: readonly OrderType[]; readonly tills: Set<TillId> }>();
  for (const till of site.tills) {
    const types = till.orderTypes.filter((type) => contexts.some((context) => context.till === till.id && context.orderType === type));
    if (types.length === 0) continue;
    const key = types.length === till.orderTypes.length ? 'all' : types.join();
    const group = byTypes.get(key) ?? { types: key === 'all' ? [] : types, tills: new Set() };
    group.tills.add(till.id);
    byTypes.set(key, group);
  }
  return [...byTypes.values()].map(({ types, tills }) =>
    [tillWords(site, tills), types.length === 0 ? '' : listed(types.map((type) => orderTypeWords[type]), 'or')].filter((words) => words !== '').join(', '));
};

const itemWords = (site: Site, items: ReadonlySet<ItemId>, names: Names): string => {
  const whole = site.menu.sections.filter((section) => {
    const own = site.menu.items.filter((item) => item.section === section.id && !item.noTicket);
    return own.length > 0 && own.every((item) => items.has(item.id));
  });
  if (whole.length === site.menu.sections.length) return 'everything';
  const inWhole = new Set(whole.map((section) => section.id));
  const loose = site.menu.items.filter((item) => items.has(item.id) && !inWhole.has(item.section));
  const looseWords = loose.length > 4 ? [`${loose.length} items`] : loose.map((item) => names.item(item.id));
  return listed([...whole.map((section) => `all ${section.name}`), ...looseWords]);
};

const partKey = ({ part }: Change): string => (part.kind === 'option' ? `option ${part.option}` : part.kind);
const endKey = (end: End): string => end.map(({ station, printer }) => `${station}>${printer ?? ''}`).join();

/** Groups changes to the smallest description: same kind, part, path and contexts become one sentence. */
export const groupChanges = (site: Site, changes: readonly Change[]): readonly ChangeGroup[] => {
  const names = namesOf(site);
  const byPath = new Map<string, Change[]>();
  for (const change of changes) {
    const key = [change.kind, partKey(change), endKey(change.before), endKey(change.after)].join('|');
    const group = byPath.get(key);
    if (group === undefined) byPath.set(key, [change]);
    else group.push(change);
  }
  const groups = [...byPath.values()].flatMap((alike) => {
    const contextsByItem = new Map<ItemId, Context[]>();
    for (const change of alike) contextsByItem.set(change.item, [...(contextsByItem.get(change.item) ?? []), change.context]);
    const byContexts = new Map<string, { readonly contexts: readonly Context[]; readonly items: Set<ItemId> }>();
    for (const [item, contexts] of contextsByItem) {
      const key = contexts.map((context) => `${context.till}/${context.orderType}`).join();
      const group = byContexts.get(key) ?? { contexts, items: new Set() };
      group.items.add(item);
      byContexts.set(key, group);
    }
    const first = alike[0]!;
    return [...byContexts.values()].flatMap(({ contexts, items }) =>
      contextWords(site, contexts).map((where): ChangeGroup => {
        const what = itemWords(site, items, names);
        const part = first.part.kind === 'option' ? `${names.option(first.part.option)} on ${what}` : first.part.kind === 'copy' ? `copies of ${what}` : what;
        return {
          kind: first.kind,
          words: `${part}${where === '' ? '' : ` ${where}`}: ${pathWords(first, names)}`,
          items: [...items],
          ways: items.size * contexts.length,
        };
      }));
  });
  const rank = new Map(changeKinds.map((kind, index) => [kind, index] as const));
  return groups.toSorted((left, right) => (rank.get(right.kind) === rank.get(left.kind) ? right.ways - left.ways : (left.kind === 'newly-lost' ? -1 : right.kind === 'newly-lost' ? 1 : (rank.get(left.kind) ?? 0) - (rank.get(right.kind) ?? 0))));
};
