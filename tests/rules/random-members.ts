import type { Random } from './random.ts';
import {
  type RandomRestraint,
  randomLoads,
  randomRestraints,
  randomSupports,
  randomSway,
} from './random-loading.ts';
import {
  areaText,
  baseValue,
  computedMomentText,
  forceText,
  lengthText,
  momentText,
  stiffnessText,
} from './random-quantities.ts';
import { type RandomSection, randomSection } from './random-sections.ts';

const PROVISIONS = ['H1.3', 'H2', 'H1.2-Cb', 'C2.3-taub'] as const;

/** End moments of one plane: none, one end, equal, reverse, any; or equal and reverse but for little. */
function endMoments(random: Random, size: number): readonly string[] {
  if (random.chance(0.12)) {
    const little = size * 10 ** -random.whole(6, 15);
    const MB = random.pick([size + little, little - size, size - little, Math.max(little, 1e-6)]);
    return [size, MB].map((M) => computedMomentText(random, M));
  }
  const moments = random.pick<() => readonly [number, number]>([
    () => [0, 0],
    () => [size, 0],
    () => [0, -size],
    () => [size, size],
    () => [size, -size],
    () => [size, size * random.between(-1, 1)],
    () => [size * random.between(-1, 1), size],
    () => [size, size * 1e-6],
  ])();
  return moments.map((M) => momentText(random, M));
}

interface Basis {
  readonly design: 'LRFD' | 'ASD';
  readonly method: 'direct' | 'effective-length' | 'first-order';
  readonly secondOrder: 'from-analysis' | 'amplified' | 'exact';
  readonly sways: boolean;
}

function randomBasis(random: Random): Basis {
  const secondOrder = random.pick(['from-analysis', 'amplified', 'exact'] as const);
  return {
    design: random.pick(['LRFD', 'ASD'] as const),
    method: random.pick(['direct', 'effective-length', 'first-order'] as const),
    secondOrder,
    sways: secondOrder === 'amplified' && random.chance(0.25),
  };
}

interface Parts {
  readonly basis: Basis;
  readonly section: RandomSection;
  readonly L: number;
  readonly restraints: readonly RandomRestraint[] | null;
  readonly springs: boolean;
}

/** Axial force: none, hardly any, any, close to a critical load, tension. */
function randomAxial(random: Random, { basis, section: s, L, springs }: Parts): number {
  const alpha = basis.design === 'ASD' ? 1.6 : 1;
  const critical = (I: number) =>
    (Math.PI ** 2 * (basis.method === 'direct' ? 0.8 : 1) * 200000 * I) / L ** 2 / alpha;
  const squash = (s.Fy * s.A) / alpha;
  const pulled = random.chance(0.2) ? -1 : 1;
  if (springs && random.chance(0.4)) return -random.between(0.05, 3) * critical(s.Ix);
  return random.pick([
    () => 0,
    () => pulled * random.size(1e-6, 1) * squash,
    () => pulled * random.between(0, 0.9) * squash,
    () => pulled * random.between(0, 0.3) * Math.min(squash, critical(s.Iy)),
    () => pulled * random.between(0, 0.3) * Math.min(squash, critical(s.Iy)),
    () => random.between(0.85, 1.02) * Math.min(critical(s.Ix), squash),
    () => random.between(0.85, 1.02) * Math.min(critical(s.Iy), squash),
    () => pulled * random.size(1e-9, 1e-3) * critical(s.Iy),
  ])();
}

function randomCombination(random: Random, name: string, parts: Parts) {
  const { basis, section: s, L, restraints, springs } = parts;
  const alpha = basis.design === 'ASD' ? 1.6 : 1;
  const share = random.pick([0.1, 0.3, 0.6, random.size(1e-4, 2)]);
  const size = (axis: 'x' | 'y') => (s.Fy * (axis === 'x' ? s.Zx : s.Zy) * share) / alpha;
  const signed = (axis: 'x' | 'y') => {
    const M = size(axis) * random.pick([0, 1, -1, 1e-11, random.between(-1, 1)]);
    // Moments below what any member has are refused as typing mistakes.
    return Math.abs(M) < 1e-6 ? 0 : M;
  };
  const [MxA, MxB] = springs ? ['0 kN m', '0 kip ft'] : endMoments(random, size('x'));
  const [MyA, MyB] = springs
    ? ['0 kip ft', '0 kN m']
    : endMoments(random, size('y') * random.pick([0, 1]));
  const given = basis.secondOrder === 'from-analysis' && random.chance(0.4);
  const loads = random.chance(springs ? 0.9 : 0.5)
    ? randomLoads(random, L, restraints ?? [], size)
    : [];
  const supports = restraints ? randomSupports(random, restraints, signed) : [];
  return {
    name,
    P: forceText(random, randomAxial(random, parts)),
    ...{ MxA, MxB, MyA, MyB },
    ...(given && { MxMax: momentText(random, size('x')) }),
    ...(given && { MyMax: momentText(random, size('y')) }),
    ...(loads.length > 0 && { loads }),
    ...(supports.length > 0 && { supports }),
    ...(random.chance(0.15) && { Vx: forceText(random, (8 * size('x')) / L) }),
    ...(random.chance(0.1) && { Vy: forceText(random, (8 * size('y')) / L) }),
    ...(basis.sways &&
      random.chance(0.8) && { sway: randomSway(random, (s.Fy * s.A) / alpha, signed) }),
  };
}

