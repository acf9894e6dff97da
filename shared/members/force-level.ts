import type { CombinationInput } from './input.ts';

// A factor on D or L that only the other design method's combinations have (ASCE/SEI 7-22, 2.3, 2.4).
const LRFD_NAME = /(?:^|[^\d.])1\.(?:2|4)\s*\(?D|(?:^|[^\d.])1\.6\s*\(?(?:L|S|R)/i;

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
  if (design === 'ASD' && c.design === undefined && LRFD_NAME.test(c.name))
    return [
      {
        field: 'name',
        message: `"${c.name}" is an LRFD combination in a calculation by ASD: forces of the two load levels cannot be mixed`,
      },
    ];
  return [];
}
