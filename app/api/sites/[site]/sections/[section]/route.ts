import { sectionInput, sectionParams } from '@/features/menu/schema';
import { deleteSection, renameSection } from '@/features/menu/server/sections';
import { route } from '@/lib/server/route';

export const PUT = route({ permission: 'menu.write', params: sectionParams, body: sectionInput, ifMatch: true }, ({ params, body, version, ...actor }) => renameSection(actor, params.section, version, body));

export const DELETE = route({ permission: 'menu.write', params: sectionParams, ifMatch: true }, ({ params, version, ...actor }) => deleteSection(actor, params.section, version));
