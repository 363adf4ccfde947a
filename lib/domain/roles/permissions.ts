/** What a person may be on one site; the same person may be another on the next. */
export const roles = ['owner', 'chef', 'installer', 'trainer'] as const;
export type Role = (typeof roles)[number];

/** Who may do what. Reading one's own site is `site.read`. */
export const permissions = {
  'site.read': ['owner', 'chef', 'installer', 'trainer'],
  'order.try': ['owner', 'chef', 'installer', 'trainer'],
  'menu.write': ['owner', 'chef'],
  'station.write': ['owner', 'chef'],
  'plan.write': ['owner', 'chef'],
  'plan.go-live': ['owner', 'chef'],
  'station.close': ['owner', 'chef'],
  'stop.override': ['owner'],
  'printer.write': ['owner', 'installer'],
  'till.write': ['owner', 'installer'],
  'network.write': ['owner', 'installer'],
  'printer.test': ['owner', 'chef', 'installer'],
  'printer.mark-down': ['owner', 'chef', 'installer'],
  'printer.set-backup': ['owner', 'chef', 'installer'],
  'site.copy': ['owner', 'installer'],
  'scenario.write': ['owner', 'chef', 'trainer'],
  'people.write': ['owner'],
  'site.settings': ['owner'],
  'history.read': ['owner', 'chef', 'installer', 'trainer'],
  'handover.write': ['owner', 'installer'],
} as const satisfies Readonly<Record<string, readonly Role[]>>;

export type Permission = keyof typeof permissions;

/** A chef may override a stop only when the owner allows this person. */
export type Membership = { readonly role: Role; readonly mayOverride: boolean };

export const may = (membership: Membership, permission: Permission): boolean =>
  (permissions[permission] as readonly Role[]).includes(membership.role)
  || (permission === 'stop.override' && membership.role === 'chef' && membership.mayOverride);
