import type { AreaId, OptionId, PrinterId, StationId, TillId } from '@/lib/domain/site/ids';
import type { OrderType } from '@/lib/domain/site/order-types';
import type { LineRoute } from '@/lib/domain/routing/route-line';
import type { Piece } from '@/lib/domain/routing/pieces';
import type { OrderLine, SaidAllergy } from './order';

/** Paper that a line is on: later word of the line goes there, whatever the plan says by then. */
export type PrintedPart = {
  readonly kind: Piece['kind'];
  readonly option: OptionId | null;
  readonly station: StationId;
  readonly printer: PrinterId;
};

/** One line of a table's order and what became of it. */
export type TabLine = {
  readonly line: OrderLine;
  readonly sending: number;
  /** Sent to the pass, not yet to the cooks. */
  readonly held: boolean;
  /** The record of its routing; null when it was refused or needs no ticket. */
  readonly route: LineRoute | null;
  readonly printed: readonly PrintedPart[];
  /** Units taken off since. */
  readonly voided: number;
};

/** A table's order as far as it has come: all that is needed to place the next word of it. */
export type Tab = {
  readonly table: string;
  readonly area: AreaId;
  readonly till: TillId;
  readonly orderType: OrderType;
  readonly covers: number | null;
  readonly server: string;
  readonly number: string;
  readonly allergies: readonly SaidAllergy[];
  readonly sendings: number;
  readonly lines: readonly TabLine[];
};

/** Units of a line still wanted. */
export const quantityLeft = (line: TabLine): number => line.line.quantity - line.voided;
