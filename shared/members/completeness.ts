import type { Line, LineOf } from '../calc/line.ts';
import type { CombinationRecord, CoverageRow } from '../calc/record.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { printNumber } from '../units/format.ts';
import type { CombinationRun } from './combination.ts';

type Cell = CoverageRow['cells'][number];
type Told = Pick<Cell, 'state' | 'because'> & {
  address?: string | null;
  check?: LineOf<'check'> | undefined;
};

interface Context {
  readonly run: CombinationRun;
  readonly record: CombinationRecord;
  readonly lines: readonly Line[];
  readonly memberLines: readonly Line[];
}

const na = (because: string): Told => ({ state: 'not applicable', because });
const notReached = (because: string): Told => ({ state: 'not reached', because });

/** Limit states that stand in every table, whether or not they apply. */
interface LimitState {
  readonly id: string;
  readonly title: string;
  readonly clause: readonly [clause: string, equation?: string];
  readonly tell: (c: Context) => Told;
}

const find = (c: Context, key: string): { line: Line; address: string } | null => {
  const own = c.lines.find((l) => l.key === key);
  if (own) return { line: own, address: `${c.record.id}:${key}` };
  const line = c.memberLines.find((l) => l.key === key);
  return line ? { line, address: key } : null;
};

/** Whether a candidate is what a governing line took. */
const governedBy = (c: Context, governing: string, candidate: string): boolean => {
  const found = find(c, governing);
  return found?.line.kind === 'governing' && found.line.governs.replace(/^:/, '') === candidate;
};

const strength = (c: Context, key: string, governing: string, words: string): Told => {
  const found = find(c, key);
  if (!found) return na(words);
  return governedBy(c, governing, key)
    ? { state: 'governs', because: 'gives the strength', address: found.address }
    : {
        state: 'does not govern',
        because: 'another limit state gives less',
        address: found.address,
      };
};

const checked = (c: Context, key: string, words: string): Told => {
  const check = c.lines.find((l): l is LineOf<'check'> => l.kind === 'check' && l.key === key);
  if (!check) return na(words);
  const address = `${c.record.id}:${key}`;
  return c.record.summary.governing?.address === address
    ? { state: 'governs', because: 'largest utilisation', address, check }
    : { state: 'does not govern', because: 'a smaller utilisation', address, check };
};

const outside = (because: string): Told => ({ state: 'outside scope', because });

const COMPRESSION = 'no compression in this combination';
const flexural = (axis: 'x' | 'y', word: string): LimitState => ({
  id: `compression/flexural-${axis}`,
  title: `Flexural buckling about the ${word} axis`,
  clause: ['E3', 'E3-4'],
  tell: (c) =>
    c.run.compressed ? strength(c, `E3/${axis}/Fe`, 'E3/Fe', 'not reached') : na(COMPRESSION),
});

const secondOrder = (axis: 'x' | 'y', word: string): LimitState => ({
  id: `second-order/${axis}`,
  title: `Second-order moment, ${word} axis`,
  clause: ['App. 8.1.2', 'A-8-3'],
  tell: (c) => {
    const plane = c.run.planes[axis];
    if (!plane || plane.state === 'none') return na(`no moment about the ${word} axis`);
    if (plane.state === 'failed')
      return {
        state: 'governs',
        because: 'no finite second-order moment exists',
        address: find(c, `App8/${axis}/unstable`)?.address ?? find(c, 'C2/squash')?.address ?? null,
      };
    if (plane.state === 'outside scope')
      return {
        state: 'outside scope',
        because: 'see the notice on the sheet',
        address: find(c, `theory/${axis}/outside`)?.address ?? null,
      };
    const at =
      find(c, `theory/${axis}/Mr`) ?? find(c, `App8/${axis}/Mr`) ?? find(c, `theory/${axis}/Mmax`);
    if (!c.run.compressed) return na('no axial force: first-order moments');
    return {
      state: 'does not govern',
      because: 'enters the interaction',
      address: at?.address ?? null,
    };
  },
});

