import { same } from '#client/lib/same.ts';

/** What was, is and could be again: the undo of a form as a whole. */
export interface History<T> {
  readonly past: readonly T[];
  readonly present: T;
  readonly future: readonly T[];
  /** The field of the last edit and its time: typing on in one field is one step. */
  readonly last: { readonly field: string; readonly at: number } | null;
}

export type HistoryAction<T> =
  | { readonly type: 'edit'; readonly value: T; readonly field: string; readonly at: number }
  | { readonly type: 'undo' }
  | { readonly type: 'redo' }
  | { readonly type: 'adopt'; readonly value: T };

const STEPS = 200;
const PAUSE = 1_200;

export const begin = <T>(present: T): History<T> => ({ past: [], present, future: [], last: null });

export function nextHistory<T>(history: History<T>, action: HistoryAction<T>): History<T> {
  const { past, present, future, last } = history;
  switch (action.type) {
    case 'edit': {
      if (same(action.value, present)) return history;
      const goesOn = last?.field === action.field && action.at - last.at < PAUSE;
      return {
        past: goesOn ? past : [...past, present].slice(-STEPS),
        present: action.value,
        future: [],
        last: { field: action.field, at: action.at },
      };
    }
    case 'undo': {
      const before = past.at(-1);
      if (before === undefined) return history;
      return { past: past.slice(0, -1), present: before, future: [present, ...future], last: null };
    }
    case 'redo': {
      const [after, ...rest] = future;
      if (after === undefined) return history;
      return { past: [...past, present], present: after, future: rest, last: null };
    }
    case 'adopt':
      return begin(action.value);
  }
}
