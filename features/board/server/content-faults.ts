import 'server-only';
import type { PlanContent, Rule } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';

type Known = { readonly [Kind in 'section' | 'item' | 'option' | 'station' | 'area' | 'till']: ReadonlySet<string> } & { readonly prep: ReadonlySet<string> };

const idsOf = (list: readonly { readonly id: string }[]): ReadonlySet<string> => new Set(list.map((member) => member.id));

const knownOf = (site: Site): Known => ({
  section: idsOf(site.menu.sections), item: idsOf(site.menu.items), option: idsOf(site.menu.options),
  station: idsOf(site.stations), area: idsOf(site.areas), till: idsOf(site.tills),
  prep: idsOf(site.stations.filter((station) => station.kind === 'prep')),
});

const faultsOf = (rule: Rule, known: Known): readonly string[] => {
  const { target, conditions, stations } = rule;
  return [
    'section' in target && !known.section.has(target.section) ? 'names a menu section that is not on this site any more' : '',
    'item' in target && !known.item.has(target.item) ? 'names an item that is not on this site any more' : '',
    'option' in target && !known.option.has(target.option) ? 'names an option that is not on this site any more' : '',
    stations.some((station) => !known.station.has(station)) ? 'names a station that is not on this site any more' : '',
    rule.kind !== 'copy' && stations.some((station) => known.station.has(station) && !known.prep.has(station)) ? 'sends dishes to a pass, which cooks nothing; a pass gets copies' : '',
    conditions.areas.some((area) => !known.area.has(area)) ? 'names an area that is not on this site any more' : '',
    conditions.tills.some((till) => !known.till.has(till)) ? 'names a till that is not on this site any more' : '',
  ].filter((fault) => fault !== '');
};

/** What keeps this content from being this site's: one reason a rule, with the rule's place. */
export const contentFaults = (site: Site, content: PlanContent): readonly { readonly field: string; readonly reason: string }[] => {
  const known = knownOf(site);
  const offers = (content.offers ?? []).flatMap((section, place) => (known.section.has(section)
    ? [] : [{ field: `content.offers.${place}`, reason: 'This menu section is not on this site any more.' }]));
  const ids = new Set<string>();
  const rules = content.rules.flatMap((rule, place) => {
    const twice = ids.has(rule.id) ? ['has the id of another rule'] : [];
    ids.add(rule.id);
    return [...faultsOf(rule, known), ...twice].map((fault) => ({ field: `content.rules.${place}`, reason: `This rule ${fault}.` }));
  });
  return [...offers, ...rules];
};
