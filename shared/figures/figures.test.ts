import { describe, expect, it } from 'vitest';
import { bayCurve } from './bay-curve.ts';
import type { InteractionPoint, MemberDrawing, NamedDrawn, PlaneDrawing } from './drawing.ts';
import { interactionDiagram } from './interaction-diagram.ts';
import { memberScene } from './member-scene.ts';
import { momentDiagram } from './moment-diagram.ts';
import type { Point, Scene, Shape } from './scene.ts';
import { sectionDrawing } from './section-drawing.ts';
import { sectionOutline } from './section-outline.ts';
import { textWidth } from './shapes.ts';

const named = (symbol: string, value: number, text: string): NamedDrawn => ({
  symbol,
  value,
  text,
});

const plane = ({
  kL = 1.2,
  ...over
}: Partial<PlaneDrawing> & { kL?: number | null } = {}): PlaneDrawing => {
  const { endA, endB } = {
    endA: named('MxA', 118e6, '118 kip ft'),
    endB: named('MxB', 104e6, '104 kip ft'),
    ...over,
  };
  return {
    ...{ plane: 'major', endA, endB, supports: [], loads: [], tension: false, swayed: false },
    bays: [{ from: 0, to: 6000, MA: endA.value, MB: endB.value, kL }],
    largest: {
      ...named('Mmax', 134.4e6, '134.4 kip ft'),
      crest: true,
      place: { value: 2800, words: 'at 9.2 ft' },
    },
    ...{ extremes: [], required: [], shear: null },
    ...over,
  };
};

const member = (over: Partial<MemberDrawing> = {}): MemberDrawing => ({
  mark: 'C-07',
  section: 'W12×79',
  length: { value: 6000, text: '6 m' },
  depth: 315,
  width: 307,
  lengths: [named('Lcx', 6000, '6 m'), named('Lcz', 3000, '3 m'), named('Lb', 1500, '1.5 m')],
  chains: [],
  held: [],
  axial: named('P', 1379e3, '310 kip'),
  planes: [plane()],
  ...over,
});

const coordinates = (shape: Shape): number[] => {
  switch (shape.kind) {
    case 'line':
    case 'area':
      return shape.points.flat();
    case 'circle':
      return [...shape.center, shape.radius];
    case 'arc':
      return [...shape.center, shape.radius, shape.from, shape.to];
    case 'text':
      return [...shape.at, shape.size];
  }
};

const texts = (scene: Scene): string[] =>
  scene.shapes.flatMap((s) => (s.kind === 'text' ? [s.text] : []));

const sound = (scene: Scene): void => {
  expect(scene.shapes.flatMap(coordinates).every(Number.isFinite)).toBe(true);
  expect(scene.description.length).toBeGreaterThan(20);
  for (const shape of scene.shapes) {
    if (shape.kind === 'text') {
      const width = textWidth(shape.text, shape.size);
      const start = shape.at[0] - { start: 0, middle: width / 2, end: width }[shape.anchor];
      expect(start, shape.text).toBeGreaterThanOrEqual(0);
      expect(start + width, shape.text).toBeLessThanOrEqual(scene.width + 1e-9);
    }
    if (shape.kind !== 'line' && shape.kind !== 'area') continue;
    for (const [x, y] of shape.points) {
      expect(x).toBeGreaterThanOrEqual(0);
      expect(x).toBeLessThanOrEqual(scene.width);
      expect(y).toBeGreaterThanOrEqual(0);
      expect(y).toBeLessThanOrEqual(scene.height);
    }
  }
};

const areas = (scene: Scene, fill: string): (readonly Point[])[] =>
  scene.shapes.flatMap((s) => (s.kind === 'area' && s.fill === fill ? [s.points] : []));

const span = (values: readonly number[]): number => Math.max(...values) - Math.min(...values);

