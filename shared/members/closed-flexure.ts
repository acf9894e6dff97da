import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { closedFlexureClass } from '../standards/aisc360-22/b4-flexure.ts';
import {
  type ClosedPlates,
  flangeLocalBucklingClosed,
  flatWidth,
  plasticMomentClosed,
  webLocalBucklingClosed,
  widthOverWebs,
} from '../standards/aisc360-22/f7.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type { BoxSection, RectHssSection, SteelQuantities } from './section-quantities.ts';

export interface ClosedStrengths {
  readonly Mp: Quantity;
  /** Flange and web local buckling, as far as they apply. */
  readonly local: readonly Quantity[];
}

/** The plates as bending about `axis` sees them: about y flanges and webs change places. */
function platesOf(r: Recorder, axis: 'x' | 'y', s: RectHssSection | BoxSection): ClosedPlates {
  const at = `F7/${axis}`;
  if (s.kind === 'rect-hss') {
    const [lambda, d] = axis === 'x' ? [s.lambdab, s.Ht] : [s.lambdah, s.B];
    return { b: flatWidth(r, at, lambda, s.t), tf: s.t, d, web: null };
  }
  const { b, h, tf, tw, d } = s;
  return axis === 'x'
    ? { b, tf, d, web: { h, tw } }
    : { b: h, tf: tw, d: widthOverWebs(r, at, b, tw), web: { h: b, tw: tf } };
}

/** F7.1 to F7.3 of a rectangular HSS or a box about one axis; null after an outside-scope notice. */
export function closedStrengths(
  r: Recorder,
  axis: 'x' | 'y',
  steel: SteelQuantities,
  s: RectHssSection | BoxSection,
): ClosedStrengths | null {
  const { kind, A: Ag } = s;
  const bent =
    axis === 'x'
      ? { I: s.Ix, S: s.Sx, Z: s.Zx, lambdaf: s.lambdab, lambdaw: s.lambdah }
      : { I: s.Iy, S: s.Sy, Z: s.Zy, lambdaf: s.lambdah, lambdaw: s.lambdab };
  const name = axis === 'x' ? 'Major' : 'Minor';
  r.section(
    `B4/${axis}`,
    `Width-to-thickness ratios, ${name.toLowerCase()}-axis flexure`,
    clause('B4.1'),
  );
  const { flange, web } = closedFlexureClass(r, axis, kind, steel, bent.lambdaf, bent.lambdaw);
  const [slenderFlange, slenderWebs] = [flange.class === 'slender', web.class === 'slender'];
  if (slenderWebs && (kind === 'rect-hss' || slenderFlange)) {
    r.notice(
      `F7/${axis}/outside`,
      'outside scope',
      'webs-slender',
      kind === 'rect-hss'
        ? 'The webs of the hollow section are slender in flexure: F7.3 has a rule for slender webs of box sections only. Flexure about this axis is not checked.'
        : 'Webs and flanges of the box are slender in flexure: F7 has no rule for both together. Flexure about this axis is not checked.',
      { title: 'Slender webs', clause: clause('F7.3') },
    );
    return null;
  }
  r.section(`F7/${axis}`, `${name}-axis flexural strength`, clause('F7'));
  const plates = slenderFlange || slenderWebs ? platesOf(r, axis, s) : null;
  const { E, Fy } = steel;
  const q = { axis, kind, E, Fy, Ag, ...bent, plates };
  const Mp = plasticMomentClosed(r, q);
  const FLB = flangeLocalBucklingClosed(r, q, Mp, flange);
  const WLB = webLocalBucklingClosed(r, q, Mp, web);
  return { Mp, local: [FLB, WLB].filter((m) => m !== null) };
}
