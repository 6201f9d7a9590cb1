import { openTestServer, type Caller, type TestServer } from '@/tests/helpers/test-server';

let server: TestServer;
let owner: Caller;
let shopHand: Caller;

beforeAll(async () => {
  server = await openTestServer();
  owner = await server.as('owner');
  shopHand = await server.as('shop_hand');
});

afterAll(() => server.close());

const SLAB = { species: 'hard maple', thickness: 1.5, length: 96, depth: 25, priceCents: 37_900 };

let made = 0;
async function newSlab(fields: object = {}): Promise<{ id: string; code: string }> {
  const { body } = await owner.post('/stock', { ...SLAB, code: `S${++made}`, ...fields }).expect(201);
  return body as { id: string; code: string };
}

describe('/stock', () => {
  it('adds a slab with everything left out at its usual', async () => {
    const { body } = await owner.post('/stock', { ...SLAB, code: 'M96' }).expect(201);

    expect(body).toMatchObject({
      ...SLAB,
      code: 'M96',
      count: null,
      faces: 'both',
      defects: [],
      trim: null,
      measuredDepth: null,
      supplier: '',
    });
  });

  it('keeps thirds of an inch and cents exactly', async () => {
    const { id } = await newSlab({ length: 95.9375, depth: 1 / 3, priceCents: 1 });
    const { body } = await owner.get('/stock').expect(200);
    const slab = body.slabs.find((one: { id: string }) => one.id === id);

    expect(slab).toMatchObject({ length: 95.9375, depth: 1 / 3, priceCents: 1 });
  });

  it('lists by species, thickness and length, with the currency', async () => {
    await newSlab({ species: 'cherry', length: 120 });
    await newSlab({ species: 'cherry', length: 72 });
    const { body } = await owner.get('/stock').expect(200);
    const cherry = body.slabs.filter(({ species }: { species: string }) => species === 'cherry');

    expect(body.currency).toBe('USD');
    expect(cherry.map(({ length }: { length: number }) => length)).toEqual([72, 120]);
    expect(body.slabs[0].species).toBe('cherry');
  });

  it('hides prices from the shop hand', async () => {
    await newSlab();
    const { body } = await shopHand.get('/stock').expect(200);

    expect(body.slabs.length).toBeGreaterThan(0);
    expect(body.slabs.every(({ priceCents }: { priceCents: unknown }) => priceCents === null)).toBe(true);
  });

  it('changes what is given, defects too', async () => {
    const { id, code } = await newSlab({ supplier: 'Gannet Point Hardwoods' });
    const defects = [{ x: 10, y: 0, w: 3, h: 4 }];
    const { body } = await owner.patch(`/stock/${id}`, { count: 4, defects }).expect(200);

    expect(body).toMatchObject({ code, count: 4, defects, supplier: 'Gannet Point Hardwoods', length: 96 });
  });

  it('refuses a name that another slab has, and lets a slab keep its own', async () => {
    const { code } = await newSlab();
    const { id, code: own } = await newSlab();

    const again = await owner.post('/stock', { ...SLAB, code }).expect(409);
    await owner.patch(`/stock/${id}`, { code }).expect(409);
    await owner.patch(`/stock/${id}`, { code: own }).expect(200);

    expect(again.body).toMatchObject({ code: 'code_taken', issues: [{ path: 'body.code', message: 'is taken' }] });
  });

  it.each([
    ['a price under 0', { priceCents: -1 }, 'body.priceCents'],
    ['a price with half cents', { priceCents: 0.5 }, 'body.priceCents'],
    ['no length', { length: 0 }, 'body.length'],
    ['a trim that eats the slab', { trim: 48 }, 'body.trim'],
    ['a defect beyond the end', { defects: [{ x: 95, y: 0, w: 2, h: 1 }] }, 'body.defects.0'],
    ['straightening that eats the slab', { straightening: 25 }, 'body.straightening'],
  ])('refuses %s, when added and when changed', async (_what, fields, path) => {
    const { id } = await newSlab();
    const added = await owner.post('/stock', { ...SLAB, code: 'bad', ...fields }).expect(422);
    const changed = await owner.patch(`/stock/${id}`, fields).expect(422);

    expect([added.body.issues[0].path, changed.body.issues[0].path]).toEqual([path, path]);
  });

  it('takes a slab out', async () => {
    const { id } = await newSlab();
    await owner.delete(`/stock/${id}`).expect(204);

    await owner.delete(`/stock/${id}`).expect(404);
    const { body } = await owner.patch(`/stock/${id}`, { count: 1 }).expect(404);
    expect(body.code).toBe('not_found');
  });
});

