import { aboutInput, siteParams } from '@/features/site-settings/schema';
import { savePart } from '@/features/site-settings/server/save-part';
import { route } from '@/lib/server/route';

export const PUT = route(
  { permission: 'site.settings', params: siteParams, body: aboutInput, ifMatch: true },
  ({ body, version, ...actor }) => savePart(actor, 'about', { version, values: body }),
);
