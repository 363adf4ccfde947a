import 'server-only';
import type { Site } from '@/lib/domain/site/site';
import { AppError } from '@/lib/http/errors';
import { mustBeAllowed, type Actor } from '@/lib/server/actor';
import { loadSite } from '@/lib/server/site-snapshot';

export const readSite = async (actor: Actor): Promise<{ readonly site: Site }> => {
  mustBeAllowed(actor.membership, 'site.read');
  const site = await loadSite(actor.siteId);
  if (site === null) throw new AppError('not-found', 'This site is not there any more. Go back to the list of your sites.');
  return { site };
};
