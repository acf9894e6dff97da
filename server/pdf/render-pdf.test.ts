import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { XMLParser, XMLValidator } from 'fast-xml-parser';
import { PDFArray, PDFDict, PDFDocument, PDFName, PDFRawStream, PDFString } from 'pdf-lib';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Block, DocumentTree, LineBlock } from '#shared/report/tree.ts';
import { renderPdf } from './render-pdf.ts';
import { sampleDocument } from './sample-document.ts';

const record = '{"format":1,"note":"as stored: 1e-7, ψ"}';
const date = new Date('2026-03-12T09:41:00Z');
const folder = mkdtempSync(join(tmpdir(), 'stanchion-pdf-'));
const file = join(folder, 'document.pdf');
let bytes: Buffer;
let text: string;

const tool = (name: string, ...args: string[]): string =>
  execFileSync(name, args, { encoding: 'utf8' });
const textOf = async (tree: DocumentTree): Promise<string> => {
  const other = join(folder, 'other.pdf');
  writeFileSync(other, await renderPdf(tree, { date, record: null }));
  return tool('pdftotext', '-layout', other, '-');
};
/** pdftotext prints every kind of space as the plain one. */
const spaced = (words: string): string => words.replaceAll('\u2009', ' ');
const lines = sampleDocument.blocks.filter((block): block is LineBlock => block.kind === 'line');

beforeAll(async () => {
  bytes = await renderPdf(sampleDocument, { date, record });
  writeFileSync(file, bytes);
  text = tool('pdftotext', '-layout', file, '-');
});

afterAll(() => rmSync(folder, { recursive: true }));

describe('the file', () => {
  test('has every font embedded, subset and with a way to Unicode, none of the standard 14', () => {
    const rows = tool('pdffonts', file).trim().split('\n').slice(2);
    expect(rows.length).toBeGreaterThan(8);
    for (const row of rows) {
      expect(row).toMatch(/^[A-Z]{6}\+(IBMPlex|KaTeX_)\S+ +CID TrueType +Identity-H +yes yes yes/);
    }
  });

  test('is clean to qpdf', () => {
    expect(tool('qpdf', '--check', file)).toContain('No syntax or stream encoding errors found');
  });

  test('is the same for the same tree, record and date', async () => {
    expect(bytes.equals(await renderPdf(sampleDocument, { date, record }))).toBe(true);
  });

  test('is tagged, with language, title and date', () => {
    const info = tool('pdfinfo', '-isodates', file);
    expect(info).toMatch(/Title: +TQ-CAL-012 Hall columns <B & C>\n/);
    expect(info).toMatch(/CreationDate: +2026-03-12T09:41:00Z\n/);
    expect(info).toMatch(/Tagged: +yes\n/);
  });

  test('carries the record unchanged, as PDF/A-3 data', () => {
    tool('pdfdetach', '-save', '1', '-o', join(folder, 'record.json'), file);
    expect(readFileSync(join(folder, 'record.json'), 'utf8')).toBe(record);
    expect(tool('pdfdetach', '-list', file)).toContain('record.json');
  });
});

describe('PDF/A', () => {
  const read = async () => {
    const { context, catalog } = await PDFDocument.load(bytes, { updateMetadata: false });
    return { context, catalog };
  };

  test('names its part, language, output intent and associated file', async () => {
    const { catalog } = await read();
    expect(catalog.lookup(PDFName.of('Lang'), PDFString).asString()).toBe('en');
    const intent = catalog.lookup(PDFName.of('OutputIntents'), PDFArray).lookup(0, PDFDict);
    expect(intent.get(PDFName.of('S'))).toBe(PDFName.of('GTS_PDFA1'));
    const attached = catalog.lookup(PDFName.of('AF'), PDFArray).lookup(0, PDFDict);
    expect(attached.get(PDFName.of('AFRelationship'))).toBe(PDFName.of('Data'));
  });

  test('says in well-formed XMP what the Info dictionary says', async () => {
    const { catalog } = await read();
    const stream = catalog.lookup(PDFName.of('Metadata'));
    if (!(stream instanceof PDFRawStream)) throw new Error('no metadata');
    const xmp = Buffer.from(stream.contents).toString('utf8');
    // An XML parser of its own; it undoes the escapes.
    expect(XMLValidator.validate(xmp)).toBe(true);
    const parts = new XMLParser({ parseTagValue: false }).parse(xmp)['x:xmpmeta']['rdf:RDF'];
    const found = Object.assign({}, ...[parts['rdf:Description']].flat());
    const said = [
      found['dc:title']['rdf:Alt']['rdf:li'],
      found['dc:creator']['rdf:Seq']['rdf:li'],
      `${found['pdfaid:part']} ${found['pdfaid:conformance']}`,
    ];
    expect(said).toEqual(['TQ-CAL-012 Hall columns <B & C>', 'Harrow & Pike Structural', '3 A']);
  });
});

