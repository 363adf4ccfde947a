import 'server-only';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { QueueRow } from '@/models/queue';
import { TillRow } from '@/models/till';
import type { PrintedTestInput } from '../schema';
import { readPrinter } from '@/lib/server/devices-of-site';

/** Notes that a test sent from a till came out of a printer, or takes that back. */
export const recordTest = (actor: Actor, { printer: id, till: tillId, printed }: PrintedTestInput & { readonly printer: string }, now = new Date()): Promise<{ readonly id: string }> =>
  actIn(actor, 'printer.test', async (transaction) => {
    const { siteId } = actor;
    const { site, printer } = await readPrinter(transaction, siteId, id);
    const till = site.tills.find((one) => one.id === tillId);
    const [count] = await QueueRow.update({ testPrintedAt: printed ? now : null }, { where: { siteId, tillId, printerId: id }, transaction });
    if (till === undefined || count === 0) throw new AppError('conflict', `${till?.name ?? 'This till'} does not have ${printer.name}, so no test can have come from there. Install it on the till first. Nothing was changed.`);
    await TillRow.increment('version', { where: { siteId, id: tillId }, transaction });
    await recordChange(transaction, {
      siteId, personId: actor.person.id, action: printed ? 'test.printed' : 'test.taken-back', subjectKind: 'printer', subjectId: id,
      summary: printed ? `A test from ${till.name} printed on ${printer.name}` : `The test from ${till.name} on ${printer.name} no longer counts`,
    });
    return { id };
  });
