import { useEffect, useRef } from 'react';

import { useSingleKeys } from './preferences';
import { typingInto } from './typing-into';

/**
 * What keys of a page do: `{ '/': find, 'ctrl+z': undo, 'shift+ctrl+z': redo, '1': () => go('room') }`. Ctrl stands for the
 * command key too. Keys without Ctrl can be turned off by the person, and none counts while something is typed.
 */
export type Shortcuts = Readonly<Record<string, (() => void) | undefined>>;

/** Listens for the page's shortcuts while `active`. */
export function useShortcuts(shortcuts: Shortcuts, active = true): void {
  const [singleKeys] = useSingleKeys();
  const latest = useRef(shortcuts);
  useEffect(() => {
    latest.current = shortcuts;
  });
  useEffect(() => {
    if (!active) return;
    const onKeyDown = (event: KeyboardEvent) => {
      if (event.defaultPrevented || typingInto(event.target)) return;
      const name = shortcutName(event);
      const act = latest.current[name];
      if (!act || (!singleKeys && !name.includes('ctrl+'))) return;
      event.preventDefault();
      act();
    };
    document.addEventListener('keydown', onKeyDown);
    return () => document.removeEventListener('keydown', onKeyDown);
  }, [active, singleKeys]);
}

/** A key as shortcuts are written: letters small, Shift only said beside Ctrl (`?` already is a shifted key). */
export function shortcutName(
  event: Pick<KeyboardEvent, 'key' | 'ctrlKey' | 'metaKey' | 'shiftKey' | 'altKey'>,
): string {
  const key = event.key.length === 1 ? event.key.toLowerCase() : event.key;
  const ctrl = event.ctrlKey || event.metaKey;
  return [ctrl && event.shiftKey && 'shift', ctrl && 'ctrl', event.altKey && 'alt', key].filter(Boolean).join('+');
}
