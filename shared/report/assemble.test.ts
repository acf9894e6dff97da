import { readFileSync } from 'node:fs';
import katex from 'katex';
import { describe, expect, it } from 'vitest';
import { lineGraph } from '../calc/graph.ts';
import type { CalculationRecord } from '../calc/record.ts';
import { parseInput } from '../members/parse-input.ts';
import { runCalculation } from '../members/run.ts';
import { assembleReport } from './assemble.ts';
import { CAUTIONS, PRELIMINARY } from './cautions.ts';
import { memberTable } from './completeness-block.ts';
import { editionNotice } from './cover-block.ts';
import { type DocumentData, unsignedDocument } from './document-data.ts';
import { memberSheet } from './member-sheet.ts';
import { parseTemplate } from './parse-template.ts';
import { presentTrace } from './present-trace.ts';
import type { Block, BlockOf } from './tree.ts';

const held = (mark: string, section: string, more: object) => ({
  mark,
  section,
  material: 'A992',
  length: '22 ft',
  ends: 'held',
  Lcx: '22 ft',
  Lcy: { value: '22 ft', source: { kind: 'assumption', basis: 'no brace counted' } },
  Lcz: '22 ft',
  Lb: '22 ft',
  endMomentSign: 'bending',
  ...more,
});

const INPUT = {
  format: 1,
  standard: 'aisc360-22',
  design: 'LRFD',
  units: 'us',
  analysis: { method: 'direct', secondOrder: 'exact', sway: 'none' },
  members: [
    held('C-07', 'W12X79', {
      combinations: [
        {
          name: '1.2D + 1.6L',
          P: '310 kip',
          MxA: '118 kip ft',
          MxB: '104 kip ft',
          MyA: '18 kip ft',
          MyB: '18 kip ft',
        },
        { name: '1.2D + L + W', P: '200 kip', MxA: '118 kip ft', MxB: '-104 kip ft' },
        { name: 'no axial force', P: '0 kip', MxA: '50 kip ft', MxB: '20 kip ft' },
      ],
    }),
    held('C-08', 'W12X79', { combinations: [{ name: '0.9D + W', P: '-20 kip', MxA: '9 kip ft' }] }),
    held('C-09', 'W8X24', { combinations: [{ name: '1.4D', P: '900 kip', MxA: '9 kip ft' }] }),
    held('C-10', 'WT8X50', { combinations: [{ name: '1.4D', P: '90 kip' }] }),
    held('C-11', 'W12X79', {
      length: '6.7 m',
      endMomentSign: 'joint',
      combinations: [{ name: '1.4D', P: '400 kN', MxA: '90 kN m', MxB: '90 kN m' }],
    }),
  ],
};

function run(changes: object = {}): CalculationRecord {
  const parsed = parseInput({ ...INPUT, ...changes });
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  return runCalculation(parsed.input);
}

const record = run();
const template = parseTemplate(
  readFileSync(new URL('../../templates/full.md', import.meta.url), 'utf8'),
).template;
const document: DocumentData = {
  ...unsignedDocument('Hall columns', '14 May 2025', 'Letter'),
  firm: 'Harrow & Pike Structural',
};
const tree = assembleReport({ template, record, document });

const of = <K extends Block['kind']>(blocks: readonly Block[], kind: K): BlockOf<K>[] =>
  blocks.filter((b): b is BlockOf<K> => b.kind === kind);
const words = (block: Block): string => JSON.stringify(block);

