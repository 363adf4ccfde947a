import 'server-only';
import type { Transaction } from 'sequelize';
import { codeClash } from '@/lib/domain/stations/codes';
import type { Site } from '@/lib/domain/site/site';
import type { Station } from '@/lib/domain/site/station';
import { isOneOf, refuseBroken, sameName } from '@/lib/server/devices-of-site';
import { StationPrinterRow } from '@/models/station-printer';

/** What the table holds of a station; its printers have a table of their own. */
export const stationValues = ({ name, code, kind, mesh, colour, open, standIn, layout, ticketsPerSending, pace }: Station) =>
  ({ name, code, kind, mesh, colour, open, standInId: standIn, layout, ticketsPerSending, pace });

export const writeStationPrinters = async (transaction: Transaction, siteId: string, { id: stationId, printers }: Pick<Station, 'id' | 'printers'>): Promise<void> => {
  await StationPrinterRow.destroy({ where: { siteId, stationId }, transaction });
  await StationPrinterRow.bulkCreate([...new Set(printers)].map((printerId, position) => ({ siteId, stationId, position, printerId })), { transaction });
};

export const mustFitSite = (site: Site, station: Station): void => {
  const others = site.stations.filter((one) => one.id !== station.id);
  const clash = codeClash(station.code, others);
  refuseBroken([
    { field: 'name', broken: others.some((one) => sameName(one.name, station.name)), reason: `There is a station called ${station.name} already.` },
    { field: 'code', broken: clash !== null, reason: clash === null ? '' : `${station.code} has the same ${clash.letter === 1 ? 'first' : 'second'} letter as ${clash.name}: half a stamp would not tell them apart.` },
    { field: 'standIn', broken: station.standIn === station.id, reason: 'A station cannot stand in for itself.' },
    { field: 'standIn', broken: !isOneOf(site.stations, station.standIn), reason: 'That station is no longer on the site. Choose another.' },
    { field: 'printers', broken: !station.printers.every((printer) => isOneOf(site.printers, printer)), reason: 'One of the printers is no longer on the site. Choose again.' },
  ]);
};
