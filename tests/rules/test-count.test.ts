import { expect, test } from 'vitest';
import { countTests, type TestReport } from '../../scripts/test-count.mjs';

/** A report as vitest writes it: one file with tests of these states. */
function report(states: string[], { success = true, fileStatus = 'passed' } = {}): TestReport {
  const assertionResults = states.map((status, index) => ({ fullName: `test ${index}`, status }));
  return { success, testResults: [{ name: 'a.test.ts', status: fileStatus, assertionResults }] };
}

test('passed tests count as passed', () => {
  expect(countTests(report(['passed', 'passed']), 0)).toEqual({
    ...{ passed: 2, failed: 0, reasons: [] },
  });
});

test('a failed test counts once, though its file has failed too', () => {
  const broken = report(['passed', 'failed'], { success: false, fileStatus: 'failed' });
  expect(countTests(broken, 1)).toEqual({ passed: 1, failed: 1, reasons: [] });
});

test.each(['skipped', 'pending', 'todo', 'disabled'])('a %s test is a failure', (state) => {
  expect(countTests(report(['passed', state]), 0)).toEqual({
    ...{ passed: 1, failed: 1, reasons: ['skipped: test 1'] },
  });
});

test.each([
  ['no report at all', undefined, 1, 0],
  ['no report in spite of exit code 0', undefined, 0, 0],
  ['a run without files', { success: true, testResults: [] }, 0, 0],
  ['a file that did not load', report([], { success: false, fileStatus: 'failed' }), 1, 0],
  ['a hook that broke', report(['passed'], { success: false, fileStatus: 'failed' }), 1, 1],
  ['an error outside a test', report(['passed'], { success: false }), 1, 1],
  ['an exit code that the report does not explain', report(['passed']), 1, 1],
] as const)('%s is a failure', (_, given, exitCode, passed) => {
  const count = countTests(given as TestReport | undefined, exitCode);
  expect(count.passed).toBe(passed);
  expect(count.failed).toBeGreaterThan(0);
  expect(count.reasons).not.toHaveLength(0);
});
