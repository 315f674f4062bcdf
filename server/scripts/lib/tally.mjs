/** Counts of passed and failed checks, by runner. */
export function createTally() {
  const rows = [];
  return {
    add: (name, passed, failed) => rows.push({ name, passed, failed }),
    rows,
    total: () =>
      rows.reduce((sum, row) => ({ passed: sum.passed + row.passed, failed: sum.failed + row.failed }), {
        passed: 0,
        failed: 0,
      }),
  };
}

/** Sums of a vitest report; a file that could not be loaded counts as one failure, and so does a run without any test. */
export function countReport(report) {
  const brokenFiles = report.testResults.filter(
    (file) => file.status === "failed" && file.assertionResults.length === 0,
  ).length;
  const failed = report.numFailedTests + brokenFiles;
  const ran = report.numPassedTests + report.numFailedTests;
  return { passed: report.numPassedTests, failed: ran + brokenFiles === 0 ? 1 : failed };
}
