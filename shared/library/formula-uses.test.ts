import { expect, it } from 'vitest';
import { defineFormula } from '../calc/formula.ts';
import { createRecorder } from '../calc/recorder.ts';
import { formulaUses } from './formula-uses.ts';

const formula = (id: string) =>
  defineFormula('book', {
    ...{ id, clause: 'A', title: id, symbol: 'b', dimension: 'none' },
    ...{ expression: '2*a', operands: { a: 'none' } },
  });

it('tells for each formula its first line, its lines, and the combinations they stand in', () => {
  const [double, again, never] = [formula('double'), formula('again'), formula('never')];
  const given = { value: 3, text: '3', source: { kind: 'typed' as const }, confirmed: true };
  const member = createRecorder('');
  const a = member.given('given/a', 'a', 'none', given, { title: 'a' });
  member.formula(double, 'A/first', { a });
  member.formula(double, 'A/second', { a });
  const combination = () => {
    const r = createRecorder(':');
    r.formula(again, 'A/third', { a });
    r.formula(again, 'A/fourth', { a });
    return [...r.lines];
  };
  const summary = { verdict: 'OK' as const, ratio: null, ratioText: null, governing: null };
  const uses = formulaUses({
    lines: [...member.lines],
    combinations: [
      { id: 'c1', name: 'one', lines: combination(), summary },
      { id: 'c2', name: 'two', lines: combination(), summary },
      { id: 'c3', name: 'idle', lines: [], summary },
    ],
  });
  expect(uses).toEqual([
    { formula: 'book/double', address: 'A/first', lines: 2, combinations: 0 },
    { formula: 'book/again', address: 'c1:A/third', lines: 4, combinations: 2 },
  ]);
  expect(uses.map((use) => use.formula)).not.toContain(never.id);
});
