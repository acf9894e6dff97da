import { evaluate } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { closeLines } from '#shared/calc/closure.ts';
import { closureProblems } from '#shared/calc/closure-problems.ts';
import type { Line } from '#shared/calc/line.ts';
import type { Quantity } from '#shared/calc/quantity.ts';
import { createRecorder, type Recorder } from '#shared/calc/recorder.ts';
import { alignmentK, bucklingLength } from '#shared/standards/aisc360-22/alignment-chart.ts';
import { firstOrderBeamLimit, firstOrderLateralLoad } from '#shared/standards/aisc360-22/app7.ts';
import {
  amplifiedMoment,
  criticalLoad,
  criticalLoadShare,
  isStable,
} from '#shared/standards/aisc360-22/app8.ts';
import {
  CmTransverse,
  multiplierB1,
  TRANSVERSE_ROWS,
  type TransverseRow,
} from '#shared/standards/aisc360-22/app8-b1.ts';
import {
  app8B2Formulas,
  multiplierB2,
  requiredAxial,
  requiredMoment,
} from '#shared/standards/aisc360-22/app8-b2.ts';
import {
  c2Formulas,
  notionalLoad,
  type StabilityMethod,
  secondOrderRatio,
} from '#shared/standards/aisc360-22/c2.ts';
import {
  barStiffness,
  jointRatio,
  practicalRatio,
} from '#shared/standards/aisc360-22/joint-ratio.ts';
import { storyStiffnessK } from '#shared/standards/aisc360-22/story-stiffness.ts';
import type { DimensionName } from '#shared/units/dimension.ts';
import { UNIT_SETS, type UnitSet } from '#shared/units/unit-set.ts';
import { inUnit, UNIT_SIZES } from './in-unit.ts';
import { roundsTo } from './printed-digits.ts';
import { readPublished } from './published-cases.ts';

interface Expected {
  readonly what: string;
  readonly line: string;
  readonly unit: string;
  /** null: the source prints no such number; by hand from its inputs. */
  readonly printed: string | null;
  readonly fromInputs: number;
  readonly working: string;
  readonly explained?: { readonly by: string; readonly expression: string };
}
interface Case {
  readonly example: string;
  readonly name: string;
  readonly run: keyof typeof RUNS;
  readonly inputs: Readonly<Record<string, string>>;
  readonly method?: StabilityMethod;
  /** Whether the method may be used; true unless said. */
  readonly allowed?: boolean;
  readonly expected: readonly Expected[];
}

const DIMENSION_OF: Readonly<Record<string, DimensionName>> = {
  kip: 'force',
  'kip ft': 'moment',
  ksi: 'stress',
  'in⁴': 'inertia',
  ft: 'length',
  in: 'deflection',
  '': 'none',
};

/** A given line from text like `178 kip`, read without the program's own reading of units. */
function given(r: Recorder, symbol: string, text: string): Quantity {
  const [number, ...rest] = text.split(' ');
  const unit = rest.join(' ');
  const [dimension, size] = [DIMENSION_OF[unit], UNIT_SIZES[unit]];
  if (dimension === undefined || size === undefined) throw new Error(`no unit ${unit}`);
  return r.given(
    `given/${symbol}`,
    symbol,
    dimension,
    { value: Number(number) * size, text, source: { kind: 'typed' }, confirmed: false },
    { title: symbol },
  );
}

type Read = (name: string) => Quantity;

