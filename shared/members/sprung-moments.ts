import type { GivenValue, Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { criticalLoad } from '../standards/aisc360-22/app8.ts';
import type { BayLoad } from '../standards/elastic-theory/bay.ts';
import { sprungBay } from '../standards/elastic-theory/end-springs.ts';
import { firstOrderBay } from '../standards/elastic-theory/statics.ts';
import { clause as theory } from '../standards/elastic-theory/writer.ts';
import { type Axis, type BayMoments, WORD } from './bay-moments.ts';
import type { ResolvedMember } from './resolved.ts';
import type { Bay } from './restraint-lines.ts';

/** The rotational springs of a plane, a pin where only the other end has one; null without any. */
export function springsOf(
  member: ResolvedMember,
  axis: Axis,
  units: 'us' | 'si',
): { readonly A: GivenValue; readonly B: GivenValue } | null {
  const [A, B] = [member.springs?.[`${axis}A`], member.springs?.[`${axis}B`]];
  const known = A ?? B;
  if (member.ends.value !== 'springs' || !known) return null;
  const pin = { ...known, value: 0, text: units === 'us' ? '0 kip ft/rad' : '0 kN m/rad' };
  return { A: A ?? pin, B: B ?? pin };
}

/** kL/EI up to which the lines of the solution keep their digits; far beyond a fixed end. */
const MOST_RELATIVE = 1e4;

/** Exact moments of a bay whose ends turn against springs: the springs take the end moments. */
export function sprungMoments(
  r: Recorder,
  axis: Axis,
  q: {
    readonly bay: Bay;
    readonly loads: readonly BayLoad[];
    readonly springs: { readonly A: GivenValue; readonly B: GivenValue };
    readonly alpha: Quantity;
    /** Axial force, compression positive; may be zero. */
    readonly Pr: Quantity;
    readonly EIstar: Quantity;
  },
): BayMoments | 'failed' | 'outside scope' {
  const { bay, loads, alpha, Pr, EIstar } = q;
  const at = `theory/${axis}`;
  const spring = (end: 'A' | 'B') =>
    r.given(`given/springs/${axis}${end}`, 'k', 'rotationalStiffness', q.springs[end], {
      title: `Rotational stiffness at end ${end}, ${WORD[axis]} axis`,
    });
  const [kA, kB] = [spring('A'), spring('B')];
  if (Math.max(kA.value, kB.value) * bay.L1.value > MOST_RELATIVE * EIstar.value) {
    r.notice(
      `${at}/outside`,
      'outside scope',
      'spring-beyond-fixed',
      'A spring is more than ten thousand times as stiff as the member: the end is fixed, and the digits of the solution are lost in the difference. Give a thousand times EI/L for a fixed end.',
      { title: `End spring stiffer than a fixed end, ${WORD[axis]} axis`, clause: theory('9') },
    );
    return 'outside scope';
  }
  const Pe1 = criticalLoad(r, axis, EIstar, bay.L1);
  const found = sprungBay(r, at, { axis, L1: bay.L1, loads, kA, kB }, { alpha, Pr, EIstar, Pe1 });
  if (found === 'failed' || found === 'outside scope') return found;
  const { result } = found;
  let statics = result.order === 'first' ? result : null;
  return {
    ...{ state: 'done', r, bay, ends: found.bay.ends, loads, exact: result, code: null },
    Mr: result.largest.size.M,
    first: () => (statics ??= firstOrderBay(r, at, found.bay)),
    ...{ alongExact: true, swayed: false, codeLower: false },
  };
}
