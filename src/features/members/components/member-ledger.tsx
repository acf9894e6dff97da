import { type ReactNode, useRef, useState } from 'react';
import { reasonOf } from '#client/lib/problem.ts';
import { useAnnounce } from '#client/ui/announcements.tsx';
import { HeadCell, Ledger } from '#client/ui/ledger.tsx';
import { PartHead } from '#client/ui/paper.tsx';
import type { Calculation } from '#shared/contracts/calculations.ts';
import type { MemberRow } from '#shared/contracts/members.ts';
import { useSelection } from '../bulk-selection.ts';
import { useReorderMembers } from '../mutations.ts';
import { BulkChangePanel } from './bulk-change-panel.tsx';
import { SelectAllBox, SelectionBar } from './bulk-select.tsx';
import { MemberLedgerRow } from './member-ledger-row.tsx';

const matches = (row: MemberRow, wanted: string): boolean =>
  wanted
    .toLowerCase()
    .split(/\s+/)
    .every((word) =>
      [row.mark, row.section, row.place, row.material, row.summary.verdict]
        .join(' ')
        .toLowerCase()
        .includes(word),
    );

/** A calculation's members: what governs each and by how much. */
export function MemberLedger(props: { calculation: Calculation; actions: ReactNode }) {
  const { calculation } = props;
  const [wanted, setWanted] = useState('');
  const reorder = useReorderMembers(calculation.id);
  const announce = useAnnounce();
  const rows = calculation.memberRows;
  const editable = calculation.can.edit;
  const shown = rows.filter((row) => matches(row, wanted.trim()));
  const shownIds = shown.map(({ id }) => id);
  const selection = useSelection(
    rows.map(({ id }) => id),
    shownIds,
  );
  const [changing, setChanging] = useState(false);
  const bar = useRef<HTMLDivElement>(null);
  const move = (row: MemberRow, by: -1 | 1) => {
    const from = rows.indexOf(row);
    const to = from + by;
    if (to < 0 || to >= rows.length) return;
    const ids = rows.map(({ id }) => id);
    ids.splice(to, 0, ...ids.splice(from, 1));
    reorder.mutate(ids, {
      onSuccess: () => announce(`${row.mark} is now number ${to + 1} of ${rows.length}.`),
      onError: (error) => announce(reasonOf(error)),
    });
  };
  if (changing && selection.chosen.length > 0) {
    return (
      <BulkChangePanel
        calculation={calculation}
        memberIds={selection.chosen}
        onLeaveOut={(id) => selection.put([id], false)}
        onClose={() => {
          setChanging(false);
          requestAnimationFrame(() => bar.current?.querySelector('button')?.focus());
        }}
      />
    );
  }
  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: the keys of the boxes in it
    <div onKeyDown={selection.onKeyDown}>
      <PartHead
        title="Members"
        actions={
          <>
            <div className="flex items-center gap-2.5">
              <label htmlFor="member-search" className="text-small text-zinc-7">
                Search
              </label>
              <input
                id="member-search"
                type="search"
                value={wanted}
                onChange={(event) => setWanted(event.target.value)}
                placeholder="mark, section, place, verdict"
                className="h-8 w-64 rounded-field border border-zinc-3 bg-paper px-2"
              />
              <span role="status" className="sr-only">
                {wanted && `${shown.length} of ${rows.length} members`}
              </span>
            </div>
            {props.actions}
          </>
        }
      />
      {editable && (
        <div ref={bar}>
          <SelectionBar selection={selection} shown={shownIds} onChange={() => setChanging(true)} />
        </div>
      )}
      <Ledger
        caption="Members"
        head={
          <>
            {editable && (
              <HeadCell className="w-[1%]">
                <SelectAllBox selection={selection} shown={shownIds} />
              </HeadCell>
            )}
            <HeadCell>Member</HeadCell>
            <HeadCell>Section</HeadCell>
            <HeadCell>Where</HeadCell>
            <HeadCell className="w-[16%]">Ratio</HeadCell>
            <HeadCell className="text-right">Verdict</HeadCell>
            <HeadCell>Governs</HeadCell>
            <HeadCell>Inputs</HeadCell>
            {editable && (
              <HeadCell className="w-[1%]">
                <span className="sr-only">Order, duplicate, delete</span>
              </HeadCell>
            )}
          </>
        }
      >
        {shown.map((row) => (
          <MemberLedgerRow
            key={row.id}
            calculationId={calculation.id}
            row={row}
            {...(editable ? { onMove: (by: -1 | 1) => move(row, by), selection } : {})}
          />
        ))}
      </Ledger>
      {shown.length === 0 && (
        <p className="py-4 text-zinc-7">
          No member matches “{wanted}”.{' '}
          <button type="button" className="link" onClick={() => setWanted('')}>
            Show all {rows.length}
          </button>
        </p>
      )}
    </div>
  );
}