describe('what extraction finds', () => {
  test('each line’s number, formula or words, value and unit', () => {
    for (const line of lines) {
      expect(text).toContain(line.number);
      if (line.working.length > 0) expect(text).toContain(line.text);
      if (line.result)
        expect(text).toContain(spaced(`${line.result.value} ${line.result.unit}`.trim()));
      if (line.also) expect(text).toContain(`= ${line.also.value} ${line.also.unit}`);
      if (line.verdict) expect(text).toContain(line.verdict);
      if (line.given) expect(text).toContain(line.given.source);
    }
  });

  test('a character that the fonts lack, and a superscript minus', async () => {
    expect(text).toContain('Inés Marlöw 日');
    const content = [{ kind: 'text', text: 'about 2.5×10⁻⁶ of it' }] as const;
    const tree = { ...sampleDocument, blocks: [{ kind: 'paragraph', content } as const] };
    expect(await textOf(tree)).toContain('about 2.5×10⁻⁶ of it');
  });

  test('on every page its sheet, the frame, and that it is preliminary', () => {
    const pages = text.split('\f').slice(0, -1);
    expect(pages.length).toBeGreaterThan(3);
    for (const [index, page] of pages.entries()) {
      expect(page).toContain(`${index + 1} of ${pages.length}`);
      for (const said of [
        'TQ-CAL-012',
        'B, draft',
        '2026-03-12',
        'TQ Tern Quay Ferry Hall',
        'does not replace',
      ]) {
        expect(page).toContain(said);
      }
      expect(page.match(/Preliminary, not issued/g)?.length).toBeGreaterThanOrEqual(2);
    }
  });

  test('no marking once it is issued', async () => {
    const frame = { ...sampleDocument.frame, marking: null };
    const blocks = sampleDocument.blocks.filter((block) => block.kind === 'line');
    expect(await textOf({ ...sampleDocument, frame, blocks })).not.toContain('Preliminary');
  });
});

describe('the structure', () => {
  test('has headings, tables, formulas and figures with words for those who can’t see them', () => {
    const tree = tool('pdfinfo', '-struct-text', file);
    for (const type of [
      'Document',
      'Sect',
      'H1',
      'H2',
      'H3',
      'P',
      'L',
      'Table',
      'TR',
      'TH',
      'TD',
      'Formula',
      'Figure',
      'Link',
    ]) {
      expect(tree).toMatch(new RegExp(`^ *${type}(:|\\s|$)`, 'm'));
    }
    const raw = tool('qpdf', '--qdf', '--object-streams=disable', file, '-').normalize();
    expect(raw).toContain('/Alt (Member C-07 with its end moments');
  });

  test('has a destination for every line and links that all lead to one', async () => {
    const { context } = await PDFDocument.load(bytes);
    const dicts = context
      .enumerateIndirectObjects()
      .flatMap(([, object]) => (object instanceof PDFDict ? [object] : []));
    const goals = dicts
      .filter((dict) => dict.get(PDFName.of('S')) === PDFName.of('GoTo'))
      .map((dict) => dict.lookup(PDFName.of('D'), PDFString).asString());
    const names = new Set(tool('pdfinfo', '-dests', file).match(/line-\d{6}/g));
    expect(names.size).toBe(lines.length);
    expect(goals.length).toBeGreaterThan(8);
    for (const goal of goals) expect(names).toContain(goal);
  });
});

describe('pages', () => {
  const pagesOf = async (blocks: readonly Block[]): Promise<string[]> =>
    (await textOf({ ...sampleDocument, blocks })).split('\f').slice(0, -1);
  const line = lines.find(({ address }) => address === 'c1:theory/Mmax') as LineBlock;
  const many = (count: number): LineBlock[] =>
    Array.from({ length: count }, (_, index) => ({
      ...line,
      address: `x/${index}`,
      number: `7.${100 + index}`,
    }));

  test('never split a line: its number, formula and value stand on one page', async () => {
    for (const page of await pagesOf(many(40))) {
      const numbers = page.match(/^ *7\.\d{3}/gm) ?? [];
      expect(numbers.length).toBeGreaterThan(0);
      expect(page.split(line.text).length - 1).toBe(numbers.length);
      expect(page.split('1613 kip in').length - 1).toBe(numbers.length);
    }
  });

  test('keep a section’s head with its first line, wherever the page ends', async () => {
    for (let before = 1; before <= 16; before += 1) {
      const head: Block = {
        kind: 'lineSection',
        reference: 'E3',
        title: 'Head of a section',
        address: 'h',
        level: 1,
        folded: false,
        outcome: null,
      };
      const pages = await pagesOf([
        ...many(before),
        head,
        { ...line, number: '8.001', address: 'y' },
      ]);
      const page = pages.find((said) => said.includes('Head of a section'));
      expect(page, `after ${before} lines`).toContain('8.001');
    }
  });

  test('repeat the head of a long table', async () => {
    const cell = (words: string) => ({ content: [{ kind: 'text', text: words }] as const });
    const rows = Array.from({ length: 90 }, (_, index) => [cell(`row ${index}`), cell('W12×79')]);
    const head = [cell('Member column'), cell('Section column')];
    const pages = await pagesOf([{ kind: 'table', caption: '', head, rows, widths: [1, 1] }]);
    expect(pages.length).toBeGreaterThan(1);
    for (const page of pages) expect(page).toContain('Member column');
  });

  test('take Letter paper as well', async () => {
    const frame = { ...sampleDocument.frame, paper: 'Letter' } as const;
    const other = join(folder, 'letter.pdf');
    writeFileSync(other, await renderPdf({ ...sampleDocument, frame }, { date, record: null }));
    expect(tool('pdfinfo', other)).toMatch(/Page size: +612 x 792 pts \(letter\)/);
  });

  test('set a formula that no line holds smaller, within its column', async () => {
    const wide = {
      ...line,
      working: ['x', `=${Array.from({ length: 40 }, (_, index) => `a_{${index}}`).join('+')}`],
    };
    const other = join(folder, 'wide.pdf');
    writeFileSync(
      other,
      await renderPdf({ ...sampleDocument, blocks: [wide] }, { date, record: null }),
    );
    const boxes = [...tool('pdftotext', '-bbox', other, '-').matchAll(/xMax="([\d.]+)"/g)];
    expect(boxes.length).toBeGreaterThan(20);
    for (const [, right] of boxes) expect(Number(right)).toBeLessThan(556);
  });
});
