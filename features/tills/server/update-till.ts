import 'server-only';
import { actIn, type Actor } from '@/lib/server/actor';
import { readTill } from '@/lib/server/devices-of-site';
import { writeTill } from '@/lib/server/till-store';
import type { TillInput } from '../schema';
import { tillOfInput } from '../till-of-input';

export type TillUpdate = { readonly till: string; readonly version: number; readonly input: TillInput };

/** Saves a till and everything installed on it, unless somebody else saved it since. */
export const updateTill = (actor: Actor, { till: id, version, input }: TillUpdate): Promise<{ readonly id: string; readonly version: number }> =>
  actIn(actor, 'till.write', async (transaction) => {
    const { site, till: before } = await readTill(transaction, actor.siteId, id);
    const after = tillOfInput(input, id, before.version);
    return writeTill(transaction, { site, personId: actor.person.id, before, after, version });
  });
