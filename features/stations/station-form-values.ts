import { meshes, stationColours, type Station } from '@/lib/domain/site/station';
import { suggestCode } from '@/lib/domain/stations/codes';
import type { StationInput } from './schema';

const firstFree = <Value extends string>(values: readonly [Value, ...Value[]], taken: readonly Value[]): Value => values.find((value) => !taken.includes(value)) ?? values[0];

/** What the form starts with: a code, a mesh and a colour that no other station has. */
export const newStationInput = (others: readonly Station[]): StationInput => ({
  name: '', code: suggestCode('', others) ?? '', kind: 'prep', mesh: firstFree(meshes, others.map((one) => one.mesh)), colour: firstFree(stationColours, others.map((one) => one.colour)),
  printers: [], open: true, standIn: null, layout: 'by-course', ticketsPerSending: 1, pace: null,
});

export const inputOfStation = ({ id: _id, version: _version, position: _position, printers, ...station }: Station): StationInput => ({ ...station, printers: [...printers] });
