import { describe, expect, it } from 'vitest';
import type { Line } from '../calc/line.ts';
import { createRecorder } from '../calc/recorder.ts';
import type { SectionSizesInput } from '../sections/sizes.ts';
import { quantityReader } from './given-values.ts';
import { findGrade, type ResolvedSteel, steelFor } from './material.ts';
import { resolveSection } from './resolve-section.ts';
import { sectionLines } from './section-lines.ts';

function read(given: string | SectionSizesInput) {
  const problems: string[] = [];
  const problem = (path: string, message: string) => problems.push(`${path} ${message}`);
  return { ...resolveSection(given, problem, quantityReader(problem)), problems };
}

const STEEL: ResolvedSteel = (() => {
  const grade = findGrade('A992');
  const found = grade && steelFor(grade, 'shapes', 10);
  if (!found) throw new Error('A992');
  return { kind: 'grade', ...found };
})();

function lines(given: string | SectionSizesInput): readonly Line[] {
  const { section, problems } = read(given);
  if (!section) throw new Error(problems.join());
  const r = createRecorder('');
  sectionLines(r, section, STEEL);
  return r.lines;
}
const keys = (given: string) => lines(given).map(({ key }) => key.replace('section/', ''));

const AXES = ['Ix', 'Sx', 'Zx', 'rx', 'Iy', 'Sy', 'Zy', 'ry', 'J'];

describe('a tabulated section', () => {
  it('has its lines in the order of a W shape', () => {
    const sizes = ['A', 'd', 'bf', 'tw', 'tf'];
    const open = [...AXES, 'Cw', 'rts', 'ho'];
    expect(keys('W12X79')).toEqual(['section', ...sizes, 'kdes', 'lambdaf', 'lambdaw', ...open]);
    // A rounded detailing value elsewhere.
    expect(keys('HP12X53')).toEqual(['section', ...sizes, 'lambdaf', 'lambdaw', ...open]);
    expect(keys('C15X33.9')).toEqual([
      ...['section', ...sizes, 'xbar', 'lambdaf', 'lambdaw', ...open, 'ro', 'H'],
    ]);
    expect(keys('HSS8X6X1/2')).toEqual([
      ...['section', 'A', 'Ht', 'B', 't', 'lambdab', 'lambdah', ...AXES],
    ]);
    expect(keys('Pipe8STD')).toEqual(['section', 'A', 'D', 't', 'lambdad', ...AXES]);
  });
  it('says where published values are off its sizes', () =>
    expect(keys('Pipe14XS').slice(0, 3)).toEqual(['section', 'note', 'A']));
  it('looks everything up', () => {
    for (const d of ['W12X79', 'S24X121', 'MC18X58', 'HSS20X12X5/8', 'HSS6.000X0.375'])
      expect(new Set(lines(d).map(({ kind }) => kind))).toEqual(new Set(['section', 'lookup']));
  });
  it('is square where both outside sizes are the same', () => {
    const kind = (d: string) => {
      const { section } = read(d);
      return section && sectionLines(createRecorder(''), section, STEEL);
    };
    expect(kind('HSS8X8X1/2')).toMatchObject({ kind: 'rect-hss', square: true });
    expect(kind('HSS8X6X1/2')).toMatchObject({ kind: 'rect-hss', square: false });
  });
});

describe('a designation', () => {
  it('of another family is outside scope, not a problem', () => {
    expect(read('WT6X20')).toMatchObject({ section: null, problems: [] });
    expect(read('2L4X4X1/2')).toMatchObject({ section: null, problems: [] });
  });
  it('that no family has is a problem', () => {
    expect(read('W12X80').problems[0]).toMatch(/^section "W12X80" is in none of the tables/);
    expect(read('HSS8X6X9').problems).toHaveLength(1);
  });
});

describe('a section by sizes', () => {
  const i = { shape: 'i', d: '20 in', bf: '10 in', tf: '1 in', tw: '0.5 in' } as const;
  it('is named by its sizes', () => {
    expect(read(i).name.value).toBe('Built-up I 20 in × 10 in × 1 in × 0.5 in');
    expect(read({ shape: 'round', D: '300 mm', t: '8 mm', wall: 'design' }).name.value).toBe(
      'Round tube 300 mm × 8 mm',
    );
  });
  it('hands its source and state to each size that has none of its own', () => {
    const source = { kind: 'drawing', number: 'S-201', revision: 'B' } as const;
    const own = { kind: 'typed', note: 'measured' } as const;
    const given = lines({
      ...{ ...i, source, confirmed: true },
      tf: { value: '1 in', source: own, confirmed: false },
    }).filter((l) => l.kind === 'given');
    expect(given.map((l) => [l.symbol, l.source, l.confirmed])).toEqual([
      ['d', source, true],
      ['bf', source, true],
      ['tf', own, false],
      ['tw', source, true],
    ]);
  });
  it('takes a square section, which has no minor axis, of any size', () => {
    // Turned by a right angle it is the same section, though Ix and Iy are computed on ways of their own.
    for (let mm = 300; mm < 310; mm += 0.37) {
      const [B, t] = [`${mm} mm`, `${mm / 15.1} mm`];
      expect(read({ shape: 'box', B, d: B, tf: t, tw: t }).problems).toEqual([]);
      expect(read({ shape: 'tube', B, Ht: B, t, wall: 'design' }).problems).toEqual([]);
    }
  });
  it.each<[string, SectionSizesInput, string]>([
    ['thick flanges', { ...i, tf: '10 in' }, 'section.tf is 10 in; two of it must be less than d'],
    ['a thick web', { ...i, tw: '10 in' }, 'section.tw is 10 in; it must be less than bf'],
    ['nothing', { ...i, d: '0 in' }, 'section.d is 0 in; it must be above zero'],
    ['another dimension', { ...i, d: '20 kip' }, 'section.d is a force'],
    ['a wide flat I', { ...i, d: '5 in' }, 'section has Iy above Ix'],
    [
      'equal flanges',
      {
        ...{ shape: 'mono-i', d: '20 in', tw: '0.5 in' },
        ...{ bfTop: '8 in', tfTop: '1 in', bfBottom: '8 in', tfBottom: '1 in' },
      },
      'section.bfTop is 8 in; both flanges are the same',
    ],
    [
      'a lying box',
      { shape: 'box', d: '10 in', B: '12 in', tf: '1 in', tw: '1 in' },
      'section has Iy above Ix',
    ],
    [
      'a lying tube',
      { shape: 'tube', Ht: '6 in', B: '8 in', t: '0.25 in', wall: 'design' },
      'section.Ht is 6 in; it must not be less than B',
    ],
    [
      'corners that meet',
      { shape: 'tube', Ht: '6 in', B: '4 in', t: '1 in', wall: 'design' },
      'section.t is 1 in; with an outside corner radius of 2t',
    ],
    [
      'a sharp corner',
      { shape: 'tube', Ht: '6 in', B: '4 in', t: '0.5 in', Ro: '0.25 in', wall: 'design' },
      'section.Ro is 0.25 in; it must not be less than t',
    ],
    [
      'a solid bar',
      { shape: 'round', D: '2 in', t: '1 in', wall: 'nominal' },
      'section.t is 1 in; two of it must be less than D',
    ],
  ])('refuses %s', (_what, given, message) => {
    const { section, problems } = read(given);
    expect(section).toBeNull();
    expect(problems[0]?.startsWith(message), problems[0]).toBe(true);
  });
});
