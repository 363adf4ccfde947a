import { stationInput, stationParams } from '@/features/stations/schema';
import { deleteStation } from '@/features/stations/server/delete-station';
import { updateStation } from '@/features/stations/server/update-station';
import { route } from '@/lib/server/route';

export const PUT = route(
  { permission: 'station.write', params: stationParams, body: stationInput, ifMatch: true },
  ({ params, body, version, ...actor }) => updateStation(actor, { station: params.station, version, input: body }),
);

export const DELETE = route(
  { permission: 'station.write', params: stationParams, ifMatch: true },
  ({ params, version, ...actor }) => deleteStation(actor, { station: params.station, version }),
);
