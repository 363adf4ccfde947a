import { enumerateWays } from '../proof/enumerate-ways';
import type { WayClass } from '../proof/way';
import { printerChooser, printerPlaces } from '../routing/choose-printer';
import { reachesOf } from '../routing/routing';
import type { PrinterId, StationId, TillId } from '../site/ids';
import type { PlanContent } from '../site/plan';
import { allWell } from '../site/present';
import type { Site } from '../site/site';

/** The printers a plan sends a till's tickets to, and those that take over from there. */
export type PrintersInUse = { readonly prints: ReadonlySet<PrinterId>; readonly takesOver: ReadonlySet<PrinterId> };

const askedStations = (classes: readonly WayClass[]): ReadonlyMap<TillId, ReadonlySet<StationId>> => {
  const asked = new Map<TillId, Set<StationId>>();
  for (const one of classes) {
    const stations = asked.get(one.till) ?? new Set<StationId>();
    for (const ask of [one.cook, one.copies, ...one.splits]) for (const station of ask.stations) stations.add(station);
    asked.set(one.till, stations);
  }
  return asked;
};

/** With every station open and every printer up. `classes` when the caller has tried the plan already. */
export const printersInUse = (site: Site, plan: PlanContent, classes: readonly WayClass[] = enumerateWays(site, plan).classes): ReadonlyMap<TillId, PrintersInUse> => {
  const reaches = reachesOf(site, allWell);
  const { printerFor } = printerChooser(site, allWell, reaches);
  const backups = new Map(site.printers.map((printer) => [printer.id, printer.backup]));
  const places = new Map(site.stations.map((station) => [station.id, printerPlaces(station.printers, backups, new Map()).map((place) => place.printer)]));
  return new Map([...askedStations(classes)].map(([till, stations]) => {
    const prints = new Set([...stations].flatMap((station) => printerFor(station, till) ?? []));
    const takesOver = new Set([...stations].flatMap((station) => places.get(station) ?? []).filter((printer) => !prints.has(printer) && reaches(till, printer)));
    return [till, { prints, takesOver }];
  }));
};