describe('report', () => {
  it('prints every line of the record once, with its address', () => {
    const expected = record.members.flatMap((m) => [
      ...m.lines.map((l) => `${m.id} ${l.key}`),
      ...m.combinations.flatMap((c) => c.lines.map((l) => `${m.id} ${c.id}:${l.key}`)),
    ]);
    let member = '';
    const printed = tree.blocks.flatMap((b) => {
      if (b.kind === 'sheetHead') member = b.member;
      return b.kind === 'line' || b.kind === 'lineSection' ? [`${member} ${b.address}`] : [];
    });
    expect(printed).toEqual(expected);
  });

  it('says preliminary on every page and nothing of checked or approved by itself', () => {
    expect(tree.frame.marking).toBe(PRELIMINARY);
    expect(tree.frame.checker).toBe('not yet checked');
    const [cover] = of(tree.blocks, 'cover');
    const field = (label: string) => cover?.fields.find((f) => f.label === label)?.value;
    expect(field('Checker')).toBe('not yet checked');
    expect(field('Approver')).toBe('not yet approved');
    expect(cover?.notices).toContain(PRELIMINARY);
    const issued = assembleReport({ template, record, document: { ...document, issued: true } });
    expect(issued.frame.marking).toBeNull();
  });

  it('counts the inputs not confirmed on the cover and lists each of them', () => {
    const [cover] = of(tree.blocks, 'cover');
    const count = cover?.fields.find((f) => f.label === 'Inputs not confirmed');
    const table = of(tree.blocks, 'table').find((t) => t.caption.startsWith('Inputs that'));
    expect(count).toMatchObject({ value: String(table?.rows.length), tone: 'over' });
    expect(words(table as Block)).toContain('assumption: no brace counted');
  });

  it('shows FAILED and NOT CHECKED on the cover and in the summary', () => {
    const [cover] = of(tree.blocks, 'cover');
    expect(cover?.notices).toContain('FAILED: C-09.');
    expect(cover?.notices).toContain('NOT CHECKED: C-08, C-10.');
    const table = of(tree.blocks, 'table').find((t) => t.caption.startsWith('Members'));
    const verdicts = table?.rows.map((r) => [
      r[3]?.content[0]?.text,
      r[3]?.tone,
      r[4]?.content[0]?.text,
    ]);
    expect(verdicts).toEqual([
      ['OK', 'strong', '0.981'],
      ['NOT CHECKED', 'over', '–'],
      ['FAILED', 'over', '–'],
      ['NOT CHECKED', 'over', '–'],
      [record.members[4]?.summary.verdict, expect.anything(), record.members[4]?.summary.ratioText],
    ]);
  });

  it('tells the completeness of every member, limit state and combination', () => {
    for (const member of record.members) {
      const table = of(tree.blocks, 'table').find((t) =>
        t.caption.startsWith(`Completeness of ${member.mark},`),
      );
      const told = words(table as Block);
      for (const row of member.completeness) expect(told).toContain(row.title);
    }
    const outside = of(tree.blocks, 'table').map((table) => words(table));
    expect(outside.filter((told) => told.includes('temporary works'))).toHaveLength(1);
  });

  it('keeps combinations with different reasons apart', () => {
    const [first] = record.members;
    const [row] = first?.completeness ?? [];
    const [one] = row?.cells ?? [];
    if (!first || !row || !one) throw new Error('no completeness');
    const cells = ['same', 'same', 'other'].map((because, i) => ({
      ...one,
      combination: `c${i + 1}`,
      because,
    }));
    const table = memberTable({ ...first, completeness: [{ ...row, cells }] });
    const told = (table as BlockOf<'table'>).rows.map((r) => [
      r[3]?.content[0]?.text,
      r[5]?.content[0]?.text,
    ]);
    expect(told).toEqual([
      ['1.2D + 1.6L; 1.2D + L + W', 'same'],
      ['no axial force', 'other'],
    ]);
  });

  it('carries the cautions', () => {
    expect(of(tree.blocks, 'cautions')).toEqual([{ kind: 'cautions', items: CAUTIONS }]);
  });

  it('warns where the building code adopts another edition', () => {
    expect(editionNotice('360-16', 'ANSI/AISC 360-22')).toContain('360-16');
    expect(editionNotice('360-22', 'ANSI/AISC 360-22')).toBeNull();
    expect(editionNotice('ANSI/AISC 360-22', 'ANSI/AISC 360-22')).toBeNull();
    expect(editionNotice('', 'ANSI/AISC 360-22')).toBeNull();
  });

  it('holds no number that is not one, and only TeX that KaTeX sets', () => {
    for (const changes of [{}, { units: 'si' }]) {
      const whole = assembleReport({ template, record: run(changes), document });
      expect(JSON.stringify(whole)).not.toMatch(/NaN|Infinity|undefined|null,null/);
      for (const line of of(whole.blocks, 'line'))
        for (const chunk of line.working)
          katex.renderToString(chunk, { throwOnError: true, strict: false, trust: true });
      for (const { scene } of of(whole.blocks, 'figure'))
        for (const shape of scene.shapes)
          expect(JSON.stringify(shape), scene.description).not.toContain('null');
    }
  });
});

