import { describe, expect, it } from 'vitest';
import { closeLines } from '#shared/calc/closure.ts';
import { closureProblems } from '#shared/calc/closure-problems.ts';
import type { Line } from '#shared/calc/line.ts';
import { createRecorder, type Recorder } from '#shared/calc/recorder.ts';
import { shearCheck, shearStrength } from '#shared/members/shear.ts';
import { tensionStrength } from '#shared/members/tension.ts';
import { interactionChecks } from '#shared/standards/aisc360-22/h1.ts';
import { type SingleAxis, singleAxisChecks } from '#shared/standards/aisc360-22/h1-single-axis.ts';
import { increasedCb, requiredTension } from '#shared/standards/aisc360-22/h1-tension.ts';
import { stressInteractionChecks } from '#shared/standards/aisc360-22/h2.ts';
import { UNIT_SETS } from '#shared/units/unit-set.ts';
import { quantities, quantity, sectionOf, steelOf, type Texts } from './given-texts.ts';
import { inUnit } from './in-unit.ts';

/*
 * Worked by hand from the equations of ANSI/AISC 360-22, where no published example is at hand.
 * E = 29 000 ksi and Fy = 50 ksi.
 */
const STEEL = { E: '29000 ksi', Fy: '50 ksi' };

function lineAt(r: Recorder, key: string): Line {
  const line = r.lines.find((l) => l.key === key);
  if (!line) throw new Error(`no line ${key}`);
  return line;
}
function valueAt(r: Recorder, key: string): number {
  const line = lineAt(r, key);
  if ('value' in line) return line.value;
  if (line.kind === 'check') return line.ratio;
  throw new Error(`${key} has no value`);
}
const equationAt = (r: Recorder, key: string) => lineAt(r, key).clause?.equation;
const noticesOf = (r: Recorder) =>
  r.lines.flatMap((l) => (l.kind === 'notice' ? [`${l.severity}: ${l.code}`] : []));

/** What does not follow on the printed sheet of a combination, in either unit set. */
function faultsOf(r: Recorder): string[] {
  const placed = (lines: readonly Line[]) =>
    lines.map((line) => ({ address: `c1:${line.key}`, combination: 'c1', line }));
  return Object.values(UNIT_SETS).flatMap((set) =>
    closureProblems(placed(closeLines(placed(r.lines), set)), set).map(
      (p) => `${p.address}: ${p.reason}`,
    ),
  );
}

/** To 0.0005 % of a value worked to seven digits. */
const near = (value: number, hand: number) =>
  expect(Math.abs(value / hand - 1), `${value}, by hand ${hand}`).toBeLessThan(5e-6);

describe('G2.1 webs between stiffeners', () => {
  const run = (a: string) => {
    const r = createRecorder('');
    const section = sectionOf(r, {
      ...{ kind: 'i', made: 'built-up', d: '36 in', tw: '0.3125 in', lambdaw: '105.6' },
    });
    shearStrength(r, 'LRFD', steelOf(r, STEEL), section, 'x', { a: quantity(r, 'a', a) });
    return r;
  };
  it('uses G2-5 up to a/h = 3', () => {
    const r = run('49.5 in');
    // h = 105.6·0.3125 = 33; a/h = 1.5; kv = 5 + 5/2.25 = 7.222222; 1.10·√(7.222222·580) = 71.19379;
    // Cv1 = 71.19379/105.6 = 0.6741836; Vn = 0.6·50·(36·0.3125)·0.6741836 = 227.5370; ·0.90 = 204.7833.
    near(inUnit(valueAt(r, 'G2/x/h'), 'in'), 33);
    near(valueAt(r, 'G2/x/kv'), 7.222222);
    near(valueAt(r, 'G2/x/limit'), 71.19379);
    near(valueAt(r, 'G2/x/Cv1'), 0.6741836);
    near(inUnit(valueAt(r, 'G2/x/Vc'), 'kip'), 204.7833);
    expect(equationAt(r, 'G2/x/kv')).toBe('G2-5');
    expect(noticesOf(r)).toEqual(['note: stiffeners-not-checked', 'note: no-tension-field']);
  });
  it('counts the web as unstiffened beyond', () => {
    // a/h = 99/33 = 3 is not beyond.
    expect(equationAt(run('99 in'), 'G2/x/kv')).toBe('G2-5');
    const r = run('99.1 in');
    near(valueAt(r, 'G2/x/kv'), 5.34);
    expect(noticesOf(r)).toEqual(['note: no-tension-field']);
  });
});

