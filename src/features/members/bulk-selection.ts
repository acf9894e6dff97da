import { type KeyboardEvent, useCallback, useRef, useState } from 'react';

export interface Selection {
  /** Those chosen that are still there, in the order of the list. */
  readonly chosen: readonly string[];
  readonly has: (id: string) => boolean;
  /** Chooses one or lets it go; with `range` all from the last one on. */
  readonly toggle: (id: string, range: boolean) => void;
  readonly put: (ids: readonly string[], chosen: boolean) => void;
  readonly clear: () => void;
  /** Arrows move along the boxes, with Shift they choose on the way; Shift+Space chooses a range. */
  readonly onKeyDown: (event: KeyboardEvent) => void;
}

/** Rows of a list that are chosen: `all` in its order, `shown` those that can be seen. */
export function useSelection(all: readonly string[], shown: readonly string[]): Selection {
  const [ids, setIds] = useState<ReadonlySet<string>>(new Set());
  const anchor = useRef<string | null>(null);
  const put = useCallback((which: readonly string[], chosen: boolean) => {
    setIds((was) => {
      const next = new Set(was);
      for (const id of which) {
        if (chosen) next.add(id);
        else next.delete(id);
      }
      return next;
    });
  }, []);
  const toggle = (id: string, range: boolean) => {
    const from = range && anchor.current !== null ? shown.indexOf(anchor.current) : -1;
    const to = shown.indexOf(id);
    anchor.current = id;
    if (from < 0) return put([id], !ids.has(id));
    put(shown.slice(Math.min(from, to), Math.max(from, to) + 1), !ids.has(id) || from === to);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const box = event.target instanceof HTMLInputElement ? event.target : null;
    const id = box?.dataset.selects;
    if (!box || id === undefined) return;
    if (event.key === ' ' && event.shiftKey) toggle(id, true);
    else if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      const next = shown[shown.indexOf(id) + (event.key === 'ArrowDown' ? 1 : -1)];
      if (next === undefined) return;
      const boxes = event.currentTarget.querySelectorAll<HTMLInputElement>('[data-selects]');
      [...boxes].find((other) => other.dataset.selects === next)?.focus();
      if (event.shiftKey) put([id, next], true);
      anchor.current = event.shiftKey ? anchor.current : next;
    } else return;
    event.preventDefault();
  };
  return {
    chosen: all.filter((id) => ids.has(id)),
    has: (id) => ids.has(id),
    toggle,
    put,
    clear: () => setIds(new Set()),
    onKeyDown,
  };
}
