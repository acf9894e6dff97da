import { type KeyboardEvent, type MouseEvent, type RefObject, useMemo, useState } from 'react';
import { Blocks } from '#client/document/blocks.tsx';
import { DocumentContext } from '#client/document/document-context.ts';
import { nestSections, type SheetNode } from '#client/document/section-tree.ts';
import type { Block } from '#shared/report/tree.ts';
import type { SheetFolds } from '../use-sheet-folds.ts';

/** The live sheet: every line can be stood on, every number followed. */
export function SheetPaper(props: {
  sheet: RefObject<HTMLElement | null>;
  blocks: readonly Block[];
  chosen: string | null;
  lit: ReadonlySet<string>;
  titleFields: DocumentContext['titleFields'];
  folds: SheetFolds;
  onChoose: (address: string) => void;
  onFollow: (address: string) => void;
  onKeyDown: (event: KeyboardEvent) => void;
}) {
  const { blocks, chosen, lit, titleFields, folds, onChoose, onFollow } = props;
  const [stood, setStood] = useState<string | null>(null);
  const current = useMemo(
    () => tabStop(blocks, folds, stood, chosen),
    [blocks, folds, stood, chosen],
  );
  const context = useMemo<DocumentContext>(
    () => ({ chosen, lit, follow: onFollow, current, onCurrent: setStood, titleFields, folds }),
    [chosen, lit, onFollow, current, titleFields, folds],
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

/**
 * The one place in the tab order: where the keyboard last stood, else the chosen line or the first,
 * of what is not folded.
 */
function tabStop(
  blocks: readonly Block[],
  folds: SheetFolds,
  stood: string | null,
  chosen: string | null,
): string | null {
  const stops = stopsIn(nestSections(blocks), folds);
  const found = [stood, chosen].find((wanted) => stops.some(({ address }) => address === wanted));
  return found ?? stops.find(({ kind }) => kind === 'line')?.address ?? stops[0]?.address ?? null;
}

interface Stop {
  readonly kind: 'line' | 'section';
  readonly address: string;
}

const stopsIn = (nodes: readonly SheetNode[], folds: SheetFolds): Stop[] =>
  nodes.flatMap((node): Stop[] => {
    if (node.kind === 'line') return [{ kind: 'line', address: node.address }];
    if (node.kind !== 'section') return [];
    const within = folds.isFolded(node.head) ? [] : stopsIn(node.body, folds);
    return [{ kind: 'section', address: node.head.address }, ...within];
  });
