import fc from 'fast-check';

/** Something wrong with an input. */
export interface Fault {
  readonly text: string;
  readonly input: unknown;
}

export interface Sampling {
  readonly seed: number;
  readonly runs: number;
  /** Values evenly from their ranges, without more of the small and the extreme ones. */
  readonly unbiased?: boolean;
}

/**
 * Fails where some value has faults, with the first fault of the smallest such value found and its
 * INPUT.json. The seed is fixed: every run tries the same values.
 */
export function assertProperty<T>(
  values: fc.Arbitrary<T>,
  { seed, runs, unbiased = false }: Sampling,
  faultsOf: (value: T) => readonly Fault[],
): void {
  const property = fc.property(values, (value) => {
    const [fault] = faultsOf(value);
    if (fault) throw new Error(`${fault.text}\nINPUT.json: ${JSON.stringify(fault.input)}`);
  });
  const found = fc.check(property, { seed, numRuns: runs, unbiased });
  if (!found.failed) return;
  const { errorInstance, counterexamplePath, numShrinks } = found;
  const said = errorInstance instanceof Error ? errorInstance.message : String(errorInstance);
  const where = `seed ${seed}, path ${counterexamplePath}, ${numShrinks} shrinks`;
  throw new Error(`${said}\n(${where}, value ${JSON.stringify(found.counterexample?.[0])})`, {
    cause: errorInstance,
  });
}
