import {
  type Axis,
  bent,
  type Context,
  check,
  checked,
  find,
  LESS,
  type LimitState,
  na,
  noMoment,
  outside,
  strength,
  type Told,
  takenBy,
  unreached,
} from './limit-state.ts';

const COMPRESSION = 'no compression in this combination';
const flexural = (axis: Axis, word: string): LimitState => ({
  id: `compression/flexural-${axis}`,
  title: `Flexural buckling about the ${word} axis`,
  clause: ['E3', 'E3-4'],
  tell: (c) => {
    if (!c.run.compressed) return na(COMPRESSION);
    const key = `E3/${axis}/Fe`;
    if (!find(c, 'E3/Fe')) return unreached(c, []);
    return strength(c, key, takenBy(c, 'E3/Fe') === key, LESS);
  },
});

function secondOrder(axis: Axis, word: string): LimitState {
  return {
    id: `second-order/${axis}`,
    title: `Second-order moment, ${word} axis`,
    clause: ['App. 8.1.2'],
    tell: (c) => {
      const state = c.run.planes[axis]?.state ?? 'none';
      if (state === 'none') return na(noMoment(axis));
      if (state === 'failed') return { ...unreached(c, [axis]), state: 'governs' };
      if (state === 'outside scope') return unreached(c, [axis]);
      if (!c.run.compressed) return na('no axial force: first-order moments');
      const squash = find(c, 'C2/squash');
      if (squash)
        return {
          state: 'governs',
          because: 'no finite second-order moment exists',
          address: squash.address,
        };
      const at =
        find(c, `theory/${axis}/Mr`) ??
        find(c, `App8/${axis}/Mr`) ??
        find(c, `theory/${axis}/Mmax`);
      return {
        state: 'does not govern',
        because: check(c, 'H1/check') ? 'enters the interaction' : 'the interaction is not reached',
        address: at?.address ?? null,
      };
    },
  };
}

/** Limit states of F2 and F3; `tell` is asked once the web is known to be compact. */
const major = (
  id: string,
  title: string,
  clause: LimitState['clause'],
  tell: (c: Context) => Told,
): LimitState => ({
  id: `flexure-major/${id}`,
  title,
  clause,
  tell: (c) => {
    if (!bent(c, 'x')) return na(noMoment('x'));
    const web = find(c, 'F4/outside');
    return web ? outside(web.line.title, web.address) : tell(c);
  },
});

const holds = (c: Context, key: string, condition: number): boolean => {
  const found = find(c, key);
  return found?.line.kind === 'choice' && found.line.tried[condition]?.holds === true;
};

/** F2/Mn took lateral-torsional buckling, which its limit, the plastic moment, gave. */
const plastic = (c: Context): boolean =>
  takenBy(c, 'F2/Mn') === 'F2/LTB/Mn' && takenBy(c, 'F2/LTB/Mn') === 'F2/Mp';

