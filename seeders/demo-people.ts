import type { Role } from '@/lib/domain/roles/permissions';

export type DemoPerson = {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly memberships: readonly { readonly site: string; readonly role: Role; readonly title: string; readonly mayOverride?: boolean }[];
};

/** People who do not exist; example addresses as RFC 2606 sets them aside. */
export const demoPeople: readonly DemoPerson[] = [
  { id: 'person-oona', name: 'Oona Prideaux', email: 'oona@lantern-yard.example', memberships: [{ site: 'lantern-yard', role: 'owner', title: 'owner' }] },
  { id: 'person-ines', name: 'Ines Okafor', email: 'ines@lantern-yard.example', memberships: [{ site: 'lantern-yard', role: 'chef', title: 'head chef', mayOverride: true }] },
  { id: 'person-femi', name: 'Femi Lindqvist', email: 'femi@lindqvist-onsite.example', memberships: [{ site: 'lantern-yard', role: 'installer', title: 'installer' }, { site: 'pilgrims-oven', role: 'installer', title: 'installer' }] },
  { id: 'person-tomas', name: 'Tomas Brandt', email: 'tomas@lantern-yard.example', memberships: [{ site: 'lantern-yard', role: 'trainer', title: 'trainer' }] },
  { id: 'person-wilma', name: 'Wilma Achterberg', email: 'wilma@pilgrims-oven.example', memberships: [{ site: 'pilgrims-oven', role: 'owner', title: 'owner' }] },
  { id: 'person-ravi', name: 'Ravi Melnyk', email: 'ravi@pilgrims-oven.example', memberships: [{ site: 'pilgrims-oven', role: 'chef', title: 'baker' }] },
  { id: 'person-ailbhe', name: 'Ailbhe Sorensen', email: 'ailbhe@pilgrims-oven.example', memberships: [{ site: 'pilgrims-oven', role: 'trainer', title: 'shift lead' }] },
];
