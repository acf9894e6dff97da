import { renderPdf } from '#server/pdf/render-pdf.ts';
import { canonicalText } from '#shared/calc/hashes.ts';
import { assembleReport } from '#shared/report/assemble.ts';
import { fullTemplate } from './full-template.ts';
import { makeRecord } from './make-record.ts';
import type { Tasks } from './tasks.ts';

/** The report of a calculation as a PDF that carries its record. */
export async function makeReport({
  drafts,
  document,
  date,
}: Tasks['report']['given']): Promise<Tasks['report']['made']> {
  const made = makeRecord(drafts);
  if ('problems' in made) return made;
  const { record } = made;
  const tree = assembleReport({ template: fullTemplate(), record, document });
  return { pdf: await renderPdf(tree, { date, record: canonicalText(record) }) };
}
