import { type KeyboardEvent, type MouseEvent, type RefObject, useMemo, useState } from 'react';
import { Blocks } from '#client/document/blocks.tsx';
import { DocumentContext } from '#client/document/document-context.ts';
import type { Block } from '#shared/report/tree.ts';

/** The live sheet: every line can be stood on, every number followed. */
export function SheetPaper(props: {
  sheet: RefObject<HTMLElement | null>;
  blocks: readonly Block[];
  chosen: string | null;
  lit: ReadonlySet<string>;
  titleFields: DocumentContext['titleFields'];
  onChoose: (address: string) => void;
  onFollow: (address: string) => void;
  onKeyDown: (event: KeyboardEvent) => void;
}) {
  const { blocks, chosen, lit, titleFields, onChoose, onFollow } = props;
  const [stood, setStood] = useState<string | null>(null);
  const current = useMemo(() => tabStop(blocks, stood, chosen), [blocks, stood, chosen]);
  const context = useMemo<DocumentContext>(
    () => ({ chosen, lit, follow: onFollow, current, onCurrent: setStood, titleFields }),
    [chosen, lit, onFollow, current, titleFields],
  );
  const onClick = (event: MouseEvent) => {
    if (!(event.target instanceof Element) || window.getSelection()?.isCollapsed === false) return;
    const operand = event.target.closest<HTMLElement>('[data-ref]')?.dataset.ref;
    const line = event.target.closest<HTMLElement>('[data-line]')?.dataset.line;
    if (operand) onFollow(operand);
    else if (line) onChoose(line);
  };
  return (
    <DocumentContext value={context}>
      <section
        ref={props.sheet}
        aria-label="Sheet"
        data-print-plain
        onClick={onClick}
        onKeyDown={props.onKeyDown}
        className="sheet-interactive @container/sheet mx-auto max-w-[880px] bg-paper pb-10 shadow-sheet"
      >
        <Blocks blocks={blocks} />
      </section>
    </DocumentContext>
  );
}

/** The one line in the tab order: where the keyboard last stood, else the chosen or the first one. */
function tabStop(
  blocks: readonly Block[],
  stood: string | null,
  chosen: string | null,
): string | null {
  const addresses = blocks.flatMap((block) => (block.kind === 'line' ? [block.address] : []));
  return (
    [stood, chosen].find((address) => address !== null && addresses.includes(address)) ??
    addresses[0] ??
    null
  );
}
