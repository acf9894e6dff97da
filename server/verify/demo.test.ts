import { describe, expect, it } from 'vitest';
import { craneBasis, craneMembers } from '#server/demo/crane-bay.ts';
import { hallBasis, hallMembers } from '#server/demo/hall-columns.ts';
import { makeReport } from '#server/runs/make-report.ts';
import { unsignedDocument } from '#shared/report/document-data.ts';
import { verifyPdf } from './verify-pdf.ts';

describe('the PDFs of the demo', { timeout: 180_000 }, () => {
  it.each([
    ['hall columns', hallBasis, hallMembers, 'Letter'],
    ['crane bay', craneBasis, craneMembers, 'A4'],
  ] as const)('of the %s are reproduced whole', async (title, basis, drafts, paper) => {
    const members = drafts.map((draft, index) => ({ id: `m-${index + 1}`, draft }));
    const document = unsignedDocument(title, '2 March 2026', paper);
    const date = new Date('2026-03-02T00:00:00Z');
    const made = await makeReport({ drafts: { basis, members }, document, date });
    if (!('pdf' in made)) throw new Error(JSON.stringify(made.problems));
    const { lines, reproduced, problems, notes } = await verifyPdf(made.pdf);
    expect({ problems, notes }).toEqual({ problems: [], notes: [] });
    expect(lines).toBeGreaterThan(500);
    expect(reproduced).toBe(lines);
  });
});
