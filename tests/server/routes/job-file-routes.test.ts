import { randomUUID } from 'node:crypto';

import { DEMO_JOBS } from '@/shared/layout/demo/demo-jobs';
import { openTestServer, type Caller, type TestServer } from '@/tests/helpers/test-server';

let server: TestServer;
let installer: Caller;

beforeAll(async () => {
  server = await openTestServer();
  installer = await server.as('installer');
});

afterAll(() => server.close());

describe('job files', () => {
  it.each(Object.entries(DEMO_JOBS))('%s goes in, out and in again to the same layout', async (_name, file) => {
    const { body: job } = await installer.post('/job-files', { file, customerName: 'Petra Hollings' }).expect(201);
    expect(job).toMatchObject({ name: file.name, customerName: 'Petra Hollings', stage: 'new' });

    const out = await installer.get(`/jobs/${job.id}/file`).expect(200);
    const { body: copy } = await installer.post('/job-files', { file: out.body }).expect(201);

    const first = await installer.get(`/layouts/${job.layoutId}`).expect(200);
    const second = await installer.get(`/layouts/${copy.layoutId}`).expect(200);
    expect(second.body.layout).toEqual(first.body.layout);
  });

  it('names the download after the job', async () => {
    const { body: job } = await installer.post('/jobs', { name: "Kiln Lane: potter's galley, 2nd" }).expect(201);
    const { headers } = await installer.get(`/jobs/${job.id}/file`).expect(200);

    expect(headers['content-disposition']).toBe('attachment; filename=kiln-lane-potters-galley-2nd.json');
    expect(headers['content-type']).toMatch(/^application\/json/);
  });

  it("fills a file that names no stock with the shop's", async () => {
    const owner = await server.as('owner');
    const slab = { code: 'M96', species: 'hard maple', thickness: 1.5, length: 96, depth: 25, priceCents: 37_900 };
    await owner.post('/stock', slab).expect(201);
    const { stock: _stock, ...file } = DEMO_JOBS['quay-street-scullery'];
    const { body: job } = await installer.post('/job-files', { file }).expect(201);
    const { body } = await installer.get(`/layouts/${job.layoutId}`).expect(200);

    expect(body.layout.stock.slabs).toMatchObject([{ id: 'M96', price: 37_900 }]);
  });

  it.each([
    ['a file that is none', 'not a file', 'body.file'],
    ['an unknown key', { ...DEMO_JOBS['lantern-row-island'], colour: 'red' }, 'body.file.colour'],
    [
      'letters in a length',
      { room: { walls: [{ id: 'A', length: 'long' }] }, runs: [] },
      'body.file.room.walls[0].length',
    ],
    [
      'a run on no wall',
      {
        room: { walls: [{ id: 'A', length: 90 }] },
        runs: [{ id: '1', wall: 'B', left: { kind: 'joint' }, right: { kind: 'joint' } }],
      },
      'body.file.runs[0].wall',
    ],
  ])('refuses %s and names the place', async (_what, file, path) => {
    const before = await installer.get('/jobs?limit=200').expect(200);
    const { body } = await installer.post('/job-files', { file }).expect(422);
    const after = await installer.get('/jobs?limit=200').expect(200);

    expect(body.code).toBe('job_file_refused');
    expect(body.issues.map((issue: { path: string }) => issue.path)).toContain(path);
    expect(after.body.items).toHaveLength(before.body.items.length);
  });

  it('answers not_found for a job that is not there', async () => {
    await installer.get(`/jobs/${randomUUID()}/file`).expect(404);
  });
});
