import type { LoadDrawing } from './drawing.ts';
import { WIDTH } from './frame.ts';
import { type BandPiece, loadPieces, type PointPiece, type Side } from './load-pieces.ts';
import { boxOf, type Label } from './place-labels.ts';
import type { Point, Shape } from './scene.ts';
import { arrow, label, PENS, path, segment } from './shapes.ts';

/** Drawn height of the largest line load, and the smallest of one that is not zero. */
const BAND = 16;
const LEAST = 6;
/** From one row of line loads to the next, and from one row of forces' labels to the next. */
const TIER = BAND + 6;
const LANE = 13;
const SHAFT = 14;
/** Rows of labels up to which forces carry the fullest text, and the next one. */
const MOST_LANES = [3, 6] as const;
/** Of one digit of a force's number. */
const NUMBER_WIDTH = 4.75;
/** Labels keep clear of those of the member's ends, which stand nearer to its axis. */
const NEAREST_LABEL = 22;
const CLEAR_ABOVE = 20;
const CLEAR_BELOW = 32;

interface Drawn {
  /** About the member's axis, y downwards. */
  readonly shapes: readonly Shape[];
  /** Room taken on either side of the axis. */
  readonly above: number;
  readonly below: number;
  /** Forces are numbered as the sheet numbers them, for want of room. */
  readonly numbered: boolean;
}

interface Frame {
  readonly along: (mm: number) => number;
  /** Drawn half depth. */
  readonly half: number;
  /** Drawn height per line load. */
  readonly perLoad: number;
}

/** Loads at the face they act at: line loads next to the member, forces through and over them. */
export function loadMarks(
  loads: readonly LoadDrawing[],
  along: (mm: number) => number,
  half: number,
): Drawn {
  const pieces = loads.flatMap(loadPieces);
  const largest = Math.max(
    0,
    ...pieces.flatMap((p) => (p.kind === 'band' ? [p.start, p.end] : [])),
  );
  const frame = { along, half, perLoad: largest > 0 ? BAND / largest : 0 };
  const [above, below] = (['above', 'below'] as const).map((side) =>
    oneSide(
      pieces.filter((piece) => piece.side === side),
      side,
      frame,
    ),
  ) as [Sided, Sided];
  return {
    shapes: [...above.shapes, ...below.shapes],
    above: above.room,
    below: below.room,
    numbered: above.numbered || below.numbered,
  };
}

interface Sided {
  readonly shapes: readonly Shape[];
  readonly room: number;
  readonly numbered: boolean;
}

function oneSide(pieces: readonly (PointPiece | BandPiece)[], side: Side, frame: Frame): Sided {
  if (pieces.length === 0) return { shapes: [], room: 0, numbered: false };
  const points = pieces.filter((p) => p.kind === 'point');
  const shafts = points.map((p) => frame.along(p.z));
  const tiers = inTiers(
    pieces.filter((p) => p.kind === 'band'),
    shafts,
    frame,
  );
  const base = Math.max(frame.half + 1, 8);
  const over = base + tiers.length * TIER;
  const bands = tiers.flatMap((tier, i) =>
    tier.flatMap((band) => bandShapes(band, i, base + i * TIER, side, frame)),
  );
  const texts = tiers.flatMap((tier, i) =>
    tier.flatMap((band) => bandTexts(band, base + i * TIER, side, frame)),
  );
  const variant = ([0, 1] as const).find(
    (v) => Math.max(0, ...lanesOf(points, v, frame)) < MOST_LANES[v],
  );
  const text = variant ?? 2;
  const lanes = lanesOf(points, text, frame);
  const first = Math.max(over - (tiers.length > 0 ? 4 : 0) + SHAFT, NEAREST_LABEL);
  const forces = points.flatMap((point, i) =>
    forceShapes(point, point.texts[text], text === 2, first + (lanes[i] ?? 0) * LANE, side, frame),
  );
  const room = points.length > 0 ? first + (Math.max(...lanes) + 1) * LANE + 2 : over + 2;
  return { shapes: [...bands, ...forces, ...texts], room, numbered: variant === undefined };
}

/** y of a distance from the axis. */
const out = (side: Side, distance: number): number => (side === 'above' ? -distance : distance);

const roomFor = (x: number): number => Math.min(WIDTH - x, 150);

/**
 * A force's label begins over its own shaft, so that no shaft to the left crosses it; a mere number
 * stands small in its middle, so that neighbours fit beside it.
 */
const forceLabel = (text: string, x: number, y: number, isNumber: boolean): Label =>
  (isNumber
    ? label(text, [x, y], { anchor: 'middle', within: text.length * NUMBER_WIDTH })
    : label(text, [x - 3, y], { within: roomFor(x - 3) })) as Label;

/** The row of every force's label: over those of the forces to its right that it would cover. */
function lanesOf(points: readonly PointPiece[], text: 0 | 1 | 2, { along }: Frame): number[] {
  const lanes = points.map(() => 0);
  const order = points.map((_, i) => i).sort((a, b) => z(points, b) - z(points, a));
  const placed: { readonly left: number; readonly right: number; readonly lane: number }[] = [];
  for (const i of order) {
    const point = points[i] as PointPiece;
    const { left, right } = boxOf(forceLabel(point.texts[text], along(point.z), 0, text === 2));
    const under = placed.filter((p) => left < p.right && p.left < right);
    const lane = under.length === 0 ? 0 : 1 + Math.max(...under.map((p) => p.lane));
    lanes[i] = lane;
    placed.push({ left, right, lane });
  }
  return lanes;
}

const z = (points: readonly PointPiece[], i: number): number => points[i]?.z ?? 0;

