import { scaleLinear } from 'd3-scale';
import { describeMoments } from './describe-moments.ts';
import {
  baseLine,
  curvePoints,
  type DiagramFrame,
  filled,
  heldPlaces,
  keyEntry,
} from './diagram-parts.ts';
import type { MemberDrawing, MomentMark, PlaneDrawing } from './drawing.ts';
import { alongScale, LEFT, WIDTH } from './frame.ts';
import { isBent } from './is-bent.ts';
import { type Box, boxOf, curveBoxes, type Label, placeLabels } from './place-labels.ts';
import { firstOrderMoments, secondOrderMoments } from './plane-curves.ts';
import type { Point, Scene, Shape } from './scene.ts';
import { label, PENS, path, segment, textWidth } from './shapes.ts';

const TOP = 36;
const TALL = 54;
/** With moments on both sides of the member's axis. */
const TALL_BOTH = 88;
/** Under the lowest moment: the mark of a largest one that is negative. */
const UNDER = 17;

/**
 * First- and second-order moments along the member in one plane, over all its bays, on the
 * compressed side, with the largest marked. Null where the plane has no moment, or where the
 * moments between the ends are not known. Without a stable second-order solution, and in tension,
 * only the first order is drawn.
 */
export function momentDiagram(drawing: MemberDrawing, plane: PlaneDrawing): Scene | null {
  if (!isBent(plane) || plane.bays.length === 0) return null;
  const length = drawing.length.value;
  const first = firstOrderMoments(plane, length);
  const second = secondOrderMoments(plane, length);
  // In tension the sheet has moments of first order only: they are the ones it uses.
  const used = second ?? (plane.tension ? first : null);
  const marks: readonly MomentMark[] = used
    ? [...(plane.largest ? [plane.largest] : []), ...plane.extremes]
    : [];
  const all = [...first, ...(second ?? []), ...marks, ...plane.required].map((s) => s.value);
  const [low, high] = [Math.min(0, ...all), Math.max(0, ...all)];
  const both = -low > 0.15 * high && high > -0.15 * low && plane.bays.length + marks.length > 2;
  const bottom = TOP + (both ? TALL_BOTH : TALL);
  const frame: DiagramFrame = {
    along: alongScale(drawing),
    up: scaleLinear().domain([low, high]).range([bottom, TOP]),
    length,
  };
  const height = bottom + (low < 0 ? UNDER : 8);
  const shapes: Shape[] = [
    ...(used ? [filled(curvePoints(used, frame), frame.up(0), 'oxide2')] : []),
    ...heldPlaces(drawing, plane.plane, used ?? first, frame),
    baseLine(frame),
    ...(second || !plane.tension ? [path(curvePoints(first, frame), PENS.first)] : []),
    ...(used ? [path(curvePoints(used, frame), PENS.second)] : []),
    ...requiredLevels(plane, frame),
    ...(used ? ordinates(plane, marks, frame) : []),
    ...labels(plane, used !== null, curvePoints(used ?? first, frame), frame),
    ...head(plane, second !== null),
  ];
  return { width: WIDTH, height, shapes, description: describeMoments(plane, second) };
}

/** The largest as an ordinate with a dot, other extremes as dots. */
function ordinates(
  { largest }: PlaneDrawing,
  marks: readonly MomentMark[],
  { along, up }: DiagramFrame,
): Shape[] {
  return marks.flatMap((mark): Shape[] => {
    const at: Point = [along(mark.place.value), up(mark.value)];
    const isLargest = mark === largest;
    return [
      ...(isLargest ? [segment(at, [at[0], up(0)], PENS.outline)] : []),
      { kind: 'circle', center: at, radius: isLargest ? 3 : 2.25, fill: 'oxide' },
    ];
  });
}

/** Texts at the ends, of the largest and, as far as there is room, over held points and between. */
function labels(
  plane: PlaneDrawing,
  withMarks: boolean,
  curve: readonly Point[],
  frame: DiagramFrame,
): Shape[] {
  const { largest, supports, extremes } = plane;
  const ends = endLabels(plane, frame);
  const most = Math.max(0, ...supports.map((s) => Math.abs(s.value)));
  const isMost = (s: MomentMark) => largest === null && Math.abs(s.value) === most;
  const marked = withMarks && largest ? [largest] : supports.filter(isMost).slice(0, 1);
  const named = marked.flatMap((m) =>
    beside(m, `${m.text} ${m.place.words}`, 600, frame).slice(0, 1),
  );
  const others = [...supports, ...(withMarks ? extremes : [])].filter(
    (m) => m.value !== 0 && !marked.includes(m),
  );
  const placed = placeLabels(
    others.map((m) => beside(m, m.text, 400, frame)),
    [...[...ends, ...named].map(boxOf), ...curveBoxes(curve), ...levelBoxes(plane, frame)],
  );
  return [...ends, ...named, ...placed];
}

const levelBoxes = ({ required }: PlaneDrawing, { along, up }: DiagramFrame): Box[] =>
  required.map(({ from, to, value }) => ({
    ...{ left: along(from), right: along(to) },
    ...{ top: up(value) - 1, bottom: up(value) + 1 },
  }));

/** Places of a text beyond the curve at a moment, else a little to either side. */
function beside(
  { place, value, crest }: MomentMark,
  text: string,
  weight: 400 | 600,
  { along, up, length }: DiagramFrame,
): Label[] {
  const half = textWidth(text) / 2;
  const [x, y] = [along(place.value), up(value)];
  const within = (middle: number) =>
    Math.max(along(0) + half, Math.min(along(length) - half, middle));
  const beyond = crest ? -7 : 13;
  return [0, half / 2, -half / 2, half + 8, -half - 8].map(
    (shift) => label(text, [within(x + shift), y + beyond], { anchor: 'middle', weight }) as Label,
  );
}

function endLabels({ endA, endB }: PlaneDrawing, { along, up, length }: DiagramFrame): Label[] {
  const [from, to] = [along(0), along(length)];
  const at = (moment: number): number => up(moment) + 4;
  return [
    label(endA.text, [from - 8, at(endA.value)], { anchor: 'end', within: LEFT - 10 }) as Label,
    label(endB.text, [to + 8, at(endB.value)], { within: WIDTH - to - 10 }) as Label,
  ];
}

/** The moments of the strength checks as levels, where the curve does not show them. */
function requiredLevels({ required }: PlaneDrawing, { along, up }: DiagramFrame): Shape[] {
  const largest = required.reduce<(typeof required)[number] | null>(
    (most, one) => (Math.abs(one.value) > Math.abs(most?.value ?? 0) ? one : most),
    null,
  );
  if (!largest) return [];
  return [
    ...required.map((level) =>
      segment([along(level.from), up(level.value)], [along(level.to), up(level.value)], PENS.level),
    ),
    label(`check uses ${largest.text}`, [222, 13], { ink: 'zinc7', within: 176 }),
    segment([190, 9], [216, 9], PENS.level),
  ];
}

/** Title at the left, meaning of the lines at the right. */
function head(plane: PlaneDrawing, withSecond: boolean): Shape[] {
  const title =
    plane.plane === 'major' ? 'Moment about x (major axis)' : 'Moment about y (minor axis)';
  const firstPen = plane.tension && !withSecond ? PENS.second : PENS.first;
  return [
    label(plane.swayed ? `${title}, no sway` : title, [0, 13], { weight: 600, within: 184 }),
    ...(withSecond ? keyEntry(WIDTH - 230, 'second order', PENS.second) : []),
    ...keyEntry(WIDTH - 102, 'first order', firstPen),
  ];
}
