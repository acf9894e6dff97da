import type { Scene, Shape, Stroke } from '#shared/figures/scene.ts';
import type { BlockOf } from '#shared/report/tree.ts';

const stroked = (stroke: Stroke | undefined) =>
  stroke
    ? {
        stroke: `var(--ink-${stroke.ink})`,
        strokeWidth: stroke.width,
        ...(stroke.dash ? { strokeDasharray: stroke.dash.join(' ') } : {}),
      }
    : {};

const points = (shape: { points: readonly (readonly [number, number])[] }) =>
  shape.points.map(([x, y]) => `${round(x)},${round(y)}`).join(' ');

const round = (n: number) => Math.round(n * 100) / 100;

function ShapeView({ shape }: { shape: Shape }) {
  switch (shape.kind) {
    case 'line':
      return <polyline points={points(shape)} fill="none" {...stroked(shape.stroke)} />;
    case 'area':
      return (
        <polygon
          points={points(shape)}
          fill={`var(--ink-${shape.fill})`}
          {...stroked(shape.stroke)}
        />
      );
    case 'circle':
      return (
        <circle
          cx={round(shape.center[0])}
          cy={round(shape.center[1])}
          r={shape.radius}
          fill={shape.fill ? `var(--ink-${shape.fill})` : 'none'}
          {...stroked(shape.stroke)}
        />
      );
    case 'arc':
      return <path d={arcPath(shape)} fill="none" {...stroked(shape.stroke)} />;
    case 'text':
      return (
        <text
          x={round(shape.at[0])}
          y={round(shape.at[1])}
          fontSize={shape.size}
          fontWeight={shape.weight}
          textAnchor={shape.anchor}
          fill={`var(--ink-${shape.ink})`}
        >
          {shape.text}
        </text>
      );
  }
}

function arcPath({ center: [x, y], radius, from, to }: Extract<Shape, { kind: 'arc' }>): string {
  const at = (angle: number) =>
    `${round(x + radius * Math.cos(angle))} ${round(y + radius * Math.sin(angle))}`;
  const large = Math.abs(to - from) > Math.PI ? 1 : 0;
  return `M${at(from)}A${radius} ${radius} 0 ${large} ${to > from ? 1 : 0} ${at(to)}`;
}

/** A scene as SVG, described in words for those who can't see it. */
export function SceneView({ scene }: { scene: Scene }) {
  return (
    <svg
      role="img"
      aria-label={scene.description}
      viewBox={`0 0 ${scene.width} ${scene.height}`}
      width={scene.width}
      height={scene.height}
      className="scene"
    >
      {scene.shapes.map((shape, index) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: shapes of a scene have no other identity
        <ShapeView key={index} shape={shape} />
      ))}
    </svg>
  );
}

export function FigureBlock({ block }: { block: BlockOf<'figure'> }) {
  return (
    <figure
      className={block.scene.width < 400 ? 'sheet-figure sheet-figure-small' : 'sheet-figure'}
    >
      <SceneView scene={block.scene} />
      {block.caption && <figcaption>{block.caption}</figcaption>}
    </figure>
  );
}
