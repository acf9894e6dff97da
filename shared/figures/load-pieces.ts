import type { LoadDrawing } from './drawing.ts';

export type Side = 'above' | 'below';

/** How a load stands at the drawn member: which side it is on, and whether it points at it. */
interface Standing {
  readonly side: Side;
  readonly inward: boolean;
  readonly height: LoadDrawing['height'];
}

export interface PointPiece extends Standing {
  readonly kind: 'point';
  /** Distance from end A, mm. */
  readonly z: number;
  /** What may stand at it, the fullest first. */
  readonly texts: readonly [string, string, string];
}

/** A part of a line load that pushes one way; sizes of the load at its two ends. */
export interface BandPiece extends Standing {
  readonly kind: 'band';
  readonly from: number;
  readonly to: number;
  readonly start: number;
  readonly end: number;
  /** Text at its start and at its end; empty where none stands there. */
  readonly startText: string;
  readonly endText: string;
}

/** Positive loads push down onto the face they act at, or pull down from it. */
function standing(height: LoadDrawing['height'], value: number): Standing {
  const down = value >= 0;
  const side =
    height === 'top' ? 'above' : height === 'bottom' ? 'below' : down ? 'above' : 'below';
  return { side, inward: down === (side === 'above'), height };
}

const ON: Readonly<Record<LoadDrawing['height'], string>> = {
  top: ', top',
  centre: '',
  bottom: ', bottom',
};

/** A load as it is drawn; one that changes its sign is cut where it is zero. */
export function loadPieces(load: LoadDrawing): (PointPiece | BandPiece)[] {
  const { height } = load;
  const on = ON[height];
  if (load.kind === 'point') {
    const { force, at } = load;
    const texts = [`${force.text} at ${at.text}${on}`, `${force.text}${on}`] as const;
    const number = load.name.replace('load ', '');
    const piece = { kind: 'point', z: at.value, texts: [...texts, number] } as const;
    return [{ ...piece, ...standing(height, force.value) }];
  }
  const { from, to, start, end } = load;
  const text = (value: typeof start) => (value.value === 0 ? '' : `${value.text}${on}`);
  const band = (part: Omit<BandPiece, 'kind' | keyof Standing>, sign: number): BandPiece => ({
    kind: 'band',
    ...part,
    ...standing(height, sign),
  });
  const sizes = { start: Math.abs(start.value), end: Math.abs(end.value) };
  if (start === end)
    return [band({ from, to, ...sizes, startText: text(start), endText: '' }, start.value)];
  const texts = { startText: text(start), endText: text(end) };
  if (start.value * end.value >= 0)
    return [band({ from, to, ...sizes, ...texts }, start.value + end.value)];
  const zero = from + ((to - from) * sizes.start) / (sizes.start + sizes.end);
  return [
    band({ from, to: zero, start: sizes.start, end: 0, ...texts, endText: '' }, start.value),
    band({ from: zero, to, start: 0, end: sizes.end, ...texts, startText: '' }, end.value),
  ];
}
