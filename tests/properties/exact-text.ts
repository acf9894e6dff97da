import type { DimensionName } from '#shared/units/dimension.ts';
import type { Write } from './member.ts';

/** A fraction of whole numbers. */
interface Fraction {
  readonly over: bigint;
  readonly under: bigint;
}

/** The decimal number that a text says, as a fraction. */
function fraction(text: string): Fraction {
  const [digits = '', exponent = '0'] = text.split('e');
  const [whole = '', decimals = ''] = digits.split('.');
  const power = Number(exponent) - decimals.length;
  const over = BigInt(whole + decimals);
  return power < 0
    ? { over, under: 10n ** BigInt(-power) }
    : { over: over * 10n ** BigInt(power), under: 1n };
}

const times = (a: Fraction, b: Fraction): Fraction => ({
  over: a.over * b.over,
  under: a.under * b.under,
});
const by = (a: Fraction, b: Fraction): Fraction => times(a, { over: b.under, under: b.over });

/** Decimals of texts: far more than a double holds, within what an input takes. */
const DECIMALS = 36;

/** A fraction as a decimal text, cut off at the 36th decimal. */
function decimalText({ over, under }: Fraction): string {
  const sign = over < 0n !== under < 0n && over !== 0n ? '-' : '';
  const size = (value: bigint) => (value < 0n ? -value : value);
  const digits = String((size(over) * 10n ** BigInt(DECIMALS)) / size(under)).padStart(
    DECIMALS + 1,
    '0',
  );
  const at = digits.length - DECIMALS;
  return `${sign}${digits.slice(0, at)}.${digits.slice(at)}`.replace(/\.?0+$/, '');
}

/** 1 in = 25.4 mm and 1 kip = 4448.2216152605 N exactly (NIST SP 811, 2008 edition, appendix B). */
const IN = fraction('25.4');
const FT = fraction('304.8');
const KIP = fraction('4448.2216152605');
const one = fraction('1');

type Unit = readonly [name: string, factor: Fraction];
const US: Partial<Record<DimensionName, readonly Unit[]>> = {
  length: [
    ['ft', FT],
    ['in', IN],
  ],
  area: [['in²', times(IN, IN)]],
  force: [['kip', KIP]],
  moment: [
    ['kip ft', times(KIP, FT)],
    ['kip in', times(KIP, IN)],
  ],
  stress: [['ksi', by(KIP, times(IN, IN))]],
  lineLoad: [['kip/ft', by(KIP, FT)]],
};
const SI: typeof US = {
  length: [
    ['m', fraction('1000')],
    ['mm', one],
  ],
  area: [['mm²', one]],
  force: [['kN', fraction('1000')]],
  moment: [
    ['kN m', fraction('1e6')],
    ['N m', fraction('1000')],
  ],
  stress: [['MPa', one]],
  lineLoad: [['kN/m', one]],
};

/**
 * Writes values of N and mm in the units of a set, exactly: they take its units in turn, and equal
 * sizes the same one, so that what is equal is typed equal.
 */
export function exactly(set: 'us' | 'si'): Write {
  const taken = new Map<string, Unit>();
  return (value, dimension) => {
    const units = (set === 'us' ? US : SI)[dimension];
    const key = `${dimension} ${Math.abs(value)}`;
    const unit = taken.get(key) ?? units?.[taken.size % units.length];
    if (!unit) throw new Error(`no unit of ${dimension}`);
    taken.set(key, unit);
    return `${decimalText(by(fraction(String(value)), unit[1]))} ${unit[0]}`;
  };
}
