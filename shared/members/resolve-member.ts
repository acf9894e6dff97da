import type { Source } from '../calc/line.ts';
import type { GivenValue } from '../calc/quantity.ts';
import { partsOf, quantityReader, stateOf, TYPED } from './given-values.ts';
import type { CalculationInput, MemberInput } from './input.ts';
import { repeated } from './repeated.ts';
import { resolveCombination } from './resolve-combination.ts';
import { resolveDetails } from './resolve-details.ts';
import { resolveRestraints } from './resolve-restraints.ts';
import { resolveSection } from './resolve-section.ts';
import { resolveSteel } from './resolve-steel.ts';
import type { Problem, ResolvedCombination, ResolvedMember } from './resolved.ts';

const DEFAULT_CB: Source = { kind: 'typed', note: 'Not given: 1.0, on the safe side' };

/** One member with its quantities read; problems are added with their paths. */
export function resolveMember(
  m: MemberInput,
  index: number,
  input: CalculationInput,
  problems: Problem[],
): ResolvedMember {
  const at = `members[${index}]`;
  const problem = (path: string, message: string) =>
    problems.push({ path: `${at}.${path}`, message });
  const quantity = quantityReader(problem);
  const length = (
    path: 'length' | 'Lcx' | 'Lcy' | 'Lcz' | 'Lb',
    zero: boolean,
  ): GivenValue | null => {
    const found = quantity(path, m[path], 'length');
    if (found && (zero ? found.value < 0 : found.value <= 0))
      problem(path, `is ${found.text}; it must be ${zero ? 'zero or above' : 'above zero'}`);
    return found;
  };
  const none: GivenValue = { value: 0, text: '0', source: TYPED, confirmed: false };

  const { name: section, section: shape } = resolveSection(m.section, problem, quantity);
  const memberLength = length('length', false) ?? none;
  const restraints = resolveRestraints(m, memberLength, problem, quantity);
  const combinations = m.combinations.map((c, j) =>
    resolveCombination(c, j, {
      ...{ input, section: section.value, problem, quantity },
      ...{ length: memberLength, restraints },
    }),
  );
  repeated(
    m.combinations.map((c) => c.name),
    (j) => `${at}.combinations[${j}].name`,
    'combination',
    problems,
  );
  repeated(
    combinations.map((c) => c.id),
    (j) => `${at}.combinations[${j}].id`,
    'id',
    problems,
  );

  const lengths = {
    Lcx: length('Lcx', false),
    Lcy: length('Lcy', false),
    Lcz: length('Lcz', false),
    Lb: length('Lb', true),
  };
  wantWhatIsNeeded(m, combinations, problem);
  if (restraints) wantReasons(lengths, problem);

  const Cb =
    m.Cb === undefined
      ? { ...none, value: 1, text: '1.0', source: DEFAULT_CB, confirmed: true }
      : partsOf(m.Cb).text.trim() === 'auto'
        ? ('auto' as const)
        : quantity('Cb', m.Cb, 'none');
  if (Cb !== 'auto' && Cb && !(Cb.value > 0 && Cb.value <= 5))
    problem('Cb', `is ${Cb.text}; it must be above 0 and, by F1-1, not above 5, or "auto"`);

  return {
    id: m.id ?? `m${index + 1}`,
    mark: m.mark,
    section,
    shape,
    steel: resolveSteel(m, problem, quantity, shape),
    length: memberLength,
    ends: stateOf(m.ends),
    ...lengths,
    Cb: Cb ?? 'auto',
    restraints,
    ...resolveDetails(m, problem, quantity),
    endMomentSign: m.endMomentSign ?? 'bending',
    combinations,
  };
}

/** What the forces make necessary: lengths have no default, nor has the sense of end moments. */
function wantWhatIsNeeded(
  m: MemberInput,
  combinations: readonly ResolvedCombination[],
  problem: (path: string, message: string) => void,
): void {
  const compressed = combinations.some((c) => c.P.value > 0);
  const bent = combinations.some(
    ({ moments: { x }, loads }) =>
      x.A.value !== 0 ||
      x.B.value !== 0 ||
      (x.max?.value ?? 0) !== 0 ||
      loads.some((load) => load.axis === 'x'),
  );
  const bothEnds = combinations.some(({ moments }) =>
    [moments.x, moments.y].some((p) => p.A.value !== 0 && p.B.value !== 0),
  );
  if (compressed && m.restraints === undefined)
    for (const name of ['Lcx', 'Lcy', 'Lcz'] as const)
      if (m[name] === undefined && !(name !== 'Lcz' && m.charts?.[name === 'Lcx' ? 'x' : 'y']))
        problem(
          name,
          'is needed: a combination has compression, and buckling lengths have no default',
        );
  if (bent && m.Lb === undefined && m.restraints === undefined)
    problem(
      'Lb',
      'is needed: a combination bends the major axis, and the unbraced length has no default (0 where the compression flange is held continuously)',
    );
  if (bothEnds && m.endMomentSign === undefined)
    problem(
      'endMomentSign',
      'is needed: "bending" (equal signs: single curvature) or "joint" (equal signs: reverse curvature)',
    );
}

/** Lengths stated beside restraints stand in place of what follows from these: the reason is needed. */
function wantReasons(
  lengths: Readonly<Record<'Lcx' | 'Lcy' | 'Lcz' | 'Lb', GivenValue | null>>,
  problem: (path: string, message: string) => void,
): void {
  for (const [name, given] of Object.entries(lengths))
    if (given && given.source.kind === 'typed' && !given.source.note)
      problem(
        name,
        'stands in place of the length that follows from the restraints: its source has to say why, or leave it out',
      );
}
