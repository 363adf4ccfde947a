import { readdirSync } from 'node:fs';
import path from 'node:path';
import { ESLint } from 'eslint';
import { beforeAll, describe, expect, test } from 'vitest';

const root = path.resolve(import.meta.dirname, '../..');
/** The files linted here are made up; a search for import circles wants them on disk. */
const linter = new ESLint({ cwd: root, overrideConfig: { rules: { 'import/no-cycle': 'off' } } });

/** Some file of a folder, as an import would name it: the rules look at what is really there. */
function someModule(folder: string): string {
  const file = readdirSync(path.join(root, folder), { recursive: true, encoding: 'utf8' })
    .sort()
    .find((name) => /\.tsx?$/.test(name) && !/\.(test|d)\.tsx?$/.test(name));
  if (!file) throw new Error(`${folder} holds no module`);
  return `@/${folder}/${file.replace(/\.tsx?$/, '')}`;
}

async function rulesBroken(filePath: string, code: string): Promise<readonly string[]> {
  const [result] = await linter.lintText(`${code}\n`, { filePath: path.join(root, filePath) });
  return (result?.messages ?? []).filter(({ severity }) => severity === 2).map(({ ruleId, message }) => ruleId ?? message);
}

const importing = (module: string) => `import * as other from '${module}';\nexport const kept = other;`;

const [oneFeature = '', otherFeature = ''] = readdirSync(path.join(root, 'features'));

describe('the direction app -> features -> components -> lib', () => {
  beforeAll(() => rulesBroken('lib/first.ts', 'export {};'), 60_000);

  test.each([
    ['lib imports a feature', 'lib/http/made-up.ts', `features/${oneFeature}`],
    ['lib imports a component', 'lib/http/made-up.ts', 'components'],
    ['a component imports a feature', 'components/made-up.tsx', `features/${oneFeature}`],
    ['a component imports a model', 'components/made-up.tsx', 'models'],
    ['a page imports a model', 'app/made-up/page.tsx', 'models'],
    ['a feature imports another feature', `features/${oneFeature}/components/made-up.tsx`, `features/${otherFeature}`],
    ["a feature's screen imports a model", `features/${oneFeature}/components/made-up.tsx`, 'models'],
    ["a feature's fetcher imports the database", `features/${oneFeature}/api/made-up.ts`, 'lib/server'],
    ["a feature's schema imports a model", `features/${oneFeature}/schema.ts`, 'models'],
    ['a new folder of a feature imports a model', `features/${oneFeature}/made-up/part.ts`, 'models'],
    ['the domain imports the server', 'lib/domain/made-up.ts', 'lib/server'],
  ])('%s: refused', async (_, file, target) => {
    expect(await rulesBroken(file, importing(someModule(target)))).toContain('import/no-restricted-paths');
  });

  test.each([
    ['a page imports a feature', 'app/made-up/page.tsx', `features/${oneFeature}`],
    ["a feature's use case imports a model", `features/${oneFeature}/server/made-up.ts`, 'models'],
    ['a feature imports itself', `features/${oneFeature}/components/made-up.tsx`, `features/${oneFeature}`],
    ['a feature imports the domain', `features/${oneFeature}/components/made-up.tsx`, 'lib/domain'],
    ['a test imports a model', 'tests/integration/made-up.test.ts', 'models'],
  ])('%s: allowed', async (_, file, target) => {
    expect(await rulesBroken(file, importing(someModule(target)))).toEqual([]);
  });
});

describe('the domain is pure', () => {
  test.each(['node:fs', 'fs', 'react', 'next/navigation', 'next-auth', 'sequelize', 'mariadb'])('it does not import %s', async (module) => {
    expect(await rulesBroken('lib/domain/made-up.ts', importing(module))).toContain('no-restricted-imports');
  });

  test.each([
    ['chance', 'export const made = () => Math.random();', 'no-restricted-properties'],
    ['the clock', 'export const made = () => Date.now();', 'no-restricted-properties'],
    ['the page', 'export const made = () => document.title;', 'no-restricted-globals'],
  ])('it does not reach for %s', async (_, code, rule) => {
    expect(await rulesBroken('lib/domain/made-up.ts', code)).toContain(rule);
  });
});

describe('settings and the console', () => {
  test.each(['app/made-up.ts', 'features/board/server/made-up.ts', 'components/made-up.ts', 'lib/server/made-up.ts'])('%s does not read process.env', async (file) => {
    expect(await rulesBroken(file, 'export const made = process.env.HOME;')).toContain('no-restricted-syntax');
  });

  test('lib/env.ts reads it', async () => {
    expect(await rulesBroken('lib/env.ts', 'export const made = process.env.HOME;')).toEqual([]);
  });

  test('the product writes nothing to the console', async () => {
    expect(await rulesBroken('features/board/server/made-up.ts', "console.log('x');")).toContain('no-console');
  });
});

test('a test that is switched off is refused', async () => {
  expect(await rulesBroken('tests/unit/made-up.test.ts', "import { test } from 'vitest';\ntest.skip('x', () => {});")).toContain('no-restricted-syntax');
});
