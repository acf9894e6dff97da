import type { Block, BlockOf } from '#shared/report/tree.ts';

interface Entry {
  readonly section: BlockOf<'lineSection'>;
  /** The first line of the section, where the keyboard then stands. */
  readonly first: string | undefined;
}

/** The sections of the sheet as a way into it, while no line is chosen. */
export function SheetContents(props: {
  blocks: readonly Block[];
  onGo: (address: string) => void;
}) {
  const entries = entriesOf(props.blocks);
  if (entries.length === 0) return null;
  return (
    <nav aria-label="Sections of the sheet" className="mt-6">
      <h2 className="caps mb-1">On this sheet</h2>
      <ul>
        {entries.map(({ section, first }, index) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: a section may stand twice on a sheet
          <li key={index} className="border-b border-zinc-2">
            <button
              type="button"
              onClick={() => first && props.onGo(first)}
              className="grid w-full grid-cols-[64px_minmax(0,1fr)] gap-2 py-1 text-left hover:text-oxide"
            >
              <span className="font-condensed text-small text-zinc-7">{section.reference}</span>
              <span>{section.title}</span>
            </button>
          </li>
        ))}
      </ul>
    </nav>
  );
}

function entriesOf(blocks: readonly Block[]): Entry[] {
  return blocks.flatMap((block, index): Entry[] => {
    if (block.kind !== 'lineSection') return [];
    const next = blocks.slice(index + 1).find(({ kind }) => kind === 'line');
    return [{ section: block, first: next?.kind === 'line' ? next.address : undefined }];
  });
}
