import { describe, expect, it } from 'vitest';
import { placedLines } from '#shared/calc/address.ts';
import type { CalculationRecord } from '#shared/calc/record.ts';
import { everyKind, lineAt, memberOf, resealed } from '#tests/cli/every-kind.ts';
import { NotARecord, readRecord, verifyRecord } from './verify-record.ts';

const record = everyKind();
const found = (changed: CalculationRecord) => verifyRecord(changed).problems;

type Copy = Parameters<Parameters<typeof resealed>[1]>[0];
/** What is changed, where a problem must be named, how it must be found, and its words. */
type Case = readonly [
  name: string,
  change: (copy: Copy) => void,
  at: { mark: string | null; address: string | null; by?: 'evaluation' | 'closure' | 'rerun' },
  reason: RegExp,
];

const B1 = 'B1';
const at = (address: string, by?: Case[2]['by'], mark: string = B1): Case[2] => ({
  mark,
  address,
  ...(by ? { by } : {}),
});

const lineCases: readonly Case[] = [
  [
    'a given value',
    (c) => {
      lineAt(c, B1, 'given/L', 'given').value *= 1.01;
    },
    at('given/L'),
    /"22 ft" is/,
  ],
  [
    'a given value with its text',
    (c) => void Object.assign(lineAt(c, B1, 'given/Lcz', 'given'), { value: 6096, typed: '20 ft' }),
    at('given/Lcz'),
    /the input says "24 ft"/,
  ],
  [
    'a state of confirmation',
    (c) => {
      lineAt(c, B1, 'given/L', 'given').confirmed = true;
    },
    at('given/L'),
    /says confirmed/,
  ],
  [
    'a source',
    (c) => {
      lineAt(c, B1, 'g1:given/P', 'given').source = { kind: 'typed' };
    },
    at('g1:given/P'),
    /another source/,
  ],
  [
    'a statement of the section',
    (c) => {
      lineAt(c, B1, 'given/section', 'statement').statement = 'W12X58';
    },
    at('given/section'),
    /the member is W12X53/,
  ],
  [
    'another statement',
    (c) => {
      lineAt(c, B1, 'given/sway', 'statement').statement = 'small';
    },
    at('given/sway', 'rerun'),
    /run again/,
  ],
  [
    'a look-up value',
    (c) => {
      lineAt(c, B1, 'section/Ix', 'lookup').value *= 1.1;
    },
    at('section/Ix'),
    /"425 in⁴" is/,
  ],
  [
    'a look-up with its text',
    (c) =>
      void Object.assign(lineAt(c, B1, 'section/ry', 'lookup'), {
        value: 65.532,
        published: '2.58 in',
      }),
    at('section/ry'),
    /the table has "2.48 in"/,
  ],
  [
    'a row of the table',
    (c) => {
      lineAt(c, B1, 'section/Ix', 'lookup').row = 'W12X58';
    },
    at('section/Ix'),
    /reads row W12X58/,
  ],
  [
    'a column of the table',
    (c) => {
      lineAt(c, B1, 'section/Ix', 'lookup').column = 'Iy_in4';
    },
    at('section/Ix'),
    /reads column Iy_in4/,
  ],
  [
    'a resistance factor',
    (c) =>
      void Object.assign(lineAt(c, B1, 'E1/phic', 'lookup'), { value: 0.95, published: '0.95' }),
    at('E1/phic'),
    /the table has "0.90"/,
  ],
  [
    'a yield stress',
    (c) =>
      void Object.assign(lineAt(c, B1, 'steel/Fy', 'lookup'), {
        value: lineAt(c, B1, 'steel/Fy', 'lookup').value * 1.1,
        published: '55 ksi',
      }),
    at('steel/Fy'),
    /the table has "50 ksi"/,
  ],
  [
    'the modulus of elasticity',
    (c) => {
      lineAt(c, B1, 'steel/E', 'lookup').published = '29500 ksi';
    },
    at('steel/E'),
    /the table has "29000 ksi"/,
  ],
  [
    'a constant of Table E7.1',
    (c) =>
      void Object.assign(lineAt(c, 'B2', 'E7/web/c1', 'lookup'), {
        value: 0.22,
        published: '0.22',
      }),
    at('E7/web/c1', undefined, 'B2'),
    /the table has "0.18"/,
  ],
  [
    'a formula value by the ninth digit',
    (c) => {
      lineAt(c, B1, 'E3/Pn', 'formula').value *= 1 + 3e-9;
    },
    at('E3/Pn'),
    /its operands give/,
  ],
  [
    'an expression',
    (c) => {
      lineAt(c, B1, 'E3/Fn', 'formula').expression = '0.658^(Fy/Fe)*Fy*1';
    },
    at('E3/Fn'),
    /E3-2 is/,
  ],
  [
    'an operand',
    (c) => {
      const { operands } = lineAt(c, B1, 'E3/x/Fe', 'formula');
      operands.Lc = { ref: 'given/Lcz', symbol: 'Lcz' };
    },
    at('E3/x/Fe'),
    /its operands give/,
  ],
  [
    'the symbol of an operand',
    (c) => {
      const { operands } = lineAt(c, B1, 'E3/x/Fe', 'formula');
      operands.Lc = { ref: 'given/Lcx', symbol: 'Lcy' };
    },
    at('E3/x/Fe'),
    /prints its operand Lc as Lcy/,
  ],
  [
    'a lacking operand',
    (c) => void delete lineAt(c, B1, 'E3/Pn', 'formula').operands.Ag,
    at('E3/Pn'),
    /lacks the operand Ag/,
  ],
  [
    'a reference to a later line',
    (c) => {
      const { operands } = lineAt(c, B1, 'E3/Pn', 'formula');
      operands.Fn = { ref: 'F2/Mp', symbol: 'Mpx' };
    },
    at('E3/Pn'),
    /no value before this line/,
  ],
  [
    'a clause number',
    (c) => {
      lineAt(c, B1, 'E3/Fn', 'formula').clause!.clause = 'E4';
    },
    at('E3/Fn'),
    /stands in E3, E3-2/,
  ],
  [
    'an equation number',
    (c) => {
      lineAt(c, B1, 'E3/Fn', 'formula').clause!.equation = 'E3-3';
    },
    at('E3/Fn'),
    /stands in E3, E3-2/,
  ],
  [
    'the clause of a choice',
    (c) => {
      lineAt(c, B1, 'E3/branch', 'choice').clause!.clause = 'E5';
    },
    at('E3/branch', 'rerun'),
    /clause.clause/,
  ],
  [
    'a dimension',
    (c) => {
      lineAt(c, B1, 'E3/Pn', 'formula').dimension = 'moment';
    },
    at('E3/Pn'),
    /gives force/,
  ],
  [
    'printed digits',
    (c) => {
      lineAt(c, B1, 'E3/Pn', 'formula').print = { working: { sig: 9 }, display: null };
    },
    at('E3/Pn', 'closure'),
    /its printed operands give/,
  ],
  [
    'the truth of a condition',
    (c) => {
      lineAt(c, B1, 'E3/branch', 'choice').tried[0]!.holds = false;
    },
    at('E3/branch'),
    /is false/,
  ],
  [
    'the branch taken',
    (c) => {
      lineAt(c, B1, 'E3/branch', 'choice').outcome = 'buckling is elastic';
    },
    at('E3/branch'),
    /its conditions give/,
  ],
  [
    'a limit of a condition',
    (c) => {
      lineAt(c, B1, 'E3/branch', 'choice').tried[0]!.right = { constant: 2.3 };
    },
    at('E3/branch', 'rerun'),
    /run again/,
  ],
  [
    'what governs',
    (c) => {
      lineAt(c, B1, 'E3/Fe', 'governing').governs = 'E3/x/Fe';
    },
    at('E3/Fe'),
    /E3\/y\/Fe is the least/,
  ],
  [
    'the governing value',
    (c) => {
      lineAt(c, B1, 'E3/Fe', 'governing').value *= 1.001;
    },
    at('E3/Fe'),
    /its candidates give/,
  ],
  [
    'the sense of a governing line',
    (c) => {
      lineAt(c, B1, 'E3/Fe', 'governing').sense = 'max';
    },
    at('E3/Fe'),
    /is the greatest/,
  ],
  [
    'a candidate left out',
    (c) => void lineAt(c, B1, 'E3/Fe', 'governing').candidates.splice(0, 1),
    at('E3/Fe', 'rerun'),
    /candidates/,
  ],
  [
    'a ratio',
    (c) => {
      lineAt(c, B1, 'g1:H1/check', 'check').ratio *= 0.9;
    },
    at('g1:H1/check'),
    /its lines give/,
  ],
  [
    'a verdict',
    (c) => {
      lineAt(c, B1, 'g1:H1/check', 'check').verdict = 'NOT OK';
    },
    at('g1:H1/check'),
    /says NOT OK/,
  ],
  [
    'a capacity',
    (c) => {
      lineAt(c, B1, 'g1:H1/axial', 'check').capacity = 'E3/Pn';
    },
    at('g1:H1/axial'),
    /its lines give/,
  ],
  [
    'a difference',
    (c) => {
      lineAt(c, B1, 'g1:theory/x/comparison', 'comparison').difference += 0.01;
    },
    at('g1:theory/x/comparison'),
    /its lines give/,
  ],
  [
    'the words of a comparison',
    (c) => {
      lineAt(c, B1, 'g1:theory/x/comparison', 'comparison').words = 'They agree.';
    },
    at('g1:theory/x/comparison', 'rerun'),
    /words/,
  ],
  [
    'the severity of a notice',
    (c) => {
      lineAt(c, 'B3', 'c1:App8/x/unstable', 'notice').severity = 'caution';
    },
    at('c1:App8/x/unstable', 'rerun', 'B3'),
    /severity/,
  ],
  [
    'the words of a notice',
    (c) => {
      lineAt(c, B1, 'g1:F1/lower', 'notice').text = 'All is well.';
    },
    at('g1:F1/lower', 'rerun'),
    /text/,
  ],
  [
    'the head of a section',
    (c) => {
      lineAt(c, B1, 'E3', 'section').title = 'Tension';
    },
    at('E3', 'rerun'),
    /title/,
  ],
  [
    'a line left out',
    (c) => {
      const { lines } = memberOf(c, B1).combinations[0]!;
      lines.splice(
        lines.findIndex((l) => l.key === 'F1/lower'),
        1,
      );
    },
    at('g1:F1/lower', 'rerun'),
    /is missing/,
  ],
  [
    'a line twice',
    (c) => void memberOf(c, B1).lines.push(lineAt(c, B1, 'F1/phib', 'lookup')),
    at('F1/phib'),
    /address of another line/,
  ],
];

