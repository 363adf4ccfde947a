import 'server-only';
import { randomUUID } from 'node:crypto';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { OptionGroupRow } from '@/models/option-group';
import type { OptionGroupInput } from '../schema';
import type { Saved } from './create-items';
import { mustFitMenu, writeOptions } from './option-rows';

export const createOptionGroup = (actor: Actor, input: OptionGroupInput): Promise<Saved> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    await mustFitMenu(transaction, siteId, null, input);
    const id = randomUUID();
    const position = Number((await OptionGroupRow.max('position', { where: { siteId }, transaction })) ?? -1) + 1;
    await OptionGroupRow.create({ id, siteId, name: input.name, min: input.min, max: input.max, position }, { transaction });
    await writeOptions(transaction, siteId, id, input.options);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'option-group.added', subjectKind: 'option-group', subjectId: id, summary: `Options ${input.name} added`, after: input });
    return { id, version: 1 };
  });
