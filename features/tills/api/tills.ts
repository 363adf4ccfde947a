import { send } from '@/lib/http/client';
import type { TillInput } from '../schema';

const tillsUrl = (siteId: string): string => `/api/sites/${encodeURIComponent(siteId)}/tills`;
const tillUrl = (siteId: string, till: string): string => `${tillsUrl(siteId)}/${encodeURIComponent(till)}`;

type Saved = { readonly id: string; readonly version: number };

export const addTill = (siteId: string, input: TillInput): Promise<Saved> => send('POST', tillsUrl(siteId), { body: input });

export const saveTill = (siteId: string, till: string, version: number, input: TillInput): Promise<Saved> => send('PUT', tillUrl(siteId, till), { body: input, version });

export const takeTillOff = (siteId: string, till: string, version: number): Promise<unknown> => send('DELETE', tillUrl(siteId, till), { version });