/** Buckling lengths as typed: those of the member, or any. */
function typedLengths(random: Random, text: string, L: number) {
  const share = () => random.pick([1, 1, 0.5, 1 / 3, 1.2, random.between(0.2, 2)]);
  const held = random.chance(0.75);
  return {
    Lcx: held ? text : lengthText(random, L * share()),
    Lcy: held ? text : lengthText(random, L * share()),
    Lcz: random.chance(0.4) ? text : lengthText(random, L * share()),
    Lb: random.pick([() => '0 ft', () => text, () => lengthText(random, L * share())])(),
  };
}

function randomDetails(random: Random, s: RandomSection, chartable: boolean) {
  const joint = () => ({
    sidesway: random.pick(['inhibited', 'uninhibited']),
    GA: random.pick([0, 1, 10, Number(random.size(0.05, 60).toPrecision(3))]),
    GB: random.pick([1, 10, Number(random.size(0.05, 60).toPrecision(3))]),
  });
  const An = areaText(random, s.A * random.between(0.5, 1));
  return {
    ...(chartable && random.chance(0.5) && { charts: { x: joint() } }),
    ...(random.chance(0.5) && {
      netSection: random.chance(0.5) ? { Ae: An } : { An, U: random.pick([0.7, 0.85, 1]) },
    }),
    ...(random.chance(0.15) && { stiffeners: lengthText(random, random.between(200, 2000)) }),
  };
}

/**
 * INPUT.json of one random member: a section of any table or by sizes, any steel, all methods,
 * either unit set; lengths typed or from restraints; end moments, loads, moments over supports,
 * sway, end springs; no axial force, hardly any, any, tension, and close to the critical loads.
 */
export function randomInput(random: Random): unknown {
  const drawn = randomBasis(random);
  const section = randomSection(random);
  const radius = Math.sqrt(section.Iy / section.A);
  const text = lengthText(random, random.pick([20, 60, 100, 150, 250]) * radius);
  const L = baseValue(text, 'length');
  const springs =
    drawn.secondOrder === 'exact' && random.chance(0.2)
      ? {
          xA: '0 kip ft/rad',
          xB: stiffnessText(random, (random.size(0.1, 100) * 2e5 * section.Ix) / L),
        }
      : null;
  const basis = springs ? { ...drawn, sways: false } : drawn;
  const restraints = springs || random.chance(0.5) ? null : randomRestraints(random, L);
  const charts = random.chance(0.15);
  const parts = { basis, section, L, restraints, springs: springs !== null };
  return {
    format: 1,
    standard: 'aisc360-22',
    design: basis.design,
    units: random.pick(['us', 'si']),
    ...(random.chance(0.2) && { constants: random.pick(['us', 'si']) }),
    analysis: {
      method: basis.method,
      secondOrder: basis.secondOrder,
      includesMemberEffect: random.chance(0.5),
      sway: basis.sways ? 'B2' : 'none',
      ...(random.chance(0.2) && { driftRatio: random.pick([1.05, 1.3, 1.5, 1.7]) }),
      ...(random.chance(0.5) && { provisions: PROVISIONS.filter(() => random.chance(0.5)) }),
    },
    members: [
      {
        mark: 'M1',
        section: random.chance(0.01) ? 'WT7X34' : section.section,
        material: section.material,
        length: text,
        ends: springs ? 'springs' : random.chance(0.02) ? random.pick(['free', 'sway']) : 'held',
        ...(springs && { springs }),
        ...(restraints ? { restraints } : typedLengths(random, text, L)),
        ...(random.chance(0.7) && {
          Cb: random.pick<() => string | number>([
            () => 'auto',
            () => 'auto',
            () => Number(random.between(1, 2.3).toFixed(2)),
          ])(),
        }),
        ...randomDetails(random, section, restraints !== null && charts),
        endMomentSign: random.pick(['bending', 'joint']),
        combinations: Array.from({ length: random.whole(1, 3) }, (_, i) =>
          randomCombination(random, `C${i + 1}`, parts),
        ),
      },
    ],
  };
}
