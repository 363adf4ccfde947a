import type { Transaction } from 'sequelize';
import { hashPassword } from '@/lib/server/password';
import { insertSite } from '@/lib/server/site-store';
import { MembershipRow } from '@/models/membership';
import { PersonRow } from '@/models/person';
import { PlanVersionRow } from '@/models/plan-version';
import { demoPeople } from './demo-people';
import { dinnerHistory } from './lantern-yard/plans';
import { lanternYard } from './lantern-yard/site';
import { pilgrimsOven } from './pilgrims-oven/site';

/** Fills an empty database with the two demo sites and the people of them, who share one password. */
export const seedDemo = async (transaction: Transaction, password: string, now: Date): Promise<void> => {
  const passwordHash = await hashPassword(password);
  await PersonRow.bulkCreate(demoPeople.map(({ id, name, email }) => ({ id, name, email, passwordHash, createdAt: now })), { transaction });
  for (const site of [lanternYard, pilgrimsOven]) await insertSite(transaction, site, now);
  await MembershipRow.bulkCreate(demoPeople.flatMap(({ id, memberships }) => memberships.map(({ site, role, title, mayOverride }) => ({ personId: id, siteId: site, role, title, mayOverride: mayOverride ?? false }))), { transaction });
  const dinner = { siteId: lanternYard.id, planId: 'ly-plan-dinner' };
  await PlanVersionRow.destroy({ where: dinner, transaction });
  await PlanVersionRow.bulkCreate(dinnerHistory.map(({ number, content, summary }) => ({ ...dinner, number, content, summary, madeBy: 'person-ines', madeAt: now })), { transaction });
};
