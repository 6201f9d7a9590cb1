import { randomUUID } from 'node:crypto';

import request from 'supertest';

import { API_ROOT } from '@/shared/contracts/contract';
import { addShop, openTestServer, type Caller, type TestServer } from '@/tests/helpers/test-server';

let server: TestServer;
let owner: Caller;
let designer: Caller;
let installer: Caller;
let shopHand: Caller;

beforeAll(async () => {
  server = await openTestServer();
  owner = await server.as('owner');
  designer = await server.as('designer');
  installer = await server.as('installer');
  shopHand = await server.as('shop_hand');
});

afterAll(() => server.close());

async function newJob(fields: object = {}): Promise<{ id: string; number: number; layoutId: string }> {
  const { body } = await installer.post('/jobs', { name: 'Ferry Steps larder', ...fields }).expect(201);
  return body as { id: string; number: number; layoutId: string };
}

/** Moves a new job through the stages up to the one given. */
async function jobIn(stage: 'measured' | 'drawn'): Promise<string> {
  const { id } = await newJob();
  for (const to of stage === 'drawn' ? ['measured', 'drawn'] : ['measured']) {
    await installer.post(`/jobs/${id}/stage`, { to }).expect(200);
  }
  return id;
}

const names = (body: { items: { name: string }[] }): string[] => body.items.map(({ name }) => name);

describe('POST /jobs', () => {
  it('opens a job from three fields, in stage New, under the next number of the shop', async () => {
    const before = await newJob();
    const { body } = await installer
      .post('/jobs', { name: ' Mast House pantry ', customerName: 'Oda Lindqvist', siteAddress: '4 Mast Lane' })
      .expect(201);

    expect(body).toMatchObject({
      number: before.number + 1,
      name: 'Mast House pantry',
      customerName: 'Oda Lindqvist',
      siteAddress: '4 Mast Lane',
      stage: 'new',
      nextOn: null,
      revision: null,
      changedSince: false,
    });
    await installer.get(`/layouts/${body.layoutId as string}`).expect(200);
  });

  it("puts the shop's slabs of the usual wood into the layout, and no others", async () => {
    const slab = { thickness: 1.5, length: 96, depth: 25, priceCents: 37_900 };
    await owner
      .post('/stock', { ...slab, code: 'M96', species: 'hard maple', measuredDepth: 25.25, straightening: 0.5 })
      .expect(201);
    await owner.post('/stock', { ...slab, code: 'W96', species: 'black walnut' }).expect(201);
    await owner.post('/stock', { ...slab, code: 'M96-2', species: 'hard maple', thickness: 2 }).expect(201);
    await shopHand
      .post('/rack', { species: 'hard maple', thickness: 1.5, length: 60, depth: 25, rightAngleDeg: 45 })
      .expect(201);
    const { layoutId } = await newJob();

    const { body } = await installer.get(`/layouts/${layoutId}`).expect(200);

    // 25 1/4 in measured less 1/2 in to straighten the edge.
    expect(body.layout.stock.slabs).toEqual([
      {
        id: 'M96',
        length: 96,
        depth: 24.75,
        price: 37_900,
        count: null,
        species: 'hard maple',
        thickness: 1.5,
        faces: 'both',
      },
    ]);
    // A 45 degree end on a piece 25 in deep costs 25 in of its length once it is cut square.
    expect(body.layout.stock.rack).toMatchObject([{ id: 'R1', length: 35, depth: 25 }]);
  });

  it('gives 8 jobs made at once 8 different numbers', async () => {
    const jobs = await Promise.all(Array.from({ length: 8 }, () => newJob()));

    expect(new Set(jobs.map(({ number }) => number)).size).toBe(8);
  });

  it('makes one job however often the same request is sent, and answers it alike', async () => {
    const key = randomUUID();
    const send = () => installer.post('/jobs', { name: 'Anchor Yard bar' }).set('Idempotency-Key', key);
    const answers = await Promise.all([send(), send(), send()]);
    const later = await send();

    expect([...answers, later].map(({ status }) => status)).toEqual([201, 201, 201, 201]);
    expect(new Set([...answers, later].map(({ body }) => body.id)).size).toBe(1);
    const { body } = await installer.get('/jobs?search=Anchor').expect(200);
    expect(names(body)).toEqual(['Anchor Yard bar']);
  });

  it('refuses a key that came with another request', async () => {
    const key = randomUUID();
    await installer.post('/jobs', { name: 'One' }).set('Idempotency-Key', key).expect(201);

    const { body } = await installer.post('/jobs', { name: 'Two' }).set('Idempotency-Key', key).expect(422);

    expect(body.code).toBe('idempotency_key_reused');
  });

  it('takes the same key from somebody else as a request of their own', async () => {
    const key = randomUUID();
    const ours = await installer.post('/jobs', { name: 'Same key' }).set('Idempotency-Key', key).expect(201);
    const theirs = await designer.post('/jobs', { name: 'Same key' }).set('Idempotency-Key', key).expect(201);

    expect(theirs.body.id).not.toBe(ours.body.id);
  });

  it.each(['', 'short', 'with a blank in it'])('asks for an Idempotency-Key, and %p is none', async (key) => {
    const { body } = await installer.post('/jobs', { name: 'One' }).set('Idempotency-Key', key).expect(400);

    expect(body.code).toBe('idempotency_key_required');
  });

  it('names every field that is not right', async () => {
    const { body } = await installer
      .post('/jobs', { name: ' ', customerName: 'two\nlines', colour: 'red' })
      .expect(422);

    expect(body.code).toBe('validation_failed');
    expect(body.issues.map(({ path }: { path: string }) => path)).toEqual(['body.name', 'body.customerName', 'body']);
  });
});