/** The functions of the book in the order of each example; false where the method may not be used. */
const RUNS = {
  story(r: Recorder, q: Read, c: Case): boolean {
    const B2 = multiplierB2(r, 'App8/x', {
      alpha: q('alpha'),
      Pstory: q('Pstory'),
      strength: {
        RM: 'Pmf' in c.inputs ? { Pmf: q('Pmf') } : 'braced',
        H: q('Hstory'),
        L: q('Lstory'),
        DeltaH: q('DeltaH'),
      },
      method: c.method as StabilityMethod,
    });
    if (typeof B2 === 'string') return false;
    if ('Pnt' in c.inputs) requiredAxial(r, q('Pnt'), q('Plt'), B2);
    return true;
  },
  amplified(r: Recorder, q: Read): boolean {
    requiredAxial(r, q('Pnt'), q('Plt'), q('B2'));
    requiredMoment(r, 'x', q('B1'), q('Mnt'), q('B2'), q('Mlt'));
    return true;
  },
  notional(r: Recorder, q: Read): boolean {
    notionalLoad(r, q('alpha'), q('Yi'));
    return true;
  },
  'story-K'(r: Recorder, q: Read): boolean {
    const Pstory = q('Pstory');
    storyStiffnessK(r, 'K/x', {
      ...{ E: q('E'), I: q('I'), L: q('L'), Pr: q('Pr'), Pstory },
      RM: r.formula(app8B2Formulas.RM, 'App8/x/RM', { Pmf: q('Pmf'), Pstory }),
      ...{ H: q('Hstory'), Hcol: q('Hcol'), DeltaH: q('DeltaH') },
    });
    return true;
  },
  lateral(r: Recorder, q: Read): boolean {
    const [alpha, Delta, L, Yi] = [q('alpha'), q('Delta'), q('Lstory'), q('Yi')];
    firstOrderLateralLoad(r, { alpha, Delta, L, Yi });
    return true;
  },
  beam: (r: Recorder, q: Read): boolean =>
    firstOrderBeamLimit(r, q('alpha'), q('Pr'), { E: q('E'), I: q('I'), L: q('L') }),
  chart(r: Recorder, q: Read, { inputs }: Case): boolean {
    const E = q('Eg');
    const column = { E, I: q('Ic'), L: q('Lc') };
    const taub = q('taub');
    const joint = (end: 'A' | 'B'): Quantity => {
      const girder = { E, I: q(`Ig${end}`), L: q('LgA') };
      const bars = (name: string, count: number, bar: typeof column): Quantity[] =>
        Array.from({ length: count }, (_, i) => barStiffness(r, `K/x/${end}/${name}/${i}`, bar));
      const columns = bars('column', Number(inputs[`columns${end}`]), column);
      return jointRatio(r, 'K/x', end, taub, columns, bars('girder', 2, girder));
    };
    const base = inputs.base as 'fixed' | 'pinned' | undefined;
    const GA = joint('A');
    const GB = base ? practicalRatio(r, 'K/x', 'B', base) : joint('B');
    const K = alignmentK(r, 'K/x', 'uninhibited', GA, GB);
    if (K) bucklingLength(r, 'K/x', K, column.L);
    return true;
  },
  B1(r: Recorder, q: Read): boolean {
    const [alpha, Pr] = [q('alpha'), q('Pr')];
    const EIstar = r.formula(c2Formulas.nominalRigidity, 'C2/x/EI', { E: q('E'), I: q('I') });
    const Pe1 = criticalLoad(r, 'x', EIstar, q('L1'));
    const share = criticalLoadShare(r, 'x', alpha, Pr, Pe1);
    if (!isStable(r, 'x', share)) return false;
    const Cm = CmTransverse(r, 'App8/x', null, share);
    amplifiedMoment(r, 'x', multiplierB1(r, 'App8/x', { alpha, Pr, Pe1, Cm }), q('Mnt'));
    return true;
  },
};

function run(c: Case): { r: Recorder; allowed: boolean } {
  const r = createRecorder('');
  const made = new Map<string, Quantity>();
  const read: Read = (name) => {
    const text = c.inputs[name];
    if (text === undefined) throw new Error(`${c.example}: no input ${name}`);
    const quantity = made.get(name) ?? given(r, name, text);
    made.set(name, quantity);
    return quantity;
  };
  return { r, allowed: RUNS[c.run](r, read, c) };
}

/** What does not follow from what is printed, in a unit set. */
function notClosed(r: Recorder, set: UnitSet): unknown[] {
  const place = (line: Line) => ({ address: line.key, combination: null, line });
  return closureProblems(closeLines(r.lines.map(place), set).map(place), set);
}

const valueAt = (r: Recorder, key: string): number => {
  const line = r.lines.find((l) => l.key === key);
  if (!line || !('value' in line)) throw new Error(`no value at ${key}`);
  return line.value;
};

const { cases } = readPublished('stability.json') as { cases: readonly Case[] };

describe('Design Examples v16.0: stability', () => {
  it('has the cases', () => expect(cases).toHaveLength(26));
  for (const c of cases)
    describe(`${c.example}: ${c.name}`, () => {
      const { r, allowed } = run(c);
      for (const e of c.expected)
        it(`${e.what} = ${e.printed ?? e.fromInputs} ${e.unit}`, () => {
          const value = inUnit(valueAt(r, e.line), e.unit);
          expect(Math.abs(value - e.fromInputs)).toBeLessThanOrEqual(1e-9 * Math.abs(e.fromInputs));
          if (e.printed === null) return;
          const source = e.explained ? Number(evaluate(e.explained.expression)) : value;
          expect(roundsTo(source, e.printed), `${source}`).toBe(true);
        });
      it(c.allowed === false ? 'the method may not be used' : 'the method may be used', () => {
        expect(allowed).toBe(c.allowed ?? true);
        const outside = r.lines.some((l) => l.kind === 'notice' && l.severity === 'outside scope');
        expect(outside).toBe(c.allowed === false);
      });
      for (const set of Object.values(UNIT_SETS))
        it(`closes as printed, ${set.name}`, () => expect(notClosed(r, set)).toEqual([]));
    });
});

