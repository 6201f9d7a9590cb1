import { z } from 'zod';

import type { Layout } from '@/geometry/core/layout';
import type { Draft } from 'immer';
import { EditRefused } from './edit-refused';
import { layoutSchema } from './layout-schema';

/**
 * Undo is an edit too: it says, item by item, what stood there before and what the undone edit left. Items are found by
 * their names, not by their places in a list, so an undo still fits after somebody else's edit; where somebody else
 * changed the same item since, it is refused instead of overwriting their work.
 */
export const restoreSchema = z.strictObject({
  id: z.uuid(),
  kind: z.literal('restore'),
  changes: z
    .array(
      z.strictObject({
        /** Section, then the item's name where the section is a list or a record. */
        path: z.array(z.string().max(200)).min(1).max(3),
        /** Missing = was not there. */
        before: z.unknown().optional(),
        after: z.unknown().optional(),
        /** Place in its list before the edit. */
        at: z.number().int().min(0).optional(),
      }),
    )
    .max(2000),
});

export type Restore = z.infer<typeof restoreSchema>;
type Change = Restore['changes'][number];
type Items = unknown[] | Record<string, unknown>;

/** Name of an item in its list, or null where the list has no names and is kept whole. */
function nameOf(item: unknown): string | null {
  if (typeof item !== 'object' || item === null) return null;
  if ('id' in item && typeof item.id === 'string') return item.id;
  if ('between' in item && Array.isArray(item.between)) return item.between.join('|');
  if ('on' in item && 'at' in item) return `${String(item.on)}@${String(item.at)}`;
  return null;
}

const named = (list: readonly unknown[]): boolean => list.every((item) => nameOf(item) !== null);

/** Sections whose fields are kept one by one. */
const BY_FIELD: ReadonlySet<string> = new Set(['room', 'letters', 'accepted', 'work']);

/** All that differs between two versions of a layout, as named items. */
export function changesBetween(before: Layout, after: Layout): Change[] {
  return compare(before as unknown as Record<string, unknown>, after as unknown as Record<string, unknown>, []);
}

function compare(before: Record<string, unknown>, after: Record<string, unknown>, path: string[]): Change[] {
  const changes: Change[] = [];
  for (const key of new Set([...Object.keys(before), ...Object.keys(after)])) {
    const a = before[key];
    const b = after[key];
    if (a === b) continue;
    if (Array.isArray(a) && Array.isArray(b) && (named(a) || a.length === 0) && (named(b) || b.length === 0))
      changes.push(...compareLists(a, b, [...path, key]));
    else if (path.length === 0 && BY_FIELD.has(key) && a !== undefined && b !== undefined)
      changes.push(...compare(a as Record<string, unknown>, b as Record<string, unknown>, [key]));
    else changes.push({ path: [...path, key], before: a, after: b });
  }
  return changes;
}

function compareLists(before: readonly unknown[], after: readonly unknown[], path: string[]): Change[] {
  const changes: Change[] = [];
  const left = new Map(after.map((item) => [nameOf(item)!, item]));
  before.forEach((item, at) => {
    const name = nameOf(item)!;
    const now = left.get(name);
    left.delete(name);
    if (now !== item) changes.push({ path: [...path, name], before: item, after: now, at });
  });
  for (const [name, item] of left) changes.push({ path: [...path, name], after: item });
  return changes;
}

/** Puts every item back; throws EditRefused where somebody changed one since. */
export function applyRestore(draft: Draft<Layout>, edit: Restore): void {
  for (const change of edit.changes) restoreOne(draft, change);
  const checked = layoutSchema.safeParse(draft);
  if (!checked.success) throw new EditRefused('What would come back does not fit the layout any more.');
}

function restoreOne(draft: Draft<Layout>, change: Change): void {
  const name = change.path[change.path.length - 1]!;
  let holder: Items = draft as unknown as Record<string, unknown>;
  for (const key of change.path.slice(0, -1)) holder = (holder as Record<string, unknown>)[key] as Items;
  if (Array.isArray(holder)) restoreInList(holder, name, change);
  else {
    if (!same(holder[name], change.after)) throw new EditRefused('It was changed again since.');
    if (change.before === undefined) delete holder[name];
    else holder[name] = change.before;
  }
}

function restoreInList(list: unknown[], name: string, change: Change): void {
  const index = list.findIndex((item) => nameOf(item) === name);
  if (!same(index < 0 ? undefined : list[index], change.after)) throw new EditRefused('It was changed again since.');
  if (change.before === undefined) list.splice(index, 1);
  else if (index < 0) list.splice(Math.min(change.at ?? list.length, list.length), 0, change.before);
  else list[index] = change.before;
}

/** Equal as documents: key order does not count (the database keeps none). */
function same(a: unknown, b: unknown): boolean {
  if (a === b) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  if (Array.isArray(a) !== Array.isArray(b)) return false;
  const keys = Object.keys(a);
  const other = b as Record<string, unknown>;
  return (
    keys.length === Object.keys(b).length && keys.every((key) => same((a as Record<string, unknown>)[key], other[key]))
  );
}
