import { asId } from '@/lib/domain/site/ids';
import type { Station } from '@/lib/domain/site/station';
import type { StationInput } from './schema';

/** The id a station goes by until the server has given it one. */
export const newStationId = 'new';

/** The station as it would be if this were saved. */
export const stationOfInput = (input: StationInput, id: string, before: Station | null): Station => ({
  ...input,
  id: asId(id),
  printers: input.printers.map((printer) => asId(printer)),
  standIn: input.standIn === null ? null : asId(input.standIn),
  position: before?.position ?? 0,
  version: before?.version ?? 1,
});
