import type { Course } from '@/lib/domain/site/site';
import type { Item, Menu, Option, OptionGroup, Section } from '@/lib/domain/site/menu';
import { asId } from '@/lib/domain/site/ids';
import type { Site } from '@/lib/domain/site/site';
import type { Mapping } from './fields';
import { fieldWords } from './fields';
import { foldName } from './fold-name';
import type { GroupText } from './option-cell';
import { readItems, type LineError, type ReadItem } from './read-items';
import type { Table } from './read-table';

/** What applying a file would do; nothing is written while there is an error. */
export type ImportPlan = {
  readonly sections: readonly Section[];
  readonly groups: readonly OptionGroup[];
  readonly options: readonly Option[];
  readonly creates: readonly Item[];
  readonly updates: readonly Item[];
  readonly unchanged: number;
  readonly errors: readonly LineError[];
};

const key = (section: string, name: string): string => `${foldName(section)}\n${foldName(name)}`;

type Working = {
  readonly menu: Menu;
  readonly courses: ReadonlyMap<string, Course>;
  readonly sections: Map<string, Section>;
  readonly newSections: Section[];
  readonly groups: Map<string, { readonly group: OptionGroup; readonly text: string }>;
  readonly newGroups: OptionGroup[];
  readonly newOptions: Option[];
  readonly newId: () => string;
};

const groupText = (group: Pick<GroupText, 'min' | 'max' | 'options'>): string =>
  JSON.stringify([group.min, group.max, group.options.map(({ name, kitchenName, allergens }) => [foldName(name), kitchenName, [...allergens].sort()])]);

const sectionFor = (working: Working, name: string): Section => {
  const known = working.sections.get(foldName(name));
  if (known !== undefined) return known;
  const made: Section = { id: asId(working.newId()), name, position: working.sections.size, version: 1 };
  working.sections.set(foldName(name), made);
  working.newSections.push(made);
  return made;
};

/** A group by its name; the same name with other options is an error, never a silent change for other items. */
const groupFor = (working: Working, said: GroupText): OptionGroup | string => {
  const known = working.groups.get(foldName(said.name));
  if (known !== undefined) {
    return known.text === groupText(said) ? known.group : `The group “${said.name}” has other options elsewhere. Give it another name, or the same options.`;
  }
  const id = asId<OptionGroup['id']>(working.newId());
  const options = said.options.map((option, position): Option => ({ id: asId(working.newId()), group: id, name: option.name, kitchenName: option.kitchenName, allergens: option.allergens, position, version: 1 }));
  const group: OptionGroup = { id, name: said.name, min: said.min, max: said.max, options: options.map((option) => option.id), version: 1 };
  working.groups.set(foldName(said.name), { group, text: groupText(said) });
  working.newGroups.push(group);
  working.newOptions.push(...options);
  return group;
};

const sameItem = (left: Item, right: Item): boolean => JSON.stringify({ ...left, allergens: [...left.allergens].sort() }) === JSON.stringify({ ...right, allergens: [...right.allergens].sort() });

const nextItem = (working: Working, said: ReadItem, present: Item | undefined, position: number): Item | LineError => {
  const course = said.course === undefined || said.course === '' ? null : working.courses.get(foldName(said.course));
  if (course === undefined) return { line: said.line, column: fieldWords.course, reason: `This site has no course “${said.course ?? ''}”. Add it to the site, or use one of its own.` };
  const groups = said.groups?.map((group) => groupFor(working, group));
  const fault = groups?.find((group) => typeof group === 'string');
  if (fault !== undefined) return { line: said.line, column: fieldWords.options, reason: fault };
  const base: Item = present ?? {
    id: asId(working.newId()), section: sectionFor(working, said.section).id, name: said.name, kitchenName: '', allergens: [], course: null, preparationSeconds: null,
    soldOut: false, left: null, noTicket: false, optionGroups: [], position, version: 1,
  };
  return {
    ...base,
    name: said.name,
    kitchenName: said.kitchenName ?? base.kitchenName,
    allergens: said.allergens ?? base.allergens,
    course: said.course === undefined ? base.course : course?.id ?? null,
    preparationSeconds: said.preparationSeconds === undefined ? base.preparationSeconds : said.preparationSeconds,
    soldOut: said.soldOut ?? base.soldOut,
    left: said.left === undefined ? base.left : said.left,
    noTicket: said.noTicket ?? base.noTicket,
    optionGroups: groups?.filter((group) => typeof group !== 'string').map((group) => group.id) ?? base.optionGroups,
  };
};

/**
 * Works out what a file would do to a menu: items are the same when section and name are, without case. Items that the
 * file does not name stay as they are.
 *
 * @param newId gives a fresh id each time
 */
export const planImport = (site: Pick<Site, 'menu' | 'courses'>, table: Table, mapping: Mapping, newId: () => string): ImportPlan => {
  const { menu } = site;
  const { items, errors } = readItems(table, mapping);
  const sectionNames = new Map(menu.sections.map((section) => [section.id, section.name]));
  const optionOf = new Map(menu.options.map((option) => [option.id, option]));
  const known = new Map(menu.items.map((item) => [key(sectionNames.get(item.section) ?? '', item.name), item]));
  const working: Working = {
    menu, newId, newSections: [], newGroups: [], newOptions: [],
    courses: new Map(site.courses.map((course) => [foldName(course.name), course])),
    sections: new Map(menu.sections.map((section) => [foldName(section.name), section])),
    groups: new Map(menu.optionGroups.map((group) => [foldName(group.name), { group, text: groupText({ ...group, options: group.options.flatMap((id) => optionOf.get(id) ?? []) }) }])),
  };
  const found: LineError[] = [...errors];
  const creates: Item[] = [];
  const updates: Item[] = [];
  const seen = new Map<string, number>();
  let unchanged = 0;
  for (const said of items) {
    const itemKey = key(said.section, said.name);
    const before = seen.get(itemKey);
    if (before !== undefined) {
      found.push({ line: said.line, column: fieldWords.name, reason: `“${said.name}” in ${said.section} stands already on line ${before}.` });
      continue;
    }
    seen.set(itemKey, said.line);
    const present = known.get(itemKey);
    const next = nextItem(working, said, present, menu.items.length + creates.length);
    if ('reason' in next) found.push(next);
    else if (present === undefined) creates.push(next);
    else if (sameItem(present, next)) unchanged += 1;
    else updates.push(next);
  }
  return {
    sections: working.newSections, groups: working.newGroups, options: working.newOptions, creates, updates, unchanged,
    errors: found.toSorted((left, right) => left.line - right.line),
  };
};