const flexureCheck = (axis: Axis, word: string): LimitState => ({
  id: `flexure-${word.toLowerCase()}/check`,
  title: `${word}-axis flexure alone`,
  clause: ['F1'],
  tell: (c) => {
    if (!bent(c, axis)) return na(noMoment(axis));
    const found = check(c, `H1/${axis}`);
    return found ? checked(c, found) : unreached(c, [axis]);
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
  flexural('x', 'major'),
  flexural('y', 'minor'),
  {
    id: 'compression/torsional',
    title: 'Torsional buckling',
    clause: ['E4', 'E4-2'],
    tell: (c) => {
      if (!c.run.compressed) return na(COMPRESSION);
      return find(c, 'E4/Fe')
        ? strength(c, 'E4/Fe', takenBy(c, 'E3/Fe') === 'E4/Fe', LESS)
        : na('the torsional buckling length does not exceed the lateral one');
    },
  },
  {
    id: 'compression/slender',
    title: 'Local buckling in compression',
    clause: ['E7', 'E7-1'],
    tell: (c) => {
      if (!c.run.compressed) return na(COMPRESSION);
      const found = find(c, 'E7/Pn');
      if (!found) return na('no element is slender');
      return find(c, 'E7/Ae')
        ? { state: 'governs', because: 'a slender element is partly effective', ...found }
        : {
            state: 'does not govern',
            because: 'slender elements are fully effective at this stress',
            ...found,
          };
    },
  },
  {
    id: 'compression/check',
    title: 'Compression alone',
    clause: ['E1'],
    tell: (c) => {
      if (!c.run.compressed) return na(COMPRESSION);
      const found = check(c, 'H1/axial');
      return found ? checked(c, found) : unreached(c, ['x', 'y']);
    },
  },
  secondOrder('x', 'major'),
  secondOrder('y', 'minor'),
  major('yielding', 'Yielding, major axis', ['F2.1', 'F2-1'], (c) =>
    find(c, 'F2/Mn')
      ? strength(c, 'F2/Mp', takenBy(c, 'F2/Mn') === 'F2/Mp' || plastic(c), LESS)
      : unreached(c, ['x']),
  ),
  major('ltb', 'Lateral-torsional buckling', ['F2.2'], (c) => {
    const range = find(c, 'F2/LTB/range');
    if (range && holds(c, 'F2/LTB/range', 0))
      return {
        ...na(
          find(c, 'F2/Lp')
            ? 'the unbraced length does not exceed Lp'
            : 'the compression flange is held continuously',
        ),
        address: range.address,
      };
    if (!find(c, 'F2/LTB/Mn')) return unreached(c, ['x']);
    const governs = takenBy(c, 'F2/Mn') === 'F2/LTB/Mn' && !plastic(c);
    return strength(c, 'F2/LTB/Mn', governs, plastic(c) ? 'limited by the plastic moment' : LESS);
  }),
  major('flb', 'Flange local buckling, major axis', ['F3.2'], (c) => {
    if (!find(c, 'F3/FLB/Mn')) return na('the flange is compact');
    return find(c, 'F2/Mn')
      ? strength(c, 'F3/FLB/Mn', takenBy(c, 'F2/Mn') === 'F3/FLB/Mn', LESS)
      : unreached(c, ['x']);
  }),
  flexureCheck('x', 'Major'),
  {
    id: 'flexure-minor/yielding',
    title: 'Yielding, minor axis',
    clause: ['F6.1', 'F6-1'],
    tell: (c) => {
      if (!bent(c, 'y')) return na(noMoment('y'));
      if (!find(c, 'F6/Mp')) return unreached(c, ['y']);
      return strength(c, 'F6/Mp', takenBy(c, 'F6/Mn') !== 'F6/FLB/Mn', LESS);
    },
  },
  {
    id: 'flexure-minor/flb',
    title: 'Flange local buckling, minor axis',
    clause: ['F6.2'],
    tell: (c) => {
      if (!bent(c, 'y')) return na(noMoment('y'));
      return find(c, 'F6/FLB/Mn')
        ? strength(c, 'F6/FLB/Mn', takenBy(c, 'F6/Mn') === 'F6/FLB/Mn', LESS)
        : na('the flange is compact');
    },
  },
  flexureCheck('y', 'Minor'),
  {
    id: 'interaction',
    title: 'Flexure and compression',
    clause: ['H1.1'],
    tell: (c) => {
      const found = check(c, 'H1/check');
      if (found) return checked(c, found);
      const present = [c.run.compressed, bent(c, 'x'), bent(c, 'y')].filter(Boolean).length;
      if (present === 0) return na('there are no forces');
      return present === 1
        ? na('only one of axial force and moments is present')
        : unreached(c, ['x', 'y']);
    },
  },
  {
    id: 'tension',
    title: 'Tension, alone and with flexure',
    clause: ['H1.2'],
    tell: (c) =>
      c.run.tension
        ? outside('the member is in tension', `${c.record.id}:D2/outside`)
        : na('no tension in this combination'),
  },
  outsideAlways('shear', 'Shear', 'G2', 'shear forces are not given'),
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
