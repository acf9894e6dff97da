import { scaleLinear } from 'd3-scale';
import type { Sample } from './bay-curve.ts';
import {
  baseLine,
  curvePoints,
  type DiagramFrame,
  filled,
  heldPlaces,
  keyEntry,
} from './diagram-parts.ts';
import type { MemberDrawing, PlaneDrawing, ShearDrawing } from './drawing.ts';
import { alongScale, WIDTH } from './frame.ts';
import { curveBoxes, type Label, placeLabels } from './place-labels.ts';
import { shearAlong } from './plane-curves.ts';
import type { Point, Scene, Shape } from './scene.ts';
import { label, PENS, path, segment } from './shapes.ts';

const TOP = 34;
const TALL = 46;
const MARGIN = 16;

/**
 * First-order shear along the member in one plane, the slope of the moment: positive upwards where
 * the moment grows from A to B. Null where the sheet checks no shear, or its diagram is not known.
 */
export function shearDiagram(drawing: MemberDrawing, plane: PlaneDrawing): Scene | null {
  const { shear } = plane;
  if (!shear || shear.marks.length === 0) return null;
  const length = drawing.length.value;
  const samples = shearAlong(plane, length);
  const level = shear.given ? shear.used.value : 0;
  const all = samples.map((s) => s.value);
  const [low, high] = [Math.min(0, ...all), Math.max(0, level, ...all)];
  const frame: DiagramFrame = {
    along: alongScale(drawing),
    up: scaleLinear()
      .domain([low, high])
      .range([TOP + TALL, TOP]),
    length,
  };
  const curve = curvePoints(samples, frame);
  const height = TOP + TALL + (low < 0 ? MARGIN : 6);
  const shapes: Shape[] = [
    filled(curve, frame.up(0), 'zinc1'),
    ...heldPlaces(drawing, plane.plane, samples, frame),
    baseLine(frame),
    path(
      [[frame.along(0), frame.up(0)], ...curve, [frame.along(length), frame.up(0)]],
      PENS.outline,
    ),
    ...(shear.given ? givenLevel(shear, frame) : []),
    ...labels(shear, curve, frame),
    label(plane.plane === 'major' ? 'Shear, bending about x' : 'Shear, bending about y', [0, 13], {
      weight: 600,
    }),
    ...keyEntry(WIDTH - 102, 'first order', PENS.outline),
  ];
  return { width: WIDTH, height, shapes, description: describe(plane, shear, samples) };
}

/** A shear that the analysis gives has no place: a level. */
function givenLevel({ used }: ShearDrawing, { along, up, length }: DiagramFrame): Shape[] {
  const y = up(used.value);
  return [
    segment([along(0), y], [along(length), y], PENS.level),
    segment([190, 9], [216, 9], PENS.level),
    label(`check uses ${used.text}`, [222, 13], { ink: 'zinc7', within: 176 }),
  ];
}

/** Ends of bays and forces; the largest stands first, so it always has its place. */
function labels(
  { marks, used }: ShearDrawing,
  curve: readonly Point[],
  frame: DiagramFrame,
): Shape[] {
  const { along, up, length } = frame;
  const size = (value: number): number => Math.abs(value);
  const bySize = [...marks].sort((a, b) => size(b.value) - size(a.value));
  const wanted = bySize.map(({ at, value, text }): Label[] => {
    const largest = size(value) >= (1 - 1e-9) * used.value;
    const weight = largest ? 600 : 400;
    const y = up(value);
    if (at === 0) return [label(text, [along(0) - 8, y + 4], { anchor: 'end', weight }) as Label];
    if (at === length) return [label(text, [along(length) + 8, y + 4], { weight }) as Label];
    const outward = value < 0 ? y + 12 : y - 4;
    return [
      label(text, [along(at), outward], { anchor: 'middle', weight }) as Label,
      label(text, [along(at) + 2, outward], { weight }) as Label,
      label(text, [along(at) - 2, outward], { anchor: 'end', weight }) as Label,
    ];
  });
  return placeLabels(wanted, curveBoxes(curve));
}

function describe(plane: PlaneDrawing, shear: ShearDrawing, samples: readonly Sample[]): string {
  const axis = plane.plane === 'major' ? 'major' : 'minor';
  const steps = samples.length > 0 && plane.loads.some((load) => load.kind === 'point');
  const [first] = shear.marks;
  const last = shear.marks.at(-1);
  const ends = first && last ? `: ${first.text} at end A, ${last.text} at end B` : '';
  const used = `${shear.given ? 'The check uses the given' : 'Largest'} ${shear.used.text}.`;
  return `First-order shear in bending about the ${axis} axis${steps ? ', with a step at every force' : ''}${ends}. ${used}`;
}
