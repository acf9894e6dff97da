import type { Source } from '../calc/line.ts';
import type { GivenValue } from '../calc/recorder.ts';
import { findShape, normalDesignation, type WShape } from '../sections/table.ts';
import type { DimensionName } from '../units/dimension.ts';
import { parseQuantity } from '../units/parse.ts';
import { forceProblems } from './force-level.ts';
import { type CalculationInput, type Ends, inputSchema, type MemberInput } from './input.ts';
import { findSteel, type Steel } from './material.ts';

/** What is wrong with an input, where, and what would be right. */
export interface Problem {
  /** `members[0].combinations[1].P`. */
  readonly path: string;
  readonly message: string;
}

export interface Stated<T> {
  readonly value: T;
  readonly source: Source;
  readonly confirmed: boolean;
}

export interface ResolvedCombination {
  readonly id: string;
  readonly name: string;
  /** Section of the analysis where it is another than the member's: the forces are unconfirmed. */
  readonly analysedWith: string | null;
  readonly P: GivenValue;
  readonly moments: Readonly<
    Record<'x' | 'y', { A: GivenValue; B: GivenValue; max: GivenValue | null }>
  >;
}

export interface ResolvedMember {
  readonly id: string;
  readonly mark: string;
  readonly section: Stated<string>;
  /** null: a shape of another family, outside the scope of the book. */
  readonly shape: WShape | null;
  readonly steel:
    | { readonly kind: 'grade'; readonly steel: Steel }
    | { readonly kind: 'own'; readonly name: string; readonly Fy: GivenValue };
  readonly length: GivenValue;
  readonly ends: Stated<Ends>;
  readonly Lcx: GivenValue | null;
  readonly Lcy: GivenValue | null;
  readonly Lcz: GivenValue | null;
  readonly Lb: GivenValue | null;
  readonly Cb: GivenValue | 'auto';
  readonly endMomentSign: 'bending' | 'joint';
  readonly combinations: readonly ResolvedCombination[];
}

export interface ResolvedInput {
  readonly source: CalculationInput;
  readonly design: 'LRFD' | 'ASD';
  readonly units: 'us' | 'si';
  readonly constants: 'us' | 'si';
  readonly analysis: {
    readonly method: 'direct' | 'effective-length' | 'first-order';
    readonly secondOrder: 'from-analysis' | 'amplified' | 'exact';
    readonly includesMemberEffect: boolean;
    readonly sway: 'none';
  };
  readonly members: readonly ResolvedMember[];
}

export type ParsedInput =
  | { readonly ok: true; readonly input: ResolvedInput }
  | { readonly ok: false; readonly problems: readonly Problem[] };

const TYPED: Source = { kind: 'typed' };
const DEFAULT_CB: Source = { kind: 'typed', note: 'Not given: 1.0, on the safe side' };
// In N and mm: beyond these nothing is built, and products leave the range of numbers.
const SMALLEST = 1e-9;
const LARGEST = 1e15;
const OTHER_FAMILY = /^(HSS|PIPE|2L|WT|MT|ST|MC|HP|C|M|S|L)\d/;

const pathText = (path: readonly PropertyKey[]): string =>
  path.reduce<string>(
    (at, p) =>
      typeof p === 'number' ? `${at}[${p}]` : at === '' ? String(p) : `${at}.${String(p)}`,
    '',
  );

