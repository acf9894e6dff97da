import type { MemberDrawing, NamedDrawn, Plane, PlaneDrawing } from './drawing.ts';
import { LEFT } from './frame.ts';
import type { Point, Shape } from './scene.ts';
import { arrow, label, PENS, path, turnArrow } from './shapes.ts';

const TURN_RADIUS = 22;
const SUPPORT = 9;

const VIEW_NAMES: Record<Plane, string> = {
  major: 'elevation, bending about x',
  minor: 'plan, bending about y',
};

interface View {
  readonly drawing: MemberDrawing;
  readonly plane: PlaneDrawing;
  readonly along: (mm: number) => number;
  /** y of the member's axis. */
  readonly axis: number;
  /** Drawn half depth. */
  readonly half: number;
  /** The axial force is drawn on one view only. */
  readonly withAxial: boolean;
}

/** One view of the member, to scale, with its supports, axial force and end moments. */
export function memberView(view: View): Shape[] {
  const { drawing, plane, along, axis, half, withAxial } = view;
  const from = along(0);
  const to = along(drawing.length.value);
  return [
    ...body(from, to, axis, half, plane.plane),
    ...supports(from, to, axis + half),
    ...(withAxial && drawing.axial ? axialForce(drawing.axial, from, to, axis) : []),
    ...endMoment(plane.endA, [from, axis], 'A'),
    ...endMoment(plane.endB, [to, axis], 'B'),
    label('A', [from, axis - half - 5], { anchor: 'middle', weight: 600 }),
    label('B', [to, axis - half - 5], { anchor: 'middle', weight: 600 }),
    label(VIEW_NAMES[plane.plane], [(from + to) / 2, axis + half + 15], {
      anchor: 'middle',
      ink: 'zinc7',
      within: to - from - 2 * SUPPORT,
    }),
  ];
}

function body(from: number, to: number, axis: number, half: number, plane: Plane): Shape[] {
  const outline: Point[] = [
    [from, axis - half],
    [to, axis - half],
    [to, axis + half],
    [from, axis + half],
  ];
  // The axis in elevation; in plan the same line is the web.
  const middle = plane === 'major' ? PENS.axis : PENS.rule;
  return [
    { kind: 'area', points: outline, fill: 'paper', stroke: PENS.outline },
    path(
      [
        [from, axis],
        [to, axis],
      ],
      middle,
    ),
  ];
}

/** A pin at A and a roller at B: held across the member, free to shorten. */
function supports(from: number, to: number, under: number): Shape[] {
  const ground = under + SUPPORT;
  const stand = (x: number): Shape =>
    path(
      [
        [x - SUPPORT, ground + 1],
        [x + SUPPORT, ground + 1],
      ],
      PENS.rule,
    );
  return [
    {
      kind: 'area',
      points: [
        [from, under],
        [from + SUPPORT - 2, ground],
        [from - SUPPORT + 2, ground],
      ],
      fill: 'paper',
      stroke: PENS.outline,
    },
    stand(from),
    {
      kind: 'circle',
      center: [to, under + SUPPORT / 2],
      radius: SUPPORT / 2,
      fill: 'paper',
      stroke: PENS.outline,
    },
    stand(to),
  ];
}

function axialForce(axial: NamedDrawn, from: number, to: number, axis: number): Shape[] {
  if (axial.value === 0) return [];
  const [near, far] = [8, 66];
  const pushes = axial.value > 0;
  const shaft = (x: number, out: 1 | -1): Shape[] => {
    const inner: Point = [x + out * near, axis];
    const outer: Point = [x + out * far, axis];
    return pushes ? arrow(outer, inner, PENS.force) : arrow(inner, outer, PENS.force);
  };
  const text = `${axial.symbol} ${axial.text}`;
  return [
    ...shaft(from, -1),
    ...shaft(to, 1),
    label(text, [from - TURN_RADIUS - 8, axis - 7], { anchor: 'end', within: LEFT - 34 }),
    label(text, [to + TURN_RADIUS + 8, axis - 7], { within: LEFT - 34 }),
  ];
}

/**
 * The couple that acts on the member's end. A positive moment (compression in the upper face)
 * turns end A clockwise and end B anticlockwise.
 */
function endMoment(moment: NamedDrawn, at: Point, end: 'A' | 'B'): Shape[] {
  if (moment.value === 0) return [];
  const up = moment.value > 0;
  const out = end === 'A' ? -1 : 1;
  const middle = end === 'A' ? Math.PI : 0;
  // On the left going up is clockwise, on the right it is anticlockwise.
  const sweep = 0.95 * (up === (end === 'A') ? 1 : -1);
  const text = `${moment.symbol} ${moment.text}`;
  const x = at[0] + out * (TURN_RADIUS + 8);
  return [
    ...turnArrow(at, TURN_RADIUS, middle - sweep, middle + sweep, PENS.force),
    label(text, [x, at[1] + 17], {
      anchor: end === 'A' ? 'end' : 'start',
      within: LEFT - TURN_RADIUS - 10,
    }),
  ];
}
