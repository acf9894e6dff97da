const at = (file: string, from: string, to: string): RegExp =>
  new RegExp(`/${file.replaceAll('.', '\\.')}: ${from} is ${to}$`);

/**
 * Mutants that compute the same as the book, with the reason; the pattern reads their ids. But for the
 * last two groups each is of a relation at its limit, where both sides say the same.
 */
export const EQUIVALENT: readonly { readonly mutants: RegExp; readonly reason: string }[] = [
  {
    mutants: /\/find-extremes\.ts:\d+ (<= is <|>= is >)$/,
    reason:
      'Shear of zero at the end of a stretch, or where it turns: no moment passes that of the end.',
  },
  {
    mutants: at('find-extremes.ts', 'Vi\\.value >=? 0', '>=?'),
    reason: 'Shear of zero at the start of a stretch: neither a crest nor a trough lies inside.',
  },
  {
    mutants: /\/bay-result\.ts:\d+ (<= is <|>= is >)$/,
    reason: 'An extreme at the very end of a part is the moment there, which counts anyway.',
  },
  {
    mutants: at('bay-result.ts', 'z\\.value (?<way>[<>]) (from|to)\\.value', '\\k<way>='),
    reason: 'A node at the very end of a part has the moment there, which counts anyway.',
  },
  {
    mutants: at('(loaded-bay|deflection).ts', 'z\\.value <=? stretch\\.to\\.value', '<=?'),
    reason: 'At the end of a stretch its own lines and those of the next one give the same.',
  },
  {
    mutants: at(
      '(stretches|plane-actions).ts',
      '(from|l\\.\\w+)\\.value (?<way>[<>]) [\\w.]+',
      '\\k<way>=',
    ),
    reason: 'Places that are the same are asked for beside, to a part in 10⁹ of the length.',
  },
  {
    mutants: at(
      '(stretches|deflection|bay-result).ts',
      '(load\\.\\w+|z)\\.value [<>]=? .+',
      '[<>]=?',
    ),
    reason: 'It refuses what no caller gives: a place outside its bay, a load without length.',
  },
  {
    mutants: /\/end-moments\.ts:\d+ >= is >$/,
    reason: 'Of two end moments of one size either is the larger one.',
  },
  {
    mutants: at('loaded-bay.ts', 'MA\\.value >= MB\\.value', '>'),
    reason: 'Of two end moments of one size either is the larger one.',
  },
  {
    mutants: /\/second-order\.ts:\d+ > is >=$/,
    reason: 'At kL = arccos ψ the crest lies at the end with the larger moment: both give it.',
  },
  {
    mutants: at('second-order-bay.ts', 'solution\\.kL\\.value >= Math\\.PI', '>'),
    reason: 'A bay cut at its middle, or not, has the same moments.',
  },
  {
    mutants: at('second-order-bay.ts', 'crest\\.M\\.value (?<way>[<>]) 0', '\\k<way>='),
    reason: 'The largest moment of a bay with end moments is never zero.',
  },
  {
    mutants: at('(second-order-bay|bow|end-springs).ts', 'Pr\\.value (>|<=) 0', '(>=|<)'),
    reason: 'Without axial force the bay is one of first order, or its share of the load is zero.',
  },
  {
    mutants: at('f[2457].ts', 'longest\\.value <= Lp\\.value', '<'),
    reason: 'At Lb = Lp another limit is written, which nothing uses: yielding governs.',
  },
  {
    mutants: at(
      'h1-single-axis.ts',
      '(inPlane|ordinary)\\.ratio\\.value (?<way>[<>]) .+',
      '\\k<way>=',
    ),
    reason: 'It chooses what a comparison for information compares; of two that are equal, either.',
  },
  {
    mutants: at('check-segments.ts', 'M[xy]\\.value > 0', '>='),
    reason: 'A moment of zero adds nothing to the interaction.',
  },
  {
    mutants: /\/axes-in-order\.ts:\d+ > is >=$/,
    reason: 'The line is written only where the axes differ in stiffness.',
  },
  {
    mutants: /\/plates-mono-i\.ts:\d+ > is >=$/,
    reason:
      'A flange of half the area has the plastic neutral axis at its inner face: both give it.',
  },
  {
    mutants: /\/alignment-chart\.ts:\d+ (> is >=|right 0\.000001 times \S+)$/,
    reason: 'G of 1e-6 as a number or as a rigid end: the factors differ by less than 1e-6.',
  },
  {
    mutants: at('find-extremes.ts', 'gi\\.value [<>] 0', '[<>]=?'),
    reason: 'It chooses between two forms of one expression, of which one does not cancel.',
  },
];
