/**
 * @typedef {object} Count
 * @property {number} passed
 * @property {number} failed
 * @property {string[]} notes why something counts as failed that no test reported
 *
 * @typedef {object} VitestReport what Vitest's JSON reporter writes, as far as it is used here
 * @property {number} numPassedTests
 * @property {number} numFailedTests
 * @property {number} numPendingTests
 * @property {number} numTodoTests
 * @property {{ name: string, status: string, assertionResults: { status: string }[] }[]} testResults
 */

/**
 * Counts one project. Stricter than Vitest: a skipped test, a file that could not be read, an error
 * outside every test and a project without tests are failures.
 * @param {string} project
 * @param {VitestReport | null} report null when Vitest wrote none
 * @param {number} exitCode
 * @returns {Count}
 */
export function countTests(project, report, exitCode) {
  if (report === null) {
    return { passed: 0, failed: 1, notes: [`${project}: Vitest wrote no report`] };
  }
  const notes = [];
  const skipped = report.numPendingTests + report.numTodoTests;
  if (skipped > 0) notes.push(`${project}: ${skipped} skipped, each counts as failed`);
  const broken = report.testResults.filter(
    ({ status, assertionResults }) =>
      status === 'failed' && assertionResults.every((each) => each.status !== 'failed'),
  );
  notes.push(...broken.map(({ name }) => `${project}: ${name} could not be run`));
  const passed = report.numPassedTests;
  let failed = report.numFailedTests + skipped + broken.length;
  if (passed + failed === 0) {
    failed = 1;
    notes.push(`${project}: no test ran`);
  } else if (exitCode !== 0 && failed === 0) {
    failed = 1;
    notes.push(`${project}: Vitest ended with exit code ${exitCode} though no test failed`);
  }
  return { passed, failed, notes };
}

/**
 * @param {readonly Count[]} counts
 * @returns {Count}
 */
export function addCounts(counts) {
  return {
    passed: counts.reduce((sum, { passed }) => sum + passed, 0),
    failed: counts.reduce((sum, { failed }) => sum + failed, 0),
    notes: counts.flatMap(({ notes }) => notes),
  };
}

/**
 * The one line that a whole run comes to.
 * @param {Pick<Count, 'passed' | 'failed'>} count
 */
export function summaryLine({ passed, failed }) {
  return `${passed} passed, ${failed} failed`;
}
