import { env } from '@/lib/env';
import { closeDatabase, database, inTransaction } from '@/lib/server/database';
import { migrate } from '@/lib/server/migrate';
import { SiteRow } from '@/models/site';
import { seedDemo } from '@/seeders/seed-demo';

/** Brings the database to the newest shape and fills an empty one with the demo. Safe to run again at any time. */
const say = (line: string): void => {
  process.stdout.write(`${line}\n`);
};

const prepare = async (): Promise<void> => {
  const done = await migrate(database());
  say(done.length === 0 ? 'The tables are up to date.' : `Tables made or changed: ${done.join(', ')}.`);
  if ((await SiteRow.count()) > 0) {
    say('There are sites already; the demo was not touched.');
    return;
  }
  const password = env().TAMIS_DEMO_PASSWORD;
  if (password === undefined) {
    say('The database is empty and TAMIS_DEMO_PASSWORD is not set, so no demo was made.');
    return;
  }
  await inTransaction((transaction) => seedDemo(transaction, password, new Date()));
  say('The demo is in: Lantern Yard and Pilgrim’s Oven.');
};

try {
  await prepare();
} finally {
  await closeDatabase();
}
