import { siteParams, stationInput } from '@/features/stations/schema';
import { createStation } from '@/features/stations/server/create-station';
import { route } from '@/lib/server/route';

export const POST = route({ permission: 'station.write', params: siteParams, body: stationInput }, ({ body, ...actor }) => createStation(actor, body));
