import type { Scene } from './scene.ts';
import { moved } from './shapes.ts';

const GAP = 16;

/** Two scenes as one, the second to the right of the first; their tops stand level. */
export function sideBySide(left: Scene, right: Scene): Scene {
  const across = left.width + GAP;
  return {
    width: across + right.width,
    height: Math.max(left.height, right.height),
    shapes: [...left.shapes, ...right.shapes.map((s) => moved(s, across, 0))],
    description: `${left.description} ${right.description}`,
  };
}
