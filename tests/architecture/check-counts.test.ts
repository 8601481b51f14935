import { expect, test } from 'vitest';

interface Counts {
  passed: number;
  failed: number;
}

// The check's own script is plain JavaScript, since it runs before anything is installed.
const steps: { countsOf(report: unknown, succeeded: boolean): Counts } = await import(
  new URL('../../scripts/check-steps.mjs', import.meta.url).href
);

const good = { status: 'passed', assertionResults: [{}] };
const report = { numPassedTests: 3, numFailedTests: 0, numPendingTests: 0, testResults: [good] };

test('a clean report counts as it stands', () => {
  expect(steps.countsOf(report, true)).toEqual({ passed: 3, failed: 0 });
});

test('failed tests, files that do not load and skipped tests all count as failed', () => {
  expect(steps.countsOf({ ...report, numFailedTests: 2 }, false)).toEqual({ passed: 3, failed: 2 });
  const unloaded = { status: 'failed', assertionResults: [] };
  expect(steps.countsOf({ ...report, testResults: [good, unloaded] }, false)).toEqual({ passed: 3, failed: 1 });
  expect(steps.countsOf({ ...report, numPendingTests: 1 }, true)).toEqual({ passed: 3, failed: 1 });
});

test('a run that ends badly without a failed test, or leaves no report, counts as one failed', () => {
  expect(steps.countsOf(report, false)).toEqual({ passed: 3, failed: 1 });
  expect(steps.countsOf(null, true)).toEqual({ passed: 0, failed: 1 });
});
