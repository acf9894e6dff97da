import type { Block, TableCell } from './tree.ts';

/** Printed on every page of a calculation that is not issued. */
export const PRELIMINARY = 'Preliminary, not issued';

export const NOT_YET_CHECKED = 'not yet checked';
export const NOT_YET_APPROVED = 'not yet approved';

/** What every sheet, report and e-mail says, in this order. */
export const CAUTIONS: readonly string[] = [
  'This calculation does not replace the locally adopted building code and its amendments, nor the standards it cites. Where they differ from it, they decide.',
  'A licensed engineer takes responsibility for this calculation: for its inputs, for the choice of method and for the use made of its results.',
  'It covers the members and limit states it lists and nothing else. It does not cover connections, base plates, strength and stiffness of bracing, deflection, torsion, fire, fatigue, seismic detailing, erection stability and temporary works.',
  'A calculation that is not issued is preliminary and is marked so on every page.',
];

/** The same in short, for the title sheet. */
export const CAUTIONS_OF_COVER: readonly string[] = [
  'It does not replace the locally adopted building code and its amendments. A licensed engineer takes responsibility for it.',
  'Not covered: connections, base plates, strength and stiffness of bracing, torsion, deflection, concentrated forces, holes, fire, fatigue, seismic detailing, erection stability, temporary works.',
];

/** The same in one line, for the foot of every page. */
export const CAUTION_OF_EVERY_PAGE =
  'Does not replace the locally adopted code. A licensed engineer takes responsibility for it. What is not covered stands under Cautions.';

interface Outside {
  readonly what: string;
  /** Where the standards treat it, for a reader who has to see to it elsewhere. */
  readonly where: string;
}

/** Outside every sheet. The clauses are of ANSI/AISC 360-22 where no other standard is named. */
export const OUTSIDE_EVERY_SHEET: readonly Outside[] = [
  { what: 'Torsion, loads off the shear centre', where: 'H3' },
  { what: 'Limits of deflection and drift', where: 'Chapter L' },
  { what: 'Concentrated forces on webs and flanges', where: 'J10' },
  { what: 'Holes and reduced sections in bending', where: 'F13.1' },
  { what: 'Strength and stiffness of the bracing taken as holding', where: 'App. 6' },
  { what: 'Connections, eccentric ones among them, and base plates', where: 'Chapter J' },
  { what: 'Fire', where: 'App. 4' },
  { what: 'Fatigue', where: 'App. 3' },
  { what: 'Seismic detailing', where: 'AISC 341' },
  { what: 'Erection stability and temporary works', where: 'not in the standard' },
];

const cell = (text: string): TableCell => ({ content: [{ kind: 'text', text }] });

export const cautionsBlock = (): Block => ({ kind: 'cautions', items: CAUTIONS });

export const outsideTable = (): Block => ({
  kind: 'table',
  caption: 'Outside every sheet of this calculation',
  head: [cell('Not covered'), cell('Treated in'), cell('State')],
  rows: OUTSIDE_EVERY_SHEET.map(({ what, where }) => [
    cell(what),
    cell(where),
    cell('NOT CHECKED'),
  ]),
  widths: [5, 2, 2],
});
