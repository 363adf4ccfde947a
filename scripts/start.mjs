/** npm start and npm run dev: from a fresh clone to a running Tamis, and everything down again on Ctrl-C. */
import path from 'node:path';
import { build } from './house/build.mjs';
import { makeDatabase, startDatabase } from './house/database.mjs';
import { debianPrograms, installFromDebian } from './house/debian.mjs';
import { homeAt, openHome, root } from './house/home.mjs';
import { startMailCatcher } from './house/mail.mjs';
import { takeHome } from './house/one-at-a-time.mjs';
import { installPackages } from './house/packages.mjs';
import { loopback, mustBeFree, readPort, rememberedPort } from './house/ports.mjs';
import { prepareDatabase } from './house/prepare.mjs';
import { ended } from './house/run.mjs';
import { say, step } from './house/say.mjs';
import { openSecrets } from './house/secrets.mjs';
import { settingsFor } from './house/settings.mjs';
import { signInsFor } from './house/sign-ins.mjs';
import { runUntilStopped } from './house/until-stopped.mjs';
import { startWeb } from './house/web.mjs';

const isDevelopment = process.argv.includes('--dev');

runUntilStopped(
  async ({ onStop, fail }) => {
    const home = homeAt(path.join(root, '.data'));
    const host = process.env.HOST || loopback;
    const port = readPort(process.env.PORT, 3000);
    const address = `http://${host}:${port}`;

    openHome(home);
    const watch = await takeHome(home, { task: 'Tamis', address, isDevelopment });
    onStop(watch.release);
    await mustBeFree(port, host);
    const secrets = openSecrets(home);

    say(isDevelopment ? 'Starting Tamis for development.' : 'Starting Tamis.');
    await step('Packages', () => installPackages(home));
    const database = await openDatabase(home, secrets, watch);
    onStop(database.stop);
    const mail = await step('Mail catcher', async () => startMailCatcher({ folder: home.mail, port: await rememberedPort(home, 'mail'), say }));
    onStop(mail.stop);

    const settings = settingsFor({ secrets, databaseUrl: database.url, mailUrl: mail.url, address });
    await step('Tables and demo', () => prepareDatabase(home, settings));
    if (!isDevelopment) await step('Build', () => build(home, settings));
    const web = await step('Web server', () =>
      startWeb({ home, env: settings, host, port, isDevelopment, onStart: (pid) => watch.add('web server', pid) }),
    );
    onStop(web.stop);

    say(`\nTamis is ready at ${settings.NEXTAUTH_URL}\n`);
    say(await signInsFor(settings));
    say(`\nMail that Tamis sends is kept in ${path.relative(root, home.mail)}. Ctrl-C stops everything.`);
    failWhenOneEnds({ 'The database': database.child, 'The web server': web.child }, fail);
    return undefined;
  },
  { codeWhenAsked: 0 },
);

/** The one named by DATABASE_URL, or a private one below the data folder. */
async function openDatabase(home, secrets, watch) {
  if (process.env.DATABASE_URL) return { url: process.env.DATABASE_URL, child: undefined, stop: () => {} };
  await step('MariaDB', () => installFromDebian([debianPrograms.database], home));
  await step('Database folder', () => makeDatabase(home));
  return step('Database server', () => startDatabase(home, secrets.databasePassword, { onStart: (pid) => watch.add('database', pid) }));
}

/** Half of Tamis is no Tamis: when one part ends by itself, say so and stop the rest. */
function failWhenOneEnds(parts, fail) {
  for (const [name, child] of Object.entries(parts))
    if (child) void ended(child).then((code) => fail(`${name} ended by itself (${code}), so Tamis stopped; its last words are in .data/log.`));
}
