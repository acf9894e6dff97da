/** One unit in the last printed digit of a published number; trailing zeros of `1130` are not digits that count. */
export function printedStep(printed: string, significant = 3): number {
  if (printed.includes('.')) return 10 ** -(printed.length - printed.indexOf('.') - 1);
  return 10 ** Math.max(0, printed.length - significant);
}

/** Whether a value rounds to the published digits; a value half-way may have gone either way. */
export const roundsTo = (value: number, printed: string): boolean =>
  Math.abs(value - Number(printed)) <= printedStep(printed) * (0.5 + 1e-6);
