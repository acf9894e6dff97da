import { describe, expect, it } from 'vitest';
import { parseInput } from '../members/parse-input.ts';
import { runCalculation } from '../members/run.ts';
import { memberSheet, wholeMemberSheet } from './member-sheet.ts';
import type { Block, BlockOf } from './tree.ts';

/** A column of two bays and three segments that carries load between its ends. */
const INPUT = {
  format: 1,
  standard: 'aisc360-22',
  design: 'LRFD',
  units: 'us',
  analysis: { method: 'direct', secondOrder: 'exact', sway: 'none' },
  members: [
    {
      ...{ mark: 'T1', section: 'W14X48', material: 'A992', length: '30 ft', ends: 'held' },
      ...{ Cb: 'auto', endMomentSign: 'bending' },
      restraints: [
        { at: '10 ft', holds: ['top', 'bottom'] },
        { at: '20 ft', holds: ['in-plane', 'centre', 'twist'] },
      ],
      combinations: [
        {
          ...{ name: '1.2D + 1.6L', P: '60 kip', MxA: '60 kip ft', MxB: '0 kip ft' },
          supports: [{ at: '20 ft', Mx: '-30 kip ft' }],
          loads: [{ kind: 'uniform', bends: 'x', w: '0.4 kip/ft', height: 'centre' }],
        },
      ],
    },
  ],
};

const parsed = parseInput(INPUT);
if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
const record = runCalculation(parsed.input);
const id = record.members[0]?.id ?? '';
const sheet = memberSheet(record, id);
const sections = sheet.filter((block) => block.kind === 'lineSection');
const at = (address: string): BlockOf<'lineSection'> => {
  const found = sections.find((section) => section.address === address);
  if (!found) throw new Error(`no section ${address}`);
  return found;
};
const words = ({ outcome }: BlockOf<'lineSection'>): string =>
  outcome?.content
    .map(({ text }) => text)
    .join('')
    .replace(/\s/g, ' ') ?? '';

describe('the sections of a sheet', () => {
  it('nest the bays in their plane and the checks in their segment', () => {
    const levels = ['c1:theory/x', 'c1:bay1/theory/x', 'c1:bay2/theory/x'].map((a) => at(a).level);
    expect(levels).toEqual([1, 2, 2]);
    expect([at('c1:s1/segment').level, at('c1:s1/H1').level]).toEqual([1, 2]);
    expect(at('c1:G/x').level).toBe(1);
  });

  it('name the bay of a section that stands apart from its plane', () => {
    expect(at('c1:bay2/L/x')).toMatchObject({ level: 1, folded: true });
    expect(at('c1:bay2/L/x').title).toMatch(/^Bay 2: deflection in the middle/);
  });

  it('start open where they lead to what governs, and folded for looked-up properties', () => {
    const governing = record.members[0]?.summary.governing?.address ?? '';
    const segment = /^c1:(s\d)\//.exec(governing)?.[1];
    const open = ['s1', 's2', 's3'].filter((name) => !at(`c1:${name}/segment`).folded);
    expect(open).toEqual([segment]);
    expect(at('section').folded).toBe(true);
    expect(at('given').folded).toBe(false);
    expect(at('E3/strength').folded).toBe(false);
  });

  it('say in one line what they come to', () => {
    expect(words(at('steel'))).toBe('Fy = 50 ksi, Fu = 65 ksi, E = 29 000 ksi');
    expect(words(at('B4/x'))).toBe('The flange is compact, the web is compact');
    const strength = sheet.find((block) => block.kind === 'line' && block.address === 'E1/Pc');
    const { value = '', unit = '' } = (strength as BlockOf<'line'>).result ?? {};
    expect(words(at('E3/strength'))).toBe(`Pc = ${value} ${unit}`);
    const ratio = record.members[0]?.summary.ratioText;
    const [governs] = sections.filter(
      ({ address, folded }) => /s\d\/segment/.test(address) && !folded,
    );
    expect(governs && words(governs)).toBe(`Flexure and compression ${ratio}`);
  });

  it('say a value of a table in the units of the sheet', () => {
    const si = parseInput({ ...INPUT, units: 'si' });
    if (!si.ok) throw new Error(JSON.stringify(si.problems));
    const section = memberSheet(runCalculation(si.input), id).find(
      (block) => block.kind === 'lineSection' && block.address === 'section',
    );
    // AISC Shapes Database v16.0: W14X48, A = 14.1 in²; 14.1 × 25.4² = 9096.8 mm².
    expect(words(section as BlockOf<'lineSection'>)).toMatch(/^Ag = 909[67][\d.]* mm²/);
  });

  it('do not say their title again before a ratio', () => {
    const shear = at('c1:G/x');
    expect(words(shear)).not.toContain(shear.title);
    expect(words(shear)).toMatch(/^0\.\d+$/);
  });

  it('leave no line out and none twice', () => {
    const lines = (blocks: readonly Block[]) =>
      blocks.filter((b) => b.kind === 'line' || b.kind === 'lineSection').length;
    const [member] = record.members;
    const all = (member?.lines.length ?? 0) + (member?.combinations[0]?.lines.length ?? 0);
    expect([lines(sheet), lines(wholeMemberSheet(record, id))]).toEqual([all, all]);
  });
});

describe('the tables of limit states', () => {
  const tables = sheet.filter((block) => block.kind === 'table');
  const told = (table: BlockOf<'table'> | undefined): string[] =>
    (table?.rows ?? []).map((row) =>
      row.map(({ content }) => content.map(({ text }) => text).join('')).join(' | '),
    );

  it('tell every limit state once, with its largest ratio or why it is not checked', () => {
    const text = tables.flatMap(told).join('\n');
    const without = record.members[0]?.completeness.filter(({ title }) => !text.includes(title));
    expect(without?.map(({ title }) => title)).toEqual([]);
  });

  it('lead from a ratio to its line', () => {
    const addresses = new Set(
      sheet.flatMap((block) => (block.kind === 'line' ? [block.address] : [])),
    );
    const links = tables
      .flatMap(({ rows }) => rows.flat().flatMap(({ content }) => content))
      .flatMap((run) => (run.kind === 'value' ? [run.address] : []));
    expect(links.length).toBeGreaterThan(8);
    expect(links.filter((address) => !addresses.has(address))).toEqual([]);
  });

  it('keep what does not apply to any member apart from what this one lacks', () => {
    const [checked, idle] = tables.map(told);
    expect(checked?.filter((row) => row.includes('not applicable'))).toEqual([]);
    expect(idle).toHaveLength(2);
    expect(idle?.[0]).toMatch(/^not applicable \| .*Tension alone \(D2\): no tension in this/);
    expect(idle?.[1]).toMatch(/^outside scope \| Torsion \(H3\)/);
  });
});
