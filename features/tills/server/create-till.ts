import 'server-only';
import { randomUUID } from 'node:crypto';
import { actIn, type Actor } from '@/lib/server/actor';
import { readSite } from '@/lib/server/devices-of-site';
import { recordChange } from '@/lib/server/history';
import { tillMustFitSite, tillValues, writeTillLists } from '@/lib/server/till-store';
import { TillRow } from '@/models/till';
import type { TillInput } from '../schema';
import { tillOfInput } from '../till-of-input';

/** Writes down a till, last in the site's list. */
export const createTill = (actor: Actor, input: TillInput): Promise<{ readonly id: string; readonly version: number }> =>
  actIn(actor, 'till.write', async (transaction) => {
    const { siteId } = actor;
    const site = await readSite(transaction, siteId);
    const id = randomUUID();
    const till = tillOfInput(input, id, 1);
    tillMustFitSite(site, till);
    const position = Number((await TillRow.max('position', { where: { siteId }, transaction })) ?? -1) + 1;
    await TillRow.create({ ...tillValues(till), id, siteId, position }, { transaction });
    await writeTillLists(transaction, siteId, till, null);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'till.added', subjectKind: 'till', subjectId: id, summary: `${till.name} added`, after: till });
    return { id, version: 1 };
  });
