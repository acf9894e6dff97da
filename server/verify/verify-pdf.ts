import type { CalculationRecord } from '#shared/calc/record.ts';
import { comparePages } from './pages/compare-pages.ts';
import { type ReadPdf, readPdf } from './pages/read-pdf.ts';
import type { Verification } from './problem.ts';
import { tally } from './tally.ts';
import { NotARecord, ofRecord, readRecord, verifyRecord } from './verify-record.ts';

/**
 * Verifies a PDF by the record it carries: the record by itself, then its pages against it.
 * Throws NotAPdf for another file and NotARecord where no record is attached or it is none.
 */
export async function verifyPdf(bytes: Uint8Array): Promise<Verification> {
  const pdf = await readPdf(bytes);
  if (pdf.record === null) throw new NotARecord('no record.json is attached');
  let json: unknown;
  try {
    json = JSON.parse(pdf.record);
  } catch {
    throw new NotARecord('the attached record.json is not JSON');
  }
  const record = readRecord(json);
  const own = verifyRecord(record);
  const pages = pagesOf(record, pdf);
  return tally(record, [...own.problems, ...pages.problems], [...own.notes, ...pages.notes]);
}

/** A record that doesn't hold together can't be set on pages: that is said instead. */
function pagesOf(record: CalculationRecord, pdf: ReadPdf): ReturnType<typeof comparePages> {
  try {
    return comparePages(record, pdf.pages);
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error);
    const problem = ofRecord('page', 'page', `the pages can't be compared: ${reason}`);
    return { problems: [problem], notes: [] };
  }
}
