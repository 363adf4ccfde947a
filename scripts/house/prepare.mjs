import path from 'node:path';
import { root } from './home.mjs';
import { inPackages, runQuietly } from './run.mjs';

/** Node runs the project's TypeScript; server modules load as they do on the server. */
export const typescript = ['--conditions=react-server', '--import', `file://${inPackages('tsx', 'dist', 'esm', 'index.mjs')}`];

/** Migrates, and fills an empty database with the demo. Says what a person must know to mend it when it fails. */
export async function prepareDatabase(home, env) {
  await runQuietly('Preparing the database', process.execPath, [...typescript, path.join(root, 'scripts', 'prepare-database.ts')], home.log('prepare-database'), { env });
}
