/** An id for a row; it stays with the row wherever that is moved. */
export function freshId(letter: string, taken: readonly { readonly id: string }[]): string {
  const numbers = taken.map(({ id }) =>
    id.startsWith(letter) && /^\d+$/.test(id.slice(1)) ? Number(id.slice(1)) : 0,
  );
  return `${letter}${Math.max(0, ...numbers) + 1}`;
}
