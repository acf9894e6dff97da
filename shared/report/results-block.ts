import type { CalculationRecord, MemberRecord } from '../calc/record.ts';
import { sectionText } from '../figures/section-text.ts';
import { cell, governsText, ratioCell, strongCell, verdictCell } from './cells.ts';
import type { Block } from './tree.ts';

/** One row per member: its verdict, its ratio, what governs and in which combination. */
export function resultsBlock(record: CalculationRecord): Block {
  return {
    kind: 'table',
    caption: 'Members and their results',
    head: ['Member', 'Section', 'Material', 'Verdict', 'Ratio', 'Governs', 'Combination'].map(
      (words) => ({ ...cell(words), ...(words === 'Ratio' ? { align: 'right' as const } : {}) }),
    ),
    rows: record.members.map((member) => [
      strongCell(member.mark),
      cell(sectionText(member.section)),
      cell(member.material),
      verdictCell(member.summary),
      ratioCell(
        member.summary.ratioText,
        member.summary.governing && {
          member: member.id,
          address: member.summary.governing.address,
        },
      ),
      cell(member.summary.governing ? governsText(member.summary) : whyNone(member)),
      cell(member.summary.governing?.combinationName ?? '–'),
    ]),
    widths: [2, 2.4, 2.6, 2.2, 1.4, 5, 3.6],
  };
}

/** The first reason a member or its combinations give for having no ratio. */
export function whyNone(member: MemberRecord): string {
  const lines = [...member.lines, ...member.combinations.flatMap((c) => c.lines)];
  const reason = (severity: 'failed' | 'outside scope') =>
    lines.find((line) => line.kind === 'notice' && line.severity === severity);
  const found = reason('failed') ?? reason('outside scope');
  return found?.kind === 'notice' ? found.text : '–';
}
