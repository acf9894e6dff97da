import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { isSlender, slenderLimit } from '../standards/aisc360-22/b4-compression.ts';
import { c2Formulas } from '../standards/aisc360-22/c2.ts';
import {
  availableCompression,
  e3Formulas,
  elasticFlexuralStress,
  nominalStress,
  slendernessNote,
} from '../standards/aisc360-22/e3.ts';
import { e4Formulas } from '../standards/aisc360-22/e4.ts';
import type { OffsetRestraint } from '../standards/aisc360-22/e4-constrained.ts';
import { e7Formulas, effectiveArea, slenderElements } from '../standards/aisc360-22/e7.ts';
import { roundEffectiveArea, roundWithinRules } from '../standards/aisc360-22/e7-round.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { compressedElements } from './compressed-elements.ts';
import type { SectionQuantities, SteelQuantities } from './section-quantities.ts';
import { torsionalStress } from './torsional-buckling.ts';

type Steel = Pick<SteelQuantities, 'E' | 'G' | 'Fy'>;

/** Buckling lengths, and the restraint that is offset from the shear centre where there is one. */
export interface CompressionLengths {
  readonly Lcx: Quantity;
  readonly Lcy: Quantity;
  /** Between points held against twist. */
  readonly Lcz: Quantity;
  readonly offset: OffsetRestraint | null;
}

/** Compressive strength of the member, with what the stability clauses need of it. */
export interface CompressionStrength {
  readonly Pc: Quantity;
  readonly Pn: Quantity;
  /** null where the method of analysis does not use it. */
  readonly Pns: Quantity | null;
  /** A stress of E4 governs. */
  readonly torsional: boolean;
  readonly slender: boolean;
}

/** The effective area at a stress, its lines under a key; null where no element is slender. */
type AreaAt = (key: 'E7' | 'C2', Fn: Quantity, symbol?: string) => Quantity;
interface LocalBuckling {
  readonly slender: boolean;
  /** Writes what does not depend on the stress. */
  readonly area: () => AreaAt;
}

/**
 * Chapter E of ANSI/AISC 360-22: E3, E4 where it applies, E7 where an element is slender; and Pns
 * of C2.3 where it is used. Pc = φc Pn or Pn/Ωc, compression positive. null after an outside-scope
 * notice: then the member has no compressive strength, which is not the same as no compression.
 */
export function compressionStrength(
  r: Recorder,
  design: 'LRFD' | 'ASD',
  steel: Steel,
  s: SectionQuantities,
  q: CompressionLengths,
  constant: Quantity,
  usesPns: boolean,
): CompressionStrength | null {
  const { E, Fy } = steel;
  r.section('B4/compression', 'Width-to-thickness ratios, compression', clause('B4.1'));
  const local = localBuckling(r, steel, s);
  if (!local) return null;

  r.section('E3', 'Compression, elastic buckling stress', clause('E3'));
  const x = elasticFlexuralStress(r, 'x', E, q.Lcx, s.rx);
  const y = elasticFlexuralStress(r, 'y', E, q.Lcy, s.ry);
  slendernessNote(r, [x.slenderness, y.slenderness]);
  const z = torsionalStress(r, steel, s, { ...q, Fex: x.stress, Fey: y.stress });
  if (z === 'outside') return null;
  const Fe = r.governing('E3/Fe', 'min', [x.stress, y.stress, ...(z ? [z] : [])], {
    title: 'Elastic buckling stress',
    symbol: 'Fe',
    clause: clause(z ? 'E4' : 'E3'),
  });

  r.section('E3/strength', 'Compressive strength', clause('E3'));
  const Fn = nominalStress(r, Fy, Fe);
  const torsional = z !== null && Fe.value < Math.min(x.stress.value, y.stress.value);
  const area = local.slender ? local.area() : null;
  const Pn = area
    ? r.formula(e7Formulas.strength, 'E7/Pn', { Fn, Ae: area('E7', Fn) })
    : r.formula(torsional ? e4Formulas.strength : e3Formulas.strength, 'E3/Pn', { Fn, Ag: s.A });
  const Pc = availableCompression(r, design, constant, Pn);
  const Pns = usesPns ? crossSectionStrength(r, Fy, s.A, area) : null;
  return { Pc, Pn, Pns, torsional, slender: local.slender };
}

/** B4.1: whether an element is slender; null where the standard has no rule for it. */
function localBuckling(r: Recorder, steel: Steel, s: SectionQuantities): LocalBuckling | null {
  const { E, Fy } = steel;
  const Ag = s.A;
  if (s.kind === 'round') {
    const { lambdad } = s;
    const lambdar = slenderLimit(r, 'roundWall', 'wall', { E, Fy });
    const slender = isSlender(r, 'roundWall', 'wall', 'wall', lambdad, lambdar);
    if (slender && !roundWithinRules(r, steel, lambdad)) return null;
    return {
      slender,
      area: () => {
        const Ae = roundEffectiveArea(r, steel, lambdad, Ag);
        return () => Ae;
      },
    };
  }
  const elements = compressedElements(r, { E, Fy }, s);
  return {
    slender: elements.some((e) => e.slender),
    area: () => {
      const slender = slenderElements(r, Fy, elements);
      return (key, Fn, symbol) => effectiveArea(r, key, Fy, Ag, slender, Fn, symbol);
    },
  };
}

/** Pns of C2.3: Fy Ag, or Fy Ae at Fn = Fy where an element is slender. */
function crossSectionStrength(
  r: Recorder,
  Fy: Quantity,
  Ag: Quantity,
  area: AreaAt | null,
): Quantity {
  r.section('C2', 'Cross-section strength for stability', clause('C2.3'));
  if (!area) return r.formula(c2Formulas.crossSection, 'C2/Pns', { Fy, Ag });
  return r.formula(c2Formulas.crossSectionSlender, 'C2/Pns', { Fy, Ae: area('C2', Fy, 'AeFy') });
}

/**
 * Available strength for flexural buckling about one axis alone, as H1.3 uses it: E3 for a section
 * without slender elements. Its keys stand under `at`: `H1.3/x` writes `H1.3/x/E3/Fe`.
 */
export function axisStrength(
  r: Recorder,
  at: string,
  design: 'LRFD' | 'ASD',
  steel: Pick<SteelQuantities, 'E' | 'Fy'>,
  s: Pick<SectionQuantities, 'rx' | 'ry' | 'A'>,
  axis: 'x' | 'y',
  Lc: Quantity,
  constant: Quantity,
): Quantity {
  const own = r.within(at);
  const { stress } = elasticFlexuralStress(own, axis, steel.E, Lc, axis === 'x' ? s.rx : s.ry);
  const Fn = nominalStress(own, steel.Fy, stress);
  const Pn = own.formula(e3Formulas.strength, 'E3/Pn', { Fn, Ag: s.A });
  return availableCompression(own, design, constant, Pn, {
    title: `Available strength, flexural buckling about the ${axis === 'x' ? 'major' : 'minor'} axis`,
    symbol: `Pc${axis}`,
  });
}
