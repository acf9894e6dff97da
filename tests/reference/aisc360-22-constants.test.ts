import { describe, expect, it } from 'vitest';
import type { Line } from '#shared/calc/line.ts';
import { createRecorder, type Recorder } from '#shared/calc/recorder.ts';
import { stressFL } from '#shared/standards/aisc360-22/f4.ts';
import { type InteractionClause, interaction } from '#shared/standards/aisc360-22/h1.ts';
import { stressInteractionChecks } from '#shared/standards/aisc360-22/h2.ts';
import { compressionOf } from './compression-of.ts';
import { type FlexureCase, majorOf } from './flexure-of.ts';
import { quantities } from './given-texts.ts';

/*
 * Equations of ANSI/AISC 360-22 that no published example at hand brings to bear, by hand with
 * Python's floats. E = 29 000 ksi, Fy = 50 ksi, √(E/Fy) = 24.08318916.
 */
const near = (value: number, hand: number, what = '') =>
  expect(Math.abs(value / hand - 1), `${what} ${value}, by hand ${hand}`).toBeLessThan(1e-9);
const lineAt = (r: Recorder, key: string): Line => {
  const line = r.lines.find((l) => l.key === key);
  if (!line) throw new Error(`no line ${key}`);
  return line;
};
const valueAt = (r: Recorder, key: string): number => {
  const line = lineAt(r, key);
  if (!('value' in line)) throw new Error(`${key} has no value`);
  return line.value;
};

/*
 * H1-1a, H1-1b with Pr = 30 or 10 of Pc = 100 kip, 20 of 50 and 6 of 40 kip ft: 0.4 and 0.15.
 *   0.3 + 8/9·(0.4 + 0.15) = 0.788889; 0.1/2 + 0.4 + 0.15 = 0.6
 *   one moment: 0.3 + 8/9·0.4 = 0.655556, 0.05 + 0.4 = 0.45; 0.3 + 8/9·0.15 = 0.433333, 0.05 + 0.15 = 0.2
 * H1.2 and H1.3(a) take the same equations.
 */
describe('H1-1a and H1-1b', () => {
  const solve = (number: InteractionClause, P: string, x: boolean, y: boolean) => {
    const r = createRecorder('');
    const q = quantities(r, {
      ...{ P, Pc: '100 kip', Mrx: '20 kip ft', Mcx: '50 kip ft' },
      ...{ Mry: '6 kip ft', Mcy: '40 kip ft' },
    });
    const found = interaction(
      r,
      'H1',
      { Pr: q.P, Pc: q.Pc },
      x ? { Mr: q.Mrx, Mc: q.Mcx } : null,
      y ? { Mr: q.Mry, Mc: q.Mcy } : null,
      number,
    );
    return { r, found };
  };
  for (const number of ['H1.1', 'H1.2', 'H1.3'] as const)
    for (const [P, share, equation, both, x, y] of [
      ['30 kip', 0.3, 'H1-1a', 0.3 + (8 / 9) * 0.55, 0.3 + (8 / 9) * 0.4, 0.3 + (8 / 9) * 0.15],
      ['10 kip', 0.1, 'H1-1b', 0.6, 0.45, 0.2],
    ] as const)
      it(`${equation} of ${number}`, () => {
        for (const [ratio, major, minor] of [
          [both, true, true],
          [x, true, false],
          [y, false, true],
        ] as const) {
          const { r, found } = solve(number, P, major, minor);
          near(valueAt(r, 'H1/PrPc'), share);
          expect(found?.equation).toBe(equation);
          expect(lineAt(r, 'H1/ratio').clause).toMatchObject({ clause: number, equation });
          near(found?.ratio.value ?? Number.NaN, ratio);
        }
      });
});

// H2-1 by hand: fra/Fca = 30/90, frbw/Fcbw = 15/60, frbz/Fcbz = 2/8, each with the section property in
// both: 1/3 + 1/4 = 0.583333 with one moment, 1/4 + 1/4 = 0.5 without axial force.
describe('H2-1 with two of its three terms', () => {
  const solve = (axial: boolean, x: boolean, y: boolean) => {
    const r = createRecorder('');
    const q = quantities(r, {
      ...{ P: '30 kip', Pc: '90 kip', A: '6.08 in²', Sx: '21.5 in³', Sy: '2.05 in³' },
      ...{ Mrx: '15 kip ft', Mcx: '60 kip ft', Mry: '2 kip ft', Mcy: '8 kip ft' },
    });
    stressInteractionChecks(r, axial ? { Pr: q.P, Pc: q.Pc, Ag: q.A } : null, [
      {
        ...{ name: 'corner', title: 'corner' },
        x: x ? { Mr: q.Mrx, S: q.Sx, Mc: q.Mcx } : null,
        y: y ? { Mr: q.Mry, S: q.Sy, Mc: q.Mcy } : null,
      },
    ]);
    return valueAt(r, 'H2/corner/ratio');
  };
  it('axial force and the major axis', () => near(solve(true, true, false), 1 / 3 + 1 / 4));
  it('axial force and the minor axis', () => near(solve(true, false, true), 1 / 3 + 1 / 4));
  it('both moments', () => near(solve(false, true, true), 0.5));
});

