import { findShape, W_DESIGNATIONS } from '#shared/sections/table.ts';
import type { Random } from './random.ts';

const MM_PER_FT = 304.8;
const N_PER_KIP = 4448.2216152605;
const NMM_PER_KIPFT = N_PER_KIP * MM_PER_FT;
/** Wide thin flanges: slender in compression from about 85 ksi, in flexure from about 280 ksi. */
const WIDE = ['W14X90', 'W12X65', 'W6X15', 'W8X31'];
const GRADES = ['A992', 'A572 Gr. 50', 'A36', 'A913 Gr. 65', 'A913 Gr. 70'];

/** A number as somebody types it: two to nine significant digits, sometimes as computed by a spreadsheet. */
const typed = (random: Random, value: number): string => {
  const text = String(Number(value.toPrecision(random.pick([2, 3, 3, 4, 6, 9]))));
  return random.chance(0.05) ? String(value) : text;
};

const length = (random: Random, mm: number): string => {
  const ft = mm / MM_PER_FT;
  const whole = Math.floor(ft);
  return random.pick([
    () => `${typed(random, ft)} ft`,
    () => `${typed(random, ft * 12)} in`,
    () => `${typed(random, mm / 1000)} m`,
    () => `${typed(random, mm)} mm`,
    () => `${whole} ft ${typed(random, Math.max(0.25, (ft - whole) * 12))} in`,
  ])();
};
const force = (random: Random, N: number): string =>
  random.chance(0.5) ? `${typed(random, N / N_PER_KIP)} kip` : `${typed(random, N / 1000)} kN`;
const moment = (random: Random, Nmm: number): string =>
  random.chance(0.5)
    ? `${typed(random, Nmm / NMM_PER_KIPFT)} kip ft`
    : `${typed(random, Nmm / 1e6)} kN m`;

/** End moments of one plane: none, one end, equal, reverse, any. */
const endMoments = (random: Random, size: number): readonly [number, number] =>
  random.pick<() => readonly [number, number]>([
    () => [0, 0],
    () => [size, 0],
    () => [0, -size],
    () => [size, size],
    () => [size, -size],
    () => [size, size * (1 - 1e-9)],
    () => [size, size * random.between(-1, 1)],
    () => [size * random.between(-1, 1), size],
    () => [size, size * 1e-6],
  ])();

/**
 * INPUT.json of one random member: every shape and steel, all methods, either unit set; no axial
 * force, hardly any, any, and close to the critical loads.
 */
export function randomInput(random: Random): unknown {
  const wide = random.chance(0.12);
  const designation = random.pick(wide ? WIDE : W_DESIGNATIONS);
  const shape = findShape(designation);
  if (!shape) throw new Error(designation);
  const design = random.pick(['LRFD', 'ASD'] as const);
  const alpha = design === 'ASD' ? 1.6 : 1;
  const method = random.pick(['direct', 'effective-length', 'first-order'] as const);
  const secondOrder = random.pick(['from-analysis', 'amplified', 'exact'] as const);
  const own = wide || random.chance(0.35);
  const FyKsi = wide ? random.pick([95, 100, 100, 120, 400]) : own ? random.between(20, 100) : 50;
  const L = random.between(wide ? 0.5 : 1.5, 16) * 1000;
  const share = () => random.pick([1, 1, 0.5, 1 / 3, 1.2, random.between(0.2, 2)]);
  const { A, Ix, Iy, Zx, Zy } = shape.properties;
  const critical = (I: number) =>
    (Math.PI ** 2 * (method === 'direct' ? 0.8 : 1) * 200000 * I) / L ** 2 / alpha;
  const squash = (FyKsi * 6.894757 * A.value) / alpha;
  const axial = (): number =>
    random.pick([
      () => 0,
      () => random.size(1e-6, 1) * squash,
      () => random.between(0, 0.9) * squash,
      () => random.between(0, 0.4) * squash,
      () => random.between(0.85, 1.02) * Math.min(critical(Ix.value), squash),
      () => random.between(0.85, 1.02) * Math.min(critical(Iy.value), squash),
      () => random.size(1e-9, 1e-3) * critical(Iy.value),
      () => (random.chance(0.2) ? -0.1 * squash : 0.2 * squash),
    ])();
  const combination = (name: string) => {
    const size = (Z: number) =>
      FyKsi * 6.894757 * Z * random.pick([0.1, 0.3, 0.6, random.size(1e-4, 2)]);
    const [MxA, MxB] = endMoments(random, size(Zx.value) / alpha);
    const [MyA, MyB] = endMoments(random, size(Zy.value) / alpha);
    const given = secondOrder === 'from-analysis' && random.chance(0.6);
    return {
      name,
      P: force(random, axial()),
      MxA: moment(random, MxA),
      MxB: moment(random, MxB),
      MyA: moment(random, MyA),
      MyB: moment(random, MyB),
      ...(given && { MxMax: moment(random, size(Zx.value)) }),
      ...(given && { MyMax: moment(random, size(Zy.value)) }),
    };
  };
  const text = length(random, L);
  const held = random.chance(0.75);
  return {
    format: 1,
    standard: 'aisc360-22',
    design,
    units: random.pick(['us', 'si']),
    analysis: {
      method,
      secondOrder,
      includesMemberEffect: random.chance(0.5),
      sway: 'none',
    },
    members: [
      {
        mark: designation,
        section: designation,
        material: own
          ? {
              name: 'own steel',
              Fy: `${typed(random, FyKsi)} ksi`,
              source: { kind: 'assumption', basis: 'random' },
            }
          : random.pick(GRADES),
        length: text,
        ends: 'held',
        // Held at the ends only, in both planes, or with any buckling lengths.
        Lcx: held ? text : length(random, L * share()),
        Lcy: held ? text : length(random, L * share()),
        Lcz: random.chance(0.4) ? text : length(random, L * share()),
        Lb: random.pick([() => '0 ft', () => text, () => length(random, L * share())])(),
        ...(random.chance(0.7) && {
          Cb: random.pick<() => string | number>([
            () => 'auto',
            () => 'auto',
            () => Number(random.between(1, 2.3).toFixed(2)),
          ])(),
        }),
        endMomentSign: random.pick(['bending', 'joint']),
        combinations: Array.from({ length: random.whole(1, 3) }, (_, i) =>
          combination(`C${i + 1}`),
        ),
      },
    ],
  };
}
