import { groupParams, optionGroupInput } from '@/features/menu/schema';
import { deleteOptionGroup, updateOptionGroup } from '@/features/menu/server/option-groups';
import { route } from '@/lib/server/route';

export const PUT = route({ permission: 'menu.write', params: groupParams, body: optionGroupInput, ifMatch: true }, ({ params, body, version, ...actor }) => updateOptionGroup(actor, params.group, version, body));

export const DELETE = route({ permission: 'menu.write', params: groupParams, ifMatch: true }, ({ params, version, ...actor }) => deleteOptionGroup(actor, params.group, version));
