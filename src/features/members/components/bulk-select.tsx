import { useEffect, useRef } from 'react';
import { count } from '#client/lib/count.ts';
import { Button } from '#client/ui/button.tsx';
import { Keycap } from '#client/ui/keycap.tsx';
import type { Selection } from '../bulk-selection.ts';

/** The box of one member; Shift chooses all from the last one on. */
export function SelectBox(props: { selection: Selection; id: string; mark: string }) {
  const { selection, id } = props;
  return (
    <input
      type="checkbox"
      data-selects={id}
      aria-label={`Choose ${props.mark || 'the member without a mark'}`}
      checked={selection.has(id)}
      onChange={(event) =>
        selection.toggle(id, (event.nativeEvent as Partial<MouseEvent>).shiftKey === true)
      }
      className="block size-4 accent-oxide"
    />
  );
}

/** The box of all members that are shown. */
export function SelectAllBox({ selection, shown }: { selection: Selection; shown: string[] }) {
  const box = useRef<HTMLInputElement>(null);
  const chosen = shown.filter(selection.has).length;
  const all = chosen > 0 && chosen === shown.length;
  useEffect(() => {
    if (box.current) box.current.indeterminate = chosen > 0 && !all;
  }, [chosen, all]);
  return (
    <input
      ref={box}
      type="checkbox"
      aria-label="Choose all members shown"
      checked={all}
      disabled={shown.length === 0}
      onChange={() => selection.put(shown, !all)}
      className="block size-4 accent-oxide"
    />
  );
}

/** How many are chosen, and what can be done with them. */
export function SelectionBar(props: {
  selection: Selection;
  shown: readonly string[];
  onChange: () => void;
}) {
  const { selection, shown } = props;
  const { chosen } = selection;
  const hidden = chosen.filter((id) => !shown.includes(id)).length;
  return (
    <div className="mb-1 flex min-h-8 flex-wrap items-center gap-x-3 text-small">
      {chosen.length === 0 ? (
        <p className="flex flex-wrap items-center gap-1 text-zinc-7">
          Choose members to change several at once: <Keycap>Space</Keycap> one,{' '}
          <Keycap>Shift</Keycap> with it a range.
        </p>
      ) : (
        <>
          <p role="status" className="font-semibold">
            {count(chosen.length, 'member')} chosen
            {hidden > 0 && `, ${hidden} of them not shown`}
          </p>
          <Button size="small" rank="main" onClick={props.onChange}>
            Change {chosen.length === 1 ? 'it' : 'them'}
          </Button>
          <Button size="small" rank="quiet" onClick={selection.clear}>
            Choose none
          </Button>
        </>
      )}
    </div>
  );
}