// C.1A: 0.290/0.181 and 0.321/0.193, C.1B: 0.204/0.145 and 0.223/0.155, as printed.
describe('Design Examples v16.0, C.1A and C.1B: drift ratios', () => {
  for (const [ratio, method] of [
    ['1.60', 'direct'],
    ['1.66', 'direct'],
    ['1.41', 'effective-length'],
    ['1.44', 'effective-length'],
  ] as const)
    it(`${ratio}: the ${method} method may be used without a remark`, () => {
      const r = createRecorder('');
      expect(secondOrderRatio(r, method, given(r, 'ratio', ratio))).toBe(true);
      expect(r.lines.some((l) => l.kind === 'notice')).toBe(false);
    });
});

interface Theory {
  readonly effectiveLength: {
    readonly cases: readonly {
      readonly id: string;
      readonly kind: 'inhibited' | 'uninhibited';
      readonly GA: number;
      readonly GB: number | 'pinned';
      readonly K: number;
    }[];
  };
  readonly transverse: {
    readonly cases: readonly {
      readonly case: string;
      readonly psi: number;
      readonly exact: Readonly<Record<'0.2' | '0.5' | '0.8', number>>;
    }[];
  };
}
const theory = readPublished('stability-theory.json') as Theory;

describe('effective length factors without the equations of the charts', () => {
  it('has the cases', () => expect(theory.effectiveLength.cases).toHaveLength(22));
  for (const { id, kind, GA, GB, K } of theory.effectiveLength.cases)
    it(`${id}: K = ${K}`, () => {
      const ends = (a: number | 'pinned', b: number | 'pinned') => {
        const r = createRecorder('');
        const end = (symbol: string, G: number | 'pinned') =>
          G === 'pinned' ? G : given(r, symbol, String(G));
        const found = alignmentK(r, 'K/x', kind, end('GA', a), end('GB', b));
        expect(Object.values(UNIT_SETS).flatMap((set) => notClosed(r, set))).toEqual([]);
        return found?.value ?? Number.NaN;
      };
      expect(Math.abs(ends(GA, GB) / K - 1)).toBeLessThan(1e-9);
      expect(Math.abs(ends(GB, GA) / K - 1)).toBeLessThan(1e-9);
    });
});

describe('Commentary Table C-A-8.1 beside the exact factors', () => {
  const rows: Readonly<Record<string, TransverseRow>> = {
    'fixed-pinned, uniform': 'fixed-pinned-uniform',
    'fixed-fixed, uniform': 'fixed-uniform',
    'fixed-fixed, midspan point': 'fixed-central',
  };
  for (const c of theory.transverse.cases)
    for (const rho of ['0.2', '0.5', '0.8'] as const)
      it(`${c.case}, P/Pe1 = ${rho}: 1 − ${-c.psi}·${rho}, at most 3.5 % below`, () => {
        const r = createRecorder('');
        const row = rows[c.case] as TransverseRow;
        const Cm = CmTransverse(r, 'App8/x', row, given(r, 'rho', rho)).value;
        expect(Cm).toBeCloseTo(1 + c.psi * Number(rho), 14);
        expect(Cm / c.exact[rho]).toBeLessThanOrEqual(1);
        expect(Cm / c.exact[rho]).toBeGreaterThan(0.965);
      });
  // The other three rows of the table as reproduced there: Cm = 1, 1 − 0.3 αPr/Pe1, 1 − 0.2 αPr/Pe1.
  for (const [row, Cm] of [
    ['simple-uniform', 1],
    ['fixed-pinned-central', 0.85],
    ['simple-central', 0.9],
  ] as const)
    it(`${TRANSVERSE_ROWS[row].words}: Cm = ${Cm} at half the critical load`, () => {
      const r = createRecorder('');
      expect(CmTransverse(r, 'App8/x', row, given(r, 'rho', '0.5')).value).toBeCloseTo(Cm, 14);
    });
});
