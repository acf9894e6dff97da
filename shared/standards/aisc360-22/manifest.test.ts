import { expect, it } from 'vitest';
import { aisc360 } from './book.ts';
import { manifest } from './manifest.ts';

// Structural: what the book has formulas of is what its manifest says it has.
const cited = new Set([...aisc360.formulas.values()].map((f) => f.clause));

it('names each clause once', () => {
  const clauses = manifest.map((m) => m.clause);
  expect(clauses.filter((c, i) => clauses.indexOf(c) !== i)).toEqual([]);
});

it('lists every clause of a formula as implemented', () => {
  const implemented = new Set(
    manifest.filter((m) => m.state === 'implemented').map((m) => m.clause),
  );
  expect([...cited].filter((c) => !implemented.has(c))).toEqual([]);
});

it('lists as implemented only clauses that have formulas', () => {
  const empty = manifest.filter((m) => m.state === 'implemented' && !cited.has(m.clause));
  expect(empty.map((m) => m.clause)).toEqual([]);
});

it('says why wherever a clause is not implemented', () => {
  expect(manifest.filter((m) => m.state !== 'implemented' && m.because === '')).toEqual([]);
});
