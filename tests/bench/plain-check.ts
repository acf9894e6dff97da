/** What the check of an I-shape needs, in N and mm. */
export type Properties = Readonly<Record<(typeof OF_SECTION)[number] | 'E' | 'Fy' | 'L', number>>;
export const OF_SECTION = [
  ...(['A', 'Ix', 'Iy', 'rx', 'ry', 'Sx', 'Sy'] as const),
  ...(['Zx', 'Zy', 'J', 'rts', 'ho', 'lambdaf'] as const),
];
export interface Forces {
  readonly P: number;
  readonly MxA: number;
  readonly MxB: number;
  readonly MyA: number;
  readonly MyB: number;
}

/** Strengths that no combination changes. */
function strengths(p: Properties) {
  const { E, Fy, Sx, Sy, L } = p;
  const euler = (radius: number) => (Math.PI ** 2 * E) / (L / radius) ** 2;
  const Fe = Math.min(euler(p.rx), euler(p.ry));
  const Fn = Fy / Fe <= 2.25 ? 0.658 ** (Fy / Fe) * Fy : 0.877 * Fe;
  const Mp = Fy * p.Zx;
  const q = p.J / (Sx * p.ho);
  const Lp = 1.76 * p.ry * Math.sqrt(E / Fy);
  const Lr =
    ((1.95 * p.rts * E) / (0.7 * Fy)) *
    Math.sqrt(q + Math.sqrt(q ** 2 + 6.76 * ((0.7 * Fy) / E) ** 2));
  const [lambdap, lambdar] = [0.38 * Math.sqrt(E / Fy), Math.sqrt(E / Fy)];
  const share = (p.lambdaf - lambdap) / (lambdar - lambdap);
  const local = (whole: number, S: number) =>
    share <= 0 ? whole : whole - (whole - 0.7 * Fy * S) * share;
  const MpY = Math.min(Fy * p.Zy, 1.6 * Fy * Sy);
  const slope = (Mp - 0.7 * Fy * Sx) / (Lr - Lp);
  return {
    Pc: 0.9 * Fn * p.A,
    Pns: Fy * p.A,
    Mp,
    local: local(Mp, Sx),
    sloped: Mp - slope * (L - Lp),
    Mcy: 0.9 * local(MpY, Sy),
    EIx: 0.8 * E * p.Ix,
    EIy: 0.8 * E * p.Iy,
    L,
  };
}

/** Amplified moment by Appendix 8 from end moments that are positive where they bend alike. */
function required(P: number, EI: number, L: number, A: number, B: number): number {
  const [larger, smaller] = Math.abs(A) >= Math.abs(B) ? [A, B] : [B, A];
  const Cm = 0.6 + (0.4 * smaller) / larger;
  const Pe1 = (Math.PI ** 2 * EI) / L ** 2;
  return Math.max(1, Cm / (1 - P / Pe1)) * Math.abs(larger);
}

/**
 * Interaction ratios of a W shape by E3, F2 or F3, F6, Appendix 8 and H1 by LRFD, as a plain
 * function without lines; only for the branches that the measured member takes.
 */
export function plainRatios(properties: Properties, forces: readonly Forces[]): number[] {
  const s = strengths(properties);
  return forces.map(({ P, MxA, MxB, MyA, MyB }) => {
    const taub = P / s.Pns <= 0.5 ? 1 : (4 * P * (1 - P / s.Pns)) / s.Pns;
    const Mrx = required(P, taub * s.EIx, s.L, MxA, MxB);
    const Mry = required(P, taub * s.EIy, s.L, MyA, MyB);
    const moment = (z: number) => Math.abs((1 - z) * MxA + z * MxB);
    const Mmax = Math.max(Math.abs(MxA), Math.abs(MxB));
    const Cb = (12.5 * Mmax) / (2.5 * Mmax + 3 * moment(0.25) + 4 * moment(0.5) + 3 * moment(0.75));
    const Mcx = 0.9 * Math.min(s.Mp, Cb * s.sloped, s.local);
    const axial = P / s.Pc;
    const bending = Mrx / Mcx + Mry / s.Mcy;
    return axial >= 0.2 ? axial + (8 / 9) * bending : axial / 2 + bending;
  });
}
