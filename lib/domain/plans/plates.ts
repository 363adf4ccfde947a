import type { Finding, Fix } from '../findings/finding';
import type { AskReach } from '../reach/compile-reach';
import type { PrinterId, StationId } from '../site/ids';
import type { Printer } from '../site/printer';
import type { Site } from '../site/site';
import type { Station } from '../site/station';
import type { Till } from '../site/till';
import { listWords } from './words';

export type PlateTag = { readonly words: string; readonly tone: 'calm' | 'look' | 'hot' };

/** The printer at the end of a rail: how it is, and what is wrong with its name or address. */
export type Plate = {
  readonly printer: PrinterId;
  readonly name: string;
  /** Its address, or how it is plugged in. */
  readonly where: string;
  readonly tag: PlateTag;
  /** "Backup SAUCE1", "No backup". */
  readonly quiet: string;
  /** The worst thing a check says of its name or address. */
  readonly wrong: { readonly words: string; readonly fix: Fix | null } | null;
  /** Version of its row, which a fix is made on. */
  readonly version: number;
};

export type StationPlates = { readonly station: StationId; readonly plates: readonly Plate[] };

const tested: readonly Printer['stage'][] = ['tested', 'signed-off'];
const addressFields: readonly string[] = ['address', 'mask', 'gateway', 'port', 'presentAddress'];

/** What stops comes before what a person should look at; a printer that is down comes before both. */
const tagOf = (printer: Printer, wrong: Finding | undefined): PlateTag => {
  if (printer.downSince !== null) return { words: 'Down', tone: 'hot' };
  if (wrong?.severity === 'stop') {
    const about = wrong.subject.field !== undefined && addressFields.includes(wrong.subject.field) ? 'Fix address' : 'Fix name';
    return { words: about, tone: 'hot' };
  }
  return tested.includes(printer.stage) ? { words: 'Printing', tone: 'calm' } : { words: 'Not tested', tone: 'look' };
};

const whereOf = (printer: Printer, site: Site): string => {
  if (printer.connection === 'network') return printer.address === '' ? 'no address yet' : printer.address;
  const host = site.tills.find((till) => till.id === printer.hostTill)?.name ?? 'no till yet';
  return `${printer.connection === 'usb' ? 'USB' : printer.connection} on ${host}`;
};

const quietOf = (printer: Printer, site: Site): string => {
  if (printer.downSince !== null && printer.downReason !== '') return printer.downReason;
  const backup = site.printers.find((candidate) => candidate.id === printer.backup);
  return backup === undefined ? 'No backup' : `Backup ${backup.name}`;
};

/** Findings about the printer itself; what only one till has wrong is shown with that till. */
const wrongOf = (printer: Printer, findings: readonly Finding[]): Finding | undefined =>
  findings
    .filter((finding) => finding.subject.kind === 'printer' && finding.subject.id === printer.id && finding.subject.field !== undefined && finding.severity === 'stop')[0];

const plateOf = (printer: Printer, site: Site, quiet: string, findings: readonly Finding[]): Plate => {
  const wrong = wrongOf(printer, findings);
  return {
    printer: printer.id,
    name: printer.name,
    where: whereOf(printer, site),
    tag: tagOf(printer, wrong),
    quiet,
    wrong: wrong === undefined ? null : { words: wrong.title, fix: wrong.fixes[0] ?? null },
    version: printer.version,
  };
};

/** For each till, the first of the station's printers that it reaches: where its tickets come out when all is well. */
const firstPrinters = (site: Site, station: Station, ask: AskReach): ReadonlyMap<PrinterId, readonly Till[]> => {
  const byPrinter = new Map<PrinterId, Till[]>();
  for (const till of site.tills) {
    const first = station.printers.find((printer) => ask(till.id, printer).reaches);
    if (first !== undefined) byPrinter.set(first, [...(byPrinter.get(first) ?? []), till]);
  }
  return byPrinter;
};

/** "Terrace" when every till of the area is among them, else the tills' own names. */
const sayTills = (site: Site, tills: readonly Till[]): string => {
  const whole = site.areas.filter((area) => {
    const inArea = site.tills.filter((till) => till.area === area.id);
    return inArea.length > 0 && inArea.every((till) => tills.includes(till));
  });
  const rest = tills.filter((till) => !whole.some((area) => area.id === till.area));
  return listWords([...whole.map((area) => area.name), ...rest.map((till) => till.name)]);
};

/**
 * The plates of one station: the printer that most tills print on, then the others in the order they are tried, each
 * saying whose tickets come out there first.
 */
export const platesOf = (site: Site, station: Station, findings: readonly Finding[], ask: AskReach): readonly Plate[] => {
  const firsts = firstPrinters(site, station, ask);
  const count = (printer: PrinterId): number => firsts.get(printer)?.length ?? 0;
  const printers = station.printers.flatMap((id) => site.printers.filter((printer) => printer.id === id));
  const [main] = printers.toSorted((left, right) => count(right.id) - count(left.id));
  if (main === undefined) return [];
  const others = printers.filter((printer) => printer !== main);
  return [
    plateOf(main, site, quietOf(main, site), findings),
    ...others.map((printer) => {
      const first = sayTills(site, firsts.get(printer.id) ?? []);
      return plateOf(printer, site, first === '' ? `Only when ${main.name} is out` : `First for ${first}`, findings);
    }),
  ];
};

/** "Stand-in Sauce", "No stand-in"; a station that is closed says so first. */
export const standInWords = (station: Station, site: Site): string => {
  const standIn = site.stations.find((candidate) => candidate.id === station.standIn)?.name;
  if (station.open) return standIn === undefined ? 'No stand-in' : `Stand-in ${standIn}`;
  return standIn === undefined ? 'Closed, no stand-in' : `Closed, stand-in ${standIn}`;
};
