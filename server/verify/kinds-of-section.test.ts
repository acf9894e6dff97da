import { expect, it } from 'vitest';
import { sealRecord } from '#shared/calc/hashes.ts';
import { parseInput } from '#shared/members/parse-input.ts';
import { runCalculation } from '#shared/members/run.ts';
import { verifyRecord } from './verify-record.ts';

/* Structural: every kind of section and every table of shapes and steels, no expected values. */
const MEMBERS: readonly (readonly [section: unknown, material: string])[] = [
  ['S24X121', 'A992'],
  ['HP12X53', 'A572 Gr. 50'],
  ['M12X11.8', 'A529 Gr. 55'],
  ['C15X33.9', 'A36'],
  ['HSS8X6X1/2', 'A500 Gr. C'],
  ['HSS6.000X0.375', 'A500 Gr. B'],
  ['Pipe14XS', 'A53 Gr. B'],
  // A steel that is not made as this.
  ['W12X79', 'A500 Gr. B'],
  [{ shape: 'i', d: '20 in', bf: '10 in', tf: '5 in', tw: '0.5 in' }, 'A588'],
  [
    {
      ...{ shape: 'mono-i', d: '20 in', tw: '0.5 in', confirmed: true },
      ...{ bfTop: '8 in', tfTop: '1 in', bfBottom: '12 in', tfBottom: '0.75 in' },
      source: { kind: 'drawing', number: 'S-201', revision: 'A' },
    },
    'A572 Gr. 50',
  ],
  [{ shape: 'box', B: '12 in', d: '20 in', tf: '1 in', tw: '0.5 in' }, 'A36'],
  [{ shape: 'tube', B: '150 mm', Ht: '250 mm', t: '10 mm', wall: 'nominal' }, 'A1085'],
  [
    { shape: 'tube', B: '6 in', Ht: '9 in', t: '0.5 in', wall: 'nominal', Ro: '1 in' },
    'A500 Gr. C',
  ],
  [{ shape: 'round', D: '300 mm', t: '8 mm', wall: 'design' }, 'A500-21 Gr. C'],
];

it.each(['us', 'si'] as const)(
  'reproduces a member of every kind of section, %s',
  { timeout: 120_000 },
  (units) => {
    const parsed = parseInput({
      ...{ format: 1, standard: 'aisc360-22', design: 'LRFD', units },
      analysis: { method: 'direct', secondOrder: 'amplified', sway: 'none' },
      members: MEMBERS.map(([section, material], index) => ({
        ...{ mark: `M${index + 1}`, section, material, length: '12 ft', ends: 'held' },
        ...{ Lcx: '12 ft', Lcy: '12 ft', Lcz: '12 ft', Lb: '12 ft', endMomentSign: 'bending' },
        combinations: [
          { name: 'both planes', P: '20 kip', MxA: '10 kip ft', MxB: '5 kip ft', MyA: '1 kip ft' },
        ],
      })),
    });
    if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
    const record = JSON.parse(JSON.stringify(sealRecord(runCalculation(parsed.input))));
    const { problems, lines, reproduced } = verifyRecord(record);
    expect(problems).toEqual([]);
    expect(reproduced).toBe(lines);
  },
);

it('finds a look-up of another row or value', () => {
  const parsed = parseInput({
    ...{ format: 1, standard: 'aisc360-22', design: 'LRFD', units: 'us' },
    analysis: { method: 'direct', secondOrder: 'amplified', sway: 'none' },
    members: [
      {
        ...{ mark: 'M', section: 'HSS8X6X1/2', material: 'A500 Gr. C', length: '12 ft' },
        ...{ ends: 'held', Lcx: '12 ft', Lcy: '12 ft', Lcz: '12 ft' },
        combinations: [{ name: 'a', P: '20 kip' }],
      },
    ],
  });
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  const found = (key: string, change: Record<string, string | number>) => {
    const record = JSON.parse(JSON.stringify(runCalculation(parsed.input)));
    const line = record.members[0].lines.find((l: { key: string }) => l.key === key);
    Object.assign(line, change);
    return verifyRecord(sealRecord(record))
      .problems.filter(({ address }) => address === key)
      .map(({ reason }) => reason);
  };
  expect(found('section/J', {})).toEqual([]);
  expect(found('section/J', { row: 'HSS8X6X3/8' })[0]).toMatch(/reads row/);
  expect(found('section/J', { published: '99 in⁴' }).join()).toMatch(/the table has/);
  expect(found('steel/Fy', { row: 'A500 Gr. C, round, editions before 2021' })[0]).toMatch(
    /reads row/,
  );
});
