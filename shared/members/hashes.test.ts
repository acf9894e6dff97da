import { describe, expect, it } from 'vitest';
import { hashesOf, sealRecord, sha256Hex } from '../calc/hashes.ts';
import { parseInput } from './parse-input.ts';
import { runCalculation } from './run.ts';

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
const seal = (json: unknown) => {
  const parsed = parseInput(json);
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  return sealRecord(runCalculation(parsed.input));
};
const withMember = (more: object) => seal({ ...input, members: [{ ...member, ...more }] });
const first = seal(input);

describe('SHA-256', () => {
  // FIPS 180-2, appendix B.1.
  it('of "abc"', () =>
    expect(sha256Hex('abc')).toBe(
      'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad',
    ));
});

describe('the result hash', () => {
  it('is the same for the same inputs', () =>
    expect(seal(input).resultHash).toBe(first.resultHash));
  it('is the one that the record should carry', () =>
    expect(hashesOf(first)).toEqual({
      resultHash: first.resultHash,
      snapshotHash: first.snapshotHash,
    }));
  for (const [what, more] of [
    ['14 ft as 168 in', { length: '168 in', Lb: '168 in' }],
    ['14 ft as 4.2672 m', { Lcx: '4.2672 m', Lcy: '4267.2 mm' }],
    ['14 ft as 14 ft 0 in', { length: '14 ft 0 in' }],
    ['the mark', { mark: 'another' }],
    ['an id', { id: 'column-7' }],
    ['a way to write the section', { section: 'w12×79' }],
    ['the name of a combination', { combinations: [{ ...combination, name: 'LC 1' }] }],
    ['the id of a combination', { combinations: [{ ...combination, id: 'lc-1' }] }],
    ['a unit of force', { combinations: [{ ...combination, MxA: '600 kip in' }] }],
    [
      'a source',
      { length: { value: '14 ft', source: { kind: 'drawing', number: 'S-201', revision: 'B' } } },
    ],
    ['a confirmation', { length: { value: '14 ft', confirmed: true } }],
  ] as const)
    it(`does not see ${what}, the snapshot hash does`, () => {
      const other = withMember(more);
      expect(other.resultHash).toBe(first.resultHash);
      expect(other.snapshotHash).not.toBe(first.snapshotHash);
    });
  for (const [what, json] of [
    ['a length', { ...input, members: [{ ...member, length: '14.01 ft' }] }],
    ['a section', { ...input, members: [{ ...member, section: 'W12X72' }] }],
    ['a steel', { ...input, members: [{ ...member, material: 'A36' }] }],
    [
      'a force',
      { ...input, members: [{ ...member, combinations: [{ ...combination, P: '101 kip' }] }] },
    ],
    [
      'the sign of a moment',
      { ...input, members: [{ ...member, combinations: [{ ...combination, MxB: '20 kip ft' }] }] },
    ],
    ['the sense of moments', { ...input, members: [{ ...member, endMomentSign: 'joint' }] }],
    [
      'the design method',
      {
        ...input,
        design: 'ASD',
        members: [{ ...member, combinations: [{ ...combination, name: 'D + L' }] }],
      },
    ],
    ['the analysis', { ...input, analysis: { ...input.analysis, method: 'effective-length' } }],
    ['the unit set', { ...input, units: 'si' }],
    ['Cb', { ...input, members: [{ ...member, Cb: 1.01 }] }],
  ] as const)
    it(`sees ${what}`, () => expect(seal(json).resultHash).not.toBe(first.resultHash));
  it('sees a changed line', () => {
    const tampered = structuredClone(first);
    const line = tampered.members[0]?.lines.find((l) => l.key === 'E1/Pc');
    if (line?.kind !== 'formula') throw new Error('no line');
    line.value += 1e-9;
    expect(hashesOf(tampered).resultHash).not.toBe(first.resultHash);
  });
  it('does not see printed digits or titles; the snapshot hash does', () => {
    const tampered = structuredClone(first);
    const line = tampered.members[0]?.lines.find((l) => l.key === 'E1/Pc');
    if (line?.kind !== 'formula') throw new Error('no line');
    line.title = 'Something else';
    expect(hashesOf(tampered).resultHash).toBe(first.resultHash);
    expect(hashesOf(tampered).snapshotHash).not.toBe(first.snapshotHash);
  });
});
