export interface Count {
  passed: number;
  failed: number;
}

/** The part of vitest's JSON report that is counted. */
export interface Report {
  numPassedTests: number;
  numFailedTests: number;
  numPendingTests: number;
  numTodoTests: number;
  testResults: Array<{ status: string; assertionResults: Array<{ status: string }> }>;
}

/** Counts a run; no report, a file that did not load, a skipped test and an unexplained exit code are failures. */
export function countReport(report: Report | null, exitCode: number): Count;

/** The one line that closes `npm test`. */
export function closingLine(count: Count): string;
