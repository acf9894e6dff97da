import type { MutantKind } from './switchboard.ts';

/** A comparison in plain code of a file. */
const compared = (file: string, sides: string): RegExp => new RegExp(`/${file}\\.ts: ${sides} is `);

export interface Equivalent {
  /** Reads the ids of the mutants. */
  readonly mutants: RegExp;
  /** `relation at its limit` where none is said. */
  readonly kinds?: readonly MutantKind[];
  readonly reason: string;
}

/** Mutants that compute the same as the book; most are of relations whose both sides meet at the limit. */
export const EQUIVALENT: readonly Equivalent[] = [
  {
    mutants: /\/find-extremes\.ts:\d+ /,
    reason:
      'Shear of zero at the end of a stretch, or where it turns: no moment passes that of the end.',
  },
  {
    mutants: compared('find-extremes', 'Vi\\.value >=? 0'),
    reason: 'Shear of zero at the start of a stretch: neither a crest nor a trough lies inside.',
  },
  {
    mutants: /\/bay-result\.ts:\d+ /,
    reason: 'An extreme at the very end of a part is the moment there, which counts anyway.',
  },
  {
    mutants: compared('bay-result', 'z\\.value [<>] (from|to)\\.value'),
    reason: 'A node at the very end of a part has the moment there, which counts anyway.',
  },
  {
    mutants: compared('(loaded-bay|deflection)', 'z\\.value <=? stretch\\.to\\.value'),
    reason: 'At the end of a stretch its own lines and those of the next one give the same.',
  },
  {
    mutants: compared('(stretches|plane-actions)', '(from|l\\.\\w+)\\.value [<>] [\\w.]+'),
    reason: 'Places that are the same are asked for beside, to a part in 10⁹ of the length.',
  },
  {
    mutants: compared('(stretches|deflection|bay-result)', '(load\\.\\w+|z)\\.value [<>]=? .+'),
    reason: 'It refuses what no caller gives: a place outside its bay, a load without length.',
  },
  {
    mutants: /\/end-moments\.ts:\d+ >= is /,
    reason: 'Of two end moments of one size either is the larger one.',
  },
  {
    mutants: compared('loaded-bay', 'MA\\.value >= MB\\.value'),
    reason: 'Of two end moments of one size either is the larger one.',
  },
  {
    mutants: /\/second-order\.ts:\d+ > is /,
    reason: 'At kL = arccos ψ the crest lies at the end with the larger moment: both give it.',
  },
  {
    mutants: compared('second-order-bay', 'solution\\.kL\\.value >= Math\\.PI'),
    reason: 'A bay cut at its middle, or not, has the same moments.',
  },
  {
    mutants: compared('second-order-bay', 'crest\\.M\\.value [<>] 0'),
    reason: 'The largest moment of a bay with end moments is never zero.',
  },
  {
    mutants: compared('(second-order-bay|bow|end-springs)', 'Pr\\.value (>|<=) 0'),
    reason: 'Without axial force the bay is one of first order, or its share of the load is zero.',
  },
  {
    mutants: compared('f[2457]', 'longest\\.value <= Lp\\.value'),
    reason: 'At Lb = Lp another limit is written, which nothing uses: yielding governs.',
  },
  {
    mutants: compared('h1-single-axis', 'inPlane\\.ratio\\.value < .+'),
    reason: 'It chooses what a comparison for information compares; of two that are equal, either.',
  },
  {
    mutants: compared('check-segments', 'M[xy]\\.value > 0'),
    reason: 'A moment of zero adds nothing to the interaction.',
  },
  {
    mutants: /\/axes-in-order\.ts:\d+ > is /,
    reason: 'The line is written only where the axes differ in stiffness.',
  },
  {
    mutants: /\/plates-mono-i\.ts:\d+ > is /,
    reason:
      'A flange of half the area has the plastic neutral axis at its inner face: both give it.',
  },
  {
    mutants: /\/alignment-chart\.ts:\d+ (> is |right 0\.000001 )/,
    kinds: ['relation at its limit', 'limit in a condition ±1 %'],
    reason: 'G of 1e-6 as a number or as a rigid end: the factors differ by less than 1e-6.',
  },
  {
    mutants: compared('find-extremes', 'gi\\.value [<>] 0'),
    kinds: ['relation at its limit', 'relation reversed'],
    reason: 'It chooses between two forms of one expression, of which one does not cancel.',
  },
];
