import { isValued, type ValuedLine } from '../calc/line.ts';
import type { MemberRecord } from '../calc/record.ts';
import { UNIT_SETS, type UnitSetName } from '../units/unit-set.ts';
import type { NamedDrawn, SectionDrawing } from './drawing.ts';
import { drawnInWorkingUnit } from './read-line.ts';
import { sectionText } from './section-text.ts';

/** The member's section from the table rows its lines looked up; null where one is missing. */
export function readSection(member: MemberRecord, units: UnitSetName): SectionDrawing | null {
  const found = (symbol: string): NamedDrawn | null => {
    const line = member.lines.find(
      (l): l is ValuedLine => isValued(l) && l.kind === 'lookup' && l.symbol === symbol,
    );
    return line ? drawnInWorkingUnit(line, UNIT_SETS[units]) : null;
  };
  const [depth, flangeWidth] = [found('d'), found('bf')];
  const [webThickness, flangeThickness] = [found('tw'), found('tf')];
  if (!depth || !flangeWidth || !webThickness || !flangeThickness) return null;
  return {
    section: sectionText(member.section),
    depth,
    flangeWidth,
    webThickness,
    flangeThickness,
  };
}
