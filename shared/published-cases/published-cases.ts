import c2At150Kip from './aisc360-22/c2-benchmark-1-150kip.json' with { type: 'json' };
import c2At300Kip from './aisc360-22/c2-benchmark-1-300kip.json' with { type: 'json' };
import c2At450Kip from './aisc360-22/c2-benchmark-1-450kip.json' with { type: 'json' };
import d1 from './aisc360-22/d-1.json' with { type: 'json' };
import e1a from './aisc360-22/e-1a.json' with { type: 'json' };
import e1bAt19Feet from './aisc360-22/e-1b-19ft.json' with { type: 'json' };
import e1bTrue from './aisc360-22/e-1b-true.json' with { type: 'json' };
import e1d from './aisc360-22/e-1d.json' with { type: 'json' };
import e1eAt5Feet from './aisc360-22/e-1e-5ft.json' with { type: 'json' };
import e1eAt10Feet from './aisc360-22/e-1e-10ft.json' with { type: 'json' };
import e1eAt15Feet from './aisc360-22/e-1e-15ft.json' with { type: 'json' };
import e2 from './aisc360-22/e-2.json' with { type: 'json' };
import e3 from './aisc360-22/e-3.json' with { type: 'json' };
import e4a from './aisc360-22/e-4a.json' with { type: 'json' };
import e4aChart from './aisc360-22/e-4a-chart.json' with { type: 'json' };
import e4aChartLower from './aisc360-22/e-4a-chart-ab.json' with { type: 'json' };
import e4bChart from './aisc360-22/e-4b-chart.json' with { type: 'json' };
import e9 from './aisc360-22/e-9.json' with { type: 'json' };
import e10 from './aisc360-22/e-10.json' with { type: 'json' };
import e11 from './aisc360-22/e-11.json' with { type: 'json' };
import equations from './aisc360-22/equations.json' with { type: 'json' };
import f11b from './aisc360-22/f-1-1b.json' with { type: 'json' };
import f12b from './aisc360-22/f-1-2b.json' with { type: 'json' };
import f21b from './aisc360-22/f-2-1b.json' with { type: 'json' };
import f22b from './aisc360-22/f-2-2b.json' with { type: 'json' };
import f3b from './aisc360-22/f-3b.json' with { type: 'json' };
import f5 from './aisc360-22/f-5.json' with { type: 'json' };
import f6 from './aisc360-22/f-6.json' with { type: 'json' };
import f7b from './aisc360-22/f-7b.json' with { type: 'json' };
import f8b from './aisc360-22/f-8b.json' with { type: 'json' };
import f9b from './aisc360-22/f-9b.json' with { type: 'json' };
import g1b from './aisc360-22/g-1b.json' with { type: 'json' };
import g2b from './aisc360-22/g-2b.json' with { type: 'json' };
import g4 from './aisc360-22/g-4.json' with { type: 'json' };
import g6 from './aisc360-22/g-6.json' with { type: 'json' };
import g7 from './aisc360-22/g-7.json' with { type: 'json' };
import g8a from './aisc360-22/g-8a.json' with { type: 'json' };
import h1a from './aisc360-22/h-1a.json' with { type: 'json' };
import h1b from './aisc360-22/h-1b.json' with { type: 'json' };
import h2 from './aisc360-22/h-2.json' with { type: 'json' };
import h4 from './aisc360-22/h-4.json' with { type: 'json' };
import iiiBraced from './aisc360-22/iii-braced.json' with { type: 'json' };
import iiiSelmAsd from './aisc360-22/iii-selm-asd.json' with { type: 'json' };
import iiiSelmLrfd from './aisc360-22/iii-selm-lrfd.json' with { type: 'json' };
import tables from './aisc360-22/tables-w.json' with { type: 'json' };
import theory from './elastic-theory/equations.json' with { type: 'json' };

export interface PublishedSource {
  readonly title: string;
  readonly edition: string;
  readonly example: string;
  readonly page: string;
}

export interface Expected {
  readonly what: string;
  readonly method: 'LRFD' | 'ASD' | 'nominal';
  /** Address of the engine's line. */
  readonly line: string;
  /** The published quantity from the line's value x in `lineUnit`. */
  readonly derive?: string;
  readonly lineUnit?: string;
  readonly unit: string;
  /** As the source prints it. */
  readonly printed: string;
  /** The example's chain from its inputs, nothing rounded on the way. */
  readonly fromInputs: number;
  readonly working: string;
  /** Printed intermediates that lead to what is printed. */
  readonly explained?: { readonly by: string; readonly expression: string };
}

