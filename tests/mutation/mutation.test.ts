import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { holds, type Tried } from '#shared/calc/condition.ts';
import { defineFormula } from '#shared/calc/formula.ts';
import { parseExpression } from '#shared/expr/parse.ts';
import { mutantsOf } from './formula-mutants.ts';
import type { Result } from './print-result.ts';
import { type Mutant, Switchboard } from './switchboard.ts';
import { type KnownUnit, runMutant, testFiles } from './units.ts';

const board = new Switchboard();
const ID = 'book/double';
const TEXT = '2*A + B/4';
const less = (value: number) => {
  const left = { value, ref: 'left', dimension: 'none', symbol: 'x' };
  return board.holds({ site: 'place:1', left, relation: '<', right: 5 } as unknown as Tried, holds);
};

/** A unit of one test, with what it touches. */
async function unitOf(run: () => void): Promise<KnownUnit> {
  board.touched = new Set();
  run();
  const unit = { file: 'file', name: 'unit', open: () => [{ name: 'test', run }] };
  const tests = new Map([['test', board.touched]]);
  return { unit, touched: new Set(), tests, seconds: 0 };
}
const killed = async (unit: KnownUnit, mutant: Mutant) =>
  (await runMutant(board, [unit], mutant)).killer !== null;
const called = (id: string): Mutant => board.met.get(id) as Mutant;

describe('a mutant of a formula', () => {
  const expression = board.expression(ID, TEXT, parseExpression);
  const unit = unitOf(() => expect(expression.evaluate({ A: 3, B: 8 })).toBe(8));
  const operands = { A: 'none', B: 'none' } as const;
  const formula = defineFormula('book', {
    ...{ id: 'double', clause: '1', title: '', symbol: 'C', dimension: 'none' },
    ...{ expression: TEXT, operands },
  });
  const mutants = mutantsOf(formula);

  it('is made of each constant, up and down, and of the whole', () => {
    expect(mutants.map(({ text }) => text)).toEqual([
      ...['0', 'A', '(2.02)*A + B/4', '(1.98)*A + B/4', '2*A + B/(4.04)', '2*A + B/(3.96)'],
    ]);
  });
  it('is found by a test of its value', async () => {
    for (const mutant of mutants) expect(await killed(await unit, mutant)).toBe(true);
  });
  it('is not found where it computes the same', async () => {
    const same: Mutant = { id: ID, kind: 'formula is 0', at: ID, text: 'B/4 + A*2' };
    expect(await killed(await unit, same)).toBe(false);
    expect(await runMutant(board, [await unit], same)).toEqual({ killer: null, seen: 1 });
  });
  it('is not found by a test that does not use it, nor by one without expectation', async () => {
    const other = { ...mutants[0], at: 'book/other' } as Mutant;
    expect(await runMutant(board, [await unit], other)).toEqual({ killer: null, seen: 0 });
    const careless = await unitOf(() => void expression.evaluate({ A: 3, B: 8 }));
    expect(await killed(careless, mutants[0] as Mutant)).toBe(false);
  });
  it('is gone when the next one runs', () => {
    expect(expression.evaluate({ A: 3, B: 8 })).toBe(8);
  });
});

describe('a mutant of a condition', () => {
  it('is found where its outcome matters', async () => {
    const away = await unitOf(() => expect(less(3)).toBe(true));
    const close = await unitOf(() => expect(less(4.96)).toBe(true));
    const at = await unitOf(() => expect(less(5)).toBe(false));
    const ids = [...board.met.keys()];
    expect(ids).toContain('place:1 right 5 times 0.99');
    const found = async (unit: KnownUnit) => {
      const all: string[] = [];
      for (const id of ids) if (await killed(unit, called(id))) all.push(id.slice(8));
      return all;
    };
    expect(await found(away)).toEqual(['< is >']);
    expect(await found(close)).toEqual(['< is >', 'right 5 times 0.99']);
    expect(await found(at)).toEqual(['< is <=', 'right 5 times 1.01']);
  });
});

it('a mutant of a comparison in plain code is found where its outcome matters', async () => {
  const at = await unitOf(() => expect(board.compare('place: a > b', 5, '>', 5)).toBe(false));
  const above = await unitOf(() => expect(board.compare('place: a > b', 6, '>', 5)).toBe(true));
  const [limit, reversed] = [called('place: a > b is >='), called('place: a > b is <')];
  expect([await killed(at, limit), await killed(at, reversed)]).toEqual([true, false]);
  expect([await killed(above, limit), await killed(above, reversed)]).toEqual([false, true]);
});

describe('a run', () => {
  it('leaves out tests without expected values from outside', () => {
    const files = testFiles('');
    expect(files).toContain('tests/reference/aisc360-22.test.ts');
    expect(files).not.toContain('shared/members/parse-input.test.ts');
  });
  // Whether the books that the tests compute with are the changed ones.
  it('finds the constants of A-7-3 by its working by hand', { timeout: 180_000 }, () => {
    const folder = mkdtempSync(join(tmpdir(), 'mutation-'));
    const out = join(folder, 'result.json');
    try {
      execFileSync(
        process.execPath,
        [
          ...['--import', 'tsx', fileURLToPath(new URL('./run.ts', import.meta.url))],
          ...['A-7-3', '--workers', '1', '--tests', 'app7.test', '--out', out],
        ],
        { encoding: 'utf8', stdio: 'pipe' },
      );
      const results: Result[] = JSON.parse(readFileSync(out, 'utf8'));
      const constants = results.filter(({ kind }) => kind === 'formula constant ±1 %');
      expect(constants.length).toBeGreaterThan(0);
      for (const { killer } of constants) expect(killer).toContain('app7.test.ts');
    } finally {
      rmSync(folder, { recursive: true });
    }
  });
});
