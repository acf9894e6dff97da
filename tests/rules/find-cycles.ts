/** Which file imports which. */
export type Graph = ReadonlyMap<string, readonly string[]>;

/**
 * The import cycles met on a walk in depth, each as the files on its way back to the first.
 * Empty exactly when there is none; where cycles overlap not each is listed.
 */
export function findCycles(graph: Graph): string[][] {
  const cycles: string[][] = [];
  const done = new Set<string>();
  const way: string[] = [];
  const visit = (file: string) => {
    const start = way.indexOf(file);
    if (start >= 0) cycles.push([...way.slice(start), file]);
    if (start >= 0 || done.has(file)) return;
    way.push(file);
    for (const next of graph.get(file) ?? []) visit(next);
    way.pop();
    done.add(file);
  };
  for (const file of graph.keys()) visit(file);
  return cycles;
}