describe('member', () => {
  it('draws length and depth at one scale', () => {
    const scene = memberScene(member());
    sound(scene);
    const body = areas(scene, 'paper').find((points) => points.length === 4) ?? [];
    const [long, deep] = [span(body.map((p) => p[0])), span(body.map((p) => p[1]))];
    expect(long / deep).toBeCloseTo(6000 / 315, 6);
  });

  it('draws every length bar at the scale of the member', () => {
    const scene = memberScene(member());
    const bars = scene.shapes.flatMap((s) =>
      s.kind === 'line' &&
      s.stroke.ink === 'zinc5' &&
      s.points.length === 2 &&
      s.points[0]?.[1] === s.points[1]?.[1] &&
      s.points[0]?.[0] === 112
        ? [span(s.points.map((p) => p[0]))]
        : [],
    );
    const [whole = 0, half = 0, quarter = 0] = bars.sort((a, b) => b - a);
    expect(half / whole).toBeCloseTo(3000 / 6000, 9);
    expect(quarter / whole).toBeCloseTo(1500 / 6000, 9);
    expect(texts(scene)).toContain('L, Lcx');
  });

  it('turns the end arrows the way the signs say', () => {
    const tips = (a: number, b: number): number[] => {
      const p = plane({ endA: named('MxA', a, 'a'), endB: named('MxB', b, 'b') });
      const scene = memberScene(member({ planes: [p], axial: null }));
      return areas(scene, 'oxide').map((points) => points[0]?.[1] ?? 0);
    };
    const [upA = 0, upB = 0] = tips(1e6, 1e6);
    const [sameA = 0, downB = 0] = tips(1e6, -1e6);
    expect(upA).toBe(upB);
    expect(sameA).toBe(upA);
    expect(downB).toBeGreaterThan(upB);
  });

  it('points the axial arrows inwards for compression and outwards for tension', () => {
    const left = (force: number): number => {
      const scene = memberScene(member({ axial: named('P', force, 'P'), planes: [plane()] }));
      return areas(scene, 'oxide')[0]?.[0]?.[0] ?? 0;
    };
    expect(left(1)).toBeGreaterThan(left(-1));
    expect(memberScene(member({ axial: named('P', -1, '-1 kip') })).description).toContain(
      'tension',
    );
  });

  it('stays in its frame for buckling lengths above the length and for a stocky member', () => {
    sound(memberScene(member({ lengths: [named('Lcx', 12000, '12 m')] })));
    sound(memberScene(member({ length: { value: 600, text: '0.6 m' }, lengths: [] })));
    sound(memberScene(member({ depth: null, width: null, axial: null })));
  });

  it('draws the elevation of a member without moments', () => {
    const scene = memberScene(member({ planes: [] }));
    sound(scene);
    expect(texts(scene).some((t) => t.startsWith('elevation'))).toBe(true);
    expect(scene.description).not.toContain('moments');
  });

  it('draws the plan only where the minor axis bends', () => {
    const minor = (moment: number) =>
      plane({ plane: 'minor', endA: named('MyA', moment, 'm'), endB: named('MyB', 0, '0') });
    const labels = (moment: number) =>
      texts(memberScene(member({ planes: [plane(), minor(moment)] })));
    expect(labels(0).some((t) => t.startsWith('plan'))).toBe(false);
    expect(labels(5).some((t) => t.startsWith('plan'))).toBe(true);
  });
});

describe('moment diagram', () => {
  it('draws moments and places in proportion', () => {
    const scene = momentDiagram(member(), plane());
    if (!scene) throw new Error('no diagram');
    sound(scene);
    const dot = scene.shapes.find((s) => s.kind === 'circle');
    const first = scene.shapes.find((s) => s.kind === 'line' && s.stroke.dash);
    const base = scene.shapes.find((s) => s.kind === 'line' && s.stroke.ink === 'zinc5');
    if (dot?.kind !== 'circle' || first?.kind !== 'line' || base?.kind !== 'line')
      throw new Error('a part is missing');
    const [a, b] = first.points;
    const ground = base.points[0]?.[1] ?? 0;
    if (!a || !b) throw new Error('no first-order line');
    expect((ground - b[1]) / (ground - a[1])).toBeCloseTo(104 / 118, 9);
    expect((ground - dot.center[1]) / (ground - a[1])).toBeCloseTo(134.4 / 118, 9);
    expect((dot.center[0] - a[0]) / (b[0] - a[0])).toBeCloseTo(2800 / 6000, 9);
    expect(texts(scene)).toContain('134.4 kip ft at 9.2 ft');
  });

  it('crosses the axis in reverse curvature', () => {
    const reverse = plane({ endB: named('MxB', -104e6, '-104 kip ft'), largest: null });
    const scene = momentDiagram(member(), reverse);
    if (!scene) throw new Error('no diagram');
    sound(scene);
    expect(scene.description).toContain('reverse curvature');
  });

  it('has no second-order curve where there is no stable solution, and says so', () => {
    for (const kL of [null, Math.PI, 4, Number.NaN]) {
      const scene = momentDiagram(member(), plane({ kL, largest: null }));
      if (!scene) throw new Error('no diagram');
      expect(areas(scene, 'oxide2')).toHaveLength(0);
      expect(scene.description).toContain('no stable solution');
    }
  });

  it('is absent without moments', () => {
    const none = named('M', 0, '0 kip ft');
    expect(momentDiagram(member(), plane({ endA: none, endB: none }))).toBeNull();
  });
});

