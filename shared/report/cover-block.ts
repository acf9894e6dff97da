import type { CalculationRecord } from '../calc/record.ts';
import { CAUTIONS_OF_COVER, NOT_YET_APPROVED, NOT_YET_CHECKED, PRELIMINARY } from './cautions.ts';
import { type DocumentData, stated } from './document-data.ts';
import type { BlockOf } from './tree.ts';

type Cover = BlockOf<'cover'>;
type Field = Cover['fields'][number];

/** The title sheet. Its check and approval fields say who did, or that nobody has yet. */
export function coverBlock(
  record: CalculationRecord,
  document: DocumentData,
  standardName: string,
): Cover {
  const { firm, project, calculation, people, date } = document;
  const { unconfirmed } = record.summary;
  const fields: Field[] = [
    { label: 'Firm', value: stated(firm) },
    { label: 'Project', value: stated([project.number, project.title].filter(Boolean).join(' ')) },
    { label: 'Client', value: stated(project.client) },
    { label: 'Place', value: stated(project.place) },
    { label: 'Revision', value: stated(calculation.revision) },
    { label: 'Status', value: stated(calculation.status) },
    { label: 'Date', value: stated(date) },
    { label: 'Originator', value: stated(people.originator) },
    { label: 'Checker', value: people.checker ?? NOT_YET_CHECKED },
    { label: 'Approver', value: people.approver ?? NOT_YET_APPROVED },
    { label: 'Standard', value: `${standardName}, ${record.design}` },
    { label: 'Members', value: String(record.members.length) },
    resultField(record),
    {
      label: 'Inputs not confirmed',
      value: unconfirmed === 0 ? 'none' : String(unconfirmed),
      tone: unconfirmed === 0 ? 'plain' : 'over',
    },
    { label: 'Program', value: `${record.program.name}, engine ${record.program.engine}` },
    { label: 'Result hash', value: record.resultHash ?? 'preview, no hash' },
  ];
  return {
    kind: 'cover',
    title: stated(calculation.title),
    number: calculation.number,
    project: project.title,
    fields,
    notices: notices(record, document, standardName),
    cautions: CAUTIONS_OF_COVER,
  };
}

function resultField({ summary, members }: CalculationRecord): Field {
  const worst = members.find((m) => m.id === summary.member);
  const ratio = summary.ratioText === null ? '' : ` ${summary.ratioText}`;
  return {
    label: 'Worst result',
    value: `${summary.verdict}${ratio}${worst ? `, member ${worst.mark}` : ''}`,
    tone: summary.verdict === 'OK' ? 'plain' : 'over',
  };
}

function notices(
  record: CalculationRecord,
  document: DocumentData,
  standardName: string,
): string[] {
  const { unconfirmed } = record.summary;
  const marksOf = (verdict: string): string[] =>
    record.members.filter((m) => m.summary.verdict === verdict).map((m) => m.mark);
  const found: (string | null)[] = [
    document.issued ? null : PRELIMINARY,
    unconfirmed === 0
      ? null
      : `${plural(unconfirmed, 'input is', 'inputs are')} not confirmed; the list follows the summary.`,
    ...(['FAILED', 'NOT OK', 'NOT CHECKED'] as const).map((verdict) =>
      membersNotice(verdict, marksOf(verdict)),
    ),
    editionNotice(document.basis.adoptedEdition, standardName),
  ];
  return found.filter((notice) => notice !== null);
}

/** How many members a notice names. */
const NAMED = 12;

/** `FAILED: C-10`; of many, the first ones by name and how many more. */
function membersNotice(verdict: string, marks: readonly string[]): string | null {
  if (marks.length === 0) return null;
  const more = marks.length - NAMED;
  const named = marks.slice(0, NAMED).join(', ');
  return `${verdict}: ${named}${more > 0 ? ` and ${plural(more, 'other member', 'other members')}` : ''}.`;
}

const plural = (count: number, one: string, many: string): string =>
  `${count} ${count === 1 ? one : many}`;

/** The building code may adopt another edition than the one calculated by. */
export function editionNotice(adopted: string, standardName: string): string | null {
  const edition = adopted.trim();
  if (edition === '' || standardName.endsWith(edition)) return null;
  if (edition.includes(standardName)) return null;
  return `The building code adopts ${edition}; this calculation is by ${standardName}.`;
}
