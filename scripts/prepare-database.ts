/** Brings the database of DATABASE_URL to the newest shape, and fills an empty one with the demo. Safe to run again. */
import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { env } from '@/lib/env';
import { closeDatabase, database, inTransaction } from '@/lib/server/database';
import { migrate } from '@/lib/server/migrate';
import { PersonRow } from '@/models/person';
import { SiteRow } from '@/models/site';
import { seedDemo } from '@/seeders/seed-demo';

const say = (line: string): void => void process.stdout.write(`${line}\n`);

/** Given by `npm start`; somebody who runs this alone gets one that is made once and kept where only they can read it. */
const demoPassword = (): string => {
  const given = env().TAMIS_DEMO_PASSWORD;
  if (given !== undefined) return given;
  const kept = path.join(process.env.TAMIS_DATA_DIR || '.data', 'demo-password');
  if (existsSync(kept)) return readFileSync(kept, 'utf8').trim();
  const password = randomBytes(9).toString('base64url');
  mkdirSync(path.dirname(kept), { recursive: true, mode: 0o700 });
  writeFileSync(kept, `${password}\n`, { mode: 0o600 });
  say(`Demo people sign in with the password ${password}, kept in ${kept}.`);
  return password;
};

const seedWhenEmpty = async (): Promise<string> => {
  if ((await SiteRow.count()) > 0 || (await PersonRow.count()) > 0) return 'The database has people or sites in it, so the demo was left out.';
  const password = demoPassword();
  await inTransaction((transaction) => seedDemo(transaction, { password, now: new Date() }));
  return 'Demo written: Lantern Yard and Pilgrim\'s Oven with their people.';
};

try {
  const done = await migrate(database());
  say(done.length === 0 ? 'Tables are up to date.' : `Tables made or changed: ${done.join(', ')}.`);
  say(await seedWhenEmpty());
} catch (error) {
  say(`The database could not be prepared: ${(error as Error).message}`);
  process.exitCode = 1;
} finally {
  await closeDatabase();
}
