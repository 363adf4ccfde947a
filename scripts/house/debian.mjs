import { accessSync, constants } from 'node:fs';
import path from 'node:path';
import { runQuietly } from './run.mjs';
import { Sentence } from './sentence.mjs';

/**
 * What Debian provides. The core packages of MariaDB hold the same server without the system service that the full
 * package would start on this machine.
 */
export const debianPrograms = {
  database: { programs: ['mariadbd', 'mariadb-install-db', 'my_print_defaults'], packages: ['mariadb-server-core', 'mariadb-client-core'] },
  browser: { programs: ['chromium'], packages: ['chromium'] },
};

const folders = () => [...(process.env.PATH ?? '').split(path.delimiter), '/usr/sbin', '/usr/bin', '/usr/local/sbin'];

export function findProgram(name) {
  return folders()
    .map((folder) => path.join(folder, name))
    .find(isExecutable);
}

function isExecutable(file) {
  try {
    accessSync(file, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/** The packages to install for what is asked, given what is there. */
export const missingPackages = (wanted, find = findProgram) =>
  wanted.filter(({ programs }) => programs.some((program) => find(program) === undefined)).flatMap(({ packages }) => packages);

/** The way in which this machine can get them: run by us, typed by a person, or none. */
export function wayToInstall(packages, { isRoot, hasApt }) {
  if (packages.length === 0) return { kind: 'nothing to do' };
  if (!hasApt)
    return {
      kind: 'sentence',
      text: `Tamis needs ${packages.join(' and ')} and this system has no apt-get; install MariaDB 10.11 or later (for tests also Chromium) in your system's way and start again.`,
    };
  const asRoot = isRoot ? '' : 'sudo ';
  const command = `${asRoot}apt-get update && ${asRoot}apt-get install -y --no-install-recommends ${packages.join(' ')}`;
  if (isRoot) return { kind: 'run', command };
  return { kind: 'sentence', text: `Tamis needs ${packages.join(' and ')}, which only root may install. Run this, then start again:\n\n    ${command}\n` };
}

export async function installFromDebian(wanted, home) {
  const packages = missingPackages(wanted);
  const way = wayToInstall(packages, { isRoot: process.getuid?.() === 0, hasApt: findProgram('apt-get') !== undefined });
  if (way.kind === 'sentence') throw new Sentence(way.text);
  if (way.kind === 'nothing to do') return 'there';
  await runQuietly('Installing from Debian', 'sh', ['-c', way.command], home.log('apt-get'), {
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
  });
  return `installed ${packages.join(', ')}`;
}
