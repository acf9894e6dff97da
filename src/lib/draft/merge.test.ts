import { describe, expect, it } from 'vitest';
import { type MergeRules, merge } from './merge.ts';

type Draft = Readonly<Record<string, string>>;

const rules: MergeRules<Draft> = {
  fields: (draft) =>
    Object.entries(draft).map(([id, text]) => ({ id, label: `label ${id}`, text, value: text })),
  take: (into, from, id) => {
    const { [id]: _, ...rest } = into;
    const value = from[id];
    return value === undefined ? rest : { ...rest, [id]: value };
  },
};

describe('two changes of one version', () => {
  it('keeps what only one of them changed', () => {
    const result = merge({ a: '1', b: '2' }, { a: '9', b: '2' }, { a: '1', b: '8' }, rules);
    expect(result).toEqual({ agreed: { a: '9', b: '8' }, clashes: [] });
  });

  it('asks about a field that both changed, and not where both say the same', () => {
    const result = merge({ a: '1', b: '2' }, { a: '9', b: '3' }, { a: '8', b: '3' }, rules);
    expect(result.agreed).toEqual({ a: '8', b: '3' });
    expect(result.clashes).toEqual([{ id: 'a', label: 'label a', mine: '9', theirs: '8' }]);
  });

  it('takes values for the same whatever the order of their names', () => {
    const ruled: MergeRules<Readonly<Record<string, unknown>>> = {
      fields: (draft) =>
        Object.entries(draft).map(([id, value]) => ({ id, label: id, text: '', value })),
      take: (into, from, id) => ({ ...into, [id]: from[id] }),
    };
    const result = merge(
      { a: { x: 1, y: 2 } },
      { a: { x: 9, y: 2 } },
      { a: { y: 2, x: 1 } },
      ruled,
    );
    expect(result).toEqual({ agreed: { a: { x: 9, y: 2 } }, clashes: [] });
  });

  it('carries over rows that one of them added or took away', () => {
    const result = merge({ a: '1', b: '2' }, { a: '1', c: '3' }, { a: '1', b: '2', d: '4' }, rules);
    expect(result).toEqual({ agreed: { a: '1', d: '4', c: '3' }, clashes: [] });
  });

  it('asks when one changed what the other took away', () => {
    const result = merge({ a: '1' }, {}, { a: '2' }, rules);
    expect(result.clashes).toEqual([{ id: 'a', label: 'label a', mine: null, theirs: '2' }]);
  });
});
