import { dependentsOfArea, dependentsOfTill, type Dependents } from '@/lib/domain/checks/dependents';
import type { DraftSite } from '@/lib/domain/checks/check-draft';
import { may, type Membership } from '@/lib/domain/roles/permissions';
import type { Area, SharedPoint, Site } from '@/lib/domain/site/site';
import type { Till } from '@/lib/domain/site/till';

/** Everything the panel of one till needs, as plain data; `till` is null for one that is being added. */
export type PanelView = {
  readonly siteId: string;
  readonly timeZone: string;
  readonly site: DraftSite;
  readonly areas: readonly Area[];
  readonly sharedPoints: readonly SharedPoint[];
  readonly till: Till | null;
  readonly dependents: Dependents;
  readonly mayWrite: boolean;
};

export const panelView = (site: Site, membership: Membership, till: Till | null): PanelView => ({
  siteId: site.id,
  timeZone: site.timeZone,
  site: { network: site.network, namingPolicy: site.namingPolicy, link: site.link, tills: site.tills, printers: site.printers, stations: site.stations },
  areas: site.areas,
  sharedPoints: site.sharedPoints,
  till,
  dependents: till === null ? { obstacles: [], consequences: [] } : dependentsOfTill(site, till.id),
  mayWrite: may(membership, 'till.write'),
});

/** Areas with how many tills stand in each, and what keeps them. */
export type AreasView = {
  readonly siteId: string;
  readonly mayWrite: boolean;
  readonly areas: readonly { readonly id: string; readonly name: string; readonly version: number; readonly tills: number; readonly dependents: Dependents }[];
};

export const areasView = (site: Site, membership: Membership): AreasView => ({
  siteId: site.id,
  mayWrite: may(membership, 'till.write'),
  areas: site.areas.map((area) => ({
    id: area.id, name: area.name, version: area.version,
    tills: site.tills.filter((till) => till.area === area.id).length,
    dependents: dependentsOfArea(site, area.id),
  })),
});
