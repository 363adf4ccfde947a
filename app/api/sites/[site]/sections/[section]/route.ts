import { sectionInput, sectionParams } from '@/features/menu/schema';
import { deleteSection } from '@/features/menu/server/delete-section';
import { renameSection } from '@/features/menu/server/rename-section';
import { route } from '@/lib/server/route';

export const PUT = route(
  { permission: 'menu.write', params: sectionParams, body: sectionInput, ifMatch: true },
  ({ params, body, version, ...actor }) => renameSection(actor, { section: params.section, version, name: body.name }),
);

export const DELETE = route(
  { permission: 'menu.write', params: sectionParams, ifMatch: true },
  ({ params, version, ...actor }) => deleteSection(actor, { section: params.section, version }),
);
