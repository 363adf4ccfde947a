import type { Item, Option, OptionGroup, Section } from '../site/menu';
import type { Area, Site } from '../site/site';
import type { Station } from '../site/station';
import type { Till } from '../site/till';

/** What a plan is read against: names and who belongs where. Every `Site` is one; a browser gets no more than this. */
export type BoardSite = {
  readonly stations: readonly Pick<Station, 'id' | 'name' | 'code' | 'kind' | 'layout' | 'position'>[];
  readonly areas: readonly Pick<Area, 'id' | 'name'>[];
  readonly tills: readonly Pick<Till, 'id' | 'name' | 'area'>[];
  readonly menu: {
    readonly sections: readonly Pick<Section, 'id' | 'name'>[];
    readonly items: readonly Pick<Item, 'id' | 'section' | 'name' | 'noTicket' | 'optionGroups'>[];
    readonly optionGroups: readonly Pick<OptionGroup, 'id' | 'name' | 'options'>[];
    readonly options: readonly Pick<Option, 'id' | 'name'>[];
  };
};

export type BoardStation = BoardSite['stations'][number];
export type BoardItem = BoardSite['menu']['items'][number];

/** Leaves out what the board does not read, so that a menu of thousands stays a small page. */
export const boardSiteOf = (site: Site): BoardSite => ({
  stations: site.stations.map(({ id, name, code, kind, layout, position }) => ({ id, name, code, kind, layout, position })),
  areas: site.areas.map(({ id, name }) => ({ id, name })),
  tills: site.tills.map(({ id, name, area }) => ({ id, name, area })),
  menu: {
    sections: site.menu.sections.map(({ id, name }) => ({ id, name })),
    items: site.menu.items.map(({ id, section, name, noTicket, optionGroups }) => ({ id, section, name, noTicket, optionGroups })),
    optionGroups: site.menu.optionGroups.map(({ id, name, options }) => ({ id, name, options })),
    options: site.menu.options.map(({ id, name }) => ({ id, name })),
  },
});
