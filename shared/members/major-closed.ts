import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { F7_LTB, ltbLimitsF7, ltbStrengthF7 } from '../standards/aisc360-22/f7.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { closedStrengths } from './closed-flexure.ts';
import type { MajorSection } from './major-section.ts';
import { roundFlexure } from './round-flexure.ts';
import type {
  BoxSection,
  RectHssSection,
  RoundSection,
  SteelQuantities,
} from './section-quantities.ts';

/** F7 for a rectangular HSS or a box; a square one has no lateral-torsional buckling. */
export function majorClosed(
  r: Recorder,
  steel: SteelQuantities,
  s: RectHssSection | BoxSection,
  longest: Quantity | null,
  phib: Quantity,
): MajorSection | null {
  const strengths = closedStrengths(r, 'x', steel, s);
  if (!strengths) return null;
  const { Mp, local } = strengths;
  const common = { Mp, phib, clause: 'F7', key: 'F7/x/Mn', yielding: Mp, others: local };
  if (s.square) {
    noBuckling(r, 'F7/x/LTB/none', 'A square section does not buckle laterally.', 'F7.4');
    return { ...common, ltb: null };
  }
  const { E, Fy } = steel;
  const q = { E, Fy, Ag: s.A, J: s.J, ry: s.ry, Sx: s.Sx };
  const limits = ltbLimitsF7(r, q, Mp, longest);
  return {
    ...common,
    ltb: {
      words: F7_LTB,
      limits,
      strength: (w, segment) => ltbStrengthF7(w, q, limits, Mp, segment),
    },
  };
}

/** F8: a round section does not buckle laterally. */
export function majorRound(
  r: Recorder,
  steel: SteelQuantities,
  s: RoundSection,
  phib: Quantity,
): MajorSection | null {
  const strengths = roundFlexure(r, 'x', steel, s);
  if (!strengths) return null;
  const { Mp, LB } = strengths;
  noBuckling(r, 'F8/x/LTB/none', 'A round section does not buckle laterally.', 'F8');
  return {
    Mp,
    phib,
    clause: 'F8',
    key: 'F8/x/Mn',
    yielding: Mp,
    others: LB ? [LB] : [],
    ltb: null,
  };
}

const noBuckling = (r: Recorder, key: string, text: string, number: string): void =>
  r.notice(key, 'note', 'no-lateral-torsional-buckling', text, {
    title: 'Lateral-torsional buckling',
    clause: clause(number),
  });
