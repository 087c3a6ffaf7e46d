/** @type {typeof import('./test-report.d.mts').countReport} */
export function countReport(report, exitCode) {
  if (!report) return { passed: 0, failed: 1 };
  const passed = report.numPassedTests;
  // A file that cannot be loaded has no tests to count, and one that is skipped has shown nothing.
  const unloaded = report.testResults.filter(
    (file) => file.status === 'failed' && file.assertionResults.every(isPassed),
  ).length;
  const unshown = report.numPendingTests + report.numTodoTests;
  const failed = report.numFailedTests + unloaded + unshown;
  return { passed, failed: failed === 0 && (exitCode !== 0 || passed === 0) ? 1 : failed };
}

/** @param {{ status: string }} test */
const isPassed = (test) => test.status === 'passed';

/** @type {typeof import('./test-report.d.mts').closingLine} */
export const closingLine = ({ passed, failed }) => `${passed} passed, ${failed} failed`;