/** A published example of a whole member: its input by each design method, and what it prints. */
export interface PublishedCase {
  readonly id: string;
  readonly source: PublishedSource;
  readonly analysis: unknown;
  readonly member: Readonly<Record<string, unknown>>;
  readonly combinations: Readonly<Record<'LRFD' | 'ASD', readonly unknown[]>>;
  readonly expected: readonly Expected[];
}

/** A published, or numerically found, value of one equation from its operands. */
export interface PublishedEquation {
  readonly example: string;
  readonly what: string;
  readonly formula: string;
  /** With units: `264 in`. */
  readonly operands: Readonly<Record<string, string>>;
  readonly unit: string;
  /** null: the source prints no such number; by hand from its inputs. */
  readonly printed: string | null;
  readonly fromInputs: number;
  readonly working: string;
  readonly explained?: { readonly by: string; readonly expression: string };
}

interface TableValue {
  readonly printed: string;
  readonly fromInputs: number;
}

/** Available flexural strengths of one row of a table of the Manual, steel A992, kip ft. */
export interface PublishedStrength {
  readonly section: string;
  readonly quoted: string;
  readonly table: string;
  readonly axis: 'x' | 'y';
  readonly Lb?: string;
  readonly LRFD: TableValue;
  readonly ASD: TableValue;
  /** The value is read off a diagram. */
  readonly reading?: string;
}

/** Limits of the unbraced length of one row of a table of the Manual, steel A992, ft. */
export interface PublishedLimits {
  readonly section: string;
  readonly table: string;
  readonly Lp: TableValue;
  readonly Lr: TableValue;
}

/** Examples of whole members. */
export const PUBLISHED_CASES = [
  ...[c2At150Kip, c2At300Kip, c2At450Kip],
  ...[d1],
  ...[
    e1a,
    e1bAt19Feet,
    e1bTrue,
    e1d,
    e1eAt5Feet,
    e1eAt10Feet,
    e1eAt15Feet,
    e2,
    e3,
    e4a,
    e4aChart,
    e4aChartLower,
    e4bChart,
    e9,
    e10,
    e11,
  ],
  ...[f11b, f12b, f21b, f22b, f3b, f5, f6, f7b, f8b, f9b],
  ...[g1b, g2b, g4, g6, g7, g8a],
  ...[h1a, h1b, h2, h4],
  ...[iiiBraced, iiiSelmAsd, iiiSelmLrfd],
] as readonly PublishedCase[];

/** Single equations: of examples that the program doesn't run as members, and of the theory. */
export const PUBLISHED_EQUATIONS = [equations, theory] as readonly {
  readonly source: PublishedSource;
  readonly formulas: readonly PublishedEquation[];
}[];

/** Rows of the Manual's tables that the examples quote. */
export const PUBLISHED_TABLES = tables as {
  readonly source: PublishedSource;
  readonly strengths: readonly PublishedStrength[];
  readonly limits: readonly PublishedLimits[];
};

type Design = 'LRFD' | 'ASD';

/** INPUT.json of a published example by one design method; null where the source has none. */
export const publishedInput = (data: PublishedCase, design: Design): unknown =>
  data.combinations[design].length === 0
    ? null
    : inputOf(design, data.analysis, { ...data.member, combinations: data.combinations[design] });

/** INPUT.json of a row of a table: the section in bending alone about one axis. */
export const tableInput = (
  { section, axis, Lb }: { section: string; axis: 'x' | 'y'; Lb?: string },
  design: Design,
): unknown =>
  inputOf(
    design,
    {
      method: 'direct',
      secondOrder: 'from-analysis',
      includesMemberEffect: true,
      sway: 'none',
    },
    {
      mark: section,
      section,
      material: 'A992',
      length: '20 ft',
      ends: 'held',
      ...(Lb && { Lb }),
      combinations: [{ name: 'any', P: '0 kip', [`M${axis}Max`]: '10 kip ft' }],
    },
  );

const inputOf = (design: Design, analysis: unknown, member: unknown): unknown => ({
  format: 1,
  standard: 'aisc360-22',
  design,
  units: 'us',
  analysis,
  members: [member],
});
