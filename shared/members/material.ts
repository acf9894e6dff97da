import type { GivenValue } from '../calc/quantity.ts';

/**
 * Steels by grade with both published sets of constants (US customary and SI), specified minimum
 * values of the ASTM standards that ANSI/AISC 360-22 A3.1 lists. From memory, except: A992
 * (US), A500 Gr. C, A53 Gr. B as in AISC Design Examples v16.0; A572 thicknesses as in ASTM
 * A572/A572M-15, Table 1; A500-21 as the Steel Tube Institute states it. Which product a steel is
 * made as: AISC Manual, Table 2-4, from memory.
 */
export interface SteelValues {
  readonly Fy: string;
  readonly Fu: string;
}

/** What a steel is rolled or formed to; thickness limits go by it. */
export type Product = 'shapes' | 'plates' | 'rectangular tubes' | 'round tubes';

/** One row of values: the products and the thicknesses that it holds for. */
interface SteelRange {
  readonly products: readonly Product[];
  /** Greatest thickness in inches, inclusive; none where the standard sets none. */
  readonly to?: number;
  /** What the row's name adds to the grade. */
  readonly range?: string;
  readonly us: SteelValues;
  readonly si: SteelValues;
}

/** A grade as it is chosen. */
export interface Grade {
  readonly key: string;
  readonly title: string;
  /** In rising order of thickness within a product. */
  readonly ranges: readonly SteelRange[];
}

/** A grade's row for one section. */
export interface Steel {
  readonly key: string;
  readonly title: string;
  /** The row's name, with its range of thickness where it has one. */
  readonly row: string;
  readonly us: SteelValues;
  readonly si: SteelValues;
}

/** A member's steel: of a grade, or one of the user's own. */
export type ResolvedSteel =
  | {
      readonly kind: 'grade';
      readonly steel: Steel;
      /** Whether the grade is made as what the section is. */
      readonly suits: boolean;
    }
  | {
      readonly kind: 'own';
      readonly name: string;
      readonly Fy: GivenValue;
      readonly Fu: GivenValue | null;
    };

type Four = readonly [FyUs: number, FuUs: number, FySi: number, FuSi: number];
const range = (
  products: readonly Product[],
  [FyUs, FuUs, FySi, FuSi]: Four,
  more: { readonly to?: number; readonly range?: string } = {},
): SteelRange => ({
  products,
  ...more,
  us: { Fy: `${FyUs} ksi`, Fu: `${FuUs} ksi` },
  si: { Fy: `${FySi} MPa`, Fu: `${FuSi} MPa` },
});

const grade = (key: string, title: string, ranges: readonly SteelRange[]): Grade => ({
  ...{ key, title, ranges },
});

/** Shapes of any thickness and plates up to one. */
const shapesAndPlates = (values: Four, plates: number, mm: number): SteelRange[] => [
  range(['shapes'], values),
  range(['plates'], values, { to: plates, range: `plates to ${plates} in [${mm} mm]` }),
];
/** Both up to a thickness. */
const upTo = (values: Four, shapes: readonly [number, number], plates: readonly [number, number]) =>
  [
    range(['shapes'], values, {
      to: shapes[0],
      range: `shapes to ${shapes[0]} in [${shapes[1]} mm]`,
    }),
    range(['plates'], values, {
      to: plates[0],
      range: `plates to ${plates[0]} in [${plates[1]} mm]`,
    }),
  ] as const;

const A572 = 'ASTM A572/A572M Grade';
const A913 = 'ASTM A913/A913M Grade';
const rectangular = ['rectangular tubes'] as const;
const round = ['round tubes'] as const;

