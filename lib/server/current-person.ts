import 'server-only';
import { cache } from 'react';
import { getServerSession } from 'next-auth';
import { MembershipRow } from '@/models/membership';
import { SiteRow } from '@/models/site';
import type { Person, SiteMembership } from './actor';
import { authOptions } from './auth-options';
import { personOfSession, type SessionClaims } from './session';

/** The claims of the cookie that came with this request; they still have to be checked. */
export const currentClaims = async (): Promise<SessionClaims | null> => (await getServerSession(authOptions()))?.claims ?? null;

/** Who is signed in, once a request; null for nobody or for a session that was ended. */
export const currentPerson = cache(async (): Promise<Person | null> => {
  const claims = await currentClaims();
  return claims === null ? null : personOfSession(claims);
});

export const membershipOn = async (personId: string, siteId: string): Promise<SiteMembership | null> => {
  const row = await MembershipRow.findOne({ where: { personId, siteId } });
  return row === null ? null : { role: row.role, mayOverride: row.mayOverride, title: row.title };
};

export type MySite = { readonly id: string; readonly name: string; readonly place: string; readonly membership: SiteMembership };

/** The sites a person belongs to, by name. */
export const sitesOf = async (personId: string): Promise<readonly MySite[]> => {
  const memberships = await MembershipRow.findAll({ where: { personId } });
  const sites = await SiteRow.findAll({ where: { id: memberships.map((row) => row.siteId) }, order: ['name'] });
  return sites.flatMap((site) => {
    const row = memberships.find((one) => one.siteId === site.id);
    return row === undefined ? [] : [{ id: site.id, name: site.name, place: site.place, membership: { role: row.role, mayOverride: row.mayOverride, title: row.title } }];
  });
};
