import type { Sample } from './bay-curve.ts';
import type { PlaneDrawing } from './drawing.ts';

/** What a diagram of moments shows, in words; `second` is null where that curve is not drawn. */
export function describeMoments(plane: PlaneDrawing, second: readonly Sample[] | null): string {
  const { endA, endB, largest, supports, extremes } = plane;
  const axis = plane.plane === 'major' ? 'major' : 'minor';
  const curvature = endA.value * endB.value < 0 ? 'reverse' : 'single';
  const ofEnds =
    endA.value * endB.value === 0 ? 'one end without moment' : `${curvature} curvature`;
  const loaded = plane.loads.length > 0;
  const shape =
    plane.bays.length > 1
      ? `continuous over ${supports.map((s) => s.place.words.replace('over ', '')).join(', ')}`
      : loaded && endA.value === 0 && endB.value === 0
        ? 'no end moments'
        : ofEnds;
  const ends = `Moments about the ${axis} axis, ${shape}: ${endA.symbol} ${endA.text} at end A, ${endB.symbol} ${endB.text} at end B`;
  const over = supports.map((s) => `, ${s.text} ${s.place.words}`).join('');
  const sway = plane.swayed ? ' Moments from lateral translation are not drawn.' : '';
  const [used] = [...plane.required].sort((a, b) => Math.abs(b.value) - Math.abs(a.value));
  const more = `${sway}${used ? ` The check uses ${used.text}.` : ''}`;
  if (second === null && !plane.tension)
    return `${ends}${over}. No second-order curve: the sheet has no stable solution for it.${more}`;
  const order = second === null ? 'first' : 'second';
  const others = extremes.map((e) => ` Between, ${e.text} ${e.place.words}.`).join('');
  const tension = second === null ? ' In tension the first-order moments stand.' : '';
  if (!largest) return `${ends}${over}, with the ${order}-order curve.${others}${tension}${more}`;
  return `${ends}${over}. Largest ${order}-order moment ${largest.text} ${largest.place.words}.${others}${tension}${more}`;
}
