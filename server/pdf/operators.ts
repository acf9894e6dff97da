/** A number as PDF content writes it: at most three decimals, no exponent. */
export function pdfNumber(value: number): string {
  if (!Number.isFinite(value)) throw new Error(`not a number for a page: ${value}`);
  const rounded = Math.round(value * 1000) / 1000;
  return String(rounded === 0 ? 0 : rounded);
}

/** The operands and the operator of one content stream instruction. */
export function operator(name: string, ...operands: readonly number[]): string {
  return [...operands.map(pdfNumber), name].join(' ');
}
