import type { RowFix } from '../row-fix';
import { send } from '@/lib/http/client';

export const applyFix = (siteId: string, fix: RowFix): Promise<{ readonly done: string }> =>
  send('POST', `/api/sites/${encodeURIComponent(siteId)}/fixes`, { body: { fix } });
