import type { ApiProblem } from '../api/api-problem';
import { ApiError } from '../api/api-problem';
import { fetchLayout, layoutLink } from '../api/layout-link';
import { listenToShop } from '../api/shop-events';
import { keepRecord, loadRecord } from './editor-database';
import { createEditorStore, type EditorRecord, type EditorStore } from './editor-store';
import { startSync } from './sync';

export interface OpenEditorEvents {
  readonly opened: (store: EditorStore) => void;
  readonly failed: (problem: ApiProblem) => void;
  /** This browser would not keep a copy. */
  readonly notKept: () => void;
}

/**
 * Opens a layout: from this device when it kept one (the server brings it up to date), else from the server. Keeps it on
 * the device, sends what is pending, and follows what others do, until it is closed.
 */
export function openEditor(layoutId: string, events: OpenEditorEvents): { readonly close: () => void } {
  const closers: (() => void)[] = [];
  let closed = false;

  const start = (record: EditorRecord) => {
    const store = createEditorStore(record);
    const sync = startSync(store, layoutLink(layoutId));
    closers.push(
      sync.stop,
      keepRecord(store, events.notKept),
      listenToShop(
        (event) => {
          if (event.kind === 'layout' && event.layoutId === layoutId) sync.news(event.seq);
        },
        () => sync.now(),
      ),
      onOnline(sync.now),
    );
    events.opened(store);
  };

  const open = async () => {
    const kept = await loadRecord(layoutId);
    if (closed) return;
    if (kept) return start(kept);
    try {
      const { seq, layout } = await fetchLayout(layoutId);
      if (!closed) start({ layoutId, base: seq, confirmed: layout, pending: [], undo: [], redo: [], refused: [] });
    } catch (error) {
      if (closed) return;
      events.failed(error instanceof ApiError ? error.problem : { kind: 'server', status: 0 });
    }
  };

  void open();
  return {
    close: () => {
      closed = true;
      for (const close of closers) close();
    },
  };
}

function onOnline(listener: () => void): () => void {
  window.addEventListener('online', listener);
  return () => window.removeEventListener('online', listener);
}
