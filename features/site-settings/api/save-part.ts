import { send } from '@/lib/http/client';
import type { Part, Values } from '../schema';

export const savePart = <Of extends Part>(siteId: string, part: Of, version: number, values: Values<Of>): Promise<unknown> =>
  send('PUT', `/api/sites/${encodeURIComponent(siteId)}/settings/${part}`, { body: values, version });
