import { rmSync } from 'node:fs';
import { makeDatabase, startDatabase } from './database.mjs';
import { startMailCatcher } from './mail.mjs';
import { freePort, loopback, rememberedPort } from './ports.mjs';
import { prepareDatabase } from './prepare.mjs';
import { settingsFor } from './settings.mjs';
import { startWeb } from './web.mjs';

/** A database server of its own with nothing in it, for tests and measurements. */
export async function startScratchDatabase(home, secrets, watch, onStop) {
  rmSync(home.database, { recursive: true, force: true });
  await makeDatabase(home);
  const database = await startDatabase(home, secrets.databasePassword, { isScratch: true, onStart: (pid) => watch.add('database', pid) });
  onStop(database.stop);
  return database;
}

/** The same server with another database in it. */
export function withDatabase(url, name) {
  const other = new URL(url);
  other.pathname = `/${name}`;
  return other.href;
}

/** What a program must be told to work on the scratch database; the address is where the product will answer. */
export async function scratchSettings(home, secrets, databaseUrl) {
  const port = await freePort();
  const mailUrl = `smtp://${loopback}:${await rememberedPort(home, 'mail')}`;
  const address = `http://${loopback}:${port}`;
  return { port, env: settingsFor({ secrets, databaseUrl, mailUrl, address, given: withoutSettings(process.env) }) };
}

/** Tests must not reach the database or the mail server that the person has set for real work. */
function withoutSettings(given) {
  const ours = new Set(['DATABASE_URL', 'NEXTAUTH_SECRET', 'NEXTAUTH_URL', 'SMTP_URL', 'MAIL_FROM', 'TAMIS_DEMO_PASSWORD']);
  return Object.fromEntries(Object.entries(given).filter(([name]) => !ours.has(name)));
}

/** The product as people meet it: production build, demo, mail kept as files. */
export async function startProduct(home, { env, port }, watch, onStop) {
  const mail = await startMailCatcher({ folder: home.mail, port: Number(new URL(env.SMTP_URL).port), say: () => {} });
  onStop(mail.stop);
  await prepareDatabase(home, env);
  const web = await startWeb({ home, env, host: loopback, port, onStart: (pid) => watch.add('web server', pid) });
  onStop(web.stop);
  return { ...env, TAMIS_BASE_URL: `http://${loopback}:${port}`, TAMIS_MAIL_FOLDER: home.mail };
}
