import { classNames } from '#client/ui/class-names.ts';
import type { Block, BlockOf } from '#shared/report/tree.ts';

type Entry = BlockOf<'lineSection'> | BlockOf<'heading'>;

/** The sections of the sheet as a way into it, while no line is chosen. */
export function SheetContents(props: {
  blocks: readonly Block[];
  onGo: (section: string) => void;
}) {
  const entries = props.blocks.filter(isEntry);
  if (entries.length === 0) return null;
  return (
    <nav aria-label="Sections of the sheet" className="mt-6">
      <h2 className="caps mb-1">On this sheet</h2>
      <ul>
        {entries.map((entry) =>
          entry.kind === 'heading' ? (
            <li key={entry.id} className="caps border-b border-zinc-3 pt-3 pb-0.5">
              {entry.text}
            </li>
          ) : (
            <li key={entry.address} className="border-b border-zinc-2">
              <button
                type="button"
                onClick={() => props.onGo(entry.address)}
                className="grid w-full grid-cols-[64px_minmax(0,1fr)] gap-2 py-1 text-left hover:text-oxide"
              >
                <span className="font-condensed text-small text-zinc-7">{entry.reference}</span>
                <span className={classNames(entry.level === 2 && 'pl-3 text-zinc-7')}>
                  {entry.title}
                </span>
              </button>
            </li>
          ),
        )}
      </ul>
    </nav>
  );
}

/** What stands within a part of a part is found there. */
const isEntry = (block: Block): block is Entry =>
  block.kind === 'heading' || (block.kind === 'lineSection' && block.level < 3);
