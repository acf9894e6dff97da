import type { MemberDrawing, NamedDrawn, Plane, PlaneDrawing } from './drawing.ts';
import { LEFT } from './frame.ts';
import { isBent } from './is-bent.ts';
import { loadMarks } from './load-marks.ts';
import { type Label, placeLabels } from './place-labels.ts';
import { holdMarks, isSeen, isSupport, supportMarks } from './restraint-marks.ts';
import type { Point, Shape } from './scene.ts';
import { arrow, label, moved, PENS, segment, turnArrow } from './shapes.ts';

const TURN_RADIUS = 22;
const SUPPORT_TURN = 15;
const SUPPORT = 9;
const ROW = 13;

const VIEW_NAMES: Record<Plane, string> = {
  major: 'elevation, bending about x',
  minor: 'plan, bending about y',
};

/** Said where forces stand too close for their values. */
const NUMBERED = 'forces by the number of their load';
/** Said where the sheet has no moments between the ends of a plane that is bent. */
const UNKNOWN = 'moments between the ends not known';

interface View {
  readonly drawing: MemberDrawing;
  readonly plane: PlaneDrawing;
  readonly along: (mm: number) => number;
  /** y of the view's upper edge. */
  readonly top: number;
  /** Drawn half depth. */
  readonly half: number;
  /** The axial force is drawn on one view only. */
  readonly withAxial: boolean;
}

/**
 * One view of the member, to scale, with its supports, axial force, end moments, restraints, moments
 * over held points and loads; `bottom` is its lower edge.
 */
export function memberView(view: View): { readonly shapes: Shape[]; readonly bottom: number } {
  const { drawing, plane, along, top, half, withAxial } = view;
  const from = along(0);
  const to = along(drawing.length.value);
  const seen = drawing.held.filter((held) => isSeen(held, plane.plane));
  const loads = loadMarks(plane.loads, along, half);
  const axis = top + Math.max(half + 16, 27, loads.above + 4);
  const held = seen.filter((h) => isSupport(h, plane.plane)).map((h) => along(h.place.value));
  const under = Math.max(half + SUPPORT + 2, loads.below);
  const bare = seen.length === 0 && plane.loads.length === 0;
  const names = bare
    ? { shapes: endNames(from, to, axis - half - 5), rows: 0 }
    : namesUnder(view, axis + under + ROW - 1);
  const name = axis + (bare ? half : under + names.rows * ROW) + 15;
  return {
    shapes: [
      ...body(from, to, axis, half, plane.plane),
      ...supportMarks(from, [...held, to], axis + half),
      ...loads.shapes.map((shape) => moved(shape, 0, axis)),
      ...seen.flatMap((h) => holdMarks(h, along(h.place.value), axis, half, plane.plane)),
      ...(withAxial && drawing.axial ? axialForce(drawing.axial, from, to, axis) : []),
      ...endMoment(plane.endA, [from, axis], 'A'),
      ...endMoment(plane.endB, [to, axis], 'B'),
      ...plane.supports.flatMap((s) => supportMoment(s.value, [along(s.place.value), axis])),
      ...names.shapes,
      label(
        [
          VIEW_NAMES[plane.plane],
          ...(loads.numbered ? [NUMBERED] : []),
          ...(isUnknown(plane) ? [UNKNOWN] : []),
        ].join('; '),
        [(from + to) / 2, name],
        {
          anchor: 'middle',
          ink: 'zinc7',
          within: to - from - 2 * SUPPORT,
        },
      ),
    ],
    bottom: bare ? axis + Math.max(half + 20, 31) : name + 5,
  };
}

const isUnknown = (plane: PlaneDrawing): boolean => isBent(plane) && plane.bays.length === 0;

const endNames = (from: number, to: number, y: number): Shape[] => [
  label('A', [from, y], { anchor: 'middle', weight: 600 }),
  label('B', [to, y], { anchor: 'middle', weight: 600 }),
];

/** Names of the ends and the held points under the view, and the moments over them. */
function namesUnder({ drawing, plane, along }: View, y: number) {
  const at = (text: string, z: number, down: number, weight: 400 | 600): Label =>
    label(text, [along(z), y + down], { anchor: 'middle', weight }) as Label;
  const seen = drawing.held.filter((held) => isSeen(held, plane.plane));
  const supports = seen.filter((held) => isSupport(held, plane.plane));
  const others = seen.filter((held) => !supports.includes(held));
  const names = placeLabels([
    [at('A', 0, 0, 600)],
    [at('B', drawing.length.value, 0, 600)],
    ...[...supports, ...others].map((held) => [at(held.name, held.place.value, 0, 600)]),
  ]);
  const moments = placeLabels(plane.supports.map((s) => [at(s.text, s.place.value, ROW, 400)]));
  return { shapes: [...names, ...moments], rows: moments.length > 0 ? 2 : 1 };
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
    segment([from, axis], [to, axis], middle),
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
  const text = `${moment.symbol} ${moment.text}`;
  const x = at[0] + (end === 'A' ? -1 : 1) * (TURN_RADIUS + 8);
  return [
    ...couple(moment.value, at, end, TURN_RADIUS, 0.95),
    label(text, [x, at[1] + 17], {
      anchor: end === 'A' ? 'end' : 'start',
      within: LEFT - TURN_RADIUS - 10,
    }),
  ];
}

/** The couples on the two bays that meet over a held point, each drawn as at the bay's own end. */
const supportMoment = (moment: number, at: Point): Shape[] =>
  moment === 0
    ? []
    : (['A', 'B'] as const).flatMap((end) => couple(moment, at, end, SUPPORT_TURN, 0.8));

function couple(moment: number, at: Point, end: 'A' | 'B', radius: number, reach: number): Shape[] {
  const up = moment > 0;
  const middle = end === 'A' ? Math.PI : 0;
  // On the left going up is clockwise, on the right it is anticlockwise.
  const sweep = reach * (up === (end === 'A') ? 1 : -1);
  return turnArrow(at, radius, middle - sweep, middle + sweep, PENS.force);
}
