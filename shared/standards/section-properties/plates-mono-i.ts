import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { DimensionName } from '../../units/dimension.ts';
import { radius } from './axes.ts';
import { platesIFormulas } from './plates-i.ts';
import { clause, formula } from './writer.ts';

/*
 * I-shape of three rectangular plates with two different flanges, symmetric about y; welds left out.
 * Shear centre and Cw: flanges alone, T. V. Galambos, Guide to Stability Design Criteria for Metal
 * Structures (from memory). J: sum of b t³/3 over the plates.
 */
type Dimensions = Readonly<Record<string, DimensionName>>;
const one = (
  id: string,
  title: string,
  dimension: DimensionName,
  expression: string,
  operands: Dimensions,
  symbol = id,
) =>
  formula({ id: `mono-${id}`, clause: 'Mono I', title, symbol, dimension, expression, operands });

const lengths = <N extends string>(...names: readonly N[]) =>
  Object.fromEntries(names.map((n) => [n, 'length'])) as Record<N, 'length'>;
const areas = { Atop: 'area', Abot: 'area', Aw: 'area' } as const;

export const platesMonoIFormulas = {
  h: one('h', 'Clear depth of the web', 'length', 'd-tftop-tfbot', lengths('d', 'tftop', 'tfbot')),
  ho: one(
    'ho',
    'Distance between flange centroids',
    'length',
    'h+(tftop+tfbot)/2',
    lengths('h', 'tftop', 'tfbot'),
  ),
  flangeArea: one('Aflange', 'Area of a flange', 'area', 'bfp*tfp', lengths('bfp', 'tfp'), 'A'),
  webArea: one('Aw', 'Area of the web', 'area', 'h*tw', lengths('h', 'tw')),
  A: one('A', 'Gross area', 'area', 'Atop+Abot+Aw', areas),
  ytop: one(
    'ytop',
    'Centroid from the top face',
    'length',
    '(Atop*tftop/2+Aw*(tftop+h/2)+Abot*(d-tfbot/2))/A',
    { ...areas, A: 'area', ...lengths('d', 'h', 'tftop', 'tfbot') },
  ),
  ybot: one(
    'ybot',
    'Centroid from the bottom face',
    'length',
    '(Abot*tfbot/2+Aw*(tfbot+h/2)+Atop*(d-tftop/2))/A',
    { ...areas, A: 'area', ...lengths('d', 'h', 'tftop', 'tfbot') },
  ),
  Ix: one(
    'Ix',
    'Second moment of area, major axis',
    'inertia',
    'Atop*(ytop-tftop/2)^2+Abot*(ybot-tfbot/2)^2+Aw*(ybot-tfbot-h/2)^2+(Atop*tftop^2+Abot*tfbot^2+Aw*h^2)/12',
    { ...areas, ...lengths('ytop', 'ybot', 'h', 'tftop', 'tfbot') },
  ),
  face: one('S', 'Elastic modulus of a face', 'modulus', 'Ix/yface', {
    Ix: 'inertia',
    yface: 'length',
  }),
  half: one('Ahalf', 'Half of the area', 'area', 'A/2', { A: 'area' }),
  ypWeb: one(
    'yp-web',
    'Plastic neutral axis from the bottom face, in the web',
    'length',
    'tfbot+(Atop+Aw-Abot)/(2*tw)',
    { ...areas, ...lengths('tfbot', 'tw') },
    'yp',
  ),
  ypTop: one(
    'yp-top',
    'Plastic neutral axis from the bottom face, in the top flange',
    'length',
    'd-Ahalf/bftop',
    { Ahalf: 'area', ...lengths('d', 'bftop') },
    'yp',
  ),
  ypBottom: one(
    'yp-bottom',
    'Plastic neutral axis from the bottom face, in the bottom flange',
    'length',
    'Ahalf/bfbot',
    { Ahalf: 'area', ...lengths('bfbot') },
    'yp',
  ),
  ZxWeb: one(
    'Zx-web',
    'Plastic modulus, major axis, neutral axis in the web',
    'modulus',
    'Atop*(d-tftop/2-yp)+Abot*(yp-tfbot/2)+tw*((yp-tfbot)^2+(d-tftop-yp)^2)/2',
    { Atop: 'area', Abot: 'area', ...lengths('d', 'tftop', 'tfbot', 'tw', 'yp') },
    'Zx',
  ),
  ZxTop: one(
    'Zx-top',
    'Plastic modulus, major axis, neutral axis in the top flange',
    'modulus',
    'bftop*((d-yp)^2+(yp-tfbot-h)^2)/2+Aw*(yp-tfbot-h/2)+Abot*(yp-tfbot/2)',
    { Aw: 'area', Abot: 'area', ...lengths('d', 'h', 'bftop', 'tfbot', 'yp') },
    'Zx',
  ),
  ZxBottom: one(
    'Zx-bottom',
    'Plastic modulus, major axis, neutral axis in the bottom flange',
    'modulus',
    'bfbot*(yp^2+(tfbot-yp)^2)/2+Aw*(tfbot+h/2-yp)+Atop*(d-tftop/2-yp)',
    { Aw: 'area', Atop: 'area', ...lengths('d', 'h', 'bfbot', 'tftop', 'tfbot', 'yp') },
    'Zx',
  ),
  Iyf: one(
    'Iyf',
    'Second moment of area of a flange, minor axis',
    'inertia',
    'tfp*bfp^3/12',
    lengths('tfp', 'bfp'),
    'Iyp',
  ),
  Iy: one('Iy', 'Second moment of area, minor axis', 'inertia', 'Iytop+Iybot+h*tw^3/12', {
    Iytop: 'inertia',
    Iybot: 'inertia',
    ...lengths('h', 'tw'),
  }),
  Sy: one('Sy', 'Elastic modulus, minor axis', 'modulus', '2*Iy/bfmax', {
    Iy: 'inertia',
    bfmax: 'length',
  }),
  Zy: one(
    'Zy',
    'Plastic modulus, minor axis',
    'modulus',
    '(tftop*bftop^2+tfbot*bfbot^2+h*tw^2)/4',
    lengths('tftop', 'bftop', 'tfbot', 'bfbot', 'h', 'tw'),
  ),
  J: one(
    'J',
    'Torsional constant',
    'inertia',
    '(bftop*tftop^3+bfbot*tfbot^3+h*tw^3)/3',
    lengths('tftop', 'bftop', 'tfbot', 'bfbot', 'h', 'tw'),
  ),
  Cw: one('Cw', 'Warping constant', 'warping', 'ho^2*Iytop*Iybot/(Iytop+Iybot)', {
    ho: 'length',
    Iytop: 'inertia',
    Iybot: 'inertia',
  }),
  yo: one(
    'yo',
    'Shear centre from the centroid, towards the top flange',
    'length',
    'tfbot/2+ho*Iytop/(Iytop+Iybot)-ybot',
    { ...lengths('tfbot', 'ho', 'ybot'), Iytop: 'inertia', Iybot: 'inertia' },
  ),
  hc: one(
    'hc',
    'Twice the distance from the centroid to the inside of a flange',
    'length',
    '2*(yface-tfp)',
    lengths('yface', 'tfp'),
  ),
  hpTop: one(
    'hp-top',
    'Twice the distance from the plastic neutral axis to the inside of the top flange',
    'length',
    '2*(d-tftop-yp)',
    lengths('d', 'tftop', 'yp'),
    'hptop',
  ),
  hpBottom: one(
    'hp-bottom',
    'Twice the distance from the plastic neutral axis to the inside of the bottom flange',
    'length',
    '2*(yp-tfbot)',
    lengths('yp', 'tfbot'),
    'hpbot',
  ),
};

