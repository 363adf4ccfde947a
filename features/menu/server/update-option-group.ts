import 'server-only';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { updateVersioned } from '@/lib/server/versioned-update';
import { OptionGroupRow } from '@/models/option-group';
import type { OptionGroupInput } from '../schema';
import type { Saved } from './create-items';
import { mustFitMenu, writeOptions } from './option-rows';

export type OptionGroupUpdate = { readonly group: string; readonly version: number; readonly input: OptionGroupInput };

/** Saves a group with its options for every item that comes with it. */
export const updateOptionGroup = (actor: Actor, { group: id, version, input }: OptionGroupUpdate): Promise<Saved> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const row = await updateVersioned(OptionGroupRow, { siteId, id, version }, { min: input.min, max: input.max }, transaction);
    await mustFitMenu(transaction, siteId, id, input);
    await OptionGroupRow.update({ name: input.name }, { where: { siteId, id }, transaction });
    await writeOptions(transaction, siteId, id, input.options);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'option-group.updated', subjectKind: 'option-group', subjectId: id, summary: `Options ${input.name} changed`, after: input });
    return { id, version: row.version };
  });
