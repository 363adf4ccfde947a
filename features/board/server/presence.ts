import 'server-only';
import { mustBeAllowed, type Actor } from '@/lib/server/actor';
import { PlanRow } from '@/models/plan';
import { planMissing } from './read-plan';

/** Somebody who has not been heard of for this long has left: a little more than two pings. */
const goneAfterMs = 45_000;

type Seen = { readonly name: string; readonly at: number };

/** Who looks at which plan. Only for courtesy, so memory is enough: after a restart everybody pings again. */
const kept = globalThis as { tamisPresence?: Map<string, Map<string, Seen>> };
const boards = (): Map<string, Map<string, Seen>> => (kept.tamisPresence ??= new Map());

const forgetGone = (board: Map<string, Seen>, now: number): void => {
  for (const [person, seen] of board) if (now - seen.at > goneAfterMs) board.delete(person);
};

export type Presence = {
  /** Names of the others on this plan. */
  readonly others: readonly string[];
  readonly newest: number;
};

/** Notes that this person is on the board, and says who else is and which version is the newest. */
export const ping = async (actor: Actor, planId: string, now: number): Promise<Presence> => {
  mustBeAllowed(actor.membership, 'site.read');
  const { siteId, person } = actor;
  const plan = await PlanRow.findOne({ where: { siteId, id: planId }, attributes: ['id', 'siteId', 'version'] });
  if (plan === null) throw planMissing();
  const key = `${siteId}/${planId}`;
  for (const [other, board] of boards()) {
    forgetGone(board, now);
    if (board.size === 0) boards().delete(other);
  }
  const board = boards().get(key) ?? new Map<string, Seen>();
  board.set(person.id, { name: person.name, at: now });
  boards().set(key, board);
  const others = [...board].filter(([id]) => id !== person.id).map(([, seen]) => seen.name).toSorted();
  return { others, newest: plan.version };
};
