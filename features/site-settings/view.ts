import type { DraftSite } from '@/lib/domain/checks/check-draft';
import type { Site } from '@/lib/domain/site/site';
import { partOf } from './facts';
import type { Part, Values } from './schema';

/** What the forms check against, without the menu and the plans. */
export type SettingsSite = DraftSite & Pick<Site, 'id'>;

/** One part as its form needs it: plain data. */
export type PartView<Of extends Part = Part> = { readonly part: Of; readonly site: SettingsSite; readonly version: number; readonly values: Values<Of> };

export const partView = <Of extends Part>(part: Of, site: Site): PartView<Of> => ({
  part,
  site: { id: site.id, network: site.network, namingPolicy: site.namingPolicy, link: site.link, tills: site.tills, printers: site.printers, stations: site.stations },
  version: site.version,
  values: partOf(part, site),
});
