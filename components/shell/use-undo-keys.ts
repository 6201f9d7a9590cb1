import { useEffect } from 'react';

import { typingInto } from '../ui/typing-into';

/** Ctrl Z and Shift Ctrl Z (Cmd on some keyboards); fields keep their own undo. */
export function useUndoKeys(undo: () => void, redo: () => void, active: boolean): void {
  useEffect(() => {
    if (!active) return;
    const onKey = (event: KeyboardEvent) => {
      if (event.key.toLowerCase() !== 'z' || !(event.ctrlKey || event.metaKey) || typingInto(event.target)) return;
      event.preventDefault();
      if (event.shiftKey) redo();
      else undo();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, [undo, redo, active]);
}
