import { z } from 'zod';
import type { Order } from '@/lib/domain/orders/order';
import { asId } from '@/lib/domain/site/ids';
import type { AreaId, CourseId, ItemId, OptionId, TillId } from '@/lib/domain/site/ids';
import { orderTypes } from '@/lib/domain/site/order-types';

const id = <Id extends string>() => z.string().max(64).transform((value) => asId<Id>(value));
const words = (most: number) => z.string().max(most);

const orderLine = z.object({
  item: id<ItemId>(),
  /** Any number: what is outside 1 to 999 is refused on its line, not here. */
  quantity: z.number(),
  options: z.array(id<OptionId>()).max(50),
  seat: z.number().nullable(),
  course: id<CourseId>().nullable(),
  note: words(300),
  allergies: z.array(words(120)).max(30),
  held: z.boolean().optional(),
});

export const orderSchema = z.object({
  till: id<TillId>(),
  orderType: z.enum(orderTypes),
  table: words(40),
  area: id<AreaId>().optional(),
  covers: z.number().int().min(1).max(999).nullable(),
  server: words(60),
  number: words(20),
  lines: z.array(orderLine).max(300),
  allergies: z.array(z.object({ seat: z.number().nullable(), words: words(120) })).max(100),
});

export const presentChoices = ['planned', 'now'] as const;
/** Every station open and every printer up, or the kitchen as it is at this moment. */
export type PresentChoice = (typeof presentChoices)[number];

/** What a person has written (the plan by the key of its choice), kept in the browser until they clear it. */
export const draftSchema = z.object({ plan: z.string().max(64), present: z.enum(presentChoices), order: orderSchema });
export type Draft = { readonly plan: string; readonly present: PresentChoice; readonly order: Order };

export const tryOrderInput = draftSchema.extend({ time: z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/) });
export type TryOrderInput = Draft & { readonly time: string };
