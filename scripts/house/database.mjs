import { closeSync, existsSync, mkdtempSync, openSync, readdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { findProgram } from './debian.mjs';
import { loopback, rememberedPort } from './ports.mjs';
import { end, identify, isAlive } from './process-table.mjs';
import { lastLines, launch, runQuietly } from './run.mjs';
import { Sentence } from './sentence.mjs';

const databaseName = 'tamis';
const person = 'tamis';

/** sun_path holds 108 bytes with its closing zero (unix(7)). */
const longestSocketPath = 107;

/** Absent, whole, or something that must not be touched. `entries` are the names in the folder, undefined when there is none. */
export function judgeDataFolder(entries) {
  if (entries === undefined || entries.length === 0) return 'absent';
  return ['mysql', 'ibdata1', 'aria_log_control'].every((name) => entries.includes(name)) ? 'whole' : 'half-made';
}

/** Run as the person who starts Tamis: another account could not enter a private folder. */
const account = () => [`--user=${os.userInfo().username}`];

/** Makes the data folder beside its place and moves it there when it is whole, so that a cut-off start leaves none. */
export async function makeDatabase(home) {
  const state = judgeDataFolder(existsSync(home.database) ? readdirSync(home.database) : undefined);
  if (state === 'whole') return 'there';
  if (state === 'half-made')
    throw new Sentence(
      `The database folder ${home.database} is half-made or damaged, so Tamis left it alone; put back a copy, or, if nothing in it is wanted, move it away and start again.`,
    );
  const making = `${home.database}.making`;
  rmSync(making, { recursive: true, force: true });
  await runQuietly(
    'Making the database folder',
    findProgram('mariadb-install-db'),
    ['--no-defaults', `--datadir=${making}`, '--auth-root-authentication-method=socket', `--auth-root-socket-user=${os.userInfo().username}`, '--skip-test-db', '--skip-name-resolve', ...account()],
    home.log('database-made'),
  );
  if (existsSync(home.database)) rmSync(home.database, { recursive: true });
  renameSync(making, home.database);
  return 'made';
}

/** Said by the server to itself before it answers anybody: the one account, for this machine only. */
export const firstWords = (password) =>
  [
    `CREATE DATABASE IF NOT EXISTS \`${databaseName}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci;`,
    ...['localhost', loopback].flatMap((from) => [
      `CREATE USER IF NOT EXISTS '${person}'@'${from}';`,
      `ALTER USER '${person}'@'${from}' IDENTIFIED BY '${password}';`,
      `GRANT ALL ON \`${databaseName}%\`.* TO '${person}'@'${from}';`,
    ]),
    '',
  ].join('\n');

/** A socket path that the system can hold: in the data folder, or in a temporary one when that lies too deep. */
function placeSocket(home) {
  if (Buffer.byteLength(home.databaseSocket) <= longestSocketPath) return { socket: home.databaseSocket, remove: () => {} };
  const folder = mkdtempSync(path.join(os.tmpdir(), 'tamis-'));
  return { socket: path.join(folder, 'database.sock'), remove: () => rmSync(folder, { recursive: true, force: true }) };
}

/**
 * @param {object} home
 * @param {string} password
 * @param {{ isScratch?: boolean, onStart?: (pid: number) => void }} options a scratch database need not survive a power cut
 * @returns {Promise<{ url: string, child: import('node:child_process').ChildProcess, stop: () => Promise<void> }>}
 */
export async function startDatabase(home, password, { isScratch = false, onStart = () => {} } = {}) {
  await endLeftover(home);
  const port = await rememberedPort(home, 'database');
  const place = placeSocket(home);
  writeFileSync(home.databaseFirstWords, firstWords(password), { mode: 0o600 });
  const log = openSync(home.log('database'), 'w', 0o600);
  const child = launch(
    findProgram('mariadbd'),
    [
      '--no-defaults',
      `--datadir=${home.database}`,
      `--socket=${place.socket}`,
      `--port=${port}`,
      `--bind-address=${loopback}`,
      `--pid-file=${home.databasePid}`,
      `--init-file=${home.databaseFirstWords}`,
      '--skip-name-resolve',
      '--character-set-server=utf8mb4',
      '--collation-server=utf8mb4_unicode_ci',
      '--default-time-zone=+00:00',
      '--max-allowed-packet=64M',
      '--innodb-buffer-pool-size=128M',
      ...(isScratch ? ['--innodb-flush-log-at-trx-commit=0', '--innodb-flush-method=nosync'] : []),
      ...account(),
    ],
    { stdio: ['ignore', log, log] },
  );
  closeSync(log);
  try {
    await untilReady(child, home);
  } finally {
    rmSync(home.databaseFirstWords, { force: true });
  }
  onStart(child.pid);
  const identity = identify(child.pid);
  return {
    child,
    url: `mariadb://${person}:${encodeURIComponent(password)}@${loopback}:${port}/${databaseName}`,
    async stop() {
      await end(identity, 30_000);
      place.remove();
    },
  };
}

/** The child itself says that it is ready; a port that answers could be anybody's. */
async function untilReady(child, home) {
  let fault;
  child.once('error', (error) => (fault = error));
  for (let waited = 0; waited < 60_000; waited += 50) {
    if (fault) throw fault;
    if (child.exitCode !== null || child.signalCode !== null) throw new Sentence(whyItEnded(home.log('database')));
    if (/ready for connections/.test(readFileSync(home.log('database'), 'utf8'))) return;
    await pause(50);
  }
  await end(identify(child.pid));
  throw new Sentence(`The database did not get ready within a minute, so Tamis stopped it. Its last words:\n${lastLines(home.log('database'))}`);
}

/** The known reasons for which a server ends at once, each as a sentence; else its last words. */
export function whyItEnded(log) {
  const text = readFileSync(log, 'utf8');
  if (/No space left on device|errno: 28|OS error number 28/i.test(text)) return 'The disk is full, so the database could not start; free some space and start again. No data was touched.';
  if (/Unable to lock|aria_log_control.*lock|another process is using/i.test(text))
    return 'Another database server is using the data folder of Tamis, so this one did not start; stop that server first. No data was touched.';
  if (/Permission denied|Errcode: 13/i.test(text)) return `The database may not read its own folder; give it back to the person who starts Tamis and start again. No data was touched.\n${lastLines(log, 5)}`;
  if (/upgrade after a crash|was created with MariaDB|Unsupported redo log format|newer version/i.test(text))
    return `The data folder was made by another version of MariaDB; start it once with that version, stop it cleanly and start again. No data was touched.\n${lastLines(log, 5)}`;
  return `The database ended as soon as it started, so Tamis stopped; no data was touched by Tamis. Its last words:\n${lastLines(log)}`;
}

/** A server of ours that outlived the start that was killed: known by its pid file and by the data folder on its command line. */
async function endLeftover(home) {
  if (!existsSync(home.databasePid)) return;
  const pid = Number(readFileSync(home.databasePid, 'utf8'));
  const identity = identify(pid);
  if (!isAlive(identity) || !commandOf(pid).includes(`--datadir=${home.database}`)) return;
  await end(identity, 30_000);
}

function commandOf(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0');
  } catch {
    return [];
  }
}
