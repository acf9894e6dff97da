import { expect } from 'vitest';
import { verifyRecord } from '#server/verify/verify-record.ts';
import { placedLines } from '#shared/calc/address.ts';
import { sealRecord } from '#shared/calc/hashes.ts';
import type { CalculationRecord } from '#shared/calc/record.ts';
import { recordOf } from '../reference/run-input.ts';
import { seededRandom } from './random.ts';
import { randomInput } from './random-members.ts';
import { recordFaults } from './record-faults.ts';

/** What random members reached. */
export interface Seen {
  lines: number;
  readonly verdicts: Set<string>;
  readonly formulas: Set<string>;
  readonly notices: Set<string>;
}

export const nothingSeen = (): Seen => ({
  ...{ lines: 0, verdicts: new Set(), formulas: new Set(), notices: new Set() },
});

/**
 * Runs random members: none throws, each record is whole and closed, and every fourth is verified
 * line by line. Adds what they reached to `seen`.
 */
export function proveRandomMembers(seed: number, count: number, seen: Seen): void {
  const random = seededRandom(seed);
  for (let i = 0; i < count; i += 1) {
    const input = randomInput(random);
    const where = `member ${i} of seed ${seed}: ${JSON.stringify(input)}`;
    const record = recordAt(where, input);
    expect(recordFaults(record), where).toEqual([]);
    if (i % 4 === 0) {
      const kept = JSON.parse(JSON.stringify(sealRecord(record)));
      const { problems, lines, reproduced } = verifyRecord(kept);
      expect(problems, where).toEqual([]);
      expect(reproduced, where).toBe(lines);
    }
    seen.verdicts.add(record.summary.verdict);
    for (const { line } of record.members.flatMap(placedLines)) {
      seen.lines += 1;
      if (line.kind === 'formula' || line.kind === 'root') seen.formulas.add(line.formula);
      if (line.kind === 'notice') seen.notices.add(line.code);
    }
  }
}

function recordAt(where: string, input: unknown): CalculationRecord {
  try {
    return recordOf(input);
  } catch (error) {
    throw new Error(where, { cause: error });
  }
}

/** Formulas that the members of each file reach, by book and chapter. */
const REACHED: Readonly<Record<string, readonly string[]>> = {
  'aisc360-22': [
    ...['C2-2a', 'C2-2b', 'C2.3-EI', 'App.7.3-share', 'C-A-7-1', 'C-A-7-2', 'C-A-7-K'],
    ...['D2-1', 'D2-2', 'D3-1', 'D1-L/r', 'H1.2-Pr', 'H1-Pr/Pc-tension', 'H1-1b-tension'],
    ...['E3-1', 'E3-2', 'E3-3', 'E3-4', 'E4-2', 'E4-3', 'E4-7', 'E4-8', 'E4-9', 'E4d-Fe', 'E4f-Fe'],
    ...['E7-1', 'E7-2-limit', 'E7-3-web', 'E7-3-flange', 'E7-5', 'E7-7', 'E7-Ae-web'],
    ...['E7-Ae-both', 'E7-Ae-two-webs', 'E7-Ae-four-walls'],
    ...['F1-1', 'F1-place-A', 'F2-1', 'F2-2', 'F2-3', 'F2-4', 'F2-5', 'F2-6', 'F2-8a', 'F2-8b'],
    ...['F3-1', 'F3-2', 'F4-1', 'F4-2', 'F4-3', 'F4-4', 'F4-9a', 'F4-9b', 'F4-13', 'F4-15'],
    ...['F5-1', 'F5-6', 'F6-1', 'F6-2', 'F7-1', 'F7-2', 'F7-3', 'F7-4', 'F7-5', 'F7-6'],
    ...['F7-10', 'F7-12', 'F8-1', 'F8-2', 'F13-IycIy'],
    ...['G2-1', 'G2-2', 'G2-3', 'G2-4', 'G2-9', 'G2-10', 'G2-11', 'G4-1', 'G5-1', 'G6-1'],
    ...['H1-1a', 'H1-1b', 'H1-3', 'H1.3-Mry/Mcy', 'H2-1', 'H2-1-w', 'H2-1-M', 'H2-fra'],
    ...['A-8-1', 'A-8-2', 'A-8-3', 'A-8-4', 'A-8-5', 'A-8-6', 'A-8-7', 'A-8-8', 'A-8-1-sway'],
    ...['App.8-story-share', 'App.8-Cm-transverse', 'App.8-B1-tension'],
  ],
  'elastic-theory': [
    ...['sense', 'Mmax', 'Mmax-end', 'zmax-A', 'zmax-B', 'Cm-sec', 'Cm-sec-end', 'kL'],
    ...['VA-point-first', 'VA-uniform-first', 'VA-linear-first', 'VA-whole-first'],
    ...['VA-point-compression', 'VA-uniform-compression', 'VA-linear-compression'],
    ...['extreme-M', 'extreme-M-first', 'zero-shear-first-linear', 'turning-shear-first'],
    ...['zero-shear-compression-linear', 'y', 'slope', 'after-force', 'intensity'],
    ...['spring-critical', 'spring-F', 'spring-MA', 'spring-MB', 'held-m-point', 'held-m-whole'],
    ...['kL-tension', 'M-tension-uniform'],
  ],
  'section-properties': ['I-Ix', 'mono-Ix', 'box-Ix', 'tube-I', 'round-I', 'mono-Zx-web'],
};

/** That the members reached what they are meant to reach: every verdict and every chapter. */
export function expectReach(seen: Seen): void {
  expect([...seen.verdicts].sort()).toEqual(['FAILED', 'NOT CHECKED', 'NOT OK', 'OK']);
  const lacking = Object.entries(REACHED).flatMap(([book, ids]) =>
    ids.map((id) => `${book}/${id}`).filter((id) => !seen.formulas.has(id)),
  );
  expect(lacking).toEqual([]);
  expect(seen.formulas.size).toBeGreaterThan(400);
  expect(seen.notices.size).toBeGreaterThan(35);
  expect(seen.lines).toBeGreaterThan(50_000);
}
