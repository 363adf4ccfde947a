import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { codeClash } from '@/lib/domain/stations/codes';
import type { Site } from '@/lib/domain/site/site';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { readSite, refuseBroken } from '@/lib/server/devices-of-site';
import { recordChange } from '@/lib/server/history';
import { deleteVersioned, updateVersioned } from '@/lib/server/versioned-update';
import { RuleStationRow } from '@/models/rule-station';
import { StationRow } from '@/models/station';
import { StationPrinterRow } from '@/models/station-printer';
import type { StationInput } from '../schema';

type Saved = { readonly id: string; readonly version: number };

const mustFit = (site: Site, id: string, input: StationInput): void => {
  const others = site.stations.filter((station) => station.id !== id);
  const clash = codeClash(input.code, others);
  refuseBroken([
    { field: 'name', broken: others.some((one) => one.name.toLowerCase() === input.name.toLowerCase()), reason: `There is a station called ${input.name} already.` },
    { field: 'code', broken: clash !== null, reason: clash === null ? '' : `${input.code} has the same ${clash.letter === 1 ? 'first' : 'second'} letter as ${clash.name}: half a stamp would not tell them apart.` },
    { field: 'standIn', broken: input.standIn === id, reason: 'A station cannot stand in for itself.' },
    { field: 'standIn', broken: input.standIn !== null && !site.stations.some((one) => one.id === input.standIn), reason: 'That station is not on this site any more.' },
    { field: 'printers', broken: input.printers.some((printer) => !site.printers.some((one) => one.id === printer)), reason: 'One of the printers is not on this site any more.' },
  ]);
};

const rowOf = ({ printers: _printers, standIn, ...fields }: StationInput) => ({ ...fields, standInId: standIn });

const writePrinters = async (transaction: Transaction, siteId: string, stationId: string, printers: readonly string[]): Promise<void> => {
  await StationPrinterRow.destroy({ where: { siteId, stationId }, transaction });
  await StationPrinterRow.bulkCreate([...new Set(printers)].map((printerId, position) => ({ siteId, stationId, position, printerId })), { transaction });
};

export const createStation = (actor: Actor, input: StationInput): Promise<Saved> =>
  actIn(actor, 'station.write', async (transaction) => {
    const { siteId } = actor;
    const site = await readSite(transaction, siteId);
    const id = randomUUID();
    mustFit(site, id, input);
    await StationRow.create({ ...rowOf(input), id, siteId, position: site.stations.length }, { transaction });
    await writePrinters(transaction, siteId, id, input.printers);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'station.added', subjectKind: 'station', subjectId: id, summary: `Station ${input.name} added`, after: input });
    return { id, version: 1 };
  });

export const updateStation = (actor: Actor, id: string, version: number, input: StationInput): Promise<Saved> =>
  actIn(actor, 'station.write', async (transaction) => {
    const { siteId } = actor;
    const site = await readSite(transaction, siteId);
    const before = site.stations.find((station) => station.id === id);
    mustFit(site, id, input);
    const row = await updateVersioned(StationRow, { siteId, id, version }, rowOf(input), transaction);
    await writePrinters(transaction, siteId, id, input.printers);
    const summary = before !== undefined && before.open !== input.open ? `${input.name} ${input.open ? 'opened' : 'closed'}` : `Station ${input.name} changed`;
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'station.updated', subjectKind: 'station', subjectId: id, summary, ...(before === undefined ? {} : { before }), after: input });
    return { id, version: row.version };
  });

/** A station that a rule sends to stays: a plan must not lose a rule unseen. */
export const deleteStation = (actor: Actor, id: string, version: number): Promise<{ readonly id: string }> =>
  actIn(actor, 'station.write', async (transaction) => {
    const { siteId } = actor;
    const rules = await RuleStationRow.count({ where: { siteId, stationId: id }, transaction });
    if (rules > 0) throw new AppError('conflict', `${rules === 1 ? 'A rule sends' : `${rules} rules send`} dishes to this station. Nothing was deleted. Send them elsewhere on the board first.`);
    await StationRow.increment('version', { where: { siteId, standInId: id }, transaction });
    await StationRow.update({ standInId: null }, { where: { siteId, standInId: id }, transaction });
    const row = await deleteVersioned(StationRow, { siteId, id, version }, transaction);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'station.deleted', subjectKind: 'station', subjectId: id, summary: `Station ${row.name} deleted` });
    return { id };
  });

export const orderStations = (actor: Actor, ids: readonly string[]): Promise<{ readonly ordered: number }> =>
  actIn(actor, 'station.write', async (transaction) => {
    const { siteId } = actor;
    for (const [position, id] of ids.entries()) await StationRow.update({ position }, { where: { siteId, id }, transaction });
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'station.ordered', subjectKind: 'site', subjectId: null, summary: 'Stations put in another order' });
    return { ordered: ids.length };
  });
