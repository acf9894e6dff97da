import { printNumber } from '../units/format.ts';

/**
 * One unit in the last printed digit of a published number. Examples print three significant
 * digits: further zeros of a whole number (`1130`) are not digits that count.
 */
function lastDigit(printed: string): number {
  const point = printed.indexOf('.');
  if (point >= 0) return 10 ** (point + 1 - printed.length);
  return 10 ** Math.max(0, printed.length - 3);
}

/** Whether a value rounds to what is printed; half a digit may have gone either way. */
export const roundsToPrinted = (value: number, printed: string): boolean =>
  Math.abs(value - Number(printed)) <= lastDigit(printed) * (0.5 + 1e-6);

/** A computed value with two digits more than the published one beside it. */
export function besidePrinted(value: number, printed: string): string {
  const digits = printed.replace('.', '').replace(/^0+/, '').length;
  return printNumber(value, { sig: Math.max(digits, 3) + 2 }).text;
}

/** How far a computed value lies from the published one: `+0.02 %`. */
export function differenceText(value: number, printed: string): string {
  const percent = 100 * (value / Number(printed) - 1);
  const text = Math.abs(percent).toFixed(2);
  if (Number(text) === 0) return '0.00 %';
  return `${percent < 0 ? '−' : '+'}${text} %`;
}
