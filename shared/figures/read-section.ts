import { isValued, type ValuedLine } from '../calc/line.ts';
import type { MemberRecord } from '../calc/record.ts';
import { UNIT_SETS, type UnitSetName } from '../units/unit-set.ts';
import type { SectionDrawing } from './drawing.ts';
import { drawnInWorkingUnit } from './read-line.ts';
import { sectionDrawing } from './section-drawing.ts';
import { sectionText } from './section-text.ts';

/** The member's section from its lines, tabulated or given; null where a size is missing. */
export function readSection(member: MemberRecord, units: UnitSetName): SectionDrawing | null {
  const lines = new Map<string, ValuedLine>(
    member.lines.flatMap((line) => (isValued(line) ? [[line.key, line] as const] : [])),
  );
  return sectionDrawing(sectionText(member.section), (name) => {
    const line = lines.get(`section/${name}`);
    return line ? drawnInWorkingUnit(line, UNIT_SETS[units]) : null;
  });
}
