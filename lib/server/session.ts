import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { PersonRow } from '@/models/person';
import { SessionRow } from '@/models/session';
import type { Person } from './actor';

/** What a signed session cookie says; checked against the database on every request, so that sessions can be ended. */
export type SessionClaims = { readonly sessionId: string; readonly personId: string; readonly sessionVersion: number };

export const startSession = async (person: { readonly id: string; readonly sessionVersion: number }): Promise<SessionClaims> => {
  const sessionId = randomUUID();
  await SessionRow.create({ id: sessionId, personId: person.id, createdAt: new Date() });
  return { sessionId, personId: person.id, sessionVersion: person.sessionVersion };
};

/** The person behind a session, or null when it was ended here, everywhere, or the person is gone. */
export const personOfSession = async (claims: SessionClaims): Promise<Person | null> => {
  const [session, person] = await Promise.all([SessionRow.findByPk(claims.sessionId), PersonRow.findByPk(claims.personId)]);
  if (session === null || session.endedAt !== null || session.personId !== claims.personId) return null;
  if (person === null || person.sessionVersion !== claims.sessionVersion) return null;
  return { id: person.id, name: person.name, email: person.email };
};

export const endSession = async (sessionId: string): Promise<void> => {
  await SessionRow.update({ endedAt: new Date() }, { where: { id: sessionId, endedAt: null } });
};

/** Ends every session of a person, on every device. */
export const endAllSessions = async (personId: string, transaction: Transaction): Promise<void> => {
  await PersonRow.increment('sessionVersion', { where: { id: personId }, transaction });
  await SessionRow.update({ endedAt: new Date() }, { where: { personId, endedAt: null }, transaction });
};
