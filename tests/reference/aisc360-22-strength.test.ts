import { evaluate } from 'mathjs';
import { describe, expect, it } from 'vitest';
import type { Line } from '#shared/calc/line.ts';
import type { Quantity } from '#shared/calc/quantity.ts';
import { createRecorder } from '#shared/calc/recorder.ts';
import { shearStrength } from '#shared/members/shear.ts';
import { tensionStrength } from '#shared/members/tension.ts';
import type { Expected } from '#shared/published-cases/published-cases.ts';
import { designationsOf, findShape } from '#shared/sections/table.ts';
import { tensionSlenderness } from '#shared/standards/aisc360-22/d2.ts';
import { h2Formulas, stressInteractionChecks } from '#shared/standards/aisc360-22/h2.ts';
import { base, quantities, quantity, sectionOf, steelOf, type Texts } from './given-texts.ts';
import { inUnit } from './in-unit.ts';
import { roundsTo } from './printed-digits.ts';
import { readPublished } from './published-cases.ts';

type Method = 'LRFD' | 'ASD';
interface Case {
  readonly example: string;
  readonly name: string;
  readonly run: 'shear' | 'tension' | 'stress';
  readonly axis?: 'x' | 'y';
  readonly steel?: Texts;
  readonly section: Texts;
  readonly net?: { readonly An: string; readonly U: string };
  readonly L?: string;
  readonly forces?: Readonly<Record<Method, Texts>>;
  readonly expected: readonly Expected[];
}
interface Row {
  readonly example: string;
  readonly what: string;
  readonly formula: string;
  readonly operands: Texts;
  readonly unit: string;
  readonly printed: string;
  readonly fromInputs: number;
}
const data = readPublished('strength.json') as {
  readonly cases: readonly Case[];
  readonly formulas: readonly Row[];
};

function linesOf(c: Case, method: Method): readonly Line[] {
  const r = createRecorder('');
  if (c.run === 'stress') {
    const s = quantities(r, c.section);
    const f = quantities(r, c.forces?.[method] ?? {});
    const of = (q: Record<string, Quantity>, name: string) => q[name] as Quantity;
    stressInteractionChecks(r, { Pr: of(f, 'P'), Pc: of(f, 'Pc'), Ag: of(s, 'A') }, [
      {
        name: 'corner',
        title: 'corner of the flange',
        x: { Mr: of(f, 'Mx'), S: of(s, 'Sx'), Mc: of(f, 'Mcx') },
        y: { Mr: of(f, 'My'), S: of(s, 'Sy'), Mc: of(f, 'Mcy') },
      },
    ]);
    return r.lines;
  }
  const steel = steelOf(r, c.steel as Texts);
  const section = sectionOf(r, c.section);
  if (c.run === 'shear') shearStrength(r, method, steel, section, c.axis as 'x' | 'y');
  else {
    const { An, U } = c.net as { An: string; U: string };
    const net = quantities(r, { An, U });
    tensionSlenderness(r, quantity(r, 'L', c.L as string), [section.rx, section.ry]);
    tensionStrength(r, method, steel, section, net);
  }
  return r.lines;
}

function valueAt(lines: readonly Line[], key: string): number {
  const line = lines.find((l) => l.key === key);
  if (line && 'value' in line) return line.value;
  if (line?.kind === 'check') return line.ratio;
  throw new Error(`no value at ${key}`);
}

for (const c of data.cases)
  for (const method of ['LRFD', 'ASD'] as const)
    describe(`Design Examples v16.0, ${c.example}, ${c.name}, ${method}`, () => {
      const lines = linesOf(c, method);
      for (const e of c.expected.filter((x) => x.method === 'nominal' || x.method === method))
        it(`${e.what}: ${e.printed} ${e.unit} at ${e.line}`, () => {
          const value = inUnit(valueAt(lines, e.line), e.unit);
          expect(Math.abs(value / e.fromInputs - 1), `${value}`).toBeLessThan(1e-6);
          const source = e.explained ? Number(evaluate(e.explained.expression)) : value;
          expect(roundsTo(source, e.printed), `${source} is not ${e.printed}`).toBe(true);
        });
    });

describe('Design Examples v16.0, single equations of H2', () => {
  for (const row of data.formulas)
    it(`${row.example}: ${row.what} = ${row.printed} ${row.unit}`, () => {
      const formula = Object.values(h2Formulas).find((f) => f.id === row.formula);
      if (!formula) throw new Error(`no formula ${row.formula}`);
      const operands = Object.fromEntries(
        Object.entries(row.operands).map(([name, text]) => [name, base(text).value]),
      );
      const value = inUnit(formula.expression.evaluate(operands), row.unit);
      expect(Math.abs(value / row.fromInputs - 1)).toBeLessThan(1e-6);
      expect(roundsTo(value, row.printed), `${value}`).toBe(true);
    });
});

describe('User Note of G2.1: rolled webs at 50 ksi that are not stocky', () => {
  it('are those of the list, among the W, S and HP shapes', () => {
    const designations = (['W', 'S', 'HP'] as const).flatMap((family) => designationsOf(family));
    const others = designations.filter((designation) => {
      const shape = findShape(designation);
      if (shape?.kind !== 'i') throw new Error(`no I-shape ${designation}`);
      const { d, tw, lambdaw } = shape.properties;
      const r = createRecorder('');
      const section = sectionOf(r, {
        ...{ kind: 'i', made: 'rolled' },
        ...{ d: d.published, tw: tw.published, lambdaw: lambdaw.published },
      });
      const steel = steelOf(r, { E: '29000 ksi', Fy: '50 ksi' });
      shearStrength(r, 'LRFD', steel, section, 'x');
      return valueAt(r.lines, 'G2/x/phiv') !== 1;
    });
    const list = 'W44X230 W40X149 W36X135 W33X118 W30X90 W24X55 W16X26 W12X14';
    expect([...others].sort()).toEqual(list.split(' ').sort());
    expect(designations.length).toBeGreaterThan(300);
  });
});

describe('User Note of G6: rolled flanges up to 70 ksi', () => {
  it('yield in shear, of every W, M, S and HP shape', () => {
    const designations = (['W', 'M', 'S', 'HP'] as const).flatMap((family) =>
      designationsOf(family),
    );
    const buckling = designations.filter((designation) => {
      const shape = findShape(designation);
      if (shape?.kind !== 'i') throw new Error(`no I-shape ${designation}`);
      const { bf, tf, lambdaf } = shape.properties;
      const r = createRecorder('');
      const section = sectionOf(r, {
        ...{ kind: 'i', made: 'rolled' },
        ...{ bf: bf.published, tf: tf.published, lambdaf: lambdaf.published },
      });
      shearStrength(r, 'LRFD', steelOf(r, { E: '29000 ksi', Fy: '70 ksi' }), section, 'y');
      return valueAt(r.lines, 'G6/y/Cv2') !== 1;
    });
    expect(buckling).toEqual([]);
  });
});
