import { describe, expect, it } from 'vitest';
import { isValued, type Line } from '../calc/line.ts';
import type { CombinationRecord, MemberRecord } from '../calc/record.ts';
import { parseInput } from '../members/parse-input.ts';
import { runCalculation } from '../members/run.ts';
import { bayCurve } from './bay-curve.ts';
import type { BayDrawing, LoadDrawing, MemberDrawing } from './drawing.ts';
import { alongScale } from './frame.ts';
import { interactionDiagram } from './interaction-diagram.ts';
import { memberScene } from './member-scene.ts';
import { momentDiagram } from './moment-diagram.ts';
import { boxOf } from './place-labels.ts';
import { shearAlong, valueAt } from './plane-curves.ts';
import { readInteraction } from './read-interaction.ts';
import { readMember } from './read-member.ts';
import type { Scene, Shape } from './scene.ts';
import { shearDiagram } from './shear-diagram.ts';

const CONTINUOUS = {
  mark: 'T1',
  section: 'W14X48',
  length: '30 ft',
  restraints: [
    { at: '10 ft', holds: ['top'] },
    { at: '15 ft', holds: ['in-plane', 'centre', 'twist'] },
    { at: '22 ft', holds: ['bottom'] },
  ],
};
const LOADED = {
  ...{ name: 'loaded', P: '120 kip', MxA: '60 kip ft', MxB: '-30 kip ft' },
  supports: [{ at: '15 ft', Mx: '-45 kip ft' }],
  loads: [
    { kind: 'point', bends: 'x', W: '14 kip', at: '6 ft', height: 'centre' },
    { kind: 'uniform', bends: 'x', w: '0.4 kip/ft', height: 'top' },
    ...[{ kind: 'linear', bends: 'x', wFrom: '0.6 kip/ft', wTo: '-0.3 kip/ft', height: 'bottom' }],
    ...[
      {
        kind: 'uniform',
        bends: 'x',
        w: '-0.5 kip/ft',
        from: '17 ft',
        to: '20 ft',
        height: 'centre',
      },
    ],
  ],
};
const PULLED = { ...LOADED, name: 'pulled', P: '-30 kip' };

function run(
  member: object,
  combinations: readonly object[],
  more: { readonly units?: string; readonly secondOrder?: string } = {},
): { member: MemberRecord; drawings: MemberDrawing[]; units: 'us' | 'si' } {
  const parsed = parseInput({
    ...{ format: 1, standard: 'aisc360-22', design: 'LRFD', units: more.units ?? 'us' },
    analysis: { method: 'direct', secondOrder: more.secondOrder ?? 'exact', sway: 'none' },
    members: [
      {
        material: 'A992',
        ends: 'held',
        Cb: 'auto',
        endMomentSign: 'bending',
        ...member,
        combinations,
      },
    ],
  });
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  const record = runCalculation(parsed.input);
  const [made] = record.members;
  if (!made) throw new Error('no member');
  const drawings = made.combinations.map((c) => {
    const drawing = readMember(made, c, record.units);
    if (!drawing) throw new Error('no drawing');
    return drawing;
  });
  return { member: made, drawings, units: record.units };
}

const textsOf = (scene: Scene): string[] =>
  scene.shapes.flatMap((s) => (s.kind === 'text' ? [s.text] : []));

/** No two texts of a scene lie on each other, and none leaves the frame. */
function readable(scene: Scene): void {
  const boxes = scene.shapes.flatMap((s) => (s.kind === 'text' ? [{ ...boxOf(s), s }] : []));
  for (const [i, a] of boxes.entries()) {
    expect(a.left, a.s.text).toBeGreaterThan(-3);
    expect(a.right, a.s.text).toBeLessThan(scene.width + 3);
    expect(a.bottom, a.s.text).toBeLessThanOrEqual(scene.height + 1);
    for (const b of boxes.slice(i + 1)) {
      const across = Math.min(a.right, b.right) - Math.max(a.left, b.left);
      const down = Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top);
      // The boxes hold a margin of 2 on either side.
      expect(across > 4 && down > 0.5, `${a.s.text} on ${b.s.text}`).toBe(false);
    }
  }
}

const scenesOf = (drawing: MemberDrawing): Scene[] => [
  memberScene(drawing),
  ...drawing.planes
    .flatMap((plane) => [momentDiagram(drawing, plane), shearDiagram(drawing, plane)])
    .filter((scene) => scene !== null),
];

const valueAtKey = (lines: readonly Line[], key: string): number => {
  const line = lines.find((l) => l.key === key);
  if (!line || !isValued(line)) throw new Error(`no value ${key}`);
  return line.value;
};

