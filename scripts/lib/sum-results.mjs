// sum-results.mjs <folder> <stage>…: names the failures of vitest's JSON reports and prints the sum last.
//
// A stage leaves <stage>.json and <stage>.code, its exit code. As failures count: a failed test; a test that
// did not run; a file that failed before its tests; a stage without any test; a stage that ended badly though
// all its tests passed.
import { readFileSync } from 'node:fs';
import path from 'node:path';

/**
 * @param {{ stage: string, code: number, report: any }} run
 * @returns {{ passed: number, failures: string[] }}
 */
export function sumStage({ stage, code, report }) {
  const files = report?.testResults ?? [];
  const failures = [];
  let passed = 0;
  for (const file of files) {
    const name = path.relative(process.cwd(), file.name);
    const tests = file.assertionResults ?? [];
    for (const test of tests) {
      if (test.status === 'passed') passed += 1;
      else failures.push(`${stage}: ${name}: ${test.fullName}${test.status === 'failed' ? '' : ' (did not run)'}`);
    }
    if (file.status === 'failed' && !tests.some((test) => test.status === 'failed')) {
      failures.push(`${stage}: ${name}: ${firstLine(file.message) || 'the file failed before its tests'}`);
    }
  }
  if (passed === 0 && failures.length === 0) failures.push(`${stage}: no test ran`);
  if (code !== 0 && failures.length === 0) failures.push(`${stage}: ended with code ${code} though its tests passed`);
  return { passed, failures };
}

function firstLine(text) {
  return (text ?? '').split('\n')[0];
}

function readRun(folder, stage) {
  const read = (name) => {
    try {
      return readFileSync(path.join(folder, name), 'utf8');
    } catch {
      return undefined;
    }
  };
  const json = read(`${stage}.json`);
  let report;
  try {
    report = json && JSON.parse(json);
  } catch {
    report = undefined;
  }
  return { stage, code: Number(read(`${stage}.code`) ?? '1'), report };
}

if (process.argv[1] === import.meta.filename) {
  const [, , folder, ...stages] = process.argv;
  const sums = stages.map((stage) => sumStage(readRun(folder, stage)));
  const failures = sums.flatMap((sum) => sum.failures);
  const passed = sums.reduce((total, sum) => total + sum.passed, 0);
  if (failures.length > 0) process.stdout.write(`\nFailed:\n${failures.map((name) => `  ✗ ${name}\n`).join('')}`);
  process.stdout.write(`\n${passed} passed, ${failures.length} failed\n`);
  process.exitCode = failures.length > 0 ? 1 : 0;
}
