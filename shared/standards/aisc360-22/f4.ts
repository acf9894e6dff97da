import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { ClassWithLimits } from './b4-flexure.ts';
import { coefficientKc } from './b4-kc.ts';
import { f4Formulas as f } from './f4-formulas.ts';
import type { LtbClause, LtbLimits } from './ltb-range.ts';
import { clause } from './writer.ts';

/*
 * F4: other I-shapes with compact or noncompact webs, major axis. Subscript c is the flange in
 * compression, t the one in tension.
 */
export interface FlangedSection {
  readonly E: Quantity;
  readonly Fy: Quantity;
  readonly Zx: Quantity;
  /** The smaller of Sxc and Sxt. */
  readonly Sx: Quantity;
  readonly Sxc: Quantity;
  readonly Sxt: Quantity;
  readonly bfc: Quantity;
  readonly tfc: Quantity;
  readonly tw: Quantity;
  readonly hc: Quantity;
  readonly J: Quantity;
  readonly ho: Quantity;
  /** Width-to-thickness ratio of the compression flange. */
  readonly lambdaf: Quantity;
  /** hc/tw. */
  readonly lambdahc: Quantity;
  /** h/tw. */
  readonly lambdaw: Quantity;
  /** Iyc/Iy; null for a doubly symmetric shape, where it is one half. */
  readonly IycIy: Quantity | null;
}

/** FL of F4-6a for a doubly symmetric shape or a slender web. Key `${at}/FL`. */
export const stressFLFull = (r: Recorder, at: string, Fy: Quantity): Quantity =>
  r.formula(f.FLFull, `${at}/FL`, { Fy });

/** FL of F4-6 by Sxt/Sxc, for a compact or noncompact web. Keys under `at`. */
export function stressFL(
  r: Recorder,
  at: string,
  q: { readonly Fy: Quantity; readonly Sxc: Quantity; readonly Sxt: Quantity },
): Quantity {
  const { Fy, Sxc, Sxt } = q;
  const ratio = r.formula(f.SxtSxc, `${at}/SxtSxc`, { Sxt, Sxc });
  const full = r.choice(
    `${at}/FL/case`,
    [{ left: ratio, relation: '>=', right: 0.7, outcome: 'F4-6a gives FL' }],
    'F4-6b gives FL',
    { title: 'Stress at which the compression flange buckles elastically', clause: clause('F4.2') },
  );
  if (full === 0) return stressFLFull(r, at, Fy);
  const trial = r.formula(f.FLPart, `${at}/FL/trial`, { Fy, Sxt, Sxc });
  const least = r.formula(f.FLLeast, `${at}/FL/least`, { Fy });
  return r.governing(`${at}/FL`, 'max', [trial, least], {
    title: 'Stress FL, not less than half of the yield stress',
    symbol: 'FL',
    clause: clause('F4.2', 'F4-6b'),
  });
}

/** aw (F4-12) and rt (F4-11), which F5 takes too. Keys under `at`. */
export function compressionFlangeRadius(
  r: Recorder,
  at: string,
  q: Pick<FlangedSection, 'hc' | 'tw' | 'bfc' | 'tfc'>,
): { readonly aw: Quantity; readonly rt: Quantity } {
  const { hc, tw, bfc, tfc } = q;
  const aw = r.formula(f.aw, `${at}/aw`, { hc, tw, bfc, tfc });
  return { aw, rt: r.formula(f.rt, `${at}/rt`, { bfc, aw }) };
}

/** F4-7, which F5 takes too. */
export const yieldingLimit = (
  r: Recorder,
  at: string,
  q: { readonly rt: Quantity; readonly E: Quantity; readonly Fy: Quantity },
): Quantity => r.formula(f.Lp, `${at}/Lp`, { rt: q.rt, E: q.E, Fy: q.Fy });

export const F4_LTB: LtbClause = {
  at: 'F4',
  clause: 'F4.2',
  limit: 'F4-7',
  inelastic: 'F4-2',
  elastic: 'F4-3',
};

export interface F4Yielding {
  readonly Mp: Quantity;
  readonly Myc: Quantity;
  readonly Rpc: Quantity;
  /** Compression flange yielding, F4-1. */
  readonly CFY: Quantity;
  /** Tension flange yielding, F4-15; null where Sxt is not below Sxc. */
  readonly TFY: Quantity | null;
  /** Iyc/Iy is at most 0.23, so that J counts as zero. */
  readonly withoutJ: boolean;
}