const wholeCases: readonly Case[] = [
  [
    'the verdict of a combination',
    (c) => {
      memberOf(c, 'B3').combinations[0]!.summary.verdict = 'OK';
    },
    { mark: 'B3', address: null },
    /combination 1.2D \+ 1.6L says OK, its lines give FAILED/,
  ],
  [
    'the verdict of a member',
    (c) => {
      memberOf(c, 'B3').summary.verdict = 'OK';
    },
    { mark: 'B3', address: null },
    /the member says OK, its lines give FAILED/,
  ],
  [
    'the verdict of the calculation',
    (c) => {
      c.summary.verdict = 'OK';
    },
    { mark: null, address: null },
    /the calculation says OK, its lines give FAILED/,
  ],
  [
    'a caution in place of a failure, in the verdict',
    (c) => {
      lineAt(c, 'B3', 'c1:App8/x/unstable', 'notice').severity = 'caution';
    },
    { mark: 'B3', address: null },
    /says FAILED, its lines give NOT OK/,
  ],
  [
    'the printed ratio of a member',
    (c) => {
      memberOf(c, 'B2').summary.ratioText = '0.400';
    },
    { mark: 'B2', address: null },
    /prints the ratio 0.400/,
  ],
  [
    'the ratio of a combination',
    (c) => {
      memberOf(c, 'B2').combinations[0]!.summary.ratio = 0.4;
    },
    { mark: 'B2', address: null },
    /says the ratio 0.4/,
  ],
  [
    'a ratio for what is not checked',
    (c) => {
      memberOf(c, '柱 1').summary.ratio = 0;
    },
    { mark: '柱 1', address: null },
    /says the ratio 0, its lines give null/,
  ],
  [
    'what governs a combination',
    (c) => {
      memberOf(c, 'B2').combinations[0]!.summary.governing!.address = 'c1:H1/x';
    },
    { mark: 'B2', address: null },
    /c1:H1\/x governs/,
  ],
  [
    'the clause that governs',
    (c) => {
      memberOf(c, 'B2').summary.governing!.clause.equation = 'H1-2';
    },
    { mark: 'B2', address: null },
    /names what governs otherwise/,
  ],
  [
    'the count of unconfirmed inputs',
    (c) => {
      c.summary.unconfirmed = 0;
    },
    { mark: null, address: null },
    /counts 0 unconfirmed/,
  ],
  [
    'a ratio in the completeness table',
    (c) => {
      const row = memberOf(c, 'B2').completeness.find((r) => r.id === 'interaction');
      row!.cells[0]!.ratioText = '0.100';
    },
    { mark: 'B2', address: null },
    /prints 0.100/,
  ],
  [
    'a line cited in the completeness table',
    (c) => {
      const row = memberOf(c, 'B2').completeness.find((r) => r.id === 'interaction');
      row!.cells[0]!.address = 'c1:H1/none';
    },
    { mark: 'B2', address: null },
    /not there/,
  ],
  [
    'a limit state left out of the completeness table',
    (c) => void memberOf(c, 'B2').completeness.pop(),
    { mark: 'B2', address: null, by: 'rerun' },
    /completeness/,
  ],
  [
    'the section of a member',
    (c) => {
      memberOf(c, 'B2').section = 'W24X62';
    },
    { mark: null, address: null },
    /the section of B2/,
  ],
  [
    'the mark of a member',
    (c) => {
      memberOf(c, 'B2').mark = 'B9';
    },
    { mark: null, address: null },
    /list of members/,
  ],
  [
    'the design method',
    (c) => {
      c.design = 'ASD';
    },
    { mark: null, address: null },
    /the design method/,
  ],
  [
    'the input alone',
    (c) => {
      const input = c.input as { members: { combinations: { P: unknown }[] }[] };
      input.members[1]!.combinations[0]!.P = '100 kip';
    },
    { mark: 'B2', address: 'c1:given/P' },
    /the input says "100 kip"/,
  ],
  [
    'an input that is none',
    (c) => {
      c.input = { format: 1 };
    },
    { mark: null, address: null },
    /^input /,
  ],
  [
    'a field that rides along',
    (c) => void Object.assign(memberOf(c, 'B2'), { approved: true }),
    { mark: null, address: null },
    /fields that the format lacks/,
  ],
];

