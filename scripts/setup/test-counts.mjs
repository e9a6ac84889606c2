import { readIfThere } from './place.mjs';
import { say } from './say.mjs';

/** @typedef {{ passed: number, failed: number, skipped: number }} Counts */

/**
 * What a run of vitest came to. A file that could not be loaded, and a run that ended badly though no test failed,
 * count as one failure each: silence must never look like success.
 * @param {string} report the file of vitest's json reporter
 * @param {number} exitCode
 * @returns {Counts}
 */
export function countsOf(report, exitCode) {
  const text = readIfThere(report);
  if (!text) {
    say('  ✗ vitest ended without a report');
    return { passed: 0, failed: 1, skipped: 0 };
  }
  const { testResults, numPassedTests, numFailedTests, numPendingTests, numTodoTests } = JSON.parse(text);
  const hasFailure = (file) => file.assertionResults.some((test) => test.status === 'failed');
  const broken = testResults.filter((file) => file.status === 'failed' && !hasFailure(file));
  for (const file of broken) say(`  ✗ ${file.name} could not be run`);
  let failed = numFailedTests + broken.length;
  if (exitCode !== 0 && failed === 0) {
    say(`  ✗ vitest ended with exit code ${exitCode} though no test failed: an error outside the tests, see above`);
    failed = 1;
  }
  return { passed: numPassedTests, failed, skipped: numPendingTests + numTodoTests };
}

/** @param {Counts} a @param {Counts} b @returns {Counts} */
export const addCounts = (a, b) => ({
  passed: a.passed + b.passed,
  failed: a.failed + b.failed,
  skipped: a.skipped + b.skipped,
});

/** @param {Counts} counts */
export const lastLine = ({ passed, failed, skipped }) =>
  `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`;
