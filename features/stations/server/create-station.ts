import 'server-only';
import { randomUUID } from 'node:crypto';
import { actIn, type Actor } from '@/lib/server/actor';
import { readSite } from '@/lib/server/devices-of-site';
import { recordChange } from '@/lib/server/history';
import { StationRow } from '@/models/station';
import type { StationInput } from '../schema';
import { stationOfInput } from '../station-of-input';
import { mustFitSite, stationValues, writeStationPrinters } from './station-row';

/** Writes down a station, last in the site's order. */
export const createStation = (actor: Actor, input: StationInput): Promise<{ readonly id: string; readonly version: number }> =>
  actIn(actor, 'station.write', async (transaction) => {
    const { siteId } = actor;
    const site = await readSite(transaction, siteId);
    const id = randomUUID();
    const station = stationOfInput(input, id, null);
    mustFitSite(site, station);
    const position = Number((await StationRow.max('position', { where: { siteId }, transaction })) ?? -1) + 1;
    await StationRow.create({ ...stationValues(station), id, siteId, position }, { transaction });
    await writeStationPrinters(transaction, siteId, station);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'station.added', subjectKind: 'station', subjectId: id, summary: `${station.name} added`, after: station });
    return { id, version: 1 };
  });