describe('a record as it was made', () => {
  const verified = verifyRecord(JSON.parse(JSON.stringify(record)));

  it('is reproduced whole', () => {
    expect(verified.problems).toEqual([]);
    expect(verified.notes).toEqual([]);
  });

  it('counts every line but the heads of sections', () => {
    const lines = record.members.flatMap((m) => placedLines(m).map((p) => p.line.kind));
    expect(verified.lines).toBe(lines.filter((kind) => kind !== 'section').length);
    expect(verified.reproduced).toBe(verified.lines);
  });

  it('holds every kind of line but roots, which no book here makes', () => {
    const kinds = new Set(record.members.flatMap((m) => placedLines(m).map((p) => p.line.kind)));
    expect([...kinds].sort()).toEqual([
      ...['check', 'choice', 'comparison', 'formula', 'given', 'governing'],
      ...['lookup', 'notice', 'section', 'statement'],
    ]);
  });
});

describe('a record changed and sealed again', () => {
  it.each([...lineCases, ...wholeCases])('%s is found and named', (_, change, where, reason) => {
    const problems = found(resealed(record, change));
    expect(problems.filter((p) => p.by === 'hash')).toEqual([]);
    const named = problems.filter(
      (p) =>
        (p.member?.mark ?? null) === where.mark &&
        p.address === where.address &&
        p.by === (where.by ?? 'evaluation'),
    );
    expect(named.map((p) => p.reason).join('\n')).toMatch(reason);
  });

  const uncounted = ['a line left out', 'the head of a section'];
  const counted = lineCases.filter(([name]) => !uncounted.includes(name));
  it.each(counted)('%s takes a line from the count', (_, change) => {
    const { lines, reproduced } = verifyRecord(resealed(record, change));
    expect(reproduced).toBeLessThan(lines);
  });
});

