import { FontSet } from '#server/pdf/font-set.ts';
import { openDocument } from '#server/pdf/open-document.ts';
import { papers } from '#server/pdf/paper.ts';
import type { CalculationRecord } from '#shared/calc/record.ts';
import type { VerifyProblem } from '../problem.ts';
import { compareFront } from './compare-front.ts';
import { compareSheets, pageProblem } from './compare-sheets.ts';
import { expectedSheets } from './expected-pages.ts';
import type { PageText } from './page-text.ts';

/** Compares everything the pages say of the record with the record: sheets, tables, frame. */
export function comparePages(
  record: CalculationRecord,
  pages: readonly PageText[],
): { problems: VerifyProblem[]; notes: string[] } {
  const fonts = new FontSet(openDocument(papers.A4, NOBODY));
  const found = pages.flatMap((page) => page.segments);
  const markOf = (id: string): string => record.members.find((m) => m.id === id)?.mark ?? id;
  const sheets = compareSheets(expectedSheets(record, fonts), found);
  const front = compareFront(record, found, fonts);
  const notes = [...front.notes, ...annotationNotes(pages)];
  const reworded = sheets.reworded + front.reworded;
  if (reworded > 0)
    notes.push(
      `${reworded} lines and rows on the pages are worded otherwise than by this version; their numbers agree`,
    );
  return {
    problems: [
      ...front.problems.map(({ member, reason }) =>
        ofPages(reason, member === null ? null : { id: member, mark: markOf(member) }),
      ),
      ...sheets.problems.map((problem) => pageProblem(problem, markOf)),
      ...pages
        .flatMap((page) => frameProblems(page, record))
        .map((reason) => ofPages(reason, null)),
    ],
    notes,
  };
}

/** Fonts need an open document to be measured in; it is never written. */
const NOBODY = { title: '', author: '', subject: '', language: 'en', date: new Date(0) };

const ofPages = (reason: string, member: VerifyProblem['member']): VerifyProblem => ({
  member,
  address: null,
  kind: 'page',
  by: 'page',
  reason,
});

/** The frame names the record's hash, and nothing is written over the content. */
function frameProblems(page: PageText, { resultHash }: CalculationRecord): string[] {
  const said = /results([0-9a-f]{12})/.exec(page.frame)?.[1];
  return [
    ...(said === undefined || resultHash?.startsWith(said)
      ? []
      : [`page ${page.number} names the results ${said}, not ${resultHash?.slice(0, 12)}`]),
    ...(page.loose === ''
      ? []
      : [
          `page ${page.number} shows "${page.loose.slice(0, 48)}" outside the document's structure`,
        ]),
  ];
}

function annotationNotes(pages: readonly PageText[]): string[] {
  const marked = pages.filter((page) => page.annotations.length > 0);
  const count = marked.reduce((n, page) => n + page.annotations.length, 0);
  if (count === 0) return [];
  const where = marked.map((page) => page.number).join(', ');
  return [`${count} annotations were put on the pages (${where}); they are not part of the record`];
}
