import type { Line, LineOf } from '../calc/line.ts';
import type { Quantity } from '../calc/quantity.ts';
import { createRecorder, NotComputable } from '../calc/recorder.ts';
import { firstOrderAxialLimit } from '../standards/aisc360-22/app7.ts';
import { interaction, interactionChecks, separateChecks } from '../standards/aisc360-22/h1.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type { CompressionStrength } from './compression.ts';
import { availableMajor, type MajorStrength } from './flexure.ts';
import type { MemberQuantities, SectionQuantities, SteelQuantities } from './member-lines.ts';
import { automaticCb } from './modification-factor.ts';
import type { ResolvedCombination, ResolvedInput, ResolvedMember } from './resolved.ts';
import {
  AXES,
  type Axis,
  axialState,
  bends,
  type PlaneResult,
  requiredMoment,
} from './second-order.ts';

/** What the member lines made available to every combination; null where it does not apply or is outside scope. */
export interface MemberStrengths {
  readonly input: ResolvedInput;
  readonly member: ResolvedMember;
  readonly q: MemberQuantities;
  readonly steel: SteelQuantities;
  readonly section: SectionQuantities;
  readonly alpha: Quantity | null;
  readonly compression: CompressionStrength | null;
  readonly major: MajorStrength | null;
  /** Available major-axis strength where it does not depend on the combination. */
  readonly Mcx: Quantity | null;
  readonly Mcy: Quantity | null;
  readonly Cb: Quantity | null;
}

export interface CombinationRun {
  readonly lines: readonly Line[];
  readonly checks: readonly LineOf<'check'>[];
  readonly planes: Readonly<Record<Axis, PlaneResult | null>>;
  /** Compressed, so that Chapter E and the second-order clauses apply. */
  readonly compressed: boolean;
  readonly tension: boolean;
}

/** All lines of one combination. */
export function runCombination(m: MemberStrengths, c: ResolvedCombination): CombinationRun {
  const r = createRecorder(':');
  const done: { checks: LineOf<'check'>[]; planes: Record<Axis, PlaneResult | null> } = {
    checks: [],
    planes: { x: null, y: null },
  };
  const compressed = c.P.value > 0;
  const tension = c.P.value < 0;
  try {
    steps(m, c, r, done);
  } catch (error) {
    if (!(error instanceof NotComputable)) throw error;
  }
  return { lines: r.lines, ...done, compressed, tension };
}

function steps(
  m: MemberStrengths,
  c: ResolvedCombination,
  r: ReturnType<typeof createRecorder>,
  done: { checks: LineOf<'check'>[]; planes: Record<Axis, PlaneResult | null> },
): void {
  const { input, member, steel, section, q } = m;
  r.section('given', `Forces of ${c.name}`, clause('C2'));
  const Pr = r.given('given/P', 'P', 'force', c.P, {
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
  const noTension = r.choice(
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
    {
      title: 'Sense of the axial force',
    },
  );
  if (noTension === 0) {
    r.notice(
      'D2/outside',
      'outside scope',
      'tension',
      'The member is in tension. Tension (D2) and its combination with flexure (H1.2) are outside the scope of this version; nothing is checked for this combination.',
      {
        title: 'Tension',
        clause: clause('H1.2'),
      },
    );
    return;
  }
  const axial = c.P.value > 0 && m.compression && m.alpha ? { Pr, Pc: m.compression.Pc } : null;
  if (axial && m.compression?.Pns && m.alpha && input.analysis.method === 'first-order')
    firstOrderAxialLimit(r, m.alpha, Pr, m.compression.Pns);
  const state =
    axial && m.compression && m.alpha && AXES.some((a) => bends(c, a))
      ? axialState(r, input, Pr, m.alpha, m.compression.Pns)
      : null;
  for (const axis of AXES) {
    const Lc = axis === 'x' ? q.Lcx : q.Lcy;
    done.planes[axis] = requiredMoment(
      r,
      input,
      c,
      {
        axis,
        L: q.L,
        E: steel.E,
        I: axis === 'x' ? section.Ix : section.Iy,
        heldBetween: Lc !== null && Lc.value < q.L.value,
        sense: member.endMomentSign,
      },
      state,
    );
  }
  const { x, y } = done.planes;
  const incomplete = [x, y].some((p) => p?.state === 'failed' || p?.state === 'outside scope');
  const Mcx = x?.Mr ? (m.Mcx ?? majorCapacity(m, c, r, x)) : null;
  const major = x?.Mr && Mcx ? { Mr: x.Mr, Mc: Mcx } : null;
  const minor = y?.Mr && m.Mcy ? { Mr: y.Mr, Mc: m.Mcy } : null;
  if (incomplete || (x?.Mr && !Mcx)) {
    // Without the interaction a strength that is exceeded by itself still says NOT OK.
    if (axial || major || minor) r.section('H1', 'Checks', clause('H1.1'));
    done.checks.push(...separateChecks(r, axial, major, minor));
    return;
  }
  r.section('H1', 'Checks', clause('H1.1'));
  done.checks.push(...interactionChecks(r, axial, major, minor));
  if (!axial && !major && !minor)
    r.notice(
      'H1/nothing',
      'note',
      'no-forces',
      'This combination has neither axial force nor moment; there is nothing to check.',
      { title: 'No forces', clause: clause('H1') },
    );
  if (r.lines.some((l) => l.key.endsWith('/lower') && l.key.startsWith('theory/'))) {
    const exact = (p: PlaneResult | null, used: { Mr: Quantity; Mc: Quantity } | null) =>
      used && p?.exact ? { Mr: p.exact.Mmax, Mc: used.Mc } : used;
    r.section(
      'theory/H1',
      'The interaction with the exact moments, for comparison',
      clause('H1.1'),
    );
    interaction(r, 'theory/H1', axial, exact(x, major), exact(y, minor));
  }
}

/** Major-axis strength where Cb comes from this combination's diagram. */
function majorCapacity(
  m: MemberStrengths,
  c: ResolvedCombination,
  r: ReturnType<typeof createRecorder>,
  x: PlaneResult,
): Quantity | null {
  const { major, q } = m;
  if (!major || !q.Lb) return null;
  const Cb = automaticCb(r, m.input, x, {
    L: q.L,
    Lb: q.Lb,
    givenMax: c.moments.x.max !== null,
    compressed: c.P.value > 0,
  });
  r.section('F2', 'Major-axis flexural strength of this combination', clause('F2'));
  return availableMajor(r, m.input.design, major, Cb);
}