const LIMIT_STATES: readonly LimitState[] = [
  flexural('x', 'major'),
  flexural('y', 'minor'),
  {
    id: 'compression/torsional',
    title: 'Torsional buckling',
    clause: ['E4', 'E4-2'],
    tell: (c) =>
      c.run.compressed
        ? strength(
            c,
            'E4/Fe',
            'E3/Fe',
            'the torsional buckling length does not exceed the lateral one',
          )
        : na(COMPRESSION),
  },
  {
    id: 'compression/slender',
    title: 'Local buckling in compression',
    clause: ['E7', 'E7-1'],
    tell: (c) => {
      if (!c.run.compressed) return na(COMPRESSION);
      const found = find(c, 'E7/Pn');
      return found
        ? { state: 'governs', because: 'an element is slender', address: found.address }
        : na('no element is slender');
    },
  },
  {
    id: 'compression/check',
    title: 'Compression alone',
    clause: ['E1'],
    tell: (c) => (c.run.compressed ? checked(c, 'H1/axial', 'not reached') : na(COMPRESSION)),
  },
  secondOrder('x', 'major'),
  secondOrder('y', 'minor'),
  {
    id: 'flexure-major/yielding',
    title: 'Yielding, major axis',
    clause: ['F2.1', 'F2-1'],
    tell: (c) =>
      bent(c, 'x')
        ? strength(c, 'F2/Mp', 'F2/Mn', 'the web is not compact')
        : na('no moment about the major axis'),
  },
  {
    id: 'flexure-major/ltb',
    title: 'Lateral-torsional buckling',
    clause: ['F2.2', 'F2-2'],
    tell: (c) =>
      bent(c, 'x')
        ? strength(c, 'F2/LTB/Mn', 'F2/Mn', 'the unbraced length does not exceed Lp')
        : na('no moment about the major axis'),
  },
  {
    id: 'flexure-major/flb',
    title: 'Flange local buckling, major axis',
    clause: ['F3.2', 'F3-1'],
    tell: (c) =>
      bent(c, 'x')
        ? strength(c, 'F3/FLB/Mn', 'F2/Mn', 'the flange is compact')
        : na('no moment about the major axis'),
  },
  {
    id: 'flexure-major/check',
    title: 'Major-axis flexure alone',
    clause: ['F1'],
    tell: (c) => checked(c, 'H1/x', 'no moment about the major axis'),
  },
  {
    id: 'flexure-minor/yielding',
    title: 'Yielding, minor axis',
    clause: ['F6.1', 'F6-1'],
    tell: (c) => {
      if (!bent(c, 'y')) return na('no moment about the minor axis');
      const found = find(c, 'F6/Mp');
      if (!found) return notReached('see the notice on the sheet');
      const local = find(c, 'F6/FLB/Mn') && governedBy(c, 'F6/Mn', 'F6/FLB/Mn');
      return {
        state: local ? 'does not govern' : 'governs',
        because: local ? 'another limit state gives less' : 'gives the strength',
        address: found.address,
      };
    },
  },
  {
    id: 'flexure-minor/flb',
    title: 'Flange local buckling, minor axis',
    clause: ['F6.2', 'F6-2'],
    tell: (c) =>
      bent(c, 'y')
        ? strength(c, 'F6/FLB/Mn', 'F6/Mn', 'the flange is compact')
        : na('no moment about the minor axis'),
  },
  {
    id: 'flexure-minor/check',
    title: 'Minor-axis flexure alone',
    clause: ['F1'],
    tell: (c) => checked(c, 'H1/y', 'no moment about the minor axis'),
  },
  {
    id: 'interaction',
    title: 'Flexure and compression',
    clause: ['H1.1', 'H1-1a'],
    tell: (c) => checked(c, 'H1/check', 'only one of axial force and moments is present'),
  },
  {
    id: 'tension',
    title: 'Tension, alone and with flexure',
    clause: ['H1.2'],
    tell: (c) =>
      c.run.tension
        ? { ...outside('the member is in tension'), address: `${c.record.id}:D2/outside` }
        : na('no tension in this combination'),
  },
  {
    id: 'shear',
    title: 'Shear',
    clause: ['G2'],
    tell: () => outside('shear forces are not given'),
  },
  {
    id: 'torsion',
    title: 'Torsion',
    clause: ['H3'],
    tell: () => outside('loads are taken through the shear centre'),
  },
  {
    id: 'concentrated',
    title: 'Concentrated forces on webs and flanges',
    clause: ['J10'],
    tell: () => outside('belongs to the connections'),
  },
  {
    id: 'holes',
    title: 'Holes in the tension flange',
    clause: ['F13.1'],
    tell: () => outside('no holes are given'),
  },
  {
    id: 'bracing',
    title: 'Strength and stiffness of the assumed braces',
    clause: ['App. 6'],
    tell: () => outside('braces are taken as given'),
  },
  {
    id: 'deflection',
    title: 'Deflection and drift',
    clause: ['L2'],
    tell: () => outside('serviceability is not covered'),
  },
];

const bent = (c: Context, axis: 'x' | 'y'): boolean => {
  const plane = c.run.planes[axis];
  return plane !== null && plane.state !== 'none';
};

/** Nothing silently skipped: every limit state under every combination, with its state and reason. */
export function completenessOf(
  runs: ReadonlyMap<string, CombinationRun>,
  combinations: readonly CombinationRecord[],
  memberLines: readonly Line[],
): CoverageRow[] {
  const halted = memberLines.find(
    (l) => l.kind === 'notice' && (l.key === 'B4/outside' || l.key === 'C2/outside'),
  );
  return LIMIT_STATES.map((state) => ({
    id: state.id,
    title: state.title,
    clause: clause(state.clause[0], state.clause[1] ?? null),
    cells: combinations.map((record): Cell => {
      const run = runs.get(record.id);
      const context = run && { run, record, lines: record.lines, memberLines };
      const stop = record.lines.find((l) => l.key === 'D2/outside');
      const told: Told =
        halted &&
        !['shear', 'torsion', 'concentrated', 'holes', 'bracing', 'deflection'].includes(state.id)
          ? { state: 'outside scope', because: halted.title, address: halted.key }
          : stop &&
              ![
                'tension',
                'shear',
                'torsion',
                'concentrated',
                'holes',
                'bracing',
                'deflection',
              ].includes(state.id)
            ? {
                state: 'outside scope',
                because: 'the member is in tension',
                address: `${record.id}:${stop.key}`,
              }
            : context
              ? state.tell(context)
              : notReached('no run');
      return {
        combination: record.id,
        state: told.state,
        because: told.because,
        address: told.address ?? null,
        ratio: told.check?.ratio ?? null,
        ratioText: told.check
          ? printNumber(told.check.ratio, told.check.print.working ?? { dec: 3 }).text
          : null,
      };
    }),
  }));
}
