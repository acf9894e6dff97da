import { useCallback, useEffect, useReducer, useRef, useState } from 'react';
import { isProblem, reasonOf } from '#client/lib/problem.ts';
import { same } from '#client/lib/same.ts';
import { begin, type History, type HistoryAction, nextHistory } from './history.ts';
import { type Merge, type MergeRules, merge } from './merge.ts';
import { forgetUnsaved, keepUnsaved, recallUnsaved } from './unsaved.ts';

/** A value as the server has it. */
export interface Stored<T> {
  readonly version: number;
  readonly value: T;
  readonly changedBy: string;
  readonly changedAt: string;
}

export type SaveState =
  | { readonly kind: 'saved'; readonly at: Date }
  | { readonly kind: 'unsaved' }
  | { readonly kind: 'saving' }
  | { readonly kind: 'held'; readonly reason: string };

/** Somebody else saved a newer version in the meantime. */
export interface Conflict<T> extends Merge<T> {
  readonly mine: T;
  readonly theirs: Stored<T>;
}

export interface VersionedDraft<T> {
  readonly value: T;
  readonly edit: (value: T, field: string) => void;
  readonly undo: () => void;
  readonly redo: () => void;
  readonly canUndo: boolean;
  readonly canRedo: boolean;
  readonly saveState: SaveState;
  readonly saveNow: () => void;
  readonly conflict: Conflict<T> | null;
  /** Ends a conflict with this value, on top of theirs. */
  readonly settle: (value: T) => void;
  /** When input kept in this browser was brought back on opening. */
  readonly restoredFrom: string | null;
}

export interface VersionedDraftOptions<T> {
  /** What the draft is of, such as `member/ID`; a change of it has to remount. */
  readonly key: string;
  readonly stored: Stored<T>;
  readonly rules: MergeRules<T>;
  readonly editable: boolean;
  readonly save: (version: number, value: T) => Promise<Stored<T>>;
  /** Their version out of a conflict's `theirs`. */
  readonly readTheirs: (theirs: unknown) => Stored<T>;
}

const SAVE_AFTER = 700;
const TRY_AGAIN_AFTER = 8_000;

/**
 * A form that saves itself: undo over the whole value, versions, input that survives a reload,
 * and conflicts that a person settles.
 */
export function useVersionedDraft<T>(options: VersionedDraftOptions<T>): VersionedDraft<T> {
  const { key, stored, rules, editable } = options;
  const [kept] = useState(() => (editable ? recallUnsaved<T>(key) : null));
  const sameVersion = kept?.version === stored.version;
  const [history, dispatch] = useReducer(
    nextHistory as (history: History<T>, action: HistoryAction<T>) => History<T>,
    null,
    () =>
      kept && sameVersion
        ? { ...begin(stored.value), past: [stored.value], present: kept.value }
        : begin(stored.value),
  );
  const [saveState, setSaveState] = useState<SaveState>({
    kind: 'saved',
    at: new Date(stored.changedAt),
  });
  const [conflict, setConflict] = useState<Conflict<T> | null>(() =>
    kept && !sameVersion && !same(kept.value, stored.value)
      ? conflictOf(kept.base, kept.value, stored, rules)
      : null,
  );
  const base = useRef({ version: stored.version, value: stored.value });
  const present = useRef(history.present);
  present.current = history.present;
  const latest = useRef(options);
  latest.current = options;
  const busy = useRef(false);
  const blocked = useRef(conflict !== null);
  blocked.current = conflict !== null;

  const saveNow = useCallback(async () => {
    const sent = present.current;
    if (busy.current || blocked.current || same(sent, base.current.value)) return;
    busy.current = true;
    setSaveState({ kind: 'saving' });
    try {
      const saved = await latest.current.save(base.current.version, sent);
      base.current = { version: saved.version, value: sent };
      forgetUnsaved(latest.current.key);
      setSaveState({ kind: 'saved', at: new Date(saved.changedAt) });
    } catch (error) {
      const detail = isProblem(error, 'conflict') ? error.details?.conflict : undefined;
      if (detail) {
        const theirs = latest.current.readTheirs(detail.theirs);
        setConflict(conflictOf(base.current.value, sent, theirs, latest.current.rules));
      }
      setSaveState({ kind: 'held', reason: reasonOf(error) });
    } finally {
      busy.current = false;
    }
  }, []);

  const value = history.present;
  useEffect(() => {
    if (!editable || conflict) return;
    if (same(value, base.current.value)) {
      forgetUnsaved(key);
      setSaveState((was) =>
        was.kind === 'unsaved' || was.kind === 'held' ? { kind: 'saved', at: new Date() } : was,
      );
      return;
    }
    const { version } = base.current;
    keepUnsaved(key, { version, base: base.current.value, value, at: new Date().toISOString() });
    if (saveState.kind === 'saving') return;
    if (saveState.kind === 'saved') setSaveState({ kind: 'unsaved' });
    const wait = saveState.kind === 'held' ? TRY_AGAIN_AFTER : SAVE_AFTER;
    const timer = window.setTimeout(() => void saveNow(), wait);
    return () => window.clearTimeout(timer);
  }, [value, key, editable, conflict, saveState, saveNow]);

  // Leaving the page within the application saves at once.
  useEffect(
    () => () => {
      if (latest.current.editable) void saveNow();
    },
    [saveNow],
  );

  // A newer version arrives while nothing here is unsaved: take it over.
  useEffect(() => {
    if (stored.version <= base.current.version || busy.current) return;
    if (!same(present.current, base.current.value)) return;
    base.current = { version: stored.version, value: stored.value };
    dispatch({ type: 'adopt', value: stored.value });
    setSaveState({ kind: 'saved', at: new Date(stored.changedAt) });
  }, [stored]);

  const settle = useCallback(
    (settled: T) => {
      if (!conflict) return;
      base.current = { version: conflict.theirs.version, value: conflict.theirs.value };
      blocked.current = false;
      setConflict(null);
      dispatch({ type: 'edit', value: settled, field: 'conflict', at: Date.now() });
      present.current = settled;
      forgetUnsaved(key);
      setSaveState({ kind: 'unsaved' });
      void saveNow();
    },
    [conflict, key, saveNow],
  );

  const edit = useCallback(
    (next: T, field: string) => dispatch({ type: 'edit', value: next, field, at: Date.now() }),
    [],
  );
  return {
    value,
    edit,
    undo: useCallback(() => dispatch({ type: 'undo' }), []),
    redo: useCallback(() => dispatch({ type: 'redo' }), []),
    canUndo: history.past.length > 0,
    canRedo: history.future.length > 0,
    saveState:
      saveState.kind === 'saved' && editable && !same(value, base.current.value)
        ? { kind: 'unsaved' }
        : saveState,
    saveNow: useCallback(() => void saveNow(), [saveNow]),
    conflict,
    settle,
    restoredFrom: kept && sameVersion && !same(kept.value, stored.value) ? kept.at : null,
  };
}

const conflictOf = <T>(base: T, mine: T, theirs: Stored<T>, rules: MergeRules<T>): Conflict<T> => ({
  ...merge(base, mine, theirs.value, rules),
  mine,
  theirs,
});
