import 'server-only';
import { createHash, randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { decodeFile } from '@/lib/domain/menu-file/decode-file';
import { guessMapping, menuFields, type Mapping } from '@/lib/domain/menu-file/fields';
import { planImport, type ImportPlan } from '@/lib/domain/menu-file/plan-import';
import { readTable, type Table } from '@/lib/domain/menu-file/read-table';
import { writeMenuFile } from '@/lib/domain/menu-file/write-file';
import type { Site } from '@/lib/domain/site/site';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { readSite } from '@/lib/server/devices-of-site';
import { recordChange } from '@/lib/server/history';
import { ItemRow } from '@/models/item';
import { ItemOptionGroupRow } from '@/models/item-option-group';
import { OptionRow } from '@/models/option';
import { OptionGroupRow } from '@/models/option-group';
import { SectionRow } from '@/models/section';
import type { DryRun } from '../dry-run';

/** More lines than this are counted, not listed: nobody mends three thousand lines by reading them here. */
const mostErrors = 200;

export const menuDigest = (site: Pick<Site, 'menu' | 'courses'>): string =>
  createHash('sha256').update(JSON.stringify([site.menu, site.courses])).digest('hex');

const readMapping = (text: string | undefined, table: Table): Mapping => {
  if (text === undefined) return guessMapping(table.headings);
  const refuse = (): never => {
    throw new AppError('invalid', 'The columns cannot be understood. Nothing was changed. Choose them again.');
  };
  let given: unknown;
  try {
    given = JSON.parse(text);
  } catch {
    return refuse();
  }
  if (typeof given !== 'object' || given === null) return refuse();
  const columns = given as Record<string, unknown>;
  const ok = menuFields.every((field) => columns[field] === null || (Number.isInteger(columns[field]) && Number(columns[field]) >= 0 && Number(columns[field]) < table.headings.length));
  return ok ? (columns as Mapping) : refuse();
};

const readUpload = (bytes: Uint8Array): Table => {
  const decoded = decodeFile(bytes);
  if (!decoded.ok) throw new AppError('invalid', decoded.message);
  const reading = readTable(decoded.text);
  if (!reading.ok) throw new AppError('invalid', reading.line === null ? reading.message : `Line ${reading.line}: ${reading.message}`);
  return reading.table;
};

const writePlan = async (transaction: Transaction, siteId: string, plan: ImportPlan): Promise<void> => {
  await SectionRow.bulkCreate(plan.sections.map(({ id, name, position }) => ({ id, siteId, name, position })), { transaction });
  await OptionGroupRow.bulkCreate(plan.groups.map(({ id, name, min, max }, position) => ({ id, siteId, name, min, max, position: 1_000 + position })), { transaction });
  await OptionRow.bulkCreate(plan.options.map(({ id, group, name, kitchenName, allergens, position }) => ({ id, siteId, optionGroupId: group, name, kitchenName, allergens: [...allergens], position })), { transaction });
  const values = (item: ImportPlan['creates'][number]) => ({
    sectionId: item.section, name: item.name, kitchenName: item.kitchenName, allergens: [...item.allergens], courseId: item.course,
    preparationSeconds: item.preparationSeconds, soldOut: item.soldOut, left: item.left, noTicket: item.noTicket,
  });
  await ItemRow.bulkCreate(plan.creates.map((item) => ({ ...values(item), id: item.id, siteId, position: item.position })), { transaction });
  for (const item of plan.updates) await ItemRow.update({ ...values(item), version: item.version + 1 }, { where: { siteId, id: item.id }, transaction });
  await ItemOptionGroupRow.destroy({ where: { siteId, itemId: plan.updates.map((item) => item.id) }, transaction });
  await ItemOptionGroupRow.bulkCreate([...plan.creates, ...plan.updates].flatMap((item) => item.optionGroups.map((optionGroupId, position) => ({ siteId, itemId: item.id, position, optionGroupId }))), { transaction });
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
    const plan = complete ? planImport(site, table, mapping, randomUUID) : { sections: [], groups: [], options: [], creates: [], updates: [], unchanged: 0, errors: [] };
    const digest = menuDigest(site);
    if (apply !== undefined) {
      if (!complete) throw new AppError('invalid', 'Say which columns hold the menu section and the item. Nothing was changed.');
      if (apply !== digest) throw new AppError('stale', 'The menu was changed since this file was checked. Nothing was brought in. Check the file again to see what it would do now.');
      if (plan.errors.length > 0) throw new AppError('invalid', `${plan.errors.length} lines have a fault, so nothing was brought in. Mend them in the file, then choose it again.`);
      await writePlan(transaction, siteId, plan);
      await recordChange(transaction, { siteId, personId: actor.person.id, action: 'menu.brought-in', subjectKind: 'site', subjectId: null, summary: `A menu file was brought in: ${plan.creates.length} new, ${plan.updates.length} changed` });
    }
    return {
      headings: table.headings, sample: table.rows.slice(0, 4).map((row) => row.cells), mapping, digest, applied: apply !== undefined,
      creates: plan.creates.length, updates: plan.updates.length, unchanged: plan.unchanged, sections: plan.sections.map((section) => section.name), groups: plan.groups.map((group) => group.name),
      errors: plan.errors.slice(0, mostErrors), errorCount: plan.errors.length,
    };
  });
};

/** The menu as a file to take away. */
export const exportMenu = (actor: Actor): Promise<Response> =>
  actIn(actor, 'site.read', async (transaction) => {
    const site = await readSite(transaction, actor.siteId);
    return new Response(`\ufeff${writeMenuFile(site)}`, {
      headers: { 'Content-Type': 'text/csv; charset=utf-8', 'Content-Disposition': `attachment; filename="${actor.siteId}-menu.csv"`, 'Cache-Control': 'no-store' },
    });
  });
