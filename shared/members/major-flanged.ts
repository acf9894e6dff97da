import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import type { ClassWithLimits } from '../standards/aisc360-22/b4-flexure.ts';
import {
  compressionFlangeRadius,
  F4_LTB,
  type FlangedSection,
  flangeLocalBucklingF4,
  flangeYieldingF4,
  ltbLimitsF4,
  ltbStrengthF4,
} from '../standards/aisc360-22/f4.ts';
import {
  F5_LTB,
  flangeLocalBucklingF5,
  flangeYieldingF5,
  ltbLimitsF5,
  ltbStrengthF5,
  reductionFactor,
} from '../standards/aisc360-22/f5.ts';
import { slenderWebWithin } from '../standards/aisc360-22/f13.ts';
import type { MajorSection } from './major-section.ts';

interface Classes {
  readonly flange: ClassWithLimits;
  readonly web: ClassWithLimits;
}

const present = (...strengths: readonly (Quantity | null)[]): readonly Quantity[] =>
  strengths.filter((q) => q !== null);

/** F4: doubly symmetric with a noncompact web, singly symmetric with a compact or noncompact web. */
export function compactOrNoncompactWeb(
  r: Recorder,
  q: FlangedSection,
  { flange, web }: Classes,
  FL: Quantity,
  kc: Quantity | null,
  longest: Quantity | null,
  phib: Quantity,
): MajorSection {
  const yielding = flangeYieldingF4(r, q, web);
  const limits = ltbLimitsF4(r, q, FL, yielding.withoutJ, longest);
  const FLB = flangeLocalBucklingF4(r, q, FL, kc, yielding, flange);
  return {
    Mp: yielding.Mp,
    phib,
    clause: 'F4',
    key: 'F4/Mn',
    yielding: yielding.CFY,
    others: present(FLB, yielding.TFY),
    ltb: {
      words: F4_LTB,
      limits,
      strength: (w, segment) => ltbStrengthF4(w, q, FL, limits, yielding, segment),
    },
  };
}

/** F5: slender web; null after an outside-scope notice, beyond the proportions of F13.2. */
export function slenderWeb(
  r: Recorder,
  q: FlangedSection & { readonly h: Quantity },
  { flange }: Classes,
  kc: Quantity | null,
  longest: Quantity | null,
  phib: Quantity,
): MajorSection | null {
  const { aw, rt } = compressionFlangeRadius(r, 'F5', q);
  if (!slenderWebWithin(r, { ...q, aw })) return null;
  const Rpg = reductionFactor(r, 'F5', { ...q, aw, lambda: q.lambdahc });
  const { CFY, TFY } = flangeYieldingF5(r, q, Rpg);
  const limits = ltbLimitsF5(r, q, rt, longest);
  const FLB = flangeLocalBucklingF5(r, q, Rpg, kc, flange);
  return {
    Mp: CFY,
    phib,
    clause: 'F5',
    key: 'F5/Mn',
    yielding: CFY,
    others: present(FLB, TFY),
    ltb: {
      words: F5_LTB,
      limits,
      strength: (w, segment) => ltbStrengthF5(w, q, { rt, Rpg, limits }, segment),
    },
  };
}
