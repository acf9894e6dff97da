import { describe, expect, it } from 'vitest';
import { begin, type History, nextHistory } from './history.ts';

const edit = (history: History<string>, value: string, field: string, at: number) =>
  nextHistory(history, { type: 'edit', value, field, at });

describe('the undo of a form', () => {
  it('takes typing on in one field as one step', () => {
    let history = begin('');
    history = edit(history, '2', 'length', 0);
    history = edit(history, '22', 'length', 300);
    history = edit(history, '22 ft', 'length', 900);
    expect(history.past).toEqual(['']);
    expect(nextHistory(history, { type: 'undo' }).present).toBe('');
  });

  it('begins a step in another field and after a pause', () => {
    let history = begin('a');
    history = edit(history, 'b', 'length', 0);
    history = edit(history, 'c', 'Lcx', 100);
    history = edit(history, 'd', 'Lcx', 5_000);
    expect(history.past).toEqual(['a', 'b', 'c']);
  });

  it('goes back and forth, and an edit ends what could be redone', () => {
    let history = edit(edit(begin('a'), 'b', 'x', 0), 'c', 'y', 0);
    history = nextHistory(nextHistory(history, { type: 'undo' }), { type: 'undo' });
    expect(history.present).toBe('a');
    history = nextHistory(history, { type: 'redo' });
    expect(history.present).toBe('b');
    history = edit(history, 'z', 'x', 0);
    expect(nextHistory(history, { type: 'redo' }).present).toBe('z');
    expect(nextHistory(history, { type: 'undo' }).present).toBe('b');
  });

  it('does nothing at either end and for an edit that changes nothing', () => {
    const history = begin('a');
    expect(nextHistory(history, { type: 'undo' })).toBe(history);
    expect(nextHistory(history, { type: 'redo' })).toBe(history);
    expect(edit(history, 'a', 'x', 0)).toBe(history);
  });
});
