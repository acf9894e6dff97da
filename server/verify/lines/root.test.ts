import { describe, expect, it } from 'vitest';
import { defineFormula } from '#shared/calc/formula.ts';
import type { LineOf } from '#shared/calc/line.ts';
import { createRecorder } from '#shared/calc/recorder.ts';
import type { LineContext } from './line-context.ts';
import { checkRoot } from './root.ts';

// x³ = 2, whose root is the cube root of two (OEIS A002580: 1.25992104989487316476…).
const cube = defineFormula('aisc360-22', {
  id: 'cube',
  clause: 'E4',
  equation: 'E4-4',
  title: 'A cubic',
  symbol: 'x',
  dimension: 'none',
  expression: 'x^3-a',
  operands: { x: 'none', a: 'none' },
});

function lines() {
  const r = createRecorder('');
  const source = { kind: 'typed' } as const;
  const a = r.given(
    'given/a',
    'a',
    'none',
    { value: 2, text: '2', source, confirmed: true },
    { title: 'a' },
  );
  r.root(cube, 'E4/x', { symbol: 'x', dimension: 'none', bracket: [1, 2] }, { a });
  return r.lines as [LineOf<'given'>, LineOf<'root'>];
}

function reasonsOf(change: Partial<LineOf<'root'>>): string[] {
  const [a, root] = lines();
  const context = {
    valued: (ref: string) => (ref === 'given/a' ? a : null),
    formulaNamed: (id: string) => (id === cube.id ? cube : undefined),
  } as unknown as LineContext;
  return [...checkRoot({ ...root, ...change }, context)];
}

describe('a root', () => {
  it('stands where the equation changes its sign', () => {
    expect(lines()[1].value).toBeCloseTo(Number('1.25992104989487316476'), 15);
    expect(reasonsOf({})).toEqual([]);
  });

  it.each<[string, Partial<LineOf<'root'>>, RegExp]>([
    ['a moved root', { value: 1.25992 }, /does not change its sign/],
    ['a moved root by the tenth digit', { value: 1.259921052 }, /does not change its sign/],
    ['another residual', { residual: 0.01 }, /residual/],
    ['a bracket without a root', { bracket: [1.3, 2] }, /outside its bracket/],
    ['another expression', { expression: 'x^3-2*a' }, /but aisc360-22\/cube is/],
    [
      'another clause',
      { clause: { book: 'aisc360-22', clause: 'E4', equation: 'E4-5' } },
      /stands in E4, E4-4/,
    ],
    ['a missing operand', { operands: {} }, /lacks the operand a/],
    ['an unknown formula', { formula: 'aisc360-22/none' }, /in no book/],
  ])('%s is found', (_, change, reason) => {
    expect(reasonsOf(change).join('\n')).toMatch(reason);
  });
});
