import { useState } from 'react';

import type { DrawItem, Scene } from '@/geometry/scene/display-list';

/**
 * The same drawing, with the items of the last one wherever nothing about them changed. A drawing is made anew with every
 * edit; painted again is then only what the edit moved.
 */
export function useStableScene(scene: Scene): Scene {
  const [last, setLast] = useState(scene);
  const stable = stableScene(last, scene);
  if (stable !== last) setLast(stable);
  return stable;
}

/** `next` with equal items replaced by those of `last`; `last` itself when all are equal. */
export function stableScene(last: Scene, next: Scene): Scene {
  if (last === next) return last;
  const known = new Map<string, DrawItem[]>();
  for (const item of last.items) {
    const key = `${item.kind} ${item.layer} ${item.id ?? ''}`;
    known.set(key, [...(known.get(key) ?? []), item]);
  }
  const items = next.items.map(
    (item) => known.get(`${item.kind} ${item.layer} ${item.id ?? ''}`)?.find((old) => equal(old, item)) ?? item,
  );
  const same = items.length === last.items.length && items.every((item, i) => item === last.items[i]);
  if (same && equal({ ...last, items: [] }, { ...next, items: [] })) return last;
  return { ...next, items };
}

/** Deep equality of plain data. */
function equal(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  if (Array.isArray(a) !== Array.isArray(b)) return false;
  const [left, right] = [a as Record<string, unknown>, b as Record<string, unknown>];
  const keys = Object.keys(left);
  return keys.length === Object.keys(right).length && keys.every((key) => equal(left[key], right[key]));
}
