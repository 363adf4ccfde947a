import type { Finding, Fix } from '../findings/finding';
import type { WayClass } from '../proof/way';
import { findSender } from '../reach/senders';
import type { PrinterId, TillId } from '../site/ids';
import type { PlanContent } from '../site/plan';
import type { Printer } from '../site/printer';
import type { Site } from '../site/site';
import type { Till } from '../site/till';
import { printersInUse } from './printers-in-use';
import { directPort } from './queue-findings';

type Need = 'prints' | 'takes-over';

/** For each till that sends by itself, the printers that it needs a queue for; a handheld's need is its till's. */
const neededQueues = (site: Site, plan: PlanContent, classes?: readonly WayClass[]): ReadonlyMap<TillId, ReadonlyMap<PrinterId, Need>> => {
  const needed = new Map<TillId, Map<PrinterId, Need>>();
  const inUse = printersInUse(site, plan, classes);
  for (const till of site.tills) {
    const use = inUse.get(till.id);
    // The print link carries an online channel's tickets itself and needs no queue.
    const sender = till.kind === 'online' ? null : findSender(site, till, new Set());
    if (use === undefined || sender === null || sender.kind !== 'till') continue;
    const ofSender = needed.get(sender.till.id) ?? new Map<PrinterId, Need>();
    for (const printer of use.takesOver) if (!ofSender.has(printer)) ofSender.set(printer, 'takes-over');
    for (const printer of use.prints) ofSender.set(printer, 'prints');
    needed.set(sender.till.id, ofSender);
  }
  return needed;
};

const addQueue = (till: Till, printer: Printer): readonly Fix[] => {
  const port = directPort(printer, till);
  return port === null ? [] : [{ kind: 'add-queue', till: till.id, printer: printer.id, name: printer.name, ...port, label: `${till.name} has ${printer.name} now` }];
};

/** Printers that a plan prints on from a till that does not have them: stop; those that only take over: check. */
export const missingQueueFindings = (site: Site, plan: PlanContent, classes?: readonly WayClass[]): readonly Finding[] =>
  [...neededQueues(site, plan, classes)].flatMap(([tillId, printers]) => {
    const till = site.tills.find((one) => one.id === tillId);
    if (till === undefined) return [];
    const installed = new Set(till.queues.map((queue) => queue.printer));
    return site.printers.filter((printer) => printers.has(printer.id) && !installed.has(printer.id)).map((printer): Finding => {
      const prints = printers.get(printer.id) === 'prints';
      return {
        code: prints ? 'queue-missing' : 'queue-missing-backup', severity: prints ? 'stop' : 'check',
        subject: { kind: 'queue', id: printer.id, till: till.id, field: 'queues' },
        title: `${till.name} does not have ${printer.name}`,
        message: prints
          ? `The plan prints there from this till, and the till knows no printer of that name. Install it, typed ${printer.name}, then say so here.`
          : `It takes over when another printer stops, and then this till could not print there. Install it, typed ${printer.name}, then say so here.`,
        fixes: addQueue(till, printer),
      };
    });
  });
