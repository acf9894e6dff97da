import { useCallback, useMemo, useState } from 'react';
import type { Folds } from '#client/document/document-context.ts';
import { nestSections, sectionsAround } from '#client/document/section-tree.ts';
import { splitAddress } from '#shared/calc/address.ts';
import type { Block, BlockOf } from '#shared/report/tree.ts';

type Head = BlockOf<'lineSection'>;
/** Sections a reader folded or opened, by key: one holds for every combination. */
type Turned = ReadonlyMap<string, boolean>;

export interface SheetFolds extends Folds {
  /** Opens the sections that a line or a section stands in. */
  readonly reveal: (address: string) => void;
  /** Folds every section, or opens all where none is open. */
  readonly turnAll: () => void;
}

/** What was folded on each member's sheet, while the page lives. */
const kept = new Map<string, Turned>();

const keyOf = (address: string): string => splitAddress(address).key;

export function useSheetFolds(memberId: string, blocks: readonly Block[]): SheetFolds {
  const [turned, setTurned] = useState<Turned>(() => kept.get(memberId) ?? new Map());
  const turn = useCallback(
    (heads: readonly Pick<Head, 'address'>[], folded: boolean) => {
      if (heads.length === 0) return;
      setTurned((was) => {
        const next = new Map([
          ...was,
          ...heads.map(({ address }) => [keyOf(address), folded] as const),
        ]);
        kept.set(memberId, next);
        return next;
      });
    },
    [memberId],
  );
  const around = useMemo(() => sectionsAround(nestSections(blocks)), [blocks]);
  const isFolded = useCallback(
    ({ address, folded }: Head) => turned.get(keyOf(address)) ?? folded,
    [turned],
  );
  const fold = useCallback(
    (address: string, folded: boolean) => turn([{ address }], folded),
    [turn],
  );
  const reveal = useCallback(
    (address: string) => turn((around.get(address) ?? []).filter(isFolded), false),
    [around, isFolded, turn],
  );
  const turnAll = useCallback(() => {
    const heads = blocks.filter((block) => block.kind === 'lineSection');
    turn(
      heads,
      heads.some((head) => !isFolded(head)),
    );
  }, [blocks, isFolded, turn]);
  return useMemo(() => ({ isFolded, fold, reveal, turnAll }), [isFolded, fold, reveal, turnAll]);
}
