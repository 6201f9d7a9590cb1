import { randomUUID } from 'node:crypto';

import { openTestServer, type Caller, type TestServer } from '@/tests/helpers/test-server';

let server: TestServer;
let shopHand: Caller;
let installer: Caller;

beforeAll(async () => {
  server = await openTestServer();
  shopHand = await server.as('shop_hand');
  installer = await server.as('installer');
});

afterAll(() => server.close());

const HOUR_MS = 3_600_000;

async function newJob(): Promise<string> {
  const { body } = await installer.post('/jobs', { name: 'Ferry Steps larder' }).expect(201);
  return `/jobs/${body.id as string}/work`;
}

const act = (step: string, kind: 'start' | 'done' | 'undo', agoMs = 0, waitHours = 0) => ({
  id: randomUUID(),
  step,
  act: kind,
  at: new Date(Date.now() - agoMs).toISOString(),
  waitHours,
});
const now = () => new Date().toISOString();

describe('/jobs/:jobId/work', () => {
  it('keeps who ticked a step and when, and until when it waits', async () => {
    const path = await newJob();
    const tick = act('Glue up P to Q', 'done', HOUR_MS, 24);
    const { body } = await shopHand.post(path, { sentAt: now(), acts: [tick] }).expect(200);

    const [mark] = body.marks;
    expect(mark).toMatchObject({ step: 'Glue up P to Q', doneBy: server.shop.people.shop_hand.name, startedAt: null });
    expect(Math.abs(Date.parse(mark.doneAt) - Date.parse(tick.at))).toBeLessThan(2000);
    expect(Date.parse(mark.readyAt) - Date.parse(mark.doneAt)).toBe(24 * HOUR_MS);
    expect((await installer.get(path).expect(200)).body).toEqual(body);
  });

  it('takes a resend for what it is', async () => {
    const path = await newJob();
    const tick = act('Sand', 'done');
    const first = await shopHand.post(path, { sentAt: now(), acts: [tick] }).expect(200);
    const again = await shopHand.post(path, { sentAt: now(), acts: [tick] }).expect(200);

    expect(again.body).toEqual(first.body);
    expect(await server.db('work_acts').where({ id: tick.id })).toHaveLength(1);
  });

  it('leaves a step with whoever ticked it first, and takes a tick back', async () => {
    const path = await newJob();
    await shopHand.post(path, { sentAt: now(), acts: [act('Load', 'start', 3000), act('Load', 'done', 2000)] });
    const twice = await installer.post(path, { sentAt: now(), acts: [act('Load', 'done', 1000)] }).expect(200);
    const undone = await installer.post(path, { sentAt: now(), acts: [act('Load', 'undo')] }).expect(200);
    const gone = await installer.post(path, { sentAt: now(), acts: [act('Load', 'undo')] }).expect(200);

    expect(twice.body.marks[0].doneBy).toBe(server.shop.people.shop_hand.name);
    expect(undone.body.marks[0]).toMatchObject({ doneAt: null, doneBy: null, readyAt: null });
    expect(undone.body.marks[0].startedBy).toBe(server.shop.people.shop_hand.name);
    expect(gone.body.marks).toEqual([]);
  });

  it('puts what was ticked without signal where it belongs in time', async () => {
    const path = await newJob();
    await installer.post(path, {
      sentAt: now(),
      acts: [act('Load', 'done', 2 * HOUR_MS), act('Load', 'undo', HOUR_MS)],
    });
    // Ticked three hours ago and sent only now: the later undo still stands.
    const { body } = await shopHand.post(path, { sentAt: now(), acts: [act('Load', 'done', 3 * HOUR_MS)] }).expect(200);

    expect(body.marks).toEqual([]);
  });

  it('goes by the server when the clock of a device is wrong', async () => {
    const path = await newJob();
    const wrong = (ms: number) => new Date(Date.now() + 50 * HOUR_MS - ms).toISOString();
    const acts = [
      { ...act('Sand', 'done'), at: wrong(HOUR_MS) },
      { ...act('Load', 'done'), at: wrong(-HOUR_MS) },
    ];
    const { body } = await shopHand.post(path, { sentAt: wrong(0), acts }).expect(200);
    const ago = body.marks.map((mark: { doneAt: string }) => (Date.now() - Date.parse(mark.doneAt)) / HOUR_MS);

    // An hour ago, and what claims to lie ahead of its own sending is now.
    expect(ago[0]).toBeCloseTo(1, 2);
    expect(ago[1]).toBeCloseTo(0, 2);
  });

  it.each([
    ['a step without a name', { step: '' }, 'body.acts.0.step'],
    ['something that is no deed', { act: 'cut' }, 'body.acts.0.act'],
    ['a wait below 0', { waitHours: -1 }, 'body.acts.0.waitHours'],
    ['a time that is none', { at: 'noon' }, 'body.acts.0.at'],
  ])('refuses %s', async (_what, fields, path) => {
    const { body } = await shopHand
      .post(await newJob(), { sentAt: now(), acts: [{ ...act('Sand', 'done'), ...fields }] })
      .expect(422);

    expect(body.issues[0].path).toBe(path);
  });

  it('can be added to and never changed or taken out, by anybody who is asked through the API', async () => {
    const rows = await server.db.raw(`select privilege_type from information_schema.table_privileges
            where grantee = 'offsquare_app' and table_name = 'work_acts' order by 1`);

    expect(rows.rows.map((row: { privilege_type: string }) => row.privilege_type)).toEqual(['INSERT', 'SELECT']);
  });
});
