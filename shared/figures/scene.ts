/**
 * A figure as data: shapes in a coordinate system of its own (x to the right, y downwards, one unit
 * = 1/96 in at the size it is meant for). A record goes in, a scene comes out; the browser draws it
 * as SVG, the report as PDF vectors.
 */
export type Ink =
  | 'ink'
  | 'zinc7'
  | 'zinc5'
  | 'zinc3'
  | 'zinc1'
  | 'oxide'
  | 'oxide3'
  | 'oxide2'
  | 'paper';

export interface Stroke {
  readonly ink: Ink;
  readonly width: number;
  readonly dash?: readonly number[];
}

export type Point = readonly [x: number, y: number];

export type Shape =
  | { readonly kind: 'line'; readonly points: readonly Point[]; readonly stroke: Stroke }
  | {
      readonly kind: 'area';
      readonly points: readonly Point[];
      readonly fill: Ink;
      readonly stroke?: Stroke;
    }
  | {
      readonly kind: 'circle';
      readonly center: Point;
      readonly radius: number;
      readonly fill?: Ink;
      readonly stroke?: Stroke;
    }
  | {
      readonly kind: 'arc';
      readonly center: Point;
      readonly radius: number;
      /** Radians, clockwise from +x. */
      readonly from: number;
      readonly to: number;
      readonly stroke: Stroke;
    }
  | {
      readonly kind: 'text';
      readonly at: Point;
      readonly text: string;
      readonly size: number;
      readonly weight: 400 | 600;
      readonly anchor: 'start' | 'middle' | 'end';
      readonly ink: Ink;
    };

export interface Scene {
  readonly width: number;
  readonly height: number;
  readonly shapes: readonly Shape[];
  /** What the figure shows, in words, for those who can't see it. */
  readonly description: string;
}
