import { routeToStation } from '@/lib/domain/routing/route-line';
import type { Ticket } from '@/lib/domain/tickets/ticket';
import type { OrderEvent } from './event';
import type { Step, Work } from './work';

/** Words to a station, on paper; they follow its stand-in and backups as a line would. */
export const sendMessage = ({ tab, kitchen, routing }: Work, event: Extract<OrderEvent, { kind: 'message' }>): Step => {
  const { site } = kitchen;
  const route = routeToStation(routing, event.station, { till: event.till });
  if (route.printer === null || route.reached === null) {
    return [tab, { tickets: [], losses: [], refusals: ['The message printed nowhere: the station is closed or its printers are out. Tell them by voice.'] }];
  }
  const station = site.stations.find((one) => one.id === route.reached)!;
  const printer = site.printers.find((one) => one.id === route.printer)!;
  const ticket: Ticket = {
    printer: printer.id, printerName: printer.name, stations: [{ id: station.id, code: station.code, name: station.name }], copy: false, printsFor: null,
    event: { kind: 'message', words: [event.words] }, table: tab.table, covers: tab.covers, orderType: tab.orderType, server: tab.server, orderNumber: tab.number,
    till: site.tills.find((one) => one.id === event.till)?.name ?? '', sending: tab.sendings, time: kitchen.clock.time, layout: station.layout, allergies: [], courses: [], cooksWith: [], times: 1,
  };
  return [tab, { tickets: [ticket], losses: [], refusals: [] }];
};