describe('a record changed and not sealed again', () => {
  it('has both hashes wrong where a result changed', () => {
    const changed = JSON.parse(JSON.stringify(record)) as CalculationRecord;
    lineAt(changed, B1, 'E3/Pn', 'formula').value *= 2;
    const hashes = found(changed).filter((p) => p.by === 'hash');
    expect(hashes.map((p) => p.reason)).toEqual([
      'its resultHash is not that of what it holds',
      'its snapshotHash is not that of what it holds',
    ]);
  });

  it('has the second hash wrong where only a state changed', () => {
    const changed = JSON.parse(JSON.stringify(record)) as CalculationRecord;
    lineAt(changed, B1, 'given/L', 'given').confirmed = true;
    const hashes = found(changed).filter((p) => p.by === 'hash');
    expect(hashes.map((p) => p.reason)).toEqual(['its snapshotHash is not that of what it holds']);
  });

  it('is not taken without hashes', () => {
    const open = { ...record, resultHash: null, snapshotHash: null };
    expect(found(open).map((p) => p.reason)).toEqual([
      'carries no resultHash',
      'carries no snapshotHash',
    ]);
  });
});

describe('a record of another engine', () => {
  const other = (change: (copy: Copy) => void) =>
    verifyRecord(
      resealed(record, (copy) => {
        copy.program.engine = '0.0.9';
        change(copy);
      }),
    );

  it('is reproduced without a run, and says so', () => {
    const { problems, notes } = other(() => {});
    expect(problems).toEqual([]);
    expect(notes.join()).toMatch(/not run again: the record is of engine 0.0.9/);
  });

  const withoutRun = lineCases.filter(([, , where]) => where.by === undefined);
  it.each(withoutRun)('%s is found without a run', (_, change, where, reason) => {
    const named = other(change).problems.filter((p) => p.address === where.address);
    expect(named.map((p) => p.reason).join('\n')).toMatch(reason);
  });
});

describe('data that is no record', () => {
  it.each<[string, unknown]>([
    ['nothing', null],
    ['a list', []],
    ['another format', { ...record, format: 2 }],
    [
      'a number beyond all numbers',
      JSON.parse(JSON.stringify(record).replace('"ratio":', '"ratio":1e400,"x":')),
    ],
  ])('%s is refused', (_, data) => {
    expect(() => readRecord(data)).toThrow(NotARecord);
  });
});
