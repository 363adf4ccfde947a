import { inPackages } from './run.mjs';
import { countPlaywright, countVitest, runCheck, runCounted, runStage } from './stages.mjs';

const node = process.execPath;

export const lint = () => runCheck('lint', node, [inPackages('eslint', 'bin', 'eslint.js'), '.', '--quiet']);

/** The framework writes the types of the routes; the compiler asks for them. */
export async function types() {
  await runStage('types', node, [inPackages('next', 'dist', 'bin', 'next'), 'typegen']);
  return runCheck('types', node, [inPackages('typescript', 'bin', 'tsc'), '--noEmit', '-p', '.']);
}

export function vitest(name, projects, { report, env, names = [] }) {
  const parts = [inPackages('vitest', 'vitest.mjs'), 'run', ...projects.flatMap((project) => ['--project', project])];
  return runCounted(name, node, [...parts, ...names, '--reporter=default', '--reporter=json', `--outputFile.json=${report}`], { report, env, count: countVitest });
}

export function browser({ report, env, names }) {
  return runCounted('browser', node, [inPackages('@playwright', 'test', 'cli.js'), 'test', ...names, '--reporter=list,json'], {
    report,
    env: { ...env, PLAYWRIGHT_JSON_OUTPUT_FILE: report },
    count: countPlaywright,
    limitMinutes: 35,
  });
}
