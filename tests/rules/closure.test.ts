import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { closeLines } from '#shared/calc/closure.ts';
import { closureProblems } from '#shared/calc/closure-problems.ts';
import { UNIT_SETS } from '#shared/units/unit-set.ts';
import { solvePlane } from '../reference/plane.ts';
import { publishedCases, publishedInput } from '../reference/published-cases.ts';
import { recordOf } from '../reference/run-input.ts';
import { recordFaults } from './record-faults.ts';

/*
 * What is printed reproduces from what is printed, over every line of the published cases and of
 * extreme members. Two readers: the program's own proof, and one that knows only the printed texts.
 * Structural: no expected values.
 */

describe('closure of the published cases', () => {
  for (const { file, data } of publishedCases())
    for (const design of ['LRFD', 'ASD'] as const)
      for (const units of ['us', 'si'] as const) {
        const input = publishedInput(data, design);
        if (input === null) continue;
        it(`${file}, ${design}, ${units}`, () => {
          expect(recordFaults(recordOf({ ...input, units }))).toEqual([]);
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
              recordFaults(
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

// The same number by two ways, to its last bits, and what is left where two numbers nearly cancel.
describe('closure of values that nearly agree', () => {
  const member = (secondOrder: string, units: string, own: object, combination: object) => ({
    ...{ format: 1, standard: 'aisc360-22', design: 'LRFD', units },
    analysis: { method: 'direct', secondOrder, includesMemberEffect: false, sway: 'none' },
    members: [
      {
        ...{ mark: 'near', section: 'W14X82', material: 'A992', length: '24 ft', ends: 'held' },
        ...{ Cb: 'auto', endMomentSign: 'bending', ...own },
        combinations: [{ name: 'any', P: '100 kip', ...combination }],
      },
    ],
  });
  const ways = ['exact', 'amplified', 'from-analysis'].flatMap((secondOrder) =>
    ['us', 'si'].map((units) => [secondOrder, units] as const),
  );

  it.each(ways)('a restraint at mid-length, %s, %s', (secondOrder, units) => {
    const faults = [
      ...['12 ft', '3657.6 mm', '3.6576 m', '3657.6000000000004 mm', '3657.5999999999995 mm'],
      ...['12.0000000000001 ft', '12.00000000001 ft', '12.000000001 ft', '12.0000001 ft'],
    ].flatMap((at) =>
      recordFaults(
        recordOf(
          member(
            ...[
              secondOrder,
              units,
              { restraints: [{ at, holds: ['in-plane', 'centre', 'twist'] }] },
            ],
            {
              ...{ MxA: '50 kip ft', MxB: '20 kip ft', MyA: '3 kip ft' },
              supports: [{ at, Mx: '30 kip ft', My: '2 kip ft' }],
              loads: [{ kind: 'uniform', bends: 'x', height: 'centre', w: '1 kip/ft' }],
            },
          ),
        ),
      ).map((fault) => `${at}: ${fault}`),
    );
    expect(faults).toEqual([]);
  });

  it.each(ways)('end moments, equal, reverse or next to none, %s, %s', (secondOrder, units) => {
    const lengths = { Lcx: '24 ft', Lcy: '24 ft', Lcz: '24 ft', Lb: '24 ft' };
    const faults = [6, 9, 10, 11, 12, 13, 14, 15].flatMap((power) =>
      [50 * (1 + 10 ** -power), -50 * (1 + 10 ** -power), 50 * 10 ** -power].flatMap((MB) =>
        // The other unit makes the last bits differ.
        [`${MB} kip ft`, `${MB * 1.3558179483314} kN m`].flatMap((MxB) =>
          recordFaults(
            recordOf(member(secondOrder, units, lengths, { MxA: '50 kip ft', MxB, MyA: MxB })),
          ).map((fault) => `${MxB}: ${fault}`),
        ),
      ),
    );
    expect(faults).toEqual([]);
  });
});
