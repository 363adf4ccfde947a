import { z } from 'zod';
import { orderTypes } from '@/lib/domain/site/order-types';
import { addressSources, portKinds, tillKinds, tillSystems } from '@/lib/domain/site/till';

const id = z.string().regex(/^[A-Za-z0-9._-]{1,36}$/, 'This is no id of this site.');
const idOrNone = id.nullable();
const words = (most: number) => z.string().trim().max(most, `At most ${most} characters.`);
const name = (what: string) => z.string().trim().min(1, `${what} needs a name.`).max(120, 'At most 120 characters.');

const queueFields = {
  /** As typed on the till, spaces and all. */
  typedName: z.string().max(220, 'At most 220 characters.'),
  portKind: z.enum(portKinds),
  portAddress: words(255),
  testPrintedAt: z.iso.datetime().nullable(),
};

/** One printer as it was found on one till. */
export const queueInput = z.object(queueFields);
export type QueueInput = z.infer<typeof queueInput>;

export const tillInput = z.object({
  name: name('A till'),
  kind: z.enum(tillKinds),
  area: z.string().min(1, 'Choose where it stands.').pipe(id),
  orderTypes: z.array(z.enum(orderTypes)).min(1, 'A till that can send nothing is no till. Choose at least one.'),
  system: z.enum(tillSystems),
  address: words(45),
  mask: words(45),
  addressSource: z.enum(addressSources),
  adapter: words(120),
  sharedPoints: z.array(id).max(50),
  defaultPrinter: idOrNone,
  printsThrough: idOrNone,
  queues: z.array(z.object({ printer: id, ...queueFields })).max(500).refine(
    (queues) => new Set(queues.map((queue) => queue.printer)).size === queues.length,
    'A printer is installed once on a till.',
  ),
});
export type TillInput = z.infer<typeof tillInput>;

export const areaInput = z.object({ name: name('An area') });
export type AreaInput = z.infer<typeof areaInput>;

export const tillParams = z.object({ site: z.string(), till: id });
export const areaParams = z.object({ site: z.string(), area: id });

/** One queue read again on its till, without opening the whole till. */
export const queueParams = z.object({ site: z.string(), till: id, printer: id });
