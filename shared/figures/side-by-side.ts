import type { Point, Scene, Shape } from './scene.ts';

const GAP = 16;

/** Two scenes as one, the second to the right of the first; their tops stand level. */
export function sideBySide(left: Scene, right: Scene): Scene {
  const across = left.width + GAP;
  return {
    width: across + right.width,
    height: Math.max(left.height, right.height),
    shapes: [...left.shapes, ...right.shapes.map((s) => moved(s, across))],
    description: `${left.description} ${right.description}`,
  };
}

function moved(shape: Shape, across: number): Shape {
  const at = ([x, y]: Point): Point => [x + across, y];
  switch (shape.kind) {
    case 'line':
    case 'area':
      return { ...shape, points: shape.points.map(at) };
    case 'circle':
    case 'arc':
      return { ...shape, center: at(shape.center) };
    case 'text':
      return { ...shape, at: at(shape.at) };
  }
}
