import { QueryTypes } from 'sequelize';
import { database, inTransaction } from '@/lib/server/database';
import { seedDemo } from '@/seeders/seed-demo';

/** The moment at which tests take the demo to have been seeded: a Tuesday evening during Dinner. */
export const seededAt = new Date('2026-12-01T19:42:00.000Z');
export const demoPassword = 'eleven-lanterns-swing';

/** Takes every row out of every table, on one connection that does not look at references meanwhile. */
export const emptyDatabase = (): Promise<void> =>
  inTransaction(async (transaction) => {
    const tables = await database().query<{ name: string }>(
      "SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE() AND table_type = 'BASE TABLE' AND table_name <> 'migrations_done'",
      { type: QueryTypes.SELECT, transaction },
    );
    await database().query('SET foreign_key_checks = 0', { transaction });
    try {
      for (const { name } of tables) await database().query(`DELETE FROM \`${name}\``, { transaction });
    } finally {
      await database().query('SET foreign_key_checks = 1', { transaction });
    }
  });

/** The demo, as a first start makes it. */
export const seedDatabase = async (): Promise<void> => {
  await emptyDatabase();
  await inTransaction((transaction) => seedDemo(transaction, { password: demoPassword, now: seededAt }));
};
