import type { Role } from '@/lib/domain/roles/permissions';

export const roleWords: Readonly<Record<Role, string>> = { owner: 'Owner', chef: 'Chef', installer: 'Installer', trainer: 'Trainer' };

/** What a role is for, in the words of domain: who may what. */
export const roleMeanings: Readonly<Record<Role, string>> = {
  owner: 'May do everything, and says who else may what.',
  chef: 'Menu, stations and plans; puts plans live and closes stations.',
  installer: 'Printers, tills and the network.',
  trainer: 'Sees everything and trains people on it; changes nothing.',
};

/** "the head chef" reads better than "chef" where the site has words of its own. */
export const titleOrRole = ({ title, role }: { readonly title: string; readonly role: Role }): string => (title === '' ? role : title);
