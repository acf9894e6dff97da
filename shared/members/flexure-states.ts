import { type Axis, WORD } from './bay-moments.ts';
import {
  bent,
  type Context,
  check,
  checked,
  type Found,
  find,
  type LimitState,
  na,
  noMoment,
  outside,
  strength,
  type Told,
  unreached,
} from './limit-state.ts';

const GOVERNING: Readonly<Record<Axis, readonly string[]>> = {
  x: ['F2/Mn', 'F4/Mn', 'F5/Mn', 'F7/x/Mn', 'F8/x/Mn'],
  y: ['F6/Mn', 'F6/Mp', 'F7/y/Mn', 'F8/y/Mn'],
};

/** The line that takes the least of the strengths about an axis, on the side that gives less. */
function governingLine(c: Context, axis: Axis): Found | null {
  const sides = find(c, 'F1/x/Mc')?.line;
  const side =
    axis === 'x' && sides?.kind === 'governing'
      ? (/(top|bottom)\/F1\/x\/Mc$/.exec(sides.governs)?.[1] ?? null)
      : null;
  const parts = axis === 'x' ? [...(side ? [`${side}/`] : []), '', 'top/', 'bottom/'] : [''];
  for (const part of parts)
    for (const key of GOVERNING[axis]) {
      const found = find(c, `${part}${key}`);
      if (found) return found;
    }
  return null;
}

/** Candidates of a governing line whose keys fit, without the scope of references. */
const candidates = (found: Found, fits: RegExp): readonly string[] =>
  found.line.kind === 'governing'
    ? found.line.candidates.map((ref) => ref.replace(/^:/, '')).filter((key) => fits.test(key))
    : [];

/** What gave the strength: buckling that its limit, the yielding strength, cut counts as yielding. */
function giver(c: Context, found: Found): string {
  if (found.line.kind !== 'governing') return found.line.key;
  const key = found.line.governs.replace(/^:/, '');
  const own = c.record.lines.find((l) => l.key === key) ?? c.memberLines.find((l) => l.key === key);
  if (/LTB\/Mn$/.test(key) && own?.kind === 'governing') {
    const limit = own.governs.replace(/^:/, '');
    if (!/LTB/.test(limit)) return limit;
  }
  return key;
}

const YIELDING = /(Mp|CFY\/Mn|FyZy)$/;
const STATES = {
  ltb: /LTB\/Mn$/,
  flb: /(FLB|LB)\/Mn$/,
  wlb: /WLB\/Mn$/,
  tfy: /TFY\/Mn$/,
} as const;

function tell(c: Context, axis: Axis, fits: RegExp, absent: (c: Context) => Told): Told {
  if (!bent(c, axis)) return na(noMoment(axis));
  const found = governingLine(c, axis);
  if (!found) return unreached(c, [axis]);
  const governs = giver(c, found);
  const own = candidates(found, fits);
  if (fits.test(governs)) return strength(find(c, governs)?.address ?? found.address, true);
  const [first] = own;
  if (first) return strength(addressOf(c, first), false);
  return absent(c);
}

const addressOf = (c: Context, key: string): string | null =>
  c.record.lines.some((l) => l.key === key) ? `${c.record.id}:${key}` : key;

const yielding = (axis: Axis): LimitState => ({
  id: `flexure-${WORD[axis]}/yielding`,
  title: `Yielding, ${WORD[axis]} axis`,
  clause: axis === 'x' ? ['F'] : ['F6.1', 'F6-1'],
  bySegment: true,
  tell: (c) =>
    tell(c, axis, YIELDING, (at) => {
      const found = governingLine(at, axis);
      return strength(found?.address ?? null, false);
    }),
});

const RANGES = ['F2', 'F4', 'F5', 'F7/x'].map((chapter) => `${chapter}/LTB/range`);

/** Why lateral-torsional buckling gives no strength; null where its range says that it does. */
function withoutBuckling(c: Context): Told | null {
  for (const key of RANGES) {
    const range = find(c, key) ?? find(c, `top/${key}`) ?? find(c, `bottom/${key}`);
    if (range?.line.kind !== 'choice') continue;
    const { tried } = range.line;
    const [first] = tried;
    if (!first?.holds || tried.length > 1) return null;
    const continuous = first.relation === '=' && 'constant' in first.right;
    const because = continuous
      ? 'the compression flange is held continuously'
      : 'the unbraced length does not exceed Lp';
    return { ...na(because), address: range.address };
  }
  return null;
}

function lateralTorsional(c: Context): Told {
  const height = find(c, 'F1/height');
  if (bent(c, 'x') && height) return outside(height.line.title, height.address);
  const told = tell(
    c,
    'x',
    STATES.ltb,
    (at) => withoutBuckling(at) ?? na('the section does not buckle laterally about this axis'),
  );
  const found = governingLine(c, 'x');
  const cut =
    found !== null &&
    told.state === 'does not govern' &&
    found.line.kind === 'governing' &&
    /LTB\/Mn$/.test(found.line.governs);
  return cut ? { ...told, because: 'limited by the plastic moment' } : told;
}

const localState = (
  axis: Axis,
  id: 'flb' | 'wlb' | 'tfy',
  title: string,
  clause: LimitState['clause'],
  because: string,
): LimitState => ({
  id: `flexure-${WORD[axis]}/${id}`,
  title: `${title}, ${WORD[axis]} axis`,
  clause,
  bySegment: true,
  tell: (c) => {
    const compact = find(c, `B4/${axis}/${id === 'wlb' ? 'web' : 'flange'}/class`)?.line;
    if (bent(c, axis) && compact?.kind === 'choice' && / is compact$/.test(compact.outcome))
      return na(id === 'tfy' ? because : compact.outcome);
    return tell(c, axis, STATES[id], () => na(because));
  },
});

const flexureCheck = (axis: Axis): LimitState => ({
  id: `flexure-${WORD[axis]}/check`,
  title: `${axis === 'x' ? 'Major' : 'Minor'}-axis flexure alone`,
  clause: ['F1'],
  bySegment: true,
  tell: (c) => {
    if (!bent(c, axis)) return na(noMoment(axis));
    const found = check(c, `H1/${axis}`);
    return found ? checked(c, found) : withoutCheck(c, axis);
  },
});

/** No moment in this segment, or a step that is missing. */
function withoutCheck(c: Context, axis: Axis): Told {
  const done = c.run.planes[axis]?.state === 'done';
  const lacking = find(c, `H1/${axis}/lacking`) ?? find(c, 'H1/axial/lacking');
  return done && !lacking && c.segment !== null
    ? na('no moment within the segment')
    : unreached(c, [axis]);
}

export const FLEXURE_STATES: readonly LimitState[] = [
  yielding('x'),
  {
    id: 'flexure-major/ltb',
    title: 'Lateral-torsional buckling',
    clause: ['F2.2'],
    bySegment: true,
    tell: lateralTorsional,
  },
  localState('x', 'flb', 'Flange local buckling', ['F3.2'], 'the flange is compact'),
  localState('x', 'wlb', 'Web local buckling', ['F7.3'], 'the web is compact, or enters yielding'),
  localState('x', 'tfy', 'Tension flange yielding', ['F4.4'], 'the compressed side yields first'),
  flexureCheck('x'),
  yielding('y'),
  localState('y', 'flb', 'Flange local buckling', ['F6.2'], 'the flange is compact'),
  localState('y', 'wlb', 'Web local buckling', ['F7.3'], 'there is no web that buckles'),
  flexureCheck('y'),
];
