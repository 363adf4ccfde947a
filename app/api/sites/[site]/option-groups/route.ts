import { optionGroupInput, siteParams } from '@/features/menu/schema';
import { createOptionGroup } from '@/features/menu/server/create-option-group';
import { route } from '@/lib/server/route';

export const POST = route({ permission: 'menu.write', params: siteParams, body: optionGroupInput }, ({ body, ...actor }) => createOptionGroup(actor, body));
