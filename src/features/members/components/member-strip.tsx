import type { ReactNode } from 'react';
import type { VersionedDraft } from '#client/lib/draft/use-versioned-draft.ts';
import { Button } from '#client/ui/button.tsx';
import { classNames } from '#client/ui/class-names.ts';
import { Hint } from '#client/ui/hint.tsx';
import type { MemberDraft } from '#shared/contracts/members.ts';

export type CentreView = 'sheet' | 'forces' | 'finder';

const views: readonly { readonly value: CentreView; readonly text: string }[] = [
  { value: 'sheet', text: 'Sheet' },
  { value: 'forces', text: 'Forces' },
  { value: 'finder', text: 'Find a section' },
];

/** Over the sheet: which paper lies there, the members beside this one, undo and redo. */
export function MemberStrip(props: {
  view: CentreView;
  onView: (view: CentreView) => void;
  draft: VersionedDraft<MemberDraft>;
  editable: boolean;
  neighbours: ReactNode;
}) {
  const { draft, view } = props;
  return (
    <div
      data-screen-only
      className="mx-auto mb-2 flex max-w-[880px] items-center justify-between gap-4 text-small"
    >
      <div className="flex gap-1">
        {views.map(({ value, text }) => (
          <button
            key={value}
            type="button"
            aria-pressed={view === value}
            onClick={() => props.onView(value)}
            className={classNames(
              'border-b-2 px-1.5 py-0.5',
              view === value
                ? 'border-ink font-semibold'
                : 'border-transparent hover:border-zinc-5',
            )}
          >
            {text}
          </button>
        ))}
      </div>
      <div className="flex items-center gap-4">{props.neighbours}</div>
      <div className="flex gap-1">
        {props.editable && (
          <>
            <Hint text="Ctrl+Z">
              <Button size="small" rank="quiet" disabled={!draft.canUndo} onClick={draft.undo}>
                Undo
              </Button>
            </Hint>
            <Hint text="Ctrl+Shift+Z">
              <Button size="small" rank="quiet" disabled={!draft.canRedo} onClick={draft.redo}>
                Redo
              </Button>
            </Hint>
          </>
        )}
      </div>
    </div>
  );
}
