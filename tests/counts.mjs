import { readFileSync } from 'node:fs';

/** @typedef {{ passed: number, failed: number, skipped: number }} Counts */

/** @returns {Counts} */
export const counts = (passed = 0, failed = 0, skipped = 0) => ({ passed, failed, skipped });

/** A stage that only succeeds or fails counts as one test. @param {number} exitCode */
export const oneTest = (exitCode) => (exitCode === 0 ? counts(1) : counts(0, 1));

/** @param {Counts[]} all */
export function sum(all) {
  const total = counts();
  for (const each of all) for (const key of Object.keys(total)) total[key] += each[key];
  return total;
}

/** @param {Counts} total */
export function inWords({ passed, failed, skipped }) {
  return `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`;
}

/**
 * Counts of Vitest's JSON report. A file that broke before its tests ran has none to show: it counts as one failure.
 * @param {string} file
 * @param {number} exitCode of the run: a failure that no test shows still counts
 */
export function vitestCounts(file, exitCode) {
  const report = readReport(file);
  if (report === undefined) return counts(0, 1);
  const broken = report.testResults.filter(
    (suite) => suite.status === 'failed' && !suite.assertionResults.some((test) => test.status === 'failed'),
  );
  const failed = report.numFailedTests + broken.length;
  return orFailed(
    counts(report.numPassedTests, failed, report.numPendingTests + report.numTodoTests),
    exitCode,
  );
}

/** Counts of Playwright's JSON report. @param {string} file @param {number} exitCode */
export function playwrightCounts(file, exitCode) {
  const stats = readReport(file)?.stats;
  if (stats === undefined) return counts(0, 1);
  return orFailed(counts(stats.expected, stats.unexpected + stats.flaky, stats.skipped), exitCode);
}

function orFailed(result, exitCode) {
  return exitCode !== 0 && result.failed === 0 ? { ...result, failed: 1 } : result;
}

function readReport(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return undefined;
  }
}