describe('G2.1(a)', () => {
  // 2.24·√580 = 53.94664.
  const factor = (section: Texts) => {
    const r = createRecorder('');
    shearStrength(
      r,
      'ASD',
      steelOf(r, STEEL),
      sectionOf(r, { d: '20 in', tw: '0.4 in', ...section }),
      'x',
    );
    return valueAt(r, 'G2/x/Omegav');
  };
  it('is for rolled I-shapes with a stocky web only', () => {
    expect(factor({ kind: 'i', made: 'rolled', lambdaw: '53.9' })).toBe(1.5);
    expect(factor({ kind: 'i', made: 'rolled', lambdaw: '54' })).toBe(1.67);
    expect(factor({ kind: 'i', made: 'built-up', lambdaw: '20' })).toBe(1.67);
    expect(factor({ kind: 'channel', lambdaw: '20' })).toBe(1.67);
    expect(factor({ kind: 'mono-i', made: 'built-up', lambdaw: '20' })).toBe(1.67);
  });
});

describe('G4 boxes and HSS', () => {
  const box = (axis: 'x' | 'y', over: Texts) => {
    const r = createRecorder('');
    const section = sectionOf(r, {
      ...{ kind: 'box', b: '10 in', h: '24 in', tf: '0.5 in', tw: '0.3 in' },
      ...{ lambdab: '20', lambdah: '80', ...over },
    });
    shearStrength(r, 'LRFD', steelOf(r, STEEL), section, axis);
    return r;
  };
  it('takes the webs about x: elastic buckling by G2-11', () => {
    const r = box('x', {});
    // 1.37·√(5·580) = 73.77676 < 80; Cv2 = 1.51·5·29000/(80²·50) = 0.6842188;
    // Vn = 0.6·50·(2·24·0.3)·0.6842188 = 295.5825.
    near(valueAt(r, 'G4/x/elastic'), 73.77676);
    expect(equationAt(r, 'G4/x/Cv2')).toBe('G2-11');
    near(valueAt(r, 'G4/x/Cv2'), 0.68421875);
    near(inUnit(valueAt(r, 'G4/x/Vn'), 'kip'), 295.5825);
  });
  it('buckles inelastically by G2-10', () => {
    // 1.10·√2900 = 59.23681 < 70 ≤ 73.77676; 59.23681/70 = 0.8462402.
    const r = box('x', { lambdah: '70', h: '21 in' });
    expect(equationAt(r, 'G4/x/Cv2')).toBe('G2-10');
    near(valueAt(r, 'G4/x/Cv2'), 0.8462402);
  });
  it('takes the flanges about y', () => {
    // Vn = 0.6·50·(2·10·0.5)·1 = 300; φ = 0.90: 270.
    near(inUnit(valueAt(box('y', {}), 'G4/y/Vc'), 'kip'), 270);
  });
  it('takes the other walls of a rectangular HSS about y', () => {
    const r = createRecorder('');
    const section = sectionOf(r, {
      kind: 'rect-hss',
      t: '0.349 in',
      lambdab: '8.46',
      lambdah: '14.2',
    });
    shearStrength(r, 'LRFD', steelOf(r, STEEL), section, 'y');
    // b = 8.46·0.349 = 2.95254; Vn = 0.6·50·2·2.95254·0.349 = 61.82619.
    near(inUnit(valueAt(r, 'G4/y/Vn'), 'kip'), 61.82619);
  });
});

