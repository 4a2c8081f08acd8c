import { existsSync, readFileSync } from 'node:fs';

/**
 * Counts one report of the test runner. A file that could not even be read as a test, and a run that failed without a
 * failed test (an error outside of any test, a crash without a report), count as one failure each.
 */
export function countReport(file, exitCode) {
  if (!existsSync(file)) return { passed: 0, failed: 1 };
  const report = JSON.parse(readFileSync(file, 'utf8'));
  const brokenFiles = report.testResults.filter(
    ({ status, assertionResults }) => status === 'failed' && !assertionResults.some((test) => test.status === 'failed'),
  ).length;
  const failed = report.numFailedTests + brokenFiles;
  return { passed: report.numPassedTests, failed: failed === 0 && exitCode !== 0 ? 1 : failed };
}
