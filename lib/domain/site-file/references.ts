import type { Site } from '@/lib/domain/site/site';

/** Something in a site file that cannot be taken, and where it stands. */
export type Fault = { readonly path: string; readonly message: string };

type Reference = { readonly path: string; readonly id: string | null };

const at = (path: string, values: readonly string[]): readonly Reference[] => values.map((id, index) => ({ path: `${path}[${index}]`, id }));

const missing = (references: readonly Reference[], known: ReadonlySet<string>, what: string): readonly Fault[] =>
  references.filter(({ id }) => id !== null && !known.has(id)).map(({ path, id }) => ({ path, message: `There is no ${what} with the id “${id ?? ''}”.` }));

const idSet = (things: readonly { readonly id: string }[]): ReadonlySet<string> => new Set(things.map((thing) => thing.id));

const repeated = (path: string, values: readonly string[], what: string, foldCase = true): readonly Fault[] => {
  const seen = new Map<string, number>();
  return values.flatMap((value, index) => {
    const key = foldCase ? value.normalize('NFC').toLowerCase() : value;
    const first = seen.get(key);
    if (first === undefined) {
      seen.set(key, index);
      return [];
    }
    return [{ path: `${path}[${index}]`, message: `${what} “${value}” stands already at ${path}[${first}].` }];
  });
};

/** Where each reference of a site points, gathered by what it must point to. */
const referencesOf = (site: Site) => {
  const rules = site.plans.flatMap((plan, p) => plan.rules.map((rule, r) => ({ rule, path: `site.plans[${p}].rules[${r}]` })));
  const one = (path: string, id: string | null): Reference => ({ path, id });
  const targetField = (field: 'section' | 'item' | 'option'): readonly Reference[] =>
    rules.flatMap(({ rule, path }) => (field in rule.target ? [one(`${path}.target.${field}`, (rule.target as Record<string, unknown>)[field] as string)] : []));
  const tills = site.tills.map((till, index) => ({ till, path: `site.tills[${index}]` }));
  const printers = site.printers.map((printer, index) => ({ printer, path: `site.printers[${index}]` }));
  const stations = site.stations.map((station, index) => ({ station, path: `site.stations[${index}]` }));
  const items = site.menu.items.map((item, index) => ({ item, path: `site.menu.items[${index}]` }));
  return {
    area: [...tills.map(({ till, path }) => one(`${path}.area`, till.area)), ...rules.flatMap(({ rule, path }) => at(`${path}.conditions.areas`, rule.conditions.areas))],
    till: [
      ...tills.map(({ till, path }) => one(`${path}.printsThrough`, till.printsThrough)),
      ...printers.map(({ printer, path }) => one(`${path}.hostTill`, printer.hostTill)),
      ...rules.flatMap(({ rule, path }) => at(`${path}.conditions.tills`, rule.conditions.tills)),
      ...(site.link.kind === 'till' ? [one('site.link.till', site.link.till)] : []),
      ...at('site.live.inForceOn', site.live?.inForceOn ?? []),
    ],
    printer: [
      ...tills.flatMap(({ till, path }) => [one(`${path}.defaultPrinter`, till.defaultPrinter), ...till.queues.map((queue, q) => one(`${path}.queues[${q}].printer`, queue.printer))]),
      ...printers.map(({ printer, path }) => one(`${path}.backup`, printer.backup)),
      ...stations.flatMap(({ station, path }) => at(`${path}.printers`, station.printers)),
    ],
    station: [...stations.map(({ station, path }) => one(`${path}.standIn`, station.standIn)), ...rules.flatMap(({ rule, path }) => at(`${path}.stations`, rule.stations))],
    section: [
      ...items.map(({ item, path }) => one(`${path}.section`, item.section)), ...targetField('section'),
      ...site.plans.flatMap((plan, index) => at(`site.plans[${index}].offers`, plan.offers ?? [])),
    ],
    item: targetField('item'),
    option: [...targetField('option'), ...site.menu.optionGroups.flatMap((group, index) => at(`site.menu.optionGroups[${index}].options`, group.options))],
    'option group': [
      ...items.flatMap(({ item, path }) => at(`${path}.optionGroups`, item.optionGroups)),
      ...site.menu.options.map((option, index) => one(`site.menu.options[${index}].group`, option.group)),
    ],
    course: items.map(({ item, path }) => one(`${path}.course`, item.course)),
    'shared point': [...tills, ...printers].flatMap((thing) => at(`${thing.path}.sharedPoints`, 'till' in thing ? thing.till.sharedPoints : thing.printer.sharedPoints)),
    plan: site.live === null ? [] : [one('site.live.planId', site.live.planId)],
  };
};

/** Tills that print through each other have nobody who prints. */
const throughCircles = (site: Site): readonly Fault[] => {
  const next = new Map(site.tills.map((till) => [till.id, till.printsThrough]));
  return site.tills.flatMap((till, index) => {
    const seen = new Set<string>();
    for (let now = till.printsThrough; now !== null && !seen.has(now); now = next.get(now) ?? null) {
      if (now === till.id) return [{ path: `site.tills[${index}].printsThrough`, message: `${till.name} prints through others that print through it: nobody prints.` }];
      seen.add(now);
    }
    return [];
  });
};

/** Every reference that points nowhere, every id or name that stands twice, every circle without a way out. */
export const faultsIn = (site: Site): readonly Fault[] => {
  const references = referencesOf(site);
  const { menu } = site;
  const lists: readonly (readonly [keyof typeof references, string, readonly { readonly id: string }[]])[] = [
    ['area', 'site.areas', site.areas], ['till', 'site.tills', site.tills], ['printer', 'site.printers', site.printers],
    ['station', 'site.stations', site.stations], ['section', 'site.menu.sections', menu.sections], ['item', 'site.menu.items', menu.items],
    ['option', 'site.menu.options', menu.options], ['option group', 'site.menu.optionGroups', menu.optionGroups],
    ['course', 'site.courses', site.courses], ['shared point', 'site.sharedPoints', site.sharedPoints], ['plan', 'site.plans', site.plans],
  ];
  const named: readonly (readonly [string, readonly { readonly name: string }[], string])[] = [
    ['site.areas', site.areas, 'The area name'], ['site.tills', site.tills, 'The till name'], ['site.printers', site.printers, 'The printer name'],
    ['site.stations', site.stations, 'The station name'], ['site.menu.sections', menu.sections, 'The section name'], ['site.plans', site.plans, 'The plan name'],
  ];
  return [
    ...lists.flatMap(([what, path, things]) => [
      ...repeated(path, things.map((thing) => thing.id), 'The id', false),
      ...missing(references[what], idSet(things), what),
    ]),
    ...repeated('site.plans.rules', site.plans.flatMap((plan) => plan.rules.map((rule) => rule.id)), 'The rule id', false),
    ...named.flatMap(([path, things, what]) => repeated(path, things.map((thing) => thing.name), what)),
    ...throughCircles(site),
  ];
};
