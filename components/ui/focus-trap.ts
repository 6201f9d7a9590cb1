import { useEffect, type RefObject } from 'react';
import type { View } from 'react-native';

const FOCUSABLE =
  'a[href],button:not([disabled]),input:not([disabled]),select:not([disabled]),textarea:not([disabled]),[tabindex]';

/** What Tab reaches inside an element, in order. */
export function focusablesIn(root: HTMLElement): readonly HTMLElement[] {
  return Array.from(root.querySelectorAll<HTMLElement>(FOCUSABLE)).filter(
    (element) =>
      element.tabIndex >= 0 && element.getAttribute('aria-disabled') !== 'true' && !element.closest('[inert]'),
  );
}

/** On Tab: goes round inside `root` instead of leaving it. */
export function keepTabInside(event: KeyboardEvent, root: HTMLElement): void {
  if (event.key !== 'Tab') return;
  const stops = focusablesIn(root);
  const first = stops[0];
  const last = stops[stops.length - 1];
  if (!first || !last) {
    event.preventDefault();
    root.focus();
    return;
  }
  const at = document.activeElement;
  const outside = !root.contains(at) || at === root;
  if (event.shiftKey && (at === first || outside)) {
    event.preventDefault();
    last.focus();
  } else if (!event.shiftKey && (at === last || outside)) {
    event.preventDefault();
    first.focus();
  }
}

/**
 * While `active`: the focus goes into the element (to what asks for it, else the element itself), Tab stays inside, and when
 * it ends the focus goes back to where it was.
 */
export function useFocusTrap(ref: RefObject<View | null>, active: boolean): void {
  useEffect(() => {
    const root = ref.current as unknown as HTMLElement | null;
    if (!active || !root) return;
    const before = document.activeElement as HTMLElement | null;
    if (!root.contains(before))
      (root.querySelector<HTMLElement>('[data-autofocus]') ?? root).focus({ preventScroll: true });
    const onKeyDown = (event: KeyboardEvent) => keepTabInside(event, root);
    document.addEventListener('keydown', onKeyDown);
    return () => {
      document.removeEventListener('keydown', onKeyDown);
      if (before?.isConnected) before.focus({ preventScroll: true });
    };
  }, [ref, active]);
}
