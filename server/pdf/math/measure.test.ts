import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import katex from 'katex';
import PDFDocument from 'pdfkit';
import { type Browser, chromium } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { FontSet } from '../font-set.ts';
import type { Formula } from './formula.ts';
import { sampleFormulas } from './sample-formulas.ts';
import { setFormula } from './set-formula.ts';

/** Em of the formula in the browser, px: large, so that rounding to pixels stays small. */
const emPixels = 400;

const styleSheet = fileURLToPath(
  new URL('../../../node_modules/katex/dist/katex.css', import.meta.url),
);

interface Ink {
  readonly what: string;
  /** Left, right, the baseline (glyphs) or foot (drawings), font size or height of the drawing. */
  readonly left: number;
  readonly right: number;
  readonly foot: number;
  readonly size: number;
}

/** Runs in the page: every piece of ink of one formula, from the browser's own layout. */
function readInk(id: string): Ink[] {
  const root = document.getElementById(id) as HTMLElement;
  const origin = (root.querySelector('.origin') as HTMLElement).getBoundingClientRect();
  const inks: Ink[] = [];
  const add = (what: string, rect: DOMRect, foot: number, size: number): void => {
    const left = rect.left - origin.left;
    inks.push({ what, left, right: left + rect.width, foot: foot - origin.bottom, size });
  };
  const canvas = document.createElement('canvas').getContext('2d') as CanvasRenderingContext2D;
  const visit = (node: Node): void => {
    if (node instanceof Text && node.data !== '\u200b') {
      const range = document.createRange();
      range.selectNodeContents(node);
      const rect = range.getBoundingClientRect();
      const style = getComputedStyle(node.parentElement as HTMLElement);
      canvas.font = `${style.fontStyle} ${style.fontWeight} ${style.fontSize} ${style.fontFamily}`;
      const ascent = Math.round(canvas.measureText('x').fontBoundingBoxAscent);
      add(node.data, rect, rect.top + ascent, Number.parseFloat(style.fontSize));
    }
    if (node instanceof SVGElement) {
      // The holder clips a radical's bar at its right.
      const holder = (node.parentElement as HTMLElement).getBoundingClientRect();
      const path = (node.querySelector('path') as SVGPathElement).getBoundingClientRect();
      const right = Math.min(path.right, holder.right);
      add('outline', new DOMRect(path.left, 0, right - path.left, 0), path.bottom, path.height);
      return;
    }
    if (node instanceof HTMLElement && /(frac|overline)-line/.test(node.className)) {
      const rect = node.getBoundingClientRect();
      add('rule', rect, rect.bottom, 0);
    }
    for (const child of node.childNodes) visit(child);
  };
  visit(root.querySelector('.katex-html') as HTMLElement);
  return inks;
}

/** The same from our measure. */
function ownInk(formula: Formula): Ink[] {
  return formula.pieces.flatMap((piece): Ink[] => {
    if (piece.kind === 'mark') return [];
    if (piece.kind === 'glyphs') {
      const { x, y, width, text, size } = piece;
      return [{ what: text, left: x, right: x + width, foot: y, size }];
    }
    if (piece.kind === 'rule') {
      const { x, y, width, thickness } = piece;
      return [{ what: 'rule', left: x, right: x + width, foot: y + thickness, size: 0 }];
    }
    const ends = piece.path.filter((segment) => segment.op !== 'close');
    const [xs, ys] = [ends.map((end) => end.x), ends.map((end) => end.y)];
    const foot = Math.max(...ys);
    const [left, right] = [piece.x + Math.min(...xs), piece.x + Math.max(...xs)];
    return [{ what: 'outline', left, right, foot: piece.y + foot, size: foot - Math.min(...ys) }];
  });
}

const folder = mkdtempSync(join(tmpdir(), 'stanchion-math-'));
const fonts = new FontSet(new PDFDocument({ font: '' }));
let browser: Browser;
let browserInk: Record<string, Ink[]>;

beforeAll(async () => {
  const formulas = Object.entries(sampleFormulas).map(
    ([name, tex]) =>
      `<p id="${name}"><span class="origin"></span>${katex.renderToString(tex, {
        displayMode: true,
        output: 'html',
        trust: true,
        strict: false,
      })}</p>`,
  );
  const page = `<!doctype html><meta charset="utf-8">
    <link rel="stylesheet" href="${pathToFileURL(styleSheet)}">
    <style>
      p { white-space: nowrap; font-size: 16px; margin: 900px 0 }
      .origin { display: inline-block; width: 0; height: 0 }
      .katex, .katex-display { font-size: ${emPixels}px !important; display: inline !important }
      .katex-display > .katex > .katex-html { display: inline !important }
    </style>${formulas.join('\n')}`;
  writeFileSync(join(folder, 'page.html'), page);
  browser = await chromium.launch({
    executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-gpu', '--no-first-run', '--disable-background-networking'],
  });
  const tab = await browser.newPage();
  await tab.goto(pathToFileURL(join(folder, 'page.html')).href);
  await tab.evaluate(async () => {
    await Promise.all([...document.fonts].map((face) => face.load()));
    await document.fonts.ready;
  });
  browserInk = {};
  for (const name of Object.keys(sampleFormulas))
    browserInk[name] = await tab.evaluate(readInk, name);
});

afterAll(async () => {
  await browser?.close();
  rmSync(folder, { recursive: true });
});

describe('our measure of KaTeX’s layout tree against Chromium’s layout of the same tree', () => {
  test.each(Object.entries(sampleFormulas))('%s', (name, tex) => {
    const own = ownInk(setFormula(tex, fonts.width));
    const theirs = (browserInk[name] ?? []).map((ink) => ({
      what: ink.what,
      left: ink.left / emPixels,
      right: ink.right / emPixels,
      foot: ink.foot / emPixels,
      size: ink.size / emPixels,
    }));
    expect(own.map((ink) => ink.what)).toEqual(theirs.map((ink) => ink.what));
    for (const [index, ink] of own.entries()) {
      const there = theirs[index];
      const place = `${name}: piece ${index} "${ink.what}"`;
      for (const side of ['left', 'right', 'foot', 'size'] as const) {
        const difference = Math.abs(ink[side] - (there?.[side] ?? Number.NaN));
        expect(difference, `${place} ${side}`).toBeLessThan(0.005);
      }
    }
  });
});

test('the sample covers the style sheet’s fonts of KaTeX it was written for', () => {
  expect(readFileSync(styleSheet, 'utf8')).toContain('content: "0.19.1"');
});