function forceShapes(
  { z, height, inward }: PointPiece,
  text: string,
  isNumber: boolean,
  tail: number,
  side: Side,
  { along, half }: Frame,
): Shape[] {
  const x = along(z);
  const far: Point = [x, out(side, tail)];
  const near: Point = [x, out(side, height === 'centre' ? 0 : half)];
  const [from, tip] = inward ? [far, near] : [near, far];
  return [
    ...arrow(from, tip, PENS.force, 7),
    forceLabel(text, x, out(side, tail) + (side === 'above' ? -3 : 11), isNumber),
  ];
}

interface PlacedBand {
  readonly band: BandPiece;
  readonly labels: readonly PlacedText[];
}
interface PlacedText {
  readonly text: string;
  readonly at: 'start' | 'end';
}

/** Line loads that would cover each other, or each other's labels, stand in rows of their own. */
function inTiers(
  bands: readonly BandPiece[],
  shafts: readonly number[],
  { along }: Frame,
): (readonly PlacedBand[])[] {
  const tiers: { placed: PlacedBand[]; taken: [number, number][] }[] = [];
  for (const band of bands) {
    const own: [number, number] = [along(band.from), along(band.to)];
    const options = labelOptions(band);
    const free = (taken: readonly [number, number][], [a, b]: [number, number]) =>
      taken.every(([c, d]) => b <= c || d <= a);
    const fits = (taken: readonly [number, number][], labels: readonly PlacedText[]) =>
      free(taken, own) &&
      labels.every((text) => {
        const reach = reachOf(text, own);
        return free(taken, reach) && !shafts.some((x) => x > reach[0] && x < reach[1]);
      });
    const found = tiers.flatMap((tier) => {
      const labels = options.find((option) => fits(tier.taken, option));
      return labels ? [{ tier, labels }] : [];
    })[0];
    const tier = found?.tier ?? { placed: [], taken: [] };
    if (!found) tiers.push(tier);
    const labels = found?.labels ?? options.find((o) => fits([], o)) ?? options[0] ?? [];
    tier.placed.push({ band, labels });
    tier.taken.push(own, ...labels.map((text) => reachOf(text, own)));
  }
  return tiers.map((tier) => tier.placed);
}

/** Texts stand at their own ends; a uniform load's at either. */
function labelOptions({ startText, endText }: BandPiece): (readonly PlacedText[])[] {
  if (startText && endText)
    return [
      [
        { text: startText, at: 'start' },
        { text: endText, at: 'end' },
      ],
    ];
  const text = startText || endText;
  const ends = startText ? (['start', 'end'] as const) : (['end', 'start'] as const);
  return ends.map((at) => [{ text, at }]);
}

const bandLabel = ({ text, at }: PlacedText, [from, to]: readonly [number, number], y: number) =>
  (at === 'start'
    ? label(text, [from - 6, y], { anchor: 'end', within: Math.min(from - 6, 130) })
    : label(text, [to + 6, y], { within: Math.min(WIDTH - to - 6, 130) })) as Label;

const reachOf = (text: PlacedText, own: readonly [number, number]): [number, number] => {
  const { left, right } = boxOf(bandLabel(text, own, 0));
  return [left, right];
};

function bandShapes(
  { band }: PlacedBand,
  tier: number,
  base: number,
  side: Side,
  { along, half, perLoad }: Frame,
): Shape[] {
  const [from, to] = [along(band.from), along(band.to)];
  const [start, end] = [drawnSize(band.start, perLoad), drawnSize(band.end, perLoad)];
  const edge = (x: number) => base + start + ((end - start) * (x - from)) / (to - from);
  const foot = tier > 0 ? base : band.height === 'centre' ? 0 : half;
  const count = Math.max(1, Math.round((to - from) / 17));
  const arrows = Array.from({ length: count + 1 }, (_, i) => from + (i * (to - from)) / count)
    .filter((x) => edge(x) - base >= LEAST - 1e-9)
    .flatMap((x): Shape[] => {
      const far: Point = [x, out(side, edge(x))];
      const near: Point = [x, out(side, foot)];
      return band.inward ? arrow(far, near, PENS.load, 5) : arrow(near, far, PENS.load, 5);
    });
  const outline: Point[] = [
    [from, out(side, base)],
    [from, out(side, base + start)],
    [to, out(side, base + end)],
    [to, out(side, base)],
  ];
  return [
    ...arrows,
    path(outline.slice(1, 3), PENS.force),
    ...(tier > 0 ? [segment([from, out(side, base)], [to, out(side, base)], PENS.load)] : []),
  ];
}

/** A band's texts, which hide what runs behind them; they are drawn last. */
function bandTexts(
  { band, labels }: PlacedBand,
  base: number,
  side: Side,
  { along, perLoad }: Frame,
): Shape[] {
  const ends = [along(band.from), along(band.to)] as const;
  return labels.flatMap((text) => {
    const size = drawnSize(text.at === 'start' ? band.start : band.end, perLoad);
    const middle = base + size / 2;
    const y =
      side === 'above' ? -Math.max(middle - 4, CLEAR_ABOVE) : Math.max(middle + 4, CLEAR_BELOW);
    return knockedOut(bandLabel(text, ends, y));
  });
}

const drawnSize = (load: number, perLoad: number): number =>
  load === 0 ? 0 : Math.max(load * perLoad, LEAST);

/** A label that hides what runs behind it. */
function knockedOut(text: Label): Shape[] {
  const { left, right, top, bottom } = boxOf(text);
  const points: Point[] = [
    [left, top],
    [right, top],
    [right, bottom],
    [left, bottom],
  ];
  return [{ kind: 'area', points, fill: 'paper' }, text];
}
