import { useRef, type KeyboardEvent } from 'react';
import type { View } from 'react-native';

export interface RadioKeys {
  /** For the container. */
  readonly group: {
    readonly ref: React.RefObject<View | null>;
    readonly onKeyDown: (event: KeyboardEvent<HTMLElement>) => void;
  };
  /** tabIndex of one option: only the chosen one (or the first) is reached by Tab. */
  readonly tabIndex: (index: number) => 0 | -1;
}

/**
 * Keys of a set of which one is chosen: arrows, Home and End move and choose, Tab leaves.
 *
 * @param count - how many options
 * @param chosen - index, or -1 for none yet
 * @param isOff - options that cannot be chosen are skipped
 */
export function useRadioKeys(
  count: number,
  chosen: number,
  onChoose: (index: number) => void,
  isOff: (index: number) => boolean = () => false,
): RadioKeys {
  const ref = useRef<View>(null);
  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    const next = nextIndex(event.key, Math.max(chosen, 0), count, isOff);
    if (next === null) return;
    event.preventDefault();
    onChoose(next);
    const root = ref.current as unknown as HTMLElement | null;
    root?.querySelectorAll<HTMLElement>('[role=radio],[role=tab]')[next]?.focus();
  };
  return { group: { ref, onKeyDown }, tabIndex: (index) => (index === Math.max(chosen, 0) ? 0 : -1) };
}

/** Where a key leads to from `at`, going round, or null if the key or the options lead nowhere. */
export function nextIndex(key: string, at: number, count: number, isOff: (index: number) => boolean): number | null {
  const step = key === 'ArrowRight' || key === 'ArrowDown' ? 1 : key === 'ArrowLeft' || key === 'ArrowUp' ? -1 : 0;
  if (step === 0 && key !== 'Home' && key !== 'End') return null;
  const from = key === 'Home' ? -1 : key === 'End' ? count : at;
  const way = step !== 0 ? step : key === 'Home' ? 1 : -1;
  for (let i = 1; i <= count; i++) {
    const index = (((from + way * i) % count) + count) % count;
    if (!isOff(index)) return index;
  }
  return null;
}