describe('GET /jobs', () => {
  it('finds all words in name, customer, address and number, with % and _ as typed', async () => {
    const { number } = await newJob({ name: '100% oak_bench', customerName: 'Runa Holt', siteAddress: '9 Tern Alley' });
    const search = async (text: string) =>
      names((await installer.get(`/jobs?search=${encodeURIComponent(text)}`).expect(200)).body);

    expect(await search('holt TERN')).toEqual(['100% oak_bench']);
    expect(await search(`#${number}`)).toContain('100% oak_bench');
    expect(await search('100%')).toEqual(['100% oak_bench']);
    expect(await search('k_b')).toEqual(['100% oak_bench']);
    expect(await search('holt walnut')).toEqual([]);
  });

  it('filters by stage and by person', async () => {
    const id = await jobIn('measured');
    const person = server.shop.people.designer.id;
    await installer.patch(`/jobs/${id}`, { name: 'For the designer', designerId: person }).expect(200);

    const measured = await installer.get('/jobs?stage=measured').expect(200);
    const theirs = await installer.get(`/jobs?person=${person}`).expect(200);

    expect(measured.body.items.every(({ stage }: { stage: string }) => stage === 'measured')).toBe(true);
    expect(names(theirs.body)).toEqual(['For the designer']);
    expect(theirs.body.items[0].designer).toEqual({ id: person, name: 'designer of Tidewater Tops' });
  });

  it('pages through all jobs, each once, last touched first', async () => {
    const { body: whole } = await installer.get('/jobs?limit=200').expect(200);
    const paged: string[] = [];
    let next: string | null = '';
    while (next !== null) {
      const { body } = await installer.get(`/jobs?limit=3${next ? `&after=${next}` : ''}`).expect(200);
      expect(body.items.length).toBeLessThanOrEqual(3);
      paged.push(...body.items.map(({ id }: { id: string }) => id));
      next = body.next as string | null;
    }

    expect(paged).toEqual(whole.items.map(({ id }: { id: string }) => id));
    const times = whole.items.map(({ updatedAt }: { updatedAt: string }) => updatedAt);
    expect(times).toEqual([...times].sort().reverse());
  });

  it('moves a job to the top when its layout is edited', async () => {
    const { id, layoutId } = await newJob();
    await newJob();
    const edit = { id: randomUUID(), kind: 'setMaterial', value: { species: 'cherry' } };
    await installer.post(`/layouts/${layoutId}/edits`, { base: 0, edits: [edit] }).expect(200);

    const { body } = await installer.get('/jobs?limit=1').expect(200);

    expect(body.items[0].id).toBe(id);
  });

  it('shows the outline of the room as solved from the readings', async () => {
    const { id, layoutId } = await newJob();
    const points = [
      [0, 0],
      [90, 0],
      [90, -100],
    ];
    const edits = [
      { id: randomUUID(), kind: 'traceRoom', walls: ['A', 'B'], points, closed: false },
      { id: randomUUID(), kind: 'addReading', wall: 'A', reading: { text: '96', value: 96 } },
      { id: randomUUID(), kind: 'addReading', wall: 'B', reading: { text: '118', value: 118 } },
    ];
    await installer.post(`/layouts/${layoutId}/edits`, { base: 0, edits }).expect(200);

    const { body } = await installer.get('/jobs?limit=1').expect(200);

    expect(body.items[0].id).toBe(id);
    expect(body.items[0].thumbnail).toEqual({
      walls: [
        [0, 0],
        [96, 0],
        [96, -118],
      ],
      closed: false,
      pieces: [],
    });
  });

  it.each(['nonsense', Buffer.from('["x","y"]').toString('base64url')])('refuses the page %p', async (after) => {
    const { body } = await installer.get(`/jobs?after=${after}`).expect(422);

    expect(body.issues).toEqual([{ path: 'query.after', message: 'has to be the "next" of the page before' }]);
  });

  it.each(['limit=0', 'limit=201', 'stage=ordered', 'colour=red'])('refuses the query %s', async (query) => {
    const { body } = await installer.get(`/jobs?${query}`).expect(422);

    expect(body.code).toBe('validation_failed');
  });

  it("shows nothing of another shop's", async () => {
    const other = await addShop(server.db, 'Breakwater Benches');
    const theirs = await server.as('owner', other);
    const { body } = await theirs.get('/jobs').expect(200);

    expect(body).toEqual({ items: [], next: null });
  });
});

