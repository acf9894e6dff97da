import type { LineOf } from '../calc/line.ts';
import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { availableShear, webShearStrength } from '../standards/aisc360-22/g2.ts';
import { closedShearStrength, type Walls } from '../standards/aisc360-22/g4.ts';
import { roundShearStrength } from '../standards/aisc360-22/g5.ts';
import { equalFlangesShear, unequalFlangesShear } from '../standards/aisc360-22/g6.ts';
import type { Design } from '../standards/aisc360-22/parameters.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type {
  BoxSection,
  ChannelSection,
  FlangeOfI,
  ISection,
  MonoISection,
  RectHssSection,
  SectionQuantities,
  SteelQuantities,
} from './section-quantities.ts';

export interface ShearInput {
  /** Clear distance between transverse stiffeners of the web (I-shapes, channels). */
  readonly a?: Quantity;
  /** Distance between the largest and zero shear force (round HSS, pipe). */
  readonly Lv?: Quantity;
}

type Axis = 'x' | 'y';
const WORD = { x: 'major', y: 'minor' } as const;

/**
 * Available shear strength Vc by Chapter G under keys `G2/x/…`, `G4/y/…`. `axis` is the axis of
 * bending: x is shear along the web, y across it.
 */
export function shearStrength(
  r: Recorder,
  design: Design,
  steel: SteelQuantities,
  section: SectionQuantities,
  axis: Axis,
  more: ShearInput = {},
): Quantity {
  const { E, Fy } = steel;
  const begin = (number: 'G2' | 'G4' | 'G5' | 'G6'): string => {
    const at = `${number}/${axis}`;
    r.section(at, `Shear strength, flexure about the ${WORD[axis]} axis`, clause(number));
    return at;
  };
  switch (section.kind) {
    case 'i':
    case 'mono-i':
    case 'channel': {
      if (axis === 'y') {
        const at = begin('G6');
        return availableShear(r, at, design, flangesShear(r, at, steel, section), axis);
      }
      const at = begin('G2');
      const { Vn, rolledStocky } = webShearStrength(r, at, {
        ...{ E, Fy, d: section.d, tw: section.tw, lambdaw: section.lambdaw },
        h: section.kind === 'mono-i' ? section.h : null,
        a: more.a ?? null,
        shape: shapeOf(section),
      });
      return availableShear(r, at, design, Vn, axis, rolledStocky);
    }
    case 'rect-hss':
    case 'box': {
      const at = begin('G4');
      const Vn = closedShearStrength(r, at, { E, Fy }, wallsOf(section, axis));
      return availableShear(r, at, design, Vn, axis);
    }
    case 'round': {
      const at = begin('G5');
      const { A: Ag, D, lambdad: lambda } = section;
      const Vn = roundShearStrength(r, at, { E, Fy, Ag, D, lambda, Lv: more.Lv ?? null });
      return availableShear(r, at, design, Vn, axis);
    }
  }
}

/** The shear force, as a magnitude, against its available strength. */
export function shearCheck(r: Recorder, axis: Axis, Vr: Quantity, Vc: Quantity): LineOf<'check'> {
  if (Vr.value < 0) throw new Error(`${Vr.ref}: a required shear strength is not negative`);
  return r.check(`G/${axis}/check`, Vr, Vc, {
    title: `Shear, flexure about the ${WORD[axis]} axis`,
    clause: clause('G1'),
  });
}

type Open = ISection | MonoISection | ChannelSection;

const shapeOf = (s: Open) =>
  s.kind === 'channel'
    ? 'a channel'
    : s.made === 'rolled'
      ? 'a rolled I-shape'
      : 'a built-up I-shape';

function flangesShear(r: Recorder, at: string, steel: SteelQuantities, s: Open): Quantity {
  const { E, Fy } = steel;
  if (s.kind !== 'mono-i')
    return equalFlangesShear(r, at, { E, Fy }, { bf: s.bf, tf: s.tf, lambda: s.lambdaf });
  const flange = (f: FlangeOfI) => ({ bf: f.b, tf: f.t, lambda: f.lambda });
  return unequalFlangesShear(r, at, { E, Fy }, flange(s.top), flange(s.bottom));
}

/** The walls along the shear force: the webs for x, the flanges for y. */
const wallsOf = (s: RectHssSection | BoxSection, axis: Axis): Walls => {
  const lambda = axis === 'x' ? s.lambdah : s.lambdab;
  if (s.kind === 'rect-hss') return { t: s.t, lambda, h: null };
  return axis === 'x' ? { t: s.tw, lambda, h: s.h } : { t: s.tf, lambda, h: s.b };
};
