import type { CombinationInput } from './input.ts';

// A factor on D or L that only the other design method's combinations have (ASCE/SEI 7-22, 2.3, 2.4).
const LRFD_NAME = /(?:^|[^\d.])1\.(?:2|4)\s*\(?D|(?:^|[^\d.])1\.6\s*\(?(?:L|S|R)/i;

// Unfactored loads alone, or a factor that only ASD has: 0.6D, 0.75L, 0.6W, 0.7E.
const ASD_NAME =
  /^\s*D\s*\+\s*(?:L|Lr|S|R)\s*$|(?:^|[^\d.])0\.(?:6\s*\(?[DW]|75\s*(?:\(|L|S|R)|7\s*\(?E)/i;

/** Forces of the other load level in a calculation are an error, not a caution. */
export function forceProblems(
  c: CombinationInput,
  design: 'LRFD' | 'ASD',
): { readonly field: 'design' | 'name'; readonly message: string }[] {
  if (c.design !== undefined && c.design !== design)
    return [
      {
        field: 'design',
        message: `is ${c.design} in a calculation by ${design}: forces of the two load levels cannot be mixed`,
      },
    ];
  const other = design === 'ASD' ? 'LRFD' : 'ASD';
  const foreign = design === 'ASD' ? LRFD_NAME : ASD_NAME;
  if (c.design === undefined && foreign.test(c.name))
    return [
      {
        field: 'name',
        message: `"${c.name}" is an ${other} combination in a calculation by ${design}: forces of the two load levels cannot be mixed`,
      },
    ];
  return [];
}