/** Reads INPUT.json: its shape, its quantities, and what the members need; all problems at once. */
export function parseInput(json: unknown): ParsedInput {
  const shape = inputSchema.safeParse(json);
  if (!shape.success)
    return {
      ok: false,
      problems: shape.error.issues.map((i) => ({ path: pathText(i.path), message: i.message })),
    };
  const problems: Problem[] = [];
  const input = shape.data;
  const { analysis } = input;
  if (analysis.secondOrder === 'from-analysis' && analysis.includesMemberEffect === undefined)
    problems.push({
      path: 'analysis.includesMemberEffect',
      message:
        'is needed with moments from an analysis: whether the effect of the axial force between the ends (P-δ) is in them',
    });
  const members = input.members.map((m, i) => resolveMember(m, i, input, problems));
  repeated(
    input.members.map((m) => m.mark),
    (i) => `members[${i}].mark`,
    'mark',
    problems,
  );
  if (problems.length > 0) return { ok: false, problems };
  return {
    ok: true,
    input: {
      source: input,
      design: input.design,
      units: input.units,
      constants: input.constants ?? input.units,
      analysis: {
        ...analysis,
        // Says something of moments from an analysis only; elsewhere it must not move the hash.
        includesMemberEffect:
          analysis.secondOrder === 'from-analysis' && analysis.includesMemberEffect === true,
      },
      members,
    },
  };
}

function repeated(
  names: readonly string[],
  path: (i: number) => string,
  what: string,
  problems: Problem[],
): void {
  names.forEach((name, i) => {
    if (names.indexOf(name) !== i)
      problems.push({ path: path(i), message: `the ${what} "${name}" is used twice` });
  });
}

type Given =
  | string
  | number
  | { value: string | number; source?: Source | undefined; confirmed?: boolean | undefined };

const parts = (given: Given): { text: string; source: Source; confirmed: boolean } =>
  typeof given === 'object'
    ? {
        text: String(given.value),
        source: given.source ?? TYPED,
        confirmed: given.confirmed ?? false,
      }
    : { text: String(given), source: TYPED, confirmed: false };

/** A word that may carry its source and state. */
function stateOf<T extends string>(
  given: T | { value: T; source?: Source | undefined; confirmed?: boolean | undefined },
): Stated<T> {
  return typeof given === 'string'
    ? { value: given, source: TYPED, confirmed: false }
    : { value: given.value, source: given.source ?? TYPED, confirmed: given.confirmed ?? false };
}

