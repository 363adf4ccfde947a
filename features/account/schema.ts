import { z } from 'zod';

/** Passwords that everybody tries first, out of the lists that are published after break-ins; from memory. */
const common = new Set(['password', 'passwort', '12345678', '123456789', '1234567890', 'qwertyuiop', 'qwerty123', 'iloveyou', 'letmein1', 'welcome1', 'password1', 'password123', 'football', 'baseball', 'sunshine', 'princess', 'superman', 'trustno1', 'abcd1234', 'asdfghjkl']);

/** At least 8 characters and no rules of composition (OWASP ASVS 5.0, 6.2.1 and 6.2.5). */
export const newPassword = z.string()
  .min(8, 'A password has at least 8 characters; three words are better.')
  .max(256, 'A password has at most 256 characters.')
  .refine((password) => !common.has(password.toLowerCase()), 'This is one of the passwords that are tried first. Choose another.');

export const passwordInput = z.strictObject({ current: z.string().min(1, 'Say the present password.').max(256), next: newPassword });
export type PasswordInput = z.output<typeof passwordInput>;
