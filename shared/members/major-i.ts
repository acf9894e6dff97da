import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { majorFlexureClass } from '../standards/aisc360-22/b4-flexure.ts';
import {
  F2_LTB,
  ltbLimitsF2,
  ltbStrengthF2,
  plasticMomentMajor,
} from '../standards/aisc360-22/f2.ts';
import { flangeLocalBucklingMajor } from '../standards/aisc360-22/f3.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type { MajorSection } from './major-section.ts';
import type { ISection, SteelQuantities } from './section-quantities.ts';

/** F2 and F3: a doubly symmetric I-shape with a compact web. */
export function majorRolledI(
  r: Recorder,
  steel: SteelQuantities,
  s: ISection,
  longest: Quantity | null,
  phib: Quantity,
): MajorSection | null {
  const { E, Fy } = steel;
  r.section('B4/x', 'Width-to-thickness ratios, major-axis flexure', clause('B4.1'));
  const { flange, web } = majorFlexureClass(r, steel, s.lambdaf, s.lambdaw);
  if (web.class !== 'compact') return null;
  const chapter = flange.class === 'compact' ? 'F2' : 'F3';
  r.section('F2', 'Major-axis flexural strength', clause(chapter));
  const q = { E, Fy, Sx: s.Sx, Zx: s.Zx, ry: s.ry, rts: s.rts, J: s.J, ho: s.ho };
  const Mp = plasticMomentMajor(r, q);
  const limits = ltbLimitsF2(r, q, null, longest);
  const FLB = flangeLocalBucklingMajor(
    r,
    { E, Fy, Sx: s.Sx, Mp, lambdaf: s.lambdaf, lambdaw: s.lambdaw },
    flange,
  );
  return {
    Mp,
    phib,
    clause: chapter,
    key: 'F2/Mn',
    yielding: Mp,
    others: FLB ? [FLB] : [],
    ltb: {
      words: F2_LTB,
      limits,
      strength: (w, segment) => ltbStrengthF2(w, q, limits, Mp, segment),
    },
  };
}
