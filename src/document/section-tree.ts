import type { Block, BlockOf } from '#shared/report/tree.ts';

/** A section of a sheet with what stands under its head, sections within it among them. */
export interface SheetSection {
  readonly kind: 'section';
  readonly head: BlockOf<'lineSection'>;
  readonly body: readonly SheetNode[];
}
export type SheetNode = Exclude<Block, { kind: 'lineSection' }> | SheetSection;

/** The blocks with sections as trees; any block that is no line ends them. */
export function nestSections(blocks: readonly Block[]): SheetNode[] {
  const top: SheetNode[] = [];
  const open: { level: number; body: SheetNode[] }[] = [];
  for (const block of blocks) {
    const inner = block.kind === 'line' ? Number.POSITIVE_INFINITY : levelOf(block);
    while (open.length > 0 && (open.at(-1)?.level ?? 0) >= inner) open.pop();
    const into = open.at(-1)?.body ?? top;
    if (block.kind !== 'lineSection') into.push(block);
    else {
      const body: SheetNode[] = [];
      into.push({ kind: 'section', head: block, body });
      open.push({ level: block.level, body });
    }
  }
  return top;
}

const levelOf = (block: Block): number => (block.kind === 'lineSection' ? block.level : 0);

/** The heads of the sections that hold each line and each section (itself the last). */
export function sectionsAround(
  nodes: readonly SheetNode[],
  around: readonly BlockOf<'lineSection'>[] = [],
  found = new Map<string, readonly BlockOf<'lineSection'>[]>(),
): ReadonlyMap<string, readonly BlockOf<'lineSection'>[]> {
  for (const node of nodes) {
    if (node.kind === 'line') found.set(node.address, around);
    if (node.kind !== 'section') continue;
    const within = [...around, node.head];
    found.set(node.head.address, within);
    sectionsAround(node.body, within, found);
  }
  return found;
}
