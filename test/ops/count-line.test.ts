import { expect, test } from 'vitest';
import { countLine, countTests } from '@/src/ops/count-line.mjs';

const file = (status: string, tests: number) => ({
  status,
  assertionResults: Array.from({ length: tests }, () => ({})),
});

test('counts failed tests, and files that could not be loaded as one failure each', () => {
  const testResults = [file('passed', 3), file('failed', 2), file('failed', 0)];
  const counts = countTests({ numPassedTests: 4, numFailedTests: 1, testResults }, 1);
  expect(countLine(counts)).toBe('4 passed, 2 failed');
});

test('a clean run has no failures', () => {
  expect(countTests({ numPassedTests: 3, numFailedTests: 0, testResults: [file('passed', 3)] }, 0)).toEqual({
    passed: 3,
    failed: 0,
  });
});

test.each([
  ['without a report', undefined, 0],
  ['without any test', { numPassedTests: 0, numFailedTests: 0, testResults: [] }, 0],
  ['that ended badly though every test passed', { numPassedTests: 3, numFailedTests: 0, testResults: [] }, 1],
])('a run %s is a failure', (_, report, exitCode) => {
  expect(countTests(report, exitCode).failed).toBe(1);
});
