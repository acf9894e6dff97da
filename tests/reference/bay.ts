import type { Quantity } from '#shared/calc/quantity.ts';
import { createRecorder, type Recorder } from '#shared/calc/recorder.ts';
import { criticalLoad } from '#shared/standards/aisc360-22/app8.ts';
import type { Bay, BayAxial, BayLoad } from '#shared/standards/elastic-theory/bay.ts';
import { endMoments } from '#shared/standards/elastic-theory/end-moments.ts';
import type { DimensionName } from '#shared/units/dimension.ts';

export type Given = (name: string, dimension: DimensionName, value: number) => Quantity;

/** Loads of a bay in N, mm and N/mm. */
export type LoadNumbers =
  | { readonly w: number; readonly from?: number; readonly to?: number }
  | { readonly wa: number; readonly wb: number; readonly from?: number; readonly to?: number }
  | { readonly W: number; readonly at: number };

export interface BayNumbers {
  readonly EI: number;
  readonly L: number;
  /** Compression positive. */
  readonly P: number;
  readonly MA?: number;
  readonly MB?: number;
  readonly loads?: readonly LoadNumbers[];
}

const UNITS: Partial<Record<DimensionName, string>> = {
  force: 'N',
  length: 'mm',
  moment: 'N mm',
  rigidity: 'N mm²',
  lineLoad: 'N/mm',
  rotationalStiffness: 'N mm/rad',
  area: 'mm²',
};

/** A bay of given lines in N and mm, with its axial state; what a test solves. */
export function bayOf(c: BayNumbers): {
  r: Recorder;
  given: Given;
  bay: Bay;
  axial: BayAxial;
  valueAt(key: string): number;
} {
  const r = createRecorder('');
  let count = 0;
  const given: Given = (symbol, dimension, value) => {
    count += 1;
    return r.given(
      `given/${count}`,
      symbol,
      dimension,
      {
        value,
        text: `${value} ${UNITS[dimension] ?? ''}`.trim(),
        source: { kind: 'typed' },
        confirmed: false,
      },
      { title: symbol },
    );
  };
  const L1 = given('L1', 'length', c.L);
  const zero = given('zi', 'length', 0);
  const ends = endMoments(r, 'theory/x', 'x', {
    MA: given('MxA', 'moment', c.MA ?? 0),
    MB: given('MxB', 'moment', c.MB ?? 0),
    sense: 'bending',
  });
  const place = (value: number): Quantity =>
    value === 0 ? zero : value === c.L ? L1 : given('zi', 'length', value);
  const loads = (c.loads ?? []).map((load): BayLoad => {
    if ('W' in load) return { kind: 'point', W: given('W', 'force', load.W), at: place(load.at) };
    const part = { from: place(load.from ?? 0), to: place(load.to ?? c.L) };
    if ('w' in load) return { kind: 'uniform', w: given('w', 'lineLoad', load.w), ...part };
    const { wa, wb } = load;
    return {
      kind: 'linear',
      wa: given('wa', 'lineLoad', wa),
      wb: given('wb', 'lineLoad', wb),
      ...part,
    };
  });
  const EIstar = given('EIstar', 'rigidity', c.EI);
  const axial = {
    alpha: given('alpha', 'none', 1),
    Pr: given('Pr', 'force', c.P),
    EIstar,
    Pe1: criticalLoad(r, 'x', EIstar, L1),
  };
  return {
    r,
    given,
    bay: { axis: 'x', L1, ends, loads },
    axial,
    valueAt: (key) => {
      const line = r.lines.find((l) => l.key === key);
      if (!line || !('value' in line)) throw new Error(`no value at ${key}`);
      return line.value;
    },
  };
}
