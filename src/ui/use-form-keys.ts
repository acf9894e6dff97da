import { type KeyboardEvent, useCallback } from 'react';

interface Undoable {
  readonly undo: () => void;
  readonly redo: () => void;
  readonly saveNow: () => void;
}

/** Ctrl+Z, Ctrl+Shift+Z (or Ctrl+Y) and Ctrl+S for a form as a whole, in place of a field's own. */
export function useFormKeys({ undo, redo, saveNow }: Undoable) {
  return useCallback(
    (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
      const key = event.key.toLowerCase();
      if (key === 'z') (event.shiftKey ? redo : undo)();
      else if (key === 'y') redo();
      else if (key === 's') saveNow();
      else return;
      event.preventDefault();
    },
    [undo, redo, saveNow],
  );
}
