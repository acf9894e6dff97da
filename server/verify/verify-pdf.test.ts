import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { PDFDocument } from 'pdf-lib';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { renderPdf } from '#server/pdf/render-pdf.ts';
import { fullTemplate } from '#server/runs/full-template.ts';
import { canonicalText } from '#shared/calc/hashes.ts';
import type { CalculationRecord } from '#shared/calc/record.ts';
import { assembleReport } from '#shared/report/assemble.ts';
import { unsignedDocument } from '#shared/report/document-data.ts';
import { editAlt, editMarked, editPages, type PageEdit, swapGlyphs } from '#tests/cli/edit-pdf.ts';
import { everyKind, lineAt, resealed } from '#tests/cli/every-kind.ts';
import { findPlaces, type Place } from '#tests/cli/printed-lines.ts';
import { NotAPdf, readPdf } from './pages/read-pdf.ts';
import type { Verification } from './problem.ts';
import { verifyPdf } from './verify-pdf.ts';
import { NotARecord } from './verify-record.ts';

const record = everyKind();

function pdfOf(shown: CalculationRecord, carried: unknown): Promise<Buffer> {
  const document = unsignedDocument('Every kind of line', '2 March 2026', 'Letter');
  const tree = assembleReport({ template: fullTemplate(), record: shown, document });
  const date = new Date('2026-03-02T00:00:00Z');
  return renderPdf(tree, { date, record: carried === null ? null : canonicalText(carried) });
}

let pdf: Uint8Array;
let sheets: number;
let place: ReturnType<typeof findPlaces>['place'];
beforeAll(async () => {
  pdf = await pdfOf(record, record);
  const { pages } = await readPdf(pdf);
  sheets = pages.length;
  place = findPlaces(record, pages).place;
});

const at = (where: Place, edit: (marked: string) => string): PageEdit => ({
  page: where.page,
  edit: (content) => editMarked(content, where.id, edit),
});

/** Problems by where they are named: `B1 E3/Pn`, `B2 page`, `page`. */
function reasonsBy({ problems }: Verification): Map<string, string> {
  const reasons = new Map<string, string>();
  for (const { member, address, kind, reason } of problems) {
    const where = [member?.mark, address ?? kind].filter(Boolean).join(' ');
    reasons.set(where, [reasons.get(where), reason].filter(Boolean).join('\n'));
  }
  return reasons;
}

describe('a PDF as it was made', { timeout: 120_000 }, () => {
  const folder = mkdtempSync(join(tmpdir(), 'verify-'));
  afterAll(() => rmSync(folder, { recursive: true }));

  it('is reproduced whole', async () => {
    const { lines, reproduced, problems, notes } = await verifyPdf(pdf);
    expect(problems).toEqual([]);
    expect(notes).toEqual([]);
    expect(reproduced).toBe(lines);
  });

  it.each([['--qdf'], ['--linearize']])(
    'is so after another program wrote it again (qpdf %s)',
    async (option) => {
      const [from, to] = [join(folder, 'from.pdf'), join(folder, 'to.pdf')];
      writeFileSync(from, pdf);
      execFileSync('qpdf', [option, '--object-streams=generate', from, to]);
      expect((await verifyPdf(readFileSync(to))).problems).toEqual([]);
    },
  );
});

