/** A path segment in absolute coordinates. */
export type Segment =
  | { readonly op: 'move' | 'line'; readonly x: number; readonly y: number }
  | {
      readonly op: 'curve';
      readonly x1: number;
      readonly y1: number;
      readonly x2: number;
      readonly y2: number;
      readonly x: number;
      readonly y: number;
    }
  | { readonly op: 'close' };

const argumentCount: Readonly<Record<string, number>> = {
  m: 2,
  l: 2,
  h: 1,
  v: 1,
  c: 6,
  s: 4,
  z: 0,
};

function readTokens(data: string): { letter: string; values: number[] }[] {
  return [...data.matchAll(/([a-zA-Z])([^a-zA-Z]*)/g)].map((match) => ({
    letter: match[1] ?? '',
    values: (match[2]?.match(/-?(?:\d+\.?\d*|\.\d+)/g) ?? []).map(Number),
  }));
}

/** Reads SVG path data (the commands M L H V C S Z). Throws on any other command. */
export function parsePath(data: string): Segment[] {
  const segments: Segment[] = [];
  let [x, y, startX, startY, controlX, controlY] = [0, 0, 0, 0, 0, 0];
  for (const { letter, values } of readTokens(data)) {
    const command = letter.toLowerCase();
    const relative = letter === command;
    const count = argumentCount[command];
    if (count === undefined) throw new Error(`mathematics: path command "${letter}" is not known`);
    if (count === 0 ? values.length > 0 : values.length === 0 || values.length % count > 0) {
      throw new Error(`mathematics: path command "${letter}" has ${values.length} values`);
    }
    for (let index = 0; index < Math.max(values.length, 1); index += count || 1) {
      const value = (at: number): number => values[index + at] as number;
      const absoluteX = (at: number): number => value(at) + (relative ? x : 0);
      const absoluteY = (at: number): number => value(at) + (relative ? y : 0);
      if (command === 'z') {
        segments.push({ op: 'close' });
        [x, y] = [startX, startY];
        [controlX, controlY] = [x, y];
        continue;
      }
      if (command === 'c' || command === 's') {
        const own = command === 'c' ? 2 : 0;
        const x1 = own ? absoluteX(0) : 2 * x - controlX;
        const y1 = own ? absoluteY(1) : 2 * y - controlY;
        const [x2, y2] = [absoluteX(own), absoluteY(own + 1)];
        [x, y] = [absoluteX(own + 2), absoluteY(own + 3)];
        [controlX, controlY] = [x2, y2];
        segments.push({ op: 'curve', x1, y1, x2, y2, x, y });
        continue;
      }
      if (command === 'h') x = absoluteX(0);
      else if (command === 'v') y = absoluteY(0);
      else [x, y] = [absoluteX(0), absoluteY(1)];
      [controlX, controlY] = [x, y];
      const move = command === 'm' && index === 0;
      if (move) [startX, startY] = [x, y];
      segments.push({ op: move ? 'move' : 'line', x, y });
    }
  }
  return segments;
}

/** Scales a path and cuts it at `maxX` (for shapes whose right part is a horizontal bar). */
export function fitPath(path: readonly Segment[], scale: number, maxX: number): Segment[] {
  const fitX = (x: number): number => Math.min(x * scale, maxX);
  return path.map((segment) => {
    if (segment.op === 'close') return segment;
    const end = { x: fitX(segment.x), y: segment.y * scale };
    if (segment.op !== 'curve') return { op: segment.op, ...end };
    const { x1, y1, x2, y2 } = segment;
    return { op: 'curve', x1: fitX(x1), y1: y1 * scale, x2: fitX(x2), y2: y2 * scale, ...end };
  });
}
