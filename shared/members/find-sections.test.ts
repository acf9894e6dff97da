import { describe, expect, it } from 'vitest';
import { designationsOf } from '../sections/table.ts';
import { findSections, type SectionSearch } from './find-sections.ts';
import { parseInput } from './parse-input.ts';
import { runMember } from './run.ts';
import { candidatesOf, NO_LIMITS, type SearchFamily } from './section-candidates.ts';

const INCH = 25.4;
const FORCES = [{ name: 'any', P: '10 kip' }];

/** A member held at both ends with a length in all directions, under forces. */
const member =
  (length: string, combinations: readonly object[], more: object = {}) =>
  (section: string) =>
    parseInput({
      format: 1,
      ...{ standard: 'aisc360-22', design: 'LRFD', units: 'us' },
      analysis: { method: 'effective-length', secondOrder: 'amplified', sway: 'none' },
      members: [
        {
          ...{ mark: 'C', section, material: 'A992', ends: 'held', endMomentSign: 'bending' },
          ...{ length, Lcx: length, Lcy: length, Lcz: length, Lb: length },
          ...{ combinations, ...more },
        },
      ],
    });

function last(steps: Iterable<SectionSearch>): SectionSearch {
  const all = [...steps];
  const end = all.at(-1);
  if (!end) throw new Error('nothing was tried');
  expect(all.map(({ tried }) => tried)).toEqual(all.map((_, index) => index + 1));
  return end;
}

const names = ({ found }: SectionSearch) => found.map(({ designation }) => designation);

describe('candidates', () => {
  it('are of one kind, the lightest first', () => {
    const weights = candidatesOf('HP', NO_LIMITS).map(({ weight }) => weight);
    expect(weights).toEqual(weights.toSorted((a, b) => a - b));
    expect(weights).toHaveLength(designationsOf('HP').length);
  });

  it('part square tubes from rectangular ones', () => {
    const of = (family: SearchFamily) => candidatesOf(family, NO_LIMITS);
    expect(of('square HSS').map(({ designation }) => designation)).toContain('HSS8X8X1/2');
    expect(of('rectangular HSS').map(({ designation }) => designation)).toContain('HSS8X6X1/2');
    expect(of('square HSS').length + of('rectangular HSS').length).toBe(
      designationsOf('HSS').length,
    );
  });

  it('keep to limits, which are inclusive: W12X79 is 12.4 in deep and 12.1 in wide', () => {
    const limits = { minDepth: 12.4, maxDepth: 12.4, minWidth: 12.1, maxWidth: 12.1 };
    const inMm = Object.fromEntries(
      Object.entries(limits).map(([name, inches]) => [name, inches * INCH]),
    ) as unknown as typeof limits;
    const found = candidatesOf('W', inMm).map(({ designation }) => designation);
    expect(found).toEqual(['W12X79']);
  });
});

describe('the lightest sections that satisfy every check', () => {
  it('begin with W14X132 in AISC Design Examples v16.0, E.1A: 840 kip, 30 ft, 14 in nominal depth', () => {
    const limits = { ...NO_LIMITS, minDepth: 13.5 * INCH, maxDepth: 15.5 * INCH };
    const search = last(
      findSections(
        candidatesOf('W', limits),
        1,
        member('30 ft', [{ name: '1.2D+1.6L', P: '840 kip' }]),
      ),
    );
    expect(names(search)).toEqual(['W14X132']);
    expect(search.tried).toBeLessThan(search.of);
  });

  it('are those whose whole run is OK, with the whole run’s summary', () => {
    const run = member(
      '16 ft',
      [
        { name: 'a', P: '60 kip', MxA: '70 kip ft', MxB: '40 kip ft' },
        { name: 'b', P: '120 kip', MyA: '3 kip ft', MyB: '2 kip ft' },
        { name: 'c', P: '-90 kip', MxA: '20 kip ft' },
      ],
      { netSection: { Ae: '4 in²' } },
    );
    const shapes = candidatesOf('S', NO_LIMITS);
    const summaries = shapes.map(({ designation }) => {
      const parsed = run(designation);
      if (!parsed.ok) throw new Error('refused');
      const [resolved] = parsed.input.members;
      if (!resolved) throw new Error('no member');
      return { designation, summary: runMember(parsed.input, resolved).summary };
    });
    const satisfying = summaries.filter(({ summary }) => summary.verdict === 'OK');
    expect(satisfying.length).toBeGreaterThan(0);
    expect(satisfying.length).toBeLessThan(shapes.length);
    const search = last(findSections(shapes, shapes.length, run));
    expect(search.found.map(({ designation, summary }) => ({ designation, summary }))).toEqual(
      satisfying,
    );
    expect(search.tried).toBe(shapes.length);
  });

  it('leave out none as light as the last: W16X26, W14X26 and W12X26 are over 5.01 in wide', () => {
    const limits = { ...NO_LIMITS, minDepth: 12 * INCH, minWidth: 5.01 * INCH };
    const search = last(findSections(candidatesOf('W', limits), 1, member('8 ft', FORCES)));
    expect(names(search)).toEqual(['W16X26', 'W14X26', 'W12X26']);
  });

  it('are none where nothing is checked, and it says why', () => {
    const swaying = member('8 ft', FORCES, { ends: 'sway' });
    const search = last(findSections(candidatesOf('HP', NO_LIMITS), 10, swaying));
    expect(search).toMatchObject({
      ...{ found: [], nearest: null, obstacle: 'Ends outside the scope' },
      unchecked: designationsOf('HP').length,
    });
  });

  it('leave out what the steel is not made for: A572 Gr. 60 to 2 in, W14X730 has 4.91 in', () => {
    const limits = {
      ...NO_LIMITS,
      minDepth: 22 * INCH,
      maxDepth: 22.5 * INCH,
      minWidth: 17.8 * INCH,
    };
    const thick = member('8 ft', FORCES, { material: 'A572 Gr. 60' });
    const search = last(findSections(candidatesOf('W', limits), 10, thick));
    expect(search).toMatchObject({ of: 1, tried: 1, found: [], unchecked: 1 });
    expect(search.obstacle).toMatch(/not made as thick/);
  });

  it('name the nearest where none satisfies: of short columns the one of the largest area', () => {
    const heavy = member('10 ft', [{ name: 'any', P: '9000 kip' }]);
    const search = last(findSections(candidatesOf('HP', NO_LIMITS), 10, heavy));
    expect(search.found).toEqual([]);
    expect(search.nearest?.designation).toBe('HP18X204');
    expect(search.nearest?.summary.verdict).toBe('NOT OK');
  });
});
