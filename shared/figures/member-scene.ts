import type { MemberDrawing, NamedDrawn, PlaneDrawing } from './drawing.ts';
import { alongScale, LEFT, WIDTH } from './frame.ts';
import { memberView } from './member-view.ts';
import type { Scene, Shape } from './scene.ts';
import { label, PENS, path } from './shapes.ts';

const ROW = 15;

/**
 * The member to scale: elevation (depth d) and, where the minor axis bends, plan (width bf), held
 * at both ends, with the axial force, the end moments, and its buckling and unbraced lengths as
 * scaled bars.
 */
export function memberScene(drawing: MemberDrawing): Scene {
  const along = alongScale(drawing);
  const perMm = (along(drawing.length.value) - along(0)) / drawing.length.value;
  const centre = (along(0) + along(drawing.length.value)) / 2;
  const shapes: Shape[] = [
    label(`${drawing.section} · ${drawing.length.text}`, [centre, 13], {
      anchor: 'middle',
      weight: 600,
    }),
  ];
  let y = 20;
  for (const plane of views(drawing)) {
    const size = plane.plane === 'major' ? drawing.depth : drawing.width;
    const half = ((size ?? 0) * perMm) / 2;
    const axis = y + Math.max(half + 16, 27);
    const withAxial = plane.plane === 'major';
    shapes.push(...memberView({ drawing, plane, along, axis, half, withAxial }));
    y = axis + Math.max(half + 20, 31);
  }
  const bars = lengthBars(drawing, along, y);
  return {
    width: WIDTH,
    height: Math.ceil(bars.end),
    shapes: [...shapes, ...bars.shapes],
    description: describe(drawing),
  };
}

const unbent = (symbol: string): NamedDrawn => ({ symbol, value: 0, text: '0' });

const UNBENT: PlaneDrawing = {
  plane: 'major',
  endA: unbent('MxA'),
  endB: unbent('MxB'),
  kL: null,
  largest: null,
  required: null,
};

/** The elevation always, the plan only where the minor axis bends. */
const views = (drawing: MemberDrawing): readonly PlaneDrawing[] => [
  drawing.planes.find((p) => p.plane === 'major') ?? UNBENT,
  ...drawing.planes.filter((p) => p.plane === 'minor' && isBent(p)),
];

const isBent = ({ endA, endB }: PlaneDrawing): boolean => endA.value !== 0 || endB.value !== 0;

/** Lengths that print alike share a bar; all bars are measured off from end A. */
function lengthBars(drawing: MemberDrawing, along: (mm: number) => number, top: number) {
  const groups = new Map<string, NamedDrawn[]>();
  for (const length of [{ symbol: 'L', ...drawing.length }, ...drawing.lengths]) {
    const key = String(length.value);
    groups.set(key, [...(groups.get(key) ?? []), length]);
  }
  const shapes: Shape[] = [];
  let y = top;
  for (const group of groups.values()) {
    const [first] = group;
    if (!first) continue;
    y += ROW;
    const end = along(first.value);
    const tick = (x: number): Shape =>
      path(
        [
          [x, y - 8],
          [x, y],
        ],
        PENS.rule,
      );
    shapes.push(
      path(
        [
          [along(0), y - 4],
          [end, y - 4],
        ],
        PENS.rule,
      ),
      tick(along(0)),
      tick(end),
      label(group.map((l) => l.symbol).join(', '), [LEFT - 10, y], {
        anchor: 'end',
        within: LEFT - 12,
      }),
      label(first.text, [end + 8, y], { within: WIDTH - end - 10 }),
    );
  }
  return { shapes, end: y + 10 };
}

function describe(drawing: MemberDrawing): string {
  const { axial } = drawing;
  const force =
    axial === null || axial.value === 0
      ? 'no axial force'
      : `axial ${axial.value > 0 ? 'compression' : 'tension'} ${axial.symbol} ${axial.text}`;
  const moments = drawing.planes
    .filter(isBent)
    .flatMap((p) => [p.endA, p.endB])
    .map((m) => `${m.symbol} ${m.text}`);
  const lengths = drawing.lengths.map((l) => `${l.symbol} ${l.text}`);
  return [
    `Member ${drawing.mark} to scale: ${drawing.section}, ${drawing.length.text} long, held at both ends`,
    force,
    moments.length > 0 ? `end moments ${moments.join(', ')}` : null,
    lengths.length > 0 ? `lengths ${lengths.join(', ')}` : null,
  ]
    .filter((part) => part !== null)
    .join('; ')
    .concat('.');
}
