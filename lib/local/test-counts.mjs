import { recall } from './state-file.mjs';

/** Reads a vitest report. A file that could not even be loaded counts as one failure, as does a run that left no report. */
export function countVitest(file, code) {
  const report = recall(file);
  if (!report) return { passed: 0, failed: 1, skipped: 0 };
  const broken = report.testResults.filter((each) => each.status === 'failed' && !hasFailure(each)).length;
  const counts = {
    passed: report.numPassedTests,
    failed: report.numFailedTests + broken,
    skipped: report.numPendingTests + report.numTodoTests,
  };
  return settle(counts, code);
}

const hasFailure = (suite) => suite.assertionResults.some((each) => each.status === 'failed');

/** Reads a Playwright report. A test that passed only at a second try counts as failed. */
export function countPlaywright(file, code) {
  const report = recall(file);
  if (!report?.stats) return { passed: 0, failed: 1, skipped: 0 };
  const { expected, unexpected, flaky, skipped } = report.stats;
  return settle({ passed: expected, failed: unexpected + flaky + report.errors.length, skipped }, code);
}

/** A runner that ends badly without naming a failed test has failed all the same, and so has one that ran nothing. */
function settle(counts, code) {
  const ran = counts.passed + counts.failed;
  return counts.failed === 0 && (code !== 0 || ran === 0) ? { ...counts, failed: 1 } : counts;
}
