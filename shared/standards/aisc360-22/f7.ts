import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { ClassWithLimits } from './b4-flexure.ts';
import { reductionFactor } from './f5.ts';
import { f7Formulas as f } from './f7-formulas.ts';
import type { LtbClause, LtbLimits } from './ltb-range.ts';
import { clause } from './writer.ts';

/*
 * F7 square and rectangular HSS and box sections about one axis, in that axis' own words: the flanges
 * are the walls that the bending compresses and stretches evenly, the webs the two others. Keys
 * stand under `F7/x` or `F7/y`.
 */
export interface ClosedSection {
  readonly axis: 'x' | 'y';
  readonly kind: 'rect-hss' | 'box';
  readonly E: Quantity;
  readonly Fy: Quantity;
  readonly Ag: Quantity;
  readonly I: Quantity;
  readonly S: Quantity;
  readonly Z: Quantity;
  readonly lambdaf: Quantity;
  readonly lambdaw: Quantity;
  /** null where no element is slender. */
  readonly plates: ClosedPlates | null;
}

/** Dimensions that slender elements need. */
export interface ClosedPlates {
  /** Clear width of a flange and its thickness. */
  readonly b: Quantity;
  readonly tf: Quantity;
  /** Outside depth in the plane of bending. */
  readonly d: Quantity;
  /** Clear depth of a web and its thickness; null for an HSS, whose webs are not slender here. */
  readonly web: { readonly h: Quantity; readonly tw: Quantity } | null;
}

/** Flat width of an HSS wall from its tabulated or computed slenderness. Key `${at}/b`. */
export const flatWidth = (r: Recorder, at: string, lambda: Quantity, t: Quantity): Quantity =>
  r.formula(f.flat, `${at}/b`, { lambda, t });

/** Outside width over the webs of a box, its depth in minor-axis bending. Key `${at}/d`. */
export const widthOverWebs = (r: Recorder, at: string, b: Quantity, tw: Quantity): Quantity =>
  r.formula(f.overWebs, `${at}/d`, { b, tw });

/** F7-1. */
export const plasticMomentClosed = (r: Recorder, q: ClosedSection): Quantity =>
  r.formula(
    f.plastic,
    `F7/${q.axis}/Mp`,
    { Fy: q.Fy, Z: q.Z },
    { symbol: `Mp${q.axis}`, title: 'Plastic moment' },
  );

/**
 * F7.2; null for a compact flange. A slender flange has the effective section modulus with the
 * effective width of the compression flange only: the part of the flange that buckles is taken out,
 * the neutral axis moves away from it, and Se is that of the compression face.
 */
export function flangeLocalBucklingClosed(
  r: Recorder,
  q: ClosedSection,
  Mp: Quantity,
  flange: ClassWithLimits,
): Quantity | null {
  const { Fy, S, lambdaf: lambda } = q;
  const at = `F7/${q.axis}/FLB`;
  if (flange.class === 'compact') return null;
  if (flange.class === 'noncompact')
    return r.formula(f.FLBNoncompact, `${at}/Mn`, {
      Mp,
      Fy,
      S,
      lambda,
      lambdapf: flange.lambdap,
      lambdarf: flange.lambdar,
    });
  return r.formula(f.FLBSlender, `${at}/Mn`, { Fy, Se: effectiveModulus(r, at, q) });
}

function effectiveModulus(r: Recorder, at: string, q: ClosedSection): Quantity {
  const { E, Fy, Ag, I, lambdaf: lambda } = q;
  if (!q.plates) throw new Error(`${at}: the plates are not given`);
  const { b, tf, d } = q.plates;
  const trial = r.formula(q.kind === 'box' ? f.widthBox : f.widthHss, `${at}/be/trial`, {
    tf,
    E,
    Fy,
    lambda,
  });
  const be = r.governing(`${at}/be`, 'min', [trial, b], {
    title: 'Effective width of the compression flange, not more than its width',
    symbol: 'be',
    clause: clause('F7.2', q.kind === 'box' ? 'F7-5' : 'F7-4'),
  });
  const Aout = r.formula(f.areaOut, `${at}/Aout`, { b, be, tf });
  const eout = r.formula(f.leverOut, `${at}/eout`, { d, tf });
  const yshift = r.formula(f.shift, `${at}/shift`, { Aout, eout, Ag });
  const Ieff = r.formula(f.inertia, `${at}/Ieff`, { I, Aout, eout, tf, Ag, yshift });
  return r.formula(f.modulus, `${at}/Se`, { Ieff, d, yshift });
}