describe('PATCH /jobs/:jobId', () => {
  it('changes what is given and leaves the rest', async () => {
    const { id } = await newJob({ customerName: 'Oda Lindqvist' });
    const { body } = await installer
      .patch(`/jobs/${id}`, { customerEmail: 'Oda@Mast.example', measureOn: '2026-12-07', fitOn: '2027-01-15' })
      .expect(200);

    expect(body).toMatchObject({
      customerName: 'Oda Lindqvist',
      customerEmail: 'oda@mast.example',
      measureOn: '2026-12-07',
      cutOn: null,
      fitOn: '2027-01-15',
      nextOn: '2026-12-07',
    });
  });

  it('names the next date of each stage: measuring when new, then cutting, then fitting', async () => {
    const { id } = await newJob();
    const dates = { measureOn: '2026-12-07', cutOn: '2027-01-04', fitOn: '2027-01-15' };
    await installer.patch(`/jobs/${id}`, dates).expect(200);
    const seen: [string, string][] = [];
    for (const to of ['measured', 'drawn']) {
      const { body } = await installer.post(`/jobs/${id}/stage`, { to }).expect(200);
      seen.push([body.stage, body.nextOn]);
    }

    expect(seen).toEqual([
      ['measured', '2027-01-04'],
      ['drawn', '2027-01-04'],
    ]);
  });

  it('refuses a person who is not in the crew', async () => {
    const { id } = await newJob();
    const { body } = await installer.patch(`/jobs/${id}`, { installerId: randomUUID() }).expect(422);

    expect(body.issues).toEqual([{ path: 'body.installerId', message: 'somebody of the crew, please' }]);
  });

  it('refuses a date that is none', async () => {
    const { id } = await newJob();
    await installer.patch(`/jobs/${id}`, { fitOn: '2026-02-30' }).expect(422);
  });
});

