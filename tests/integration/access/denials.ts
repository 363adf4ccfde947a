import type { Permission } from '@/lib/domain/roles/permissions';

/**
 * Who may call what: an entry for every method of every route under app/api. The test beside this file reads the routes
 * from disk and fails for one that has no entry, then calls each as everybody who may not.
 */
export type Denial = {
  /** The folder under app/api. */
  readonly route: string;
  readonly method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  readonly permission: Permission | 'signed-in' | 'public';
  /** Ids in the address besides the site's, of rows that only the other site has: even an owner must not reach them. */
  readonly foreign?: Readonly<Record<string, string>>;
  /** The same of rows that the site itself has, where nothing is read of the row. */
  readonly own?: Readonly<Record<string, string>>;
  /** What a right call sends: needed to come as far as the row, and where the right depends on it. */
  readonly body?: unknown;
  /** For what needs no right on a site: why that is so. */
  readonly why?: string;
};

type More = Pick<Denial, 'foreign' | 'own' | 'body'>;

const methods = (route: string, permission: Permission, names: readonly Denial['method'][], more: More = {}): readonly Denial[] =>
  names.map((method) => ({ route: `sites/[site]/${route}`, method, permission, ...more }));

const fix = (permission: Permission, body: Readonly<Record<string, unknown>>): Denial => ({ route: 'sites/[site]/fixes', method: 'POST', permission, body: { fix: { label: 'Mend it', ...body } } });

