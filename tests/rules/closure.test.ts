import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { placedLines } from '#shared/calc/address.ts';
import { closeLines } from '#shared/calc/closure.ts';
import { closureProblems } from '#shared/calc/closure-problems.ts';
import { lineGraph } from '#shared/calc/graph.ts';
import { type CalculationRecord, recordSchema } from '#shared/calc/record.ts';
import { UNIT_SETS } from '#shared/units/unit-set.ts';
import { solvePlane } from '../reference/plane.ts';
import { publishedCases, publishedInput } from '../reference/published-cases.ts';
import { recordOf } from '../reference/run-input.ts';
import { printedFaults } from './printed-sheet.ts';
import { seededRandom } from './random.ts';
import { randomInput } from './random-members.ts';

/*
 * What is printed reproduces from what is printed, over every line of the published cases and of
 * 500 random members. Two readers: the program's own proof, and one that knows only the printed
 * texts. Structural: no expected values.
 */
function notFinite(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [`${path} is ${value}`];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, part]) => notFinite(part, `${path}/${key}`));
}

function faultsOf(record: CalculationRecord): string[] {
  const set = UNIT_SETS[record.units];
  const parsed = recordSchema.safeParse(record);
  return [
    ...(parsed.success ? [] : [parsed.error.message]),
    ...notFinite(record),
    ...record.members.flatMap((member) => {
      const placed = placedLines(member);
      const graph = lineGraph(member);
      return [
        ...closureProblems(placed, set).map((p) => `${p.address}: ${p.reason}`),
        ...printedFaults(member, set),
        ...(graph.lines.size === placed.length ? [] : ['the graph lost a line']),
      ];
    }),
  ];
}

describe('closure of the published cases', () => {
  for (const { file, data } of publishedCases())
    for (const design of ['LRFD', 'ASD'] as const)
      for (const units of ['us', 'si'] as const) {
        const input = publishedInput(data, design);
        if (input === null) continue;
        it(`${file}, ${design}, ${units}`, () => {
          expect(faultsOf(recordOf({ ...input, units }))).toEqual([]);
        });
      }
});

describe('closure of the elastic theory cases', () => {
  const { cases } = JSON.parse(
    readFileSync(
      new URL('../reference/elastic-theory/equivalent-moment.json', import.meta.url),
      'utf8',
    ),
  ) as { cases: { id: string; inputs: { psi: number; P_over_Pe: number } }[] };
  it('has no line that does not close, in either unit set', () => {
    const faults = cases
      .filter((c) => c.inputs.P_over_Pe > 0)
      .flatMap(({ id, inputs: { psi, P_over_Pe: rho } }) => {
        const { r } = solvePlane({
          EI: 2.5e13,
          L: 5200,
          P: (rho * Math.PI ** 2 * 2.5e13) / 5200 ** 2,
          MA: 64e6,
          MB: psi * 64e6,
        });
        const placed = r.lines.map((line) => ({ address: line.key, combination: null, line }));
        return Object.values(UNIT_SETS).flatMap((set) => {
          const closed = closeLines(placed, set).map((line) => ({
            address: line.key,
            combination: null,
            line,
          }));
          return closureProblems(closed, set).map((p) => `${id} ${p.address}: ${p.reason}`);
        });
      });
    expect(faults).toEqual([]);
  });
});

// Units mixed up, noughts too many: absurd but legible inputs.
describe('closure of extreme members', () => {
  for (const secondOrder of ['amplified', 'exact', 'from-analysis'])
    for (const length of ['1e-8 mm', '14 ft', '1e9 ft'])
      it(`${secondOrder}, ${length}`, () => {
        const faults = ['1e-9 N', '100 kip', '1e14 N'].flatMap((P) =>
          ['1e-8 N mm', '50 kip ft', '1e14 N mm'].flatMap((M) =>
            ['1e-8 MPa', '50 ksi', '1e14 MPa'].flatMap((Fy) =>
              faultsOf(
                recordOf({
                  format: 1,
                  standard: 'aisc360-22',
                  design: 'LRFD',
                  units: 'us',
                  analysis: {
                    method: 'direct',
                    secondOrder,
                    includesMemberEffect: false,
                    sway: 'none',
                  },
                  members: [
                    {
                      mark: 'extreme',
                      section: 'W14X82',
                      material: { name: 'any', Fy, source: { kind: 'typed' } },
                      length,
                      ends: 'held',
                      Lcx: length,
                      Lcy: length,
                      Lcz: length,
                      Lb: length,
                      Cb: 'auto',
                      endMomentSign: 'bending',
                      combinations: [{ name: 'any', P, MxA: M, MxB: M, MyA: M }],
                    },
                  ],
                }),
              ).map((f) => `${P}, ${M}, ${Fy}: ${f}`),
            ),
          ),
        );
        expect(faults).toEqual([]);
      });
});

describe('closure of 500 random members', () => {
  const random = seededRandom(20220801);
  const inputs = Array.from({ length: 500 }, () => randomInput(random));
  it('has no line that does not close, no number that is not finite, no line astray', () => {
    const seen = { lines: 0, verdicts: new Map<string, number>(), equations: new Set<string>() };
    const faults = inputs.flatMap((input, i) => {
      const record = recordOf(input);
      for (const { line } of record.members.flatMap(placedLines)) {
        seen.lines += 1;
        if (line.kind === 'formula') seen.equations.add(line.formula);
      }
      const { verdict } = record.summary;
      seen.verdicts.set(verdict, (seen.verdicts.get(verdict) ?? 0) + 1);
      return faultsOf(record).map((f) => `member ${i}, ${f}`);
    });
    expect(faults).toEqual([]);
    // The members reach what they are meant to reach.
    expect(seen.lines).toBeGreaterThan(50_000);
    expect([...seen.verdicts.keys()].sort()).toEqual(['FAILED', 'NOT CHECKED', 'NOT OK', 'OK']);
    for (const equation of [
      'E3-2',
      'E3-3',
      'E4-2',
      'E7-3-web',
      'E7-3-flange',
      'E7-Ae-both',
      'F2-2',
      'F2-3',
      'F3-1',
      'F3-2',
      'F6-2',
      'F6-3',
      'C2-2b',
      'A-8-3',
      'H1-1a',
      'H1-1b',
      'F1-1',
    ])
      expect(seen.equations, equation).toContain(`aisc360-22/${equation}`);
    for (const equation of [
      'sense',
      'Mmax',
      'Mmax-end',
      'zmax-A',
      'zmax-B',
      'Cm-sec',
      'Cm-sec-end',
    ])
      expect(seen.equations, equation).toContain(`elastic-theory/${equation}`);
  });
});
