import { expect, it } from 'vitest';
import { roundsToPrinted } from './agreement.ts';
import { PUBLISHED_RUNS } from './published-values.ts';

const runs = PUBLISHED_RUNS.map((run) => run());
const values = runs.flatMap((run) => run.values);

it('compares every published value, each once', () => {
  const names = values.map((v) => [v.example, v.what, v.design, v.unit, v.printed].join(' '));
  expect(values.length).toBeGreaterThan(160);
  // H.4 prints one value of this kind twice, for two axes.
  expect(names.length - new Set(names).size).toBeLessThan(5);
});

it('agrees to the last printed digit, or says why the source rounds otherwise', () => {
  const silent = values.filter(
    ({ computed, printed, rounding }) => !roundsToPrinted(computed, printed) && rounding === null,
  );
  expect(silent.map(({ example, what }) => `${example}: ${what}`)).toEqual([]);
});

it('tells through which equations a value comes', () => {
  // Design Examples v16.0, E.1A: φcPn = 893 kip by E3-4, E3-2, E3-1 and E1.
  const value = values.find(({ example, design }) => example === 'E.1A' && design === 'LRFD');
  expect(value).toMatchObject({ printed: '893', unit: 'kip', clause: { clause: 'E1' } });
  expect(value?.computed).toBeCloseTo(893.2027, 3);
  expect(value?.formulas[0]).toBe('aisc360-22/E1-LRFD');
  expect(value?.formulas).toEqual(
    expect.arrayContaining(['aisc360-22/E3-1', 'aisc360-22/E3-2', 'aisc360-22/E3-4']),
  );
  expect(value?.formulas).not.toContain('aisc360-22/E3-3');
});

it('gives decisions only where every condition has been tried', () => {
  const facts = runs.flatMap((run) => run.facts);
  const ofE3 = facts.filter(({ clause }) => clause.clause === 'E3');
  // ANSI/AISC 360-22 E3: inelastic where Fy/Fe ≤ 2.25.
  expect(ofE3.map(({ decision }) => decision)).toContainEqual({
    title: 'Inelastic or elastic buckling',
    ways: [{ condition: 'Fy/Fe ≤ 2.25', outcome: 'buckling is inelastic: E3-2 applies' }],
    otherwise: 'buckling is elastic: E3-3 applies',
  });
  const ofE1 = facts.flatMap(({ clause, constant }) =>
    clause.clause === 'E1' && constant ? [[constant.text, constant.published]] : [],
  );
  // E1: φc = 0.90 (LRFD), Ωc = 1.67 (ASD).
  expect(ofE1).toContainEqual(['φc', '0.90']);
  expect(ofE1).toContainEqual(['Ωc', '1.67']);
  // A flange found compact says nothing of what follows for others.
  const flexure = facts.filter(({ decision }) => decision?.title === 'Web in flexure');
  expect(flexure).toEqual([]);
});