/** F4.1 and F4.4: Mp, web plastification factors, yielding of either flange. */
export function flangeYieldingF4(r: Recorder, q: FlangedSection, web: ClassWithLimits): F4Yielding {
  const { Fy, Zx, Sx, Sxc, Sxt, IycIy, lambdahc } = q;
  const plastic = r.formula(f.plastic, 'F4/FyZx', { Fy, Zx });
  const cap = r.formula(f.cap, 'F4/cap', { Fy, Sx });
  const Mp = r.governing('F4/Mp', 'min', [plastic, cap], {
    title: 'Plastic moment about the major axis',
    symbol: 'Mpx',
    clause: clause('F4.1'),
  });
  const Myc = r.formula(f.Myc, 'F4/Myc', { Fy, Sxc });
  const taken = r.choice(
    'F4/web/case',
    [
      ...(IycIy
        ? [
            {
              left: IycIy,
              relation: '<=',
              right: 0.23,
              outcome: 'the web plastification factor is 1 and J counts as zero',
            } as const,
          ]
        : []),
      {
        left: lambdahc,
        relation: '<=',
        right: web.lambdap,
        outcome: 'the web plastification factor is Mp over the yield moment',
      },
    ],
    'the web plastification factor lies between Mp over the yield moment and 1',
    { title: 'Web plastification factor', clause: clause('F4.1') },
  );
  const withoutJ = IycIy !== null && taken === 0;
  const limits = { lambda: lambdahc, lambdapw: web.lambdap, lambdarw: web.lambdar };
  const factor = (name: 'Rpc' | 'Rpt', My: Record<string, Quantity>, e: typeof f.Rpc): Quantity => {
    if (withoutJ) return r.formula(e.one, `F4/${name}`, {});
    if (taken >= 0) return r.formula(e.full, `F4/${name}`, { Mp, ...My });
    const full = r.formula(e.full, `F4/${name}/full`, { Mp, ...My }, { symbol: e.fullSymbol });
    const trial = r.formula(e.part, `F4/${name}/trial`, { Mp, ...My, ...limits });
    return r.governing(`F4/${name}`, 'min', [trial, full], {
      title: 'Web plastification factor, not more than Mp over the yield moment',
      symbol: name,
      clause: clause(e.part.clause, e.part.equation),
    });
  };
  const Rpc = factor('Rpc', { Myc }, f.Rpc);
  const CFY = r.formula(f.CFY, 'F4/CFY/Mn', { Rpc, Myc });
  return { Mp, Myc, Rpc, CFY, TFY: tension(), withoutJ };

  function tension(): Quantity | null {
    if (IycIy === null) return null;
    const applies = r.choice(
      'F4/TFY/applies',
      [{ left: Sxt, relation: '<', right: Sxc, outcome: 'tension flange yielding is checked' }],
      'tension flange yielding does not apply',
      { title: 'Tension flange yielding', clause: clause('F4.4') },
    );
    if (applies < 0) return null;
    const Myt = r.formula(f.Myt, 'F4/Myt', { Fy, Sxt });
    const Rpt = factor('Rpt', { Myt }, f.Rpt);
    return r.formula(f.TFY, 'F4/TFY/Mn', { Rpt, Myt });
  }
}

export interface F4Limits extends LtbLimits {
  readonly rt: Quantity | null;
}

/** F4-7, F4-8, F4-11 for a member whose longest unbraced length is `longest`, as in F2.2. */
export function ltbLimitsF4(
  r: Recorder,
  q: FlangedSection,
  FL: Quantity,
  withoutJ: boolean,
  longest: Quantity | null,
): F4Limits {
  if (!longest || longest.value === 0) return { rt: null, Lp: null, Lr: null };
  const { E, Fy, J, Sxc, ho } = q;
  const { rt } = compressionFlangeRadius(r, 'F4', q);
  const Lp = yieldingLimit(r, 'F4', { rt, E, Fy });
  if (longest.value <= Lp.value) return { rt, Lp, Lr: null };
  const Lr = withoutJ
    ? r.formula(f.LrWithoutJ, 'F4/Lr', { rt, E, FL })
    : r.formula(f.Lr, 'F4/Lr', { rt, E, FL, J, Sxc, ho });
  return { rt, Lp, Lr };
}

/** F4-2 or F4-3, not more than Rpc Myc. Throws where the limits of the range were not written. */
export function ltbStrengthF4(
  r: Recorder,
  q: FlangedSection,
  FL: Quantity,
  limits: F4Limits,
  yielding: F4Yielding,
  segment: {
    readonly range: 'inelastic' | 'elastic';
    readonly Lb: Quantity;
    readonly Cb: Quantity;
  },
): Quantity {
  const { rt, Lp, Lr } = limits;
  if (!rt || !Lp || !Lr) throw new Error('F4.2: a limit is not written');
  const { E, Sxc, J, ho } = q;
  const { Rpc, Myc, CFY } = yielding;
  const { Lb, Cb } = segment;
  const stress = () =>
    yielding.withoutJ
      ? r.formula(f.criticalStressWithoutJ, 'F4/LTB/Fcr', { Cb, E, Lb, rt })
      : r.formula(f.criticalStress, 'F4/LTB/Fcr', { Cb, E, Lb, rt, J, Sxc, ho });
  const trial =
    segment.range === 'inelastic'
      ? r.formula(f.inelastic, 'F4/LTB/trial', { Cb, Rpc, Myc, FL, Sxc, Lb, Lp, Lr })
      : r.formula(f.elastic, 'F4/LTB/trial', { Fcr: stress(), Sxc });
  return r.governing('F4/LTB/Mn', 'min', [trial, CFY], {
    title: 'Lateral-torsional buckling strength, not more than compression flange yielding',
    symbol: 'MnLTB',
    clause: clause('F4.2'),
  });
}

/** F4.3; null for a compact flange. `kc` where the flange's class has written it already. */
export function flangeLocalBucklingF4(
  r: Recorder,
  q: FlangedSection,
  FL: Quantity,
  kc: Quantity | null,
  yielding: F4Yielding,
  flange: ClassWithLimits,
): Quantity | null {
  const { E, Sxc, lambdaf: lambda } = q;
  const { Rpc, Myc } = yielding;
  if (flange.class === 'compact') return null;
  return flange.class === 'noncompact'
    ? r.formula(f.FLBNoncompact, 'F4/FLB/Mn', {
        Rpc,
        Myc,
        FL,
        Sxc,
        lambda,
        lambdapf: flange.lambdap,
        lambdarf: flange.lambdar,
      })
    : r.formula(f.FLBSlender, 'F4/FLB/Mn', {
        E,
        kc: kc ?? coefficientKc(r, 'F4', q.lambdaw),
        Sxc,
        lambda,
      });
}
