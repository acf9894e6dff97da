import { describe, expect, it } from 'vitest';
import { createRecorder } from '../calc/recorder.ts';
import { parseQuantity } from '../units/parse.ts';
import { quantityReader } from './given-values.ts';
import type { MemberInput } from './input.ts';
import { findGrade, rowsOf, STEELS } from './material.ts';
import { resolveSection } from './resolve-section.ts';
import { resolveSteel } from './resolve-steel.ts';
import { steelLines } from './steel-lines.ts';

function read(material: MemberInput['material'], section: Parameters<typeof resolveSection>[0]) {
  const problems: string[] = [];
  const problem = (path: string, message: string) => problems.push(`${path} ${message}`);
  const quantity = quantityReader(problem);
  const found = resolveSection(section, problem, quantity).section;
  const steel = resolveSteel({ material } as MemberInput, problem, quantity, found);
  return { steel, problems };
}

const rowOf = (material: string, section: Parameters<typeof resolveSection>[0]) => {
  const { steel, problems } = read(material, section);
  if (problems.length > 0) return problems.join();
  return steel.kind === 'grade' ? `${steel.steel.row}: ${steel.steel.us.Fy}` : steel.name;
};
const plates = (tf: string) => ({ shape: 'i', d: '60 in', bf: '20 in', tf, tw: '0.5 in' }) as const;

/* From memory of the ASTM standards; A572 thicknesses: A572/A572M-15, Table 1. */
describe('the row of a steel', () => {
  it.each([
    ['A992', 'W12X79', 'A992: 50 ksi'],
    ['A572 Gr. 50', 'W14X730', 'A572 Gr. 50: 50 ksi'],
    ['A36', 'C15X33.9', 'A36: 36 ksi'],
    ['A500 Gr. C', 'HSS8X6X1/2', 'A500 Gr. C, rectangular: 50 ksi'],
    ['A500 Gr. C', 'HSS6.000X0.375', 'A500 Gr. C, round, editions before 2021: 46 ksi'],
    ['A500 Gr. B', 'HSS6.000X0.375', 'A500 Gr. B, round, editions before 2021: 42 ksi'],
    ['A500 Gr. B', 'HSS8X6X1/2', 'A500 Gr. B, rectangular: 46 ksi'],
    ['A500-21 Gr. C', 'HSS6.000X0.375', 'A500-21 Gr. C: 50 ksi'],
    ['ASTM A53 Grade B', 'Pipe8STD', 'A53 Gr. B: 35 ksi'],
    ['A588', 'W14X99', 'A588: 50 ksi'],
  ])('%s for %s', (material, section, row) => expect(rowOf(material, section)).toBe(row));

  it.each([
    ['4 in', 'A588, plates to 4 in [100 mm]: 50 ksi'],
    ['101.7 mm', 'A588, plates over 4 to 5 in [100 to 125 mm]: 46 ksi'],
    ['5 in', 'A588, plates over 4 to 5 in [100 to 125 mm]: 46 ksi'],
    ['6 in', 'A588, plates over 5 to 8 in [125 to 200 mm]: 42 ksi'],
  ])('A588, flange plates of %s', (tf, row) => expect(rowOf('A588', plates(tf))).toBe(row));
  it('A36, plates over 8 in', () =>
    expect(rowOf('A36', plates('8.5 in'))).toBe('A36, plates over 8 in [200 mm]: 32 ksi'));

  it.each([
    ['A588', plates('9 in')],
    ['A572 Gr. 65', plates('1.5 in')],
    // Flange 3.82 in; shapes to 2 in.
    ['A572 Gr. 60', 'W14X550'],
    ['A529 Gr. 50', 'W14X311'],
  ])('%s is not made as thick: a problem', (material, section) =>
    expect(rowOf(material, section)).toMatch(/^material is ASTM .* not made as thick/),
  );

  it('of A1085 is refused for a tube of the tables, whose walls are those of A500', () => {
    expect(rowOf('A1085', 'HSS8X6X1/2')).toMatch(/^material is A1085, but HSS8X6X1\/2/);
    const tube = { shape: 'tube', Ht: '8 in', B: '6 in', t: '0.5 in', wall: 'nominal' } as const;
    expect(rowOf('A1085', tube)).toBe('A1085: 50 ksi');
  });
});

describe('the lines of a steel', () => {
  const lines = (material: MemberInput['material'], section: string, set: 'us' | 'si' = 'us') => {
    const r = createRecorder('');
    const { steel, problems } = read(material, section);
    if (problems.length > 0) throw new Error(problems.join());
    return { q: steelLines(r, steel, set), lines: r.lines };
  };
  /* AISC Design Examples v16.0: Fy = 50 ksi, Fu = 65 ksi, E = 29 000 ksi for A992. */
  it('are of the row, in both published sets', () => {
    const published = (set: 'us' | 'si') =>
      lines('A992', 'W12X79', set).lines.flatMap((l) =>
        l.kind === 'lookup' ? [`${l.key} ${l.published}`] : [],
      );
    expect(published('us')).toEqual([
      ...['steel/Fy 50 ksi', 'steel/Fu 65 ksi', 'steel/E 29000 ksi', 'steel/G 11200 ksi'],
    ]);
    expect(published('si')).toEqual([
      ...['steel/Fy 345 MPa', 'steel/Fu 450 MPa', 'steel/E 200000 MPa', 'steel/G 77200 MPa'],
    ]);
  });
  it('caution where the steel is not made as the section, with its lowest yield stress', () => {
    const { lines: found } = lines('A500 Gr. C', 'W12X79');
    expect(found.find((l) => l.kind === 'notice')).toMatchObject({
      ...{ key: 'steel/product', severity: 'caution' },
    });
    expect(found.find((l) => l.key === 'steel/Fy')).toMatchObject({ published: '46 ksi' });
    expect(lines('A992', 'W12X79').lines.some((l) => l.kind === 'notice')).toBe(false);
  });
  it('leave Fu out where a steel of one’s own has none', () => {
    const own = { name: 'S355', Fy: '355 MPa', source: { kind: 'typed' } } as const;
    expect(lines(own, 'W12X79').q.Fu).toBeNull();
    expect(lines({ ...own, Fu: '470 MPa' }, 'W12X79').q.Fu?.value).toBe(470);
  });
});

describe('the list of steels', () => {
  it('has each grade once, found by its title and its key, every value a stress, Fy below Fu', () => {
    expect(new Set(STEELS.map(({ key }) => key)).size).toBe(STEELS.length);
    for (const grade of STEELS) {
      expect(findGrade(grade.key)).toBe(grade);
      const rows = rowsOf(grade);
      for (const row of rows)
        for (const set of ['us', 'si'] as const) {
          const [Fy, Fu] = [row[set].Fy, row[set].Fu].map((text) => {
            const parsed = parseQuantity(text, 'stress');
            return parsed.ok ? parsed.quantity.value : Number.NaN;
          }) as [number, number];
          expect(Fy, row.row).toBeGreaterThan(200);
          expect(Fu, row.row).toBeGreaterThan(Fy);
        }
      // The two published sets are within 2 % of each other.
      for (const { us, si } of rows)
        expect(
          Math.abs((Number.parseFloat(us.Fy) * 6.894757) / Number.parseFloat(si.Fy) - 1),
        ).toBeLessThan(0.02);
    }
  });
  it('rows of one name have the same values', () => {
    for (const rows of STEELS.map(rowsOf))
      for (const a of rows)
        for (const b of rows) if (a.row === b.row) expect({ ...a }).toEqual({ ...b });
  });
});
