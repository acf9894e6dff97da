import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { DimensionName } from '../../units/dimension.ts';
import { AXIS_WORDS, modulus, radius } from './axes.ts';
import { formula } from './writer.ts';

/*
 * Rectangular tube of one wall thickness with round corners, and round tube. Where the corner radius
 * is not known, the outside one is twice the thickness, as in the properties of AISC's tables
 * (AISC Manual, Part 1, from memory). J: R. Bredt's single cell on the middle line; the term of the
 * open wall is left out, as in AISC's tables. Differences of powers are written as products.
 */
type Dimensions = Readonly<Record<string, DimensionName>>;
const one = (
  id: string,
  title: string,
  symbol: string,
  dimension: DimensionName,
  expression: string,
  operands: Dimensions,
  clause: 'Tube' | 'Round' = 'Tube',
) => formula({ id, clause, title, symbol, dimension, expression, operands });

const lengths = (...names: readonly string[]): Dimensions =>
  Object.fromEntries(names.map((n) => [n, 'length' as const]));

export const tubeFormulas = {
  Ro: one('tube-Ro', 'Outside corner radius', 'Ro', 'length', '2*t', lengths('t')),
  Ri: one('tube-Ri', 'Inside corner radius', 'Ri', 'length', 'Ro-t', lengths('Ro', 't')),
  bflat: one(
    'tube-bflat',
    'Straight part of the width',
    'bflat',
    'length',
    'B-2*Ro',
    lengths('B', 'Ro'),
  ),
  hflat: one(
    'tube-hflat',
    'Straight part of the height',
    'hflat',
    'length',
    'Ht-2*Ro',
    lengths('Ht', 'Ro'),
  ),
  Ac: one(
    'tube-Ac',
    'Area of one corner',
    'Ac',
    'area',
    'pi*t*(Ro+Ri)/4',
    lengths('t', 'Ro', 'Ri'),
  ),
  Qc: one(
    'tube-Qc',
    'First moment of a corner about an axis through its centre',
    'Qc',
    'modulus',
    't*(Ro^2+Ro*Ri+Ri^2)/3',
    lengths('t', 'Ro', 'Ri'),
  ),
  Ic: one(
    'tube-Ic',
    'Second moment of a corner about an axis through its centre',
    'Ic',
    'inertia',
    'pi*t*(Ro+Ri)*(Ro^2+Ri^2)/16',
    lengths('t', 'Ro', 'Ri'),
  ),
  A: one('tube-A', 'Gross area', 'A', 'area', '2*t*(bflat+hflat)+4*Ac', {
    ...lengths('t', 'bflat', 'hflat'),
    Ac: 'area',
  }),
  I: one(
    'tube-I',
    'Second moment of area',
    'I',
    'inertia',
    'bflat*t*(Ht-t)^2/2+bflat*t^3/6+t*hflat^3/6+4*Ic+4*hflat*Qc+hflat^2*Ac',
    { ...lengths('t', 'bflat', 'hflat', 'Ht'), Ac: 'area', Qc: 'modulus', Ic: 'inertia' },
  ),
  Z: one(
    'tube-Z',
    'Plastic modulus',
    'Z',
    'modulus',
    'bflat*t*(Ht-t)+t*hflat^2/2+4*Qc+2*hflat*Ac',
    {
      ...lengths('t', 'bflat', 'hflat', 'Ht'),
      Ac: 'area',
      Qc: 'modulus',
    },
  ),
  Rm: one('tube-Rm', 'Corner radius of the middle line', 'Rm', 'length', '(Ro+Ri)/2', {
    ...lengths('Ro', 'Ri'),
  }),
  Am: one(
    'tube-Am',
    'Area inside the middle line of the wall',
    'Am',
    'area',
    'bflat*hflat+2*Rm*(bflat+hflat)+pi*Rm^2',
    lengths('bflat', 'hflat', 'Rm'),
  ),
  pm: one(
    'tube-pm',
    'Length of the middle line of the wall',
    'pm',
    'length',
    '2*(bflat+hflat)+2*pi*Rm',
    lengths('bflat', 'hflat', 'Rm'),
  ),
  J: one('tube-J', 'Torsional constant', 'J', 'inertia', '4*Am^2*t/pm', {
    Am: 'area',
    ...lengths('t', 'pm'),
  }),
  Di: one('round-Di', 'Inside diameter', 'Di', 'length', 'D-2*t', lengths('D', 't'), 'Round'),
  lambdad: one(
    ...(['round-lambdad', 'Diameter-to-thickness ratio', 'lambdad', 'none', 'D/t'] as const),
    lengths('D', 't'),
    'Round',
  ),
  roundA: one(
    ...(['round-A', 'Gross area', 'A', 'area', 'pi*t*(D+Di)/2'] as const),
    lengths('t', 'D', 'Di'),
    'Round',
  ),
  roundI: one(
    'round-I',
    'Second moment of area',
    'I',
    'inertia',
    'pi*t*(D+Di)*(D^2+Di^2)/32',
    lengths('t', 'D', 'Di'),
    'Round',
  ),
  roundZ: one(
    'round-Z',
    'Plastic modulus',
    'Z',
    'modulus',
    't*(D^2+D*Di+Di^2)/3',
    lengths('t', 'D', 'Di'),
    'Round',
  ),
  roundJ: one('round-J', 'Torsional constant', 'J', 'inertia', '2*I', { I: 'inertia' }, 'Round'),
};