export const STEELS: readonly Grade[] = [
  grade('A992', 'ASTM A992/A992M', [range(['shapes'], [50, 65, 345, 450])]),
  grade('A572 Gr. 50', `${A572} 50 [345]`, shapesAndPlates([50, 65, 345, 450], 4, 100)),
  grade('A36', 'ASTM A36/A36M', [
    ...shapesAndPlates([36, 58, 250, 400], 8, 200),
    range(['plates'], [32, 58, 220, 400], { range: 'plates over 8 in [200 mm]' }),
  ]),
  grade('A913 Gr. 65', `${A913} 65 [450]`, [range(['shapes'], [65, 80, 450, 550])]),
  grade('A913 Gr. 70', `${A913} 70 [485]`, [range(['shapes'], [70, 90, 485, 620])]),
  grade('A913 Gr. 50', `${A913} 50 [345]`, [range(['shapes'], [50, 65, 345, 450])]),
  grade('A913 Gr. 60', `${A913} 60 [415]`, [range(['shapes'], [60, 75, 415, 520])]),
  grade('A913 Gr. 80', `${A913} 80 [550]`, [range(['shapes'], [80, 95, 550, 655])]),
  grade('A572 Gr. 42', `${A572} 42 [290]`, shapesAndPlates([42, 60, 290, 415], 6, 150)),
  grade('A572 Gr. 55', `${A572} 55 [380]`, shapesAndPlates([55, 70, 380, 485], 2, 50)),
  grade('A572 Gr. 60', `${A572} 60 [415]`, upTo([60, 75, 415, 520], [2, 50], [1.25, 32])),
  grade('A572 Gr. 65', `${A572} 65 [450]`, upTo([65, 80, 450, 550], [2, 50], [1.25, 32])),
  grade('A529 Gr. 50', 'ASTM A529/A529M Grade 50 [345]', [
    ...upTo([50, 65, 345, 450], [1.5, 40], [1, 25]),
  ]),
  grade('A529 Gr. 55', 'ASTM A529/A529M Grade 55 [380]', [
    ...upTo([55, 70, 380, 485], [1.5, 40], [1, 25]),
  ]),
  grade('A588', 'ASTM A588/A588M', [
    ...shapesAndPlates([50, 70, 345, 485], 4, 100),
    range(['plates'], [46, 67, 315, 460], {
      to: 5,
      range: 'plates over 4 to 5 in [100 to 125 mm]',
    }),
    range(['plates'], [42, 63, 290, 435], {
      to: 8,
      range: 'plates over 5 to 8 in [125 to 200 mm]',
    }),
  ]),
  grade('A500 Gr. B', 'ASTM A500/A500M Grade B', [
    range(rectangular, [46, 58, 315, 400], { range: 'rectangular' }),
    range(round, [42, 58, 290, 400], { range: 'round, editions before 2021' }),
  ]),
  grade('A500 Gr. C', 'ASTM A500/A500M Grade C', [
    range(rectangular, [50, 62, 345, 425], { range: 'rectangular' }),
    range(round, [46, 62, 315, 425], { range: 'round, editions before 2021' }),
  ]),
  grade('A500-21 Gr. C', 'ASTM A500/A500M-21 Grade C', [
    range([...rectangular, ...round], [50, 62, 345, 425]),
  ]),
  grade('A1085', 'ASTM A1085/A1085M', [range([...rectangular, ...round], [50, 65, 345, 450])]),
  grade('A53 Gr. B', 'ASTM A53/A53M Grade B', [range(round, [35, 60, 240, 415])]),
];

/** The grade of that name, however it is written: `ASTM A572 Grade 50` is `A572 Gr. 50`. */
export const findGrade = (key: string): Grade | undefined => {
  const plain = (s: string) =>
    s.toUpperCase().replace(/[\s.]/g, '').replace(/^ASTM/, '').replace('GRADE', 'GR');
  return STEELS.find((s) => plain(s.key) === plain(key));
};

const rowOf = ({ key, title }: Grade, { range: words, us, si }: SteelRange): Steel => ({
  ...{ key, title, us, si },
  row: words ? `${key}, ${words}` : key,
});

/** All rows of a grade. */
export const rowsOf = (of: Grade): readonly Steel[] => of.ranges.map((r) => rowOf(of, r));

const MM_PER_IN = 25.4;

/**
 * The grade's row for a product of that thickness in mm; null where the standard doesn't cover the
 * thickness. A grade that isn't made as that product answers its lowest yield stress.
 */
export function steelFor(
  of: Grade,
  product: Product,
  thickness: number,
): { readonly steel: Steel; readonly suits: boolean } | null {
  const made = of.ranges.filter(({ products }) => products.includes(product));
  const found = made.find(({ to }) => to === undefined || thickness <= to * MM_PER_IN);
  if (found) return { steel: rowOf(of, found), suits: true };
  if (made.length > 0) return null;
  const [lowest] = [...of.ranges].sort(
    (a, b) => Number.parseFloat(a.us.Fy) - Number.parseFloat(b.us.Fy),
  );
  return lowest ? { steel: rowOf(of, lowest), suits: false } : null;
}

/** E and G: ANSI/AISC 360-22, symbols and C2.3/E4; 29 000 ksi [200 000 MPa], 11 200 ksi [77 200 MPa]. */
export const MODULI = {
  us: { E: '29000 ksi', G: '11200 ksi' },
  si: { E: '200000 MPa', G: '77200 MPa' },
} as const;
