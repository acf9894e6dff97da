import { describe, expect, it } from 'vitest';
import { addressOf, splitAddress } from './address.ts';
import { defineFormula } from './formula.ts';
import { lineGraph } from './graph.ts';
import type { Quantity } from './quantity.ts';
import type { CombinationRecord } from './record.ts';
import { createRecorder } from './recorder.ts';

const sum = defineFormula('b', {
  id: 'sum',
  clause: 'A',
  title: 'Sum',
  symbol: 's',
  dimension: 'none',
  expression: 'x+y',
  operands: { x: 'none', y: 'none' },
});
const given = (r: ReturnType<typeof createRecorder>, key: string, value: number): Quantity =>
  r.given(
    key,
    key,
    'none',
    { value, text: String(value), source: { kind: 'typed' }, confirmed: false },
    { title: key },
  );

/** Member lines a, b, ab = a + b; in c1 and c2 each: P, s = ab + P, a choice on s, and a check of s. */
function member() {
  const m = createRecorder('');
  const [a, b] = [given(m, 'a', 1), given(m, 'b', 2)];
  const ab = m.formula(sum, 'ab', { x: a, y: b });
  const combination = (id: string, value: number): CombinationRecord => {
    const r = createRecorder(':');
    const P = given(r, 'P', value);
    const s = r.formula(sum, 's', { x: ab, y: P });
    r.choice('side', [{ left: s, relation: '>', right: P, outcome: 'yes' }], 'no', {
      title: 'Side',
    });
    r.check('check', s, a, { title: 'Check' });
    const summary = { verdict: 'OK', ratio: 0, ratioText: '0.000', governing: null } as const;
    return { id, name: id, lines: [...r.lines], summary };
  };
  return { lines: [...m.lines], combinations: [combination('c1', 10), combination('c2', 20)] };
}

describe('the graph of a member', () => {
  const graph = lineGraph(member());
  it('has every line once, by address', () =>
    expect([...graph.lines.keys()]).toEqual([
      'a',
      'b',
      'ab',
      'c1:P',
      'c1:s',
      'c1:side',
      'c1:check',
      'c2:P',
      'c2:s',
      'c2:side',
      'c2:check',
    ]));
  it('answers what a line came from', () => {
    expect(graph.sources('ab')).toEqual(['a', 'b']);
    expect(graph.sources('c1:s')).toEqual(['ab', 'c1:P']);
    expect(graph.sources('c1:side')).toEqual(['c1:s', 'c1:P']);
    expect(graph.sources('c2:check')).toEqual(['c2:s', 'a']);
    expect(graph.sources('a')).toEqual([]);
  });
  it('answers what uses a line, over all combinations', () => {
    expect(graph.dependents('ab')).toEqual(['c1:s', 'c2:s']);
    expect(graph.dependents('a')).toEqual(['ab', 'c1:check', 'c2:check']);
    expect(graph.dependents('c1:P')).toEqual(['c1:s', 'c1:side']);
    expect(graph.dependents('c1:check')).toEqual([]);
  });
  it('leads down to given values, nearest first, each once', () => {
    expect(graph.ladder('c1:check')).toEqual(['c1:s', 'c1:P', 'ab', 'b', 'a']);
    expect(graph.ladder('a')).toEqual([]);
  });
  it('refuses a reference to nothing, or to what comes later', () => {
    const { lines, combinations } = member();
    expect(() => lineGraph({ lines: lines.slice(1), combinations })).toThrow(
      /ab refers to a, not before it/,
    );
    expect(() => lineGraph({ lines: lines.toReversed(), combinations })).toThrow(/not before it/);
    expect(() => lineGraph({ lines: [...lines, ...lines], combinations })).toThrow(
      /two lines at a/,
    );
  });
});

describe('addresses', () => {
  it('add the combination to what starts with a colon', () => {
    expect(addressOf(':H1/ratio', 'c1')).toBe('c1:H1/ratio');
    expect(addressOf('E3/Fn', 'c1')).toBe('E3/Fn');
  });
  it('split again', () => {
    expect(splitAddress('c1:H1/ratio')).toEqual({ combination: 'c1', key: 'H1/ratio' });
    expect(splitAddress('E3/Fn')).toEqual({ combination: null, key: 'E3/Fn' });
  });
});
