import 'server-only';
import { dependentsOfTill } from '@/lib/domain/checks/dependents';
import { asId } from '@/lib/domain/site/ids';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { readTill } from '@/lib/server/devices-of-site';
import { recordChange } from '@/lib/server/history';
import { deleteVersioned } from '@/lib/server/versioned-update';
import { TillRow } from '@/models/till';

/** Takes a till off the list, with its queues; refused while rules, printers, other tills or the link need it. */
export const deleteTill = (actor: Actor, { till: id, version }: { readonly till: string; readonly version: number }): Promise<{ readonly id: string }> =>
  actIn(actor, 'till.write', async (transaction) => {
    const { siteId } = actor;
    const { site, till } = await readTill(transaction, siteId, id);
    const { obstacles } = dependentsOfTill(site, asId(id));
    if (obstacles.length > 0) throw new AppError('conflict', `${till.name} has to stay for now. ${obstacles.join(' ')}`);
    await deleteVersioned(TillRow, { siteId, id, version }, transaction);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'till.deleted', subjectKind: 'till', subjectId: id, summary: `${till.name} taken off the list`, before: till });
    return { id };
  });
