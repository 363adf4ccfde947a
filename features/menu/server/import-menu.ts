import 'server-only';
import { createHash, randomUUID } from 'node:crypto';
import { itemDifferences, type ItemNaming } from '@/lib/domain/menu/item-differences';
import { planImport, type ImportPlan } from '@/lib/domain/menu-file/plan-import';
import type { Site } from '@/lib/domain/site/site';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { readSite } from '@/lib/server/devices-of-site';
import { recordChange } from '@/lib/server/history';
import type { DryRun } from '../dry-run';
import { applyImport } from './apply-import';
import { readMapping, readUpload } from './read-upload';

/** More than these are counted, not listed: nobody mends three thousand lines by reading them here. */
const mostErrors = 200;
const mostChanges = 50;

const nothing: ImportPlan = { sections: [], groups: [], options: [], creates: [], updates: [], unchanged: 0, errors: [] };

/** Whatever moves this moves what a file would do. */
export const menuDigest = (site: Pick<Site, 'menu' | 'courses'>): string =>
  createHash('sha256').update(JSON.stringify([site.menu, site.courses])).digest('hex');

const sayChanges = (site: Site, plan: ImportPlan): DryRun['changes'] => {
  const before = new Map(site.menu.items.map((item) => [item.id, item]));
  const naming: ItemNaming = { sections: site.menu.sections, courses: site.courses, groups: [...site.menu.optionGroups, ...plan.groups] };
  return plan.updates.slice(0, mostChanges).map((item) => ({
    name: item.name,
    what: itemDifferences(before.get(item.id) ?? item, item, naming).map(({ label, from, to }) => `${label.toLowerCase()} ${from} to ${to}`).join('; '),
  }));
};

const mustApply = (apply: string, digest: string, complete: boolean, plan: ImportPlan): void => {
  if (!complete) throw new AppError('invalid', 'Say which columns hold the menu section and the item. Nothing was changed.');
  if (apply !== digest) throw new AppError('stale', 'The menu was changed since this file was checked. Nothing was brought in. Check the file again to see what it would do now.');
  if (plan.errors.length > 0) throw new AppError('invalid', `${plan.errors.length === 1 ? 'A line has' : `${plan.errors.length} lines have`} a fault, so nothing was brought in. Mend them in the file, then choose it again.`);
};

export type ImportRequest = { readonly bytes: Uint8Array; readonly mapping: string | undefined; readonly apply: string | undefined };

/**
 * Looks at a file without changing anything, or applies it whole: only when it has no error, and only to the menu that the
 * dry run looked at.
 */
export const importMenu = async (actor: Actor, { bytes, mapping: given, apply }: ImportRequest): Promise<DryRun> => {
  const table = readUpload(bytes);
  return actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const site = await readSite(transaction, siteId);
    const mapping = readMapping(given, table);
    const complete = mapping.section !== null && mapping.name !== null;
    const plan = complete ? planImport(site, table, mapping, randomUUID) : nothing;
    const digest = menuDigest(site);
    if (apply !== undefined) {
      mustApply(apply, digest, complete, plan);
      await applyImport(transaction, siteId, plan);
      await recordChange(transaction, { siteId, personId: actor.person.id, action: 'menu.brought-in', subjectKind: 'site', subjectId: null, summary: `A menu file was brought in: ${plan.creates.length} new, ${plan.updates.length} changed` });
    }
    return {
      headings: table.headings, sample: table.rows.slice(0, 4).map((row) => row.cells), mapping, digest, applied: apply !== undefined,
      creates: plan.creates.length, updates: plan.updates.length, unchanged: plan.unchanged, sections: plan.sections.map((section) => section.name), groups: plan.groups.map((group) => group.name),
      changes: sayChanges(site, plan), errors: plan.errors.slice(0, mostErrors), errorCount: plan.errors.length,
    };
  });
};
