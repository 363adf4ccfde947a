import type { Site } from '../site/site';
import type { Queue, Till } from '../site/till';
import { kindWords, orderTypeLabels, portWords, sourceWords, systemWords } from './till-words';

export type TillField = Exclude<keyof Till, 'id' | 'version'>;

export const tillFieldWords: Readonly<Record<TillField, string>> = {
  name: 'Name', kind: 'Kind', area: 'Area', orderTypes: 'Sends orders', system: 'System', address: 'Address', mask: 'Mask', addressSource: 'Address comes', adapter: 'Wired adapter',
  sharedPoints: 'Hangs on', defaultPrinter: 'Default printer', printsThrough: 'Prints through', queues: 'Printers',
};

export type TillNaming = Pick<Site, 'areas' | 'tills' | 'printers' | 'sharedPoints'>;
export type TillDifference = { readonly field: TillField; readonly label: string; readonly from: string; readonly to: string };

const nameIn = (rows: readonly { readonly id: string; readonly name: string }[], id: string | null): string =>
  (id === null ? 'none' : rows.find((row) => row.id === id)?.name ?? 'one that is gone');

const sayQueue = (queue: Queue, naming: TillNaming): string =>
  `${nameIn(naming.printers, queue.printer)} typed ${queue.typedName || 'nothing'} on ${portWords[queue.portKind].toLowerCase()} ${queue.portAddress}${queue.testPrintedAt === null ? '' : ', tested'}`.trim();

const sayValue = (till: Till, field: TillField, naming: TillNaming): string => {
  switch (field) {
    case 'kind': return kindWords[till.kind];
    case 'area': return nameIn(naming.areas, till.area);
    case 'orderTypes': return till.orderTypes.map((type) => orderTypeLabels[type].toLowerCase()).join(', ');
    case 'system': return systemWords[till.system];
    case 'addressSource': return sourceWords[till.addressSource].toLowerCase();
    case 'sharedPoints': return till.sharedPoints.map((point) => nameIn(naming.sharedPoints, point)).join(', ') || 'nothing';
    case 'defaultPrinter': return nameIn(naming.printers, till.defaultPrinter);
    case 'printsThrough': return till.printsThrough === null ? 'itself' : nameIn(naming.tills, till.printsThrough);
    case 'queues': return till.queues.map((queue) => sayQueue(queue, naming)).join('; ') || 'none';
    default: return till[field] || 'nothing';
  }
};

/** Every field of a till in words, for somebody who only reads. */
export const tillFacts = (till: Till, naming: TillNaming): readonly { readonly label: string; readonly value: string }[] =>
  (Object.keys(tillFieldWords) as TillField[]).map((field) => ({ label: tillFieldWords[field], value: sayValue(till, field, naming) }));

/** Rows and lists count as equal in any order: nobody sorts the printers of a till on purpose. */
const comparable = (till: Till, field: TillField): string => {
  const value = till[field];
  return Array.isArray(value) ? (value as readonly unknown[]).map((one) => JSON.stringify(one)).toSorted().join('\n') : JSON.stringify(value);
};

/** What differs between two states of one till, in words. */
export const tillDifferences = (from: Till, to: Till, naming: TillNaming): readonly TillDifference[] =>
  (Object.keys(tillFieldWords) as TillField[])
    .filter((field) => comparable(from, field) !== comparable(to, field))
    .map((field) => ({ field, label: tillFieldWords[field], from: sayValue(from, field, naming), to: sayValue(to, field, naming) }));

const sayQueueChanges = (from: Till, to: Till, naming: TillNaming): readonly string[] => {
  const name = (queue: Queue): string => nameIn(naming.printers, queue.printer);
  const before = new Map(from.queues.map((queue) => [queue.printer, queue]));
  const after = new Set(to.queues.map((queue) => queue.printer));
  return [
    ...to.queues.filter((queue) => !before.has(queue.printer)).map((queue) => `${name(queue)} installed`),
    ...from.queues.filter((queue) => !after.has(queue.printer)).map((queue) => `${name(queue)} taken off`),
    ...to.queues.flatMap((queue) => {
      const was = before.get(queue.printer);
      return was === undefined || JSON.stringify(was) === JSON.stringify(queue) ? [] : [sayQueue(queue, naming)];
    }),
  ];
};

/** One line of history: "Till 1: address 10.20.30.61 to 10.20.30.71, PASS1 installed". */
export const sayTillChange = (from: Till, to: Till, naming: TillNaming): string => {
  const parts = tillDifferences(from, to, naming).flatMap(({ field, label, from: was, to: now }) =>
    (field === 'queues' ? sayQueueChanges(from, to, naming) : [`${label.toLowerCase()} ${was} to ${now}`]));
  return parts.length === 0 ? `${to.name} saved without a change` : `${to.name}: ${parts.join(', ')}`;
};
