import { existsSync, readFileSync } from 'node:fs';

const NOTHING = { passed: 0, failed: 0, skipped: 0 };

/** A file that could not even be loaded holds no tests to count, yet it has failed. */
const failedToLoad = (file) => file.status === 'failed' && !file.assertionResults.some(isFailed);
const isFailed = (assertion) => assertion.status === 'failed';

/**
 * Counts one run from the report that vitest wrote.
 *
 * @param exitCode vitest's own: when it fails without a failed test (an unhandled error, a setup that threw, no report at
 *   all), the run itself counts as the one that failed
 */
export function countReport(reportFile, exitCode) {
  const counts = existsSync(reportFile) ? countTests(JSON.parse(readFileSync(reportFile, 'utf8'))) : NOTHING;
  return exitCode !== 0 && counts.failed === 0 ? { ...counts, failed: 1 } : counts;
}

function countTests(report) {
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests + report.testResults.filter(failedToLoad).length,
    skipped: report.numPendingTests + report.numTodoTests,
  };
}

export function addCounts(one, other) {
  return {
    passed: one.passed + other.passed,
    failed: one.failed + other.failed,
    skipped: one.skipped + other.skipped,
  };
}

export const noCounts = () => ({ ...NOTHING });

export function printCounts({ passed, failed, skipped }) {
  const skippedPart = skipped > 0 ? `, ${skipped} skipped` : '';
  return `${passed} passed, ${failed} failed${skippedPart}`;
}
