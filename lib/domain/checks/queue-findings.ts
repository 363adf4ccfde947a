import { readAddress } from '../addresses/read-address';
import type { Finding, Fix, Subject } from '../findings/finding';
import { visibleName } from '../names/check-printer-name';
import type { Printer } from '../site/printer';
import type { Site } from '../site/site';
import type { Queue, Till } from '../site/till';

export type QueueSite = Pick<Site, 'printers' | 'tills'>;

type Judged = {
  readonly till: Till;
  readonly printer: Printer;
  readonly queue: Queue;
  readonly host: Till | undefined;
  readonly subject: Subject;
  readonly direct: readonly Fix[];
  /** Every till on which this printer is typed in the same wrong way, this one included. */
  readonly alsoTyped: readonly string[];
};

type QueueRule = {
  readonly code: string;
  readonly severity: 'stop' | 'check';
  readonly field: 'typedName' | 'portKind' | 'portAddress';
  readonly applies: (judged: Judged) => boolean;
  readonly title: (judged: Judged) => string;
  readonly message: (judged: Judged) => string;
  readonly fixes: (judged: Judged) => readonly Fix[];
};

/** What a queue that leads straight to the printer looks like on this till; null when the till has no way of its own. */
export const directPort = (printer: Printer, till: Pick<Till, 'id'>): { readonly portKind: Queue['portKind']; readonly portAddress: string } | null => {
  if (printer.connection === 'network') return readAddress(printer.address) === null ? null : { portKind: 'tcp', portAddress: `${printer.address}:${printer.port}` };
  if (printer.hostTill !== till.id || printer.connection === 'serial') return null;
  return { portKind: printer.connection, portAddress: printer.connection === 'usb' ? 'USB001' : 'LPT1:' };
};

const directFixes = (printer: Printer, till: Till): readonly Fix[] => {
  const port = directPort(printer, till);
  return port === null ? [] : [{
    kind: 'set-queue-port', till: till.id, printer: printer.id, ...port,
    label: port.portKind === 'tcp' ? `It goes to ${port.portAddress} now` : `It goes to ${port.portAddress} of ${till.name} now`,
  }];
};

const fourParts = /(?<![\d.])(\d{1,3}(?:\.\d{1,3}){3})(?![\d.])(?::(\d{1,5}))?/;

/** The address in a port as found ("IP_10.20.30.201", "socket://10.20.30.201:9100"), when there is one. */
export const addressInPort = (portAddress: string): { readonly address: string; readonly port: number | null } | null => {
  const match = fourParts.exec(portAddress);
  return match?.[1] === undefined ? null : { address: match[1], port: match[2] === undefined ? null : Number(match[2]) };
};

const leadsElsewhere = ({ queue, printer }: Judged): boolean => {
  if (queue.portKind !== 'tcp' || printer.connection !== 'network' || readAddress(printer.address) === null) return false;
  const found = addressInPort(queue.portAddress);
  return found !== null && (found.address !== printer.address || (found.port !== null && found.port !== printer.port));
};

const rules: readonly QueueRule[] = [
  {
    code: 'queue-typed-differently', severity: 'stop', field: 'typedName',
    applies: ({ queue, printer }) => queue.typedName !== printer.name,
    title: ({ till, printer, queue }) => `On ${till.name}, ${printer.name} is typed ${queue.typedName === '' ? 'with no name' : visibleName(queue.typedName)}`,
    message: ({ printer }) => `The name must be the same on every till, letter for letter. Type ${printer.name} there, then say so here.`,
    fixes: ({ till, printer, alsoTyped }) => [
      { kind: 'rename-queue', till: till.id, printer: printer.id, name: printer.name, label: `It reads ${printer.name} now` },
      ...(alsoTyped.length < 2 ? [] : [{ kind: 'rename-queues' as const, tills: alsoTyped, printer: printer.id, name: printer.name, label: `All ${alsoTyped.length} tills read ${printer.name} now` }]),
    ],
  },
  {
    code: 'queue-parallel-nothing', severity: 'stop', field: 'portKind',
    applies: ({ queue, printer, till }) => queue.portKind === 'parallel' && !(printer.connection === 'parallel' && printer.hostTill === till.id),
    title: ({ till, printer }) => `On ${till.name}, ${printer.name} goes to a parallel port`,
    message: () => 'Driver installers often pick one by themselves. Nothing is plugged in there, so tickets wait for ever.',
    fixes: ({ direct }) => direct,
  },
  {
    code: 'queue-port-elsewhere', severity: 'stop', field: 'portAddress',
    applies: leadsElsewhere,
    title: ({ till, printer, queue }) => `On ${till.name}, ${printer.name} goes to ${addressInPort(queue.portAddress)?.address ?? queue.portAddress}${wrongPortOnly(queue, printer)}`,
    message: ({ printer }) => `${printer.name} is at ${printer.address}, port ${printer.port}, so its tickets come out elsewhere or nowhere.`,
    fixes: ({ direct }) => direct,
  },
  {
    code: 'queue-shared', severity: 'check', field: 'portKind',
    applies: ({ queue }) => queue.portKind === 'shared',
    title: ({ till, printer, host }) => `On ${till.name}, ${printer.name} prints through ${host === undefined ? 'another computer' : host.name}`,
    message: ({ host }) => `A shared printer cannot have the same name everywhere, and it stops when ${host === undefined ? 'that computer' : host.name} is off.`,
    fixes: ({ direct }) => direct,
  },
];

const wrongPortOnly = (queue: Queue, printer: Printer): string => {
  const found = addressInPort(queue.portAddress);
  return found !== null && found.address === printer.address && found.port !== null ? `, port ${found.port}` : '';
};

const tillsTyping = (site: QueueSite, { printer, typedName }: Queue): readonly string[] =>
  site.tills.filter((till) => till.queues.some((queue) => queue.printer === printer && queue.typedName === typedName)).map((till) => till.id);

/** What is wrong with the queues as they are installed on one till. `field` says where in the till's form. */
export const queueFindings = (site: QueueSite, till: Till): readonly Finding[] =>
  till.queues.flatMap((queue, index) => {
    const printer = site.printers.find((one) => one.id === queue.printer);
    if (printer === undefined) return [];
    const host = site.tills.find((one) => one.id === printer.hostTill && printer.connection !== 'network');
    const judged: Judged = { till, printer, queue, host, subject: { kind: 'queue', id: printer.id, till: till.id }, direct: directFixes(printer, till), alsoTyped: tillsTyping(site, queue) };
    return rules.filter((rule) => rule.applies(judged)).map((rule): Finding => ({
      code: rule.code, severity: rule.severity, subject: { ...judged.subject, field: `queues.${index}.${rule.field}` },
      title: rule.title(judged), message: rule.message(judged), fixes: rule.fixes(judged),
    }));
  });

/** A ticket printer as the default of a till's system. */
export const defaultPrinterFinding = (site: QueueSite, till: Till): readonly Finding[] => {
  const printer = site.printers.find((one) => one.id === till.defaultPrinter);
  return printer === undefined ? [] : [{
    code: 'till-default-printer', severity: 'check', subject: { kind: 'till', id: till.id, field: 'defaultPrinter' },
    title: `${printer.name} is the default printer of ${till.name}`,
    message: 'Reports and web pages printed there without choosing come out in the kitchen.',
    fixes: [{ kind: 'clear-default-printer', till: till.id, label: `${till.name} has no default printer now` }],
  }];
};
