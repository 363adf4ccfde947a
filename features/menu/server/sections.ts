import 'server-only';
import { randomUUID } from 'node:crypto';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { deleteVersioned, updateVersioned } from '@/lib/server/versioned-update';
import { ItemRow } from '@/models/item';
import { SectionRow } from '@/models/section';
import type { SectionInput } from '../schema';

type Saved = { readonly id: string; readonly version: number };

export const createSection = (actor: Actor, { name }: SectionInput): Promise<Saved> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const position = Number((await SectionRow.max('position', { where: { siteId }, transaction })) ?? -1) + 1;
    const id = randomUUID();
    await SectionRow.create({ id, siteId, name, position }, { transaction });
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'section.added', subjectKind: 'section', subjectId: id, summary: `Menu section ${name} added` });
    return { id, version: 1 };
  });

export const renameSection = (actor: Actor, id: string, version: number, { name }: SectionInput): Promise<Saved> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const row = await updateVersioned(SectionRow, { siteId, id, version }, { name }, transaction);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'section.renamed', subjectKind: 'section', subjectId: id, summary: `Menu section renamed to ${name}` });
    return { id, version: row.version };
  });

/** Only an empty section can go, and only when no plan speaks of it; the tables refuse the rest. */
export const deleteSection = (actor: Actor, id: string, version: number): Promise<{ readonly id: string }> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const items = await ItemRow.count({ where: { siteId, sectionId: id }, transaction });
    if (items > 0) throw new AppError('conflict', `This section still has ${items === 1 ? 'an item' : `${items} items`}. Nothing was deleted. Move or delete ${items === 1 ? 'it' : 'them'} first.`);
    const row = await deleteVersioned(SectionRow, { siteId, id, version }, transaction);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'section.deleted', subjectKind: 'section', subjectId: id, summary: `Menu section ${row.name} deleted` });
    return { id };
  });

export const orderSections = (actor: Actor, ids: readonly string[]): Promise<{ readonly ordered: number }> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    for (const [position, id] of ids.entries()) await SectionRow.update({ position }, { where: { siteId, id }, transaction });
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'section.ordered', subjectKind: 'site', subjectId: null, summary: 'Menu sections put in another order' });
    return { ordered: ids.length };
  });
