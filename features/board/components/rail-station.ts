import type { StationPlates } from '@/lib/domain/plans/plates';
import type { StationId } from '@/lib/domain/site/ids';
import type { Station } from '@/lib/domain/site/station';

/** A station as the head of its rail, with the printers at the rail's end. */
export type RailStation = Pick<Station, 'name' | 'code' | 'kind' | 'mesh' | 'colour'> & {
  readonly id: StationId;
  /** "Stand-in Sauce". */
  readonly standIn: string;
  readonly plates: StationPlates['plates'];
};
