import 'server-only';
import { asId } from '@/lib/domain/site/ids';
import type { Till } from '@/lib/domain/site/till';
import { actIn, type Actor } from '@/lib/server/actor';
import { readTill } from '@/lib/server/devices-of-site';
import { writeTill } from '@/lib/server/till-store';
import type { QueueInput } from '../schema';

type QueueKey = { readonly till: string; readonly printer: string };

const saveQueues = (actor: Actor, { till: id }: QueueKey, change: (till: Till) => Till['queues']): Promise<{ readonly version: number }> =>
  actIn(actor, 'till.write', async (transaction) => {
    const { site, till: before } = await readTill(transaction, actor.siteId, id);
    const after = { ...before, queues: change(before) };
    return writeTill(transaction, { site, personId: actor.person.id, before, after, version: before.version });
  });

/** Writes down one printer as it was found on a till. The newest look at the till is right, so no version is asked for. */
export const writeQueue = (actor: Actor, { input, ...key }: QueueKey & { readonly input: QueueInput }): Promise<{ readonly version: number }> =>
  saveQueues(actor, key, (till) => {
    const queue = { ...input, printer: asId<Till['queues'][number]['printer']>(key.printer) };
    return till.queues.some((one) => one.printer === key.printer) ? till.queues.map((one) => (one.printer === key.printer ? queue : one)) : [...till.queues, queue];
  });

/** Forgets a printer on a till, when it is no longer installed there. */
export const removeQueue = (actor: Actor, key: QueueKey): Promise<{ readonly version: number }> =>
  saveQueues(actor, key, (till) => till.queues.filter((one) => one.printer !== key.printer));
