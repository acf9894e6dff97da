import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { DimensionName } from '../../units/dimension.ts';
import { modulus, radius } from './axes.ts';
import { formula } from './writer.ts';

/*
 * Doubly symmetric I-shape of three rectangular plates; welds left out. J: sum of b t³/3 over the
 * plates (AISC Design Examples v16.0, E.2). Cw: ANSI/AISC 360-22, E4 User Note. rts: F2-7.
 */
const one = (
  id: string,
  title: string,
  dimension: DimensionName,
  expression: string,
  operands: Readonly<Record<string, DimensionName>>,
  symbol = id,
) => formula({ id: `I-${id}`, clause: 'I', title, symbol, dimension, expression, operands });

const plates = { bf: 'length', tf: 'length', tw: 'length', h: 'length' } as const;

export const platesIFormulas = {
  h: one('h', 'Clear depth of the web', 'length', 'd-2*tf', { d: 'length', tf: 'length' }),
  ho: one('ho', 'Distance between flange centroids', 'length', 'd-tf', {
    d: 'length',
    tf: 'length',
  }),
  A: one('A', 'Gross area', 'area', '2*bf*tf+h*tw', plates),
  lambdaf: one('lambdaf', 'Flange width-to-thickness ratio', 'none', 'bf/(2*tf)', {
    bf: 'length',
    tf: 'length',
  }),
  lambdaw: one('lambdaw', 'Web width-to-thickness ratio', 'none', 'h/tw', {
    h: 'length',
    tw: 'length',
  }),
  Ix: one(
    'Ix',
    'Second moment of area, major axis',
    'inertia',
    'bf*tf*ho^2/2+bf*tf^3/6+tw*h^3/12',
    { ...plates, ho: 'length' },
  ),
  Zx: one('Zx', 'Plastic modulus, major axis', 'modulus', 'bf*tf*ho+tw*h^2/4', {
    ...plates,
    ho: 'length',
  }),
  Iy: one('Iy', 'Second moment of area, minor axis', 'inertia', 'tf*bf^3/6+h*tw^3/12', plates),
  Zy: one('Zy', 'Plastic modulus, minor axis', 'modulus', 'tf*bf^2/2+h*tw^2/4', plates),
  J: one('J', 'Torsional constant', 'inertia', '(2*bf*tf^3+h*tw^3)/3', plates),
  Cw: one('Cw', 'Warping constant', 'warping', 'Iy*ho^2/4', { Iy: 'inertia', ho: 'length' }),
  rts: one('rts', 'Effective radius of gyration', 'length', 'sqrt(sqrt(Iy*Cw)/Sx)', {
    Iy: 'inertia',
    Cw: 'warping',
    Sx: 'modulus',
  }),
};

/** All properties from depth, flange width, flange and web thickness. */
export function platesI(r: Recorder, q: Readonly<Record<'d' | 'bf' | 'tf' | 'tw', Quantity>>) {
  const f = platesIFormulas;
  const h = r.formula(f.h, 'section/h', q);
  const ho = r.formula(f.ho, 'section/ho', q);
  const p = { ...q, h, ho };
  const A = r.formula(f.A, 'section/A', p);
  const lambdaf = r.formula(f.lambdaf, 'section/lambdaf', p);
  const lambdaw = r.formula(f.lambdaw, 'section/lambdaw', p);
  const Ix = r.formula(f.Ix, 'section/Ix', p);
  const Sx = modulus(r, 'x', Ix, q.d);
  const Zx = r.formula(f.Zx, 'section/Zx', p);
  const rx = radius(r, 'x', Ix, A);
  const Iy = r.formula(f.Iy, 'section/Iy', p);
  const Sy = modulus(r, 'y', Iy, q.bf);
  const Zy = r.formula(f.Zy, 'section/Zy', p);
  const ry = radius(r, 'y', Iy, A);
  const J = r.formula(f.J, 'section/J', p);
  const Cw = r.formula(f.Cw, 'section/Cw', { Iy, ho });
  const rts = r.formula(f.rts, 'section/rts', { Iy, Cw, Sx });
  return { A, lambdaf, lambdaw, Ix, Sx, Zx, rx, Iy, Sy, Zy, ry, J, Cw, rts, ho };
}
