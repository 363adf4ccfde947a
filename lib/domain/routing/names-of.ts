import type { AreaId, ItemId, OptionId, PrinterId, SectionId, StationId, TillId } from '@/lib/domain/site/ids';
import type { Site } from '@/lib/domain/site/site';

type Named = { readonly id: string; readonly name: string };

const byId = <Id extends string>(things: readonly Named[]): ((id: Id) => string) => {
  const names = new Map<string, string>(things.map((thing) => [thing.id, thing.name]));
  return (id) => names.get(id) ?? 'something that no longer exists';
};

/** Looks up what things are called, for sentences. */
export const namesOf = (site: Site) => ({
  station: byId<StationId>(site.stations),
  printer: byId<PrinterId>(site.printers),
  section: byId<SectionId>(site.menu.sections),
  item: byId<ItemId>(site.menu.items),
  option: byId<OptionId>(site.menu.options),
  till: byId<TillId>(site.tills),
  area: byId<AreaId>(site.areas),
});

export type Names = ReturnType<typeof namesOf>;

/** "Grill", "Grill and Larder", "Grill, Larder and Sauce". */
export const listed = (words: readonly string[], last = 'and'): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} ${last} ${words.at(-1) ?? ''}`;
