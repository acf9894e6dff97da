import type { CombinationRecord } from '../calc/record.ts';

/**
 * The segment (`s2`) whose check governs a combination: where that is a check of no segment, the one
 * whose interaction governs; null where the member is one segment, or none could be compared.
 */
export function governingSegment({ summary, lines }: CombinationRecord): string | null {
  const [, ofCheck] = /:(s\d+)\//.exec(summary.governing?.address ?? '') ?? [];
  if (ofCheck !== undefined) return ofCheck;
  const line = lines.find(({ key }) => key === 'H1/segments/ratio');
  const [, ofRatio = null] =
    (line?.kind === 'governing' ? /^:(s\d+)\//.exec(line.governs) : null) ?? [];
  return ofRatio;
}
