import type { Printer } from '../site/printer';
import type { Site } from '../site/site';
import { codePageWords, connectionWords, emphasisWords, stageWords } from './printer-words';

/** What a person writes down about a printer; being down is said elsewhere. */
export type PrinterField = Exclude<keyof Printer, 'id' | 'version' | 'downSince' | 'downReason'>;

export const printerFieldWords: Readonly<Record<PrinterField, string>> = {
  name: 'Printer name', model: 'Model', serial: 'Serial number', connection: 'Connection', hostTill: 'Plugged into', address: 'Address', mask: 'Mask', gateway: 'Gateway', port: 'Port',
  mac: 'MAC address', presentAddress: 'Answers now at', rollWidthMm: 'Roll', columns: 'Characters on a line', codePage: 'Code page', emphasis: 'Allergies stand out by', cutter: 'Cutter', buzzer: 'Buzzer',
  backup: 'Backup', joinsStations: 'One ticket for all its stations', sharedPoints: 'Hangs on', stage: 'Stage',
};

export type PrinterNaming = Pick<Site, 'tills' | 'printers' | 'sharedPoints'>;
export type PrinterDifference = { readonly field: PrinterField; readonly label: string; readonly from: string; readonly to: string };

const nameIn = (rows: readonly { readonly id: string; readonly name: string }[], id: string | null): string =>
  (id === null ? 'none' : rows.find((row) => row.id === id)?.name ?? 'one that is gone');

const sayValue = (printer: Printer, field: PrinterField, naming: PrinterNaming): string => {
  switch (field) {
    case 'connection': return connectionWords[printer.connection];
    case 'hostTill': return nameIn(naming.tills, printer.hostTill);
    case 'backup': return nameIn(naming.printers, printer.backup);
    case 'sharedPoints': return printer.sharedPoints.map((point) => nameIn(naming.sharedPoints, point)).join(', ') || 'nothing';
    case 'rollWidthMm': return `${printer.rollWidthMm} mm`;
    case 'codePage': return codePageWords[printer.codePage];
    case 'emphasis': return emphasisWords[printer.emphasis];
    case 'stage': return stageWords[printer.stage];
    case 'cutter': case 'buzzer': case 'joinsStations': return printer[field] ? 'yes' : 'no';
    default: return String(printer[field]) || 'nothing';
  }
};

/** Every field of a printer in words, for somebody who only reads. */
export const printerFacts = (printer: Printer, naming: PrinterNaming): readonly { readonly label: string; readonly value: string }[] =>
  (Object.keys(printerFieldWords) as PrinterField[]).map((field) => ({ label: printerFieldWords[field], value: sayValue(printer, field, naming) }));

const sameValue = (left: unknown, right: unknown): boolean =>
  Array.isArray(left) && Array.isArray(right) ? left.toSorted().join('\n') === right.toSorted().join('\n') : left === right;

/** What differs between two states of one printer, in words. */
export const printerDifferences = (from: Printer, to: Printer, naming: PrinterNaming): readonly PrinterDifference[] =>
  (Object.keys(printerFieldWords) as (PrinterField)[])
    .filter((field) => !sameValue(from[field], to[field]))
    .map((field) => ({ field, label: printerFieldWords[field], from: sayValue(from, field, naming), to: sayValue(to, field, naming) }));

/** One line of history: "LARDER 1 renamed to LARDER1", "GRILL1: address 10.20.30.201 to 10.20.30.211". */
export const sayPrinterChange = (from: Printer, to: Printer, naming: PrinterNaming): string => {
  const differences = printerDifferences(from, to, naming);
  const [only] = differences;
  if (only === undefined) return `${to.name} saved without a change`;
  if (differences.length === 1 && only.field === 'name') return `${from.name} renamed to ${to.name}`;
  return `${to.name}: ${differences.map(({ label, from: was, to: now }) => `${label.toLowerCase().replace('mac', 'MAC')} ${was} to ${now}`).join(', ')}`;
};
