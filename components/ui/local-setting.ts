import { createContext, useContext, useSyncExternalStore } from 'react';

/**
 * Settings that belong to one person on one device: theme, millimeters on the pad, the left-hand pad, single-key shortcuts.
 * They are kept in the browser only. Where the browser refuses to keep anything, they hold until the page is left.
 */
export const SettingOwner = createContext<string>('anyone');

const PREFIX = 'offsquare.setting';

const memory = new Map<string, string>();
const listeners = new Set<() => void>();

/**
 * One setting of the person given by `SettingOwner`.
 *
 * @param name - short and stable, it is part of the key
 * @param allowed - every value it can have; anything else found in the browser counts as `fallback`
 * @returns the value and a setter; every component that reads the same setting follows
 */
export function useLocalSetting<T extends string>(
  name: string,
  allowed: readonly T[],
  fallback: T,
): readonly [T, (next: T) => void] {
  const owner = useContext(SettingOwner);
  const key = `${PREFIX}.${owner}.${name}`;
  const raw = useSyncExternalStore(
    subscribe,
    () => read(key),
    () => null,
  );
  const value = allowed.find((one) => one === raw) ?? fallback;
  return [value, (next) => write(key, next)];
}

/** An on/off setting, see `useLocalSetting`. */
export function useLocalSwitch(name: string, fallback: boolean): readonly [boolean, (next: boolean) => void] {
  const [value, set] = useLocalSetting(name, ['on', 'off'], fallback ? 'on' : 'off');
  return [value === 'on', (next) => set(next ? 'on' : 'off')];
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  window.addEventListener('storage', listener);
  return () => {
    listeners.delete(listener);
    window.removeEventListener('storage', listener);
  };
}

function read(key: string): string | null {
  try {
    return memory.get(key) ?? window.localStorage.getItem(key);
  } catch {
    // Storage is blocked in this browser: the page's own memory stands in.
    return memory.get(key) ?? null;
  }
}

function write(key: string, value: string): void {
  try {
    window.localStorage.setItem(key, value);
    memory.delete(key);
  } catch {
    // Full or blocked: the setting still holds while the page is open.
    memory.set(key, value);
  }
  for (const listener of listeners) listener();
}
