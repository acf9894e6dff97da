import { isValued, type ValuedLine } from '../calc/line.ts';
import type { CalculationRecord } from '../calc/record.ts';
import { readText } from '../figures/read-line.ts';
import { UNIT_SETS } from '../units/unit-set.ts';
import { DESIGN_WORDS, METHOD_WORDS, secondOrderWords } from './basis-words.ts';
import { cell, strongCell } from './cells.ts';
import { type DocumentData, stated } from './document-data.ts';
import type { StandardNames } from './sheet-books.ts';
import type { Block } from './tree.ts';

/** The basis of design as one table: codes, method, units, constants, program, assumptions. */
export function basisBlock(
  record: CalculationRecord,
  document: DocumentData,
  standards: readonly StandardNames[],
): Block {
  const { buildingCode, adoptedEdition, loadStandard, analysis, assumptions } = document.basis;
  const code = [buildingCode.name, buildingCode.year].filter(Boolean).join(' ');
  const set = UNIT_SETS[record.units];
  const rows: [string, string][] = [
    ['Building code', stated(code)],
    ['Amendments', stated(buildingCode.amendments)],
    ['Edition it adopts', stated(adoptedEdition)],
    ['Loads', stated(loadStandard)],
    ...standards.map((s, i): [string, string] => [
      i === 0 ? 'Standards used' : '',
      s.title.startsWith(s.name) ? s.title : `${s.name}: ${s.title}`,
    ]),
    ['Design method', DESIGN_WORDS[record.design]],
    ['Analysis method', METHOD_WORDS[record.analysis.method]],
    ['Second-order moments', secondOrderWords(record.analysis)],
    ['Sway', `none; known from: ${stated(analysis.swaySource)}`],
    ['Notional loads', stated(analysis.notionalLoads)],
    ['Analysis by', stated([analysis.program, analysis.file].filter(Boolean).join(', '))],
    ['Signs', 'compression positive; x is the major axis, y the minor; z runs along the member'],
    ['Units', set.title],
    ...materialRows(record),
    ...tableRows(record),
    ['Assumptions', stated(assumptions)],
    [
      'Program',
      `${record.program.name}, engine ${record.program.engine}, input and record format ${record.format}`,
    ],
  ];
  return {
    kind: 'table',
    caption: 'Basis of design',
    head: [cell('Item'), cell('Basis')],
    rows: rows.map(([label, value]) => [strongCell(label), cell(value)]),
    widths: [3, 9],
  };
}

/** Symbols of the material constants, as the members' lines name them. */
const CONSTANTS = ['E', 'G', 'Fy', 'Fu'];

/** Each material with its constants as the members' lines print them. */
function materialRows(record: CalculationRecord): [string, string][] {
  const set = UNIT_SETS[record.units];
  const materials = new Set<string>();
  for (const member of record.members) {
    const constants = member.lines.filter(
      (line): line is ValuedLine =>
        isValued(line) &&
        (line.kind === 'lookup' || line.kind === 'given') &&
        CONSTANTS.includes(line.symbol),
    );
    const words = constants.map((line) => `${line.symbol} ${readText(line, set)}`).join(', ');
    if (words !== '') materials.add(`${member.material}: ${words}`);
  }
  return [...materials].map((words, i) => [i === 0 ? 'Materials' : '', words]);
}

/** The publications that table values are from. */
function tableRows(record: CalculationRecord): [string, string][] {
  const lines = record.members.flatMap((member) => member.lines);
  const tables = new Set(
    lines.flatMap((line) =>
      line.kind === 'lookup' && !line.table.startsWith('Clause ')
        ? [`${line.table}: ${line.tableSource}`]
        : [],
    ),
  );
  return [...tables].map((words, i) => [i === 0 ? 'Tables' : '', words]);
}
