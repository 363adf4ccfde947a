import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { dependentsOfArea } from '@/lib/domain/checks/dependents';
import { asId } from '@/lib/domain/site/ids';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { readSite, refuseBroken, sameName } from '@/lib/server/devices-of-site';
import { recordChange } from '@/lib/server/history';
import { deleteVersioned, updateVersioned } from '@/lib/server/versioned-update';
import { AreaRow } from '@/models/area';
import type { AreaInput } from '../schema';

const readAreas = async (transaction: Transaction, siteId: string, input: AreaInput | null, id: string | null) => {
  const site = await readSite(transaction, siteId);
  const area = site.areas.find((one) => one.id === id);
  if (id !== null && area === undefined) throw new AppError('not-found', 'This area is no longer on the site; somebody has taken it off the list. Nothing was changed.');
  refuseBroken([{ field: 'name', reason: `Another area is called ${input?.name} already.`, broken: input !== null && site.areas.some((one) => one.id !== id && sameName(one.name, input.name)) }]);
  return { site, area };
};

export const createArea = (actor: Actor, input: AreaInput): Promise<{ readonly id: string; readonly version: number }> =>
  actIn(actor, 'till.write', async (transaction) => {
    const { siteId } = actor;
    const { site } = await readAreas(transaction, siteId, input, null);
    const id = randomUUID();
    await AreaRow.create({ id, siteId, name: input.name, position: site.areas.length }, { transaction });
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'area.added', subjectKind: 'area', subjectId: id, summary: `${input.name} added` });
    return { id, version: 1 };
  });

export const renameArea = (actor: Actor, { area: id, version, input }: { readonly area: string; readonly version: number; readonly input: AreaInput }): Promise<{ readonly id: string; readonly version: number }> =>
  actIn(actor, 'till.write', async (transaction) => {
    const { siteId } = actor;
    const { area } = await readAreas(transaction, siteId, input, id);
    const row = await updateVersioned(AreaRow, { siteId, id, version }, { name: input.name }, transaction);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'area.updated', subjectKind: 'area', subjectId: id, summary: `${area?.name} renamed to ${input.name}`, before: { name: area?.name }, after: input });
    return { id, version: row.version };
  });

/** Refused while tills stand in it or rules name it. */
export const deleteArea = (actor: Actor, { area: id, version }: { readonly area: string; readonly version: number }): Promise<{ readonly id: string }> =>
  actIn(actor, 'till.write', async (transaction) => {
    const { siteId } = actor;
    const { site, area } = await readAreas(transaction, siteId, null, id);
    const { obstacles } = dependentsOfArea(site, asId(id));
    if (obstacles.length > 0) throw new AppError('conflict', `${area?.name} has to stay for now. ${obstacles.join(' ')}`);
    await deleteVersioned(AreaRow, { siteId, id, version }, transaction);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'area.deleted', subjectKind: 'area', subjectId: id, summary: `${area?.name} taken off the list` });
    return { id };
  });