describe('G5 round sections', () => {
  const run = (Lv: string | null) => {
    const r = createRecorder('');
    const section = sectionOf(r, { kind: 'round', A: '12.4 in²', D: '20 in', lambdad: '100' });
    const more = Lv === null ? {} : { Lv: quantity(r, 'Lv', Lv) };
    shearStrength(r, 'LRFD', steelOf(r, STEEL), section, 'x', more);
    return { r, Fcr: inUnit(valueAt(r, 'G5/x/Fcr'), 'ksi') };
  };
  // G5-2b: 0.78·29000/100^1.5 = 22.62; 0.6·50 = 30.
  it('takes G5-2a where it gives more', () => {
    // 1.60·29000/(√(500/20)·100^1.25) = 46400/(5·316.2278) = 29.34594; Vn = 29.34594·12.4/2 = 181.9448.
    const { r, Fcr } = run('500 in');
    near(Fcr, 29.34594);
    near(inUnit(valueAt(r, 'G5/x/Vn'), 'kip'), 181.9448);
  });
  it('takes G5-2b where that gives more', () => {
    // G5-2a at 1000 in: 46400/(7.071068·316.2278) = 20.75071.
    near(run('1000 in').Fcr, 22.62);
  });
  it('is limited by yielding', () => {
    // G5-2a at 100 in: 46400/(2.236068·316.2278) = 65.62.
    near(run('100 in').Fcr, 30);
  });
  it('without the length in shear takes G5-2b alone, the safe one, and says so', () => {
    const { r, Fcr } = run(null);
    near(Fcr, 22.62);
    expect(noticesOf(r)).toEqual(['note: length-in-shear-not-given']);
  });
});

describe('G6 minor axis', () => {
  it('adds the two flanges of a singly symmetric I-shape', () => {
    const r = createRecorder('');
    const flange = (b: string, t: string, lambda: string, n: string) => {
      const q = quantities(r, { [`b${n}`]: b, [`t${n}`]: t, [`lambda${n}`]: lambda });
      return { b: q[`b${n}`], t: q[`t${n}`], lambda: q[`lambda${n}`] };
    };
    const section = {
      ...sectionOf(r, { kind: 'mono-i', made: 'built-up' }),
      top: flange('21 in', '0.3 in', '35', '1'),
      bottom: flange('8 in', '0.5 in', '8', '2'),
    } as ReturnType<typeof sectionOf>;
    shearStrength(r, 'LRFD', steelOf(r, STEEL), section, 'y');
    // kv = 1.2: 1.10·√(1.2·580) = 29.01999 < 35 ≤ 1.37·√696 = 36.14308; Cv2 = 0.8291427.
    // Vn = 0.6·50·(21·0.3·0.8291427 + 8·0.5·1) = 156.7080 + 120 = 276.7080.
    near(valueAt(r, 'G6/y/top/Cv2'), 0.8291427);
    near(inUnit(valueAt(r, 'G6/y/Vn'), 'kip'), 276.708);
  });
});

describe('the shear check', () => {
  it('divides the magnitude by the strength, and takes no negative one', () => {
    const r = createRecorder(':');
    const { V, N, Z, Vc } = quantities(r, {
      ...{ V: '30 kip', N: '-30 kip', Z: '0 kip', Vc: '40 kip' },
    });
    expect(shearCheck(r, 'x', V, Vc)).toMatchObject({ key: 'G/x/check', ratio: 0.75 });
    expect(() => shearCheck(r, 'y', N, Vc)).toThrow(/negative/);
    expect(shearCheck(r, 'y', Z, Vc)).toMatchObject({ ratio: 0, verdict: 'OK' });
  });
});

