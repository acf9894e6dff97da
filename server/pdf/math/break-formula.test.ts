import PDFDocument from 'pdfkit';
import { describe, expect, test } from 'vitest';
import { FontSet } from '../font-set.ts';
import { breakFormula } from './break-formula.ts';
import type { Formula } from './formula.ts';
import { setFormula } from './set-formula.ts';

const fonts = new FontSet(new PDFDocument({ font: '' }));
const chunks = [
  '{M_{max}}',
  String.raw` = {M_A}\,\dfrac{\sqrt{1 - 2\psi\cos{kL} + \psi^{2}}}{\sin{kL}}`,
  String.raw` = 118.0\,\dfrac{\sqrt{1 - 2(0.8814)(0.3753) + 0.8814^{2}}}{0.9269}`,
];
const breakAt = (width: number): Formula[] =>
  breakFormula(chunks, fonts.width, { width, indent: 2 });
const inkStart = (line: Formula | undefined): number =>
  Math.min(...(line?.pieces ?? []).map((piece) => piece.x));

describe('a formula in chunks', () => {
  test('stands on one line where it fits, with the spacing of the unbroken formula', () => {
    const whole = setFormula(chunks.join(''), fonts.width);
    const lines = breakAt(whole.width + 0.001);
    expect(lines).toHaveLength(1);
    expect(lines[0]?.width).toBeCloseTo(whole.width, 9);
    expect(lines[0]?.height).toBe(whole.height);
    const places = (formula: Formula | undefined): number[] =>
      (formula?.pieces ?? []).map((piece) => Math.round(piece.x * 1e6));
    expect(places(lines[0])).toEqual(places(whole));
  });

  test('goes on in an indented line where it doesn’t fit', () => {
    const whole = setFormula(chunks.join(''), fonts.width);
    const lines = breakAt(whole.width - 0.001);
    expect(lines).toHaveLength(2);
    expect(inkStart(lines[0])).toBe(0);
    expect(inkStart(lines[1])).toBeCloseTo(2, 9);
    for (const line of lines) expect(line.width).toBeLessThan(whole.width);
  });

  test('keeps a chunk wider than the line in one piece, for the caller to see', () => {
    const lines = breakAt(4);
    expect(lines).toHaveLength(3);
    expect(lines[1]?.width).toBeGreaterThan(4);
  });

  test('keeps the box and address of each operand', () => {
    const tex = String.raw`x + \htmlData{ref=c1:A8/B1}{{B_1}} + y`;
    const [line] = breakFormula([tex], fonts.width, { width: 99, indent: 0 });
    const mark = line?.pieces.find((piece) => piece.kind === 'mark');
    const bare = setFormula('{B_1}', fonts.width);
    const before = setFormula('x +{}', fonts.width);
    expect(mark).toMatchObject({ attributes: { 'data-ref': 'c1:A8/B1' } });
    expect(mark?.width).toBeCloseTo(bare.width, 4);
    expect(mark?.x).toBeCloseTo(before.width, 4);
    expect(mark?.depth).toBeCloseTo(bare.depth, 9);
  });
});
