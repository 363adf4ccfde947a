import 'server-only';
import type { Transaction } from 'sequelize';
import type { Site } from '@/lib/domain/site/site';
import { isOneOf, refuseBroken } from '@/lib/server/devices-of-site';
import { ContactRow } from '@/models/contact';
import { CourseRow } from '@/models/course';
import { ReservedAddressRow } from '@/models/reserved-address';
import { SharedPointRow } from '@/models/shared-point';
import type { Part, Values } from '../schema';
import { writeNamedRows } from './write-named-rows';

const writeReserved = async (transaction: Transaction, site: Site, { reserved }: Values<'network'>): Promise<void> => {
  refuseBroken(reserved.map(({ address }, index) => ({
    field: `reserved.${index}.address`, reason: `${address} stands in the list twice. Only one can have it.`, broken: reserved.slice(0, index).some((other) => other.address === address),
  })));
  const siteId = site.id;
  await ReservedAddressRow.destroy({ where: { siteId }, transaction });
  await ReservedAddressRow.bulkCreate(reserved.map(({ address, reason }, position) => ({ siteId, address, reason, position })), { transaction });
};

/** A course that dishes belong to stays: without it they would come out under no course at all. */
const writeCourses = async (transaction: Transaction, site: Site, { courses }: Values<'courses'>): Promise<void> => {
  refuseBroken(site.courses.filter(({ id }) => !courses.some((course) => course.id === id)).map(({ id, name }) => {
    const items = site.menu.items.filter(({ course }) => course === id).length;
    return { field: 'courses', reason: `${items} ${items === 1 ? 'item is' : 'items are'} in ${name}. Give ${items === 1 ? 'it' : 'them'} another course on the menu first.`, broken: items > 0 };
  }));
  await writeNamedRows(transaction, CourseRow, { siteId: site.id, list: 'courses', before: site.courses, after: courses });
};

const linkMustFit = (site: Site, { kind, till }: Values<'link'>): void => refuseBroken([
  { field: 'till', reason: 'Choose the till that it runs on.', broken: kind === 'till' && till === '' },
  { field: 'till', reason: 'This till is no longer on the site. Choose another.', broken: kind === 'till' && till !== '' && !isOneOf(site.tills, till) },
]);

const writeContacts = async (transaction: Transaction, { id: siteId }: Site, { contacts }: Values<'contacts'>): Promise<void> => {
  await ContactRow.destroy({ where: { siteId }, transaction });
  await ContactRow.bulkCreate(contacts.map((contact, position) => ({ siteId, position, ...contact })), { transaction });
};

/** What the site's own row holds of a part. */
export const rowValuesOf: { readonly [Of in Part]: (values: Values<Of>) => object } = {
  about: (values) => values,
  network: ({ subnet, gateway, poolFrom, poolTo }) => ({ subnet, gateway, poolFrom, poolTo }),
  link: ({ kind, till, address, mask }) => ({ linkKind: kind, linkTillId: kind === 'till' ? till : null, linkAddress: kind === 'own' ? address : '', linkMask: kind === 'own' ? mask : '' }),
  names: ({ minLength, maxLength, allowUnderscore, allowHyphen, mustStartWithLetter }) => ({
    nameMinLength: minLength, nameMaxLength: maxLength, nameAllowUnderscore: allowUnderscore, nameAllowHyphen: allowHyphen, nameMustStartWithLetter: mustStartWithLetter,
  }),
  follow: (values) => values,
  'shared-points': () => ({}),
  courses: () => ({}),
  contacts: () => ({}),
};

const nothing = async (): Promise<void> => undefined;

/** What a part keeps in tables of its own; refuses, on the field it is about, what cannot stand beside the rest of the site. */
export const writeListsOf: { readonly [Of in Part]: (transaction: Transaction, site: Site, values: Values<Of>) => Promise<void> } = {
  about: nothing,
  network: writeReserved,
  link: nothing,
  names: nothing,
  follow: nothing,
  'shared-points': (transaction, site, { points }) => writeNamedRows(transaction, SharedPointRow, { siteId: site.id, list: 'points', before: site.sharedPoints, after: points }),
  courses: writeCourses,
  contacts: writeContacts,
};

export const partMustFit = <Of extends Part>(part: Of, site: Site, values: Values<Of>): void => {
  if (part === 'link') linkMustFit(site, values as Values<'link'>);
};