type MonoSizes = Readonly<Record<'d' | 'bftop' | 'tftop' | 'bfbot' | 'tfbot' | 'tw', Quantity>>;

/** All properties from the depth and the plates; hc and hp are negative where the axis lies in that flange. */
export function platesMonoI(r: Recorder, q: MonoSizes) {
  const f = platesMonoIFormulas;
  const h = r.formula(f.h, 'section/h', q);
  const ho = r.formula(f.ho, 'section/ho', { ...q, h });
  const sizes = { ...q, h, ho };
  const Aw = r.formula(f.webArea, 'section/Aw', sizes);
  const [top, bottom] = [flange(r, 'top', q.bftop, q.tftop), flange(r, 'bottom', q.bfbot, q.tfbot)];
  const parts = { Atop: top.A, Abot: bottom.A, Aw };
  const A = r.formula(f.A, 'section/A', parts);
  const ytop = r.formula(f.ytop, 'section/ytop', { ...sizes, ...parts, A });
  const ybot = r.formula(f.ybot, 'section/ybot', { ...sizes, ...parts, A });
  const lambdaw = r.formula(platesIFormulas.lambdaw, 'section/lambdaw', sizes);
  const Ix = r.formula(f.Ix, 'section/Ix', { ...sizes, ...parts, ytop, ybot });
  const Stop = faceModulus(r, 'top', Ix, ytop);
  const Sbot = faceModulus(r, 'bottom', Ix, ybot);
  const Sx = r.governing('section/Sx', 'min', [Stop, Sbot], {
    title: 'Elastic modulus, major axis',
    symbol: 'Sx',
  });
  const rx = radius(r, 'x', Ix, A);
  const { yp, Zx } = plasticAxis(r, { ...sizes, ...parts, A });
  const [Iytop, Iybot] = [top.Iyf, bottom.Iyf];
  const Iy = r.formula(f.Iy, 'section/Iy', { ...sizes, Iytop, Iybot });
  const bfmax = r.governing('section/bfmax', 'max', [q.bftop, q.bfbot], {
    title: 'Width of the wider flange',
    symbol: 'bfmax',
  });
  const Sy = r.formula(f.Sy, 'section/Sy', { Iy, bfmax });
  const Zy = r.formula(f.Zy, 'section/Zy', sizes);
  const ry = radius(r, 'y', Iy, A);
  const J = r.formula(f.J, 'section/J', sizes);
  const Cw = r.formula(f.Cw, 'section/Cw', { ho, Iytop, Iybot });
  const yo = r.formula(f.yo, 'section/yo', { ...sizes, ybot, Iytop, Iybot });
  return {
    ...{ A, h, ho, lambdaw, Ix, Sx, Zx, rx, Iy, Sy, Zy, ry, J, Cw, yo },
    top: {
      ...{ b: q.bftop, t: q.tftop, lambda: top.lambda, Iyf: Iytop, S: Stop },
      hc: centroidDepth(r, 'top', ytop, q.tftop),
      hp: r.formula(f.hpTop, 'section/top/hp', { ...q, yp }),
    },
    bottom: {
      ...{ b: q.bfbot, t: q.tfbot, lambda: bottom.lambda, Iyf: Iybot, S: Sbot },
      hc: centroidDepth(r, 'bottom', ybot, q.tfbot),
      hp: r.formula(f.hpBottom, 'section/bottom/hp', { ...q, yp }),
    },
  };
}

