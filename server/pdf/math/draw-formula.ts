import type { FontSet } from '../font-set.ts';
import { operator } from '../operators.ts';
import type { Formula, GlyphRun, Outline, Rule } from './formula.ts';

/** Where a formula goes: left end of its baseline and em size, points from the page's top left. */
export interface FormulaPlace {
  readonly x: number;
  readonly y: number;
  readonly size: number;
}

/**
 * Writes a measured formula into the current page, in the current fill colour. The text it carries
 * for extraction is the caller's: a marked-content Span with ActualText around it.
 */
export function drawFormula(
  doc: PDFKit.PDFDocument,
  fonts: FontSet,
  formula: Formula,
  place: FormulaPlace,
): void {
  const glyphs: string[] = [];
  const shapes: string[] = [];
  for (const piece of formula.pieces) {
    if (piece.kind === 'glyphs') glyphs.push(showGlyphs(fonts, piece, place));
    else if (piece.kind === 'rule') shapes.push(fillRule(piece, place));
    else if (piece.kind === 'outline') shapes.push(fillOutline(piece, place));
  }
  if (glyphs.length > 0) doc.addContent(['BT', ...glyphs, 'ET'].join('\n'));
  if (shapes.length > 0) doc.addContent(shapes.join('\n'));
}

function showGlyphs(fonts: FontSet, run: GlyphRun, { x, y, size }: FormulaPlace): string {
  const font = `/${fonts.use(run.face)} ${operator('Tf', run.size * size)}`;
  // PDFKit's page has y downwards: the text matrix turns the glyphs upright again.
  const matrix = operator('Tm', 1, 0, 0, -1, x + run.x * size, y + run.y * size);
  return `${font} ${matrix} ${fonts.shape(run.face, run.text).operator}`;
}

function fillRule(rule: Rule, { x, y, size }: FormulaPlace): string {
  const place = [x + rule.x * size, y + rule.y * size] as const;
  return `${operator('re', ...place, rule.width * size, rule.thickness * size)} f`;
}

function fillOutline(outline: Outline, { x, y, size }: FormulaPlace): string {
  const at = (px: number, py: number) =>
    [x + (outline.x + px) * size, y + (outline.y + py) * size] as const;
  const segments = outline.path.map((segment) => {
    if (segment.op === 'close') return 'h';
    const end = at(segment.x, segment.y);
    if (segment.op !== 'curve') return operator(segment.op === 'move' ? 'm' : 'l', ...end);
    return operator('c', ...at(segment.x1, segment.y1), ...at(segment.x2, segment.y2), ...end);
  });
  return `${segments.join(' ')} f`;
}
