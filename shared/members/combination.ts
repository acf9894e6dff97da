import type { LineOf } from '../calc/line.ts';
import type { Quantity } from '../calc/quantity.ts';
import { createRecorder, NotComputable, type Recorder } from '../calc/recorder.ts';
import { firstOrderAxialLimit } from '../standards/aisc360-22/app7.ts';
import { requiredAxial } from '../standards/aisc360-22/app8-b2.ts';
import { stiffnessByNotionalLoad, stiffnessReduction } from '../standards/aisc360-22/c2.ts';
import type { Axial } from '../standards/aisc360-22/h1.ts';
import { requiredTension } from '../standards/aisc360-22/h1-tension.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { AXES, type AxialState, type Axis } from './bay-moments.ts';
import { checkSegments } from './check-segments.ts';
import { deflectionLines } from './deflection-lines.ts';
import type { CombinationRun, MemberStrengths } from './member-strengths.ts';
import { bends, type PlaneMoments, planeMoments } from './plane-moments.ts';
import type { ResolvedCombination, ResolvedInput } from './resolved.ts';
import { type Segment, segmentsOf } from './segments.ts';
import { checkShear } from './shear-demand.ts';
import { storyMultiplier, translationMoment } from './sway.ts';

/** A run that has no lines, where nothing of the member is checked. */
export const noRun = (c: ResolvedCombination): CombinationRun => ({
  ...{ lines: [], checks: [], planes: { x: null, y: null }, segments: [null] },
  ...{ bends: bendsOf(c), compressed: c.P.value > 0, tension: c.P.value < 0 },
});

const bendsOf = (c: ResolvedCombination) => ({ x: bends(c, 'x'), y: bends(c, 'y') });

interface Done {
  checks: LineOf<'check'>[];
  planes: Record<Axis, PlaneMoments | null>;
  segments: (string | null)[];
  compressed: boolean;
  tension: boolean;
}

/** All lines of one combination. */
export function runCombination(m: MemberStrengths, c: ResolvedCombination): CombinationRun {
  const r = createRecorder(':');
  const done: Done = {
    ...{ checks: [], planes: { x: null, y: null }, segments: [null] },
    ...{ compressed: c.P.value > 0, tension: c.P.value < 0 },
  };
  try {
    steps(m, c, r, done);
  } catch (error) {
    if (!(error instanceof NotComputable)) throw error;
  }
  return { lines: r.lines, bends: bendsOf(c), ...done };
}

function steps(m: MemberStrengths, c: ResolvedCombination, r: Recorder, done: Done): void {
  const { input, member } = m;
  r.section('given', `Forces of ${c.name}`, clause('C2'));
  const P = r.given('given/P', 'P', 'force', c.P, {
    title:
      input.design === 'ASD'
        ? 'Axial force, ASD load level, compression positive'
        : 'Axial force, compression positive',
  });
  if (c.analysedWith !== null)
    r.notice(
      'given/analysed',
      'caution',
      'analysed-with-another-section',
      `These forces were analysed with ${c.analysedWith}, the member is ${member.section.value}: they are not confirmed until the analysis is run again.`,
      { title: 'Forces of another section', clause: clause('C2') },
    );
  const sway = swayOf(r, m, c);
  if (sway === 'stopped') return;
  const Pr = axialWithSway(r, c, P, sway);
  const sense = r.choice(
    'given/sense',
    [
      { left: Pr, relation: '<', right: 0, outcome: 'the member is in tension' },
      {
        left: Pr,
        relation: '=',
        right: 0,
        outcome: 'there is no axial force: Chapter E does not apply',
      },
    ],
    'the member is in compression',
    { title: 'Sense of the axial force' },
  );
  done.tension = sense === 0;
  done.compressed = sense < 0;
  const axial = done.tension ? tensionOf(r, m, Pr) : compressionOf(r, m, Pr, done.compressed);
  const state =
    done.compressed && m.compression && m.alpha && AXES.some((a) => bends(c, a))
      ? axialState(r, input, Pr, m.alpha, m.compression.Pns)
      : null;
  let start: Quantity | null = null;
  const context = {
    ...m,
    start: () => (start ??= startOfPlaces(r, m)),
  };
  for (const axis of AXES)
    done.planes[axis] = planeMoments(r, context, c, axis, { axial: state, P: Pr }, () => {
      const direction = c.sway?.[axis];
      const B2 = sway?.[axis];
      const Mlt = direction && B2 ? translationMoment(r, axis, direction) : null;
      return B2 && Mlt ? { B2, Mlt } : null;
    });
  const { x, y } = done.planes;
  if (!x || !y) return;
  const segments: readonly Segment[] = segmentsOf(r, context, x);
  done.segments = segments.map((s) => s.id);
  const unknown = done.compressed && !m.compression;
  done.checks.push(
    ...checkSegments(
      r,
      context,
      c,
      { ...axial, unknown, compressed: done.compressed },
      { x, y },
      segments,
    ),
    ...checkShear(r, m, c, { x, y }),
  );
  for (const plane of [x, y]) if (plane.state === 'done') deflectionLines(plane);
}

