import type { ContactKind, FollowMode, SharedPointKind } from '@/lib/domain/site/site';
import type { Values } from './schema';

export const sharedPointWords: Readonly<Record<SharedPointKind, string>> = { switch: 'Switch', 'access-point': 'Access point', 'power-strip': 'Power strip', other: 'Something else' };

export const contactWords: Readonly<Record<ContactKind, string>> = { installer: 'Installer', network: 'Network provider', electrician: 'Electrician' };

export const followWords: Readonly<Record<FollowMode, string>> = { 'by-hand': 'By hand', asking: 'Asking', 'through-link': 'Through the link' };

/** What each way means for service: a plan on a screen prints nothing by itself. */
export const followMeanings: Readonly<Record<FollowMode, string>> = {
  'by-hand': 'After each change somebody sets the tills, one by one, from a list of what differs. Nothing changes on a till before that.',
  asking: 'The ordering software asks Tamis for each order, or reads the live plan. A change is in force when a till has asked again.',
  'through-link': 'The tills’ printers point to the print link, once. Closed stations, diverts and backups are in force at once; moved menu sections still need one of the other two.',
};

export const linkWords: Readonly<Record<Values<'link'>['kind'], string>> = { none: 'No print link', till: 'On a till', own: 'On a device of its own' };

/** "English (en)" in English, whatever the browser speaks. */
export const sayLanguage = (tag: string): string => {
  const known = new Intl.DisplayNames('en', { type: 'language', fallback: 'none' }).of(tag);
  return known === undefined ? tag : `${known} (${tag})`;
};
