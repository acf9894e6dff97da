import { designationsOf, FAMILIES, type Family, findShape } from '#shared/sections/table.ts';
import type { Random } from './random.ts';
import { baseValue, lengthText, MPA_PER_KSI, stressText } from './random-quantities.ts';

/** A section with its steel as INPUT.json has them, and about how strong it is, N and mm. */
export interface RandomSection {
  readonly section: unknown;
  readonly material: unknown;
  readonly Fy: number;
  readonly A: number;
  readonly Ix: number;
  readonly Iy: number;
  readonly Zx: number;
  readonly Zy: number;
}
type Rough = Pick<RandomSection, 'A' | 'Ix' | 'Iy' | 'Zx' | 'Zy'>;
interface Chosen {
  readonly section: unknown;
  readonly grades: readonly string[];
  readonly rough: Rough;
}

const GRADES: Readonly<Record<Family, readonly string[]>> = {
  W: ['A992', 'A992', 'A36', 'A572 Gr. 50', 'A913 Gr. 50', 'A913 Gr. 60', 'A913 Gr. 65'],
  M: ['A36', 'A529 Gr. 55', 'A572 Gr. 65'],
  S: ['A36', 'A992', 'A572 Gr. 42'],
  HP: ['A572 Gr. 50', 'A588', 'A913 Gr. 80'],
  C: ['A36', 'A529 Gr. 50', 'A572 Gr. 60'],
  MC: ['A36', 'A992', 'A572 Gr. 55'],
  HSS: ['A500 Gr. B', 'A500 Gr. C', 'A500-21 Gr. C'],
  'round HSS': ['A500 Gr. B', 'A500 Gr. C', 'A500-21 Gr. C'],
  pipe: ['A53 Gr. B'],
};
const PLATES = ['A36', 'A572 Gr. 50', 'A572 Gr. 42', 'A588'];
const TUBES = ['A500 Gr. B', 'A500 Gr. C', 'A500-21 Gr. C', 'A1085'];
/** Wide thin flanges: slender in compression from about 85 ksi, in flexure from about 280 ksi. */
const WIDE = ['W14X90', 'W12X65', 'W6X15', 'W8X31'];

function tabulated(random: Random): Chosen {
  const family = random.pick([...FAMILIES, 'W', 'W', 'W', 'HSS'] as const);
  const shape = findShape(random.pick(designationsOf(family)));
  if (!shape) throw new Error(family);
  const value = (...names: string[]): number => {
    const found = names.map((name) => Reflect.get(shape.properties, name)).find((p) => p);
    return found.value;
  };
  return {
    section: shape.designation,
    grades: GRADES[family],
    rough: {
      A: value('A'),
      Ix: value('Ix', 'I'),
      Iy: value('Iy', 'I'),
      Zx: value('Zx', 'Z'),
      Zy: value('Zy', 'Z'),
    },
  };
}

/** Four walls, or two flanges and a web, near enough to choose forces by. */
const rough = (d: number, b: number, flanges: number, webs: number): Rough => ({
  A: flanges + webs,
  Ix: (flanges * d ** 2) / 4 + (webs * d ** 2) / 12,
  Iy: (flanges * b ** 2) / 12 + (webs * b ** 2) / 40,
  Zx: (flanges * d) / 2 + (webs * d) / 4,
  Zy: (flanges * b) / 4 + (webs * b) / 40,
});

