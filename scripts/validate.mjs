/** npm run validate: what can be checked in a minute, without a database or a browser. */
import path from 'node:path';
import { lint, types, vitest } from './house/checks.mjs';
import { homeAt, openHome, root } from './house/home.mjs';
import { installPackages } from './house/packages.mjs';
import { say, step } from './house/say.mjs';
import { inTurn, sum } from './house/stages.mjs';
import { runUntilStopped } from './house/until-stopped.mjs';

runUntilStopped(
  async () => {
    const home = homeAt(path.join(root, '.data', 'validate'));
    openHome(home);
    await step('Packages', () => installPackages(home));
    const outcomes = await Promise.all([
      inTurn([
        ['lint', lint],
        ['types', types],
      ]),
      inTurn([['unit', () => vitest('unit', ['unit'], { report: path.join(home.folder, 'unit.json') })]]),
    ]);
    const { passed, failed } = sum(outcomes.flat());
    say(`\n${passed} passed, ${failed} failed`);
    return failed === 0 ? 0 : 1;
  },
  { codeWhenAsked: 130 },
);
