import { type Formula, movePieces, type Piece } from './formula.ts';
import type { RunWidth } from './measure.ts';
import { setFormula } from './set-formula.ts';

/** Where the ink or a mark begins, em. */
const leftEdge = (formula: Formula): number =>
  Math.min(formula.width, ...formula.pieces.map((piece) => piece.x));

/** Parts side by side from `start` on. */
function joinFormulas(parts: readonly Formula[], start: number): Formula {
  let x = start;
  const pieces: Piece[] = [];
  for (const part of parts) {
    pieces.push(...movePieces(part.pieces, x, 0));
    x += part.width;
  }
  return {
    width: x,
    height: Math.max(0, ...parts.map((part) => part.height)),
    depth: Math.max(0, ...parts.map((part) => part.depth)),
    pieces,
  };
}

/**
 * Sets a formula given as chunks of TeX on as many lines as it needs. A line breaks only between
 * chunks, so a chunk begins with its operator (` = a + b`, ` + c`); it takes chunks while they fit
 * `width`, and later lines are indented by `indent`. A chunk wider than the line stands alone on
 * it, so the caller sees a line wider than `width`. Lengths in em of the base size.
 */
export function breakFormula(
  chunks: readonly string[],
  runWidth: RunWidth,
  { width, indent }: { width: number; indent: number },
): Formula[] {
  const lines: { start: number; end: number; parts: Formula[] }[] = [];
  for (const [index, chunk] of chunks.entries()) {
    // An empty atom before the chunk gives its operator the space it has inside a formula.
    const part = setFormula(index === 0 ? chunk : `{}${chunk}`, runWidth);
    const line = lines.at(-1);
    if (line && line.end + part.width <= width) {
      line.parts.push(part);
      line.end += part.width;
    } else {
      // A later line begins with its ink, not with the space before its operator.
      const start = line ? indent - leftEdge(part) : 0;
      lines.push({ start, end: start + part.width, parts: [part] });
    }
  }
  return lines.map(({ start, parts }) => joinFormulas(parts, start));
}
