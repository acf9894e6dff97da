import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import type { Test, Unit } from './stand-in.ts';
import type { Mutant, Switchboard } from './switchboard.ts';

const top = fileURLToPath(new URL('../..', import.meta.url));

/** Folders whose tests name a publication or carry their working by hand. */
const FOLDERS = ['tests/reference', 'shared/standards', 'shared/members'];

/** Files in them without expected values from outside: what they find doesn't count. */
const STRUCTURAL = [
  'tests/reference/elastic-theory-closure.test.ts',
  'tests/reference/aisc360-22-flexure-continuity.test.ts',
  'shared/standards/aisc360-22/manifest.test.ts',
  'shared/members/cancelled-loads.test.ts',
  'shared/members/completeness.test.ts',
  'shared/members/find-sections.test.ts',
  'shared/members/hashes.test.ts',
  'shared/members/parse-input.test.ts',
  'shared/members/resolve-section.test.ts',
];

export const testFiles = (word: string): string[] =>
  FOLDERS.flatMap((folder) =>
    readdirSync(join(top, folder), { recursive: true, encoding: 'utf8' }).map(
      (path) => `${folder}/${path}`,
    ),
  )
    .filter((path) => path.endsWith('.test.ts') && !STRUCTURAL.includes(path))
    .filter((path) => new RegExp(word).test(path))
    .sort();

/** A unit with what it touches: in its body, and test by test. */
export interface KnownUnit {
  readonly unit: Unit;
  readonly touched: ReadonlySet<string>;
  readonly tests: ReadonlyMap<string, ReadonlySet<string>>;
  readonly seconds: number;
}

export interface Baseline {
  readonly units: readonly KnownUnit[];
  /** Tests that fail without a mutant, which count for nothing. */
  readonly failing: readonly string[];
}

/** Reads the test files whose path fits a pattern and runs them once without a mutant. */
export async function runBaseline(board: Switchboard, word: string): Promise<Baseline> {
  const { reading } = await import('./stand-in.ts');
  const units: KnownUnit[] = [];
  const failing: string[] = [];
  for (const file of testFiles(word)) {
    Object.assign(reading, { file, units: [] });
    board.touched = new Set();
    await import(pathToFileURL(join(top, file)).href);
    const { touched } = board;
    const own = [...reading.units];
    if (touched.size > 0) failing.push(`${file}: computes outside its tests`);
    for (const unit of own) {
      const known = await knowUnit(board, unit, failing);
      if (known) units.push(known);
    }
  }
  board.touched = new Set();
  for (const { unit, tests } of units) {
    const failed = await firstFailure(unit, new Set(tests.keys()));
    if (failed !== null)
      throw new Error(`${unit.file}: ${unit.name}: ${failed}: fails when it is run again`);
  }
  units.sort((a, b) => a.seconds - b.seconds);
  return { units, failing };
}

async function knowUnit(
  board: Switchboard,
  unit: Unit,
  failing: string[],
): Promise<KnownUnit | null> {
  const start = performance.now();
  board.touched = new Set();
  let opened: Test[];
  try {
    opened = unit.open();
  } catch (error) {
    failing.push(`${unit.file}: ${unit.name}: ${error}`);
    return null;
  }
  const { touched } = board;
  const tests = new Map<string, ReadonlySet<string>>();
  for (const test of opened) {
    board.touched = new Set();
    try {
      await test.run();
      tests.set(test.name, board.touched);
    } catch (error) {
      failing.push(`${unit.file}: ${unit.name}: ${test.name}: ${String(error).slice(0, 200)}`);
    }
  }
  return { unit, touched, tests, seconds: (performance.now() - start) / 1000 };
}

/** What a unit's tests note of a mutant: its formula, or itself. */
const markOf = (mutant: Mutant): string => (mutant.text === '' ? mutant.id : mutant.at);

/** The first test that fails with the mutant in place, or null; and how many could see it. */
export async function runMutant(
  board: Switchboard,
  units: readonly KnownUnit[],
  mutant: Mutant,
): Promise<{ readonly killer: string | null; readonly seen: number }> {
  const mark = markOf(mutant);
  let seen = 0;
  board.active = mutant;
  try {
    for (const known of units) {
      const inBody = known.touched.has(mark);
      const names = [...known.tests].filter(([, t]) => inBody || t.has(mark)).map(([name]) => name);
      if (names.length === 0) continue;
      seen += names.length;
      const failed = await firstFailure(known.unit, new Set(names));
      if (failed !== null)
        return { killer: `${known.unit.file}: ${known.unit.name}: ${failed}`, seen };
    }
  } finally {
    board.active = null;
  }
  return { killer: null, seen };
}

async function firstFailure(unit: Unit, names: ReadonlySet<string>): Promise<string | null> {
  let tests: Test[];
  try {
    tests = unit.open();
  } catch {
    return 'does not come to its tests';
  }
  for (const test of tests) {
    if (!names.has(test.name)) continue;
    try {
      await test.run();
    } catch {
      return test.name;
    }
  }
  return null;
}