describe('second-order curve', () => {
  const curve = (kL: number) => {
    const found = bayCurve({ from: 0, to: 6000, MA: 100, MB: -40, kL }, [], kL, false);
    if (!found) throw new Error('no curve');
    return found.moment;
  };

  it('has the ends it was given and (MA + MB) / (2 cos kL/2) at mid-length', () => {
    // Timoshenko and Gere, Theory of Elastic Stability, chapter 1: the sum form at mid-length.
    const moment = curve(2);
    expect(moment(0)).toBeCloseTo(100, 9);
    expect(moment(6000)).toBeCloseTo(-40, 9);
    expect(moment(3000)).toBeCloseTo(60 / (2 * Math.cos(1)), 9);
  });

  it('is the straight line without axial force', () => {
    expect(curve(0)(1500)).toBeCloseTo(65, 9);
  });
});

describe('interaction diagram', () => {
  const point = (axial: number, moment: number, ratio: number): InteractionPoint => ({
    combination: `1.2D + ${ratio}`,
    segment: null,
    axial,
    moment,
    ratio,
    ratioText: ratio.toFixed(3),
  });

  it('puts the corners of H1-1a and H1-1b and the points at one scale', () => {
    const scene = interactionDiagram([point(0.45, 0.5, 0.894)]);
    if (!scene) throw new Error('no diagram');
    sound(scene);
    const limit = scene.shapes.find((s) => s.kind === 'line' && s.stroke.width === 1.5);
    const dot = scene.shapes.find((s) => s.kind === 'circle');
    if (limit?.kind !== 'line' || dot?.kind !== 'circle') throw new Error('a part is missing');
    const [top, corner, right] = limit.points;
    if (!top || !corner || !right) throw new Error('no envelope');
    // ANSI/AISC 360-22 H1.1: at Pr/Pc = 0.2 both equations leave 0.9 for the moments.
    expect((corner[0] - top[0]) / (right[0] - top[0])).toBeCloseTo(0.9, 9);
    expect((right[1] - corner[1]) / (right[1] - top[1])).toBeCloseTo(0.2, 9);
    expect((dot.center[0] - top[0]) / (right[0] - top[0])).toBeCloseTo(0.5, 9);
    expect((right[1] - dot.center[1]) / (right[1] - top[1])).toBeCloseTo(0.45, 9);
  });

  it('keeps points beyond the limit inside the frame and fills them with oxide', () => {
    const scene = interactionDiagram([point(2.4, 3, 4.2), point(0.1, 0.1, 0.15)]);
    if (!scene) throw new Error('no diagram');
    sound(scene);
    const fills = scene.shapes.flatMap((s) => (s.kind === 'circle' ? [s.fill] : []));
    expect(fills).toEqual(['oxide', 'ink']);
    expect(scene.description).toContain('over the limit');
  });

  it('lists the worst twelve and counts the rest', () => {
    const many = Array.from({ length: 15 }, (_, i) => point(0.02 * i, 0.1, 0.05 * i));
    const scene = interactionDiagram(many);
    expect(scene && texts(scene)).toContain('3 more, all lower');
    expect(interactionDiagram([])).toBeNull();
  });
});

it('draws the section at one scale', () => {
  const flange = {
    width: named('bf', 307.34, '12.1 in'),
    thickness: named('tf', 18.67, '0.735 in'),
  };
  const scene = sectionOutline({
    section: 'W12×79',
    form: 'i',
    depth: named('d', 314.96, '12.4 in'),
    top: flange,
    bottom: flange,
    web: named('tw', 11.94, '0.470 in'),
    centroid: 157.48,
  });
  sound(scene);
  const [outline = []] = areas(scene, 'zinc1');
  const [wide, tall] = [span(outline.map((p) => p[0])), span(outline.map((p) => p[1]))];
  expect(wide / tall).toBeCloseTo(307.34 / 314.96, 9);
  const [a, b, c] = outline;
  if (!a || !b || !c) throw new Error('no outline');
  expect((b[1] - a[1]) / tall).toBeCloseTo(18.67 / 314.96, 9);
  expect((a[0] - c[0]) / wide).toBeCloseTo((307.34 - 11.94) / 2 / 307.34, 9);
});

