import { ApiError } from '@/components/api/api-problem';
import { createEditorStore } from '@/components/editor/editor-store';
import { startSync, type LayoutLink } from '@/components/editor/sync';
import type { EditsOutcome, LoggedEdit } from '@/shared/contracts/layouts';
import { applyEdit, type Edit } from '@/shared/layout/apply-edit';
import { emptyLayout } from '@/shared/layout/empty-layout';
import type { Layout } from '@/geometry/core/layout';

/** A server of a few lines: one log, edits applied in order, a resent id changes nothing. */
function fakeServer(start: Layout) {
  const log: LoggedEdit[] = [];
  let layout = start;
  const store = (edit: Edit): string | null => {
    const result = applyEdit(layout, edit);
    if (!result.ok) return result.reason;
    layout = result.layout;
    log.push({
      seq: log.length + 1,
      edit,
      personId: '00000000-0000-4000-8000-000000000001',
      personName: 'Sol',
      at: '2026-05-12T09:00:00.000Z',
    });
    return null;
  };
  const post = async (base: number, edits: readonly Edit[]): Promise<EditsOutcome> => {
    const others = log.filter((entry) => entry.seq > base && !edits.some((edit) => edit.id === entry.edit.id));
    const applied: { id: string; seq: number }[] = [];
    const refused: { edit: Edit; reason: string }[] = [];
    for (const edit of edits) {
      const known = log.find((entry) => entry.edit.id === edit.id);
      const reason = known ? null : store(edit);
      if (reason) refused.push({ edit, reason });
      else applied.push({ id: edit.id, seq: (known ?? log[log.length - 1]!).seq });
    }
    return { seq: log.length, applied, refused, others };
  };
  const list = async (since: number) => ({ seq: log.length, edits: log.filter((entry) => entry.seq > since) });
  return { post, list, store, current: () => layout, log };
}

const traced = applyEdit(emptyLayout(), {
  id: '90000000-0000-4000-8000-000000000000',
  kind: 'traceRoom',
  walls: ['A', 'B'],
  points: [
    [0, 0],
    [96, 0],
    [96, -96],
  ],
  closed: false,
});
if (!traced.ok) throw new Error(traced.reason);
const start = traced.layout;

const tape = (wall: string, value: number) =>
  ({ kind: 'addReading', wall, reading: { text: String(value), value } }) as const;

const open = () =>
  createEditorStore({ layoutId: 'l', base: 0, confirmed: start, pending: [], undo: [], redo: [], refused: [] });

const settle = async (until: () => boolean) => {
  for (let i = 0; i < 200 && !until(); i++) await new Promise((resolve) => setTimeout(resolve, 10));
  expect(until()).toBe(true);
};

describe('sync', () => {
  it('sends edits in order and ends with the server’s layout', async () => {
    const server = fakeServer(start);
    const store = open();
    const sync = startSync(store, server);
    store.getState().run(tape('A', 96.25), 'wall A');
    store.getState().run(tape('B', 84), 'wall B');
    await settle(() => store.getState().pending.length === 0 && store.getState().base === 2);
    expect(server.current()).toEqual(store.getState().layout);
    sync.stop();
  });

  it('keeps edits without signal and sends them once it is back, none twice', async () => {
    const server = fakeServer(start);
    let signal = false;
    let lostAnswer = true;
    const link: LayoutLink = {
      list: server.list,
      post: async (base, edits) => {
        if (!signal) throw new ApiError({ kind: 'offline' });
        const outcome = await server.post(base, edits);
        // The request arrives, its answer does not: the resend carries the same ids.
        if (lostAnswer) {
          lostAnswer = false;
          throw new ApiError({ kind: 'offline' });
        }
        return outcome;
      },
    };
    const store = open();
    const sync = startSync(store, link);
    store.getState().run(tape('A', 96.25), 'wall A');
    await settle(() => store.getState().sync === 'offline');
    expect(store.getState().pending).toHaveLength(1);
    signal = true;
    sync.now();
    await settle(() => !lostAnswer && store.getState().sync === 'offline');
    sync.now();
    await settle(() => store.getState().pending.length === 0);
    expect(server.log).toHaveLength(1);
    expect(store.getState().layout.room.walls[0]!.length).toHaveLength(1);
    sync.stop();
  });

  it('brings in what others did, before and between own edits', async () => {
    const server = fakeServer(start);
    server.store({ ...tape('B', 70), id: '80000000-0000-4000-8000-000000000001' } as Edit);
    const store = open();
    const sync = startSync(store, server);
    await settle(() => store.getState().base === 1);
    server.store({ ...tape('B', 71), id: '80000000-0000-4000-8000-000000000002' } as Edit);
    store.getState().run(tape('B', 72), 'wall B');
    await settle(() => store.getState().pending.length === 0 && store.getState().base === 3);
    expect(store.getState().layout).toEqual(server.current());
    expect(store.getState().layout.room.walls[1]!.length.map((r) => r.value)).toEqual([70, 71, 72]);
    sync.stop();
  });

  it('says that a person may not change the layout, and keeps what was typed', async () => {
    const server = fakeServer(start);
    const link: LayoutLink = {
      list: server.list,
      post: async () => {
        throw new ApiError({
          kind: 'problem',
          status: 403,
          code: 'not_allowed',
          detail: 'A shop hand may not change a layout.',
          issues: [],
          body: null,
        });
      },
    };
    const store = open();
    const sync = startSync(store, link);
    store.getState().run(tape('A', 96.25), 'wall A');
    await settle(() => store.getState().sync === 'no-permission');
    expect(store.getState().pending).toHaveLength(1);
    sync.stop();
  });
});
