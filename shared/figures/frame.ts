import { scaleLinear } from 'd3-scale';
import type { MemberDrawing } from './drawing.ts';

/** Width of the figures of a sheet; the member stands between the margins for labels. */
export const WIDTH = 640;
export const LEFT = 112;
export const RIGHT = WIDTH - 112;

/** Largest drawn depth of a member, so that a stocky one leaves room for the rest. */
const DEEPEST = 96;

/**
 * Place along the member (mm from end A) to x. One scale for all views and diagrams of a member, so
 * that they stand under each other; longer buckling lengths than the member still fit.
 */
export function alongScale(drawing: MemberDrawing): (mm: number) => number {
  const longest = Math.max(drawing.length.value, ...drawing.lengths.map((l) => l.value));
  const deepest = Math.max(drawing.depth ?? 0, drawing.width ?? 0);
  const perMm = Math.min((RIGHT - LEFT) / longest, deepest > 0 ? DEEPEST / deepest : Infinity);
  return scaleLinear()
    .domain([0, longest])
    .range([LEFT, LEFT + longest * perMm]);
}
