import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { type CompressionClass, compressionClass } from '../standards/aisc360-22/b4.ts';
import { c2Formulas } from '../standards/aisc360-22/c2.ts';
import {
  availableCompression,
  e3Formulas,
  elasticFlexuralStress,
  nominalStress,
  slendernessNote,
} from '../standards/aisc360-22/e3.ts';
import { e4Formulas, elasticTorsionalStress } from '../standards/aisc360-22/e4.ts';
import {
  e7Formulas,
  effectiveArea,
  type SlenderElements,
  type SlenderWidths,
  slenderWidths,
} from '../standards/aisc360-22/e7.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type { MemberQuantities, SectionQuantities, SteelQuantities } from './member-lines.ts';

/** Compressive strength of the member, with what the stability clauses need of it. */
export interface CompressionStrength {
  readonly Pc: Quantity;
  /** null where the method of analysis does not use it. */
  readonly Pns: Quantity | null;
  readonly torsional: boolean;
  readonly slender: boolean;
}

/** Chapter E: E3, E4 where Lcz exceeds Lcy, E7 where an element is slender; and Pns of C2.3 where it is used. */
export function compressionStrength(
  r: Recorder,
  design: 'LRFD' | 'ASD',
  steel: SteelQuantities,
  s: SectionQuantities,
  q: MemberQuantities & { Lcx: Quantity; Lcy: Quantity; Lcz: Quantity },
  constant: Quantity,
  usesPns: boolean,
): CompressionStrength {
  const { E, G, Fy } = steel;
  r.section('B4/compression', 'Width-to-thickness ratios, compression', clause('B4.1'));
  const cls = compressionClass(r, { E, Fy }, s.lambdaf, s.lambdaw);
  const elements: SlenderElements = elementsOf(cls, Fy, s);

  r.section('E3', 'Compression, elastic buckling stress', clause('E3'));
  const x = elasticFlexuralStress(r, 'x', E, q.Lcx, s.rx);
  const y = elasticFlexuralStress(r, 'y', E, q.Lcy, s.ry);
  slendernessNote(r, [x.slenderness, y.slenderness]);
  const z = elasticTorsionalStress(r, {
    E,
    G,
    Cw: s.Cw,
    J: s.J,
    Ix: s.Ix,
    Iy: s.Iy,
    Lcy: q.Lcy,
    Lcz: q.Lcz,
  });
  const candidates = [x.stress, y.stress, ...(z ? [z] : [])];
  const Fe = r.governing('E3/Fe', 'min', candidates, {
    title: 'Elastic buckling stress',
    symbol: 'Fe',
    clause: clause(z ? 'E4' : 'E3'),
  });

  r.section('E3/strength', 'Compressive strength', clause('E3'));
  const Fn = nominalStress(r, Fy, Fe);
  const torsional = z !== null && Fe.value < Math.min(x.stress.value, y.stress.value);
  const slender = cls.flangeSlender || cls.webSlender;
  const widths = slenderWidths(r, elements);
  const Ag = s.A;
  const Pn = slender
    ? r.formula(e7Formulas.strength, 'E7/Pn', {
        Fn,
        Ae: effectiveArea(r, 'E7', elements, widths, Fn),
      })
    : r.formula(torsional ? e4Formulas.strength : e3Formulas.strength, 'E3/Pn', { Fn, Ag });
  const Pc = availableCompression(r, design, constant, Pn);

  const Pns = usesPns ? crossSectionStrength(r, Fy, elements, slender ? widths : null) : null;
  return {
    Pc,
    Pns,
    torsional,
    slender,
  };
}

/** Pns of C2.3: Fy Ag, or Fy Ae at Fn = Fy where an element is slender. */
function crossSectionStrength(
  r: Recorder,
  Fy: Quantity,
  elements: SlenderElements,
  widths: SlenderWidths | null,
): Quantity {
  r.section('C2', 'Cross-section strength for stability', clause('C2.3'));
  if (!widths) return r.formula(c2Formulas.crossSection, 'C2/Pns', { Fy, Ag: elements.Ag });
  const Ae = effectiveArea(r, 'C2', elements, widths, Fy, 'AeFy');
  return r.formula(c2Formulas.crossSectionSlender, 'C2/Pns', { Fy, Ae });
}

const elementsOf = (
  cls: CompressionClass,
  Fy: Quantity,
  s: SectionQuantities,
): SlenderElements => ({
  Fy,
  Ag: s.A,
  web: { slender: cls.webSlender, lambda: s.lambdaw, lambdar: cls.lambdarw, tw: s.tw },
  flange: {
    slender: cls.flangeSlender,
    lambda: s.lambdaf,
    lambdar: cls.lambdarf,
    bf: s.bf,
    tf: s.tf,
  },
});
