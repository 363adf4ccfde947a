import 'server-only';
import type { Transaction } from 'sequelize';
import { AppError } from '@/lib/http/errors';
import { isOneOf, readSite } from '@/lib/server/devices-of-site';
import { recordChange } from '@/lib/server/history';
import { updateVersioned } from '@/lib/server/versioned-update';
import { ReservedAddressRow } from '@/models/reserved-address';
import { SiteRow } from '@/models/site';
import { StationRow } from '@/models/station';
import type { By } from './change-device';

type NetworkChange = Partial<Record<'subnet' | 'gateway' | 'poolFrom' | 'poolTo' | 'linkAddress' | 'linkMask', string>>;

const changeWords: Readonly<Record<keyof NetworkChange, string>> = {
  subnet: 'subnet', gateway: 'router', poolFrom: 'pool from', poolTo: 'pool to', linkAddress: 'print link at', linkMask: 'print link with mask',
};

/** The site's own row has no site id, so it is found by its id alone. */
export const changeNetwork = async (transaction: Transaction, { siteId, personId }: By, change: NetworkChange): Promise<void> => {
  const before = await readSite(transaction, siteId);
  await SiteRow.update(change, { where: { id: siteId }, transaction });
  await SiteRow.increment('version', { where: { id: siteId }, transaction });
  await recordChange(transaction, { siteId, personId, action: 'network.updated', subjectKind: 'site', subjectId: siteId, summary: `Network: ${Object.entries(change).map(([field, value]) => `${changeWords[field as keyof NetworkChange]} ${value || 'nothing'}`).join(', ')}`, before: before.network, after: change });
};

export const reserveAddress = async (transaction: Transaction, { siteId, personId }: By, address: string, reason: string): Promise<void> => {
  const site = await readSite(transaction, siteId);
  const taken = site.network.reserved.find((one) => one.address === address);
  if (taken !== undefined) throw new AppError('conflict', `${address} is reserved already, for ${taken.reason || 'something else'}. Nothing was changed. Look at it on the network's page.`);
  await ReservedAddressRow.create({ siteId, address, reason, position: site.network.reserved.length }, { transaction });
  await SiteRow.increment('version', { where: { id: siteId }, transaction });
  await recordChange(transaction, { siteId, personId, action: 'address.reserved', subjectKind: 'site', subjectId: siteId, summary: `${address} reserved for ${reason}`, after: { address, reason } });
};

export const changeStandIn = async (transaction: Transaction, { siteId, personId }: By, stationId: string, standIn: string): Promise<void> => {
  const site = await readSite(transaction, siteId);
  const station = site.stations.find((one) => one.id === stationId);
  if (station === undefined || !isOneOf(site.stations, standIn) || stationId === standIn) throw new AppError('conflict', 'One of the two stations is no longer there. Nothing was changed. Look at the stations again.');
  await updateVersioned(StationRow, { siteId, id: stationId, version: station.version }, { standInId: standIn }, transaction);
  await recordChange(transaction, { siteId, personId, action: 'station.updated', subjectKind: 'station', subjectId: stationId, summary: `${site.stations.find((one) => one.id === standIn)?.name} stands in for ${station.name}` });
};