/*
 * E7, three plates: flanges 20 × 3/8, web 20 × 1/4, Lc = 10 ft. A = 20, Ix = 1723.619792,
 * Iy = 500.0260417, ry = 5.000130207: Fey = 496.9330466 ksi. Built up, so E4 too: J = 0.8072916667,
 * Cw = 500.0260417·20.375²/4 = 51 895.28086, E4-2: (π²·29 000·Cw/120² + 11 200·J)/(Ix + Iy) = 467.9374426,
 * Fn = 0.658^0.1068518897·50 = 47.81312148 ksi.
 *   kc = 4/√80 = 0.4472135955, λr = 0.64·√(kc·580) = 10.30745553 < 26.67; web 1.49·24.083 = 35.88395 < 80
 *   flange (c): Fel = (1.49·10.30745553/26.66667)²·50 = 16.58471512, be = 5.126423801 of 10
 *   web (a): Fel = (1.31·35.88395185/80)²·50 = 17.26367105, he = 10.71791008 of 20
 *   Ae = 20 − 4·(10 − 5.126423801)·0.375 − (20 − 10.71791008)·0.25 = 10.36911322, Pn = 495.7796701
 * At Fn = Fy: be = 5.029563311, he = 10.50900991: Pns = 508.5798722 kip.
 */
it('slender flanges and a slender web of a doubly symmetric I-shape', () => {
  const c = compressionOf({
    Fy: '50 ksi',
    section: {
      ...{ kind: 'i', made: 'built-up', A: '20 in²', Ix: '1723.6197916666667 in⁴' },
      ...{ Iy: '500.0260416666667 in⁴', rx: '9.283371671075836 in', ry: '5.000130206637957 in' },
      ...{
        J: '0.8072916666666666 in⁴',
        ho: '20.375 in',
        Cw: '51895.280863444015 in⁶',
        d: '20.75 in',
      },
      ...{ bf: '20 in', tf: '0.375 in', tw: '0.25 in', h: '20 in' },
      ...{ lambdaf: '26.666666666666668', lambdaw: '80' },
    },
    lengths: { Lcx: '120 in', Lcy: '120 in', Lcz: '120 in' },
  });
  near(c.at('E4/Fe', 'ksi'), 467.9374425684435);
  near(c.at('E3/Fn', 'ksi'), 47.81312148332193);
  near(c.at('E7/flange/Fel', 'ksi'), 16.5847151218834);
  near(c.at('E7/web/Fel', 'ksi'), 17.263671045312503);
  near(c.at('E7/Ae', 'in²'), 10.369113220003085);
  near(c.at('E7/Pn', 'kip'), 495.7796700623269);
  near(c.at('C2/Pns', 'kip'), 508.5798722297846);
});

/*
 * F4-6, Fy = 50: Sxt/Sxc = 90/200 = 0.45: Fy·Sxt/Sxc = 22.5, not less than 0.5·Fy = 25;
 * 139/200 = 0.695: 34.75; 140.5/200 = 0.7025 is above 0.7: 0.7·Fy = 35.
 */
describe('FL by Sxt/Sxc', () => {
  for (const [Sxt, FL, equation] of [
    ['90 in³', 25, 'F4-6b'],
    ['139 in³', 34.75, 'F4-6b'],
    ['140.5 in³', 35, 'F4-6a'],
  ] as const)
    it(`${Sxt} of 200 in³: ${FL} ksi by ${equation}`, () => {
      const r = createRecorder('');
      const q = quantities(r, { Fy: '50 ksi', Sxc: '200 in³', Sxt });
      const found = stressFL(r, 'F4', q);
      near(found.value / q.Fy.value, FL / 50);
      expect(lineAt(r, 'F4/FL').clause?.equation).toBe(equation);
    });
});

/*
 * F4, a stocky compression flange 6 × 2 1/2 above a web 44 × 7/16 and a flange 14 × 3/4 in tension:
 * A = 44.75, centroid 21.95670391 below the top, Ix = 16 189.67653, Iy = 216.8070475: Iyc/Iy = 45/Iy =
 * 0.2075578 ≤ 0.23. Sxc = 737.3454867, Sxt = 640.0777690, Zx = 783.8660714 (axis 19.357142857 down)
 *   hc = 38.91340782, hp = 33.71428571, hc/tw = 88.94493216; row 16: Mp/My = 39 193.304/32 003.888,
 *   λp = 1.154211418·24.08318916/(0.54·1.224642 − 0.09)² = 85.16492268: noncompact, F4
 *   1.6·Fy·Sx = 51 206.22152, so Mp = Fy·Zx; Rpc = Rpt = 1 (F4-10, F4-17):
 *   CFY = 36 867.27433, TFY = 32 003.88845 kip in, which governs a member held all along
 */
