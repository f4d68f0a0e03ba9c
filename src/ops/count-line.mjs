/** A file that could not be loaded has no tests to fail, yet it failed. */
const brokenFiles = (report) =>
  report.testResults.filter((file) => file.status === 'failed' && file.assertionResults.length === 0).length;

/** What a run of the tests came to, from vitest's report; without one the run itself is the failure. */
export function countTests(report, exitCode) {
  if (!report) return { passed: 0, failed: 1 };
  const failed = report.numFailedTests + brokenFiles(report);
  const nothingRan = report.numPassedTests + failed === 0;
  const failedOtherwise = failed === 0 && (exitCode !== 0 || nothingRan);
  return { passed: report.numPassedTests, failed: failed + (failedOtherwise ? 1 : 0) };
}

export const countLine = ({ passed, failed }) => `${passed} passed, ${failed} failed`;
