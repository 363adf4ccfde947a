import type { Role } from '@/lib/domain/roles/permissions';

export type DemoMembership = { readonly site: string; readonly role: Role; readonly title: string; readonly mayOverride: boolean };
export type DemoPerson = { readonly id: string; readonly name: string; readonly email: string; readonly memberships: readonly DemoMembership[] };

const member = (site: string, role: Role, title: string, mayOverride = false): DemoMembership => ({ site, role, title, mayOverride });

/**
 * People who do not exist, at example addresses as RFC 2606 sets them aside: everybody who can sign in to the demo, with a
 * person for each role on both sites. Femi and Tomas work on both.
 */
export const people: readonly DemoPerson[] = [
  { id: 'marguerite-adeyemi', name: 'Marguerite Adeyemi', email: 'marguerite@lanternyard.example', memberships: [member('lantern-yard', 'owner', 'owner')] },
  { id: 'ines-okafor', name: 'Ines Okafor', email: 'ines@lanternyard.example', memberships: [member('lantern-yard', 'chef', 'head chef', true)] },
  {
    id: 'femi-lindqvist', name: 'Femi Lindqvist', email: 'femi@lindqvist.example',
    memberships: [member('lantern-yard', 'installer', 'installer'), member('pilgrims-oven', 'installer', 'installer')],
  },
  {
    id: 'tomas-brandt', name: 'Tomas Brandt', email: 'tomas@brandt.example',
    memberships: [member('lantern-yard', 'trainer', 'trainer'), member('pilgrims-oven', 'trainer', 'trainer')],
  },
  { id: 'halima-pettersen', name: 'Halima Pettersen', email: 'halima@pilgrimsoven.example', memberships: [member('pilgrims-oven', 'owner', 'owner')] },
  { id: 'bram-okonjo', name: 'Bram Okonjo', email: 'bram@pilgrimsoven.example', memberships: [member('pilgrims-oven', 'chef', 'head baker')] },
];