it('the flange in tension yields where the small flange is in compression', () => {
  const plates: FlexureCase = {
    Fy: '50 ksi',
    section: {
      ...{ kind: 'mono-i', made: 'built-up', tw: '0.4375 in', h: '44 in' },
      ...{ lambdaw: '100.57142857142857', ho: '45.625 in', J: '34.446940104166664 in⁴' },
      ...{ Ix: '16189.676530493482 in⁴', Iy: '216.80704752604166 in⁴' },
      ...{ Sx: '640.0777689582183 in³', Zx: '783.8660714285714 in³' },
    },
    flanges: {
      top: {
        ...{ b: '6 in', t: '2.5 in', lambda: '1.2', Iyf: '45 in⁴', S: '737.3454866632742 in³' },
        ...{ hc: '38.91340782122905 in', hp: '33.714285714285715 in' },
      },
      bottom: {
        ...{ b: '14 in', t: '0.75 in', lambda: '9.333333333333334', Iyf: '171.5 in⁴' },
        ...{ S: '640.0777689582183 in³', hc: '49.08659217877095 in', hp: '54.285714285714285 in' },
      },
    },
    Lb: '0 ft',
  };
  const c = majorOf(plates);
  near(c.at('B4/x/web/lambdap'), 85.16492267533246);
  near(c.at('F4/cap', 'kip in'), 51206.22151665746);
  near(c.at('F4/Rpt'), 1);
  near(c.at('F4/CFY/Mn', 'kip in'), 36867.27433316371);
  near(c.at('F4/TFY/Mn', 'kip in'), 32003.88844791091);
  near(c.at('F4/Mn', 'kip in'), 32003.88844791091);
  expect(c.lines.find((l) => l.key === 'F4/Rpt')?.clause?.equation).toBe('F4-17');
  // With the centroid at the inner face of the flange, or in the flange, no part of the web is compressed.
  const { flanges } = plates;
  if (!flanges) throw new Error('no flanges');
  for (const hc of ['0 in', '-1 in']) {
    const beyond = majorOf({ ...plates, flanges: { ...flanges, top: { ...flanges.top, hc } } });
    expect(beyond.codes).toContain('web-not-compressed');
    expect(beyond.outcome('B4/x/web/elastic')).toBe('the web is in tension only');
  }
});

/*
 * F7-5 on a box of 30 × 30 clear, flanges 3/4 in, webs 1/2 in: A = 76.5, Ix = 13 244.34375. Of the flange in
 * compression be = 1.92·0.75·24.08318916·(1 − 0.34·24.08318916/40) = 27.58059239 of 30: 1.814555710 in² are
 * out, 15.375 in from the centroid, with 2.419407613·0.75³/12 = 0.08505729890 in⁴ of their own; the axis
 * moves by 1.814555710·15.375/74.68544429 = 0.3735506203:
 *   Ieff = Ix − 0.08505730 − 1.814555710·15.375² − 74.68544429·0.3735506203² = 12 804.8931225
 */
it('what is left of a box with a slender flange', () => {
  const c = majorOf({
    Fy: '50 ksi',
    section: {
      ...{ kind: 'box', square: 'no', b: '30 in', h: '30 in', tf: '0.75 in', tw: '0.5 in' },
      ...{ d: '31.5 in', lambdab: '40', lambdah: '60', A: '76.5 in²', Ix: '13244.34375 in⁴' },
      ...{ Iy: '10701.375 in⁴', Sx: '840.9107142857143 in³', Sy: '690.411290322581 in³' },
      ...{ Zx: '939.9375 in³', Zy: '817.875 in³', ry: '11.82739425664 in' },
      ...{ J: '17219.1096044 in⁴' },
    },
    Lb: '0 ft',
  });
  near(c.at('F7/x/FLB/Ieff', 'in⁴'), 12804.89312254486);
});

/*
 * Table B4.1b: row 20, D/t of a round wall: 0.07·580 = 40.6 and 0.31·580 = 179.8. Row 21, b/t of a box's
 * flange: 1.12·24.08318916 = 26.97317186 and 1.49·24.08318916 = 35.88395185.
 */
describe('limits of Table B4.1b', () => {
  it('row 20', () => {
    const c = majorOf({
      Fy: '50 ksi',
      section: { kind: 'round', lambdad: '100', Sx: '60.97 in³', Zx: '78.41 in³' },
      Lb: '0 ft',
    });
    near(c.at('B4/x/wall/lambdap'), 40.6);
    near(c.at('B4/x/wall/lambdar'), 179.8);
  });
  it('row 21', () => {
    const c = majorOf({
      Fy: '50 ksi',
      section: {
        ...{ kind: 'box', square: 'no', b: '20 in', h: '30 in', tf: '0.75 in', tw: '0.5 in' },
        ...{ d: '31.5 in', lambdab: '26.7', lambdah: '60', A: '61.5 in²', Ix: '9698 in⁴' },
        ...{ Iy: '4310 in⁴', Sx: '615.746 in³', Zx: '709.3 in³', Sy: '410.5 in³', Zy: '472.9 in³' },
        ...{ ry: '8.372 in', J: '8946 in⁴' },
      },
      Lb: '0 ft',
    });
    near(c.at('B4/x/flange/lambdap'), 26.97317186, 'λp');
    near(c.at('B4/x/flange/lambdar'), 35.88395185, 'λr');
  });
});
