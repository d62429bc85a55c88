import { existsSync } from 'node:fs';
import { readFile, rm } from 'node:fs/promises';
import { inLocal, inRoot } from './paths.mjs';
import { attempt } from './run.mjs';

const ownWorkers = /^(-i|--runInBand|-w|--maxWorkers)(=|$)/;

/**
 * Counts of a jest report: a file that could not run, or failed outside its tests, counts as one
 * failed test, so that it cannot be overlooked.
 */
export function countsOf(report) {
  const broken = report.testResults.filter(
    ({ status, assertionResults }) =>
      status === 'failed' && !assertionResults.some((test) => test.status === 'failed'),
  );
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests + broken.length,
    skipped: report.numPendingTests + report.numTodoTests,
  };
}

/** `12 passed, 1 failed`, and how many were skipped where any were. */
export const closingLine = ({ passed, failed, skipped }) =>
  `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`;

/**
 * Runs jest, showing its output, and answers its counts with `ok`. Not ok: a failure of any kind,
 * jest's own included, and a run without a single test.
 */
export async function runJest(args, env) {
  const report = inLocal(`jest-${process.pid}.json`);
  const workers = args.some((arg) => ownWorkers.test(arg)) ? [] : ['-w', '2'];
  const own = ['--json', '--outputFile', report, ...workers];
  try {
    const { code } = await attempt(
      process.execPath,
      [inRoot('node_modules/jest/bin/jest.js'), ...own, ...args],
      { env, show: true },
    );
    if (!existsSync(report)) return { passed: 0, failed: 1, skipped: 0, ok: false };
    const counts = countsOf(JSON.parse(await readFile(report, 'utf8')));
    return { ...counts, ok: code === 0 && counts.failed === 0 && counts.passed > 0 };
  } finally {
    await rm(report, { force: true });
  }
}
