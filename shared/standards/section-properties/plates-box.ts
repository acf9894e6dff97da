import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { DimensionName } from '../../units/dimension.ts';
import { modulus, radius } from './axes.ts';
import { platesIFormulas } from './plates-i.ts';
import { formula } from './writer.ts';

/*
 * Box of four rectangular plates within an outside width and depth, no plate beyond the outside of
 * another; welds left out. J: R. Bredt's single cell, middle lines of the plates.
 */
const one = (
  id: string,
  title: string,
  dimension: DimensionName,
  expression: string,
  names: readonly string[],
) =>
  formula({
    ...{ id: `box-${id}`, clause: 'Box', title, symbol: id, dimension, expression },
    operands: Object.fromEntries(names.map((n) => [n, 'length' as const])),
  });

export const platesBoxFormulas = {
  b: one('b', 'Clear width between the webs', 'length', 'B-2*tw', ['B', 'tw']),
  bo: one('bo', 'Distance between web centroids', 'length', 'B-tw', ['B', 'tw']),
  A: one('A', 'Gross area', 'area', '2*(B*tf+h*tw)', ['B', 'tf', 'h', 'tw']),
  lambdab: one('lambdabf', 'Flange width-to-thickness ratio', 'none', 'b/tf', ['b', 'tf']),
  Ix: one('Ix', 'Second moment of area, major axis', 'inertia', 'B*tf*ho^2/2+B*tf^3/6+tw*h^3/6', [
    'B',
    'tf',
    'ho',
    'h',
    'tw',
  ]),
  Zx: one('Zx', 'Plastic modulus, major axis', 'modulus', 'B*tf*ho+tw*h^2/2', [
    ...['B', 'tf', 'ho', 'h', 'tw'],
  ]),
  Iy: one('Iy', 'Second moment of area, minor axis', 'inertia', 'h*tw*bo^2/2+h*tw^3/6+tf*B^3/6', [
    'B',
    'tf',
    'bo',
    'h',
    'tw',
  ]),
  Zy: one('Zy', 'Plastic modulus, minor axis', 'modulus', 'h*tw*bo+tf*B^2/2', [
    ...['B', 'tf', 'bo', 'h', 'tw'],
  ]),
  J: one('J', 'Torsional constant', 'inertia', '2*(bo*ho)^2/(bo/tf+ho/tw)', [
    ...['bo', 'ho', 'tf', 'tw'],
  ]),
};

/** All properties from outside width and depth, flange and web thickness. */
export function platesBox(r: Recorder, q: Readonly<Record<'B' | 'd' | 'tf' | 'tw', Quantity>>) {
  const f = platesBoxFormulas;
  const h = r.formula(platesIFormulas.h, 'section/h', q);
  const b = r.formula(f.b, 'section/b', q);
  const ho = r.formula(platesIFormulas.ho, 'section/ho', q);
  const bo = r.formula(f.bo, 'section/bo', q);
  const p = { ...q, h, b, ho, bo };
  const A = r.formula(f.A, 'section/A', p);
  const lambdab = r.formula(f.lambdab, 'section/lambdab', p);
  const lambdah = r.formula(platesIFormulas.lambdaw, 'section/lambdah', p);
  const Ix = r.formula(f.Ix, 'section/Ix', p);
  const Sx = modulus(r, 'x', Ix, q.d);
  const Zx = r.formula(f.Zx, 'section/Zx', p);
  const rx = radius(r, 'x', Ix, A);
  const Iy = r.formula(f.Iy, 'section/Iy', p);
  const Sy = modulus(r, 'y', Iy, q.B);
  const Zy = r.formula(f.Zy, 'section/Zy', p);
  const ry = radius(r, 'y', Iy, A);
  const J = r.formula(f.J, 'section/J', p);
  return { b, h, A, lambdab, lambdah, Ix, Sx, Zx, rx, Iy, Sy, Zy, ry, J };
}
