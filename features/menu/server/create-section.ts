import 'server-only';
import { randomUUID } from 'node:crypto';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { SectionRow } from '@/models/section';
import type { SectionInput } from '../schema';
import type { Saved } from './create-items';
import { mustBeFreeHeading } from './free-heading';

/** Adds a menu section at the end. */
export const createSection = (actor: Actor, { name }: SectionInput): Promise<Saved> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    await mustBeFreeHeading(transaction, siteId, null, name);
    const position = Number((await SectionRow.max('position', { where: { siteId }, transaction })) ?? -1) + 1;
    const id = randomUUID();
    await SectionRow.create({ id, siteId, name, position }, { transaction });
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'section.added', subjectKind: 'section', subjectId: id, summary: `Menu section ${name} added` });
    return { id, version: 1 };
  });
