import type { LineOf } from '../calc/line.ts';
import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { f1Formulas } from '../standards/aisc360-22/f1.ts';
import {
  type Axial,
  type Flexure,
  interaction,
  separateChecks,
} from '../standards/aisc360-22/h1.ts';
import { singleAxisChecks } from '../standards/aisc360-22/h1-single-axis.ts';
import {
  type FlexureAtPoint,
  type StressPoint,
  stressInteractionChecks,
} from '../standards/aisc360-22/h2.ts';
import { methodConstant } from '../standards/aisc360-22/parameters.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { axisStrength } from './compression.ts';
import { availableMajor, availableYielding, ltbRange } from './major-flexure.ts';
import type { Side } from './major-strengths.ts';
import type { MemberStrengths } from './member-strengths.ts';
import type { Segment } from './segments.ts';

/** What a segment brings to the provisions that the basis may choose. */
export interface OptionalCase {
  readonly axial: Axial | null;
  readonly compressed: boolean;
  readonly major: Flexure | null;
  readonly minor: Flexure | null;
  readonly Lb: Quantity | null;
  /** Modification factor of the segment's strength, where it needed one. */
  readonly Cb: Quantity | null;
  readonly sides: readonly Side[];
}

/**
 * H1.3 or H2 in place of H1.1, where the basis of design chooses them and their conditions hold,
 * with the ordinary ratio beside; null: H1.1 decides.
 */
export function optionalChecks(
  m: MemberStrengths,
  { r }: Segment,
  q: OptionalCase,
): LineOf<'check'>[] | null {
  const { provisions } = m.input;
  if (provisions.has('H1.3')) {
    const checks = singleAxis(r, m, q);
    if (checks) return checks;
  }
  return provisions.has('H2') ? stresses(r, m, q) : null;
}

function singleAxis(r: Recorder, m: MemberStrengths, q: OptionalCase): LineOf<'check'>[] | null {
  const { section, compression, steel, input } = m;
  const { axial, major, minor, Lb } = q;
  const { Lcx, Lcy, Lcz } = m.q;
  const strength = m.major?.top;
  const lengths = Lcx && Lcy && Lcz ? { Lcx, Lcy, Lcz } : null;
  if (!q.compressed || !axial || !major || !compression || !strength || !Lb || !lengths)
    return null;
  if (section.kind !== 'i' || !strength.elements || compression.slender || compression.torsional) {
    r.notice(
      'H1.3/not',
      'note',
      'single-axis-not-applicable',
      'H1.3 is for rolled compact members of doubly symmetric section, here without elements slender in compression and without torsional buckling. H1.1 decides.',
      { title: 'H1.3 does not apply', clause: clause('H1.3') },
    );
    return null;
  }
  const { design } = input;
  const phic = methodConstant(r, 'compression', design);
  const along = (axis: 'x' | 'y', Lc: Quantity) =>
    axisStrength(r, `H1.3/${axis}`, design, steel, section, axis, Lc, phic);
  // Lateral-torsional buckling with Cb = 1, beside the strength with the segment's own factor.
  const plain = r.within('H1.3/Cb1');
  const one = plain.formula(f1Formulas.CbOne, 'F1/Cb', {});
  const range = ltbRange(plain, strength, Lb);
  return singleAxisChecks(r, {
    shape: section.made === 'rolled' ? 'a doubly symmetric rolled I-shape' : 'another shape',
    ...strength.elements,
    ...{ Lcy: lengths.Lcy, Lcz: lengths.Lcz, Pr: axial.Pr, Pc: axial.Pc },
    ...{ Pcx: along('x', lengths.Lcx), Pcy: along('y', lengths.Lcy) },
    ...{ x: major, y: minor, Cb: q.Cb ?? one },
    yielding: availableYielding(r, 'H1.3', design, strength),
    Mcx1: availableMajor(plain, design, strength, range, one),
  });
}

/** H2 at the corners; the ratio of H1.1 stands beside it. */
function stresses(r: Recorder, m: MemberStrengths, q: OptionalCase): LineOf<'check'>[] | null {
  const { axial, major, minor, compressed } = q;
  if ([axial, major, minor].filter((part) => part !== null).length < 2) return null;
  if (axial && !compressed) {
    r.notice('H2/tension', 'note', 'stress-interaction-tension', 'With tension H1.2 decides.', {
      title: 'H2 is not used in tension',
      clause: clause('H2'),
    });
    return null;
  }
  const { section } = m;
  const minorAt: FlexureAtPoint | null = minor && { ...minor, S: section.Sy };
  const point = (name: string, title: string, S: Quantity): StressPoint => ({
    ...{ name, title, y: minorAt },
    x: major && { ...major, S },
  });
  // Every term adds at one corner of a doubly symmetric section. Of a singly symmetric one the face
  // in tension is at its own distance; the smaller modulus about y stands for both tips.
  const points =
    section.kind === 'mono-i' && major
      ? q.sides.flatMap((side) => [
          point(`${side}-compressed`, `${side} flange, compressed`, section[side].S),
        ])
      : [point('corner', 'worst corner', section.Sx)];
  const use = axial && { Pr: axial.Pr, Pc: axial.Pc, Ag: section.A };
  interaction(r, 'H1', axial, major, minor);
  return [...stressInteractionChecks(r, use, points), ...separateChecks(r, axial, major, minor)];
}
