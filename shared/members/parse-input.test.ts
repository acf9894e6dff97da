import { describe, expect, it } from 'vitest';
import { parseInput } from './parse-input.ts';

/* Structural: every wrong input names its place and what would be right; no engineering values. */
const combination = { name: '1.2D + 1.6L', P: '100 kip', MxA: '50 kip ft', MxB: '-20 kip ft' };
const member = {
  mark: 'C1',
  section: 'W12X79',
  material: 'A992',
  length: '14 ft',
  ends: 'held',
  Lcx: '14 ft',
  Lcy: '14 ft',
  Lcz: '14 ft',
  Lb: '14 ft',
  Cb: 1,
  endMomentSign: 'bending',
  combinations: [combination],
};
const input = {
  format: 1,
  standard: 'aisc360-22',
  design: 'LRFD',
  units: 'us',
  analysis: { method: 'direct', secondOrder: 'amplified', sway: 'none' },
  members: [member],
};
const without = <T extends object>(from: T, ...keys: (keyof T)[]): Partial<T> =>
  Object.fromEntries(
    Object.entries(from).filter(([k]) => !keys.includes(k as keyof T)),
  ) as Partial<T>;
const withMember = (more: object) => ({ ...input, members: [{ ...member, ...more }] });
const withForces = (more: object) => withMember({ combinations: [{ ...combination, ...more }] });

const problemsOf = (json: unknown) => {
  const parsed = parseInput(json);
  return parsed.ok ? [] : parsed.problems;
};

it('takes a right input', () => {
  expect(problemsOf(input)).toEqual([]);
});

