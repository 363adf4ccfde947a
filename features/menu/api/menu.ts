import { send } from '@/lib/http/client';
import type { ItemInput, OptionGroupInput } from '../schema';
import type { DryRun } from '../dry-run';

export type Saved = { readonly id: string; readonly version: number };

const base = (siteId: string): string => `/api/sites/${encodeURIComponent(siteId)}`;
const one = (siteId: string, list: string, id: string): string => `${base(siteId)}/${list}/${encodeURIComponent(id)}`;

export const addSection = (siteId: string, name: string): Promise<Saved> => send('POST', `${base(siteId)}/sections`, { body: { name } });
export const saveSection = (siteId: string, id: string, version: number, name: string): Promise<Saved> => send('PUT', one(siteId, 'sections', id), { body: { name }, version });
export const dropSection = (siteId: string, id: string, version: number): Promise<unknown> => send('DELETE', one(siteId, 'sections', id), { version });
export const placeSections = (siteId: string, ids: readonly string[]): Promise<unknown> => send('PUT', `${base(siteId)}/sections/order`, { body: { ids } });

export const addItems = (siteId: string, items: readonly ItemInput[]): Promise<{ readonly items: readonly Saved[] }> => send('POST', `${base(siteId)}/items`, { body: { items } });
export const saveItem = (siteId: string, id: string, version: number, input: ItemInput): Promise<Saved> => send('PUT', one(siteId, 'items', id), { body: input, version });
export const dropItem = (siteId: string, id: string, version: number): Promise<unknown> => send('DELETE', one(siteId, 'items', id), { version });
export const placeItems = (siteId: string, ids: readonly string[]): Promise<unknown> => send('PUT', `${base(siteId)}/items/order`, { body: { ids } });

export const addOptionGroup = (siteId: string, input: OptionGroupInput): Promise<Saved> => send('POST', `${base(siteId)}/option-groups`, { body: input });
export const saveOptionGroup = (siteId: string, id: string, version: number, input: OptionGroupInput): Promise<Saved> => send('PUT', one(siteId, 'option-groups', id), { body: input, version });
export const dropOptionGroup = (siteId: string, id: string, version: number): Promise<unknown> => send('DELETE', one(siteId, 'option-groups', id), { version });

/** Sends a file to be looked at, or with the digest of what was looked at to be applied. */
export const sendMenuFile = (siteId: string, file: Blob, query: { readonly mapping?: string; readonly apply?: string }): Promise<DryRun> =>
  send('POST', `${base(siteId)}/menu-file?${new URLSearchParams(query)}`, { file });

export const menuFileHref = (siteId: string): string => `${base(siteId)}/menu-file`;
