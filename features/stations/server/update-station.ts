import 'server-only';
import { sayStationChange } from '@/lib/domain/stations/station-differences';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { readSite } from '@/lib/server/devices-of-site';
import { recordChange } from '@/lib/server/history';
import { updateVersioned } from '@/lib/server/versioned-update';
import { StationRow } from '@/models/station';
import type { StationInput } from '../schema';
import { stationOfInput } from '../station-of-input';
import { mustFitSite, stationValues, writeStationPrinters } from './station-row';

export type StationUpdate = { readonly station: string; readonly version: number; readonly input: StationInput };

/** Saves a station as a person wrote it, unless somebody else saved it since. */
export const updateStation = (actor: Actor, { station: id, version, input }: StationUpdate): Promise<{ readonly id: string; readonly version: number }> =>
  actIn(actor, 'station.write', async (transaction) => {
    const { siteId } = actor;
    const site = await readSite(transaction, siteId);
    const before = site.stations.find((station) => station.id === id);
    if (before === undefined) throw new AppError('not-found', 'This station is no longer on the site; somebody has taken it off the list. Nothing was changed.');
    const after = stationOfInput(input, id, before);
    if (before.version === version) mustFitSite(site, after);
    const row = await updateVersioned(StationRow, { siteId, id, version }, stationValues(after), transaction);
    await writeStationPrinters(transaction, siteId, after);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'station.updated', subjectKind: 'station', subjectId: id, summary: sayStationChange(before, after, site), before, after });
    return { id, version: row.version };
  });