interface AxialUse {
  readonly axial: Axial | null;
  readonly clause: 'H1.1' | 'H1.2';
}

/** Compression against Pc; in the first-order method its limit too. */
function compressionOf(
  r: Recorder,
  m: MemberStrengths,
  Pr: Quantity,
  compressed: boolean,
): AxialUse {
  const { compression, alpha, input } = m;
  if (!compressed || !compression || !alpha) return { axial: null, clause: 'H1.1' };
  if (compression.Pns && input.analysis.method === 'first-order')
    firstOrderAxialLimit(r, alpha, Pr, compression.Pns);
  return { axial: { Pr, Pc: compression.Pc }, clause: 'H1.1' };
}

/** Tension as a positive force against the strength of D2, as far as that is known. */
function tensionOf(r: Recorder, m: MemberStrengths, P: Quantity): AxialUse {
  const { tension } = m;
  if (!tension) return { axial: null, clause: 'H1.2' };
  const Pr = requiredTension(r, P);
  if (!tension.Pc)
    r.notice(
      'D2/outside',
      'outside scope',
      'tension',
      'The member is in tension, and its rupture strength is not known, as said with the member. Yielding alone is checked.',
      { title: 'Tension', clause: clause('D2', 'D2-2') },
    );
  return { axial: { Pr, Pc: tension.Pc ?? tension.yielding }, clause: 'H1.2' };
}

type Multipliers = Readonly<Record<Axis, Quantity | null>>;

/** B2 of each direction that sways; 'stopped' where a story has none. */
function swayOf(
  r: Recorder,
  { input, alpha }: MemberStrengths,
  c: ResolvedCombination,
): Multipliers | null | 'stopped' {
  if (input.analysis.sway !== 'B2' || !c.sway || !alpha) return null;
  const { sway } = c;
  const of = (axis: Axis) => {
    const direction = sway[axis];
    return direction ? storyMultiplier(r, input, axis, alpha, direction) : null;
  };
  const [x, y] = [of('x'), of('y')];
  if (typeof x === 'string' || typeof y === 'string') return 'stopped';
  return { x, y };
}

/** A-8-2 with the larger of the multipliers; the given force where nothing sways. */
function axialWithSway(
  r: Recorder,
  c: ResolvedCombination,
  Pnt: Quantity,
  sway: Multipliers | null,
): Quantity {
  if (!sway || !c.sway?.P || c.sway.P.value === 0) return Pnt;
  const candidates = AXES.flatMap((axis) => sway[axis] ?? []);
  const [first] = candidates;
  if (!first) return Pnt;
  const Plt = r.given('given/sway/P', 'Plt', 'force', c.sway.P, {
    title: 'Axial force from lateral translation, compression positive',
  });
  const B2 =
    candidates.length === 1
      ? first
      : r.governing('App8/B2', 'max', candidates, {
          title: 'The larger story multiplier',
          symbol: 'B2',
          clause: clause('App. 8.1.1', 'A-8-2'),
        });
  return requiredAxial(r, Pnt, Plt, B2);
}

/** C2.1(d) and C2.3(b), (c): α, and τb where the analysis is direct. Pr is above zero. */
function axialState(
  r: Recorder,
  input: ResolvedInput,
  Pr: Quantity,
  alpha: Quantity,
  Pns: Quantity | null,
): AxialState {
  if (input.analysis.method !== 'direct' || !Pns) return { Pr, alpha, taub: null };
  r.section('C2', 'Stiffness of the direct analysis', clause('C2.3'));
  if (input.provisions.has('C2.3-taub'))
    return { Pr, alpha, taub: stiffnessByNotionalLoad(r, { alpha, Pr, Pns }, null) };
  return { Pr, alpha, taub: stiffnessReduction(r, alpha, Pr, Pns) ?? 'failed' };
}

/** The origin of distances along the member. */
const startOfPlaces = (r: Recorder, { input, member }: MemberStrengths): Quantity =>
  r.given(
    'given/start',
    'z',
    'length',
    { ...member.length, value: 0, text: input.units === 'us' ? '0 ft' : '0 m' },
    { title: 'Start of the member, end A' },
  );
