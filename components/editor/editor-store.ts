import { createStore, type StoreApi } from 'zustand/vanilla';

import type { Layout } from '@/geometry/core/layout';
import { applyEdit, applyEdits, type Edit, type EditDraft } from '@/shared/layout/apply-edit';

/** One thing a person did, with what undoes it. */
export interface Deed {
  /** In the person's words: "wall C, 84 3/4". */
  readonly label: string;
  readonly inverse: EditDraft;
}

export interface RefusedEdit {
  readonly edit: Edit;
  readonly reason: string;
}

/** Kept in the browser's database, so that nothing is lost when the page goes away. */
export interface EditorRecord {
  readonly layoutId: string;
  /** Sequence of the server's layout that `confirmed` is. */
  readonly base: number;
  readonly confirmed: Layout;
  /** Not yet known to be stored by the server, oldest first. */
  readonly pending: readonly Edit[];
  readonly undo: readonly Deed[];
  readonly redo: readonly Deed[];
  readonly refused: readonly RefusedEdit[];
}

export interface EditorState extends EditorRecord {
  /** Confirmed plus pending: what the person sees and works on. */
  readonly layout: Layout;
  /** A drag in progress, drawn and never stored. */
  readonly preview: Layout | null;
  readonly sync: 'idle' | 'sending' | 'offline' | 'no-permission';
  /** Applies an edit at once. Returns the sentence why not, or null. */
  readonly run: (edit: EditDraft, label: string) => string | null;
  /** Applies an edit that nobody did on purpose, such as keeping letters: it is stored, and not undone. */
  readonly keep: (edit: EditDraft) => void;
  readonly undoLast: () => string | null;
  readonly redoLast: () => string | null;
  readonly showPreview: (edits: readonly EditDraft[] | null) => void;
  /** The server's answer, or what other people did: every edit after `base`, in the server's order. */
  readonly receive: (news: {
    readonly seq: number;
    readonly edits: readonly Edit[];
    readonly refused: readonly { readonly id: string; readonly reason: string }[];
  }) => void;
  readonly setSync: (sync: EditorState['sync']) => void;
  readonly dropRefused: () => void;
}

export type EditorStore = StoreApi<EditorState>;

/** Steps of undo kept; a day's work in a kitchen is under two hundred edits. */
const MOST_DEEDS = 500;

/**
 * The state of one layout in one browser: what the server has, what is still to send, what can be undone.
 *
 * @param newId - makes a UUID; injected so that tests repeat
 */
export function createEditorStore(record: EditorRecord, newId: () => string = () => crypto.randomUUID()): EditorStore {
  return createStore<EditorState>((set, get) => {
    const withId = (draft: EditDraft): Edit => ({ ...draft, id: newId() }) as Edit;

    /** Applies one edit to what is shown and queues it. */
    const enqueue = (draft: EditDraft): { inverse: EditDraft } | { reason: string } => {
      const edit = withId(draft);
      const result = applyEdit(get().layout, edit);
      if (!result.ok) return { reason: result.reason };
      set({ layout: result.layout, preview: null, pending: [...get().pending, edit] });
      return { inverse: result.inverse as EditDraft };
    };

    /** Takes the newest deed of one stack, does its opposite and puts that on the other stack. */
    const turnBack = (from: 'undo' | 'redo', to: 'undo' | 'redo', failed: (label: string, why: string) => string) => {
      const deed = get()[from].at(-1);
      if (!deed) return null;
      const result = enqueue(deed.inverse);
      const rest = get()[from].slice(0, -1);
      if ('reason' in result) {
        set(from === 'undo' ? { undo: rest } : { redo: rest });
        return failed(deed.label, result.reason);
      }
      const turned = [...get()[to], { label: deed.label, inverse: result.inverse }];
      set(from === 'undo' ? { undo: rest, redo: turned } : { redo: rest, undo: turned });
      return null;
    };

    return {
      ...record,
      layout: applyEdits(record.confirmed, record.pending).layout,
      preview: null,
      sync: 'idle',
      run(draft, label) {
        const result = enqueue(draft);
        if ('reason' in result) return result.reason;
        set({ undo: [...get().undo, { label, inverse: result.inverse }].slice(-MOST_DEEDS), redo: [] });
        return null;
      },
      keep: (draft) => void enqueue(draft),
      undoLast: () => turnBack('undo', 'redo', (label, why) => `Could not undo ${label}. ${why}`),
      redoLast: () => turnBack('redo', 'undo', (label, why) => `Could not redo ${label}. ${why}`),
      showPreview(drafts) {
        if (!drafts) return set({ preview: null });
        set({ preview: applyEdits(get().layout, drafts.map(withId)).layout });
      },
      receive({ seq, edits, refused }) {
        if (seq <= get().base && edits.length === 0 && refused.length === 0) return;
        set(rebase(get(), seq, edits, refused));
      },
      setSync: (sync) => set({ sync }),
      dropRefused: () => set({ refused: [] }),
    };
  });
}

/** What is shown after the server's news: its edits first, then what is still to send on top of them. */
function rebase(
  state: EditorState,
  seq: number,
  edits: readonly Edit[],
  refused: readonly { readonly id: string; readonly reason: string }[],
): Partial<EditorState> {
  const confirmed = applyEdits(state.confirmed, edits).layout;
  const settled = new Set([...edits.map((edit) => edit.id), ...refused.map((r) => r.id)]);
  const waiting = state.pending.filter((edit) => !settled.has(edit.id));
  const again = applyEdits(confirmed, waiting);
  const byServer = refused.flatMap(({ id, reason }) => {
    const edit = state.pending.find((pending) => pending.id === id);
    return edit ? [{ edit, reason }] : [];
  });
  return {
    base: seq,
    confirmed,
    layout: again.layout,
    pending: again.applied,
    refused: [...state.refused, ...byServer, ...again.refused],
  };
}

/** The part of the state that outlives the page. */
export function recordOf(state: EditorState): EditorRecord {
  const { layoutId, base, confirmed, pending, undo, redo, refused } = state;
  return { layoutId, base, confirmed, pending, undo, redo, refused };
}

/** A person reading the save state: "Saved", "Saving", "Saved here, 3 to send". */
export function saveWords(state: Pick<EditorState, 'pending' | 'sync'>): string {
  if (state.sync === 'no-permission') return 'Not saved: you may look, not change';
  if (state.pending.length === 0) return 'Saved';
  if (state.sync === 'offline') return `Saved here, ${state.pending.length} to send`;
  return 'Saving';
}
