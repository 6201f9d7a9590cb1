import { useEffect, useRef, useState } from 'react';

import { typingInto } from '../ui/typing-into';

/** J and K move through a list, Enter opens. Gives the index under the mark, -1 before the first key. */
export function useListKeys(count: number, onOpen: (index: number) => void, active: boolean): number {
  const [index, setIndex] = useState(-1);
  const latest = useRef({ count, onOpen, index });
  useEffect(() => {
    latest.current = { count, onOpen, index };
  });
  useEffect(() => {
    if (!active) return;
    const onKey = (event: KeyboardEvent) => {
      if (event.ctrlKey || event.metaKey || event.altKey || typingInto(event.target)) return;
      const now = latest.current;
      if (event.key === 'j' || event.key === 'k') {
        const step = event.key === 'j' ? 1 : -1;
        setIndex(Math.max(0, Math.min(now.count - 1, now.index + step)));
      } else if (event.key === 'Enter' && event.target === document.body && now.index >= 0 && now.index < now.count)
        now.onOpen(now.index);
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, [active]);
  return index < count ? index : -1;
}
