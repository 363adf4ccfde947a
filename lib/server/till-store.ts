import 'server-only';
import type { Transaction } from 'sequelize';
import { queueTestStands } from '@/lib/domain/checks/test-stands';
import { sayTillChange } from '@/lib/domain/devices/till-differences';
import type { Site } from '@/lib/domain/site/site';
import type { Queue, Till } from '@/lib/domain/site/till';
import { QueueRow } from '@/models/queue';
import { TillRow } from '@/models/till';
import { TillOrderTypeRow } from '@/models/till-order-type';
import { TillSharedPointRow } from '@/models/till-shared-point';
import { isOneOf, refuseBroken, sameName } from './devices-of-site';
import { recordChange } from './history';
import { updateVersioned } from './versioned-update';

/** What the table itself holds of a till; its lists stand in tables of their own. */
export const tillValues = (till: Till) => ({
  name: till.name, kind: till.kind, areaId: till.area, system: till.system, address: till.address, mask: till.mask, addressSource: till.addressSource, adapter: till.adapter,
  defaultPrinterId: till.defaultPrinter, printsThroughId: till.kind === 'online' ? null : till.printsThrough,
});

/** A test stands only for the queue it came through; one that was just said to have printed is new. */
const keptTest = (queue: Queue, before: Queue | undefined): string | null => {
  const sameTest = before !== undefined && before.testPrintedAt === queue.testPrintedAt;
  return sameTest && !queueTestStands(before, queue) ? null : queue.testPrintedAt;
};

export const writeTillLists = async (transaction: Transaction, siteId: string, till: Till, before: Till | null): Promise<void> => {
  const where = { siteId, tillId: till.id };
  await TillOrderTypeRow.destroy({ where, transaction });
  await TillOrderTypeRow.bulkCreate([...new Set(till.orderTypes)].map((orderType) => ({ ...where, orderType })), { transaction });
  await TillSharedPointRow.destroy({ where, transaction });
  await TillSharedPointRow.bulkCreate([...new Set(till.sharedPoints)].map((sharedPointId) => ({ ...where, sharedPointId })), { transaction });
  await QueueRow.destroy({ where, transaction });
  await QueueRow.bulkCreate(till.queues.map((queue) => {
    const test = keptTest(queue, before?.queues.find((one) => one.printer === queue.printer));
    return { ...where, printerId: queue.printer, typedName: queue.typedName, portKind: queue.portKind, portAddress: queue.portAddress, testPrintedAt: test === null ? null : new Date(test) };
  }), { transaction });
};

export const tillMustFitSite = (site: Site, till: Till): void => refuseBroken([
  { field: 'name', reason: `Another till is called ${till.name} already.`, broken: site.tills.some((other) => other.id !== till.id && sameName(other.name, till.name)) },
  { field: 'area', reason: 'This area is no longer on the site. Choose another.', broken: !isOneOf(site.areas, till.area) },
  { field: 'printsThrough', reason: 'A till cannot print through itself. Choose another.', broken: till.printsThrough === till.id },
  { field: 'printsThrough', reason: 'This till is no longer on the site. Choose another.', broken: !isOneOf(site.tills, till.printsThrough) },
  { field: 'defaultPrinter', reason: 'This printer is no longer on the site. Choose another.', broken: !isOneOf(site.printers, till.defaultPrinter) },
  { field: 'sharedPoints', reason: 'One of these is no longer on the site. Choose again.', broken: !till.sharedPoints.every((point) => isOneOf(site.sharedPoints, point)) },
  { field: 'queues', reason: 'One of these printers is no longer on the site. Take its row out.', broken: !till.queues.every((queue) => isOneOf(site.printers, queue.printer)) },
]);

export type TillWrite = {
  readonly site: Site;
  readonly personId: string;
  readonly before: Till;
  readonly after: Till;
  /** The version the change was made from. */
  readonly version: number;
};

export const writeTill = async (transaction: Transaction, { site, personId, before, after, version }: TillWrite): Promise<{ readonly id: string; readonly version: number }> => {
  const siteId = site.id;
  if (before.version === version) tillMustFitSite(site, after);
  const row = await updateVersioned(TillRow, { siteId, id: before.id, version }, tillValues(after), transaction);
  await writeTillLists(transaction, siteId, after, before);
  await recordChange(transaction, { siteId, personId, action: 'till.updated', subjectKind: 'till', subjectId: before.id, summary: sayTillChange(before, after, site), before, after });
  return { id: before.id, version: row.version };
};
