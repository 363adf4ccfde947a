import { readFileSync } from 'node:fs';
import path from 'node:path';
import type { Role } from '@/lib/domain/roles/permissions';

export type DemoPerson = { readonly email: string; readonly name: string; readonly site: string; readonly siteId: string; readonly role: Role };

/** What one run of browser tests keeps: who can sign in, and the cookies of each. */
export const keptFolder = path.resolve(import.meta.dirname, '../../../.data/browser');
export const keptPeople = path.join(keptFolder, 'people.json');
export const stateOf = (role: Role): string => path.join(keptFolder, `${role}.json`);

/** Said by `npm test`, which starts the product under test. */
export function told(name: 'TAMIS_BASE_URL' | 'TAMIS_DEMO_PASSWORD' | 'DATABASE_URL' | 'TAMIS_MAIL_FOLDER'): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is not set: browser tests are started by "npm test", or alone by "npm test browser".`);
  return value;
}

/** The demo's people on the site that the tests visit. */
export const demoPeople = (): readonly DemoPerson[] => JSON.parse(readFileSync(keptPeople, 'utf8')) as readonly DemoPerson[];

export function personWith(role: Role): DemoPerson {
  const person = demoPeople().find((each) => each.role === role);
  if (!person) throw new Error(`the demo has nobody with the role ${role}`);
  return person;
}
