import { produce, type Draft } from 'immer';
import { z } from 'zod';

import type { Layout } from '@/geometry/core/layout';
import { applyJobEdit, jobEditSchema, type JobEdit } from './edit-job';
import { EditRefused } from './edit-refused';
import { applyRoomEdit, roomEditSchema, type RoomEdit } from './edit-room';
import { applyRestore, changesBetween, restoreSchema, type Restore } from './restore';

/** Every way a layout can change. The id is made by the client: a resend of the same id changes nothing. */
export const editSchema = z.discriminatedUnion('kind', [roomEditSchema, jobEditSchema, restoreSchema]);

export type Edit = RoomEdit | JobEdit | Restore;

/** An edit before it has its id. */
export type EditDraft = Edit extends infer E ? (E extends Edit ? Omit<E, 'id'> : never) : never;

export type ApplyResult =
  | { readonly ok: true; readonly layout: Layout; readonly inverse: Omit<Restore, 'id'> }
  | { readonly ok: false; readonly reason: string };

const ROOM_KINDS = new Set<string>(roomEditSchema.options.map((option) => option.shape.kind.value));

const isRoomEdit = (edit: Edit): edit is RoomEdit => ROOM_KINDS.has(edit.kind);

/**
 * Applies one edit. Pure: the layout given stays as it is, what did not change is shared with the result.
 *
 * @returns the new layout and the edit that undoes it (still without an id); or the reason, in a sentence, why the edit
 *   no longer applies (its wall is gone, it was changed again since)
 */
export function applyEdit(layout: Layout, edit: Edit): ApplyResult {
  try {
    const next = produce(layout, (draft: Draft<Layout>) => {
      if (edit.kind === 'restore') applyRestore(draft, edit);
      else if (isRoomEdit(edit)) applyRoomEdit(draft, edit);
      else applyJobEdit(draft, edit);
    });
    return { ok: true, layout: next, inverse: { kind: 'restore', changes: changesBetween(layout, next) } };
  } catch (error) {
    if (error instanceof EditRefused) return { ok: false, reason: error.message };
    throw error;
  }
}

/** Applies edits in order; those that no longer apply are left out and come back with their reasons. */
export function applyEdits(
  layout: Layout,
  edits: readonly Edit[],
): { layout: Layout; applied: Edit[]; refused: { edit: Edit; reason: string }[] } {
  const applied: Edit[] = [];
  const refused: { edit: Edit; reason: string }[] = [];
  let current = layout;
  for (const edit of edits) {
    const result = applyEdit(current, edit);
    if (result.ok) {
      current = result.layout;
      applied.push(edit);
    } else refused.push({ edit, reason: result.reason });
  }
  return { layout: current, applied, refused };
}
