import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { minorFlexureClass } from '../standards/aisc360-22/b4-flexure.ts';
import { availableFlexure } from '../standards/aisc360-22/f1.ts';
import { minorFlexuralStrength } from '../standards/aisc360-22/f6.ts';
import type { Design } from '../standards/aisc360-22/parameters.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type { SectionQuantities, SteelQuantities } from './section-quantities.ts';

/**
 * F6, F7 or F8 about the minor axis with its available strength φb Mn or Mn/Ωb; `phib` is φb or Ωb.
 * Answers null after an outside-scope notice.
 */
export function minorStrength(
  r: Recorder,
  design: Design,
  steel: SteelQuantities,
  section: SectionQuantities,
  phib: Quantity,
): Quantity | null {
  if (section.kind !== 'i') return null;
  const { E, Fy } = steel;
  const { Sy, Zy, lambdaf } = section;
  r.section('B4/y', 'Width-to-thickness ratios, minor-axis flexure', clause('B4.1'));
  const flange = minorFlexureClass(r, steel, lambdaf);
  r.section('F6', 'Minor-axis flexural strength', clause('F6'));
  const { Mn } = minorFlexuralStrength(r, { E, Fy, Sy, Zy, lambdaf }, flange);
  return availableFlexure(r, 'y', design, phib, Mn);
}
