import { existsSync, readFileSync } from 'node:fs';

/** vitest's and jest's JSON report. A file that could not be run at all holds no test, and counts as one failure. */
function countsOfJestReport(report) {
  const broken = report.testResults.filter(
    ({ status, assertionResults }) => status === 'failed' && assertionResults.length === 0,
  );
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests + broken.length,
    skipped: report.numPendingTests + (report.numTodoTests ?? 0),
  };
}

/** Playwright's JSON report. A test that passed only when repeated has failed once; errors belong to no test. */
function countsOfPlaywrightReport({ stats, errors = [] }) {
  return { passed: stats.expected, failed: stats.unexpected + stats.flaky + errors.length, skipped: stats.skipped };
}

/** Node.js's own runner in TAP, which ends with lines such as "# pass 12". */
function countsOfTapReport(text) {
  const count = (name) => {
    const line = new RegExp(`^# ${name} (\\d+)$`, 'm').exec(text);
    if (!line) throw new Error(`no count of ${name}`);
    return Number(line[1]);
  };
  return {
    passed: count('pass'),
    failed: count('fail') + count('cancelled'),
    skipped: count('skipped') + count('todo'),
  };
}

const READERS = {
  jest: (text) => countsOfJestReport(JSON.parse(text)),
  playwright: (text) => countsOfPlaywrightReport(JSON.parse(text)),
  tap: countsOfTapReport,
};

/**
 * What one runner did: { passed, failed, skipped, trouble }. `trouble` says in words why the run as a whole is a failure
 * although no single test failed: no report, nothing run, or a bad exit code nothing in the report explains.
 */
export function readReport({ format, file, exitCode }) {
  if (!existsSync(file)) return ofTrouble(`ended with ${exitCode ?? 'a signal'} and left no report`);
  let counts;
  try {
    counts = READERS[format](readFileSync(file, 'utf8'));
  } catch (error) {
    return ofTrouble(`left a report that cannot be read: ${error.message}`);
  }
  if (!Object.values(counts).every(Number.isInteger)) return ofTrouble('left a report without counts');
  const { passed, failed } = counts;
  if (failed === 0 && exitCode !== 0)
    return ofTrouble(`ended with ${exitCode ?? 'a signal'} though no test failed`, counts);
  if (passed + failed === 0) return ofTrouble('ran no test', counts);
  return counts;
}

function ofTrouble(trouble, { passed = 0, skipped = 0 } = {}) {
  return { passed, failed: 1, skipped, trouble };
}

export function addUp(results) {
  const total = (kind) => results.reduce((sum, result) => sum + result[kind], 0);
  return { passed: total('passed'), failed: total('failed') };
}

/** The line `npm test` ends with. */
export function lastLine({ passed, failed }) {
  return `${passed} passed, ${failed} failed`;
}
