import { createStore, del, get, set } from 'idb-keyval';

import { layoutSchema } from '@/shared/layout/layout-schema';
import { recordOf, type EditorRecord, type EditorStore } from './editor-store';

let opened: ReturnType<typeof createStore> | null = null;
const database = () => (opened ??= createStore('offsquare-editor', 'layouts'));

/** What this browser kept of a layout, or null when it kept nothing that can still be read. */
export async function loadRecord(layoutId: string): Promise<EditorRecord | null> {
  try {
    const record = await get<EditorRecord>(layoutId, database());
    if (!record || !layoutSchema.safeParse(record.confirmed).success) return null;
    return record;
  } catch {
    // Private windows may have no database: the page works on, the server keeps the layout.
    return null;
  }
}

/** Takes a layout out of this browser, when it was deleted or its person signed out with nothing left to send. */
export async function forgetRecord(layoutId: string): Promise<void> {
  await del(layoutId, database()).catch(() => undefined);
}

/** Writes every change of the store to the browser's database, one write at a time. Returns the way to stop. */
export function keepRecord(store: EditorStore, failed: () => void): () => void {
  let writing = false;
  let again = false;
  const write = async () => {
    if (writing) {
      again = true;
      return;
    }
    writing = true;
    do {
      again = false;
      const record = recordOf(store.getState());
      await set(record.layoutId, record, database()).catch(failed);
    } while (again);
    writing = false;
  };
  const stop = store.subscribe((now, before) => {
    if (now.pending !== before.pending || now.confirmed !== before.confirmed || now.undo !== before.undo) void write();
  });
  void write();
  return stop;
}
