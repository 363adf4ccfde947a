import 'server-only';
import { cache } from 'react';
import { headers } from 'next/headers';
import { forbidden, notFound, redirect } from 'next/navigation';
import { may, type Permission } from '@/lib/domain/roles/permissions';
import type { Site } from '@/lib/domain/site/site';
import type { Person, SiteMembership } from './actor';
import { currentPerson, membershipOn, sitesOf, type MySite } from './current-person';
import { loadSite } from './site-snapshot';

export type OpenSite = { readonly person: Person; readonly membership: SiteMembership; readonly site: Site };

const siteOnce = cache((siteId: string): Promise<Site | null> => loadSite(siteId));
const membershipOnce = cache(membershipOn);

/** Sends a stranger to the sign-in page, which brings them back. */
export const signedInPerson = async (): Promise<Person> => {
  const person = await currentPerson();
  if (person !== null) return person;
  const path = (await headers()).get('x-tamis-path') ?? '/';
  redirect(`/sign-in?next=${encodeURIComponent(path)}`);
};

/**
 * Opens a site for a page: who looks, as what, and the whole site. A site that is not yours does not exist for you; a page
 * that is not for your role says so.
 */
export const openSite = async (siteId: string, permission: Permission): Promise<OpenSite> => {
  const person = await signedInPerson();
  const membership = await membershipOnce(person.id, siteId);
  if (membership === null) notFound();
  if (!may(membership, permission)) forbidden();
  const site = await siteOnce(siteId);
  return site === null ? notFound() : { person, membership, site };
};

export const mySites = async (): Promise<{ readonly person: Person; readonly sites: readonly MySite[] }> => {
  const person = await signedInPerson();
  return { person, sites: await sitesOf(person.id) };
};
