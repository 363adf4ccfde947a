import 'server-only';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { updateVersioned } from '@/lib/server/versioned-update';
import { SectionRow } from '@/models/section';
import type { SectionInput } from '../schema';
import type { Saved } from './create-items';
import { mustBeFreeHeading } from './free-heading';

export type SectionRenaming = SectionInput & { readonly section: string; readonly version: number };

export const renameSection = (actor: Actor, { section: id, version, name }: SectionRenaming): Promise<Saved> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const before = await SectionRow.findOne({ where: { siteId, id }, transaction });
    if (before?.version === version) await mustBeFreeHeading(transaction, siteId, id, name);
    const row = await updateVersioned(SectionRow, { siteId, id, version }, { name }, transaction);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'section.renamed', subjectKind: 'section', subjectId: id, summary: `Menu section ${before?.name ?? ''} renamed to ${name}` });
    return { id, version: row.version };
  });