describe('wrong inputs', () => {
  const cases: readonly (readonly [what: string, json: unknown, path: string, message: RegExp])[] =
    [
      [
        'negative length',
        withMember({ length: '-14 ft' }),
        'members[0].length',
        /is -14 ft; it must be above zero/,
      ],
      [
        'a length of zero',
        withMember({ length: '0 ft' }),
        'members[0].length',
        /it must be above zero/,
      ],
      [
        'a buckling length of zero',
        withMember({ Lcx: '0 ft' }),
        'members[0].Lcx',
        /it must be above zero/,
      ],
      [
        'a negative unbraced length',
        withMember({ Lb: '-1 ft' }),
        'members[0].Lb',
        /it must be zero or above/,
      ],
      [
        'unknown section',
        withMember({ section: 'W12X80' }),
        'members[0].section',
        /"W12X80" is in none of the tables of W, .*; write it like W12X79/,
      ],
      [
        'sizes without one of them',
        withMember({ section: { shape: 'i', d: '20 in', bf: '10 in', tf: '1 in' } }),
        'members[0].section.tw',
        /must be a text with its unit/,
      ],
      [
        'sizes of no shape',
        withMember({ section: { d: '20 in' } }),
        'members[0].section.shape',
        /must be "i", "mono-i", "box", "tube" or "round"/,
      ],
      [
        'a tube that does not say which wall it gives',
        withMember({ section: { shape: 'round', D: '300 mm', t: '8 mm' } }),
        'members[0].section.wall',
        /must be "nominal" .* or "design"/,
      ],
      ['a section as a number', withMember({ section: 5 }), 'members[0].section', /designation/],
      ['empty section', withMember({ section: ' ' }), 'members[0].section', /is empty/],
      [
        'unknown steel',
        withMember({ material: 'A123' }),
        'members[0].material',
        /"A123" is not a steel known here; choose A992/,
      ],
      [
        'a moment for a length',
        withMember({ length: '14 kip ft' }),
        'members[0].length',
        /is a moment; a length is wanted/,
      ],
      [
        'a length for a force',
        withForces({ P: '100 ft' }),
        'members[0].combinations[0].P',
        /is a length; a force is wanted/,
      ],
      [
        'a force for a moment',
        withForces({ MxA: '50 kip' }),
        'members[0].combinations[0].MxA',
        /is a force; a moment is wanted/,
      ],
      [
        'a number without unit',
        withForces({ P: '100' }),
        'members[0].combinations[0].P',
        /needs a unit \(N, kN/,
      ],
      [
        'a bare number',
        withForces({ P: 100 }),
        'members[0].combinations[0].P',
        /must be a text with its unit/,
      ],
      [
        'an unknown unit',
        withMember({ length: '14 fathoms' }),
        'members[0].length',
        /"fathoms" is not a unit known here/,
      ],
      [
        'a number too large',
        withForces({ P: '1e400 kip' }),
        'members[0].combinations[0].P',
        /too large to be a number/,
      ],
      [
        'a number too large in its unit',
        withForces({ P: '1e307 kip' }),
        'members[0].combinations[0].P',
        /too large to be a number/,
      ],
      [
        'a force beyond any member',
        withForces({ P: '1e300 kip' }),
        'members[0].combinations[0].P',
        /is 1e300 kip, which no member has; see the number and its unit/,
      ],
      [
        'a length beyond any member',
        withMember({ length: '1e-300 ft' }),
        'members[0].length',
        /is 1e-300 ft, which no member has/,
      ],
      ['an empty quantity', withMember({ length: '' }), 'members[0].length', /is empty/],
      [
        'words for a quantity',
        withMember({ length: 'about 14 ft' }),
        'members[0].length',
        /"about 14 ft" does not start with a number/,
      ],
      [
        'a comma',
        withMember({ length: '14,5 ft' }),
        'members[0].length',
        /has a comma in the number/,
      ],
      [
        'not a number',
        withMember({ length: 'NaN ft' }),
        'members[0].length',
        /does not start with a number/,
      ],
      [
        'a script in a mark',
        withMember({ mark: '<script>alert(1)</script>' }),
        'members[0].mark',
        /may hold letters, digits, spaces and/,
      ],
      ['an empty mark', withMember({ mark: '' }), 'members[0].mark', /is empty/],
      [
        'a long mark',
        withMember({ mark: 'C'.repeat(41) }),
        'members[0].mark',
        /is longer than 40 characters/,
      ],
      [
        'a script in a name',
        withForces({ name: '<b>' }),
        'members[0].combinations[0].name',
        /may hold letters/,
      ],
      [
        'Cb of zero',
        withMember({ Cb: 0 }),
        'members[0].Cb',
        /must be above 0 and, by F1-1, not above 5/,
      ],
      ['Cb above five', withMember({ Cb: '5.1' }), 'members[0].Cb', /not above 5/],
      [
        'a word for Cb',
        withMember({ Cb: 'automatic' }),
        'members[0].Cb',
        /does not start with a number/,
      ],
      [
        'ends of another kind',
        withMember({ ends: 'pinned' }),
        'members[0].ends',
        /must be one of held, free, sway, springs/,
      ],
      [
        'another sign',
        withMember({ endMomentSign: 'clockwise' }),
        'members[0].endMomentSign',
        /must be "bending"/,
      ],
      [
        'no sign with both end moments',
        { ...input, members: [without(member, 'endMomentSign')] },
        'members[0].endMomentSign',
        /is needed: "bending" \(equal signs: single curvature\)/,
      ],
      [
        'no Lb with major-axis moment',
        { ...input, members: [without(member, 'Lb')] },
        'members[0].Lb',
        /is needed: a combination bends the major axis/,
      ],
      [
        'no Lcx',
        { ...input, members: [without(member, 'Lcx')] },
        'members[0].Lcx',
        /is needed: a combination has compression/,
      ],
      [
        'no Lcy',
        { ...input, members: [without(member, 'Lcy')] },
        'members[0].Lcy',
        /buckling lengths have no default/,
      ],
      [
        'no Lcz',
        { ...input, members: [without(member, 'Lcz')] },
        'members[0].Lcz',
        /buckling lengths have no default/,
      ],
      [
        'no combination',
        withMember({ combinations: [] }),
        'members[0].combinations',
        /needs at least one combination/,
      ],
      ['no member', { ...input, members: [] }, 'members', /needs at least one member/],
      ['another format', { ...input, format: 2 }, 'format', /must be 1/],
      [
        'another standard',
        { ...input, standard: 'aisc360-16' },
        'standard',
        /must be "aisc360-22"/,
      ],
      ['another design', { ...input, design: 'lrfd' }, 'design', /must be "LRFD" or "ASD"/],
      ['other units', { ...input, units: 'metric' }, 'units', /must be "us" or "si"/],
      [
        'another method',
        { ...input, analysis: { ...input.analysis, method: 'none' } },
        'analysis.method',
        /must be "direct"/,
      ],
      [
        'sway',
        { ...input, analysis: { ...input.analysis, sway: 'free' } },
        'analysis.sway',
        /must be "none", or "B2"/,
      ],
      [
        'an analysis that does not say P-δ',
        { ...input, analysis: { ...input.analysis, secondOrder: 'from-analysis' } },
        'analysis.includesMemberEffect',
        /is needed with moments from an analysis/,
      ],
      [
        'forces of the other level, said',
        {
          ...input,
          design: 'ASD',
          members: [
            { ...member, combinations: [{ ...combination, name: 'D + L', design: 'LRFD' }] },
          ],
        },
        'members[0].combinations[0].design',
        /is LRFD in a calculation by ASD/,
      ],
      [
        'forces of the other level, by name',
        { ...input, design: 'ASD' },
        'members[0].combinations[0].name',
        /is an LRFD combination in a calculation by ASD/,
      ],
      [
        'a mark twice',
        { ...input, members: [member, member] },
        'members[1].mark',
        /the mark "C1" is used twice/,
      ],
      [
        'an id twice',
        {
          ...input,
          members: [
            { ...member, id: 'm-1' },
            { ...member, mark: 'C2', id: 'm-1' },
          ],
        },
        'members[1].id',
        /the id "m-1" is used twice/,
      ],
      [
        'a combination twice',
        withMember({ combinations: [combination, combination] }),
        'members[0].combinations[1].name',
        /the combination "1\.2D \+ 1\.6L" is used twice/,
      ],
      [
        'own steel without source',
        withMember({ material: { name: 'S', Fy: '50 ksi' } }),
        'members[0].material.source',
        /is needed: a steel of your own states/,
      ],
      [
        'own steel of zero',
        withMember({ material: { name: 'S', Fy: '0 ksi', source: { kind: 'typed' } } }),
        'members[0].material.Fy',
        /it must be above zero/,
      ],
      [
        'own steel in a wrong unit',
        withMember({ material: { name: 'S', Fy: '50 kip', source: { kind: 'typed' } } }),
        'members[0].material.Fy',
        /is a force; a stress is wanted/,
      ],
    ];
  for (const [what, json, path, message] of cases)
    it(what, () => {
      const problems = problemsOf(json);
      expect(problems.map((p) => p.path)).toContain(path);
      expect(problems.find((p) => p.path === path)?.message).toMatch(message);
      // Nothing else is complained of.
      expect(problems.filter((p) => p.path !== path)).toEqual([]);
    });
  for (const [what, json] of [
    ['nothing', undefined],
    ['null', null],
    ['a text', 'W12X79'],
    ['a list', []],
    ['a number', 1],
  ] as const)
    it(`refuses ${what} for an input`, () => expect(problemsOf(json).length).toBeGreaterThan(0));
  it('refuses a key that it does not know, naming it', () => {
    expect(problemsOf(withMember({ Lbb: '14 ft' }))[0]).toMatchObject({
      path: 'members[0]',
      message: expect.stringMatching(/Lbb/) as string,
    });
  });
  it('tells all problems at once', () => {
    const paths = problemsOf(
      withMember({
        length: '-1 ft',
        section: 'W1X1',
        Lcx: '3 kip',
        combinations: [{ ...combination, P: '' }],
      }),
    ).map((p) => p.path);
    expect(paths).toEqual(
      expect.arrayContaining([
        'members[0].length',
        'members[0].section',
        'members[0].Lcx',
        'members[0].combinations[0].P',
      ]),
    );
  });
});

describe('what may be left out', () => {
  it('buckling lengths, with bending alone', () => {
    const bending = {
      ...without(member, 'Lcx', 'Lcy', 'Lcz'),
      combinations: [{ name: 'D', P: '0 kip', MxA: '10 kip ft' }],
    };
    expect(problemsOf({ ...input, members: [bending] })).toEqual([]);
  });
  it('moments, Lb, the sign and Cb, with compression alone', () => {
    const column = {
      ...without(member, 'Lb', 'endMomentSign', 'Cb'),
      combinations: [{ name: 'D', P: '10 kip' }],
    };
    expect(problemsOf({ ...input, members: [column] })).toEqual([]);
  });
  it('an unbraced length of zero means held continuously', () => {
    expect(problemsOf(withMember({ Lb: '0 ft' }))).toEqual([]);
  });
  it('an ASD name in a calculation by ASD', () => {
    expect(
      problemsOf({
        ...input,
        design: 'ASD',
        members: [{ ...member, combinations: [{ ...combination, name: 'D + 0.75L + 0.75S' }] }],
      }),
    ).toEqual([]);
  });
});

describe('an input that is not complete yet', () => {
  const unfinished = {
    ...input,
    members: [
      {
        ...without(member, 'length'),
        Lcx: '-14 ft',
        combinations: [{ name: 'D', P: '100 kg' }, { MxA: '5 ft' }],
      },
    ],
  };
  it('says what is missing, and what is wrong beside it', () => {
    expect(problemsOf(unfinished).map(({ path }) => path)).toEqual([
      'members[0].length',
      'members[0].combinations[1].name',
      'members[0].combinations[1].P',
      'members[0].combinations[0].P',
      'members[0].combinations[1].MxA',
      'members[0].Lcx',
    ]);
  });
  it('says of another wrong shape that alone', () => {
    expect(problemsOf({ ...unfinished, units: 'metric' }).map(({ path }) => path)).toEqual([
      'units',
      'members[0].length',
      'members[0].combinations[1].name',
      'members[0].combinations[1].P',
    ]);
  });
});

describe('sources and states', () => {
  it('stay with the value', () => {
    const parsed = parseInput(
      withMember({
        length: {
          value: '14 ft',
          source: { kind: 'drawing', number: 'S-201', revision: 'B' },
          confirmed: true,
        },
      }),
    );
    expect(parsed.ok && parsed.input.members[0]?.length).toEqual({
      value: 14 * 304.8,
      text: '14 ft',
      source: { kind: 'drawing', number: 'S-201', revision: 'B' },
      confirmed: true,
    });
  });
  it('are typed and not confirmed where nothing is said', () => {
    const parsed = parseInput(input);
    expect(parsed.ok && parsed.input.members[0]?.length).toMatchObject({
      source: { kind: 'typed' },
      confirmed: false,
    });
  });
});
