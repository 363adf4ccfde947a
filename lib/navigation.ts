import type { Role } from '@/lib/domain/roles/permissions';

export type PageLink = { readonly name: string; readonly path: string };

const pages = {
  board: { name: 'Board', path: 'board' },
  menu: { name: 'Menu', path: 'menu' },
  stations: { name: 'Stations', path: 'stations' },
  printers: { name: 'Printers', path: 'printers' },
  tills: { name: 'Tills', path: 'tills' },
  proof: { name: 'Proof', path: 'proof' },
  try: { name: 'Try an order', path: 'try' },
  people: { name: 'People', path: 'people' },
  settings: { name: 'Site', path: 'settings' },
} as const satisfies Readonly<Record<string, PageLink>>;

/** The handful of pages that are each person's own, in the order they hang. */
const pagesOf: Readonly<Record<Role, readonly PageLink[]>> = {
  owner: [pages.board, pages.menu, pages.stations, pages.printers, pages.tills, pages.proof, pages.try, pages.people, pages.settings],
  chef: [pages.board, pages.menu, pages.stations, pages.proof, pages.try],
  installer: [pages.printers, pages.tills, pages.settings, pages.board, pages.proof, pages.try],
  trainer: [pages.board, pages.menu, pages.proof, pages.try],
};

export const navigationFor = (role: Role): readonly PageLink[] => pagesOf[role];

/** Where a person starts on a site. */
export const homePath = (siteId: string, role: Role): string => `/sites/${siteId}/${pagesOf[role][0]?.path ?? 'board'}`;
