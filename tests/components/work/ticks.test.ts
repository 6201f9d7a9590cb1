import { ApiError } from '@/components/api/api-problem';
import { createTicksStore, NO_TICKS, ticksWords } from '@/components/work/ticks-store';
import { startTicksSync } from '@/components/work/ticks-sync';
import { marksAfter, type WorkAct } from '@/shared/work/work-marks';

const NOON = '2026-03-16T12:00:00.000Z';

function newStore() {
  let n = 0;
  return createTicksStore(NO_TICKS, { by: 'Tobias Reed', newId: () => `act ${++n}`, now: () => new Date(NOON) });
}

/** A server that keeps what it is sent, and can be out of reach. */
function newServer() {
  const acts: WorkAct[] = [];
  const state = { reachable: true, refuses: false, posts: 0 };
  const answer = () => {
    if (!state.reachable) throw new ApiError({ kind: 'offline' });
    return Object.values(marksAfter(acts));
  };
  const link = {
    get: () => Promise.resolve().then(answer),
    post: (sent: readonly WorkAct[]) =>
      Promise.resolve().then(() => {
        state.posts += 1;
        if (state.refuses)
          throw new ApiError({ kind: 'problem', status: 403, code: 'not_allowed', detail: '', issues: [], body: null });
        answer();
        acts.push(...sent.filter((act) => !acts.some(({ id }) => id === act.id)));
        return Object.values(marksAfter(acts));
      }),
  };
  return { acts, state, link };
}

beforeEach(() => jest.useFakeTimers());
afterEach(() => jest.useRealTimers());

const settle = (ms = 0) => jest.advanceTimersByTimeAsync(ms);

describe('ticks of a job', () => {
  it('show at once, and are with the server a moment later', async () => {
    const [store, server] = [newStore(), newServer()];
    const sync = startTicksSync(store, server.link);
    await settle();
    store.getState().act('Sand', 'done', 24);
    expect(store.getState().marks['Sand']).toMatchObject({
      doneBy: 'Tobias Reed',
      doneAt: NOON,
      readyAt: '2026-03-17T12:00:00.000Z',
    });
    await settle();
    expect(server.acts.map(({ step, act }) => [step, act])).toEqual([['Sand', 'done']]);
    expect(store.getState()).toMatchObject({ pending: [], sync: 'idle' });
    expect(ticksWords(store.getState())).toBeNull();
    sync.stop();
  });

  it('wait without signal, say how many, and go out in order when there is some', async () => {
    const [store, server] = [newStore(), newServer()];
    server.state.reachable = false;
    const sync = startTicksSync(store, server.link);
    store.getState().act('Glue up P to Q', 'start', 0);
    store.getState().act('Glue up P to Q', 'done', 2);
    await settle();
    expect(ticksWords(store.getState())).toBe('Ticked here, 2 to send');
    expect(store.getState().marks['Glue up P to Q']?.doneAt).toBe(NOON);
    server.state.reachable = true;
    await settle(120_000);
    expect(server.acts.map(({ act }) => act)).toEqual(['start', 'done']);
    expect(store.getState().pending).toEqual([]);
    sync.stop();
  });

  it('leave a step with whoever ticked it first, and bring in what others did', async () => {
    const [store, server] = [newStore(), newServer()];
    server.acts.push({ id: 'x', step: 'Load', act: 'done', at: '2026-03-16T09:00:00.000Z', waitHours: 0, by: 'Odile' });
    const sync = startTicksSync(store, server.link);
    store.getState().act('Load', 'done', 0);
    await settle();
    expect(store.getState().marks['Load']?.doneBy).toBe('Odile');
    sync.stop();
  });

  it('stay on the device when the server refuses them, and are not sent over and over', async () => {
    const [store, server] = [newStore(), newServer()];
    server.state.refuses = true;
    const sync = startTicksSync(store, server.link);
    await settle();
    store.getState().act('Load', 'done', 0);
    await settle(600_000);
    expect(store.getState().pending).toHaveLength(1);
    expect(ticksWords(store.getState())).toBe('Ticks could not be kept');
    expect(server.state.posts).toBe(1);
    sync.stop();
  });
});
