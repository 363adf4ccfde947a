import { contactsInput, siteParams } from '@/features/site-settings/schema';
import { savePart } from '@/features/site-settings/server/save-part';
import { route } from '@/lib/server/route';

export const PUT = route(
  { permission: 'site.settings', params: siteParams, body: contactsInput, ifMatch: true },
  ({ body, version, ...actor }) => savePart(actor, 'contacts', { version, values: body }),
);