describe('D2 with what is given of the net section', () => {
  const run = (steel: Texts, net: 'none' | Texts) => {
    const r = createRecorder('');
    const section = sectionOf(r, { kind: 'i', A: '10 in²' });
    const given = net === 'none' ? null : (quantities(r, net) as never);
    return {
      r,
      found: tensionStrength(r, 'LRFD', steelOf(r, { ...STEEL, ...steel }), section, given),
    };
  };
  const Fu = { Fu: '65 ksi' };
  it('takes yielding where rupture gives more', () => {
    // 0.90·50·10 = 450 < 0.75·65·9.5 = 463.125.
    const { found } = run(Fu, { Ae: '9.5 in²' });
    near(inUnit(found.Pc?.value ?? 0, 'kip'), 450);
    near(inUnit(found.rupture?.value ?? 0, 'kip'), 463.125);
  });
  it('has yielding alone, outside scope, without net section or Fu', () => {
    for (const { r, found } of [run(Fu, 'none'), run({}, { Ae: '9 in²' }), run({}, 'none')]) {
      near(inUnit(found.yielding.value, 'kip'), 450);
      expect(found).toMatchObject({ rupture: null, Pc: null });
      expect(noticesOf(r)).toEqual(['outside scope: net-section-not-given']);
    }
  });
  it('refuses a net section above the gross one', () => {
    for (const net of [
      { Ae: '10.1 in²' },
      { An: '10.1 in²', U: '0.8' },
      { An: '9 in²', U: '1.1' },
    ]) {
      const { r, found } = run(Fu, net as Texts);
      expect(found.Pc).toBeNull();
      expect(noticesOf(r)).toEqual(['failed: net-section-above-gross']);
    }
  });
  it('takes the whole section with U = 1', () => {
    near(inUnit(run(Fu, { An: '10 in²', U: '1' }).found.Pc?.value ?? 0, 'kip'), 450);
  });
});

describe('H1.2 flexure and tension', () => {
  it('combines by the equations of H1.1 and cites H1.2', () => {
    const r = createRecorder(':');
    const q = quantities(r, {
      ...{ P: '-120 kip', Pc: '400 kip', Mrx: '100 kip ft', Mcx: '250 kip ft' },
    });
    const Pr = requiredTension(r, q.P);
    near(inUnit(Pr.value, 'kip'), 120);
    const checks = interactionChecks(r, { Pr, Pc: q.Pc }, { Mr: q.Mrx, Mc: q.Mcx }, null, 'H1.2');
    // 120/400 + 8/9·100/250 = 0.3 + 0.3555556 = 0.6555556.
    near(valueAt(r, 'H1/ratio'), 0.6555556);
    expect(checks.map((c) => [c.key, c.title, c.clause?.clause, c.clause?.equation])).toEqual([
      ['H1/check', 'Flexure and tension', 'H1.2', 'H1-1a'],
      ['H1/axial', 'Tension alone', 'D2', null],
      ['H1/x', 'Major-axis flexure alone', 'F1', null],
    ]);
    expect(lineAt(r, 'H1/ratio').clause).toMatchObject({ clause: 'H1.2', equation: 'H1-1a' });
  });
  const raised = (symmetry: Parameters<typeof increasedCb>[1]['symmetry']) => {
    const r = createRecorder(':');
    // W14×99 over 14 ft, ASD.
    const q = quantities(r, {
      ...{ Cb: '1.14', alpha: '1.6', Pr: '267 kip', E: '29000 ksi', Iy: '402 in⁴', Lb: '168 in' },
    });
    return { r, Cb: increasedCb(r, { ...q, symmetry }) };
  };
  it('raises Cb for a doubly symmetric section', () => {
    const { r, Cb } = raised('a doubly symmetric section');
    // Pey = π²·29000·402/168² = 4076.667; √(1 + 1.6·267/4076.667) = 1.051091; ·1.14 = 1.198243.
    near(inUnit(valueAt(r, 'H1.2/Pey'), 'kip'), 4076.667);
    near(Cb.value, 1.198243);
    expect(equationAt(r, 'H1.2/Pey')).toBe('H1-2');
  });
  it('leaves it for any other', () => {
    expect(raised('a singly symmetric section').Cb.value).toBe(1.14);
  });
});

