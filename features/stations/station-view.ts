import type { Dependents } from '@/lib/domain/checks/dependents';
import type { Printer } from '@/lib/domain/site/printer';
import type { Site } from '@/lib/domain/site/site';
import type { Station } from '@/lib/domain/site/station';
import { dependentsOfStation } from '@/lib/domain/stations/dependents-of-station';

export type PrinterChoice = {
  readonly id: Printer['id'];
  readonly name: string;
  /** Its address, or the till it hangs on; that it is down comes first. */
  readonly where: string;
};

/** What the panel of one station needs, as plain data; `station` is null for one that is being added. */
export type StationView = {
  readonly siteId: string;
  readonly station: Station | null;
  readonly stations: readonly Station[];
  readonly printers: readonly PrinterChoice[];
  readonly dependents: Dependents;
  readonly mayWrite: boolean;
};

const whereOf = (printer: Printer, site: Site): string => {
  const host = site.tills.find((till) => till.id === printer.hostTill)?.name;
  const place = printer.connection === 'network' ? printer.address || 'no address yet' : `on ${host ?? 'no till yet'}`;
  return printer.downSince === null ? place : `down, ${place}`;
};

export const viewStation = (site: Site, station: Station | null, mayWrite: boolean): StationView => ({
  siteId: site.id,
  station,
  stations: site.stations,
  printers: site.printers.map((printer) => ({ id: printer.id, name: printer.name, where: whereOf(printer, site) })),
  dependents: station === null ? { obstacles: [], consequences: [] } : dependentsOfStation(site, station.id),
  mayWrite,
});
