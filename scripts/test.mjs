/**
 * npm test: sets itself up, tries everything on a database of its own, and ends with one line of counts.
 * npm test <part> [file ...] runs one part, of some files.
 */
import path from 'node:path';
import { build } from './house/build.mjs';
import { browser, lint, types, vitest } from './house/checks.mjs';
import { debianPrograms, installFromDebian } from './house/debian.mjs';
import { homeAt, openHome, root } from './house/home.mjs';
import { takeHome } from './house/one-at-a-time.mjs';
import { installPackages } from './house/packages.mjs';
import { mustNotBuildUnderARunningTamis } from './house/running-build.mjs';
import { say, step } from './house/say.mjs';
import { scratchSettings, startProduct, startScratchDatabase, withDatabase } from './house/scratch.mjs';
import { openSecrets } from './house/secrets.mjs';
import { Sentence } from './house/sentence.mjs';
import { inTurn, outcome, sum } from './house/stages.mjs';
import { runUntilStopped } from './house/until-stopped.mjs';

const [only, ...names] = process.argv.slice(2);

runUntilStopped(
  async ({ onStop }) => {
    const home = homeAt(path.join(root, '.data', 'test'));
    const report = (name) => path.join(home.folder, `${name}.json`);
    openHome(home);
    const watch = await takeHome(home, { task: 'A test run of Tamis' });
    onStop(watch.release);
    mustNotBuildUnderARunningTamis();
    const secrets = openSecrets(home);

    await step('Packages', () => installPackages(home));
    await step('MariaDB and Chromium', () => installFromDebian([debianPrograms.database, debianPrograms.browser], home));
    const database = await step('Database server', () => startScratchDatabase(home, secrets, watch, onStop));
    const product = await scratchSettings(home, secrets, database.url);
    const integration = { ...product.env, DATABASE_URL: withDatabase(database.url, 'tamis_integration') };

    let isBuilt = false;
    const stages = {
      lint,
      unit: () => vitest('unit', ['unit', 'reference'], { report: report('unit'), names }),
      build: async () => {
        await step('Build', () => build(home, product.env));
        isBuilt = true;
        return outcome('build', 1, 0);
      },
      types,
      integration: () => vitest('integration', ['integration'], { report: report('integration'), env: integration, names }),
      browser: async () => {
        if (!isBuilt) throw new Error('there is no build to try in a browser');
        return browser({ report: report('browser'), env: await startProduct(home, product, watch, onStop), names });
      },
    };
    const wanted = (...group) => group.filter((name) => !only || name === only || (only === 'browser' && name === 'build')).map((name) => [name, stages[name]]);
    if (only && !Object.hasOwn(stages, only)) throw new Sentence(`There is no part "${only}"; the parts are ${Object.keys(stages).join(', ')}.`);

    // Two cores: the build has stretches on one core, in which the other lints. The types of the routes come from the build.
    const sideBySide = await Promise.all([inTurn(wanted('lint', 'unit')), inTurn(wanted('build', 'types'))]);
    const alone = await inTurn(wanted('integration', 'browser'));

    const outcomes = [...sideBySide.flat(), ...alone];
    say();
    for (const { name, passed, failed } of outcomes) say(`${name.padEnd(11)} ${String(passed).padStart(6)} passed ${String(failed).padStart(4)} failed`);
    const { passed, failed } = sum(outcomes);
    say(`${passed} passed, ${failed} failed`);
    return failed === 0 ? 0 : 1;
  },
  { codeWhenAsked: 130 },
);
