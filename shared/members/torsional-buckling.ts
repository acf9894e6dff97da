import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import {
  closedShapeNote,
  doublySymmetricStress,
  elasticTorsionalStress,
} from '../standards/aisc360-22/e4.ts';
import {
  closedConstrainedStress,
  constrainedTorsionalStress,
  type OffsetRestraint,
  offsetByAnalysis,
} from '../standards/aisc360-22/e4-constrained.ts';
import {
  elasticTwistStress,
  shearCentreConstants,
  singlySymmetricStress,
} from '../standards/aisc360-22/e4-flexural-torsional.ts';
import type { SectionQuantities, SteelQuantities } from './section-quantities.ts';

export interface TorsionalQuantities {
  readonly Lcy: Quantity;
  readonly Lcz: Quantity;
  readonly offset: OffsetRestraint | null;
  /** Flexural stresses of E3-4. */
  readonly Fex: Quantity;
  readonly Fey: Quantity;
}

/**
 * Elastic stress of E4 by kind of section: (a) built-up I-shapes, rolled ones where Lcz exceeds Lcy,
 * (b) channels and mono-symmetric I-shapes always, (d), (e), (f) where a restraint is offset from
 * the shear centre. null where E4 asks for nothing; `outside` after an outside-scope notice.
 */
export function torsionalStress(
  r: Recorder,
  steel: Pick<SteelQuantities, 'E' | 'G'>,
  s: SectionQuantities,
  q: TorsionalQuantities,
): Quantity | null | 'outside' {
  const { E, G } = steel;
  const { Lcy, Lcz, offset, Fex, Fey } = q;
  const { J, Ix, Iy, rx, ry, A: Ag } = s;
  switch (s.kind) {
    case 'i': {
      const { ho, Cw } = s;
      if (offset)
        return constrainedTorsionalStress(r, offset, { E, G, J, Ix, Iy, rx, ry, ho, Ag, Lcz });
      return s.made === 'rolled'
        ? elasticTorsionalStress(r, { E, G, Cw, J, Ix, Iy, Lcy, Lcz })
        : doublySymmetricStress(r, { E, G, Cw, J, Ix, Iy, Lcz });
    }
    case 'rect-hss':
    case 'box':
    case 'round':
      if (offset) return closedConstrainedStress(r, offset, { E, G, J, Ix, Iy, rx, ry, Ag, Lcz });
      closedShapeNote(r);
      return null;
    default: {
      if (offset) {
        offsetByAnalysis(r);
        return 'outside';
      }
      const { ro, H } =
        s.kind === 'channel' ? s : shearCentreConstants(r, { yo: s.yo, Ix, Iy, Ag });
      const Fez = elasticTwistStress(r, { E, G, Cw: s.Cw, J, Lcz, Ag, ro });
      return singlySymmetricStress(r, s.kind === 'channel' ? Fex : Fey, Fez, H);
    }
  }
}
