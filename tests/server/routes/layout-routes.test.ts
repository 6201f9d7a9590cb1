import { randomUUID } from 'node:crypto';

import { openTestServer, type Caller, type TestServer } from '@/tests/helpers/test-server';

let server: TestServer;
let installer: Caller;

beforeAll(async () => {
  server = await openTestServer();
  installer = await server.as('installer');
});

afterAll(() => server.close());

async function newLayoutId(): Promise<string> {
  const { body } = await installer.post('/jobs', { name: 'Quay Street scullery' }).expect(201);
  return body.layoutId as string;
}

const trace = () => ({
  id: randomUUID(),
  kind: 'traceRoom',
  walls: ['A', 'B'],
  points: [
    [0, 0],
    [96, 0],
    [96, -120],
  ],
  closed: false,
});

const reading = (wall: string, text: string, value: number) => ({
  id: randomUUID(),
  kind: 'addReading',
  wall,
  reading: { text, value },
});

describe('GET /layouts/:layoutId', () => {
  it('gives an empty layout with 0 edits for a new job', async () => {
    const id = await newLayoutId();

    const { body } = await installer.get(`/layouts/${id}`).expect(200);

    expect(body.seq).toBe(0);
    expect(body.layout.format).toBe('offsquare-layout');
    expect(body.layout.room.walls).toEqual([]);
  });

  it('answers 304 to the ETag of the same layout and 200 after an edit', async () => {
    const id = await newLayoutId();
    const first = await installer.get(`/layouts/${id}`).expect(200);
    const etag = first.headers['etag'] as string;

    await installer.get(`/layouts/${id}`).set('If-None-Match', etag).expect(304);
    await installer.post(`/layouts/${id}/edits`, { base: 0, edits: [trace()] }).expect(200);
    await installer.get(`/layouts/${id}`).set('If-None-Match', etag).expect(200);
  });

  it('answers not_found for an id that is none and for one of no layout', async () => {
    const none = await installer.get('/layouts/abc').expect(404);
    const unknown = await installer.get(`/layouts/${randomUUID()}`).expect(404);

    expect([none.body.code, unknown.body.code]).toEqual(['not_found', 'not_found']);
    expect(none.headers['content-type']).toMatch(/^application\/problem\+json/);
  });
});

