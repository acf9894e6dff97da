/**
 * Counts a run of vitest from its JSON report (undefined when it left none) and its exit code.
 * A skipped test, a file that didn't load and an error outside a test are failures, and so is
 * a run without tests: nothing that wasn't shown to work passes. `reasons` says what else failed.
 */
export function countTests(report, exitCode) {
  if (!report) return { passed: 0, failed: 1, reasons: ['vitest ended without a report'] };
  const tests = report.testResults.flatMap((file) => file.assertionResults);
  const passed = tests.filter((test) => test.status === 'passed').length;
  const broken = tests.filter((test) => test.status === 'failed').length;
  const skipped = tests.filter((test) => test.status !== 'passed' && test.status !== 'failed');
  const notLoaded = report.testResults.filter(
    (file) => file.status === 'failed' && !file.assertionResults.some(isFailure),
  );
  const reasons = [
    ...skipped.map((test) => `skipped: ${test.fullName}`),
    ...notLoaded.map((file) => `didn't run to its end: ${file.name}`),
  ];
  if (tests.length === 0) reasons.push('no test was run');
  const unexplained = broken + reasons.length === 0 && (exitCode !== 0 || !report.success);
  if (unexplained) reasons.push('an error outside any test');
  return { passed, failed: broken + reasons.length, reasons };
}

const isFailure = (test) => test.status === 'failed';
