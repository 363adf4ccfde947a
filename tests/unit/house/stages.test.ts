import { describe, expect, test } from 'vitest';
import { tableOf } from '@/scripts/house/figures.mjs';
import { countPlaywright, countVitest, settle, sum } from '@/scripts/house/stages.mjs';

describe('the counts of a test run', () => {
  test('a file that could not be loaded counts as failed', () => {
    const testResults = [
      { status: 'failed', assertionResults: [] },
      { status: 'failed', assertionResults: [{}] },
      { status: 'passed', assertionResults: [{}] },
    ];
    expect(countVitest({ numPassedTests: 7, numFailedTests: 1, testResults })).toEqual({ passed: 7, failed: 2 });
  });

  test('a browser test that passed only when repeated counts as failed', () => {
    expect(countPlaywright({ stats: { expected: 5, unexpected: 1, flaky: 1, skipped: 0 } })).toEqual({ passed: 5, failed: 2 });
  });

  test.each([
    ['a program that failed between its tests has failed', 1, { passed: 9, failed: 0 }, { passed: 9, failed: 1 }],
    ['one that was cut off has failed', 'SIGTERM', { passed: 9, failed: 0 }, { passed: 9, failed: 1 }],
    ['one that ran no test has failed', 0, { passed: 0, failed: 0 }, { passed: 0, failed: 1 }],
    ['failed tests are counted once', 1, { passed: 9, failed: 2 }, { passed: 9, failed: 2 }],
    ['all well', 0, { passed: 9, failed: 0 }, { passed: 9, failed: 0 }],
  ])('%s', (_, code, counted, settled) => {
    expect(settle(code, counted)).toEqual(settled);
  });

  test('the last line adds up every stage', () => {
    expect(
      sum([
        { name: 'lint', passed: 1, failed: 0 },
        { name: 'unit', passed: 40, failed: 2 },
      ]),
    ).toEqual({ passed: 41, failed: 2 });
  });
});

test('figures stand in columns, and a missed goal is plain to see', () => {
  expect(
    tableOf([
      { name: 'proof', value: 41.27, unit: 'ms', goal: '<= 50', holds: true },
      { name: 'resolver, bare', value: 1_900_000, unit: 'lines/s', goal: '>= 2,000,000', holds: false },
    ]).split('\n'),
  ).toEqual([
    'figure              value  unit     goal',
    'proof               41.27  ms       <= 50         holds',
    'resolver, bare  1,900,000  lines/s  >= 2,000,000  MISSED',
  ]);
});
