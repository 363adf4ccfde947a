import { passwordInput } from '@/features/account/schema';
import { changePassword } from '@/features/account/server/change-password';
import { route } from '@/lib/server/route';

export const POST = route({ permission: 'signed-in', body: passwordInput }, ({ person, body }) => changePassword(person, body));
