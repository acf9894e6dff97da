import { describe, expect, it } from 'vitest';
import { DIMENSION_NAMES, DIMENSIONS } from './dimension.ts';
import { fromBase, toBase, UNITS, unitNamed } from './unit.ts';
import { UNIT_SETS } from './unit-set.ts';

/*
 * NIST Special Publication 811, 2008 edition, appendix B.8, as printed there with seven digits:
 * inch 25.4 mm, foot 0.3048 m, kip 4.448222 kN, ksi 6.894757 MPa, psi 6.894757 kPa,
 * pound-force foot 1.355818 N m, inch to the fourth power 4.162314 E-07 m⁴, cubic inch 1.638706 E-05 m³.
 */
const PUBLISHED: readonly (readonly [unit: string, base: number])[] = [
  ['in', 25.4],
  ['ft', 304.8],
  ['kip', 4448.222],
  ['ksi', 6.894757],
  ['psi', 0.006894757],
  ['lbf ft', 1355.818],
  ['kip ft', 1355818],
  ['in³', 16387.06],
  ['in⁴', 416231.4],
  ['in²', 645.16],
  ['kN m', 1e6],
  ['GPa', 1000],
  ['cm', 10],
];

describe('factors to N and mm', () => {
  for (const [unit, base] of PUBLISHED)
    it(unit, () => expect(unitNamed(unit).factor / base - 1).toBeCloseTo(0, 6));
  it('29 000 ksi is 199 948 MPa', () =>
    expect(toBase(29000, unitNamed('ksi'))).toBeCloseTo(199948, 0));
  it('there and back', () => {
    for (const unit of UNITS.values())
      expect(fromBase(toBase(12.34, unit), unit)).toBeCloseTo(12.34, 12);
  });
  it('an unknown name is a mistake in the code', () =>
    expect(() => unitNamed('stone')).toThrow(/no unit named "stone"/));
});

describe('unit sets', () => {
  for (const set of Object.values(UNIT_SETS)) {
    it(`${set.name} has a working unit of each dimension`, () => {
      // A deflection prints in the unit of lengths, without their display unit.
      const unitsOf = (name: string) => (name === 'deflection' ? 'length' : name);
      for (const name of DIMENSION_NAMES) expect(set.working[name].dimension).toBe(unitsOf(name));
      for (const [name, unit] of Object.entries(set.display)) expect(unit.dimension).toBe(name);
    });
    it(`${set.name}: working units are coherent`, () => {
      const [force, length] = [set.working.force.factor, set.working.length.factor];
      for (const name of DIMENSION_NAMES) {
        const { force: f, length: l } = DIMENSIONS[name];
        expect(set.working[name].factor / (force ** f * length ** l)).toBeCloseTo(1, 12);
      }
    });
  }
});
