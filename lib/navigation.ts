import type { Role } from '@/lib/domain/roles/permissions';

/** `path` is below the site, unless it starts with a slash. */
export type PageLink = { readonly name: string; readonly path: string };

const pages = {
  sites: { name: 'Sites', path: '/sites' },
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
  installer: [pages.sites, pages.printers, pages.tills, pages.settings, pages.board, pages.proof, pages.try],
  trainer: [pages.board, pages.menu, pages.proof, pages.try],
};

export const navigationFor = (role: Role): readonly PageLink[] => pagesOf[role];

export const hrefOf = ({ path }: PageLink, siteId: string): string => (path.startsWith('/') ? path : `/sites/${siteId}/${path}`);

/** Where each role starts on a site: with what is wrong there that is theirs to mend. */
const homeOf = { owner: pages.board, chef: pages.board, installer: pages.printers, trainer: pages.board } as const satisfies Readonly<Record<Role, PageLink>>;

export const homePath = (siteId: string, role: Role): string => hrefOf(homeOf[role], siteId);
