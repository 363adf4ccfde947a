import 'server-only';
import { asId } from '@/lib/domain/site/ids';
import { dependentsOfStation } from '@/lib/domain/stations/dependents-of-station';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { readSite } from '@/lib/server/devices-of-site';
import { recordChange } from '@/lib/server/history';
import { deleteVersioned } from '@/lib/server/versioned-update';
import { StationRow } from '@/models/station';

export type StationDeletion = { readonly station: string; readonly version: number };

/** Takes a station off the list, unless a plan sends to it; whoever leaned on it has no stand-in any more. */
export const deleteStation = (actor: Actor, { station: id, version }: StationDeletion): Promise<{ readonly id: string }> =>
  actIn(actor, 'station.write', async (transaction) => {
    const { siteId } = actor;
    const site = await readSite(transaction, siteId);
    const { obstacles, consequences } = dependentsOfStation(site, asId(id));
    if (obstacles.length > 0) throw new AppError('conflict', `Nothing was deleted. ${obstacles.join(' ')}`);
    await StationRow.increment('version', { where: { siteId, standInId: id }, transaction });
    await StationRow.update({ standInId: null }, { where: { siteId, standInId: id }, transaction });
    const row = await deleteVersioned(StationRow, { siteId, id, version }, transaction);
    await recordChange(transaction, {
      siteId, personId: actor.person.id, action: 'station.deleted', subjectKind: 'station', subjectId: id,
      summary: [`${row.name} taken off the list.`, ...consequences].join(' '), before: row.get({ plain: true }),
    });
    return { id };
  });
