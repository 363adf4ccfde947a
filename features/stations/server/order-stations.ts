import 'server-only';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { StationRow } from '@/models/station';

/** Puts all stations in an order, which the board's rails and the tickets follow. */
export const orderStations = (actor: Actor, ids: readonly string[]): Promise<{ readonly ordered: number }> =>
  actIn(actor, 'station.write', async (transaction) => {
    const { siteId } = actor;
    const rows = await StationRow.findAll({ where: { siteId }, transaction, lock: transaction.LOCK.UPDATE });
    const wanted = new Set(ids);
    if (wanted.size !== ids.length || rows.length !== ids.length || !rows.every((row) => wanted.has(row.id))) {
      throw new AppError('conflict', 'Somebody added a station or took one off in between. Nothing was put in order. Look at the stations again, then order them.');
    }
    for (const [position, id] of ids.entries()) await StationRow.update({ position }, { where: { siteId, id }, transaction });
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'station.ordered', subjectKind: 'site', subjectId: null, summary: `Stations in this order now: ${ids.map((id) => rows.find((row) => row.id === id)?.name ?? '').join(', ')}` });
    return { ordered: ids.length };
  });
