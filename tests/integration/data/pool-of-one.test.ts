import type { Sequelize } from 'sequelize';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { env } from '@/lib/env';
import { closeDatabase, connect, database, inTransaction } from '@/lib/server/database';
import { lastChangeOf, recordChange } from '@/lib/server/history';
import { readPlanVersion, writePlanContent } from '@/lib/server/plan-store';
import { loadSite } from '@/lib/server/site-snapshot';
import { insertSite } from '@/lib/server/site-store';
import { updateVersioned } from '@/lib/server/versioned-update';
import { TillRow } from '@/models/till';
import { aSite } from '@/tests/fixtures/build-site';
import { seedDatabase, seededAt } from '@/tests/setup/demo-database';

const kept = globalThis as { tamisConnection?: Sequelize };

/** With one connection, a statement outside the transaction that holds it waits until it gives up. */
beforeAll(async () => {
  await closeDatabase();
  kept.tamisConnection = connect(env().DATABASE_URL, 1);
});

afterAll(closeDatabase);

describe('with a single connection', () => {
  it('the demo is seeded', async () => {
    await seedDatabase();
    expect((await loadSite('lantern-yard'))?.menu.items).toHaveLength(182);
  });

  it('every part of a unit of work stays inside its transaction', async () => {
    const version = await inTransaction(async (transaction) => {
      const site = await loadSite('lantern-yard', transaction);
      const plan = site?.plans.find(({ name }) => name === 'Lunch');
      if (plan === undefined) throw new Error('The demo has no Lunch.');
      await updateVersioned(TillRow, { siteId: 'lantern-yard', id: 'till-1', version: 1 }, { adapter: 'Ethernet 2' }, transaction);
      await recordChange(transaction, { siteId: 'lantern-yard', personId: null, action: 'till.updated', subjectKind: 'till', subjectId: 'till-1', summary: 'Till 1 has another adapter' });
      expect(await lastChangeOf('lantern-yard', 'till', 'till-1', transaction)).toMatchObject({ by: 'Tamis' });
      await insertSite(transaction, aSite(), seededAt);
      const written = await writePlanContent(transaction, { siteId: 'lantern-yard', planId: plan.id, version: plan.version, content: { offers: null, rules: plan.rules }, summary: 'All offered', personId: null });
      expect(await readPlanVersion('lantern-yard', plan.id, written.version, transaction)).toMatchObject({ offers: null });
      return written.version;
    });
    expect(version).toBe((await loadSite('lantern-yard'))?.plans.find(({ name }) => name === 'Lunch')?.version);
  });

  it('a refused stale write gives the connection back', async () => {
    const stale = () => inTransaction((transaction) => updateVersioned(TillRow, { siteId: 'lantern-yard', id: 'till-2', version: 9 }, { adapter: 'X' }, transaction));
    await expect(stale()).rejects.toMatchObject({ name: 'StaleWrite' });
    await expect(stale()).rejects.toMatchObject({ name: 'StaleWrite' });
    expect(database().config.pool?.max ?? 1).toBe(1);
  });
});
