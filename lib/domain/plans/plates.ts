import type { Finding, Fix } from '../findings/finding';
import type { PrinterId, StationId } from '../site/ids';
import type { Printer } from '../site/printer';
import type { Site } from '../site/site';
import type { Station } from '../site/station';
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

const plateOf = (printer: Printer, site: Site, findings: readonly Finding[]): Plate => {
  const wrong = wrongOf(printer, findings);
  return {
    printer: printer.id,
    name: printer.name,
    where: whereOf(printer, site),
    tag: tagOf(printer, wrong),
    quiet: quietOf(printer, site),
    wrong: wrong === undefined ? null : { words: wrong.title, fix: wrong.fixes[0] ?? null },
    version: printer.version,
  };
};

/** The plates of one station, in the order its printers are tried. */
export const platesOf = (site: Site, station: Station, findings: readonly Finding[]): readonly Plate[] =>
  station.printers.flatMap((id) => {
    const printer = site.printers.find((candidate) => candidate.id === id);
    return printer === undefined ? [] : [plateOf(printer, site, findings)];
  });

/** "Stand-in Sauce", "No stand-in"; a station that is closed says so first. */
export const standInWords = (station: Station, site: Site): string => {
  const standIn = site.stations.find((candidate) => candidate.id === station.standIn)?.name;
  return listWords([station.open ? '' : 'Closed', standIn === undefined ? 'No stand-in' : `Stand-in ${standIn}`].filter((words) => words !== ''));
};
