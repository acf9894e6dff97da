import { isValued, type LineOf } from '../calc/line.ts';
import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { f1Formulas } from '../standards/aisc360-22/f1.ts';
import {
  type Axial,
  type Flexure,
  interaction,
  interactionChecks,
  separateChecks,
} from '../standards/aisc360-22/h1.ts';
import { increasedCb } from '../standards/aisc360-22/h1-tension.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type { Axis } from './bay-moments.ts';
import { destabilisingLoad } from './load-height.ts';
import { type Side, segmentStrength } from './major-strengths.ts';
import type { MemberStrengths } from './member-strengths.ts';
import { automaticCb } from './modification-factor.ts';
import { optionalChecks } from './optional-checks.ts';
import type { PlaneMoments } from './plane-moments.ts';
import type { ResolvedCombination } from './resolved.ts';
import { segmentCb } from './segment-cb.ts';
import {
  largestIn,
  largestOn,
  type Segment,
  type SegmentContext,
  sidesIn,
  unbracedLength,
} from './segments.ts';

/** The axial force of a combination as the checks use it. */
export interface AxialCase {
  readonly axial: Axial | null;
  readonly clause: 'H1.1' | 'H1.2';
  /** Compressed, but without a compressive strength. */
  readonly unknown: boolean;
  readonly compressed: boolean;
}

type Planes = Readonly<Record<Axis, PlaneMoments>>;
type Context = MemberStrengths & SegmentContext;

/** The checks of every segment, and which of them governs. */
export function checkSegments(
  r: Recorder,
  m: Context,
  c: ResolvedCombination,
  axial: AxialCase,
  planes: Planes,
  segments: readonly Segment[],
): LineOf<'check'>[] {
  const found = segments.map((segment) => checkSegment(m, c, axial, planes, segment));
  if (segments.length > 1) governingSegment(r, segments);
  const sheared = [c.shears.x, c.shears.y].some((shear) => (shear?.value ?? 0) !== 0);
  if (!axial.axial && !axial.unknown && !sheared && segments.every((s) => !s.r.lines.some(isCheck)))
    if (planes.x.state === 'none' && planes.y.state === 'none')
      r.notice(
        'H1/nothing',
        'note',
        'no-forces',
        'This combination has neither axial force nor moment; there is nothing to check.',
        { title: 'No forces', clause: clause('H1') },
      );
  return found.flat();
}

const isCheck = (line: { kind: string }): boolean => line.kind === 'check';

function checkSegment(
  m: Context,
  c: ResolvedCombination,
  { axial, clause: number, unknown, compressed }: AxialCase,
  { x, y }: Planes,
  segment: Segment,
): LineOf<'check'>[] {
  const { r } = segment;
  const Lb = unbracedLength(segment, m, x);
  const exactMoments = m.input.analysis.secondOrder === 'exact';
  const Mx = largestIn(segment, m, x, exactMoments);
  const My = largestIn(segment, m, y, exactMoments);
  const capacity =
    Mx && Mx.value > 0 && Lb
      ? majorCapacity(m, c, segment, Lb, x, { axial, clause: number, compressed })
      : NO_CAPACITY;
  const { Mcx } = capacity;
  const major: Flexure | null = Mx && Mx.value > 0 && Mcx ? { Mr: Mx, Mc: Mcx } : null;
  const minor: Flexure | null = My && My.value > 0 && m.Mcy ? { Mr: My, Mc: m.Mcy } : null;
  const lacking = lackingStrengths(r, { unknown, Mx, My, Mcx, Mcy: m.Mcy });
  const incomplete = [x, y].some((p) => p.state === 'failed' || p.state === 'outside scope');
  if (incomplete || lacking) {
    // Without the interaction a strength that is exceeded by itself still says NOT OK.
    if (axial || major || minor) r.section('H1', 'Checks', clause(number));
    return separateChecks(r, axial, major, minor, number);
  }
  if (!axial && !major && !minor) return [];
  r.section('H1', 'Checks', clause(number));
  const checks =
    optionalChecks(m, segment, { axial, compressed, major, minor, Lb, ...capacity }) ??
    interactionChecks(r, axial, major, minor, number);
  if (compressed && axial) besideExact(m, segment, axial, { x, y }, { major, minor });
  return checks;
}

/** A strength that a moment needs and the member has not: said with the combination too. */
function lackingStrengths(
  r: Recorder,
  q: {
    readonly unknown: boolean;
    readonly Mx: Quantity | null;
    readonly My: Quantity | null;
    readonly Mcx: Quantity | null;
    readonly Mcy: Quantity | null;
  },
): boolean {
  const say = (key: string, title: string, number: string): true => {
    r.notice(
      key,
      'outside scope',
      'no-strength',
      `${title}: the reason stands with the strength.`,
      {
        title,
        clause: clause(number),
      },
    );
    return true;
  };
  const lacking = [
    q.unknown && say('H1/axial/lacking', 'Compressive strength outside the scope', 'E1'),
    (q.Mx?.value ?? 0) > 0 &&
      !q.Mcx &&
      say('H1/x/lacking', 'Major-axis flexural strength outside the scope', 'F1'),
    (q.My?.value ?? 0) > 0 &&
      !q.Mcy &&
      say('H1/y/lacking', 'Minor-axis flexural strength outside the scope', 'F1'),
  ];
  return lacking.includes(true);
}

