import { randomUUID } from 'node:crypto';

import AdmZip from 'adm-zip';
import DxfParser from 'dxf-parser';
import type { Response } from 'supertest';

import { QUAY_STREET_SCULLERY } from '@/shared/layout/demo/quay-street-scullery';
import { poppler } from '../sheets/pdf-reading';
import { openTestServer, type Caller, type TestServer } from '@/tests/helpers/test-server';

let server: TestServer;
let installer: Caller;
let job: { id: string; layoutId: string; number: number };
let slabs: number;

beforeAll(async () => {
  server = await openTestServer();
  installer = await server.as('installer');
  job = (await installer.post('/job-files', { file: QUAY_STREET_SCULLERY }).expect(201)).body as typeof job;
  for (const to of ['measured', 'drawn']) await installer.post(`/jobs/${job.id}/stage`, { to }).expect(200);
  const { body } = await installer.post(`/jobs/${job.id}/nest`, { limitMs: 1000 }).expect(200);
  slabs = body.nest.slabs.length as number;
  await installer.post(`/jobs/${job.id}/revisions`, { seq: 0, nest: body.nest }).expect(201);
});

afterAll(() => server.close());

const sheet = (query: string, of = job.id) =>
  installer
    .get(`/jobs/${of}/sheets/cut.pdf?${query}`)
    .buffer(true)
    .parse((response, done) => {
      const chunks: Buffer[] = [];
      response.on('data', (chunk: Buffer) => chunks.push(chunk));
      response.on('end', () => done(null, Buffer.concat(chunks)));
    });

const bytes = (response: Response): Buffer => response.body as Buffer;
const textOf = (response: Response): string => poppler('pdftotext', ['-layout'], bytes(response));
const pagesOf = (response: Response): number =>
  Number(/Pages:\s+(\d+)/.exec(poppler('pdfinfo', [], bytes(response), false))?.[1]);

describe('GET /jobs/:jobId/sheets/cut.pdf', () => {
  it('prints a page a slab of a revision, with DRAFT while nobody signed it', async () => {
    const answer = await sheet('revision=1').expect(200);

    expect(answer.headers).toMatchObject({
      'content-type': 'application/pdf',
      'content-disposition': 'inline; filename="cut-sheet-0001-revision-1-draft.pdf"',
    });
    expect(pagesOf(answer)).toBeGreaterThanOrEqual(slabs);
    expect(textOf(answer)).toContain('DRAFT');
    expect(textOf(answer)).toContain('0001 Quay Street scullery');
  });

  it('prints on US Letter unless A4 is asked for', async () => {
    const size = (response: Response) => /Page size:\s+(.*)/.exec(poppler('pdfinfo', [], bytes(response), false))?.[1];

    expect(size(await sheet('revision=1').expect(200))).toContain('792 x 612');
    expect(size(await sheet('revision=1&paper=a4').expect(200))).toContain('841.89 x 595');
  });

  it('prints a draft of the layout as it is now, the same one twice', async () => {
    const first = await sheet('revision=draft').expect(200);
    const second = await sheet('revision=draft').expect(200);

    expect(textOf(first)).toContain('DRAFT');
    expect(first.headers['content-disposition']).toBe('inline; filename="cut-sheet-0001-draft.pdf"');
    expect(bytes(second).equals(bytes(first))).toBe(true);
  });

  it('prints a signed revision without DRAFT, byte for byte the same, after the job is renamed too', async () => {
    await (await server.as('designer')).post(`/jobs/${job.id}/revisions/1/sign-off`).expect(200);
    const first = await sheet('revision=1').expect(200);
    await installer.patch(`/jobs/${job.id}`, { name: 'Another name' }).expect(200);
    const second = await sheet('revision=1').expect(200);

    expect(textOf(first)).not.toContain('DRAFT');
    expect(first.headers['content-disposition']).toBe('inline; filename="cut-sheet-0001-revision-1.pdf"');
    expect(bytes(second).equals(bytes(first))).toBe(true);
  });

  it('says that the job was changed since, and prints the revision as it was', async () => {
    const edits = [{ id: randomUUID(), kind: 'changeItem', section: 'runs', item: '1', change: { from: 20 } }];
    const before = await sheet('revision=1').expect(200);
    await installer.post(`/layouts/${job.layoutId}/edits`, { base: 0, edits }).expect(200);
    const after = await sheet('revision=1').expect(200);
    const draft = await sheet('revision=draft').expect(200);

    const marks = (response: Response) => textOf(response).match(/\d+ \d+\/\d+/g);
    expect(textOf(after)).toContain('changed since revision 1');
    expect(marks(after)).toEqual(marks(before));
    expect(marks(draft)).not.toEqual(marks(before));
  });

  it('is printed by the shop hand too, who cuts from it', async () => {
    const shopHand = await server.as('shop_hand');
    await shopHand.get(`/jobs/${job.id}/sheets/cut.pdf?revision=1`).expect(200);
    await server.nobody.get(`/jobs/${job.id}/sheets/cut.pdf?revision=1`).expect(401);
  });

  it('refuses a revision without slabs, and a draft without pieces', async () => {
    const { body: empty } = await installer.post('/jobs', { name: 'Empty' }).expect(201);
    await installer.post(`/jobs/${empty.id}/revisions`, { seq: 0, nest: null }).expect(201);

    for (const revision of ['1', 'draft']) {
      const { body } = await installer.get(`/jobs/${empty.id}/sheets/cut.pdf?revision=${revision}`).expect(409);
      expect(body.code).toBe('plan_refused');
    }
  });

  it('prints nothing that the checker finds wrong, even from the database', async () => {
    const { body: other } = await installer.post('/job-files', { file: QUAY_STREET_SCULLERY }).expect(201);
    const { body: found } = await installer.post(`/jobs/${other.id}/nest`, { limitMs: 1000 }).expect(200);
    await installer.post(`/jobs/${other.id}/revisions`, { seq: 0, nest: found.nest }).expect(201);
    await server.db.raw(
      `update revisions set plan = jsonb_set(plan, '{nest,slabs,0,parts,0,x}', '-1') where job_id = ?`,
      [other.id],
    );

    const { body } = await installer.get(`/jobs/${other.id}/sheets/cut.pdf?revision=1`).expect(409);
    expect(body.issues[0].path).toMatch(/^nest\./);
  });

  it.each([
    ['', 422],
    ['revision=0', 422],
    ['revision=1&paper=a3', 422],
    ['revision=9', 404],
  ])('answers a wrong question (%s) with %d', async (query, status) => {
    await sheet(query).expect(status);
  });

  it("finds nothing of another shop's", async () => {
    await sheet('revision=1', randomUUID()).expect(404);
  });
});

