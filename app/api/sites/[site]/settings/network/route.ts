import { networkInput, siteParams } from '@/features/site-settings/schema';
import { savePart } from '@/features/site-settings/server/save-part';
import { route } from '@/lib/server/route';

export const PUT = route(
  { permission: 'network.write', params: siteParams, body: networkInput, ifMatch: true },
  ({ body, version, ...actor }) => savePart(actor, 'network', { version, values: body }),
);
