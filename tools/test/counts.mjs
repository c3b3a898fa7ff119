import { existsSync, readFileSync } from 'node:fs';

const withoutTests = ({ status, assertionResults }) => status === 'failed' && assertionResults.length === 0;

/** jest and vitest write the same report. A file that could not be loaded counts as one failure. */
export function jestCounts(report) {
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests + report.testResults.filter(withoutTests).length,
    skipped: report.numPendingTests + (report.numTodoTests ?? 0),
  };
}

/** Playwright's report. A failure outside of any test counts too. */
export function playwrightCounts({ stats, errors }) {
  return {
    passed: stats.expected + stats.flaky,
    failed: stats.unexpected + errors.length,
    skipped: stats.skipped,
  };
}

/** What a runner reported, made to agree with its exit code: no report, or no test at all, is a failure. */
export function countsFrom(file, read, code) {
  if (!existsSync(file)) return { passed: 0, failed: 1, skipped: 0, note: 'no report' };
  const counts = read(JSON.parse(readFileSync(file, 'utf8')));
  if (counts.passed + counts.failed === 0) return { ...counts, failed: 1, note: 'no test was run' };
  if (code !== 0 && counts.failed === 0)
    return { ...counts, failed: 1, note: code === null ? 'did not end by itself' : `ended with ${code}` };
  return counts;
}
