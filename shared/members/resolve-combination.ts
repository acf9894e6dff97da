import type { GivenValue } from '../calc/quantity.ts';
import { normalDesignation } from '../sections/table.ts';
import { forceProblems } from './force-level.ts';
import { type ReadQuantity, TYPED } from './given-values.ts';
import type { CalculationInput, CombinationInput } from './input.ts';
import { resolveLoads, resolveSupports } from './resolve-loads.ts';
import { resolveSway } from './resolve-sway.ts';
import type { ResolvedCombination, ResolvedRestraint } from './resolved.ts';

export interface CombinationContext {
  readonly input: CalculationInput;
  /** The member's section as typed. */
  readonly section: string;
  readonly problem: (path: string, message: string) => void;
  readonly quantity: ReadQuantity;
  readonly length: GivenValue;
  readonly restraints: readonly ResolvedRestraint[] | null;
}

/** One force set. Forces belong to the section they were analysed with. */
export function resolveCombination(
  c: CombinationInput,
  index: number,
  context: CombinationContext,
): ResolvedCombination {
  const { input, section, problem, quantity } = context;
  const path = `combinations[${index}]`;
  for (const { field, message } of forceProblems(c, input.design))
    problem(`${path}.${field}`, message);
  const elsewhere =
    c.analysedWith !== undefined &&
    normalDesignation(c.analysedWith) !== normalDesignation(section);
  const asAnalysed = <T extends GivenValue | null>(given: T): T =>
    given && elsewhere ? { ...given, confirmed: false } : given;
  const read: typeof quantity = (at, given, dimension) =>
    asAnalysed(quantity(at, given, dimension));
  const places = { ...context, path, read };
  const moment = (field: 'MxA' | 'MxB' | 'MyA' | 'MyB' | 'MxMax' | 'MyMax') =>
    read(`${path}.${field}`, c[field], 'moment');
  const none: GivenValue = { value: 0, text: '0', source: TYPED, confirmed: false };
  const P = asAnalysed(quantity(`${path}.P`, c.P, 'force') ?? none);
  // A moment left out is zero, with the source and state of the force set.
  const zero = { ...P, value: 0, text: input.units === 'us' ? '0 kip ft' : '0 kN m' };
  return {
    id: c.id ?? `c${index + 1}`,
    name: c.name,
    analysedWith: elsewhere && c.analysedWith ? normalDesignation(c.analysedWith) : null,
    P,
    moments: {
      x: { A: moment('MxA') ?? zero, B: moment('MxB') ?? zero, max: moment('MxMax') },
      y: { A: moment('MyA') ?? zero, B: moment('MyB') ?? zero, max: moment('MyMax') },
    },
    supports: resolveSupports(c.supports, places),
    loads: resolveLoads(c.loads, places),
    shears: {
      x: read(`${path}.Vx`, c.Vx, 'force'),
      y: read(`${path}.Vy`, c.Vy, 'force'),
    },
    sway: resolveSway(c.sway, path, problem, read),
  };
}
