import { Button } from '#client/ui/button.tsx';
import { classNames } from '#client/ui/class-names.ts';
import { VerdictText } from '#client/ui/verdict.tsx';
import type { MemberRecord } from '#shared/calc/record.ts';
import type { DraftCombination } from '#shared/contracts/members.ts';

/** The member's combinations with their verdicts; the shown one is marked. */
export function CombinationList(props: {
  rows: readonly DraftCombination[];
  record: MemberRecord | null;
  shown: string | undefined;
  editable: boolean;
  onShow: (id: string) => void;
  onAdd: () => void;
  onOpenTable: () => void;
}) {
  const { rows, record, shown } = props;
  return (
    <section aria-labelledby="combinations">
      <h2 id="combinations" className="caps mb-1.5">
        Combinations
      </h2>
      <ul className="max-h-44 overflow-y-auto border-y border-zinc-3">
        {rows.map((row) => {
          const summary = record?.combinations.find(({ id }) => id === row.id)?.summary;
          return (
            <li key={row.id} className="border-b border-zinc-2 last:border-b-0">
              <button
                type="button"
                aria-pressed={row.id === shown}
                onClick={() => props.onShow(row.id)}
                className={classNames(
                  'flex w-full items-baseline justify-between gap-2 px-2 py-1 text-left font-condensed',
                  row.id === shown
                    ? 'bg-paper font-semibold shadow-[inset_3px_0_0_var(--color-ink)]'
                    : 'hover:bg-zinc-1',
                )}
              >
                <span className="min-w-0 truncate" title={row.name}>
                  {row.name || 'without a name'}
                </span>
                {summary && <VerdictText verdict={summary.verdict} ratioText={summary.ratioText} />}
              </button>
            </li>
          );
        })}
      </ul>
      <div className="mt-2 flex gap-2">
        {props.editable && (
          <Button size="small" onClick={props.onAdd}>
            Add
          </Button>
        )}
        <Button size="small" onClick={props.onOpenTable}>
          {props.editable ? 'All as a table, or paste' : 'All as a table'}
        </Button>
      </div>
    </section>
  );
}
