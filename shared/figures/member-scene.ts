import { describeMember } from './describe-member.ts';
import type { MemberDrawing, NamedDrawn, PlaneDrawing } from './drawing.ts';
import { alongScale, WIDTH } from './frame.ts';
import { isBent } from './is-bent.ts';
import { lengthRows } from './length-rows.ts';
import { memberView } from './member-view.ts';
import { markKey } from './restraint-marks.ts';
import type { Scene, Shape } from './scene.ts';
import { label } from './shapes.ts';

const TOP = 20;
const KEY_ROW = 17;
const KEY_GAP = 4;

/**
 * The member to scale: elevation (depth d) and, where the minor axis bends, plan (width bf), with its
 * supports and restraints, loads, axial force, end moments and moments over held points, and its
 * buckling and unbraced lengths as scaled bars.
 */
export function memberScene(drawing: MemberDrawing): Scene {
  const along = alongScale(drawing);
  const perMm = (along(drawing.length.value) - along(0)) / drawing.length.value;
  const centre = (along(0) + along(drawing.length.value)) / 2;
  const shapes: Shape[] = [
    label(`${drawing.section} · ${drawing.length.text}`, [centre, 13], {
      anchor: 'middle',
      weight: 600,
      within: WIDTH,
    }),
  ];
  let y = TOP;
  for (const plane of views(drawing)) {
    const size = plane.plane === 'major' ? drawing.depth : drawing.width;
    const half = ((size ?? 0) * perMm) / 2;
    const withAxial = plane.plane === 'major';
    const view = memberView({ drawing, plane, along, top: y, half, withAxial });
    shapes.push(...view.shapes);
    y = view.bottom;
  }
  if (drawing.held.length > 0) {
    y += KEY_ROW;
    shapes.push(...markKey(drawing.held, along(0), y));
    y += KEY_GAP;
  }
  const rows = lengthRows(drawing, along, y);
  return {
    width: WIDTH,
    height: Math.ceil(rows.end),
    shapes: [...shapes, ...rows.shapes],
    description: describeMember(drawing),
  };
}

const unbent = (symbol: string): NamedDrawn => ({ symbol, value: 0, text: '0' });

const UNBENT: PlaneDrawing = {
  plane: 'major',
  endA: unbent('MxA'),
  endB: unbent('MxB'),
  supports: [],
  loads: [],
  bays: [],
  tension: false,
  swayed: false,
  largest: null,
  extremes: [],
  required: [],
  shear: null,
};

/** The elevation always, the plan only where the minor axis bends. */
const views = (drawing: MemberDrawing): readonly PlaneDrawing[] => [
  drawing.planes.find((p) => p.plane === 'major') ?? UNBENT,
  ...drawing.planes.filter((p) => p.plane === 'minor' && isBent(p)),
];
