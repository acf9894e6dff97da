import { useEffect } from 'react';

interface Undoable {
  readonly undo: () => void;
  readonly redo: () => void;
  readonly saveNow: () => void;
}

/**
 * Ctrl+Z, Ctrl+Shift+Z (or Ctrl+Y) and Ctrl+S for the form of a page as a whole, in place of a
 * field's own; dialogs over the page keep theirs.
 */
export function useFormKeys({ undo, redo, saveNow }: Undoable) {
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
      if (event.target instanceof Element && event.target.closest('dialog')) return;
      const key = event.key.toLowerCase();
      if (key === 'z') (event.shiftKey ? redo : undo)();
      else if (key === 'y') redo();
      else if (key === 's') saveNow();
      else return;
      event.preventDefault();
    };
    window.addEventListener('keydown', onKeyDown);
    return () => window.removeEventListener('keydown', onKeyDown);
  }, [undo, redo, saveNow]);
}
