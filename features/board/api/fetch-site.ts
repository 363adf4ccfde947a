import type { Site } from '@/lib/domain/site/site';
import { send } from '@/lib/http/client';
import { planUrl } from './plan-url';

/** The whole site, for the proof beside the board. */
export const fetchSite = async (siteId: string, planId: string): Promise<Site> =>
  (await send<{ site: Site }>('GET', `${planUrl(siteId, planId)}/site`)).site;
