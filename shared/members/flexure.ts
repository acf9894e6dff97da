import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { majorFlexureClass, minorFlexureClass } from '../standards/aisc360-22/b4-flexure.ts';
import { availableFlexure } from '../standards/aisc360-22/f1.ts';
import {
  F2_LTB,
  type F2Limits,
  ltbLimitsF2,
  ltbStrengthF2,
  type MajorFlexure,
  plasticMomentMajor,
} from '../standards/aisc360-22/f2.ts';
import { flangeLocalBucklingMajor } from '../standards/aisc360-22/f3.ts';
import { minorFlexuralStrength } from '../standards/aisc360-22/f6.ts';
import { type LtbRange, ltbRangeOf } from '../standards/aisc360-22/ltb-range.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type { SectionQuantities, SteelQuantities } from './member-lines.ts';

/** Major-axis strength as far as it does not depend on the combination. */
export interface MajorStrength {
  readonly q: MajorFlexure;
  readonly limits: F2Limits;
  readonly range: LtbRange;
  readonly Lb: Quantity;
  readonly Mp: Quantity;
  readonly FLB: Quantity | null;
  readonly phib: Quantity;
}

/** F2 and F3 up to Cb; null, with an outside-scope notice, where the web is not compact (F4, F5). */
export function majorStrength(
  r: Recorder,
  steel: SteelQuantities,
  s: SectionQuantities,
  Lb: Quantity,
  phib: Quantity,
): MajorStrength | null {
  const { E, Fy } = steel;
  r.section('B4/x', 'Width-to-thickness ratios, major-axis flexure', clause('B4.1'));
  const { flange, web } = majorFlexureClass(r, { E, Fy }, s.lambdaf, s.lambdaw);
  if (web.class !== 'compact') {
    r.notice(
      'F4/outside',
      'outside scope',
      'web-not-compact',
      'The web is not compact in flexure: F4 or F5 applies, which this version does not cover. Major-axis flexure is not checked.',
      {
        title: 'Noncompact or slender web',
        clause: clause(web.class === 'noncompact' ? 'F4' : 'F5'),
      },
    );
    return null;
  }
  r.section('F2', 'Major-axis flexural strength', clause(flange.class === 'compact' ? 'F2' : 'F3'));
  const q: MajorFlexure = { E, Fy, Sx: s.Sx, Zx: s.Zx, ry: s.ry, rts: s.rts, J: s.J, ho: s.ho };
  const Mp = plasticMomentMajor(r, q);
  const limits = ltbLimitsF2(r, q, null, Lb);
  const range = ltbRangeOf(r, F2_LTB, limits, Lb);
  const FLB = flangeLocalBucklingMajor(
    r,
    { E, Fy, Sx: s.Sx, Mp, lambdaf: s.lambdaf, lambdaw: s.lambdaw },
    flange,
  );
  return { q, limits, range, Lb, Mp, FLB, phib };
}

/** Mn and Mc about the major axis once Cb is known; `Cb` is not used where LTB does not apply. */
export function availableMajor(
  r: Recorder,
  design: 'LRFD' | 'ASD',
  m: MajorStrength,
  Cb: Quantity | null,
): Quantity {
  const { range, Lb } = m;
  const LTB =
    Cb && (range === 'inelastic' || range === 'elastic')
      ? ltbStrengthF2(r, m.q, m.limits, m.Mp, { range, Lb, Cb })
      : null;
  const candidates = [LTB ?? m.Mp, ...(m.FLB ? [m.FLB] : [])];
  const Mn = r.governing('F2/Mn', 'min', candidates, {
    title: 'Nominal flexural strength, major axis',
    symbol: 'Mnx',
    clause: clause(m.FLB ? 'F3' : 'F2'),
  });
  return availableFlexure(r, 'x', design, m.phib, Mn);
}

/** F6 with its available strength. */
export function minorStrength(
  r: Recorder,
  design: 'LRFD' | 'ASD',
  steel: SteelQuantities,
  s: SectionQuantities,
  phib: Quantity,
): Quantity {
  const { E, Fy } = steel;
  r.section('B4/y', 'Width-to-thickness ratios, minor-axis flexure', clause('B4.1'));
  const flange = minorFlexureClass(r, { E, Fy }, s.lambdaf);
  r.section('F6', 'Minor-axis flexural strength', clause('F6'));
  const { Mn } = minorFlexuralStrength(
    r,
    { E, Fy, Sy: s.Sy, Zy: s.Zy, lambdaf: s.lambdaf },
    flange,
  );
  return availableFlexure(r, 'y', design, phib, Mn);
}