describe('the curves of a record', () => {
  const { drawings, member } = run(CONTINUOUS, [LOADED, PULLED]);
  const [drawing, pulled] = drawings as [MemberDrawing, MemberDrawing];
  const [combination] = member.combinations as [CombinationRecord];
  const [plane] = drawing.planes;
  if (!plane) throw new Error('no plane');

  it('go through the extremes and the moments at restraints that the sheet prints', () => {
    const { lines } = combination;
    const FT = 304.8;
    // Places of the node, the restraints and of what the sheet finds: worked by other formulas.
    const found: [bay: number, order: 'first' | 'second', z: number, M: number][] = [
      [0, 'second', 6 * FT, valueAtKey(lines, 'bay1/theory/x/M1')],
      [0, 'first', 6 * FT, valueAtKey(lines, 'bay1/theory/x/first/M1')],
      [0, 'second', 10 * FT, valueAtKey(lines, 'F1/r1/M')],
      [1, 'second', 7 * FT, valueAtKey(lines, 'F1/r3/M')],
      [1, 'second', 2 * FT, valueAtKey(lines, 'bay2/theory/x/M1')],
      [1, 'second', 5 * FT, valueAtKey(lines, 'bay2/theory/x/M2')],
      [1, 'first', 5 * FT, valueAtKey(lines, 'bay2/theory/x/first/M2')],
    ];
    const marks = [...(plane.largest ? [plane.largest] : []), ...plane.extremes];
    expect(marks.length).toBeGreaterThanOrEqual(2);
    for (const { place, value } of marks) {
      const bay = plane.bays.findIndex(({ to }) => place.value <= to);
      found.push([bay, 'second', place.value - (plane.bays[bay]?.from ?? 0), value]);
    }
    for (const [index, order, z, M] of found) {
      const bay = plane.bays[index] as BayDrawing;
      const curve = bayCurve(bay, plane.loads, order === 'first' ? 0 : (bay.kL ?? 0), false);
      expect(Math.abs((curve?.moment(z) ?? 0) / M - 1), `${index} ${order} ${z}`).toBeLessThan(
        1e-3,
      );
    }
  });

  it('have the shear that the sheet prints at the ends of bays', () => {
    const samples = shearAlong(plane, drawing.length.value);
    for (const [i, bay] of plane.bays.entries()) {
      const key = `bay${i + 1}/theory/x/first`;
      const inside = 1e-4;
      const at = (z: number) => valueAt(samples, z);
      expect(at(bay.from + inside) / valueAtKey(combination.lines, `${key}/VA`)).toBeCloseTo(1, 3);
      expect(at(bay.to - inside) / valueAtKey(combination.lines, `${key}/VB`)).toBeCloseTo(1, 3);
    }
  });

  it('are those of first order in tension, and say so', () => {
    const [major] = pulled.planes;
    const scene = major && momentDiagram(pulled, major);
    if (!scene) throw new Error('no diagram');
    expect(textsOf(scene)).not.toContain('second order');
    expect(scene.description).toContain('In tension the first-order moments stand');
    expect(memberScene(pulled).description).toContain('axial tension P −30 kip');
    expect(major?.largest?.place.words).toBe('at 6 ft from A');
  });

  it('run through both bays and mark the largest with its text and place', () => {
    const scene = momentDiagram(drawing, plane);
    if (!scene) throw new Error('no diagram');
    const along = alongScale(drawing);
    const curve = scene.shapes.find((s) => s.kind === 'line' && s.stroke.width === 1.75);
    if (curve?.kind !== 'line') throw new Error('no curve');
    expect(curve.points[0]?.[0]).toBeCloseTo(along(0), 9);
    expect(curve.points.at(-1)?.[0]).toBeCloseTo(along(9144), 9);
    expect(textsOf(scene)).toContain(`${plane.largest?.text} at 6 ft from A`);
    expect(textsOf(scene)).toContain('−45 kip ft');
  });
});

