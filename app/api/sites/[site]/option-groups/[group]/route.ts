import { groupParams, optionGroupInput } from '@/features/menu/schema';
import { deleteOptionGroup } from '@/features/menu/server/delete-option-group';
import { updateOptionGroup } from '@/features/menu/server/update-option-group';
import { route } from '@/lib/server/route';

export const PUT = route(
  { permission: 'menu.write', params: groupParams, body: optionGroupInput, ifMatch: true },
  ({ params, body, version, ...actor }) => updateOptionGroup(actor, { group: params.group, version, input: body }),
);

export const DELETE = route(
  { permission: 'menu.write', params: groupParams, ifMatch: true },
  ({ params, version, ...actor }) => deleteOptionGroup(actor, { group: params.group, version }),
);
