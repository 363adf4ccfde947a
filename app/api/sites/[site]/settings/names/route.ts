import { namingInput, siteParams } from '@/features/site-settings/schema';
import { savePart } from '@/features/site-settings/server/save-part';
import { route } from '@/lib/server/route';

export const PUT = route(
  { permission: 'site.settings', params: siteParams, body: namingInput, ifMatch: true },
  ({ body, version, ...actor }) => savePart(actor, 'names', { version, values: body }),
);
