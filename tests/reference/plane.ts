import type { GivenValue, Quantity } from '#shared/calc/quantity.ts';
import { createRecorder } from '#shared/calc/recorder.ts';
import { criticalLoad } from '#shared/standards/aisc360-22/app8.ts';
import { endMoments } from '#shared/standards/elastic-theory/end-moments.ts';
import {
  largestMoment,
  secondOrderQuarters,
} from '#shared/standards/elastic-theory/second-order.ts';
import type { DimensionName } from '#shared/units/dimension.ts';

const BASE_UNIT: Partial<Record<DimensionName, string>> = {
  force: 'N',
  length: 'mm',
  moment: 'N mm',
  rigidity: 'N mm²',
};

const given = (value: number, dimension: DimensionName): GivenValue => ({
  value,
  text: `${value} ${BASE_UNIT[dimension] ?? ''}`.trim(),
  source: { kind: 'typed' },
  confirmed: false,
});

export interface PlaneCase {
  readonly EI: number;
  readonly L: number;
  /** Above zero. */
  readonly P: number;
  readonly MA: number;
  readonly MB: number;
  readonly sense?: 'bending' | 'joint';
  readonly alpha?: number;
}

/** One plane of a pinned member through the books' own functions, in N and mm. */
export function solvePlane(c: PlaneCase) {
  const r = createRecorder('');
  const quantity = (name: string, dimension: DimensionName, value: number): Quantity =>
    r.given(`given/${name}`, name, dimension, given(value, dimension), { title: name });
  const alpha = quantity('alpha', 'none', c.alpha ?? 1);
  const Pr = quantity('Pr', 'force', c.P);
  const EIstar = quantity('EIstar', 'rigidity', c.EI);
  const L1 = quantity('L1', 'length', c.L);
  const Pe1 = criticalLoad(r, 'x', EIstar, L1);
  const ends = endMoments(r, 'theory/x', 'x', {
    MA: quantity('MxA', 'moment', c.MA),
    MB: quantity('MxB', 'moment', c.MB),
    sense: c.sense ?? 'bending',
  });
  if (!ends.psi) throw new Error('no moment');
  const { psi, M2, largerEnd } = ends;
  const found = largestMoment(r, 'theory/x', 'x', {
    alpha,
    Pr,
    EIstar,
    L1,
    Pe1,
    M2,
    psi,
    largerEnd,
  });
  const quarters = secondOrderQuarters(r, 'quarters', ends.MA, ends.MB, found.kL);
  const valueAt = (key: string): number => {
    const line = r.lines.find((l) => l.key === key);
    if (!line || !('value' in line)) throw new Error(`no value at ${key}`);
    return line.value;
  };
  return { r, alpha, Pr, Pe1, ends, psi, found, quarters, valueAt };
}
