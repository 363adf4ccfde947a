import 'server-only';
import type { Transaction } from 'sequelize';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { lastChangeOf, recordChange } from '@/lib/server/history';
import { RowMissing, StaleWrite } from '@/lib/server/versioned-update';
import { MembershipRow } from '@/models/membership';
import { PersonRow } from '@/models/person';
import type { MemberInput } from '../schema';
import { titleOrRole } from '../words';

type MemberKey = { readonly person: string; readonly version: number };

/**
 * Everybody's place on the site, locked: of two owners who take each other off at once, the second finds the first gone.
 */
const lockMembers = async (transaction: Transaction, { siteId, person }: Actor): Promise<readonly MembershipRow[]> => {
  const rows = await MembershipRow.findAll({ where: { siteId }, order: ['personId'], transaction, lock: transaction.LOCK.UPDATE });
  if (!rows.some((row) => row.personId === person.id && row.role === 'owner')) throw new AppError('not-allowed', 'You are not an owner of this site any more. Nothing was changed.');
  return rows;
};

const memberAt = async (transaction: Transaction, siteId: string, rows: readonly MembershipRow[], { person, version }: MemberKey): Promise<MembershipRow> => {
  const row = rows.find((one) => one.personId === person);
  if (row === undefined) throw new RowMissing('membership', person);
  if (row.version === version) return row;
  throw new StaleWrite('membership', person, row.get({ plain: true }), row.version, await lastChangeOf(siteId, 'membership', person, transaction));
};

const keepAnOwner = (rows: readonly MembershipRow[], leaving: MembershipRow): void => {
  if (leaving.role !== 'owner' || rows.some((row) => row.role === 'owner' && row.personId !== leaving.personId)) return;
  throw new AppError('conflict', 'A site always has an owner, and there is no other. Nothing was changed. Make somebody else an owner first.', { fields: [{ field: 'role', reason: 'A site always has an owner, and there is no other.' }] });
};

const nameOf = async (transaction: Transaction, personId: string): Promise<string> => (await PersonRow.findByPk(personId, { transaction }))?.name ?? 'Somebody';

/** What they are from now on; on their next press it counts. */
export const changeMember = (actor: Actor, key: MemberKey, input: MemberInput): Promise<{ readonly version: number }> =>
  actIn(actor, 'people.write', async (transaction) => {
    const { siteId } = actor;
    const rows = await lockMembers(transaction, actor);
    const row = await memberAt(transaction, siteId, rows, key);
    if (input.role !== 'owner') keepAnOwner(rows, row);
    const before = { role: row.role, title: row.title, mayOverride: row.mayOverride };
    const after = { ...input, mayOverride: input.role === 'chef' && input.mayOverride };
    await row.update({ ...after, version: row.version + 1 }, { transaction });
    const said = `${await nameOf(transaction, row.personId)} is ${titleOrRole(after)}${after.role === 'chef' ? `, and ${after.mayOverride ? 'may' : 'may not'} override a stop` : ''}`;
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'member.updated', subjectKind: 'membership', subjectId: row.personId, summary: said, before, after });
    return { version: row.version };
  });

/** Takes a person off the site; what they did stays in the history. */
export const removeMember = (actor: Actor, key: MemberKey): Promise<{ readonly left: string }> =>
  actIn(actor, 'people.write', async (transaction) => {
    const { siteId } = actor;
    const rows = await lockMembers(transaction, actor);
    const row = await memberAt(transaction, siteId, rows, key);
    keepAnOwner(rows, row);
    const name = await nameOf(transaction, row.personId);
    await row.destroy({ transaction });
    await recordChange(transaction, {
      siteId, personId: actor.person.id, action: 'member.removed', subjectKind: 'membership', subjectId: row.personId, summary: `${name} taken off the site`, before: { role: row.role, title: row.title, mayOverride: row.mayOverride },
    });
    return { left: row.personId };
  });
