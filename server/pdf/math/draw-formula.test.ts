import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import PDFDocument from 'pdfkit';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { FontSet } from '../font-set.ts';
import { drawFormula } from './draw-formula.ts';
import { sampleFormulas } from './sample-formulas.ts';
import { setFormula } from './set-formula.ts';

const folder = mkdtempSync(join(tmpdir(), 'stanchion-draw-'));
const file = join(folder, 'formulas.pdf');
const tool = (name: string, ...args: string[]): string =>
  execFileSync(name, [...args], { encoding: 'utf8' });

beforeAll(async () => {
  const doc = new PDFDocument({ font: '', size: 'A4', margin: 0 });
  const parts: Buffer[] = [];
  doc.on('data', (part: Buffer) => parts.push(part));
  const ended = new Promise((resolve) => doc.on('end', resolve));
  const fonts = new FontSet(doc);
  let y = 40;
  for (const [name, tex] of Object.entries(sampleFormulas)) {
    const formula = setFormula(tex, fonts.width);
    if (y + (formula.height + formula.depth) * 11 > 800) {
      doc.addPage();
      y = 40;
    }
    y += formula.height * 11;
    doc.markContent('Span', { actual: `formula ${name}` });
    drawFormula(doc, fonts, formula, { x: 40, y, size: 11 });
    doc.endMarkedContent();
    y += formula.depth * 11 + 12;
  }
  doc.end();
  await ended;
  writeFileSync(file, Buffer.concat(parts));
});

afterAll(() => rmSync(folder, { recursive: true }));

test('every formula is found in the page by the text given for it, and by nothing else', () => {
  const lines = tool('pdftotext', '-layout', file, '-')
    .split(/\s*\n\s*/)
    .map((line) => line.trim());
  const wanted = Object.keys(sampleFormulas).map((name) => `formula ${name}`);
  expect(lines.filter((line) => line !== '' && line !== '\f')).toEqual(wanted);
});

test('qpdf finds nothing wrong', () => {
  expect(tool('qpdf', '--check', file)).toContain('No syntax or stream encoding errors found');
});

test('the glyphs come from KaTeX’s fonts, embedded and subset', () => {
  const rows = tool('pdffonts', file).trim().split('\n').slice(2);
  expect(rows.length).toBeGreaterThan(5);
  for (const row of rows)
    expect(row).toMatch(/^[A-Z]{6}\+KaTeX_\S+ +CID TrueType +Identity-H +yes yes yes/);
});
