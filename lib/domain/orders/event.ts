import type { AreaId, CourseId, OptionId, StationId, TillId } from '@/lib/domain/site/ids';
import type { Order, OrderLine, SaidAllergy } from './order';
import type { Tab } from './tab';

/** What a person does at a till with an order; `till` is the one it is done at, `line` an index into the tab's lines. */
export type OrderEvent =
  | { readonly kind: 'send'; readonly order: Order }
  | { readonly kind: 'add'; readonly till: TillId; readonly lines: readonly OrderLine[]; readonly allergies: readonly SaidAllergy[] }
  | { readonly kind: 'fire'; readonly till: TillId; readonly course: CourseId | null }
  | { readonly kind: 'amend'; readonly till: TillId; readonly line: number; readonly options?: readonly OptionId[]; readonly note?: string; readonly allergies?: readonly string[] }
  | { readonly kind: 'void'; readonly till: TillId; readonly line: number; readonly quantity: number }
  | { readonly kind: 'move'; readonly till: TillId; readonly table: string; readonly area?: AreaId }
  | { readonly kind: 'merge'; readonly till: TillId; readonly other: Tab }
  | { readonly kind: 'rush'; readonly till: TillId; readonly course: CourseId | null }
  | { readonly kind: 'reprint'; readonly till: TillId; readonly sending: number }
  | { readonly kind: 'remake'; readonly till: TillId; readonly line: number; readonly quantity: number }
  | { readonly kind: 'message'; readonly till: TillId; readonly station: StationId; readonly words: string };

export type OrderEventKind = OrderEvent['kind'];