describe('what goes out of a revision', () => {
  let fresh: { id: string };
  const get = (path: string) =>
    installer
      .get(`/jobs/${fresh.id}${path}`)
      .buffer(true)
      .parse((response, done) => {
        const chunks: Buffer[] = [];
        response.on('data', (chunk: Buffer) => chunks.push(chunk));
        response.on('end', () => done(null, Buffer.concat(chunks)));
      });

  beforeAll(async () => {
    fresh = (await installer.post('/job-files', { file: QUAY_STREET_SCULLERY }).expect(201)).body as { id: string };
    const { body } = await installer.post(`/jobs/${fresh.id}/nest`, { limitMs: 1000 }).expect(200);
    await installer.post(`/jobs/${fresh.id}/revisions`, { seq: 0, nest: body.nest }).expect(201);
  });

  it('is written down when it is printed, a draft is not', async () => {
    expect((await installer.get(`/jobs/${fresh.id}/prints`).expect(200)).body).toEqual({ prints: [] });
    await get('/sheets/fit.pdf?revision=draft').expect(200);
    await get('/sheets/fit.pdf?revision=1').expect(200);
    const { body } = await installer.get(`/jobs/${fresh.id}/prints`).expect(200);
    expect(body.prints).toEqual([
      { revision: 1, kinds: ['fit'], at: expect.any(String), by: server.shop.people.installer.name },
    ]);
  });

  it('prints chosen pages of the whole set', async () => {
    const all = await get('/sheets/all.pdf?revision=1').expect(200);
    const some = await get('/sheets/all.pdf?revision=1&pages=2,4-5').expect(200);
    expect(pagesOf(all)).toBeGreaterThan(8);
    expect(pagesOf(some)).toBe(3);
    expect(textOf(some)).toContain(`2 of ${pagesOf(all)}`);
    await get('/sheets/all.pdf?revision=1&pages=5-x').expect(422);
    await get('/sheets/all.pdf?revision=1&pages=399').expect(409);
  });

  it('comes as one archive with every sheet, drawing, list and the job file', async () => {
    const answer = await get('/sheets.zip?revision=1').expect(200);
    expect(answer.headers['content-disposition']).toMatch(/job-\d+-revision-1\.zip/);
    const zip = new AdmZip(bytes(answer));
    const names = zip.getEntries().map((entry) => entry.entryName).sort(); // prettier-ignore
    expect(names).toEqual(
      ['cut.pdf', 'customer.pdf', 'finish.pdf', 'fit.pdf', 'job.json', 'joint.pdf', 'labels.pdf', 'order.csv', 'order.pdf', 'pieces.csv', 'pieces.dxf', 'pieces.svg', 'templates.pdf', 'tops.dxf', 'tops.svg'].sort(), // prettier-ignore
    );
    const file = JSON.parse(zip.readAsText('job.json')) as { runs: unknown[] };
    expect(file.runs).toHaveLength(QUAY_STREET_SCULLERY.runs.length);
    const drawing = new DxfParser().parseSync(zip.readAsText('tops.dxf'));
    expect(drawing?.entities.length).toBeGreaterThan(4);
    // Prices are nothing for an installer.
    expect(zip.readAsText('order.csv')).not.toMatch(/price|379/i);
  });

  it('is mailed to somebody of the crew, once for one press', async () => {
    const to = server.shop.people.shop_hand;
    const { body } = await installer
      .post(`/jobs/${fresh.id}/sheet-mails`, { personId: to.id, revision: 1, note: 'Saw on Monday.' })
      .expect(201);
    expect(body).toEqual({ sentTo: to.name });
    const [mail] = await server.db('outbox').where({ kind: 'sheets', to_address: to.email });
    expect(mail.body).toContain(`/jobs/${fresh.id}/sheets`);
    expect(mail.body).toContain('Saw on Monday.');
    await installer.post(`/jobs/${fresh.id}/sheet-mails`, { personId: randomUUID(), revision: 1 }).expect(404);
    await installer.post(`/jobs/${fresh.id}/sheet-mails`, { personId: to.id, revision: 9 }).expect(404);
  });
});
