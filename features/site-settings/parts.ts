import type { Permission } from '@/lib/domain/roles/permissions';
import type { Site } from '@/lib/domain/site/site';
import type { Part, Values } from './schema';

/** In the order of the page: what the installer needs first stands first. */
export const partOrder: readonly Part[] = ['network', 'link', 'shared-points', 'about', 'follow', 'names', 'courses', 'contacts'];

export const partTitles: Readonly<Record<Part, string>> = {
  about: 'The site', network: 'Network', link: 'Print link', 'shared-points': 'Shared points', names: 'Printer names', courses: 'Courses', follow: 'How the tills follow', contacts: 'Contacts',
};

/** The network is the installer's work as well; the rest is for the owner to say. */
export const partPermissions = {
  about: 'site.settings', network: 'network.write', link: 'network.write', 'shared-points': 'network.write',
  names: 'site.settings', courses: 'site.settings', follow: 'site.settings', contacts: 'site.settings',
} as const satisfies Readonly<Record<Part, Permission>>;

export const isPart = (text: string | undefined): text is Part => text !== undefined && Object.hasOwn(partTitles, text);

const linkValues = ({ link }: Site): Values<'link'> => ({
  kind: link.kind, till: link.kind === 'till' ? link.till : '', address: link.kind === 'own' ? link.address : '', mask: link.kind === 'own' ? link.mask : '',
});

/** The values of every part, as its form starts with them. */
export const valuesOf: { readonly [Of in Part]: (site: Site) => Values<Of> } = {
  about: ({ name, place, timeZone, language }) => ({ name, place, timeZone, language }),
  network: ({ network: { subnet, gateway, poolFrom, poolTo, reserved } }) => ({ subnet, gateway, poolFrom, poolTo, reserved: reserved.map(({ address, reason }) => ({ address, reason })) }),
  link: linkValues,
  'shared-points': ({ sharedPoints }) => ({ points: sharedPoints.map(({ id, name, kind }) => ({ id, name, kind })) }),
  names: ({ namingPolicy: { minLength, maxLength, allowUnderscore, allowHyphen, mustStartWithLetter } }) => ({ minLength, maxLength, allowUnderscore, allowHyphen, mustStartWithLetter }),
  courses: ({ courses }) => ({ courses: courses.map(({ id, name }) => ({ id, name })) }),
  follow: ({ follows }) => ({ follows }),
  contacts: ({ contacts }) => ({ contacts: contacts.map(({ kind, name, phone, email }) => ({ kind, name, phone, email })) }),
};
