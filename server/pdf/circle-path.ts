import type { Segment } from './math/svg-path.ts';

/**
 * A circular arc as Bézier curves, from and to in radians, clockwise from +x (y downwards); pieces
 * of at most a quarter turn, whose largest error is 0.03 % of the radius.
 */
export function arcPath(
  [cx, cy]: readonly [number, number],
  radius: number,
  from: number,
  to: number,
): Segment[] {
  const count = Math.max(1, Math.ceil(Math.abs(to - from) / (Math.PI / 2) - 1e-9));
  const step = (to - from) / count;
  const arm = (4 / 3) * Math.tan(step / 4) * radius;
  const at = (angle: number): [number, number] => [
    cx + radius * Math.cos(angle),
    cy + radius * Math.sin(angle),
  ];
  const [startX, startY] = at(from);
  const segments: Segment[] = [{ op: 'move', x: startX, y: startY }];
  for (let index = 0; index < count; index += 1) {
    const [a, b] = [from + index * step, from + (index + 1) * step];
    const [[ax, ay], [bx, by]] = [at(a), at(b)];
    segments.push({
      op: 'curve',
      x1: ax - arm * Math.sin(a),
      y1: ay + arm * Math.cos(a),
      x2: bx + arm * Math.sin(b),
      y2: by - arm * Math.cos(b),
      x: bx,
      y: by,
    });
  }
  return segments;
}

export const circlePath = (center: readonly [number, number], radius: number): Segment[] => [
  ...arcPath(center, radius, 0, 2 * Math.PI),
  { op: 'close' },
];
