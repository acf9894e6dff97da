import type { BasisDraft } from '#shared/contracts/calculations.ts';
import type { DraftRestraint } from '#shared/contracts/draft-parts.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';
import { assumed, drawn, forceFile, fromFile, none, typed } from './draft-values.ts';

/** TQ-CAL-014, Crane bay and canopy: ASD, effective length, amplified moments, SI. */

export const craneBasis: BasisDraft = {
  ...{ standard: 'aisc360-22', design: 'ASD', units: 'si', constants: 'si' },
  analysis: {
    method: 'effective-length',
    ...{ secondOrder: 'amplified', includesMemberEffect: null, sway: 'none' },
    swaySource: 'S-305 rev C: crane bay held by the bracing on grid 8',
    notionalLoads: '0.002 of the gravity load, gravity combinations only',
    ...{ program: 'frame analysis of the crane bay, first order', file: 'crane-forces.csv' },
  },
  buildingCode: { name: 'International Building Code', year: '2024', amendments: '' },
  ...{ adoptedEdition: '360-22', loadStandard: 'ASCE/SEI 7-22' },
  assumptions: 'The crane girder holds the columns in both planes and against twist at its level.',
};

const forces = forceFile('crane-forces.csv', [
  ['D + L', '920 kN', '128 kN m', '-64 kN m', '9 kN m', '9 kN m'],
  ['D + 0.75L + 0.75S', '1010 kN', '96 kN m', '-48 kN m', '7 kN m', '7 kN m'],
  ['D + L', '1180 kN', '212 kN m', '150 kN m', '18 kN m', '12 kN m'],
  ['D + 0.75L + 0.75S', '1240 kN', '168 kN m', '120 kN m', '14 kN m', '9 kN m'],
  ['D + S', '138 kN', '22 kN m', '', '4 kN m', ''],
  ['0.6D + 0.6W', '-42 kN', '17 kN m', ''],
  ['D + 0.6W', '640 kN', '24 kN m', '18 kN m'],
]);

function column(mark: string, place: string, section: string, length: string): MemberDraft {
  const measured = drawn(length, 'S-305', 'C', place);
  return {
    ...{ mark, place, material: 'A992', ownSteel: null },
    section: drawn(section, 'S-210', 'B', `mark ${mark}`),
    ends: drawn('held', 'S-305', 'C', place),
    ...{ length: measured, Lcx: measured, Lcy: measured, Lcz: measured, Lb: measured },
    ...{ Cb: typed('1'), endMomentSign: 'bending', combinations: [] },
  };
}

/** A girt of the wall at a distance from the base; the flange braces are on the drawing. */
const girt = (id: string, at: string, holds: DraftRestraint['holds']): DraftRestraint => ({
  ...{ id, at, holds, confirmed: true },
  source: { kind: 'drawing', number: 'S-305', revision: 'C', detail: 'grid 8/C, wall girts' },
});

/** Held by girts, of which the middle one has flange braces, with the wind on the wall. */
const windColumn: MemberDraft = {
  ...column('K-03', 'crane bay, grid 8/C', 'W14X90', '7.9 m'),
  ...{ Lcx: none, Lcy: none, Lcz: none, Lb: none, Cb: typed('auto') },
  restraints: [girt('r1', '2.6 m', ['top']), girt('r2', '5.2 m', ['top', 'bottom'])],
  combinations: [
    {
      ...fromFile(forces, 'c1', 7),
      loads: [
        {
          ...{ id: 'l1', kind: 'whole', bends: 'x', height: 'top', w: '6.5 kN/m' },
          ...{ wFrom: '', wTo: '', W: '', at: '', from: '', to: '', confirmed: false },
          source: { kind: 'assumption', basis: 'wind pressure before the wind study' },
        },
      ],
    },
  ],
};

export const craneMembers: readonly MemberDraft[] = [
  {
    ...column('K-01', 'crane bay, grid 8/A', 'W14X90', '7.9 m'),
    combinations: [fromFile(forces, 'c1', 1), fromFile(forces, 'c2', 2)],
  },
  {
    ...column('K-02', 'crane bay, grid 8/B', 'W14X90', '7.9 m'),
    Lb: assumed('7.9 m', 'the walkway bracket is not taken as a brace'),
    combinations: [fromFile(forces, 'c1', 3), fromFile(forces, 'c2', 4)],
  },
  windColumn,
  {
    ...column('P-01', 'canopy, grid 9/A', 'W8X31', '4.9 m'),
    endMomentSign: 'joint',
    Cb: typed('auto'),
    combinations: [fromFile(forces, 'c1', 5)],
  },
  {
    ...column('P-02', 'canopy, grid 9/B', 'W8X31', '4.9 m'),
    combinations: [fromFile(forces, 'c1', 5), fromFile(forces, 'c2', 6, false)],
  },
];
