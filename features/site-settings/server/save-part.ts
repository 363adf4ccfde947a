import 'server-only';
import { actIn, type Actor } from '@/lib/server/actor';
import { readSite } from '@/lib/server/devices-of-site';
import { recordChange } from '@/lib/server/history';
import { updateVersioned } from '@/lib/server/versioned-update';
import { SiteRow } from '@/models/site';
import { partOf, settingDifferences } from '../facts';
import { partPermissions, partTitles } from '../parts';
import type { Part, Values } from '../schema';
import { partMustFit, rowValuesOf, writeListsOf } from './write-part';

type PartWrite<Of extends Part> = { readonly version: number; readonly values: Values<Of> };

/** Saves one part of a site's settings. All parts share the site's version: whoever saves second hears of the first. */
export const savePart = <Of extends Part>(actor: Actor, part: Of, { version, values }: PartWrite<Of>): Promise<{ readonly version: number }> =>
  actIn(actor, partPermissions[part], async (transaction) => {
    const { siteId } = actor;
    const site = await readSite(transaction, siteId);
    partMustFit(part, site, values);
    const row = await updateVersioned(SiteRow, { siteId, id: siteId, version }, rowValuesOf[part](values), transaction);
    await writeListsOf[part](transaction, site, values);
    const before = partOf(part, site);
    const changed = settingDifferences(part, before, values, site).map(({ label, to }) => `${label.toLowerCase()} ${to}`).join(', ');
    await recordChange(transaction, {
      siteId, personId: actor.person.id, action: `site.${part}`, subjectKind: 'site', subjectId: siteId, summary: `${partTitles[part]}: ${changed === '' ? 'saved as it was' : changed}`, before, after: values,
    });
    return { version: row.version };
  });
