import type { LoadedCalculation } from '#server/features/calculations/load-for-run.ts';
import type { DocumentData } from '#shared/report/document-data.ts';

const dateWords = new Intl.DateTimeFormat('en-GB', {
  ...{ day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' },
});

/** What the report of a calculation says beside its record. US units print on Letter, SI on A4. */
export function documentDataOf(found: LoadedCalculation, date: Date): DocumentData {
  const { project, number, title, revision, basis, originator, firm } = found;
  return {
    firm,
    project: {
      number: project.number,
      title: project.title,
      client: project.client,
      place: project.place,
    },
    calculation: { number, title, revision, status: 'draft' },
    people: { originator, checker: null, approver: null },
    date: dateWords.format(date),
    basis,
    issued: false,
    paper: basis.units === 'us' ? 'Letter' : 'A4',
  };
}