export const denials: readonly Denial[] = [
  { route: 'auth/[...nextauth]', method: 'GET', permission: 'public', why: 'signing in, and the token that its form needs' },
  { route: 'auth/[...nextauth]', method: 'POST', permission: 'public', why: 'signing in' },
  { route: 'account/light', method: 'POST', permission: 'public', why: 'a cookie of this browser, and nothing else' },
  { route: 'account/sign-out', method: 'POST', permission: 'public', why: 'ends the session that comes with it, if one does' },
  { route: 'account/invitation', method: 'POST', permission: 'public', why: 'whoever holds the token of an invitation' },
  { route: 'account/invitation/join', method: 'POST', permission: 'signed-in', why: 'one’s own place on a site, by invitation' },
  { route: 'account/password', method: 'POST', permission: 'signed-in', why: 'one’s own password' },

  ...methods('areas', 'till.write', ['POST']),
  ...methods('areas/[area]', 'till.write', ['PUT', 'DELETE'], { foreign: { area: 'garden' }, body: { name: 'Yard' } }),
  ...methods('tills', 'till.write', ['POST']),
  ...methods('tills/[till]', 'till.write', ['PUT', 'DELETE'], { foreign: { till: 'garden-handheld' } }),
  ...methods('queues/[till]/[printer]', 'till.write', ['PUT', 'DELETE'], { foreign: { till: 'shop-counter', printer: 'oven1' }, body: { typedName: 'OVEN1', portKind: 'tcp', portAddress: '', testPrintedAt: null } }),

  ...methods('printers', 'printer.write', ['POST']),
  ...methods('printers/[printer]', 'printer.write', ['PUT', 'DELETE'], { foreign: { printer: 'oven1' } }),
  ...methods('printers/[printer]/backup', 'printer.set-backup', ['PUT'], { foreign: { printer: 'oven1' }, body: { backup: null } }),
  ...methods('printers/[printer]/down', 'printer.mark-down', ['PUT'], { foreign: { printer: 'oven1' }, body: { down: true, reason: 'Paper' } }),
  ...methods('printers/[printer]/tests', 'printer.test', ['POST'], { foreign: { printer: 'oven1' }, body: { till: 'shop-counter', printed: true } }),

  ...methods('stations', 'station.write', ['POST']),
  ...methods('stations/order', 'station.write', ['PUT']),
  ...methods('stations/[station]', 'station.write', ['PUT', 'DELETE'], { foreign: { station: 'oven' } }),

  ...methods('items', 'menu.write', ['POST', 'PUT']),
  ...methods('items/order', 'menu.write', ['PUT']),
  ...methods('items/[item]', 'site.read', ['GET'], { foreign: { item: 'baguette' } }),
  ...methods('items/[item]', 'menu.write', ['PUT', 'DELETE'], { foreign: { item: 'baguette' }, body: { section: 'pasta', name: 'Baguette' } }),
  ...methods('sections', 'menu.write', ['POST']),
  ...methods('sections/order', 'menu.write', ['PUT']),
  ...methods('sections/[section]', 'menu.write', ['PUT', 'DELETE'], { foreign: { section: 'bread' }, body: { name: 'Loaves' } }),
  ...methods('option-groups', 'menu.write', ['POST']),
  ...methods('option-groups/[group]', 'menu.write', ['PUT', 'DELETE'], { foreign: { group: 'bread' }, body: { name: 'Loaf', min: 0, max: 1, options: [{ id: null, name: 'Rye' }] } }),
  ...methods('menu-file', 'site.read', ['GET']),
  ...methods('menu-file', 'menu.write', ['POST']),

  ...methods('plans', 'plan.write', ['POST']),
  ...methods('plans/order', 'plan.write', ['PUT']),
  ...methods('plans/[plan]', 'site.read', ['GET'], { foreign: { plan: 'every-day' } }),
  ...methods('plans/[plan]', 'plan.write', ['PUT', 'DELETE'], { foreign: { plan: 'every-day' }, body: { content: { offers: null, rules: [] }, summary: 'Emptied' } }),
  ...methods('plans/[plan]', 'plan.write', ['PATCH'], { foreign: { plan: 'every-day' }, body: { name: 'Feast', was: 'Every day' } }),
  ...methods('plans/[plan]/weekly-times', 'plan.write', ['PUT'], { foreign: { plan: 'every-day' }, body: { weeklyTimes: [], was: [] } }),
  ...methods('plans/[plan]/presence', 'site.read', ['POST'], { own: { plan: 'dinner' } }),
  ...methods('plans/[plan]/site', 'site.read', ['GET'], { own: { plan: 'dinner' } }),
  ...methods('try', 'order.try', ['POST']),

  ...methods('people/[person]', 'people.write', ['PUT', 'DELETE'], { foreign: { person: 'bram-okonjo' }, body: { role: 'trainer', title: '', mayOverride: false } }),
  ...methods('people/invitations', 'people.write', ['POST']),
  ...methods('people/invitations/[invitation]', 'people.write', ['POST', 'DELETE'], { foreign: { invitation: 'elsewhere' } }),

  ...methods('settings/about', 'site.settings', ['PUT']),
  ...methods('settings/network', 'network.write', ['PUT']),
  ...methods('settings/link', 'network.write', ['PUT']),
  ...methods('settings/shared-points', 'network.write', ['PUT']),
  ...methods('settings/names', 'site.settings', ['PUT']),
  ...methods('settings/courses', 'site.settings', ['PUT']),
  ...methods('settings/follow', 'site.settings', ['PUT']),
  ...methods('settings/contacts', 'site.settings', ['PUT']),

  // A fix takes the right of the change that it makes.
  fix('printer.write', { kind: 'rename-printer', printer: 'oven1', name: 'OVEN9' }),
  fix('printer.set-backup', { kind: 'set-backup', printer: 'oven1', backup: 'coffee1' }),
  fix('till.write', { kind: 'set-till-address', till: 'shop-counter', address: '192.168.40.11' }),
  fix('network.write', { kind: 'set-network', change: { gateway: '10.20.30.2' } }),
  fix('network.write', { kind: 'reserve-address', address: '10.20.30.77', reason: 'Scales' }),
  fix('station.write', { kind: 'set-stand-in', station: 'grill', standIn: 'sauce' }),
];