function resolveMember(
  m: MemberInput,
  index: number,
  input: CalculationInput,
  problems: Problem[],
): ResolvedMember {
  const at = `members[${index}]`;
  const problem = (path: string, message: string) =>
    problems.push({ path: `${at}.${path}`, message });
  const quantity = (
    path: string,
    given: Given | undefined,
    dimension: DimensionName,
  ): GivenValue | null => {
    if (given === undefined) return null;
    const { text, source, confirmed } = parts(given);
    const parsed = parseQuantity(text, dimension);
    if (!parsed.ok) {
      problem(path, parsed.reason);
      return null;
    }
    const size = Math.abs(parsed.quantity.value);
    if (size !== 0 && (size < SMALLEST || size > LARGEST)) {
      problem(path, `is ${text}, which no member has; see the number and its unit`);
      return null;
    }
    return { value: parsed.quantity.value, text: parsed.quantity.text, source, confirmed };
  };
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

  const section = stateOf(m.section);
  const shape = findShape(section.value);
  if (!shape && !OTHER_FAMILY.test(normalDesignation(section.value)))
    problem(
      'section',
      `"${section.value}" is not in the table of W shapes (AISC Shapes Database v15.0); write it like W12X79`,
    );

  const combinations = m.combinations.map((c, j): ResolvedCombination => {
    const path = `combinations[${j}]`;
    for (const message of forceProblems(c, input.design))
      problem(`${path}.${message.field}`, message.message);
    const elsewhere =
      c.analysedWith !== undefined &&
      normalDesignation(c.analysedWith) !== normalDesignation(section.value);
    // Forces belong to the section they were analysed with.
    const asAnalysed = <T extends GivenValue | null>(given: T): T =>
      given && elsewhere ? { ...given, confirmed: false } : given;
    const force = (field: 'MxA' | 'MxB' | 'MyA' | 'MyB' | 'MxMax' | 'MyMax') =>
      asAnalysed(quantity(`${path}.${field}`, c[field], 'moment'));
    const P = asAnalysed(quantity(`${path}.P`, c.P, 'force') ?? none);
    // A moment left out is zero, with the source and state of the force set.
    const zero = { ...P, value: 0, text: input.units === 'us' ? '0 kip ft' : '0 kN m' };
    return {
      id: c.id ?? `c${j + 1}`,
      name: c.name,
      analysedWith: elsewhere && c.analysedWith ? normalDesignation(c.analysedWith) : null,
      P,
      moments: {
        x: { A: force('MxA') ?? zero, B: force('MxB') ?? zero, max: force('MxMax') },
        y: { A: force('MyA') ?? zero, B: force('MyB') ?? zero, max: force('MyMax') },
      },
    };
  });
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
  const compressed = combinations.some((c) => c.P.value > 0);
  const bent = combinations.some(
    ({ moments: { x } }) => x.A.value !== 0 || x.B.value !== 0 || (x.max?.value ?? 0) !== 0,
  );
  const bothEnds = combinations.some(({ moments }) =>
    [moments.x, moments.y].some((p) => p.A.value !== 0 && p.B.value !== 0),
  );
  if (compressed)
    for (const name of ['Lcx', 'Lcy', 'Lcz'] as const)
      if (m[name] === undefined)
        problem(
          name,
          'is needed: a combination has compression, and buckling lengths have no default',
        );
  if (bent && m.Lb === undefined)
    problem(
      'Lb',
      'is needed: a combination bends the major axis, and the unbraced length has no default (0 where the compression flange is held continuously)',
    );
  if (bothEnds && m.endMomentSign === undefined)
    problem(
      'endMomentSign',
      'is needed: "bending" (equal signs: single curvature) or "joint" (equal signs: reverse curvature)',
    );

  const Cb =
    m.Cb === undefined
      ? { ...none, value: 1, text: '1.0', source: DEFAULT_CB, confirmed: true }
      : parts(m.Cb).text.trim() === 'auto'
        ? ('auto' as const)
        : quantity('Cb', m.Cb, 'none');
  if (Cb !== 'auto' && Cb && !(Cb.value > 0 && Cb.value <= 5))
    problem('Cb', `is ${Cb.text}; it must be above 0 and, by F1-1, not above 5, or "auto"`);

  return {
    id: m.id ?? `m${index + 1}`,
    mark: m.mark,
    section: { ...section, value: shape?.designation ?? section.value },
    shape,
    steel: resolveSteel(m, problem, quantity),
    length: length('length', false) ?? none,
    ends: stateOf(m.ends),
    ...lengths,
    Cb: Cb ?? 'auto',
    endMomentSign: m.endMomentSign ?? 'bending',
    combinations,
  };
}

function resolveSteel(
  m: MemberInput,
  problem: (path: string, message: string) => void,
  quantity: (path: string, given: Given | undefined, dimension: DimensionName) => GivenValue | null,
): ResolvedMember['steel'] {
  const fallback: GivenValue = { value: 1, text: '1 MPa', source: TYPED, confirmed: false };
  if (typeof m.material === 'string') {
    const steel = findSteel(m.material);
    if (steel) return { kind: 'grade', steel };
    problem(
      'material',
      `"${m.material}" is not a steel known here; choose A992, A572 Gr. 50, A36, A913 Gr. 65, A913 Gr. 70, or give your own with name, Fy and source`,
    );
    return { kind: 'own', name: m.material, Fy: fallback };
  }
  if (m.material.source === undefined)
    problem(
      'material.source',
      'is needed: a steel of your own states where its yield stress is from',
    );
  const Fy = quantity('material.Fy', m.material.Fy, 'stress');
  if (Fy && Fy.value <= 0) problem('material.Fy', `is ${Fy.text}; it must be above zero`);
  const own = {
    ...(Fy ?? fallback),
    source: m.material.source ?? TYPED,
    confirmed: m.material.confirmed ?? false,
  };
  return { kind: 'own', name: m.material.name, Fy: own };
}