function bySizes(random: Random): Chosen {
  const size = (mm: number) => {
    const text = lengthText(random, mm);
    return { text, value: baseValue(text, 'length') };
  };
  const d = size(random.between(180, 900));
  // Webs and flanges from stocky to slender.
  const tw = size(d.value / random.size(15, 150));
  const tf = size(Math.max(tw.value, d.value / random.size(15, 80)));
  const shape = random.pick(['i', 'mono-i', 'box', 'tube', 'round'] as const);
  switch (shape) {
    case 'i': {
      const bf = size(d.value * random.between(0.3, 0.95));
      return {
        section: { shape, d: d.text, bf: bf.text, tf: tf.text, tw: tw.text },
        grades: PLATES,
        rough: rough(d.value, bf.value, 2 * bf.value * tf.value, d.value * tw.value),
      };
    }
    case 'mono-i': {
      const [top, bottom] = [0, 0].map(() => size(d.value * random.between(0.25, 0.7)));
      const under = size(tf.value * random.between(0.6, 1.4));
      if (!top || !bottom) throw new Error(shape);
      return {
        section: {
          ...{ shape, d: d.text, tw: tw.text, bfTop: top.text, bfBottom: bottom.text },
          ...{ tfTop: tf.text, tfBottom: under.text },
        },
        grades: PLATES,
        rough: rough(
          d.value,
          Math.min(top.value, bottom.value),
          top.value * tf.value + bottom.value * under.value,
          d.value * tw.value,
        ),
      };
    }
    case 'box': {
      const B = size(d.value * random.between(0.5, 0.95));
      return {
        section: { shape, B: B.text, d: d.text, tf: tf.text, tw: tw.text },
        grades: PLATES,
        rough: rough(d.value, B.value, 2 * B.value * tf.value, 2 * d.value * tw.value),
      };
    }
    case 'tube': {
      const Ht = size(random.between(60, 500));
      const B = random.chance(0.3) ? Ht : size(Ht.value * random.between(0.4, 0.95));
      const t = size(B.value / random.size(8, 90));
      const wall = random.pick(['nominal', 'design']);
      const Ro = random.chance(0.3) && {
        Ro: `${Math.min(t.value * random.between(1, 3), 0.45 * B.value)} mm`,
      };
      return {
        section: { shape, B: B.text, Ht: Ht.text, t: t.text, wall, ...Ro },
        grades: TUBES,
        rough: rough(Ht.value, B.value, 2 * B.value * t.value, 2 * Ht.value * t.value),
      };
    }
    case 'round': {
      const D = size(random.between(60, 600));
      const t = size(D.value / random.size(10, 250));
      const A = Math.PI * D.value * t.value;
      const [I, Z] = [(A * D.value ** 2) / 8, (A * D.value) / Math.PI];
      return {
        section: { shape, D: D.text, t: t.text, wall: random.pick(['nominal', 'design']) },
        grades: TUBES,
        rough: { A, Ix: I, Iy: I, Zx: Z, Zy: Z },
      };
    }
  }
}

/** A shape of any table or by sizes of any kind, of a grade or of a steel of its own. */
export function randomSection(random: Random): RandomSection {
  const wide = random.chance(0.05);
  const chosen = random.chance(0.65) ? tabulated(random) : bySizes(random);
  const designation = wide ? random.pick(WIDE) : null;
  const shape = designation === null ? undefined : findShape(designation);
  if (shape?.kind === 'i') {
    const { A, Ix, Iy, Zx, Zy } = shape.properties;
    const values = { A: A.value, Ix: Ix.value, Iy: Iy.value, Zx: Zx.value, Zy: Zy.value };
    const Fy = MPA_PER_KSI * random.pick([95, 100, 120, 400]);
    return { section: designation, ...ownSteel(random, Fy), ...values };
  }
  const { section, grades, rough: values } = chosen;
  if (random.chance(0.3))
    return {
      ...{ section, ...values },
      ...ownSteel(random, MPA_PER_KSI * random.between(20, 100)),
    };
  return { section, material: random.pick(grades), Fy: 300, ...values };
}

function ownSteel(random: Random, Fy: number) {
  return {
    material: {
      name: 'own steel',
      Fy: stressText(random, Fy),
      ...(random.chance(0.7) && { Fu: stressText(random, 1.25 * Fy) }),
      source: { kind: 'assumption', basis: 'random' },
    },
    Fy,
  };
}
