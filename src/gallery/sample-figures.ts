import { parseInput } from '#shared/members/parse-input.ts';
import { runCalculation } from '#shared/members/run.ts';
import { interactionFigure, memberFigures } from '#shared/report/sheet-figures.ts';
import type { Block } from '#shared/report/tree.ts';

/** A made-up member with a restraint of every kind, loads at every face, compressed and pulled. */
const INPUT = {
  format: 1,
  standard: 'aisc360-22',
  design: 'LRFD',
  units: 'us',
  analysis: { method: 'direct', secondOrder: 'exact', sway: 'none' },
  members: [
    {
      mark: 'B-04',
      section: 'W14X48',
      material: 'A992',
      length: '30 ft',
      ends: 'held',
      Cb: 'auto',
      endMomentSign: 'bending',
      restraints: [
        { at: '10 ft', holds: ['top'] },
        { at: '15 ft', holds: ['in-plane', 'centre', 'twist'] },
        { at: '22 ft', holds: ['bottom'] },
      ],
      netSection: { Ae: '12 in²' },
      combinations: [
        {
          name: '1.2D + 1.6L',
          P: '120 kip',
          MxA: '60 kip ft',
          MxB: '-30 kip ft',
          supports: [{ at: '15 ft', Mx: '-45 kip ft' }],
          loads: [
            { kind: 'point', bends: 'x', W: '14 kip', at: '6 ft', height: 'centre' },
            { kind: 'uniform', bends: 'x', w: '0.4 kip/ft', height: 'bottom' },
            {
              ...{ kind: 'linear', bends: 'x', wFrom: '0 kip/ft', wTo: '0.6 kip/ft' },
              ...{ from: '15 ft', to: '25 ft', height: 'centre' },
            },
          ],
        },
        {
          name: '0.9D + 1.0W',
          P: '-60 kip',
          MxA: '40 kip ft',
          supports: [{ at: '15 ft', Mx: '25 kip ft' }],
        },
      ],
    },
  ],
};

/** The figures of that member. */
export const sampleFigures: readonly Block[] = figures();

function figures(): Block[] {
  const parsed = parseInput(INPUT);
  if (!parsed.ok) throw new Error(parsed.problems.map((p) => `${p.path}: ${p.message}`).join('\n'));
  const record = runCalculation(parsed.input);
  return record.members.flatMap((member) => [
    ...member.combinations.flatMap((c) => memberFigures(record, member, c)),
    ...interactionFigure(record, member),
  ]);
}
