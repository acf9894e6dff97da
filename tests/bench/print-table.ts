/** Prints a table: a heading, then columns as wide as their widest cell, the first to the left. */
export function printTable(
  title: string,
  head: readonly string[],
  rows: readonly (readonly string[])[],
): void {
  const widths = head.map((_, i) => Math.max(...[head, ...rows].map((r) => (r[i] ?? '').length)));
  const line = (cells: readonly string[]): string =>
    cells
      .map((cell, i) => (i === 0 ? cell.padEnd(widths[i] ?? 0) : cell.padStart(widths[i] ?? 0)))
      .join('  ');
  const rule = widths.map((w) => '-'.repeat(w)).join('  ');
  process.stdout.write(`\n${title}\n\n${[line(head), rule, ...rows.map(line)].join('\n')}\n`);
}