describe('the outline of', () => {
  const sizes = (all: Readonly<Record<string, number>>, section = 'a section') => {
    const drawing = sectionDrawing(section, (symbol) =>
      symbol in all ? named(symbol, all[symbol] ?? 0, `${all[symbol]} mm`) : null,
    );
    if (!drawing) throw new Error('no drawing');
    const scene = sectionOutline(drawing);
    sound(scene);
    return scene;
  };
  const xOf = (points: readonly Point[]) => span(points.map((p) => p[0]));
  const yOf = (points: readonly Point[]) => span(points.map((p) => p[1]));

  it('an I-shape with two flanges has each at its own width, the x axis at the centroid', () => {
    const scene = sizes({
      ...{ d: 500, tw: 10, ytop: 300 },
      ...{ bftop: 200, tftop: 20, bfbot: 300, tfbot: 15 },
    });
    const [outline = []] = areas(scene, 'zinc1');
    const perMm = yOf(outline) / 500;
    expect(xOf(outline)).toBeCloseTo(300 * perMm, 9);
    const top = Math.min(...outline.map((p) => p[1]));
    expect(xOf(outline.filter((p) => p[1] === top))).toBeCloseTo(200 * perMm, 9);
    const axis = scene.shapes.find(
      (s) => s.kind === 'line' && s.points[0]?.[1] === s.points[1]?.[1],
    );
    const [from] = axis?.kind === 'line' ? axis.points : [];
    expect((from?.[1] ?? 0) - top).toBeCloseTo(300 * perMm, 9);
    for (const size of ['bftop 200 mm', 'tfbot 15 mm', 'tw 10 mm'])
      expect(scene.description).toContain(size);
  });
  it('a channel has its web at the back and the y axis at the centroid', () => {
    const scene = sizes({ d: 380, bf: 90, tf: 16, tw: 10, xbar: 20 });
    const [outline = []] = areas(scene, 'zinc1');
    const perMm = yOf(outline) / 380;
    expect(xOf(outline)).toBeCloseTo(90 * perMm, 9);
    const back = Math.min(...outline.map((p) => p[0]));
    const axis = scene.shapes.find(
      (s) => s.kind === 'line' && s.points[0]?.[0] === s.points[1]?.[0],
    );
    const [from] = axis?.kind === 'line' ? axis.points : [];
    expect((from?.[0] ?? 0) - back).toBeCloseTo(20 * perMm, 9);
  });
  it('a box has a hole less by its plates', () => {
    const scene = sizes({ B: 300, d: 500, tf: 25, tw: 12 });
    const [outline = []] = areas(scene, 'zinc1');
    const [hole = []] = areas(scene, 'paper');
    const perMm = yOf(outline) / 500;
    expect(xOf(outline) - xOf(hole)).toBeCloseTo(24 * perMm, 9);
    expect(yOf(outline) - yOf(hole)).toBeCloseTo(50 * perMm, 9);
    expect(outline).toHaveLength(4);
  });
  it('a tube has round corners of 2t where no radius is known', () => {
    const scene = sizes({ B: 150, Ht: 250, t: 10 });
    const [outline = []] = areas(scene, 'zinc1');
    const perMm = yOf(outline) / 250;
    const top = Math.min(...outline.map((p) => p[1]));
    const straight = outline.filter((p) => Math.abs(p[1] - top) < 1e-9);
    expect(xOf(straight)).toBeCloseTo((150 - 40) * perMm, 6);
    expect(texts(scene).filter((t) => t.startsWith('t '))).toEqual(['t 10 mm']);
  });
  it('a round tube is two circles', () => {
    const scene = sizes({ D: 300, t: 30 });
    const radii = scene.shapes.flatMap((s) => (s.kind === 'circle' ? [s.radius] : []));
    expect((radii[1] ?? 0) / (radii[0] ?? 1)).toBeCloseTo(0.8, 9);
  });
  it('a section with a long name keeps within its window', () => {
    const long = 'Built-up I 500 mm × 12.5 mm, top 200 mm × 20 mm, bottom 300 mm × 15 mm';
    expect(texts(sizes({ D: 300, t: 30 }, long))[0]).toMatch(/^Built-up I 500 mm .*…$/);
  });
  it('nothing where a size is missing', () => {
    expect(sectionDrawing('W', (s) => (s === 'd' ? named(s, 1, '1') : null))).toBeNull();
  });
});