describe('member sheet', () => {
  const sheet = memberSheet(record, 'm1', 'c1');

  it('shows the member lines and those of one combination only', () => {
    const combinations = of(sheet, 'line').map((l) => l.address.split(':')[0]);
    expect(combinations).toContain('c1');
    expect(combinations).not.toContain('c2');
    expect(of(sheet, 'line').length).toBeGreaterThan(50);
  });

  it('splits the ratio into the terms of the interaction equation', () => {
    const [verdict] = of(sheet, 'verdict');
    expect(verdict).toMatchObject({ verdict: 'OK', ratioText: '0.981', limit: '1.000' });
    expect(verdict?.governs).toContain('H1-1a');
    // 310/603.7, 8/9 × 134.44/382.5, 8/9 × 35.45/203.6 by hand from the printed values.
    expect(verdict?.terms.map((t) => [t.label, t.text])).toEqual([
      ['axial', '0.514'],
      ['major', '0.312'],
      ['minor', '0.155'],
    ]);
  });

  it('draws the member, moments and shear, the interaction and the section', () => {
    const figures = of(sheet, 'figure').map((f) => f.scene.description);
    // Equal minor-axis moments have no shear.
    expect(figures).toHaveLength(5);
    expect(figures[0]).toContain('axial compression P 310 kip');
    expect(figures[1]).toContain('Largest second-order moment 134.44 kip ft at 9.269 ft from A');
    expect(figures[2]).toContain('First-order shear in bending about the major axis');
    expect(figures[3]).toContain('minor axis, single curvature');
    expect(figures[4]).toContain('3 combinations');
    expect(figures[4]).toContain('d 12.4 in');
  });

  it('labels the section in the unit of the sheet', () => {
    // 12.4 in = 314.96 mm by hand (1 in = 25.4 mm).
    const parsed = parseInput({ ...INPUT, units: 'si' });
    if (!parsed.ok) throw new Error('the input is right');
    const si = memberSheet(runCalculation(parsed.input), 'm1');
    const outline = of(si, 'figure').at(-1)?.scene.description;
    expect(outline).toMatch(/d 31[45](\.\d+)? mm/);
    expect(outline).not.toContain(' in');
  });

  it('draws the joint sense by the way the ends really turn', () => {
    const joint = memberSheet(record, 'm5');
    const diagram = of(joint, 'figure').find((f) => f.scene.description.startsWith('Moments'));
    expect(diagram?.scene.description).toContain('reverse curvature');
  });

  it('draws first order only for a member at its critical load, and says why', () => {
    const failed = memberSheet(record, 'm3');
    expect(of(failed, 'verdict')[0]).toMatchObject({
      verdict: 'FAILED',
      ratioText: null,
      terms: [],
    });
    const diagram = of(failed, 'figure').find((f) => f.scene.description.startsWith('Moments'));
    expect(diagram?.scene.description).toContain('no stable solution');
  });

  it('shows a value typed in other units as it was typed', () => {
    const lines = of(memberSheet(record, 'm5'), 'line');
    const length = lines.find((l) => l.address === 'given/L');
    // 6.7 m / 0.3048 m = 21.98 ft.
    expect(length?.result).toEqual({ value: '21.98', unit: 'ft' });
    expect(words(length as Block)).toContain('given as 6.7 m');
  });

  it('refuses a member or a combination that is not there', () => {
    expect(() => memberSheet(record, 'nobody')).toThrow('no member');
    expect(() => memberSheet(record, 'm1', 'c9')).toThrow('no combination');
  });
});

describe('trace', () => {
  it('goes down to given values and up to what uses the line', () => {
    const trace = presentTrace(record, 'm1', 'c1:theory/x/Mmax');
    expect(trace?.chosen).toMatchObject({ title: 'Largest second-order moment, major axis' });
    expect(trace?.sources.map((s) => s.address)).toEqual([
      'c1:theory/x/absA',
      'c1:theory/x/psi',
      'c1:theory/x/kL',
    ]);
    expect(trace?.ladder.some((s) => s.given?.source === 'typed')).toBe(true);
    expect(trace?.usedBy.map((s) => s.address)).toContain('c1:H1/ratio');
    expect(presentTrace(record, 'm1', 'c1:no/line')).toBeNull();
  });

  it('exists for every line and ends in lines that come from nowhere else', () => {
    for (const member of record.members) {
      const graph = lineGraph(member);
      for (const [address, { line }] of graph.lines) {
        if (line.kind === 'section') continue;
        const trace = presentTrace(record, member.id, address);
        expect(trace?.ladder.length).toBe(graph.ladder(address).length);
        const last = trace?.ladder.at(-1);
        if (last) expect(graph.sources(last.address)).toEqual([]);
      }
    }
  });
});
