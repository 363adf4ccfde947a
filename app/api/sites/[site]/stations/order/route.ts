import { orderInput, siteParams } from '@/features/stations/schema';
import { orderStations } from '@/features/stations/server/order-stations';
import { route } from '@/lib/server/route';

export const PUT = route({ permission: 'station.write', params: siteParams, body: orderInput }, ({ body, ...actor }) => orderStations(actor, body.ids));
