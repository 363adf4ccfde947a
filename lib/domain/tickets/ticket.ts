import type { PrinterId, StationId } from '@/lib/domain/site/ids';
import type { OrderType } from '@/lib/domain/site/order-types';
import type { Printer } from '@/lib/domain/site/printer';
import type { TicketLayout } from '@/lib/domain/site/station';

export type TicketStation = { readonly id: StationId; readonly code: string; readonly name: string };

/** What was said of a guest's seat, or of everyone at the table when the seat is null. */
export type TicketAllergy = { readonly seat: number | null; readonly words: string };

export const lineMarks = ['COPY', 'HOLD', 'RUSH', 'REMAKE', 'REPRINT', 'AMENDED', 'VOID'] as const;
export type LineMark = (typeof lineMarks)[number];

/** An option as the kitchen reads it; the codes name the stations that make it, on copies and joined tickets. */
export type TicketOption = { readonly name: string; readonly stationCodes: readonly string[] };

/** One line of the order as this ticket shows it: a dish, or an option that became a line of its own. */
export type TicketLine = {
  /** Index of the order's line. */
  readonly sourceLine: number;
  /** 1 to 999. */
  readonly quantity: number;
  /** The kitchen name, in the case it was typed in; capitals are made on paper. */
  readonly name: string;
  readonly options: readonly TicketOption[];
  /** For a split option: the kitchen name of its dish. */
  readonly forDish: string | null;
  readonly note: string;
  /** Null means the whole table. */
  readonly seat: number | null;
  /** What was said of this line, its seat or its table; empty for none. */
  readonly allergies: readonly string[];
  readonly marks: readonly LineMark[];
  /** Who cooks it, on a copy and on a joined ticket; otherwise empty. */
  readonly stationCodes: readonly string[];
};

export type TicketCourse = { readonly course: string; readonly lines: readonly TicketLine[] };

export const ticketEvents = ['send', 'fire', 'amend', 'void', 'move', 'merge', 'rush', 'remake', 'reprint', 'message'] as const;
export type TicketEventKind = (typeof ticketEvents)[number];

/** One piece of paper before it is laid out: one printer, one station (or those it joins), one sending. */
export type Ticket = {
  readonly printer: PrinterId;
  readonly printerName: string;
  /** One, or all that share the printer when it joins them; in order of position. */
  readonly stations: readonly TicketStation[];
  /** For a station that does not cook these lines. */
  readonly copy: boolean;
  /** When another printer should have printed: for whom this one does ("GRILL") and why ("GRILL1 is down"). */
  readonly printsFor: { readonly station: string; readonly reason: string } | null;
  readonly event: {
    readonly kind: TicketEventKind;
    /** Large under the head, one row or more each: "MAINS AWAY", "MOVED FROM TABLE 12"; empty for a plain sending. */
    readonly words: readonly string[];
  };
  /** As the waiter says it, without the word: "14"; empty when the guest has none. */
  readonly table: string;
  readonly covers: number | null;
  readonly orderType: OrderType;
  readonly till: string;
  readonly server: string;
  /** "0231". */
  readonly orderNumber: string;
  /** 1 for the first. */
  readonly sending: number;
  /** "HH:MM" on the site's own clock. */
  readonly time: string;
  readonly layout: TicketLayout;
  /** Of every seat whose food is on this ticket, and of the table. */
  readonly allergies: readonly TicketAllergy[];
  /** Courses in the site's order; lines in the order's. */
  readonly courses: readonly TicketCourse[];
  /** Names of the other prep stations cooking for the same courses of this sending. */
  readonly cooksWith: readonly string[];
  /** How many times the same paper comes out, 1 to 3. */
  readonly times: number;
};

/** What of a printer decides how a ticket comes out of it. */
export type PaperPrinter = Pick<Printer, 'columns' | 'codePage' | 'emphasis' | 'cutter' | 'buzzer'>;
