import { scaleLinear } from 'd3-scale';
import type { MemberDrawing, PlaneDrawing } from './drawing.ts';
import { alongScale, LEFT, WIDTH } from './frame.ts';
import { firstOrderSamples, type Sample, secondOrderSamples } from './moment-curve.ts';
import type { Point, Scene, Shape } from './scene.ts';
import { label, PENS, path, textWidth } from './shapes.ts';

const TOP = 36;
const TALL = 54;
/** Under the lowest moment: the mark of a largest one that is negative. */
const UNDER = 17;

/**
 * First- and second-order moments along the member in one plane, on the compressed side, with the
 * largest marked. Null where the plane has no moment. Without a stable second-order solution only
 * the first order is drawn.
 */
export function momentDiagram(drawing: MemberDrawing, plane: PlaneDrawing): Scene | null {
  if (plane.endA.value === 0 && plane.endB.value === 0) return null;
  const first = firstOrderSamples(plane.endA.value, plane.endB.value);
  const second =
    plane.kL === null ? null : secondOrderSamples(plane.endA.value, plane.endB.value, plane.kL);
  const along = alongScale(drawing);
  const length = drawing.length.value;
  const all = [...first, ...(second ?? [])].map((s) => s.moment);
  if (second && plane.largest) all.push(plane.largest.value);
  if (plane.required) all.push(plane.required.value);
  const up = scaleLinear()
    .domain([Math.min(0, ...all), Math.max(0, ...all)])
    .range([TOP + TALL, TOP]);
  const points = (samples: readonly Sample[]): Point[] =>
    samples.map((s) => [along(s.part * length), up(s.moment)]);
  const base = up(0);
  const shapes: Shape[] = [
    ...(second ? [filled(points(second), base)] : []),
    path(
      [
        [along(0), base],
        [along(length), base],
      ],
      PENS.rule,
    ),
    path(points(first), PENS.first),
    ...(second ? [path(points(second), PENS.second)] : []),
    ...endLabels(plane, along(0), along(length), up),
    ...requiredLevel(plane, along(0), along(length), up),
    ...(second ? largestMark(plane, along, along(length), up) : []),
    ...head(plane, second !== null),
  ];
  const height = TOP + TALL + (Math.min(0, ...all) < 0 ? UNDER : 6);
  return { width: WIDTH, height, shapes, description: describe(plane, second) };
}

const filled = (curve: readonly Point[], base: number): Shape => {
  const [start] = curve;
  const end = curve.at(-1);
  const closing: Point[] =
    start && end
      ? [
          [end[0], base],
          [start[0], base],
        ]
      : [];
  return { kind: 'area', points: [...curve, ...closing], fill: 'oxide2' };
};

function endLabels(
  plane: PlaneDrawing,
  from: number,
  to: number,
  up: (moment: number) => number,
): Shape[] {
  const at = (moment: number): number => up(moment) + 4;
  return [
    label(plane.endA.text, [from - 8, at(plane.endA.value)], {
      anchor: 'end',
      within: LEFT - 10,
    }),
    label(plane.endB.text, [to + 8, at(plane.endB.value)], { within: WIDTH - to - 10 }),
  ];
}

function largestMark(
  plane: PlaneDrawing,
  along: (mm: number) => number,
  end: number,
  up: (moment: number) => number,
): Shape[] {
  const { largest } = plane;
  if (!largest) return [];
  const x = along(largest.place.value);
  const y = up(largest.value);
  const outward = largest.value < 0 ? 13 : -7;
  const text = `${largest.text} ${largest.place.words}`;
  const half = textWidth(text) / 2;
  const middle = Math.max(along(0) + half, Math.min(end - half, x));
  return [
    path(
      [
        [x, y],
        [x, up(0)],
      ],
      PENS.outline,
    ),
    { kind: 'circle', center: [x, y], radius: 3, fill: 'oxide' },
    label(text, [middle, y + outward], { anchor: 'middle', weight: 600 }),
  ];
}

/** The moment of the strength check as a level, where it is not the marked one. */
function requiredLevel(
  { required }: PlaneDrawing,
  from: number,
  to: number,
  up: (moment: number) => number,
): Shape[] {
  if (!required) return [];
  const y = up(required.value);
  return [
    path(
      [
        [from, y],
        [to, y],
      ],
      PENS.level,
    ),
    label(`check uses ${required.text}`, [222, 13], { ink: 'zinc7', within: 176 }),
    path(
      [
        [190, 9],
        [216, 9],
      ],
      PENS.level,
    ),
  ];
}

/** Title at the left, meaning of the two lines at the right. */
function head(plane: PlaneDrawing, withSecond: boolean): Shape[] {
  const title =
    plane.plane === 'major' ? 'Moment about x (major axis)' : 'Moment about y (minor axis)';
  const key = (x: number, text: string, pen: (typeof PENS)['first' | 'second']): Shape[] => [
    path(
      [
        [x, 9],
        [x + 26, 9],
      ],
      pen,
    ),
    label(text, [x + 32, 13], { ink: 'zinc7' }),
  ];
  return [
    label(title, [0, 13], { weight: 600 }),
    ...(withSecond ? key(WIDTH - 230, 'second order', PENS.second) : []),
    ...key(WIDTH - 102, 'first order', PENS.first),
  ];
}

function describe(plane: PlaneDrawing, second: readonly Sample[] | null): string {
  const { endA, endB, largest } = plane;
  const axis = plane.plane === 'major' ? 'major' : 'minor';
  const curvature = endA.value * endB.value < 0 ? 'reverse' : 'single';
  const shape = endA.value * endB.value === 0 ? 'one end without moment' : `${curvature} curvature`;
  const used = plane.required ? ` The check uses ${plane.required.text}.` : '';
  const ends = `Moments about the ${axis} axis, ${shape}: ${endA.symbol} ${endA.text} at end A, ${endB.symbol} ${endB.text} at end B`;
  if (second === null)
    return `${ends}. No second-order curve: the sheet has no stable solution for it.${used}`;
  if (!largest) return `${ends}, with the second-order curve.${used}`;
  return `${ends}. Largest second-order moment ${largest.text} ${largest.place.words}.${used}`;
}
