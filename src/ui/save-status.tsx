import { clockTime } from '#client/lib/clock.ts';
import type { SaveState } from '#client/lib/draft/use-versioned-draft.ts';
import { Hint } from './hint.tsx';

/** `saved 09:41`, in the top bar. */
export function SaveStatus({ state, onSave }: { state: SaveState; onSave: () => void }) {
  switch (state.kind) {
    case 'saved':
      return <span className="whitespace-nowrap text-zinc-2">saved {clockTime(state.at)}</span>;
    case 'unsaved':
    case 'saving':
      return <span className="whitespace-nowrap text-zinc-2">saving …</span>;
    case 'held':
      return (
        <Hint text={`${state.reason} What you typed is kept in this browser; it is tried again.`}>
          <button
            type="button"
            onClick={onSave}
            className="border-b border-oxide-3 font-semibold whitespace-nowrap text-oxide-3"
          >
            not saved, try now
          </button>
        </Hint>
      );
  }
}
