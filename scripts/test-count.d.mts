/** The part of vitest's JSON report that is read. */
export interface TestReport {
  success: boolean;
  testResults: {
    name: string;
    status: string;
    assertionResults: { fullName: string; status: string }[];
  }[];
}

export interface TestCount {
  passed: number;
  failed: number;
  reasons: string[];
}

export function countTests(report: TestReport | undefined, exitCode: number): TestCount;
