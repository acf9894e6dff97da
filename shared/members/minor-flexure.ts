import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { minorFlexureClass } from '../standards/aisc360-22/b4-flexure.ts';
import { availableFlexure } from '../standards/aisc360-22/f1.ts';
import { minorFlexuralStrength } from '../standards/aisc360-22/f6.ts';
import type { Design } from '../standards/aisc360-22/parameters.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { axesInOrder } from './axes-in-order.ts';
import { closedStrengths } from './closed-flexure.ts';
import { roundFlexure } from './round-flexure.ts';
import type {
  ChannelSection,
  ISection,
  MonoISection,
  SectionQuantities,
  SteelQuantities,
} from './section-quantities.ts';

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
  const Mn = axesInOrder(r, 'y', section) ? nominal(r, steel, section) : null;
  return Mn && availableFlexure(r, 'y', design, phib, Mn);
}

function nominal(r: Recorder, steel: SteelQuantities, s: SectionQuantities): Quantity | null {
  switch (s.kind) {
    case 'i':
    case 'mono-i':
    case 'channel':
      return openShape(r, steel, s);
    case 'rect-hss':
    case 'box': {
      const strengths = closedStrengths(r, 'y', steel, s);
      return strengths && least(r, 'F7', [strengths.Mp, ...strengths.local]);
    }
    case 'round': {
      const strengths = roundFlexure(r, 'y', steel, s);
      if (!strengths) return null;
      const { Mp, LB } = strengths;
      return least(r, 'F8', LB ? [Mp, LB] : [Mp]);
    }
  }
}

/** F6; of a singly symmetric I-shape the more slender flange is taken for both. */
function openShape(
  r: Recorder,
  steel: SteelQuantities,
  s: ISection | MonoISection | ChannelSection,
): Quantity {
  r.section('B4/y', 'Width-to-thickness ratios, minor-axis flexure', clause('B4.1'));
  const lambdaf =
    s.kind === 'mono-i'
      ? r.governing('B4/y/flange/lambda', 'max', [s.top.lambda, s.bottom.lambda], {
          title: 'Width-to-thickness ratio of the more slender flange',
          symbol: 'lambda',
          clause: clause('B4.1', 'Table B4.1b, 13'),
        })
      : s.lambdaf;
  const flange = minorFlexureClass(r, steel, lambdaf);
  r.section('F6', 'Minor-axis flexural strength', clause('F6'));
  const { E, Fy } = steel;
  return minorFlexuralStrength(r, { E, Fy, Sy: s.Sy, Zy: s.Zy, lambdaf }, flange).Mn;
}

const least = (r: Recorder, chapter: string, strengths: readonly Quantity[]): Quantity =>
  r.governing(`${chapter}/y/Mn`, 'min', strengths, {
    title: 'Nominal flexural strength, minor axis',
    symbol: 'Mny',
    clause: clause(chapter),
  });