/** All properties of a rectangular tube; `Ro` null: the outside corner radius is 2 t. */
export function rectangularTube(
  r: Recorder,
  q: Readonly<Record<'B' | 'Ht' | 't', Quantity>>,
  given: Quantity | null,
) {
  const f = tubeFormulas;
  const { t } = q;
  const Ro = given ?? r.formula(f.Ro, 'section/Ro', q);
  const Ri = r.formula(f.Ri, 'section/Ri', { Ro, t });
  const bflat = r.formula(f.bflat, 'section/bflat', { ...q, Ro });
  const hflat = r.formula(f.hflat, 'section/hflat', { ...q, Ro });
  const corner = { t, Ro, Ri };
  const Ac = r.formula(f.Ac, 'section/Ac', corner);
  const Qc = r.formula(f.Qc, 'section/Qc', corner);
  const Ic = r.formula(f.Ic, 'section/Ic', corner);
  const A = r.formula(f.A, 'section/A', { t, bflat, hflat, Ac });
  const across = {
    x: { ...{ t, Ac, Qc, Ic }, bflat, hflat, Ht: q.Ht },
    y: { ...{ t, Ac, Qc, Ic }, bflat: hflat, hflat: bflat, Ht: q.B },
  } as const;
  const about = (axis: 'x' | 'y') => {
    const more = (name: string, title: string) => ({
      symbol: `${name}${axis}`,
      title: `${title}, ${AXIS_WORDS[axis]}`,
    });
    const I = r.formula(f.I, `section/I${axis}`, across[axis], more('I', 'Second moment of area'));
    const S = modulus(r, axis, I, across[axis].Ht);
    const Z = r.formula(f.Z, `section/Z${axis}`, across[axis], more('Z', 'Plastic modulus'));
    return { I, S, Z, r: radius(r, axis, I, A) };
  };
  const x = about('x');
  const y = about('y');
  const Rm = r.formula(f.Rm, 'section/Rm', { Ro, Ri });
  const Am = r.formula(f.Am, 'section/Am', { bflat, hflat, Rm });
  const pm = r.formula(f.pm, 'section/pm', { bflat, hflat, Rm });
  const J = r.formula(f.J, 'section/J', { Am, t, pm });
  return {
    ...{ A, J, Ix: x.I, Sx: x.S, Zx: x.Z, rx: x.r, Iy: y.I, Sy: y.S, Zy: y.Z, ry: y.r },
    flats: { b: bflat, h: hflat },
  };
}

/** All properties of a round tube; both axes have the same lines. */
export function roundTube(r: Recorder, q: Readonly<Record<'D' | 't', Quantity>>) {
  const f = tubeFormulas;
  const Di = r.formula(f.Di, 'section/Di', q);
  const p = { ...q, Di };
  const any = (name: string, title: string) => ({
    symbol: `${name}x`,
    title: `${title}, any axis`,
  });
  const A = r.formula(f.roundA, 'section/A', p);
  const lambdad = r.formula(f.lambdad, 'section/lambdad', p);
  const I = r.formula(f.roundI, 'section/Ix', p, any('I', 'Second moment of area'));
  const S = modulus(r, 'x', I, q.D);
  const Z = r.formula(f.roundZ, 'section/Zx', p, any('Z', 'Plastic modulus'));
  const gyration = radius(r, 'x', I, A);
  const J = r.formula(f.roundJ, 'section/J', { I });
  return {
    ...{ A, lambdad, J, Ix: I, Sx: S, Zx: Z, rx: gyration, Iy: I, Sy: S, Zy: Z, ry: gyration },
  };
}
