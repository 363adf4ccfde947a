import { stationInput, stationParams } from '@/features/stations/schema';
import { deleteStation, updateStation } from '@/features/stations/server/stations';
import { route } from '@/lib/server/route';

export const PUT = route({ permission: 'station.write', params: stationParams, body: stationInput, ifMatch: true }, ({ params, body, version, ...actor }) => updateStation(actor, params.station, version, body));

export const DELETE = route({ permission: 'station.write', params: stationParams, ifMatch: true }, ({ params, version, ...actor }) => deleteStation(actor, params.station, version));
