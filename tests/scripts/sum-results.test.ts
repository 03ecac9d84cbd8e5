import { describe, expect, it } from 'vitest';
import { sumStage } from '@/scripts/lib/sum-results.mjs';

const file = (status: string, tests: [name: string, status: string][], message = '') => ({
  name: `${process.cwd()}/tests/a.test.ts`,
  status,
  message,
  assertionResults: tests.map(([fullName, state]) => ({ fullName, status: state })),
});

const run = (code: number, ...testResults: ReturnType<typeof file>[]) =>
  sumStage({ stage: 'unit', code, report: { testResults } });

describe('the sum of the test results', () => {
  it('counts what passed', () => {
    const tests: [string, string][] = [
      ['x', 'passed'],
      ['y', 'passed'],
    ];
    expect(run(0, file('passed', tests))).toEqual({ passed: 2, failures: [] });
  });

  it('names a failed test and one that did not run', () => {
    const sum = run(1, file('failed', [['x', 'failed'], ['y', 'skipped'], ['z', 'passed']])); // prettier-ignore
    expect(sum).toEqual({
      passed: 1,
      failures: ['unit: tests/a.test.ts: x', 'unit: tests/a.test.ts: y (did not run)'],
    });
  });

  it('counts a file that failed before its tests', () => {
    expect(run(1, file('failed', [], 'Cannot find module\n at …')).failures).toEqual([
      'unit: tests/a.test.ts: Cannot find module',
    ]);
  });

  it.each([
    ['a stage without tests', 0, { testResults: [] }],
    ['a stage that left no report', 0, undefined],
    ['a stage that ended badly after passing tests', 1, { testResults: [file('passed', [['x', 'passed']])] }],
  ])('counts %s as a failure', (_what, code, report) => {
    expect(sumStage({ stage: 'ui', code, report }).failures).toHaveLength(1);
  });
});