describe('H1.3 on W12×79, 20 ft, LRFD', () => {
  /*
   * A = 23.2, rx = 5.34, ry = 3.05, Sx = 107, Zx = 119, J = 3.84, ho = 11.7, rts = 3.43, Sy = 35.8,
   * Zy = 54.3 in inches (AISC Shapes Database v15.0), Lc = Lb = 240 in, Cb = 1.25.
   * x: Fe = π²·29000/44.9438² = 141.6961, Fn = 0.658^(50/141.6961)·50 = 43.13480, φPn = 900.6545 kip.
   * y: Fe = π²·29000/78.6885² = 46.22479, Fn = 31.79437, φPn = 663.8665 kip.
   * φMp = 0.90·50·119/12 = 446.25 kip ft. Lp = 129.2786, Lr = 478.5138 in:
   * Mn = 5950 − (5950 − 0.7·50·107)·(240 − 129.2786)/(478.5138 − 129.2786) = 5250.927 kip in,
   * φMn = 393.8196 kip ft at Cb = 1; at 1.25 φMp governs. φMny = 0.90·50·54.3/12 = 203.625 kip ft.
   */
  const TEXTS = {
    ...{ lambdaf: '8.22', lambdap: '9.151612', lambdaw: '20.7', lambdapw: '90.55279' },
    ...{ Lcy: '240 in', Lcz: '240 in', Pr: '300 kip', Pc: '663.8665 kip', Pcx: '900.6545 kip' },
    ...{ Mrx: '220 kip ft', Mcx: '446.25 kip ft', Mp: '446.25 kip ft', Mcx1: '393.8196 kip ft' },
    ...{ Cb: '1.25', Mry: '4 kip ft', Mcy: '203.625 kip ft' },
  };
  const run = (
    over: Partial<Record<keyof typeof TEXTS, string>>,
    more: Partial<SingleAxis> = {},
  ) => {
    const r = createRecorder(':');
    const q = quantities(r, { ...TEXTS, ...over });
    const checks = singleAxisChecks(r, {
      shape: 'a doubly symmetric rolled I-shape',
      flange: { lambda: q.lambdaf, lambdap: q.lambdap },
      web: { lambda: q.lambdaw, lambdap: q.lambdapw },
      ...{ Lcy: q.Lcy, Lcz: q.Lcz, Pr: q.Pr, Pc: q.Pc, Pcx: q.Pcx, Pcy: q.Pc },
      x: { Mr: q.Mrx, Mc: q.Mcx },
      ...{ yielding: q.Mp, Mcx1: q.Mcx1, Cb: q.Cb },
      y: { Mr: q.Mry, Mc: q.Mcy },
      ...more,
    });
    return { r, checks };
  };
  it('checks in the plane and out of it, with H1.1 beside', () => {
    const { r, checks } = run({});
    // In the plane: 300/900.6545 = 0.3330911 ≥ 0.2: + 8/9·(220/446.25 + 4/203.625) = 0.7887721.
    near(valueAt(r, 'H1.3/in-plane'), 0.7887721);
    // Out of it: p = 300/663.8665 = 0.4518981: p·(1.5 − 0.5·p) = 0.5757412;
    // (220/(1.25·393.8196))² = 0.1997242: 0.7754654.
    near(valueAt(r, 'H1.3/out-of-plane'), 0.7754654);
    // H1.1: 0.4518981 + 8/9·(220/446.25 + 4/203.625) = 0.9075791; 0.7887721/0.9075791 − 1 = −0.1309054.
    near(valueAt(r, 'H1/ratio'), 0.9075791);
    const comparison = lineAt(r, 'H1.3/comparison');
    near(comparison.kind === 'comparison' ? comparison.difference : 0, -0.1309054);
    expect(checks?.map((c) => [c.key, c.clause?.clause, c.clause?.equation])).toEqual([
      ['H1.3/in-plane', 'H1.3', 'H1-1a'],
      ['H1.3/out-of-plane', 'H1.3', 'H1-3'],
      ['H1/axial', 'E1', null],
      ['H1/x', 'F1', null],
      ['H1/y', 'F1', null],
    ]);
  });
  it('takes the yielding strength in the plane where buckling limits H1.1', () => {
    // Cb = 1: in the plane as before; out of it 0.5757412 + (220/393.8196)² = 0.8878102;
    // H1.1: 0.4518981 + 8/9·(220/393.8196 + 4/203.625) = 0.9659206.
    const { r } = run({ Cb: '1', Mcx: '393.8196 kip ft' });
    near(valueAt(r, 'H1.3/in-plane'), 0.7887721);
    near(valueAt(r, 'H1.3/out-of-plane'), 0.8878102);
    near(valueAt(r, 'H1/ratio'), 0.9659206);
  });
  it('prints what follows, at small utilisations too', () => {
    expect(faultsOf(run({}).r)).toEqual([]);
    expect(faultsOf(run({ Pr: '31.7 kip', Mrx: '11.3 kip ft', Mry: '0.37 kip ft' }).r)).toEqual([]);
  });
  it('says NOT OK by compression alone where H1-3 has fallen again', () => {
    // p = 1992/663.8665 = 3.000603: p·(1.5 − 0.5·p) < 0.
    const { checks } = run({ Pr: '1992 kip' });
    const verdicts = new Map(checks?.map((c) => [c.key, c.verdict]));
    expect(verdicts.get('H1.3/out-of-plane')).toBe('OK');
    expect(verdicts.get('H1/axial')).toBe('NOT OK');
  });
  it('needs no minor-axis moment', () => {
    const { r, checks } = run({}, { y: null });
    // 0.3330911 + 8/9·220/446.25 = 0.7713108.
    near(valueAt(r, 'H1.3/in-plane'), 0.7713108);
    expect(checks).toHaveLength(4);
  });
  it('applies up to a minor-axis moment of 5 %: 10.13/203.625 = 0.049748', () => {
    expect(run({ Mry: '10.13 kip ft' }).checks).not.toBeNull();
  });
  for (const [what, over, more] of [
    ['a minor-axis moment of 5 % or more', { Mry: '10.18125 kip ft' }, {}],
    ['a noncompact flange', { lambdaf: '9.2' }, {}],
    ['a noncompact web', { lambdaw: '91' }, {}],
    ['a longer torsional length', { Lcz: '241 in' }, {}],
    ['no compression', { Pr: '0 kip' }, {}],
    ['another shape', {}, { shape: 'another shape' }],
  ] as const)
    it(`does not apply with ${what}`, () => {
      const { r, checks } = run(over, more);
      expect(checks).toBeNull();
      expect(r.lines.some((l) => l.key.startsWith('H1/'))).toBe(false);
    });
});

