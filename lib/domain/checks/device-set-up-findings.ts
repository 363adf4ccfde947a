import type { Finding } from '../findings/finding';
import type { Printer } from '../site/printer';
import type { Site } from '../site/site';
import type { Till } from '../site/till';

type SetUpSite = Pick<Site, 'tills' | 'printers'>;

const cableWords = { network: 'network', usb: 'USB', serial: 'serial', parallel: 'parallel' } as const;

/** A printer on a cable hangs on one till, and prints only from there. */
export const hostFinding = (site: SetUpSite, printer: Printer): readonly Finding[] => {
  if (printer.connection === 'network') return [];
  const host = site.tills.find((till) => till.id === printer.hostTill);
  const subject = { kind: 'printer', id: printer.id, field: 'hostTill' } as const;
  const name = printer.name || 'This printer';
  if (host === undefined) {
    return [{
      code: 'host-missing', severity: 'stop', subject, fixes: [],
      title: `Nobody has said which till ${name} is plugged into`,
      message: `A ${cableWords[printer.connection]} printer prints only from the till at the other end of its cable.`,
    }];
  }
  return host.kind !== 'online' ? [] : [{
    code: 'host-online', severity: 'stop', subject, fixes: [],
    title: `${name} is plugged into ${host.name}, which is no device`,
    message: 'An online channel has no sockets. Name the till that the cable really goes to.',
  }];
};

/** Print tests are how anyone knows that a ticket comes out; a printer past that stage has had one. */
export const testFinding = (site: SetUpSite, printer: Printer): readonly Finding[] => {
  if (printer.stage === 'tested' || printer.stage === 'signed-off') return [];
  const printed = site.tills.some((till) => till.queues.some((queue) => queue.printer === printer.id && queue.testPrintedAt !== null));
  return printed ? [] : [{
    code: 'never-tested', severity: 'check', subject: { kind: 'printer', id: printer.id, field: 'stage' },
    title: `${printer.name} has never printed a test`,
    message: 'Until a ticket has come out of it, nobody knows that one will.',
    fixes: [{ kind: 'print-test', printer: printer.id, label: 'Print a test' }],
  }];
};

/** Tills that print through each other all print nowhere. */
export const circleFinding = (site: SetUpSite, till: Till): readonly Finding[] => {
  const names: string[] = [];
  const seen = new Set<string>();
  let at: Till | undefined = till;
  while (at !== undefined && at.kind !== 'online' && at.printsThrough !== null) {
    if (seen.has(at.id)) break;
    seen.add(at.id);
    names.push(at.name);
    const next: string = at.printsThrough;
    at = site.tills.find((one) => one.id === next);
  }
  if (at?.id !== till.id || names.length === 0) return [];
  return [{
    code: 'prints-through-circle', severity: 'stop', subject: { kind: 'till', id: till.id, field: 'printsThrough' },
    title: `${till.name} prints through itself`,
    message: names.length === 1 ? 'No device would send its tickets.' : `${[...names, till.name].join(' prints through ')}, so no device sends the tickets.`,
    fixes: [{ kind: 'clear-prints-through', till: till.id, label: `${till.name} prints by itself` }],
  }];
};
