import { sectionInput, siteParams } from '@/features/menu/schema';
import { createSection } from '@/features/menu/server/create-section';
import { route } from '@/lib/server/route';

export const POST = route({ permission: 'menu.write', params: siteParams, body: sectionInput }, ({ body, ...actor }) => createSection(actor, body));