describe('/rack', () => {
  const PIECE = { species: 'hard maple', thickness: 1.5, length: 41, depth: 25 };

  it('gives each piece the next code, also when several come at once', async () => {
    const answers = await Promise.all([1, 2, 3, 4].map(() => shopHand.post('/rack', { ...PIECE, place: 'Left bay' })));

    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201, 201]);
    expect(answers.map(({ body }) => body.code).sort()).toEqual(['R1', 'R2', 'R3', 'R4']);
  });

  it('lists what no job has taken, and who holds what', async () => {
    const { body: job } = await owner.post('/jobs', { name: 'Mast House pantry' }).expect(201);
    const { body: before } = await owner.get('/rack').expect(200);
    const [held, taken] = before.pieces as [{ id: string }, { id: string }];
    const shop = { shop_id: server.shop.id, person_id: server.shop.people.owner.id };
    await server.db('reservations').insert({ ...shop, rack_piece_id: held.id, job_id: job.id });
    await server.db('rack_pieces').where({ id: taken.id }).update({ taken_by_job_id: job.id, taken_at: new Date() });

    const { body } = await shopHand.get('/rack').expect(200);

    expect(body.pieces).toHaveLength(before.pieces.length - 1);
    expect(body.pieces.find(({ id }: { id: string }) => id === held.id).reservedForJobId).toBe(job.id);
    expect(body.pieces.find(({ id }: { id: string }) => id === taken.id)).toBeUndefined();
  });

  it.each([
    ['an end that cannot be', { leftAngleDeg: 180 }, 'body.leftAngleDeg'],
    ['a job of nobody', { fromJobId: 'bcf9ae1c-7a0e-4b9c-9d5a-2f2f5f0e9a11' }, 'body.fromJobId'],
    ['a defect beside it', { defects: [{ x: 0, y: 24, w: 1, h: 2 }] }, 'body.defects.0'],
  ])('refuses %s', async (_what, fields, path) => {
    const { body } = await shopHand.post('/rack', { ...PIECE, ...fields }).expect(422);

    expect(body.issues[0].path).toBe(path);
  });
});

describe('POST /layouts/:layoutId/stock', () => {
  it('puts the slabs of the wood the layout is in by now into it, as one edit', async () => {
    const installer = await server.as('installer');
    await newSlab({ code: 'W96', species: 'black walnut' });
    const { body: job } = await installer.post('/jobs', { name: 'Walnut job' }).expect(201);
    const path = `/layouts/${job.layoutId as string}`;
    const edit = {
      id: 'a3b9a3de-0f0b-4a38-8a2e-7f5b2a1c9d10',
      kind: 'setMaterial',
      value: { species: 'black walnut' },
    };
    await installer.post(`${path}/edits`, { base: 0, edits: [edit] }).expect(200);

    const editId = 'a3b9a3de-0f0b-4a38-8a2e-7f5b2a1c9d11';
    const first = await installer.post(`${path}/stock`, { base: 0, editId }).expect(200);
    const again = await installer.post(`${path}/stock`, { base: 0, editId }).expect(200);

    expect(first.body.seq).toBe(2);
    expect(first.body.edits.map((one: { edit: { id: string } }) => one.edit.id)).toEqual([edit.id, editId]);
    expect(again.body).toEqual(first.body);
    const { body } = await installer.get(path).expect(200);
    expect(body.layout.stock.slabs.map(({ id }: { id: string }) => id)).toEqual(['W96']);
    expect(body.layout.stock.kerf).toBe(0.125);
  });
});

describe('/stock/import', () => {
  it('takes what has a free code, names what has not, and takes all of it back', async () => {
    const { code } = await newSlab();
    const slabs = ['I1', code, 'I2', 'I1'].map((one) => ({ ...SLAB, code: one }));
    const { body } = await owner.post('/stock/import', { slabs }).expect(201);

    expect(body.added.map((slab: { code: string }) => slab.code)).toEqual(['I1', 'I2']);
    expect(body.refused.map((one: { index: number }) => one.index)).toEqual([1, 3]);
    const ids = body.added.map((slab: { id: string }) => slab.id);
    expect((await owner.post('/stock/removals', { ids }).expect(200)).body).toEqual({ removed: 2 });
    expect((await owner.post('/stock/removals', { ids }).expect(200)).body).toEqual({ removed: 0 });
    const left = (await owner.get('/stock').expect(200)).body.slabs.map((slab: { code: string }) => slab.code);
    expect(left).toContain(code);
    expect(left).not.toContain('I1');
  });

  it('adds nothing where a slab makes no sense', async () => {
    const slabs = [
      { ...SLAB, code: 'J1' },
      { ...SLAB, code: 'J2', priceCents: -1 },
    ];
    const { body } = await owner.post('/stock/import', { slabs }).expect(422);
    expect(body.issues[0].path).toContain('slabs.1.priceCents');
    expect(
      (await owner.get('/stock').expect(200)).body.slabs.some((slab: { code: string }) => slab.code === 'J1'),
    ).toBe(false);
  });

  it('is the owner’s alone', async () => {
    await shopHand.post('/stock/import', { slabs: [{ ...SLAB, code: 'K1' }] }).expect(403);
  });
});