describe('the curve of a bay', () => {
  const bay: BayDrawing = { from: 0, to: 8000, MA: 0, MB: 0, kL: 2 };
  const load = (start: number, end: number): LoadDrawing => ({
    ...{ name: 'load 1', height: 'centre', heightWords: '', kind: 'line', reach: '' },
    ...{ from: 0, to: 8000 },
    ...{ start: { value: start, text: '' }, end: { value: end, text: '' } },
  });

  it('has w L² (sec kL/2 − 1)/(kL)² in the middle of a uniform load, sech in tension', () => {
    // Timoshenko and Gere, Theory of Elastic Stability, chapter 1; tension its continuation.
    const moment = (tension: boolean) => bayCurve(bay, [load(5, 5)], 2, tension)?.moment(4000);
    expect(moment(false)).toBeCloseTo((5 * 8000 ** 2 * (1 / Math.cos(1) - 1)) / 4, 3);
    expect(moment(true)).toBeCloseTo((5 * 8000 ** 2 * (1 - 1 / Math.cosh(1))) / 4, 3);
  });

  it('tends to the first order without a step as the force vanishes', () => {
    for (const tension of [false, true])
      for (const kL of [1e-6, 1e-3, 3e-3, 1e-2]) {
        const near = bayCurve(bay, [load(0, 6)], kL, tension)?.moment(5000) ?? 0;
        // Triangle from 0 at A: w (L² z − z³)/(6 L), by equilibrium.
        const first = (6 * (8000 ** 2 * 5000 - 5000 ** 3)) / (6 * 8000);
        expect(Math.abs(near / first - 1)).toBeLessThan(kL ** 2 / 5 + 1e-9);
      }
  });

  it('does not notice a force over its end', () => {
    const at = (z: number): LoadDrawing => ({
      ...{ name: 'load 1', height: 'centre', heightWords: '', kind: 'point' },
      ...{ force: { value: 1e5, text: '' }, at: { value: z, text: '' } },
    });
    for (const z of [0, 8000]) expect(bayCurve(bay, [at(z)], 2, false)?.moment(3000)).toBe(0);
  });
});

describe('the drawn member', () => {
  const { drawings } = run(CONTINUOUS, [LOADED], { secondOrder: 'amplified' });
  const [drawing] = drawings as [MemberDrawing];
  const scene = memberScene(drawing);
  const along = alongScale(drawing);
  const body = scene.shapes.find((s) => s.kind === 'area' && s.points.length === 4);
  if (body?.kind !== 'area') throw new Error('no body');
  const ys = body.points.map((p) => p[1]);
  const [top, bottom] = [Math.min(...ys), Math.max(...ys)];
  const linesOf = (width: number): Extract<Shape, { kind: 'line' }>[] =>
    scene.shapes.flatMap((s) => (s.kind === 'line' && s.stroke.width === width ? [s] : []));

  it('has a cross at the face that is held, at its place', () => {
    const middles = linesOf(1.5)
      .filter((l) => l.stroke.ink === 'ink')
      .map(({ points: [a = [0, 0], b = [0, 0]] }) => [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2]);
    const has = (feet: number, y: number) =>
      middles.some(
        ([mx = 0, my = 0]) => Math.abs(mx - along(feet * 304.8)) < 1e-6 && Math.abs(my - y) < 1e-6,
      );
    expect(has(10, top)).toBe(true);
    expect(has(15, (top + bottom) / 2)).toBe(true);
    expect(has(22, bottom)).toBe(true);
    expect(has(10, bottom)).toBe(false);
  });

  it('has a force that points down to the centre where it acts there', () => {
    const tip = scene.shapes.flatMap((s) =>
      s.kind === 'area' && s.fill === 'oxide' ? [s.points[0] ?? [0, 0]] : [],
    );
    const at = tip.filter(([x]) => Math.abs(x - along(6 * 304.8)) < 1e-6).map(([, y]) => y);
    expect(at.some((y) => Math.abs(y - (top + bottom) / 2) < 1e-6)).toBe(true);
    expect(textsOf(scene)).toContain('14 kip at 6 ft');
    expect(textsOf(scene)).toContain('0.4 kip/ft, top');
  });

  it('says all of it in words', () => {
    for (const words of [
      'restraint r1 at 10 ft from A holds laterally at the top flange',
      'restraint r2 at 15 ft from A holds in the plane of major-axis bending',
      'load 1, bending about x: 14 kip at 6 ft from A, at the shear centre',
      'load 3, bending about x: 0.6 kip/ft at its start, −0.3 kip/ft at its end',
      'load 4, bending about x: −0.5 kip/ft from 17 ft to 20 ft',
      'moment about x over r2 −45 kip ft',
      'Lcx from A in pieces',
    ])
      expect(scene.description).toContain(words);
  });

  it('has bays and segments to scale in place, the governing segment marked', () => {
    const heavy = run(
      {
        ...CONTINUOUS,
        section: 'W14X22',
        length: '24 ft',
        restraints: [{ at: '8 ft', holds: ['top'] }],
      },
      [
        {
          ...{ name: 'loaded', P: '10 kip' },
          loads: [{ kind: 'uniform', bends: 'x', w: '0.2 kip/ft', height: 'centre' }],
        },
      ],
    ).drawings[0] as MemberDrawing;
    // The second segment is twice as long and holds the middle of the member.
    const chain = heavy.chains.find(({ symbol }) => symbol === 'Lb');
    expect(chain?.pieces.map((p) => Math.round(p.value / 3.048) / 100)).toEqual([8, 16]);
    expect(chain?.governs).toBe(1);
    const drawn = memberScene(heavy);
    const marked = drawn.shapes.find(
      (s) => s.kind === 'line' && s.stroke.ink === 'oxide' && s.stroke.width === 2,
    );
    if (marked?.kind !== 'line') throw new Error('no mark');
    const scale = alongScale(heavy);
    const [from, to] = marked.points;
    expect(from?.[0]).toBeCloseTo(scale(8 * 304.8), 6);
    expect(to?.[0]).toBeCloseTo(scale(24 * 304.8), 6);
    expect(textsOf(drawn)).toContain('segment 2 governs');
  });
});