/**
 * F7.3; null for compact webs. Slender webs: F7-7, for boxes with compact or noncompact flanges
 * only, which the caller has to make sure of.
 */
export function webLocalBucklingClosed(
  r: Recorder,
  q: ClosedSection,
  Mp: Quantity,
  web: ClassWithLimits,
): Quantity | null {
  const { E, Fy, S, lambdaw: lambda } = q;
  const at = `F7/${q.axis}/WLB`;
  if (web.class === 'compact') return null;
  if (web.class === 'noncompact')
    return r.formula(f.WLBNoncompact, `${at}/Mn`, {
      Mp,
      Fy,
      S,
      lambda,
      lambdapw: web.lambdap,
      lambdarw: web.lambdar,
    });
  if (!q.plates?.web) throw new Error(`${at}: the plates are not given`);
  const { b, tf } = q.plates;
  const { h, tw } = q.plates.web;
  const aw = r.formula(f.aw, `${at}/aw`, { h, tw, b, tf });
  const Rpg = reductionFactor(r, at, { aw, lambda, E, Fy });
  return r.formula(f.WLBSlender, `${at}/Mn`, { Rpg, Fy, S });
}

export const F7_LTB: LtbClause = {
  at: 'F7/x',
  clause: 'F7.4',
  limit: 'F7-12',
  inelastic: 'F7-10',
  elastic: 'F7-11',
};

export interface ClosedLtb {
  readonly E: Quantity;
  readonly Fy: Quantity;
  readonly Ag: Quantity;
  readonly J: Quantity;
  readonly ry: Quantity;
  readonly Sx: Quantity;
}

/** F7-12 and F7-13 for a member whose longest unbraced length is `longest`, as in F2.2. */
export function ltbLimitsF7(
  r: Recorder,
  q: ClosedLtb,
  Mp: Quantity,
  longest: Quantity | null,
): LtbLimits {
  if (!longest || longest.value === 0) return { Lp: null, Lr: null };
  const { E, Fy, Ag, J, ry, Sx } = q;
  const Lp = r.formula(f.Lp, 'F7/x/Lp', { E, ry, J, Ag, Mp });
  const Lr =
    longest.value <= Lp.value ? null : r.formula(f.Lr, 'F7/x/Lr', { E, ry, J, Ag, Fy, Sx });
  return { Lp, Lr };
}

/** F7-10 or F7-11, not more than Mp. Throws where the limits of the range were not written. */
export function ltbStrengthF7(
  r: Recorder,
  q: ClosedLtb,
  limits: LtbLimits,
  Mp: Quantity,
  segment: {
    readonly range: 'inelastic' | 'elastic';
    readonly Lb: Quantity;
    readonly Cb: Quantity;
  },
): Quantity {
  const { Lp, Lr } = limits;
  if (!Lp || !Lr) throw new Error('F7.4: a limit is not written');
  const { E, Fy, Ag, J, ry, Sx } = q;
  const { Lb, Cb } = segment;
  const trial =
    segment.range === 'inelastic'
      ? r.formula(f.inelastic, 'F7/x/LTB/trial', { Cb, Mp, Fy, Sx, Lb, Lp, Lr })
      : r.formula(f.elastic, 'F7/x/LTB/trial', { E, Cb, J, Ag, Lb, ry });
  return r.governing('F7/x/LTB/Mn', 'min', [trial, Mp], {
    title: 'Lateral-torsional buckling strength, not more than the plastic moment',
    symbol: 'MnLTB',
    clause: clause('F7.4'),
  });
}
