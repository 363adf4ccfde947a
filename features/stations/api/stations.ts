import { send } from '@/lib/http/client';
import type { StationInput } from '../schema';

const base = (siteId: string): string => `/api/sites/${encodeURIComponent(siteId)}/stations`;
const one = (siteId: string, id: string): string => `${base(siteId)}/${encodeURIComponent(id)}`;

export const addStation = (siteId: string, input: StationInput): Promise<unknown> => send('POST', base(siteId), { body: input });
export const saveStation = (siteId: string, id: string, version: number, input: StationInput): Promise<unknown> => send('PUT', one(siteId, id), { body: input, version });
export const dropStation = (siteId: string, id: string, version: number): Promise<unknown> => send('DELETE', one(siteId, id), { version });
export const placeStations = (siteId: string, ids: readonly string[]): Promise<unknown> => send('PUT', `${base(siteId)}/order`, { body: { ids } });