describe('nothing lies on anything else', () => {
  const every = (count: number, step: number, holds: readonly string[]) =>
    Array.from({ length: count }, (_, i) => ({ at: `${(i + 1) * step} m`, holds }));
  const point = (at: number, W: string) => ({
    ...{ kind: 'point', bends: 'x', W, at: `${at} m`, height: 'top' },
  });
  const members: readonly (readonly [string, object, readonly object[]])[] = [
    ['continuous', CONTINUOUS, [LOADED, PULLED]],
    [
      'five spans',
      {
        mark: 'N1',
        section: 'W18X50',
        length: '20 m',
        restraints: every(4, 4, ['in-plane', 'bottom']),
      },
      [
        {
          ...{ name: 'loaded', P: '150 kN' },
          supports: [4, 8, 12, 16].map((z) => ({ at: `${z} m`, Mx: '-30.25 kN m' })),
          loads: [
            { kind: 'uniform', bends: 'x', w: '18 kN/m', height: 'top' },
            point(18, '25 kN'),
            { kind: 'uniform', bends: 'x', w: '-5 kN/m', from: '1 m', to: '3 m', height: 'bottom' },
          ],
        },
      ],
    ],
    [
      'many forces',
      { mark: 'N2', section: 'HSS10X6X3/8', material: 'A500 Gr. C', length: '9 m', restraints: [] },
      [
        { name: 'few', P: '0 kN', loads: [3, 4.5, 6].map((z) => point(z, '12.5 kN')) },
        {
          ...{ name: 'thirty', P: '200 kN' },
          loads: Array.from({ length: 29 }, (_, i) => point(0.3 * (i + 1), '5.25 kN')),
        },
      ],
    ],
    [
      'purlins',
      { mark: 'N3', section: 'W12X26', length: '9 m', restraints: every(17, 0.5, ['top']) },
      [
        {
          ...{ name: 'gravity', P: '50 kN', MxA: '-60 kN m', MyA: '2 kN m' },
          loads: [{ kind: 'uniform', bends: 'x', w: '12 kN/m', height: 'top' }],
        },
      ],
    ],
    [
      'pipe',
      { mark: 'N4', section: 'Pipe8STD', material: 'A53 Gr. B', length: '3 m', restraints: [] },
      [{ name: 'bare', P: '-40 kN', MxA: '20 kN m', MyB: '-10 kN m' }],
    ],
  ];
  it.each(members)('%s', (_, member, combinations) => {
    for (const drawing of run(member, combinations, { units: 'si' }).drawings)
      for (const scene of scenesOf(drawing)) readable(scene);
  });
});

describe('the interaction diagram', () => {
  it('has the point of the segment that governs, tension below the line of zero', () => {
    const { member } = run(
      {
        ...CONTINUOUS,
        netSection: { Ae: '12 in²' },
        restraints: [{ at: '15 ft', holds: ['centre', 'twist'] }],
      },
      [
        { name: 'pushed', P: '100 kip', MxA: '20 kip ft', MxB: '90 kip ft' },
        { name: 'pulled', P: '-50 kip', MxA: '90 kip ft', MxB: '20 kip ft' },
      ],
    );
    const points = readInteraction(member);
    expect(points.map((p) => p.segment)).toEqual(['2', '1']);
    expect(points.map((p) => Math.sign(p.axial))).toEqual([1, -1]);
    const scene = interactionDiagram(points);
    if (!scene) throw new Error('no diagram');
    readable(scene);
    expect(textsOf(scene)).toContain('tension');
    expect(scene.description).toMatch(/pulled [\d.]+, segment 1, in tension/);
    const limit = scene.shapes.find((s) => s.kind === 'line' && s.stroke.width === 1.5);
    if (limit?.kind !== 'line') throw new Error('no limit');
    // H1.2: the same lines for tension, so the corner at 0.2 is mirrored.
    const [, corner, , mirrored] = limit.points;
    expect(mirrored?.[0]).toBeCloseTo(corner?.[0] ?? 0, 9);
  });
});
