import { scaleLinear } from 'd3-scale';
import type { InteractionPoint } from './drawing.ts';
import type { Point, Scene, Shape } from './scene.ts';
import { cutTo, label, PENS, path, segment } from './shapes.ts';

const WIDTH = 424;
const HEIGHT = 242;
const PLOT = { left: 40, right: 226, top: 24, bottom: 204 };
const LISTED = 12;
const ROW = 15.5;

/** ANSI/AISC 360-22 H1-1a and H1-1b as a line of moment utilisation against Pr/Pc. */
const ENVELOPE: readonly Point[] = [
  [0, 1],
  [0.9, 0.2],
  [1, 0],
];

/** Least part of the tension side that is drawn, so that its name fits. */
const LEAST_TENSION = 0.3;

/**
 * Every combination as a point of the interaction diagram: across, the sum of the moment ratios;
 * upwards, Pr/Pc, and in tension (H1.2, the same limit) downwards. Null where no combination has
 * reached the interaction.
 */
export function interactionDiagram(points: readonly InteractionPoint[]): Scene | null {
  if (points.length === 0) return null;
  const worstFirst = [...points].sort((a, b) => b.ratio - a.ratio);
  const reach = Math.max(1.1, ...points.flatMap((p) => [p.axial, p.moment])) * 1.04;
  const x = scaleLinear().domain([0, reach]).range([PLOT.left, PLOT.right]);
  const y = scaleLinear().domain([0, reach]).range([PLOT.bottom, PLOT.top]);
  const pulled = Math.max(0, ...points.map((p) => -p.axial));
  const tension = pulled > 0 ? Math.max(LEAST_TENSION, pulled * 1.1) : 0;
  const limit = [...ENVELOPE, ...tensionEnvelope(tension)].map(([m, p]): Point => [x(m), y(p)]);
  const shapes: Shape[] = [
    { kind: 'area', points: [[x(0), y(-tension)], [x(0), y(0)], ...limit], fill: 'zinc1' },
    ...frame(x.ticks(5), x, y, y(-tension)),
    path(limit, { ink: 'ink', width: 1.5 }),
    label('limit H1-1a, H1-1b', [x(0.1) + 4, y(0.96)], { ink: 'zinc7' }),
    ...worstFirst.flatMap((p, index) => mark(p, index, x(p.moment), y(p.axial))),
    ...list(worstFirst),
  ];
  if (tension > 0) shapes.push(label('tension', [x(0) + 5, y(-tension) - 5], { ink: 'zinc7' }));
  const height = HEIGHT + y(-tension) - y(0);
  return { width: WIDTH, height, shapes, description: describe(worstFirst) };
}

/** The limit below the line of no axial force, down to a ratio. */
function tensionEnvelope(down: number): readonly Point[] {
  const mirrored = ENVELOPE.slice(0, -1)
    .reverse()
    .map(([m, p]): Point => [m, -p]);
  const last: Point = [down > 0.2 ? Math.max(0, (9 / 8) * (1 - down)) : 1 - down / 2, -down];
  const kept = mirrored.filter(([, p]) => p > -down);
  return down === 0 ? [] : down > 1 ? mirrored : [...kept, last];
}

function frame(
  ticks: readonly number[],
  x: (value: number) => number,
  y: (value: number) => number,
  bottom: number,
): Shape[] {
  const across = (value: number): Shape[] => [
    segment([x(value), bottom], [x(value), bottom + 4], PENS.rule),
    label(String(value), [x(value), bottom + 16], { anchor: 'middle', ink: 'zinc7' }),
  ];
  const upwards = (value: number): Shape[] => [
    segment([PLOT.left - 4, y(value)], [PLOT.left, y(value)], PENS.rule),
    label(String(Math.abs(value)), [PLOT.left - 8, y(value) + 4], { anchor: 'end', ink: 'zinc7' }),
  ];
  const below = ticks.filter((value) => value > 0 && y(-value) <= bottom);
  return [
    path(
      [
        [PLOT.left, PLOT.top],
        [PLOT.left, bottom],
        [PLOT.right, bottom],
      ],
      PENS.rule,
    ),
    ...(bottom > y(0) ? [segment([PLOT.left, y(0)], [PLOT.right, y(0)], PENS.hair)] : []),
    ...ticks.flatMap((value) => [...across(value), ...upwards(value)]),
    ...below.flatMap((value) => upwards(-value)),
    label('Pr / Pc', [PLOT.left - 8, PLOT.top - 10], { weight: 600 }),
    label('Mrx / Mcx + Mry / Mcy', [PLOT.right, bottom + 33], {
      anchor: 'end',
      weight: 600,
    }),
  ];
}

/** The worst twelve carry the number they have in the list; over the limit is filled with oxide. */
function mark(point: InteractionPoint, index: number, x: number, y: number): Shape[] {
  const over = point.ratio > 1;
  const dot: Shape = {
    kind: 'circle',
    center: [x, y],
    radius: index === 0 ? 4 : 3,
    fill: over ? 'oxide' : 'ink',
    stroke: { ink: 'paper', width: 1 },
  };
  if (index >= LISTED) return [dot];
  return [dot, label(String(index + 1), [x + 6, y - 4], { weight: index === 0 ? 600 : 400 })];
}

function list(points: readonly InteractionPoint[]): Shape[] {
  const left = PLOT.right + 14;
  const named = WIDTH - left - 64;
  const rest = points.length - LISTED;
  const rows = points.slice(0, LISTED).flatMap((point, index): Shape[] => {
    const y = PLOT.top + index * ROW;
    const weight = index === 0 ? 600 : 400;
    return [
      label(String(index + 1), [left + 12, y], { anchor: 'end', weight }),
      label(cutTo(point.combination, named), [left + 22, y], { weight, within: named }),
      label(point.ratioText, [WIDTH, y], { anchor: 'end', weight, ...overInk(point) }),
    ];
  });
  if (rest <= 0) return rows;
  const y = PLOT.top + LISTED * ROW;
  const words = rest === 1 ? 'one more, lower' : `${rest} more, all lower`;
  return [...rows, label(words, [left + 22, y], { ink: 'zinc7' })];
}

const overInk = (point: InteractionPoint): { ink?: 'oxide' } =>
  point.ratio > 1 ? { ink: 'oxide' } : {};

function describe(points: readonly InteractionPoint[]): string {
  const each = points
    .slice(0, LISTED)
    .map(
      (p) =>
        `${p.combination} ${p.ratioText}${p.segment === null ? '' : `, segment ${p.segment}`}${p.axial < 0 ? ', in tension' : ''}${p.ratio > 1 ? ', over the limit' : ''}`,
    );
  const count = points.length === 1 ? 'one combination' : `${points.length} combinations`;
  return `Interaction diagram of Pr/Pc against the sum of the moment ratios with the limit of H1-1a and H1-1b, ${count}: ${each.join('; ')}.`;
}
