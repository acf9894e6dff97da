import { AXIAL_STATES } from './axial-states.ts';
import { type Axis, WORD } from './bay-moments.ts';
import { FLEXURE_STATES } from './flexure-states.ts';
import {
  bent,
  type Context,
  check,
  checked,
  find,
  type LimitState,
  na,
  noMoment,
  outside,
  type Told,
  unreached,
} from './limit-state.ts';

function secondOrder(axis: Axis): LimitState {
  return {
    id: `second-order/${axis}`,
    title: `Second-order moment, ${WORD[axis]} axis`,
    clause: ['App. 8.1.2'],
    tell: (c) => {
      if (!bent(c, axis)) return na(noMoment(axis));
      const state = c.run.planes[axis]?.state;
      if (!state) return unreached(c, [axis]);
      if (state === 'failed') return { ...unreached(c, [axis]), state: 'governs' };
      if (state === 'outside scope') return unreached(c, [axis]);
      if (!c.run.compressed) return na('no compression: first-order moments');
      const squash = find(c, 'C2/squash');
      if (squash)
        return {
          state: 'governs',
          because: 'no finite second-order moment exists',
          address: squash.address,
        };
      const at = ['theory', 'App8']
        .flatMap((book) => [`${book}/${axis}/Mr`, `bay1/${book}/${axis}/Mr`])
        .concat(`theory/${axis}/Mmax`, `bay1/theory/${axis}/Mmax`)
        .map((key) => find(c, key))
        .find((found) => found !== null);
      return {
        state: 'does not govern',
        because: interacts(c) ? 'enters the interaction' : 'the interaction is not reached',
        address: at?.address ?? null,
      };
    },
  };
}

const interacts = (c: Context): boolean =>
  c.record.lines.some((l) => l.kind === 'check' && /(^|\/)(H1|H2)\/check$|H1\.3/.test(l.key));

/** A check of H that replaces or is the interaction. */
const interactionBy = (
  id: string,
  title: string,
  clause: string,
  keys: readonly string[],
  absent: string,
): LimitState => ({
  id,
  title,
  clause: [clause],
  bySegment: true,
  tell: (c) => {
    const found = keys.map((key) => check(c, key)).filter((one) => one !== null);
    const [first] = found;
    if (!first) return na(absent);
    const worst = found.reduce((a, b) => (b.line.ratio > a.line.ratio ? b : a), first);
    return checked(c, worst);
  },
});

function interaction(c: Context): Told {
  const found = check(c, 'H1/check');
  if (found) return checked(c, found);
  if (check(c, 'H2/check') || check(c, 'H1.3/in-plane'))
    return { ...na('another provision of Chapter H, which the basis chose, decides') };
  const present = [c.run.compressed || c.run.tension, bent(c, 'x'), bent(c, 'y')].filter(
    Boolean,
  ).length;
  if (present === 0) return na('there are no forces');
  if (present === 1) return na('only one of axial force and moments is present');
  const lacking = ['axial', 'x', 'y'].some((part) => find(c, `H1/${part}/lacking`));
  const done = (['x', 'y'] as const).every((axis) =>
    ['none', 'done'].includes(c.run.planes[axis]?.state ?? 'none'),
  );
  return c.segment !== null && done && !lacking
    ? na('only one of axial force and moments is present within the segment')
    : unreached(c, ['x', 'y']);
}

const shear = (axis: Axis): LimitState => ({
  id: `shear/${axis}`,
  title: `Shear, flexure about the ${WORD[axis]} axis`,
  clause: [axis === 'x' ? 'G2' : 'G6'],
  tell: (c) => {
    const found = check(c, `G/${axis}/check`);
    if (found) return checked(c, found);
    if (!bent(c, axis)) return na(noMoment(axis));
    if (!c.run.planes[axis]) return unreached(c, [axis]);
    return find(c, `G/${axis}`)
      ? na('the moment does not change along the member')
      : outside('the shear force cannot be told from what is given');
  },
});

const outsideAlways = (id: string, title: string, clause: string, because: string): LimitState => ({
  id,
  title,
  clause: [clause],
  never: true,
  tell: () => outside(because),
});

export const LIMIT_STATES: readonly LimitState[] = [
  ...AXIAL_STATES,
  {
    id: 'second-order/story',
    title: 'Sway of the story',
    clause: ['App. 8.1.3'],
    tell: (c) => {
      const found = ['x', 'y']
        .flatMap((axis) => [
          `App8/${axis}/B2/unstable`,
          `App8/${axis}/B2/ratio/above`,
          `App8/${axis}/B2/trial`,
        ])
        .map((key) => find(c, key))
        .find((one) => one !== null);
      if (!found) return na('the ends do not translate');
      if (found.line.kind === 'notice') return { ...outside(found.line.title, found.address) };
      return {
        state: 'does not govern',
        because: 'enters the required strengths',
        address: found.address,
      };
    },
  },
  secondOrder('x'),
  secondOrder('y'),
  ...FLEXURE_STATES,
  {
    id: 'interaction',
    title: 'Flexure and axial force',
    clause: ['H1'],
    bySegment: true,
    tell: interaction,
  },
  interactionBy(
    'interaction/single-axis',
    'Flexure and compression by single-axis provisions',
    'H1.3',
    ['H1.3/in-plane', 'H1.3/out-of-plane'],
    'the basis does not choose it, or its conditions do not hold',
  ),
  interactionBy(
    'interaction/stresses',
    'Interaction of stresses',
    'H2',
    ['H2/check'],
    'the basis does not choose it',
  ),
  shear('x'),
  shear('y'),
  outsideAlways('torsion', 'Torsion', 'H3', 'loads are taken through the shear centre'),
  outsideAlways(
    'concentrated',
    'Concentrated forces on webs and flanges',
    'J10',
    'belongs to the connections',
  ),
  outsideAlways('holes', 'Holes in the tension flange', 'F13.1', 'no holes are given'),
  outsideAlways(
    'bracing',
    'Strength and stiffness of the assumed braces',
    'App. 6',
    'braces are taken as given',
  ),
  outsideAlways('deflection', 'Deflection and drift', 'L2', 'serviceability is not covered'),
];
