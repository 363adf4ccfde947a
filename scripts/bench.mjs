/** npm run bench [word]: the figures of tests/bench, each beside its goal; with a word, only the benches whose name holds it. */
import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { build } from './house/build.mjs';
import { debianPrograms, installFromDebian } from './house/debian.mjs';
import { tableOf } from './house/figures.mjs';
import { homeAt, openHome, root } from './house/home.mjs';
import { keep } from './house/keep-json.mjs';
import { takeHome } from './house/one-at-a-time.mjs';
import { installPackages } from './house/packages.mjs';
import { inPackages, runQuietly } from './house/run.mjs';
import { mustNotBuildUnderARunningTamis } from './house/running-build.mjs';
import { say, step } from './house/say.mjs';
import { scratchSettings, startProduct, startScratchDatabase } from './house/scratch.mjs';
import { openSecrets } from './house/secrets.mjs';
import { Sentence } from './house/sentence.mjs';
import { runUntilStopped } from './house/until-stopped.mjs';

const folder = path.join(root, 'tests', 'bench');

/** Benches of pages are asked of the running product; the others need only Node. */
const wantsProduct = (name) => name.startsWith('page-');

runUntilStopped(
  async ({ onStop }) => {
    const word = process.argv[2] ?? '';
    const names = readdirSync(folder).filter((name) => name.endsWith('.bench.ts') && name.includes(word));
    if (names.length === 0) throw new Sentence(`No bench in tests/bench has "${word}" in its name.`);

    const home = homeAt(path.join(root, '.data', 'bench'));
    openHome(home);
    const watch = await takeHome(home, { task: 'A bench of Tamis' });
    onStop(watch.release);
    await step('Packages', () => installPackages(home));
    const env = names.some(wantsProduct) ? await startForPages(home, watch, onStop) : process.env;

    const figures = [];
    for (const name of names) figures.push(...(await step(name.replace('.bench.ts', ''), () => measure(name, home, env))));
    keep(path.join(root, '.data', 'bench.json'), { node: process.versions.node, at: new Date().toISOString(), figures });
    say(`\n${tableOf(figures)}\n\nKept in .data/bench.json.`);
    return figures.every(({ holds }) => holds) ? 0 : 1;
  },
  { codeWhenAsked: 130 },
);

async function startForPages(home, watch, onStop) {
  mustNotBuildUnderARunningTamis();
  await step('MariaDB and Chromium', () => installFromDebian([debianPrograms.database, debianPrograms.browser], home));
  const secrets = openSecrets(home);
  const database = await step('Database server', () => startScratchDatabase(home, secrets, watch, onStop));
  const product = await scratchSettings(home, secrets, database.url);
  await step('Build', () => build(home, product.env));
  return step('Web server', () => startProduct(home, product, watch, onStop));
}

/** In a process of its own, so that no bench warms or burdens the next. */
async function measure(name, home, env) {
  const result = path.join(home.folder, `${name}.json`);
  const runner = path.join(folder, 'run-bench.ts');
  await runQuietly(`The bench ${name}`, process.execPath, ['--import', `file://${inPackages('tsx', 'dist', 'esm', 'index.mjs')}`, runner, path.join(folder, name), result], home.log(name), { env });
  return JSON.parse(readFileSync(result, 'utf8'));
}
