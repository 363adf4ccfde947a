import type { AreaId, CourseId, ItemId, OptionId, TillId } from '@/lib/domain/site/ids';
import type { OrderType } from '@/lib/domain/site/order-types';

export type OrderLine = {
  readonly item: ItemId;
  /** 1 to 999. */
  readonly quantity: number;
  readonly options: readonly OptionId[];
  /** 1 and up; null means the whole table. */
  readonly seat: number | null;
  /** Null means the item's own course. */
  readonly course: CourseId | null;
  readonly note: string;
  /** Said of this line alone; those of its seat and table come on top. */
  readonly allergies: readonly string[];
  /** Sent with the order, cooked when its course is fired. */
  readonly held?: boolean;
};

/** Belongs to every line of that seat, or of the whole table when the seat is null. */
export type SaidAllergy = { readonly seat: number | null; readonly words: string };

/** What a till sends at one time. */
export type Order = {
  readonly till: TillId;
  readonly orderType: OrderType;
  /** Without the word: "14"; empty when the guest has none. */
  readonly table: string;
  /** The till's own area unless said. */
  readonly area?: AreaId;
  /** Number of guests; null when nobody counted. */
  readonly covers: number | null;
  readonly server: string;
  /** "0231". */
  readonly number: string;
  readonly lines: readonly OrderLine[];
  readonly allergies: readonly SaidAllergy[];
};
