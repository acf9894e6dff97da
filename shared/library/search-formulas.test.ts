import { describe, expect, it } from 'vitest';
import { searchFormulas } from './search-formulas.ts';
import { showFormula, symbolsOf } from './show-formula.ts';

const found = (query: string) => searchFormulas(query).map(({ id }) => id);

describe('a search of the formulas', () => {
  it('finds an equation by its number, in any case of letters, and puts it first', () => {
    expect(found('E3-2')[0]).toBe('aisc360-22/E3-2');
    expect(found('e3-2')).toEqual(found('E3-2'));
    expect(found('E3−2')).toEqual(found('E3-2'));
    expect(found('H1-1')).toEqual(expect.arrayContaining(['aisc360-22/H1-1a', 'aisc360-22/H1-1b']));
  });
  it('finds the formulas of a clause', () => {
    const clauses = new Set(searchFormulas('E4').map(({ clause }) => clause));
    expect(clauses).toContain('E4');
    expect(found('app. 8')).toContain('aisc360-22/A-8-5');
    expect(found('appendix 8')).toContain('aisc360-22/A-8-5');
    expect(found('theory 1.1')).toContain('elastic-theory/Mmax');
  });
  it('finds what a symbol is the result of before where it is used', () => {
    const [first] = searchFormulas('Fn');
    expect(first?.symbol).toBe('Fn');
    expect(found('Fn')).toContain('aisc360-22/E3-1');
    // As it is written, with a Greek letter.
    expect(found('λpf').length).toBeGreaterThan(0);
  });
  it('finds words of a title, all of those asked for', () => {
    expect(found('inelastic buckling')).toContain('aisc360-22/E3-2');
    expect(found('inelastic buckling')).not.toContain('aisc360-22/E3-4');
    expect(found('buckling nonsense')).toEqual([]);
  });
  it('finds nothing where nothing is asked', () => {
    expect(found('')).toEqual([]);
    expect(found('  ')).toEqual([]);
  });
});

describe('a formula in its own symbols', () => {
  const [formula] = searchFormulas('E3-2');
  if (!formula) throw new Error('E3-2 is not found');
  it('is the equation of the standard', () => {
    // ANSI/AISC 360-22, E3-2: Fn = (0.658^(Fy/Fe)) Fy.
    expect(showFormula(formula).text).toBe('Fn = 0.658^(Fy/Fe) · Fy');
    expect(showFormula(formula).tex).toBe('F_n={0.658}^{{F_y}/{F_e}}\\,{F_y}');
  });
  it('does not say twice what its symbol says', () => {
    const [ratio] = searchFormulas('Yield stress over elastic buckling stress');
    expect(ratio && showFormula(ratio).text).toBe('Fy/Fe');
  });
  it('comes with its symbols, the result first, in both unit sets', () => {
    expect(symbolsOf([formula]).map(({ name, units }) => [name, units.us, units.si])).toEqual([
      ['Fn', ['ksi'], ['MPa']],
      ['Fy', ['ksi'], ['MPa']],
      ['Fe', ['ksi'], ['MPa']],
    ]);
    const kL = searchFormulas('kL').find(({ id }) => id === 'elastic-theory/kL');
    const units = new Map(symbolsOf(kL ? [kL] : []).map((row) => [row.name, row.units]));
    expect(units.get('L1')).toEqual({ us: ['in', 'ft'], si: ['mm', 'm'] });
    expect(units.get('alpha')).toEqual({ us: [], si: [] });
  });
});
