import { accessSync, chmodSync, constants, existsSync, mkdirSync, statfsSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { Sentence } from './sentence.mjs';

export const root = path.resolve(fileURLToPath(new URL('../..', import.meta.url)));

/** What a start needs on disk beyond what is there: packages, build and database at first, later only room to work. */
const neededBytes = { first: 1_200_000_000, later: 200_000_000 };

/** Every path below one data folder; nothing of ours lies outside it but node_modules and the build. */
export function homeAt(folder) {
  const below = (...parts) => path.join(folder, ...parts);
  return {
    folder,
    database: below('database'),
    databaseSocket: below('database.sock'),
    databasePid: below('database.pid'),
    databaseFirstWords: below('database.sql'),
    ports: below('ports.json'),
    secrets: below('secrets.json'),
    running: below('running.json'),
    mail: below('mail'),
    log: (name) => below('log', `${name}.log`),
  };
}

/** Makes the folders, readable by nobody else, and says at once when they cannot be used. */
export function openHome(home) {
  const isFirst = !existsSync(path.join(root, 'node_modules'));
  mustHaveRoom(root, isFirst ? neededBytes.first : neededBytes.later);
  for (const folder of [home.folder, home.mail, path.dirname(home.log('any'))]) makeFolder(folder);
  accessSync(home.folder, constants.R_OK | constants.W_OK | constants.X_OK);
}

function makeFolder(folder) {
  if (mkdirSync(folder, { recursive: true, mode: 0o700 })) chmodSync(folder, 0o700);
}

export function mustHaveRoom(folder, bytes, look = statfsSync) {
  const { bavail, bsize } = look(folder);
  if (bavail * bsize >= bytes) return;
  const megabytes = (count) => `${Math.floor(count / 1_000_000).toLocaleString('en')} MB`;
  throw new Sentence(
    `The disk that holds ${folder} has ${megabytes(bavail * bsize)} free and Tamis wants ${megabytes(bytes)}; free some space and start again. Nothing was changed.`,
  );
}
