import { z } from 'zod';
import { longestPassword } from '@/lib/domain/people/new-password';

const password = z.string().max(longestPassword * 2, `A password has at most ${longestPassword} characters.`);

export const changePasswordInput = z.object({
  current: password.min(1, 'Type the password that you sign in with now.'),
  wanted: password,
});
export type ChangePasswordInput = z.infer<typeof changePasswordInput>;
