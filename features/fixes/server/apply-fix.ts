import 'server-only';
import type { Transaction } from 'sequelize';
import { fixPermissions } from '@/lib/domain/findings/fix-permissions';
import type { Till } from '@/lib/domain/site/till';
import { actIn, type Actor } from '@/lib/server/actor';
import type { RowFix } from '../row-fix';
import { changeNetwork, changeStandIn, reserveAddress } from './change-site';
import { changePrinter, changeTill } from './change-device';

type Applied = { readonly done: string };

const retyped = ({ printer, name }: { readonly printer: string; readonly name: string }) => (till: Till): Till => ({
  ...till, queues: till.queues.map((queue) => (queue.printer === printer ? { ...queue, typedName: name } : queue)),
});

const apply = async (transaction: Transaction, actor: Actor, fix: RowFix): Promise<void> => {
  const by = { siteId: actor.siteId, personId: actor.person.id };
  switch (fix.kind) {
    case 'rename-printer': return changePrinter(transaction, by, fix.printer, (printer) => ({ ...printer, name: fix.name }));
    case 'set-printer-address': return changePrinter(transaction, by, fix.printer, (printer) => ({ ...printer, address: fix.address }));
    case 'set-printer-mask': return changePrinter(transaction, by, fix.printer, (printer) => ({ ...printer, mask: fix.mask }));
    case 'set-printer-gateway': return changePrinter(transaction, by, fix.printer, (printer) => ({ ...printer, gateway: fix.gateway }));
    case 'set-printer-port': return changePrinter(transaction, by, fix.printer, (printer) => ({ ...printer, port: fix.port }));
    case 'set-printer-mac': return changePrinter(transaction, by, fix.printer, (printer) => ({ ...printer, mac: fix.mac }));
    case 'set-backup': return changePrinter(transaction, by, fix.printer, (printer) => ({ ...printer, backup: fix.backup as typeof printer.backup }));
    case 'set-till-address': return changeTill(transaction, by, fix.till, (till) => ({ ...till, address: fix.address }));
    case 'set-till-mask': return changeTill(transaction, by, fix.till, (till) => ({ ...till, mask: fix.mask }));
    case 'clear-prints-through': return changeTill(transaction, by, fix.till, (till) => ({ ...till, printsThrough: null }));
    case 'clear-default-printer': return changeTill(transaction, by, fix.till, (till) => ({ ...till, defaultPrinter: null }));
    case 'rename-queue': return changeTill(transaction, by, fix.till, retyped(fix));
    case 'rename-queues': {
      for (const till of fix.tills) await changeTill(transaction, by, till, retyped(fix));
      return;
    }
    case 'set-queue-port': return changeTill(transaction, by, fix.till, (till) => ({
      ...till, queues: till.queues.map((queue) => (queue.printer === fix.printer ? { ...queue, portKind: fix.portKind, portAddress: fix.portAddress } : queue)),
    }));
    case 'add-queue': return changeTill(transaction, by, fix.till, (till) => (till.queues.some((queue) => queue.printer === fix.printer) ? till : {
      ...till, queues: [...till.queues, { printer: fix.printer as typeof till.queues[number]['printer'], typedName: fix.name, portKind: fix.portKind, portAddress: fix.portAddress, testPrintedAt: null }],
    }));
    case 'reserve-address': return reserveAddress(transaction, by, fix.address, fix.reason);
    case 'set-network': return changeNetwork(transaction, by, fix.change);
    case 'set-link-address': return changeNetwork(transaction, by, { linkAddress: fix.address, linkMask: fix.mask });
    case 'set-stand-in': return changeStandIn(transaction, by, fix.station, fix.standIn);
  }
};

/**
 * Makes the one change a fix stands for, with the right that making it by hand takes. It changes the row as it is now:
 * a fix names one field, and whatever else was saved since stays.
 */
export const applyFix = (actor: Actor, fix: RowFix): Promise<Applied> =>
  actIn(actor, fixPermissions[fix.kind], async (transaction) => {
    await apply(transaction, actor, fix);
    return { done: fix.label };
  });
