/** How many digits a number prints with: significant ones, or decimals (ratios). */
export type Digits = { readonly sig: number } | { readonly dec: number };

/** A number as printed: its printed value, the size of one step of its last digit, and its forms. */
export interface PrintedNumber {
  readonly value: number;
  /** One unit in the last printed digit. */
  readonly step: number;
  /** Plain text with thin spaces between thousands, U+2212 for minus, superscripts for powers. */
  readonly text: string;
  readonly tex: string;
}

const THIN = '\u2009';
const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** Ratios of this size and above print significant digits: their decimals say nothing. */
const MANY = 1e6;
const MANY_DIGITS = 4;

/** Numbers of this size and above, or below SMALL, print as ×10ⁿ. */
const LARGE = 1e8;
const SMALL = 1e-3;

const superscript = (n: number): string =>
  (n < 0 ? '⁻' : '') + [...String(Math.abs(n))].map((d) => SUPERSCRIPTS[Number(d)]).join('');

const grouped = (plain: string, gap: string): string => {
  const [whole = '', part] = plain.split('.');
  const spaced = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, gap) : whole;
  return part === undefined ? spaced : `${spaced}.${part}`;
};

/** Prints a finite number; nothing is rounded before this point. */
export function printNumber(value: number, digits: Digits): PrintedNumber {
  if (!Number.isFinite(value)) throw new Error(`cannot print ${value}`);
  const size = Math.abs(value);
  if (size === 0)
    return plainForm('0', false, 'sig' in digits ? 10 ** -digits.sig : 10 ** -digits.dec);
  if ('dec' in digits && size >= MANY) return printNumber(value, { sig: digits.dec + MANY_DIGITS });
  if ('dec' in digits) {
    const fixed = size.toFixed(Math.min(digits.dec, 20));
    return plainForm(fixed, value < 0, 10 ** -digits.dec);
  }
  const rounded = size.toExponential(digits.sig - 1);
  const exponent = Number(rounded.slice(rounded.indexOf('e') + 1));
  const step = Number(`1e${exponent - digits.sig + 1}`);
  if (size < LARGE && size >= SMALL) {
    const decimals = digits.sig - 1 - exponent;
    const plain =
      decimals >= 0 ? Number(rounded).toFixed(Math.min(decimals, 20)) : String(Number(rounded));
    return plainForm(plain, value < 0, step);
  }
  const mantissa = rounded.slice(0, rounded.indexOf('e'));
  const sign = value < 0;
  return {
    value: (sign ? -1 : 1) * Number(rounded),
    step,
    text: `${sign ? '−' : ''}${mantissa}×10${superscript(exponent)}`,
    tex: `${sign ? '-' : ''}${mantissa}\\times 10^{${exponent}}`,
  };
}

function plainForm(plain: string, negative: boolean, step: number): PrintedNumber {
  const zero = Number(plain) === 0;
  const minus = negative && !zero;
  return {
    value: (minus ? -1 : 1) * Number(plain),
    step,
    text: (minus ? '−' : '') + grouped(plain, THIN),
    tex: (minus ? '-' : '') + grouped(plain, '\\,'),
  };
}

/**
 * Prints a number that stands in a text somebody typed or a table published (`22`, `3.05`):
 * its digits are kept as they are, only the thousands are spaced.
 */
export function printTyped(numberText: string): PrintedNumber {
  const plain = numberText.trim().replace(/^\+/, '');
  const value = Number(plain);
  if (!Number.isFinite(value)) throw new Error(`cannot print "${numberText}"`);
  const negative = plain.startsWith('-');
  const bare = plain.replace(/^-/, '');
  if (/^\d+(\.\d+)?$/.test(bare)) {
    const decimals = bare.includes('.') ? bare.length - bare.indexOf('.') - 1 : 0;
    return plainForm(bare, negative, 10 ** -decimals);
  }
  const canonical = String(Math.abs(value));
  if (/e/.test(canonical))
    return printNumber(value, { sig: Math.max(1, canonical.replace(/e.*|\./g, '').length) });
  return plainForm(canonical, negative, 10 ** -(canonical.split('.')[1] ?? '').length);
}
