import { send } from '@/lib/http/client';

const areasUrl = (siteId: string): string => `/api/sites/${encodeURIComponent(siteId)}/areas`;

export const addArea = (siteId: string, name: string): Promise<unknown> => send('POST', areasUrl(siteId), { body: { name } });

export const renameArea = (siteId: string, area: string, version: number, name: string): Promise<unknown> =>
  send('PUT', `${areasUrl(siteId)}/${encodeURIComponent(area)}`, { body: { name }, version });

export const takeAreaOff = (siteId: string, area: string, version: number): Promise<unknown> =>
  send('DELETE', `${areasUrl(siteId)}/${encodeURIComponent(area)}`, { version });
