import type { KeyboardEvent } from 'react';
import { reasonOf } from '#client/lib/problem.ts';
import { useAnnounce } from '#client/ui/announcements.tsx';
import { Button } from '#client/ui/button.tsx';
import { Hint } from '#client/ui/hint.tsx';
import type { MemberRow } from '#shared/contracts/members.ts';
import { useDeleteMember, useDuplicateMember, useRestoreMember } from '../mutations.ts';

/** Order, duplicate and delete of one member of the list. */
export function MemberRowActions(props: {
  calculationId: string;
  row: MemberRow;
  onMove: (by: -1 | 1) => void;
}) {
  const { calculationId, row, onMove } = props;
  const mark = row.mark || 'the member without a mark';
  const duplicate = useDuplicateMember(calculationId);
  const remove = useDeleteMember(calculationId);
  const restore = useRestoreMember(calculationId);
  const announce = useAnnounce();
  const onError = (error: Error) => announce(reasonOf(error));
  const onDelete = () =>
    remove.mutate(row.id, {
      onSuccess: () =>
        announce({
          text: `${mark} deleted.`,
          action: { label: 'Restore', run: () => restore.mutate(row.id, { onError }) },
        }),
      onError,
    });
  return (
    <>
      <MoveHandle mark={mark} onMove={onMove} />
      <Button
        size="small"
        rank="quiet"
        aria-label={`Duplicate ${mark}`}
        disabled={duplicate.isPending}
        onClick={() =>
          duplicate.mutate(row.id, {
            onSuccess: (copy) => announce(`${copy.draft.mark} is a copy of ${mark}.`),
            onError,
          })
        }
      >
        Duplicate
      </Button>
      <Button
        size="small"
        rank="quiet"
        aria-label={`Delete ${mark}`}
        disabled={remove.isPending}
        onClick={onDelete}
      >
        Delete
      </Button>
    </>
  );
}

function MoveHandle({ mark, onMove }: { mark: string; onMove: (by: -1 | 1) => void }) {
  const onKeyDown = (event: KeyboardEvent) => {
    const by = event.key === 'ArrowUp' ? -1 : event.key === 'ArrowDown' ? 1 : null;
    if (by === null) return;
    event.preventDefault();
    onMove(by);
  };
  return (
    <Hint text="Move it: arrow up and down keys, or Shift and click for up, click for down">
      <Button
        size="small"
        rank="quiet"
        aria-label={`Move ${mark}: arrow up or down`}
        onKeyDown={onKeyDown}
        onClick={(event) => onMove(event.shiftKey ? -1 : 1)}
      >
        <span aria-hidden="true">↕</span>
      </Button>
    </Hint>
  );
}
