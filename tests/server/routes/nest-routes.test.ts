import { randomUUID } from 'node:crypto';

import { HARBOUR_BAKERY_COUNTER } from '@/shared/layout/demo/harbour-bakery-counter';
import { openTestServer, type Caller, type TestServer } from '@/tests/helpers/test-server';

let server: TestServer;
let installer: Caller;

beforeAll(async () => {
  server = await openTestServer();
  installer = await server.as('installer');
});

afterAll(() => server.close());

async function bakery(file: object = HARBOUR_BAKERY_COUNTER): Promise<{ id: string; layoutId: string }> {
  const { body } = await installer.post('/job-files', { file }).expect(201);
  return body as { id: string; layoutId: string };
}

describe('POST /jobs/:jobId/nest', () => {
  it('lays every piece of the layout as it is stored on slabs', async () => {
    const { id } = await bakery();
    const { body } = await installer.post(`/jobs/${id}/nest`, { limitMs: 2000 }).expect(200);
    const pieces = body.nest.slabs.flatMap((slab: { parts: { id: string }[] }) => slab.parts.map((part) => part.id));

    expect(body.seq).toBe(0);
    expect(pieces.sort()).toEqual(['P', 'Q', 'R', 'S', 'T']);
    expect(body.nest.cost).toBeGreaterThanOrEqual(body.nest.lowerBound);
  });

  it('refuses a layout without pieces', async () => {
    const { body: job } = await installer.post('/jobs', { name: 'Empty' }).expect(201);
    const { body } = await installer.post(`/jobs/${job.id}/nest`, {}).expect(409);

    expect(body).toMatchObject({ code: 'plan_refused', detail: 'There are no pieces to plan yet. Lay a top first.' });
  });

  it('says so when there are not enough slabs for all pieces', async () => {
    const slabs = [{ id: 'C96', length: 96, depth: 25, price: 20_000, count: 1 }];
    const { id } = await bakery({ ...HARBOUR_BAKERY_COUNTER, stock: { slabs, rack: [] } });
    const { body } = await installer.post(`/jobs/${id}/nest`, {}).expect(409);

    expect(body.code).toBe('plan_refused');
    expect(body.issues).toHaveLength(1);
    expect(body.detail).toBe(body.issues[0].message);
  });

  it.each([99, 30_001, 1.5])('refuses a limit of %p ms', async (limitMs) => {
    const { id } = await bakery();
    const { body } = await installer.post(`/jobs/${id}/nest`, { limitMs }).expect(422);

    expect(body.issues[0].path).toBe('body.limitMs');
  });

  it('answers not_found for a job that is not there', async () => {
    await installer.post(`/jobs/${randomUUID()}/nest`, {}).expect(404);
  });
});
