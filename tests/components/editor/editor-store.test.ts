import { createEditorStore, recordOf, saveWords, type EditorRecord } from '@/components/editor/editor-store';
import { applyEdits, type Edit, type EditDraft } from '@/shared/layout/apply-edit';
import { emptyLayout } from '@/shared/layout/empty-layout';

const ids = (prefix: string) => {
  let n = 0;
  return () => `${prefix}0000000-0000-4000-8000-${String(++n).padStart(12, '0')}`;
};

const start = applyEdits(emptyLayout(), [
  {
    id: '90000000-0000-4000-8000-000000000000',
    kind: 'traceRoom',
    walls: ['A', 'B', 'C'],
    points: [
      [0, 0],
      [96, 0],
      [96, -118],
      [12, -118],
    ],
    closed: false,
  },
]).layout;

const record = (overrides: Partial<EditorRecord> = {}): EditorRecord => ({
  layoutId: 'l1',
  base: 4,
  confirmed: start,
  pending: [],
  undo: [],
  redo: [],
  refused: [],
  ...overrides,
});

const tape = (wall: string, value: number): EditDraft => ({
  kind: 'addReading',
  wall,
  reading: { text: String(value), value },
});

const readings = (store: ReturnType<typeof createEditorStore>) =>
  store.getState().layout.room.walls.map((wall) => wall.length.map((reading) => reading.value));

describe('the editor store', () => {
  it('applies an edit at once and keeps it to send', () => {
    const store = createEditorStore(record(), ids('1'));
    expect(store.getState().run(tape('A', 96.25), 'wall A, 96 1/4')).toBeNull();
    expect(readings(store)).toEqual([[96.25], [], []]);
    expect(store.getState().pending).toHaveLength(1);
    expect(saveWords({ ...store.getState(), sync: 'offline' })).toBe('Saved here, 1 to send');
  });

  it('undoes and redoes, also after a reload', () => {
    const first = createEditorStore(record(), ids('1'));
    first.getState().run(tape('A', 96.25), 'wall A, 96 1/4');
    first.getState().run(tape('C', 84), 'wall C, 84');
    first.getState().undoLast();
    const kept = JSON.parse(JSON.stringify(recordOf(first.getState()))) as EditorRecord;
    const store = createEditorStore(kept, ids('2'));
    expect(readings(store)).toEqual([[96.25], [], []]);
    store.getState().redoLast();
    expect(readings(store)).toEqual([[96.25], [], [84]]);
    store.getState().undoLast();
    store.getState().undoLast();
    expect(store.getState().layout).toEqual(start);
    expect(store.getState().undo).toEqual([]);
  });

  it('forgets what could be redone once something else is done', () => {
    const store = createEditorStore(record(), ids('1'));
    store.getState().run(tape('A', 96), 'wall A, 96');
    store.getState().undoLast();
    store.getState().run(tape('B', 118), 'wall B, 118');
    expect(store.getState().redo).toEqual([]);
  });

  it('puts other people’s edits under what is still to send', () => {
    const store = createEditorStore(record(), ids('1'));
    store.getState().run(tape('A', 96.25), 'wall A, 96 1/4');
    const theirs = { ...tape('C', 84), id: '80000000-0000-4000-8000-000000000001' } as Edit;
    store.getState().receive({ seq: 5, edits: [theirs], refused: [] });
    expect(readings(store)).toEqual([[96.25], [], [84]]);
    expect(store.getState()).toMatchObject({ base: 5 });
    expect(store.getState().pending).toHaveLength(1);
  });

  it('drops an edit from what is to send once the server has it, without applying it twice', () => {
    const store = createEditorStore(record(), ids('1'));
    store.getState().run(tape('A', 96.25), 'wall A, 96 1/4');
    const mine = store.getState().pending[0]!;
    store.getState().receive({ seq: 5, edits: [mine], refused: [] });
    expect(readings(store)).toEqual([[96.25], [], []]);
    expect(store.getState().pending).toEqual([]);
    expect(saveWords(store.getState())).toBe('Saved');
  });

  it('gives back an edit whose wall somebody took away, with its value', () => {
    const store = createEditorStore(record(), ids('1'));
    store.getState().run(tape('C', 84), 'wall C, 84');
    const gone: Edit = { id: '80000000-0000-4000-8000-000000000002', kind: 'removeWall', wall: 'C' };
    store.getState().receive({ seq: 5, edits: [gone], refused: [] });
    const [refused] = store.getState().refused;
    expect(refused!.edit).toMatchObject({ kind: 'addReading', reading: { value: 84 } });
    expect(refused!.reason).toBe('The wall this belongs to is gone.');
    expect(store.getState().pending).toEqual([]);
  });

  it('shows a drag without storing it, and forgets it when the drag ends without an edit', () => {
    const store = createEditorStore(record(), ids('1'));
    store.getState().showPreview([{ kind: 'moveCorner', index: 3, to: [20, -118] }]);
    expect(store.getState().preview!.room.sketch[3]).toEqual([20, -118]);
    expect(store.getState().layout.room.sketch[3]).toEqual([12, -118]);
    store.getState().showPreview(null);
    expect(store.getState().preview).toBeNull();
    expect(store.getState().pending).toEqual([]);
  });

  it('says why an edit cannot be done and changes nothing', () => {
    const store = createEditorStore(record(), ids('1'));
    expect(store.getState().run(tape('Q', 10), 'wall Q, 10')).toBe('The wall this belongs to is gone.');
    expect(store.getState().layout).toEqual(start);
    expect(store.getState().undo).toEqual([]);
  });
});