type Side = 'top' | 'bottom';
const SHORT = { top: 'top', bottom: 'bot' } as const satisfies Record<Side, string>;

function flange(r: Recorder, side: Side, bfp: Quantity, tfp: Quantity) {
  const f = platesMonoIFormulas;
  const more = (symbol: string, title: string) => ({ symbol: symbol + SHORT[side], title });
  return {
    A: r.formula(
      f.flangeArea,
      `section/${side}/A`,
      { bfp, tfp },
      more('A', `Area of the ${side} flange`),
    ),
    lambda: r.formula(
      platesIFormulas.lambdaf,
      `section/${side}/lambda`,
      { bf: bfp, tf: tfp },
      more('lambdaf', `Width-to-thickness ratio of the ${side} flange`),
    ),
    Iyf: r.formula(
      f.Iyf,
      `section/${side}/Iy`,
      { bfp, tfp },
      more('Iy', `Second moment of area of the ${side} flange, minor axis`),
    ),
  };
}

const faceModulus = (r: Recorder, side: Side, Ix: Quantity, yface: Quantity): Quantity =>
  r.formula(
    platesMonoIFormulas.face,
    `section/${side}/S`,
    { Ix, yface },
    { symbol: `S${SHORT[side]}`, title: `Elastic modulus of the ${side} face` },
  );

const centroidDepth = (r: Recorder, side: Side, yface: Quantity, tfp: Quantity): Quantity =>
  r.formula(
    platesMonoIFormulas.hc,
    `section/${side}/hc`,
    { yface, tfp },
    {
      symbol: `hc${SHORT[side]}`,
      title: `Twice the distance from the centroid to the inside of the ${side} flange`,
    },
  );

/** Where half of the area lies on either side, and Zx about it. */
function plasticAxis(
  r: Recorder,
  q: MonoSizes & Readonly<Record<'h' | 'Atop' | 'Abot' | 'Aw' | 'A', Quantity>>,
): { readonly yp: Quantity; readonly Zx: Quantity } {
  const f = platesMonoIFormulas;
  const Ahalf = r.formula(f.half, 'section/Ahalf', { A: q.A });
  const taken = r.choice(
    'section/pna',
    [
      {
        left: q.Atop,
        relation: '>',
        right: Ahalf,
        outcome: 'the plastic neutral axis lies in the top flange',
      },
      {
        left: q.Abot,
        relation: '>',
        right: Ahalf,
        outcome: 'the plastic neutral axis lies in the bottom flange',
      },
    ],
    'the plastic neutral axis lies in the web',
    { title: 'Plastic neutral axis', clause: clause('Mono I') },
  );
  const [position, modulus] = (
    [
      [f.ypTop, f.ZxTop],
      [f.ypBottom, f.ZxBottom],
    ] as const
  )[taken] ?? [f.ypWeb, f.ZxWeb];
  const operands = { ...q, Ahalf };
  const yp = r.formula(position, 'section/yp', operands);
  return { yp, Zx: r.formula(modulus, 'section/Zx', { ...operands, yp }) };
}