describe('POST /jobs/:jobId/stage', () => {
  const move = (caller: Caller, id: string, to: string, note = '') => caller.post(`/jobs/${id}/stage`, { to, note });

  it('goes one stage forward and keeps who and when', async () => {
    const id = await jobIn('measured');
    const { body } = await installer.get(`/jobs/${id}/activity`).expect(200);

    expect(body.items.map(({ action }: { action: string }) => action)).toEqual(['job.stage_moved', 'job.created']);
    expect(body.items[0]).toMatchObject({
      personName: 'installer of Tidewater Tops',
      data: { from: 'new', to: 'measured' },
    });
  });

  it('refuses to skip a stage, to stay, and to sign off without a revision', async () => {
    const { id } = await newJob();
    const skipped = await move(installer, id, 'drawn').expect(409);
    const stayed = await move(installer, id, 'new').expect(409);
    const drawn = await jobIn('drawn');
    const signed = await move(designer, drawn, 'signed_off').expect(409);

    expect(skipped.body).toMatchObject({
      code: 'stage_refused',
      detail: 'The job is in New; the next stage is Measured.',
    });
    expect(stayed.body.detail).toBe('The job is in New already.');
    expect(signed.body.detail).toBe('Sign a revision off; the job then moves by itself.');
  });

  it('goes back any number of stages, with a note', async () => {
    const id = await jobIn('drawn');
    await move(designer, id, 'new', 'The owners moved the window.').expect(200);
    const { body } = await installer.get(`/jobs/${id}/activity?limit=1`).expect(200);

    expect(body.items[0].data).toEqual({ from: 'drawn', to: 'new', note: 'The owners moved the window.' });
  });

  it('is not for the shop hand before Cut', async () => {
    const { id } = await newJob();
    const { body } = await move(shopHand, id, 'measured').expect(403);

    expect(body.code).toBe('not_allowed');
  });

  it('moves a job once when two ask at the same moment', async () => {
    const { id } = await newJob();
    const answers = await Promise.all([move(installer, id, 'measured'), move(designer, id, 'measured')]);

    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
  });
});

describe('POST /jobs/:jobId/send-for-check', () => {
  it('marks a drawn job, and moving it takes the mark away', async () => {
    const id = await jobIn('drawn');
    const sent = await installer.post(`/jobs/${id}/send-for-check`).expect(200);
    expect(sent.body.sentForCheckAt).toMatch(/^\d{4}-/);

    const back = await designer.post(`/jobs/${id}/stage`, { to: 'measured' }).expect(200);
    expect(back.body.sentForCheckAt).toBeNull();
  });

  it('refuses a job that is not drawn', async () => {
    const { id } = await newJob();
    const { body } = await installer.post(`/jobs/${id}/send-for-check`).expect(409);

    expect(body.detail).toBe('A drawn job is sent for check; this one is in New.');
  });
});

describe('reads', () => {
  it('answer 304 to their own ETag and are kept by no shared cache', async () => {
    const { id } = await newJob();
    const first = await installer.get(`/jobs/${id}`).expect(200);
    expect(first.headers['cache-control']).toBe('private, no-cache');
    expect(first.headers['etag']).toMatch(/^"/);

    const second = await installer.get(`/jobs/${id}`).set('If-None-Match', first.headers['etag'] as string);
    expect([second.status, second.text]).toEqual([304, '']);
    await installer.patch(`/jobs/${id}`, { customerName: 'Somebody' }).expect(200);
    await installer
      .get(`/jobs/${id}`)
      .set('If-None-Match', first.headers['etag'] as string)
      .expect(200);
  });

  it('need a sign-in', async () => {
    await request(server.app).get(`${API_ROOT}/jobs`).expect(401);
  });
});
