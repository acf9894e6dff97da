import { placedLines } from '../calc/address.ts';
import type {
  CalculationRecord,
  CombinationRecord,
  MemberRecord,
  Summary,
} from '../calc/record.ts';
import { sectionText } from '../figures/section-text.ts';
import { limitStateTables } from './limit-state-table.ts';
import { openMember } from './open-member.ts';
import type { Presenter } from './presenter.ts';
import { shortReference } from './reference-text.ts';
import { whyNone } from './results-block.ts';
import { interactionFigure, memberFigures } from './sheet-figures.ts';
import { governingWay, sectionedLines } from './sheet-sections.ts';
import type { Block, BlockOf } from './tree.ts';
import { verdictTerms } from './verdict-terms.ts';

/**
 * A member's sheet on the screen: head, verdict, the member with its moments, the member's lines,
 * then those of one combination (null: the governing one), and at the end all combinations in the
 * interaction diagram. Throws if the member or the combination is not in the record.
 */
export function memberSheet(
  record: CalculationRecord,
  memberId: string,
  combinationId: string | null = null,
): Block[] {
  const { member, presenter } = openMember(record, memberId);
  const combination = chosen(member, combinationId);
  const summary = combination?.summary ?? member.summary;
  const way = governingWay(presenter, summary.governing?.address ?? null);
  return [
    sheetHead(member),
    verdictBlock(member, summary, combination),
    ...memberFigures(record, member, combination),
    ...(combination ? limitStateTables(member, combination) : []),
    ...memberBlocks(presenter, way),
    ...(combination ? combinationBlocks(presenter, combination, way) : []),
    ...interactionFigure(record, member),
  ];
}

/** The sheet with every combination; its figures are of the governing one, all on its first page. */
export function wholeMemberSheet(record: CalculationRecord, memberId: string): Block[] {
  const { member, presenter } = openMember(record, memberId);
  const governing = chosen(member, null);
  const way = governingWay(presenter, member.summary.governing?.address ?? null);
  return [
    sheetHead(member),
    verdictBlock(member, member.summary, governing),
    ...memberFigures(record, member, governing),
    ...interactionFigure(record, member),
    ...(governing ? limitStateTables(member, governing) : []),
    ...memberBlocks(presenter, way),
    ...member.combinations.flatMap((c) => combinationBlocks(presenter, c, way)),
  ];
}

/** The combination asked for, else the one that governs, else the first. */
function chosen(member: MemberRecord, id: string | null): CombinationRecord | null {
  const wanted = id ?? member.summary.governing?.combination ?? member.combinations[0]?.id;
  if (wanted === undefined) return null;
  const found = member.combinations.find((c) => c.id === wanted);
  if (!found) throw new Error(`no combination ${wanted} of member ${member.mark}`);
  return found;
}

const sheetHead = ({ id, mark, section, material }: MemberRecord): Block => ({
  kind: 'sheetHead',
  member: id,
  mark,
  section: sectionText(section),
  material,
});

function verdictBlock(
  member: MemberRecord,
  summary: Summary,
  combination: CombinationRecord | null,
): BlockOf<'verdict'> {
  const { governing } = summary;
  return {
    kind: 'verdict',
    verdict: summary.verdict,
    ratioText: summary.ratioText,
    address: governing?.address ?? null,
    terms: governing ? verdictTerms(member, governing) : [],
    limit: '1.000',
    governs: governing ? governsWords(member, governing) : whyNone(member),
    combination: governing?.combinationName ?? combination?.name ?? '',
  };
}

/** Clause and title of what governs; of a notice, which has no ratio, its reason too. */
function governsWords(
  member: MemberRecord,
  { clause, title, address }: NonNullable<Summary['governing']>,
): string {
  const line = placedLines(member).find((placed) => placed.address === address)?.line;
  const named = `${shortReference(clause)}, ${title}`;
  return line?.kind === 'notice' ? `${named}. ${line.text}` : named;
}

const memberBlocks = (presenter: Presenter, way: ReadonlySet<string>): Block[] => [
  { kind: 'heading', level: 3, text: 'The member, for every combination', id: presenter.member.id },
  ...sectionedLines(presenter, null, way),
];

/** A combination's heading carries its verdict, so that no sheet is read past it. */
function combinationBlocks(
  presenter: Presenter,
  combination: CombinationRecord,
  way: ReadonlySet<string>,
): Block[] {
  const { verdict, ratioText } = combination.summary;
  return [
    {
      kind: 'heading',
      level: 3,
      text: `Combination ${combination.name}: ${verdict}${ratioText === null ? '' : ` ${ratioText}`}`,
      id: `${presenter.member.id}/${combination.id}`,
    },
    ...sectionedLines(presenter, combination.id, way),
  ];
}
