import type { HeldPoint, Hold, Plane } from './drawing.ts';
import type { Point, Shape } from './scene.ts';
import { label, PENS, segment } from './shapes.ts';

const SUPPORT = 9;
const ARM = 3.5;

/** Whether a held point is a support of the plane: it ends a bay there. */
export const isSupport = ({ holds }: HeldPoint, plane: Plane): boolean =>
  plane === 'major' ? holds.has('in-plane') : isLateral(holds);

const isLateral = (holds: ReadonlySet<Hold>): boolean =>
  holds.has('top') || holds.has('bottom') || holds.has('centre');

/** What is seen of a held point in a view. */
export const isSeen = (held: HeldPoint, plane: Plane): boolean =>
  plane === 'major' || isSupport(held, plane) || held.holds.has('twist');

/** A pin at A, rollers at B and where the plane is held between: held across, free to shorten. */
export function supportMarks(from: number, others: readonly number[], under: number): Shape[] {
  const ground = under + SUPPORT;
  const stand = (x: number): Shape =>
    segment([x - SUPPORT, ground + 1], [x + SUPPORT, ground + 1], PENS.rule);
  const roller = (x: number): Shape => ({
    kind: 'circle',
    center: [x, under + SUPPORT / 2],
    radius: SUPPORT / 2,
    fill: 'paper',
    stroke: PENS.outline,
  });
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
    ...others.flatMap((x) => [roller(x), stand(x)]),
  ];
}

/** A lateral hold as a cross at its face, a hold against twist as two lines over the depth. */
export function holdMarks(
  { holds }: HeldPoint,
  x: number,
  axis: number,
  half: number,
  plane: Plane,
): Shape[] {
  const twist = holds.has('twist') ? twistMark(x, axis, half) : [];
  if (plane === 'minor') return twist;
  const at: readonly (readonly [Hold, number])[] = [
    ['top', axis - half],
    ['centre', axis],
    ['bottom', axis + half],
  ];
  return [...twist, ...at.flatMap(([hold, y]) => (holds.has(hold) ? crossMark([x, y]) : []))];
}

const crossMark = ([x, y]: Point): Shape[] => [
  segment([x - ARM, y - ARM], [x + ARM, y + ARM], PENS.mark),
  segment([x - ARM, y + ARM], [x + ARM, y - ARM], PENS.mark),
];

const twistMark = (x: number, axis: number, half: number): Shape[] =>
  [-2, 2].map((off) => segment([x + off, axis - half], [x + off, axis + half], PENS.outline));

const KEY: readonly {
  readonly words: string;
  readonly holds: readonly Hold[];
  readonly mark: (at: Point) => Shape[];
}[] = [
  {
    words: 'held in the plane of bending',
    holds: ['in-plane'],
    mark: ([x, y]) => [
      { kind: 'circle', center: [x, y], radius: 4, fill: 'paper', stroke: PENS.outline },
      segment([x - 6, y + 5], [x + 6, y + 5], PENS.rule),
    ],
  },
  {
    words: 'held laterally where marked',
    holds: ['top', 'bottom', 'centre'],
    mark: crossMark,
  },
  {
    words: 'held against twist',
    holds: ['twist'],
    mark: ([x, y]) => twistMark(x, y, 5),
  },
];

/** What the marks mean, as far as they are used; from `left`, on one row. */
export function markKey(held: readonly HeldPoint[], left: number, y: number): Shape[] {
  const used = KEY.filter(({ holds }) => held.some((h) => holds.some((hold) => h.holds.has(hold))));
  let x = left;
  return used.flatMap(({ words, mark }) => {
    const at = x;
    x += 14 + words.length * 5.2 + 16;
    return [...mark([at + 5, y - 4]), label(words, [at + 16, y], { ink: 'zinc7' })];
  });
}