describe('H2 on a channel with signs', () => {
  /*
   * C12×20.7: A = 6.08 in², Sx = 21.5, Sy = 2.05 at the toes; at the back of the web Iy/x̄ =
   * 3.86/0.698 = 5.530086 in³ (AISC Shapes Database v15.0). Pc = 90 kip, Mcx = 60 kip ft; the available
   * minor-axis moment is 6 kip ft for the toes and 8 kip ft for the back (taken as given).
   * Mrx = 15 kip ft compresses the top, Mry = 2 kip ft the toes.
   */
  const run = (P: string) => {
    const r = createRecorder(':');
    const q = quantities(r, {
      ...{ P, Pc: '90 kip', A: '6.08 in²', Mrx: '15 kip ft', Mcx: '60 kip ft', Mry: '2 kip ft' },
      ...{ McToe: '6 kip ft', McBack: '8 kip ft' },
      ...{ top: '21.5 in³', bottom: '-21.5 in³', toe: '2.05 in³', back: '-5.530086 in³' },
    });
    const x = (S: 'top' | 'bottom') => ({ Mr: q.Mrx, S: q[S], Mc: q.Mcx });
    const y = (S: 'toe' | 'back') => ({ Mr: q.Mry, S: q[S], Mc: S === 'toe' ? q.McToe : q.McBack });
    const points = (['top', 'bottom'] as const).flatMap((v) =>
      (['toe', 'back'] as const).map((h) => ({
        ...{ name: `${v}-${h}`, title: `${v} flange, ${h}`, x: x(v), y: y(h) },
      })),
    );
    return { r, checks: stressInteractionChecks(r, { Pr: q.P, Pc: q.Pc, Ag: q.A }, points) };
  };
  it('adds compression and flexure with their signs', () => {
    const { r, checks } = run('30 kip');
    // fra/Fca = (30/6.08)/(90/6.08) = 1/3; x: ±15/60 = ±0.25; y: 2/6 = +1/3 at the toes, −2/8 at the back.
    near(inUnit(valueAt(r, 'H2/fra'), 'ksi'), 4.934211);
    // −2·12/5.530086 = −4.339897; 8·12/5.530086 = 17.35959.
    near(inUnit(valueAt(r, 'H2/top-back/frbz'), 'ksi'), -4.339897);
    near(inUnit(valueAt(r, 'H2/top-back/Fcbz'), 'ksi'), 17.35959);
    near(valueAt(r, 'H2/top-toe/ratio'), 0.9166667);
    near(valueAt(r, 'H2/top-back/ratio'), 0.3333333);
    near(valueAt(r, 'H2/bottom-toe/ratio'), 0.4166667);
    near(valueAt(r, 'H2/bottom-back/ratio'), 0.1666667);
    expect(checks.map((c) => c.key)).toEqual(['H2/check']);
    near(valueAt(r, 'H2/check'), 0.9166667);
    expect(lineAt(r, 'H2/ratio')).toMatchObject({ governs: ':H2/top-toe/ratio' });
  });
  it('finds another point governing in tension', () => {
    const { r } = run('-30 kip');
    // −1/3 + 0.25 + 1/3 = 0.25 at the toe on top; |−1/3 − 0.25 − 0.25| = 0.8333333 at the back below.
    near(valueAt(r, 'H2/top-toe/ratio'), 0.25);
    near(valueAt(r, 'H2/check'), 0.8333333);
    expect(lineAt(r, 'H2/ratio')).toMatchObject({ governs: ':H2/bottom-back/ratio' });
  });
  it('prints what follows, at small utilisations too', () => {
    // 1.37/90 = 0.01522: less than 0.1 at the back of the web.
    for (const P of ['30 kip', '-30 kip', '1.37 kip']) expect(faultsOf(run(P).r)).toEqual([]);
    const r = createRecorder(':');
    const q = quantities(r, {
      ...{ P: '1.37 kip', Pc: '90 kip', A: '6.08 in²', M: '2.9 kip ft', S: '21.5 in³' },
      Mc: '60 kip ft',
    });
    const point = { name: 'top', title: 'top', x: { Mr: q.M, S: q.S, Mc: q.Mc }, y: null };
    stressInteractionChecks(r, { Pr: q.P, Pc: q.Pc, Ag: q.A }, [point]);
    // 1.37/90 + 2.9/60 = 0.06355556.
    near(valueAt(r, 'H2/check'), 0.06355556);
    expect(faultsOf(r)).toEqual([]);
  });
  it('writes no check where nothing combines', () => {
    const r = createRecorder(':');
    const q = quantities(r, { M: '15 kip ft', S: '21.5 in³', Mc: '60 kip ft' });
    const point = { name: 'top', title: 'top flange', x: { Mr: q.M, S: q.S, Mc: q.Mc }, y: null };
    expect(stressInteractionChecks(r, null, [point])).toEqual([]);
  });
});
