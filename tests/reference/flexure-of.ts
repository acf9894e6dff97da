import { closeLines } from '#shared/calc/closure.ts';
import { closureProblems } from '#shared/calc/closure-problems.ts';
import type { Line } from '#shared/calc/line.ts';
import { createRecorder, type Recorder } from '#shared/calc/recorder.ts';
import {
  availableMajor,
  ltbRange,
  type MajorSection,
  majorSection,
} from '#shared/members/major-flexure.ts';
import { minorStrength } from '#shared/members/minor-flexure.ts';
import type { SectionQuantities } from '#shared/members/section-quantities.ts';
import { modificationFactor } from '#shared/standards/aisc360-22/f1.ts';
import { methodConstant } from '#shared/standards/aisc360-22/parameters.ts';
import { UNIT_SETS } from '#shared/units/unit-set.ts';
import { quantities, quantity, steelOf, type Texts } from './given-texts.ts';
import { inUnit } from './in-unit.ts';

/** One flange of a singly symmetric I-shape. */
type FlangeTexts = Record<'b' | 't' | 'lambda' | 'Iyf' | 'S' | 'hc' | 'hp', string>;

export interface FlexureCase {
  /** Yield stress; E is 29 000 ksi. */
  readonly Fy: string;
  /** Kind, made, square, and the quantities that the steps use. */
  readonly section: Texts;
  readonly flanges?: { readonly top: FlangeTexts; readonly bottom: FlangeTexts };
  readonly compressed?: 'top' | 'bottom';
  readonly Lb: string;
  readonly Cb?: string;
  /** Moments that F1-1 takes, in place of Cb. */
  readonly quarters?: Record<'Mmax' | 'MA4' | 'MB4' | 'MC4', string>;
}

export interface Computed {
  readonly r: Recorder;
  readonly lines: readonly Line[];
  readonly section: MajorSection | null;
  /** Value of a line in a unit. */
  readonly at: (key: string, unit?: string) => number;
  /** Outcome of a choice line. */
  readonly outcome: (key: string) => string;
  readonly codes: readonly string[];
  readonly has: (key: string) => boolean;
}

/** The section of a case with its given lines. */
function sectionOf(r: Recorder, c: FlexureCase): SectionQuantities {
  const { kind, made, square, ...texts } = c.section;
  const flange = (name: 'top' | 'bottom') =>
    c.flanges && { [name]: quantities(r.within(name), c.flanges[name]) };
  return {
    ...{ kind, made, square: square === 'yes' },
    ...quantities(r, texts),
    ...flange('top'),
    ...flange('bottom'),
  } as unknown as SectionQuantities;
}

function read(r: Recorder, section: MajorSection | null): Computed {
  const line = (key: string) => r.lines.find((l) => l.key === key);
  return {
    r,
    lines: r.lines,
    section,
    at: (key, unit = '') => {
      const found = line(key);
      if (!found || !('value' in found)) throw new Error(`no value at ${key}`);
      return inUnit(found.value, unit);
    },
    outcome: (key) => {
      const found = line(key);
      if (found?.kind !== 'choice') throw new Error(`no choice at ${key}`);
      return found.outcome;
    },
    codes: r.lines.flatMap((l) => (l.kind === 'notice' ? [l.code] : [])),
    has: (key) => line(key) !== undefined,
  };
}

/** Major-axis strength of one segment, which is the member, over a case. */
export function majorOf(c: FlexureCase, design: 'LRFD' | 'ASD' = 'LRFD'): Computed {
  const r = createRecorder('');
  const steel = steelOf(r, { E: '29000 ksi', Fy: c.Fy });
  const section = sectionOf(r, c);
  const Lb = quantity(r, 'Lb', c.Lb);
  const phib = methodConstant(r, 'flexure', design);
  const m = majorSection(r, steel, section, c.compressed ?? 'top', Lb, phib);
  if (!m) return read(r, null);
  const segment = ltbRange(r, m, Lb);
  const given = c.quarters
    ? modificationFactor(r, 'F1', quantities(r, c.quarters))
    : quantity(r, 'Cb', c.Cb ?? '1.0');
  availableMajor(r, design, m, segment, segment.needsCb ? given : null);
  return read(r, m);
}

/** Minor-axis strength over a case. */
export function minorOf(c: FlexureCase, design: 'LRFD' | 'ASD' = 'LRFD'): Computed {
  const r = createRecorder('');
  const steel = steelOf(r, { E: '29000 ksi', Fy: c.Fy });
  minorStrength(r, design, steel, sectionOf(r, c), methodConstant(r, 'flexure', design));
  return read(r, null);
}

/** What does not follow, as printed in either unit set, from what is printed. */
export const closureFaults = ({ lines }: Computed): readonly string[] =>
  Object.values(UNIT_SETS).flatMap((set) => {
    const placed = (of: readonly Line[]) =>
      of.map((line) => ({ address: line.key, combination: null, line }));
    const closed = closeLines(placed(lines), set);
    return closureProblems(placed(closed), set).map((p) => `${p.address}: ${p.reason}`);
  });
