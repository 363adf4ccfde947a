import { send } from '@/lib/http/client';
import { planUrl } from './plan-url';

export type PresenceAnswer = { readonly others: readonly string[]; readonly newest: number };

/** Says "I am here" and hears who else is; null while the connection is out. */
export const pingPresence = async (siteId: string, planId: string): Promise<PresenceAnswer | null> => {
  try {
    return await send<PresenceAnswer>('POST', `${planUrl(siteId, planId)}/presence`);
  } catch {
    return null;
  }
};