interface Capacity {
  readonly Mcx: Quantity | null;
  /** Modification factor, where the strength needed one. */
  readonly Cb: Quantity | null;
  readonly sides: readonly Side[];
}
const NO_CAPACITY: Capacity = { Mcx: null, Cb: null, sides: [] };

/** Major-axis strength of a segment; Cb from the diagram only where it is needed. */
function majorCapacity(
  m: Context,
  c: ResolvedCombination,
  segment: Segment,
  Lb: Quantity,
  x: PlaneMoments,
  { axial, clause: number, compressed }: Omit<AxialCase, 'unknown'>,
): Capacity {
  const { major, input } = m;
  const { r } = segment;
  if (!major) return NO_CAPACITY;
  if (major.fixed) return { Mcx: major.fixed, Cb: m.Cb, sides: ['top'] };
  const factorOf = (): Quantity | null => {
    if (destabilisingLoad(r, m.member, c, segment)) return null;
    const Cb = m.Cb ?? modification(m, segment, x, Lb, compressed);
    if (number !== 'H1.2' || !axial || !m.alpha || !input.provisions.has('H1.2-Cb')) return Cb;
    return increasedCb(r, {
      ...{ Cb, alpha: m.alpha, Pr: axial.Pr, E: m.steel.E, Iy: m.section.Iy, Lb },
      symmetry: ['channel', 'mono-i'].includes(m.section.kind)
        ? 'a singly symmetric section'
        : 'a doubly symmetric section',
    });
  };
  let Cb: Quantity | null = null;
  const factor = () => {
    Cb = factorOf();
    return Cb;
  };
  const sides = sidesIn(segment, m, x, major.sided);
  const Mcx = segmentStrength(r, input.design, major, sides, Lb, factor);
  return { Mcx, Cb, sides };
}

function modification(
  m: Context,
  segment: Segment,
  x: PlaneMoments,
  Lb: Quantity,
  compressed: boolean,
): Quantity {
  const { input, member, q } = m;
  const { r } = segment;
  const [bay] = x.bays;
  const plain = x.bays.length === 1 && bay && bay.loads.length === 0 && !bay.swayed;
  if (member.restraints === null && plain)
    return automaticCb(r, input, { bay, givenMax: x.givenMax }, { L: q.L, Lb, compressed });
  if (member.restraints === null && Lb.value !== q.L.value) {
    r.section('F1', 'Lateral-torsional buckling modification factor', clause('F1'));
    r.notice(
      'F1/taken',
      'note',
      'segment-not-member',
      'The unbraced length is not the length of the member and the places of the braces are not given: the moments of the segment are not known. Cb is taken as 1, which is on the safe side.',
      { title: 'Modification factor', clause: clause('F1') },
    );
    return r.formula(f1Formulas.CbOne, 'F1/Cb', {});
  }
  return segmentCb(segment, input, m, x, Lb, compressed);
}

/** Where the code's moment is much lower than the exact one, the interaction with that beside it. */
function besideExact(
  m: Context,
  segment: Segment,
  axial: Axial,
  planes: Planes,
  used: { readonly major: Flexure | null; readonly minor: Flexure | null },
): void {
  const { r } = segment;
  const lower = [...planes.x.bays, ...planes.y.bays].some((bay) => bay.codeLower);
  if (!lower) return;
  const exact = (plane: PlaneMoments, flexure: Flexure | null): Flexure | null => {
    if (!flexure || !plane.bays.every((bay) => bay.exact || bay.state !== 'done')) return flexure;
    const Mr = largestOn(
      segment,
      m,
      plane,
      (bay) => bay.exact ?? bay.first(),
      `theory/H1/M${plane.axis}`,
    );
    return Mr ? { Mr, Mc: flexure.Mc } : flexure;
  };
  r.section('theory/H1', 'The interaction with the exact moments, for comparison', clause('H1.1'));
  interaction(r, 'theory/H1', axial, exact(planes.x, used.major), exact(planes.y, used.minor));
}

/** Which segment's interaction governs, with the others shown not to. */
function governingSegment(r: Recorder, segments: readonly Segment[]): void {
  const ratios = segments.flatMap(({ id }) => {
    const line = r.lines.find((l) => l.key === `${id}/H1/ratio`);
    return line && isValued(line)
      ? [{ ref: `:${line.key}`, symbol: line.symbol, value: line.value, dimension: line.dimension }]
      : [];
  });
  if (ratios.length !== segments.length) return;
  r.section('H1/segments', 'Segments', clause('H1.1'));
  r.governing('H1/segments/ratio', 'max', ratios, {
    title: 'Utilisation of the governing segment',
    symbol: 'ratio',
    clause: clause('H1.1'),
  });
}
