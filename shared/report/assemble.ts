import type { CalculationRecord } from '../calc/record.ts';
import { basisBlock } from './basis-block.ts';
import { CAUTION_OF_EVERY_PAGE, cautionsBlock, NOT_YET_CHECKED, PRELIMINARY } from './cautions.ts';
import { completenessBlocks } from './completeness-block.ts';
import { coverBlock } from './cover-block.ts';
import type { DocumentData } from './document-data.ts';
import { wholeMemberSheet } from './member-sheet.ts';
import { resultsBlock } from './results-block.ts';
import { standardNames, standardsUsed } from './sheet-books.ts';
import type { DirectiveName, Template } from './template.ts';
import type { Block, DocumentTree, PageFrame } from './tree.ts';
import { unconfirmedBlock } from './unconfirmed-block.ts';

export interface ReportParts {
  readonly template: Template;
  readonly record: CalculationRecord;
  readonly document: DocumentData;
}

/** A template, a record and what is said beside it, as the document that web and PDF render. */
export function assembleReport({ template, record, document }: ReportParts): DocumentTree {
  const blocks = template.parts.flatMap((part): readonly Block[] =>
    part.kind === 'prose' ? [part.block] : FILL[part.name](record, document),
  );
  const { number, title } = document.calculation;
  return {
    language: 'en',
    title: [number, title].filter(Boolean).join(' '),
    frame: pageFrame(record, document),
    blocks,
  };
}

const FILL: Record<
  DirectiveName,
  (record: CalculationRecord, document: DocumentData) => readonly Block[]
> = {
  cover: (record, document) => [
    coverBlock(record, document, standardNames(record.standard).name),
    { kind: 'pageBreak' },
  ],
  basis: (record, document) => [basisBlock(record, document, standardsUsed(record))],
  results: (record) => [resultsBlock(record)],
  unconfirmed: (record) => [unconfirmedBlock(record)],
  completeness: (record) => completenessBlocks(record),
  members: (record) =>
    record.members.flatMap((member, index): Block[] => [
      ...(index === 0 ? [] : [{ kind: 'pageBreak' as const }]),
      ...wholeMemberSheet(record, member.id),
    ]),
  cautions: () => [cautionsBlock()],
};

/** The frame around every page; an issued calculation carries no marking. */
export function pageFrame(record: CalculationRecord, document: DocumentData): PageFrame {
  const { project, calculation, people } = document;
  const hash = record.resultHash === null ? 'preview' : record.resultHash.slice(0, 12);
  return {
    firm: document.firm,
    project: [project.number, project.title].filter(Boolean).join(' '),
    calculation: calculation.number,
    title: calculation.title,
    revision: calculation.revision,
    date: document.date,
    originator: people.originator,
    checker: people.checker ?? NOT_YET_CHECKED,
    marking: document.issued ? null : PRELIMINARY,
    foot: `${record.program.name}, engine ${record.program.engine} · ${standardNames(record.standard).name}, ${record.design} · results ${hash}. ${CAUTION_OF_EVERY_PAGE}`,
    paper: document.paper,
  };
}