describe('POST /layouts/:layoutId/edits', () => {
  it('applies edits in order and counts them', async () => {
    const id = await newLayoutId();
    const edits = [trace(), reading('A', '96 1/4', 96.25)];

    const { body } = await installer.post(`/layouts/${id}/edits`, { base: 0, edits }).expect(200);

    expect(body).toEqual({
      seq: 2,
      applied: [
        { id: edits[0]?.id, seq: 1 },
        { id: edits[1]?.id, seq: 2 },
      ],
      refused: [],
      others: [],
    });
    const after = await installer.get(`/layouts/${id}`).expect(200);
    expect(after.body.layout.room.walls[0].length).toEqual([{ text: '96 1/4', value: 96.25 }]);
  });

  it('applies an edit once, however often it is sent', async () => {
    const id = await newLayoutId();
    const edits = [trace(), reading('A', '96', 96)];

    await installer.post(`/layouts/${id}/edits`, { base: 0, edits }).expect(200);
    const again = await installer.post(`/layouts/${id}/edits`, { base: 0, edits }).expect(200);

    expect(again.body.seq).toBe(2);
    expect(again.body.applied.map(({ seq }: { seq: number }) => seq)).toEqual([1, 2]);
    expect(again.body.others).toEqual([]);
    const after = await installer.get(`/layouts/${id}`).expect(200);
    expect(after.body.layout.room.walls[0].length).toHaveLength(1);
  });

  it('applies an edit once when it stands twice in one request', async () => {
    const id = await newLayoutId();
    const first = trace();
    const twice = reading('A', '96', 96);

    const { body } = await installer
      .post(`/layouts/${id}/edits`, { base: 0, edits: [first, twice, twice] })
      .expect(200);

    expect(body.seq).toBe(2);
  });

  it('loses nothing when 4 people write on the same base at once', async () => {
    const id = await newLayoutId();
    await installer.post(`/layouts/${id}/edits`, { base: 0, edits: [trace()] }).expect(200);
    const owner = await server.as('owner');
    const designer = await server.as('designer');
    const writers = [installer, owner, designer, installer];
    const sent = writers.map((_, n) => [reading('A', `${90 + n}`, 90 + n), reading('B', `${110 + n}`, 110 + n)]);

    const answers = await Promise.all(
      writers.map((writer, n) => writer.post(`/layouts/${id}/edits`, { base: 1, edits: sent[n] })),
    );

    expect(answers.map(({ status }) => status)).toEqual([200, 200, 200, 200]);
    const seqs = answers.flatMap(({ body }) => body.applied.map(({ seq }: { seq: number }) => seq));
    expect(seqs.sort((a, b) => a - b)).toEqual([2, 3, 4, 5, 6, 7, 8, 9]);
    const { body } = await installer.get(`/layouts/${id}`).expect(200);
    const values = body.layout.room.walls.map((wall: { length: { value: number }[] }) =>
      wall.length.map(({ value }) => value).sort((a, b) => a - b),
    );
    expect(values).toEqual([
      [90, 91, 92, 93],
      [110, 111, 112, 113],
    ]);
    // Own edits and others' together are everything after the base, for every writer.
    for (const { body: answer } of answers) {
      const all = [...answer.applied, ...answer.others].map(({ seq }: { seq: number }) => seq).sort((a, b) => a - b);
      expect(all).toEqual(Array.from({ length: answer.seq - 1 }, (_, i) => i + 2));
    }
  });

  it('loses nothing when the same edits are sent 4 times at once', async () => {
    const id = await newLayoutId();
    const edits = [trace(), reading('A', '96', 96)];

    const answers = await Promise.all(
      [1, 2, 3, 4].map(() => installer.post(`/layouts/${id}/edits`, { base: 0, edits })),
    );

    expect(answers.map(({ status, body }) => [status, body.seq])).toEqual(Array(4).fill([200, 2]));
  });

  it('hands back an edit whose wall is gone, with its values, and keeps the others', async () => {
    const id = await newLayoutId();
    await installer.post(`/layouts/${id}/edits`, { base: 0, edits: [trace()] }).expect(200);
    await installer
      .post(`/layouts/${id}/edits`, { base: 1, edits: [{ id: randomUUID(), kind: 'removeWall', wall: 'B' }] })
      .expect(200);
    const late = reading('B', '120 1/2', 120.5);
    const kept = reading('A', '96', 96);

    const { body } = await installer.post(`/layouts/${id}/edits`, { base: 1, edits: [late, kept] }).expect(200);

    expect(body.applied).toEqual([{ id: kept.id, seq: 3 }]);
    expect(body.refused).toHaveLength(1);
    expect(body.refused[0].edit).toEqual(late);
    expect(body.refused[0].reason).toMatch(/gone/);
    expect(body.others.map(({ edit }: { edit: { kind: string } }) => edit.kind)).toEqual(['removeWall']);
  });

  it('answers edits_refused with the edits, when not one applies', async () => {
    const id = await newLayoutId();
    const late = reading('Z', '12', 12);

    const { body } = await installer.post(`/layouts/${id}/edits`, { base: 0, edits: [late] }).expect(409);

    expect(body.code).toBe('edits_refused');
    expect(body.refused[0].edit).toEqual(late);
    expect(body.seq).toBe(0);
  });

  it('answers validation_failed for a base that lies ahead of the layout', async () => {
    const id = await newLayoutId();

    const { body } = await installer.post(`/layouts/${id}/edits`, { base: 7, edits: [] }).expect(422);

    expect(body.code).toBe('validation_failed');
    expect(body.issues).toEqual([{ path: 'body.base', message: 'is 7, and the layout has 0 edits' }]);
  });

  it('refuses the edit that would make the layout larger than its schema allows', async () => {
    const id = await newLayoutId();
    const seam = (at: number) => ({ id: randomUUID(), kind: 'pinSeam', on: 'i', at });
    const island = { id: 'i', length: 240, depth: 39 };
    const first = { id: randomUUID(), kind: 'addItem', section: 'islands', item: island };
    const edits = [first, ...Array.from({ length: 101 }, (_, n) => seam(n))];

    const { body } = await installer.post(`/layouts/${id}/edits`, { base: 0, edits }).expect(200);

    expect(body.seq).toBe(101);
    expect(body.refused).toHaveLength(1);
    await installer.get(`/layouts/${id}`).expect(200);
  });

  it('names the field of an edit that is not right', async () => {
    const id = await newLayoutId();
    const bad = { ...reading('A', '96', 96), reading: { text: '96', value: -1 } };

    const { body } = await installer.post(`/layouts/${id}/edits`, { base: 0, edits: [bad] }).expect(422);

    expect(body.issues[0].path).toBe('body.edits.0.reading.value');
  });
});

describe('GET /layouts/:layoutId/edits', () => {
  it('lists what was done after a sequence number, by whom', async () => {
    const id = await newLayoutId();
    const edits = [trace(), reading('A', '96', 96), reading('B', '120', 120)];
    await installer.post(`/layouts/${id}/edits`, { base: 0, edits }).expect(200);

    const { body } = await installer.get(`/layouts/${id}/edits?since=1`).expect(200);

    expect(body.seq).toBe(3);
    expect(body.edits.map((one: { seq: number; edit: { id: string } }) => [one.seq, one.edit.id])).toEqual([
      [2, edits[1]?.id],
      [3, edits[2]?.id],
    ]);
    expect(body.edits[0].personName).toBe('installer of Tidewater Tops');
  });
});
