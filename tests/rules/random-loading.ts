import type { Random } from './random.ts';
import {
  baseValue,
  forceText,
  lengthText,
  lineLoadText,
  momentText,
  placeText,
} from './random-quantities.ts';

/** What is held at a place between the ends; texts as INPUT.json has them. */
export interface RandomRestraint {
  readonly at: string;
  readonly holds: readonly string[];
}

const HOLDS: readonly (readonly string[])[] = [
  ['top'],
  ['bottom'],
  ['centre'],
  ['twist'],
  ['top', 'bottom'],
  ['centre', 'twist'],
  ['in-plane'],
  ['in-plane', 'centre', 'twist'],
  ['in-plane', 'top', 'bottom', 'centre', 'twist'],
  ['in-plane', 'top'],
  ['top', 'twist'],
];

/** None to four restraints, now and then two of them very close together or beside an end. */
export function randomRestraints(random: Random, L: number): readonly RandomRestraint[] {
  const count = random.pick([0, 1, 1, 1, 2, 2, 3, 4]);
  const shares = random.pick([
    () => Array.from({ length: count }, (_, i) => (i + 1) / (count + 1)),
    () => Array.from({ length: count }, (_, i) => (i + random.between(0.2, 0.8)) / (count || 1)),
    () => [0.5, 0.5 + random.pick([2e-4, 1e-3, 0.01])].slice(0, count),
    () => [random.pick([2e-4, 1e-3]), 1 - random.pick([2e-4, 1e-3])].slice(0, count),
  ])();
  const same = random.chance(0.4) ? random.pick(HOLDS) : null;
  return shares.map((share) => ({
    at: placeText(random, share * L),
    holds: same ?? random.pick(HOLDS),
  }));
}

/** A place of a load: anywhere, at an end, at a restraint, in the middle. */
const loadPlace = (
  random: Random,
  L: number,
  restraints: readonly RandomRestraint[],
): { readonly at: string; readonly value: number } => {
  const at = random.pick([
    () => placeText(random, random.between(0.01, 0.99) * L),
    () => placeText(random, L / 2),
    () => '0 ft',
    () => `${L} mm`,
    () => (restraints.length > 0 ? random.pick(restraints).at : placeText(random, L / 3)),
    // At a restraint, but written anew: the last digits may differ.
    () =>
      restraints.length > 0
        ? placeText(random, baseValue(random.pick(restraints).at, 'length'))
        : placeText(random, L / 4),
  ])();
  return { at, value: baseValue(at, 'length') };
};

/** Loads between the ends that bend the axes by about `size(axis)`, N mm. */
export function randomLoads(
  random: Random,
  L: number,
  restraints: readonly RandomRestraint[],
  size: (axis: 'x' | 'y') => number,
): readonly unknown[] {
  return Array.from({ length: random.pick([0, 0, 1, 1, 2, 3]) }, () => {
    const bends = random.pick(['x', 'x', 'y'] as const);
    // A load off the shear centre that bends the minor axis twists: outside the scope.
    const height = random.pick(
      bends === 'x' || random.chance(0.1) ? ['top', 'centre', 'bottom'] : ['centre'],
    );
    const sign = random.pick([1, 1, -1]);
    const common = { bends, height };
    if (random.chance(0.4))
      return {
        ...{ kind: 'point', ...common, at: loadPlace(random, L, restraints).at },
        W: forceText(random, (sign * 4 * size(bends)) / L),
      };
    const line = (share: number) => lineLoadText(random, (share * sign * 8 * size(bends)) / L ** 2);
    const ends = [loadPlace(random, L, restraints), loadPlace(random, L, restraints)];
    const [from, to] = ends.sort((a, b) => a.value - b.value);
    const reach =
      from && to && random.chance(0.5) && to.value > from.value ? { from: from.at, to: to.at } : {};
    if (random.chance(0.5)) return { kind: 'uniform', ...common, ...reach, w: line(1) };
    const [wFrom, wTo] = random.pick([
      [0, 1],
      [1, 0],
      [1, 1],
      [-1, 1],
      [0.3, 1],
    ] as const);
    return { kind: 'linear', ...common, ...reach, wFrom: line(wFrom), wTo: line(wTo) };
  });
}

/** Moments over the points held between the ends; now and then one is left out. */
export function randomSupports(
  random: Random,
  restraints: readonly RandomRestraint[],
  moment: (axis: 'x' | 'y') => number,
): readonly unknown[] {
  return restraints.flatMap(({ at, holds }) => {
    const x = holds.includes('in-plane') && random.chance(0.95);
    const lateral = ['top', 'bottom', 'centre'].some((hold) => holds.includes(hold));
    const y = lateral && random.chance(0.9);
    if (!x && !y) return [];
    return {
      at,
      ...(x && { Mx: momentText(random, moment('x')) }),
      ...(y && { My: momentText(random, moment('y')) }),
    };
  });
}

/** Sway of the story by B2 in one or both directions, from stiff to unstable. */
export function randomSway(
  random: Random,
  squash: number,
  moment: (axis: 'x' | 'y') => number,
): unknown {
  const direction = (axis: 'x' | 'y') => {
    const Pstory = squash * random.size(1, 20);
    const mean = moment(axis);
    const [MA, MB] = random.pick([
      [mean, -mean],
      [mean, 0],
      [mean, mean / 3],
      [0, 0],
    ] as const);
    const stiffness = random.chance(0.4)
      ? { PeStory: forceText(random, Pstory * random.pick([0.5, 1.2, 3, 10, 100])) }
      : {
          H: forceText(random, Pstory * random.size(0.01, 0.3)),
          height: lengthText(random, random.between(3000, 6000)),
          drift: lengthText(random, random.size(1, 60)),
          ...random.pick([
            { RM: 'braced' },
            { RM: 'lower bound' },
            { Pmf: '0 kip' },
            { Pmf: `${0.4 * Pstory} N` },
          ]),
        };
    return {
      MA: momentText(random, MA),
      MB: momentText(random, MB),
      Pstory: `${Pstory} N`,
      ...stiffness,
    };
  };
  const axial = random.pick([0, 0.02, -0.02, 0.2, -0.3]) * squash;
  return {
    ...(random.chance(0.7) && { P: forceText(random, axial) }),
    ...(random.chance(0.8) && { x: direction('x') }),
    ...(random.chance(0.5) && { y: direction('y') }),
  };
}
