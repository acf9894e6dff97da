const longest = 40;

/** A free mark for a copy: `C-07 copy`, `C-07 copy 2`; the mark is cut where it would be too long. */
export function copyOfMark(mark: string, taken: readonly string[]): string {
  const stem = mark.replace(/ copy(?: \d+)?$/, '');
  for (let count = 1; ; count += 1) {
    const tail = count === 1 ? ' copy' : ` copy ${count}`;
    const copy = `${Array.from(stem.slice(0, longest - tail.length)).join('')}${tail}`.trimStart();
    if (!taken.includes(copy)) return copy;
  }
}
