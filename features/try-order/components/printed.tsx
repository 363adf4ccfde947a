'use client';

import { PrinterMouth } from '@/components/printer-mouth';
import { Stamp } from '@/components/stamp';
import { TicketPaper } from '@/components/ticket-paper';
import type { TriedOrder, TriedTicket } from '@/lib/domain/orders/try-order';
import type { Site } from '@/lib/domain/site/site';
import styles from './try-order.module.css';

type PrintedProps = { readonly site: Site; readonly tried: TriedOrder; readonly selected: number | null; readonly onSelect: (line: number) => void };

const stationNames = ({ ticket }: TriedTicket): string => ticket.stations.map(({ name }) => name).join(' and ');

const mouthWords = (tickets: readonly TriedTicket[]): string =>
  [...new Set(tickets.map((one) => `${stationNames(one)}${one.ticket.copy ? ', copy' : ''}`))].join('; ');

/** Names in one sentence, for what stays quiet. */
const named = (names: readonly string[]): string => (names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names.at(-1) ?? ''}`);

function FromPrinter({ site, tickets, selected, onSelect }: Omit<PrintedProps, 'tried'> & { readonly tickets: readonly TriedTicket[] }) {
  const stations = [...new Set(tickets.flatMap(({ ticket }) => ticket.stations.map(({ id }) => id)))].flatMap((id) => site.stations.find((station) => station.id === id) ?? []);
  return (
    <li className={styles['printer']}>
      <PrinterMouth
        name={tickets[0]?.ticket.printerName ?? ''}
        words={mouthWords(tickets)}
        stamps={stations.slice(0, 2).map(({ id, code, mesh, colour }) => <Stamp key={id} code={code} mesh={mesh} colour={colour} size="small" />)}
      />
      {tickets.map((one) => (
        <TicketPaper
          key={one.ticket.stations.map(({ id }) => id).join()}
          sheet={one.sheet}
          feeds
          label={`Ticket for ${stationNames(one)} from ${one.ticket.printerName}${one.ticket.copy ? ', a copy' : ''}`}
          selectedLine={selected}
          onSelect={onSelect}
        />
      ))}
    </li>
  );
}

/** Every printer that prints for this order, with its paper; the others stay quiet. */
export function Printed({ site, tried, selected, onSelect }: PrintedProps) {
  const printing = new Map([...new Set(tried.tickets.map(({ ticket }) => ticket.printer))]
    .map((printer) => [printer, tried.tickets.filter(({ ticket }) => ticket.printer === printer)]));
  const quiet = site.printers.filter(({ id }) => !printing.has(id)).map(({ name }) => name);
  return (
    <>
      <ul className={styles['printers']} aria-label="Printers and their tickets">
        {[...printing].map(([printer, tickets]) => <FromPrinter key={printer} site={site} tickets={tickets} selected={selected} onSelect={onSelect} />)}
      </ul>
      {quiet.length === 0 || printing.size === 0 ? null : <p className={styles['quietOnes']}>{named(quiet)} {quiet.length === 1 ? 'prints' : 'print'} nothing for this order.</p>}
    </>
  );
}
