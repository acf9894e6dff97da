import { describe, expect, it } from 'vitest';
import { createRecorder } from '#shared/calc/recorder.ts';
import { flangeLocalBucklingMajor } from '#shared/standards/aisc360-22/f3.ts';
import type { DimensionName } from '#shared/units/dimension.ts';
import { linesOf } from '../run-input.ts';
import { expectValue, runOne } from './one-member.ts';

/*
 * F6-1, its limit, by hand: W40×331, Sy = 106, Zy = 172 in³: Fy·Zy = 50·172 = 8600 kip in, 1.6·50·106 = 8480
 * kip in is less: Mp = 8480, φMn = 0.9·8480/12 = 636 kip ft.
 */
describe('the limit of the plastic moment about the minor axis', () => {
  it('governs W40×331', () => {
    const m = runOne({
      member: { section: 'W40X331', length: '20 ft' },
      forces: { P: '0 kip', MyA: '10 kip ft' },
    });
    expectValue(m, 'F6/FyZy', 'kip in', 8600);
    expectValue(m, 'F6/cap', 'kip in', 8480);
    expectValue(m, 'F6/Mp', 'kip in', 8480);
    expectValue(m, 'F1/y/Mc', 'kip ft', 636);
  });
});

/*
 * Slender flange in flexure, by hand. No W shape has one below 280 ksi, so W14×90 in a steel of 400 ksi:
 * √(29 000/400) = 8.514693 < bf/2tf = 10.2; web 25.9 < 3.76·8.514693: compact.
 *   kc = 4/√25.9 = 0.785974, not above 0.76; F3-2: 0.9·29 000·0.76·143/10.2² = 27 264.01 kip in
 *   F6-4: 0.70·29 000/10.2² = 195.1173 ksi, F6-3: 195.1173·49.9 = 9736.351 kip in
 */
describe('a slender flange', () => {
  const m = runOne({
    member: {
      section: 'W14X90',
      material: {
        name: 'imagined',
        Fy: '400 ksi',
        source: { kind: 'assumption', basis: 'a slender flange needs it' },
      },
      length: '20 ft',
      Lb: '0 ft',
    },
    forces: { P: '0 kip', MxA: '10 kip ft', MyA: '10 kip ft' },
  });
  it('about the major axis, F3-2 with kc at its upper limit', () => {
    expectValue(m, 'F3/kc', '', 0.76);
    expectValue(m, 'F3/FLB/Mn', 'kip in', (0.9 * 29000 * 0.76 * 143) / 10.2 ** 2);
    expect(linesOf(m).get('F3/FLB/Mn')?.clause?.equation).toBe('F3-2');
    expectValue(m, 'F2/Mn', 'kip in', 27264.01, 1e-6);
  });
  it('about the minor axis, F6-3 and F6-4', () => {
    expectValue(m, 'F6/FLB/Fcr', 'ksi', 195.1173, 1e-6);
    expectValue(m, 'F6/FLB/Mn', 'kip in', 9736.351, 1e-6);
    expectValue(m, 'F6/Mn', 'kip in', 9736.351, 1e-6);
  });
  /*
   * kc between and at its limits, at λ = 10, Sx = 100 in³: h/tw = 64: 4/8 = 0.5: 0.9·29 000·0.5·100/100 = 13 050;
   * h/tw = 200: 0.2828, not below 0.35: 9135 kip in.
   */
  for (const [h_tw, Mn] of [
    [64, 13050],
    [200, 9135],
    [16, 19836],
  ] as const)
    it(`kc at h/tw = ${h_tw}`, () => {
      const r = createRecorder('');
      const quantity = (name: string, dimension: DimensionName, value: number) =>
        r.given(
          name,
          name,
          dimension,
          { value, text: String(value), source: { kind: 'typed' }, confirmed: false },
          { title: name },
        );
      const limit = quantity('lambdapf', 'none', 5);
      const found = flangeLocalBucklingMajor(
        r,
        {
          E: quantity('E', 'stress', 29000),
          Fy: quantity('Fy', 'stress', 400),
          Sx: quantity('Sx', 'modulus', 100),
          Mp: quantity('Mp', 'moment', 1e6),
          lambdaf: quantity('lambdaf', 'none', 10),
          lambdaw: quantity('lambdaw', 'none', h_tw),
        },
        { class: 'slender', lambdap: limit, lambdar: limit },
      );
      expect(found?.value).toBeCloseTo(Mn, 6);
    });
});
