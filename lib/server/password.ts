import 'server-only';
import { hash, verify } from '@node-rs/argon2';

/** argon2id with the parameters of OWASP's password storage page (19 MiB, 2 passes, 1 lane). */
const parameters = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export const hashPassword = (password: string): Promise<string> => hash(password, parameters);

let stranger: Promise<string> | undefined;

/** Checks a password; an unknown person costs the same time, against a hash that nothing matches. */
export const passwordMatches = async (passwordHash: string | null, password: string): Promise<boolean> => {
  stranger ??= hashPassword('nobody has this one');
  const matches = await verify(passwordHash ?? (await stranger), password).catch(() => false);
  return passwordHash !== null && matches;
};
