import {
  ASYMMETRIC_MATCHERS_OBJECT,
  chai,
  GLOBAL_EXPECT,
  JestAsymmetricMatchers,
  JestChaiExpect,
  JestExtend,
  setState,
} from '@vitest/expect';

/*
 * What tests import as `vitest` in a mutation run: nothing is run when it is declared. A test or a
 * group at the top of a file becomes a unit, run as often as wanted in this process.
 */
export interface Unit {
  readonly file: string;
  readonly name: string;
  /** Answers the tests of the group; computing in the group's body happens each time. */
  readonly open: () => Test[];
}
export interface Test {
  readonly name: string;
  readonly run: () => unknown;
}

chai.use(JestExtend);
chai.use(JestChaiExpect);
chai.use(JestAsymmetricMatchers);
export const expect = Object.assign(
  (value: unknown, message?: string) => chai.expect(value, message),
  chai.expect,
  (globalThis as Record<symbol, object>)[ASYMMETRIC_MATCHERS_OBJECT],
);
Object.defineProperty(globalThis, GLOBAL_EXPECT, { value: expect, configurable: true });
setState({ assertionCalls: 0, isExpectingAssertions: false } as never, expect as never);

/** The file being read, its units, and the group that is open. */
export const reading: { file: string; units: Unit[]; tests: Test[] | null; prefix: string } = {
  ...{ file: '', units: [], tests: null, prefix: '' },
};

type Body = (...given: never[]) => unknown;

function declareTest(name: string, body: () => unknown): void {
  const { file, tests, prefix } = reading;
  const test = { name: `${prefix}${name}`, run: body };
  if (tests) tests.push(test);
  else reading.units.push({ file, name, open: () => [test] });
}

function declareGroup(name: string, body: () => unknown): void {
  const { file, tests, prefix } = reading;
  const fill = (into: Test[], before: string) => {
    const kept = { tests: reading.tests, prefix: reading.prefix };
    Object.assign(reading, { tests: into, prefix: before });
    try {
      body();
    } finally {
      Object.assign(reading, kept);
    }
  };
  if (tests) {
    fill(tests, `${prefix}${name} / `);
    return;
  }
  reading.units.push({
    file,
    name,
    open: () => {
      const own: Test[] = [];
      fill(own, '');
      return own;
    },
  });
}

const each =
  (declare: (name: string, body: () => unknown) => void) =>
  (rows: readonly unknown[]) =>
  (name: string, body: Body): void => {
    rows.forEach((row, i) => {
      const given = (Array.isArray(row) ? row : [row]) as never[];
      declare(`${name} [${i}]`, () => body(...given));
    });
  };

/** As vitest's, with a time limit or options in either place left out. */
const declarer = (declare: typeof declareTest) =>
  Object.assign(
    (name: string, ...rest: readonly unknown[]) =>
      declare(name, rest.find((r) => typeof r === 'function') as () => unknown),
    { each: each(declare) },
  );

export const it = declarer(declareTest);
export const test = it;
export const describe = declarer(declareGroup);
