import type { CombinationRecord, MemberRecord } from '../calc/record.ts';
import { UNIT_SETS, type UnitSetName } from '../units/unit-set.ts';
import type { MemberDrawing } from './drawing.ts';
import { governingSegment } from './governing-segment.ts';
import { readChains, readHeld } from './read-held.ts';
import { drawn } from './read-line.ts';
import { readPlane } from './read-plane.ts';
import { sectionText } from './section-text.ts';
import { sheetLines } from './sheet-lines.ts';

const LENGTHS = ['Lcx', 'Lcy', 'Lcz', 'Lb'] as const;

/** What a member's figures draw under one combination; null where the record has no length. */
export function readMember(
  member: MemberRecord,
  combination: CombinationRecord | null,
  units: UnitSetName,
): MemberDrawing | null {
  const lines = sheetLines(member, combination, UNIT_SETS[units]);
  const own = sheetLines(member, null, UNIT_SETS[units]);
  const length = own.bySymbol('L');
  if (!length) return null;
  const value = (symbol: string): number | null => own.bySymbol(symbol)?.value ?? null;
  const axial = combination && (lines.byKey('given/P') ?? lines.bySymbol('Pr'));
  const held = readHeld(member, lines);
  const chains = readChains(lines, combination && governingSegment(combination));
  const located = new Set(chains.map((chain) => chain.symbol));
  const segments = chains.find(({ symbol }) => symbol === 'Lb')?.pieces ?? [];
  const common = {
    length: length.value,
    force: axial?.value ?? 0,
    held,
    segments: segments.map((piece) => piece.value),
  };
  return {
    mark: member.mark,
    section: sectionText(member.section),
    length: drawn(length, lines.set),
    depth: value('d') ?? value('Ht') ?? value('D'),
    width: value('bf') ?? value('bfmax') ?? value('B') ?? value('D'),
    lengths: LENGTHS.filter((symbol) => !located.has(symbol))
      .map((symbol) => (combination ? lines : own).bySymbol(symbol))
      .filter((line) => line !== undefined)
      .map((line) => drawn(line, lines.set)),
    chains,
    held,
    axial: axial ? drawn(axial, lines.set) : null,
    planes: combination
      ? (['major', 'minor'] as const)
          .map((plane) => readPlane(lines, plane, common))
          .filter((plane) => plane !== null)
      : [],
  };
}