describe('numbers changed on the pages', { timeout: 120_000 }, () => {
  const swap = (m: string): string => swapGlyphs(m);
  /** Each edit, where its problem must be named, and the words for it. */
  const edits: readonly (readonly [
    what: string,
    where: string,
    reason: RegExp,
    edit: () => PageEdit,
  ])[] = [
    [
      'the result of a check',
      'B1 g1:H1/axial',
      /^page \d+ shows "OK0\.\d+", the record gives "OK0\.\d+"$/,
      () => at(place(/^OK/, ['B1', 'g1:H1/axial']), swap),
    ],
    [
      'the unit of a result',
      'B1 g1:F1/x/Mc',
      /shows "[\d.]+k/,
      () => at(place(/kipft/, ['B1', 'g1:F1/x/Mc']), swap),
    ],
    [
      'a given value',
      'B1 given/Lcz',
      /shows/,
      () => at(place(/^24ft/, ['B1', 'given/Lcz']), (m) => swapGlyphs(m, 'first')),
    ],
    [
      'a substituted value, the copied text as it was',
      'B1 E3/Pn',
      /^page \d+ shows "Pn=FnA/,
      () => at(place(/^Pn=/, ['B1', 'E3/Pn']), swap),
    ],
    [
      'the copied text alone',
      'B1 E1/Pc',
      /^page \d+ is copied as/,
      () =>
        at(place(/^Pc=/, ['B1', 'E1/Pc']), (m) => m.replace(/(ActualText \([^)]*?)[1-8]/, '$19')),
    ],
    [
      'the number of a line',
      'B1 E3/FyFe',
      /shows/,
      () => {
        const title = place(/./, ['B1', 'E3/FyFe']);
        return at(title, swap);
      },
    ],
    ['a clause', 'B1 E3/Fn', /shows "E3E/, () => at(place(/^E3E3-2$/, ['B1', 'E3/Fn']), swap)],
    [
      'a title, which is the record’s own',
      'B1 E2/slenderness',
      /shows "Largest/,
      () => at(place(/^Largestslenderness$/, ['B1', 'E2/slenderness']), swap),
    ],
    [
      'the verdict of a sheet',
      'B2 page',
      /^the verdict: page \d+ shows/,
      () =>
        // Word, ratio, terms, what governs: the ratio is the second run.
        at(place(/^OK0\.474.+limit/), (m) =>
          m.replace(/(TJ[^<]*<)([0-9a-f]{4})([0-9a-f]{4})/, '$1$3$2'),
        ),
    ],
    [
      'a figure',
      'B1 page',
      /^a figure: page/m,
      () => at(place(/W12×53xyd12/), (m) => swapGlyphs(m, 'first')),
    ],
    [
      'a row of the completeness table',
      'B1 page',
      /the table "Completeness of B1/,
      () => at(place(/^0\.797$/), swap),
    ],
    [
      'a row of the table of results',
      'page',
      /the table "Members and their results"/,
      () => at(place(/^0\.474$/), swap),
    ],
    [
      'a row of the unconfirmed inputs',
      'page',
      /the table "Inputs that are not confirmed"/,
      () => at(place(/^24ft$/), (m) => m.replace(/<([0-9a-f]{4})([0-9a-f]{4})/, '<$2$1')),
    ],
    [
      'the worst result on the cover',
      'page',
      /the field "Worstresult"/,
      () => at(place(/^FAILED,memberB3$/), swap),
    ],
  ];

  let reasons: Map<string, string>;
  let counted: Verification;
  beforeAll(async () => {
    counted = await verifyPdf(
      await editPages(
        pdf,
        edits.map(([, , , edit]) => edit()),
      ),
    );
    reasons = reasonsBy(counted);
  });

  it.each(edits)('%s is found at %s', (_, where, reason) => {
    expect(reasons.get(where)).toMatch(reason);
  });

  it('and nothing else is', () => {
    expect([...reasons.keys()].sort()).toEqual([...new Set(edits.map(([, at]) => at))].sort());
    expect(counted.problems.map((p) => p.by).filter((by) => by !== 'page')).toEqual([]);
    const lines = edits.filter(([, where]) => !where.endsWith('page'));
    expect(counted.lines - counted.reproduced).toBe(lines.length);
  });

  it('what is read aloud alone is found', async () => {
    const bytes = await editAlt(pdf, 'Pn = Fn', (alt) => alt.replace(/[1-8]/, '9'));
    const found = reasonsBy(await verifyPdf(bytes));
    expect([...found.keys()]).toEqual(['B1 E3/Pn']);
    expect(found.get('B1 E3/Pn')).toMatch(/is read aloud as/);
  });
});

describe('content put on a page or taken from it', { timeout: 120_000 }, () => {
  const overlay = 'BT /F1 12 Tf 1 0 0 -1 300 300 Tm [<00030004>] TJ ET';

  it.each([
    ['outside the structure', overlay],
    ['as decoration', `/Artifact BMC ${overlay} EMC`],
  ])('%s is found', async (_, added) => {
    const { page } = place(/kip$/, ['B1', 'E3/Pn']);
    const bytes = await editPages(pdf, [{ page, edit: (content) => `${content}\n${added}` }]);
    const found = reasonsBy(await verifyPdf(bytes));
    expect(found.get('page')).toMatch(`page ${page} shows`);
    expect(found.get('page')).toMatch(/outside the document's structure/);
  });

  it('inside lines, a result taken away, results in each other’s place', async () => {
    const [one, other] = [place(/^OK/, ['B1', 'g1:H1/axial']), place(/^OK/, ['B1', 'g1:H1/x'])];
    expect(other.page).toBe(one.page);
    const heights = new Map<number, string>();
    const keep = (id: number) => (m: string) => {
      heights.set(id, /([\d.]+) Tm/.exec(m)?.[1] ?? '');
      return m;
    };
    const exchanged: PageEdit = {
      page: one.page,
      edit: (content) => {
        editMarked(editMarked(content, one.id, keep(one.id)), other.id, keep(other.id));
        const [a, b] = [heights.get(one.id), heights.get(other.id)];
        const moved = editMarked(content, one.id, (m) => m.replaceAll(`${a} Tm`, `${b} Tm`));
        return editMarked(moved, other.id, (m) => m.replaceAll(`${b} Tm`, `${a} Tm`));
      },
    };
    const bytes = await editPages(pdf, [
      at(place(/kip$/, ['B1', 'E3/Pn']), (m) => m.replace(/EMC\s*$/, `${overlay}\nEMC\n`)),
      at(place(/kip$/, ['B1', 'E1/Pc']), (m) => m.replace(/BT[\s\S]*ET/, '')),
      exchanged,
    ]);
    const found = reasonsBy(await verifyPdf(bytes));
    expect([...found.keys()].sort()).toEqual(
      ['B1 E1/Pc', 'B1 E3/Pn', 'B1 g1:H1/axial', 'B1 g1:H1/x'].sort(),
    );
    expect(found.get('B1 g1:H1/axial')).toMatch(/another line's place/);
  });
});

describe('what is no number of the record', { timeout: 120_000 }, () => {
  it('is noted, not held against the record', async () => {
    const words = at(place(/because/, ['B1', 'E3/branch']), (m) => swapGlyphs(m, 'first'));
    const document = await PDFDocument.load(await editPages(pdf, [words]), {
      updateMetadata: false,
    });
    const note = { Type: 'Annot', Subtype: 'FreeText', Rect: [100, 100, 200, 120] };
    const { context } = document;
    document.getPages()[5]?.node.addAnnot(context.register(context.obj(note)));
    const { problems, notes } = await verifyPdf(await document.save());
    expect(problems).toEqual([]);
    expect(notes.join('\n')).toMatch(/1 lines and rows on the pages are worded otherwise/);
    expect(notes.join('\n')).toMatch(/1 annotations were put on the pages \(6\)/);
  });
});

describe('the record that a PDF carries', { timeout: 120_000 }, () => {
  it('changed and sealed again, disagrees with the pages and with itself', async () => {
    const changed = resealed(record, (c) => {
      lineAt(c, 'B1', 'E3/Pn', 'formula').value *= 1.1;
    });
    const { problems } = await verifyPdf(await pdfOf(record, changed));
    const ways = new Set(problems.filter((p) => p.address === 'E3/Pn').map((p) => p.by));
    expect([...ways].sort()).toEqual(['closure', 'evaluation', 'page', 'rerun']);
  });

  it('of other forces, sound in itself, disagrees with the pages', async () => {
    const { problems } = await verifyPdf(await pdfOf(everyKind('140 kip'), record));
    expect(problems.filter((p) => p.by !== 'page')).toEqual([]);
    const lines = problems.filter((p) => p.member?.mark === 'B1').map((p) => p.address);
    expect(lines).toContain('g1:given/P');
    expect(lines).toContain('g1:H1/check');
    const frames = problems.filter((p) => /page \d+ names the results/.test(p.reason));
    expect(frames).toHaveLength(sheets);
  });

  it('changed and not sealed again, has the wrong hash', async () => {
    const changed = JSON.parse(JSON.stringify(record)) as CalculationRecord;
    lineAt(changed, 'B1', 'given/L', 'given').confirmed = true;
    const { problems } = await verifyPdf(await pdfOf(record, changed));
    expect(problems.map((p) => p.by)).toContain('hash');
  });

  it('is not there, or is none', async () => {
    await expect(verifyPdf(await pdfOf(record, null))).rejects.toThrow(NotARecord);
    await expect(verifyPdf(await pdfOf(record, { format: 1 }))).rejects.toThrow(NotARecord);
  });

  it('is sought in a PDF only', async () => {
    await expect(verifyPdf(Buffer.from('%PDF-nothing'))).rejects.toThrow(NotAPdf);
    await expect(verifyPdf(Buffer.from(''))).rejects.toThrow(NotAPdf);
  });
});
