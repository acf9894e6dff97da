import type { BasisDraft } from '#shared/contracts/calculations.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';
import { assumed, drawn, forceFile, fromFile, typed } from './draft-values.ts';

/** TQ-CAL-012, Hall columns: LRFD, direct analysis, moments by the exact elastic solution. */

export const hallBasis: BasisDraft = {
  ...{ standard: 'aisc360-22', design: 'LRFD', units: 'us', constants: 'us' },
  analysis: {
    ...{ method: 'direct', secondOrder: 'exact', includesMemberEffect: null, sway: 'none' },
    swaySource: 'S-201 rev C: braced in both directions, bracing on grids 1 and 8',
    notionalLoads: '0.002 of the gravity load at each level, both directions',
    ...{ program: 'frame analysis of the hall, first order', file: 'hall-forces.csv' },
  },
  buildingCode: { name: 'International Building Code', year: '2024', amendments: '' },
  ...{ adoptedEdition: '360-22', loadStandard: 'ASCE/SEI 7-22' },
  assumptions: 'Girts do not restrain the columns. Bases are pinned.',
};

const forces = forceFile('hall-forces.csv', [
  ['1.2D + 1.6L', '182 kip', '41 kip ft', '-36 kip ft', '6 kip ft', '6 kip ft'],
  ['1.2D + L + W', '148 kip', '62 kip ft', '-20 kip ft', '4 kip ft', '4 kip ft'],
  ['1.2D + 1.6L', '264 kip', '96 kip ft', '71 kip ft', '9 kip ft', '-7 kip ft'],
  ['1.2D + L + W', '221 kip', '118 kip ft', '54 kip ft', '9 kip ft', '-7 kip ft'],
  ['1.2D + 1.6L', '310 kip', '118 kip ft', '104 kip ft', '18 kip ft', '18 kip ft'],
  ['1.2D + L + W', '268 kip', '131 kip ft', '62 kip ft', '14 kip ft', '14 kip ft'],
  ['1.2D + 1.6L', '372 kip', '126 kip ft', '120 kip ft', '21 kip ft', '18 kip ft'],
  ['1.2D + L + W', '334 kip', '138 kip ft', '74 kip ft', '16 kip ft', '14 kip ft'],
  ['0.9D + W', '-38 kip', '44 kip ft', '12 kip ft'],
  ['1.2D + 1.6L', '96 kip', '31 kip ft', '22 kip ft'],
  ['1.2D + 1.6L', '164 kip', '12 kip ft', '12 kip ft', '3 kip ft', '3 kip ft'],
]);

const braced = 'no brace is drawn; the full height is taken';

function column(mark: string, grid: string, section: string, length: string): MemberDraft {
  const measured = drawn(length, 'S-201', 'C', `grid ${grid}`);
  return {
    ...{ mark, place: `grid ${grid}`, material: 'A992', ownSteel: null },
    section: drawn(section, 'S-210', 'B', `mark ${mark}`),
    ends: drawn('held', 'S-201', 'C', `grid ${grid}, base and roof`),
    ...{ length: measured, Lcx: measured, Lcy: measured, Lcz: measured, Lb: measured },
    ...{ Cb: typed('1'), endMomentSign: 'bending', combinations: [] },
  };
}

const assumedLengths = (length: string) => ({
  Lcy: assumed(length, braced),
  Lb: assumed(length, braced),
});

export const hallMembers: readonly MemberDraft[] = [
  {
    ...column('C-05', '2/A', 'W10X49', '14 ft'),
    combinations: [fromFile(forces, 'c1', 1), fromFile(forces, 'c2', 2)],
  },
  {
    ...column('C-06', '3/A', 'W12X65', '18 ft'),
    combinations: [fromFile(forces, 'c1', 3), fromFile(forces, 'c2', 4)],
  },
  {
    ...column('C-07', '4/B', 'W12X79', '22 ft'),
    ...assumedLengths('22 ft'),
    combinations: [fromFile(forces, 'c1', 5), fromFile(forces, 'c2', 6)],
  },
  {
    ...column('C-08', '5/B', 'W12X79', '22 ft'),
    ...assumedLengths('22 ft'),
    // The section moved on after the analysis: its forces are not confirmed, and say why.
    combinations: [fromFile(forces, 'c1', 7), fromFile(forces, 'c2', 8)].map((row) => ({
      ...row,
      analysedWith: 'W12X65',
    })),
  },
  {
    ...column('C-09', '6/B', 'W10X33', '16 ft'),
    combinations: [fromFile(forces, 'c1', 10), fromFile(forces, 'c2', 9)],
  },
  {
    ...column('C-10', '7/C', 'W8X18', '24 ft'),
    combinations: [fromFile(forces, 'c1', 11)],
  },
];
