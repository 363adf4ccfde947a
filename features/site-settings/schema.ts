import { z } from 'zod';
import { longestNameBytes } from '@/lib/domain/names/name-limits';
import { contactKinds, followModes, sharedPointKinds } from '@/lib/domain/site/site';

const id = z.string().regex(/^[A-Za-z0-9._-]{1,36}$/, 'This is no id of this site.');
const words = (most: number) => z.string().trim().max(most, `At most ${most} characters.`);
const name = (what: string, most: number) => z.string().trim().min(1, `${what} needs a name.`).max(most, `At most ${most} characters.`);

/** Zones that have a name; an offset alone would not know of summer time. */
const isZone = (zone: string): boolean => {
  try {
    return /^[A-Za-z]/.test(zone) && new Intl.DateTimeFormat('en', { timeZone: zone }).resolvedOptions().timeZone !== '';
  } catch {
    return false;
  }
};

const isLanguage = (tag: string): boolean => {
  try {
    return Intl.getCanonicalLocales(tag).length === 1;
  } catch {
    return false;
  }
};

export const aboutInput = z.object({
  name: name('A site', 120),
  place: words(120),
  timeZone: z.string().trim().max(64).refine(isZone, 'There is no such time zone. Write it as in the list, for example Europe/Dublin.'),
  language: z.string().trim().max(35).refine(isLanguage, 'This is no language tag. Write it as in the list, for example en or de-AT.'),
});

/** Addresses are kept as they were found on site; the checks say what is wrong with them. */
export const networkInput = z.object({
  subnet: words(50),
  gateway: words(45),
  poolFrom: words(45),
  poolTo: words(45),
  reserved: z.array(z.object({ address: words(45).pipe(z.string().min(1, 'Write the address, or take the line off.')), reason: words(200) })).max(500, 'At most 500 addresses.'),
});

/** Where the link runs; what the other ways would need stays as typed and is not kept. */
export const linkInput = z.object({ kind: z.enum(['none', 'till', 'own']), till: z.union([id, z.literal('')]), address: words(45), mask: words(45) });

export const sharedPointsInput = z.object({
  points: z.array(z.object({ id: z.union([id, z.literal('')]), name: name('A shared point', 120), kind: z.enum(sharedPointKinds) })).max(200, 'At most 200 shared points.'),
});

export const coursesInput = z.object({
  courses: z.array(z.object({ id: z.union([id, z.literal('')]), name: name('A course', 60) })).max(30, 'At most 30 courses.'),
});

const length = z.number('Write a number.').int('Write a whole number.').min(1, 'At least 1.').max(longestNameBytes, `At most ${longestNameBytes}: print systems cut what is longer.`);

export const namingInput = z.object({
  minLength: length, maxLength: length, allowUnderscore: z.boolean(), allowHyphen: z.boolean(), mustStartWithLetter: z.boolean(),
}).refine(({ minLength, maxLength }) => minLength <= maxLength, { path: ['maxLength'], message: 'The longest name cannot be shorter than the shortest.' });

export const followInput = z.object({ follows: z.enum(followModes) });

export const contactsInput = z.object({
  contacts: z.array(z.object({
    kind: z.enum(contactKinds), name: name('A contact', 120), phone: words(60), email: words(254).refine((email) => email === '' || z.email().safeParse(email).success, 'This is no e-mail address.'),
  })).max(30, 'At most 30 contacts.'),
});

/** The settings of a site, in the parts that are edited and saved on their own. */
export const partSchemas = {
  about: aboutInput, network: networkInput, link: linkInput, 'shared-points': sharedPointsInput, names: namingInput, courses: coursesInput, follow: followInput, contacts: contactsInput,
} as const;

export type Part = keyof typeof partSchemas;
export type Values<Of extends Part> = z.output<(typeof partSchemas)[Of]>;

export const siteParams = z.object({ site: z.string() });
