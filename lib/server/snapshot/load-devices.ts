import 'server-only';
import { asId } from '@/lib/domain/site/ids';
import type { OrderType } from '@/lib/domain/site/order-types';
import type { Printer } from '@/lib/domain/site/printer';
import type { Station } from '@/lib/domain/site/station';
import type { Till } from '@/lib/domain/site/till';
import { PrinterRow } from '@/models/printer';
import { PrinterSharedPointRow } from '@/models/printer-shared-point';
import { QueueRow } from '@/models/queue';
import { StationRow } from '@/models/station';
import { StationPrinterRow } from '@/models/station-printer';
import { TillRow } from '@/models/till';
import { TillOrderTypeRow } from '@/models/till-order-type';
import { TillSharedPointRow } from '@/models/till-shared-point';
import { groupRows, type Within } from './group-rows';

const idOrNull = <Id extends string>(value: string | null): Id | null => (value === null ? null : asId<Id>(value));

export const loadTills = async (within: Within, allTypes: readonly OrderType[]): Promise<readonly Till[]> => {
  const [tills, types, points, queues] = await Promise.all([
    TillRow.findAll({ ...within, order: ['position', 'name'] }),
    TillOrderTypeRow.findAll(within),
    TillSharedPointRow.findAll({ ...within, order: ['sharedPointId'] }),
    QueueRow.findAll({ ...within, order: ['printerId'] }),
  ]);
  const typesOf = groupRows(types, (row) => row.tillId);
  const pointsOf = groupRows(points, (row) => row.tillId);
  const queuesOf = groupRows(queues, (row) => row.tillId);
  return tills.map((row) => ({
    id: asId(row.id), name: row.name, kind: row.kind, area: asId(row.areaId), system: row.system, address: row.address, mask: row.mask,
    orderTypes: allTypes.filter((type) => typesOf(row.id).some((one) => one.orderType === type)),
    addressSource: row.addressSource, adapter: row.adapter, sharedPoints: pointsOf(row.id).map((one) => asId(one.sharedPointId)),
    defaultPrinter: idOrNull(row.defaultPrinterId), printsThrough: idOrNull(row.printsThroughId), version: row.version,
    queues: queuesOf(row.id).map((queue) => ({
      printer: asId(queue.printerId), typedName: queue.typedName, portKind: queue.portKind, portAddress: queue.portAddress, testPrintedAt: queue.testPrintedAt?.toISOString() ?? null,
    })),
  }));
};

export const loadPrinters = async (within: Within): Promise<readonly Printer[]> => {
  const [printers, points] = await Promise.all([
    PrinterRow.findAll({ ...within, order: ['position', 'name'] }),
    PrinterSharedPointRow.findAll({ ...within, order: ['sharedPointId'] }),
  ]);
  const pointsOf = groupRows(points, (row) => row.printerId);
  return printers.map((row) => ({
    id: asId(row.id), name: row.name, model: row.model, serial: row.serial, connection: row.connection, hostTill: idOrNull(row.hostTillId),
    address: row.address, mask: row.mask, gateway: row.gateway, port: row.port, mac: row.mac, presentAddress: row.presentAddress,
    rollWidthMm: row.rollWidthMm, columns: row.columns, codePage: row.codePage, emphasis: row.emphasis, cutter: row.cutter, buzzer: row.buzzer,
    backup: idOrNull(row.backupId), joinsStations: row.joinsStations, sharedPoints: pointsOf(row.id).map((one) => asId(one.sharedPointId)),
    stage: row.stage, downSince: row.downSince?.toISOString() ?? null, downReason: row.downReason, version: row.version,
  }));
};

export const loadStations = async (within: Within): Promise<readonly Station[]> => {
  const [stations, printers] = await Promise.all([
    StationRow.findAll({ ...within, order: ['position', 'name'] }),
    StationPrinterRow.findAll({ ...within, order: ['stationId', 'position'] }),
  ]);
  const printersOf = groupRows(printers, (row) => row.stationId);
  return stations.map((row) => ({
    id: asId(row.id), name: row.name, code: row.code, kind: row.kind, mesh: row.mesh, colour: row.colour, position: row.position,
    printers: printersOf(row.id).map((one) => asId(one.printerId)), open: row.open, standIn: idOrNull(row.standInId), layout: row.layout,
    ticketsPerSending: row.ticketsPerSending, pace: row.pace, version: row.version,
  }));
};
