import { asId } from '@/lib/domain/site/ids';
import type { Till } from '@/lib/domain/site/till';
import type { TillInput } from './schema';

/** The id a till goes by until the server has given it one. */
export const newTillId = 'new';

/** The till as it would be if this were saved. */
export const tillOfInput = (input: TillInput, id: string, version: number): Till => ({
  ...input,
  id: asId(id),
  version,
  area: asId(input.area),
  sharedPoints: input.sharedPoints.map((point) => asId(point)),
  defaultPrinter: input.defaultPrinter === null ? null : asId(input.defaultPrinter),
  printsThrough: input.kind === 'online' || input.printsThrough === null ? null : asId(input.printsThrough),
  queues: input.queues.map((queue) => ({ ...queue, printer: asId(queue.printer) })),
});

export const inputOfTill = ({ id: _id, version: _version, ...till }: Till): TillInput => ({
  ...till,
  orderTypes: [...till.orderTypes],
  sharedPoints: [...till.sharedPoints],
  queues: till.queues.map((queue) => ({ ...queue })),
});
