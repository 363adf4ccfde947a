import { z } from 'zod';
import { orderTypes } from '@/lib/domain/site/order-types';
import type { Order } from './order';

const id = z.string().min(1).max(36);
const allergyWords = z.string().trim().min(1).max(80);

/** The shape of an order from outside. Whether the menu has what it names is `refuseOrder`'s to say, line by line. */
export const orderSchema = z.strictObject({
  till: id,
  orderType: z.enum(orderTypes),
  table: z.string().max(20).default(''),
  area: id.optional(),
  covers: z.int().min(0).max(999).nullable().default(null),
  server: z.string().max(40).default(''),
  number: z.string().max(12).default(''),
  lines: z.array(z.strictObject({
    item: id,
    quantity: z.number(),
    options: z.array(id).max(50).default([]),
    seat: z.number().nullable().default(null),
    course: id.nullable().default(null),
    note: z.string().max(200).default(''),
    allergies: z.array(allergyWords).max(20).default([]),
    held: z.boolean().default(false),
  })).max(500),
  allergies: z.array(z.strictObject({ seat: z.number().nullable(), words: allergyWords })).max(100).default([]),
});

/** A parsed order carries the domain's branded ids; they are checked against the site next. */
export const asOrder = (parsed: z.output<typeof orderSchema>): Order => parsed as unknown as Order;
