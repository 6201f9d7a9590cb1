import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { openTestServer, type Caller, type TestServer } from '@/tests/helpers/test-server';

let server: TestServer;
let owner: Caller;

beforeAll(async () => {
  server = await openTestServer();
  owner = await server.as('owner');
});

afterAll(() => server.close());

describe('/shop', () => {
  it('fills settings that a shop stored long ago with what has come since', async () => {
    const { backGap: _backGap, finishes: _finishes, ...old } = DEFAULT_SETTINGS;
    const { frontLine: _frontLine, ...screws } = old.screws;
    await server.db('shops').update({ settings: JSON.stringify({ ...old, screws: { ...screws, shank: 0.2 } }) });

    const { body } = await (await server.as('installer')).get('/shop').expect(200);

    expect(body.settings).toEqual({
      ...DEFAULT_SETTINGS,
      screws: { ...DEFAULT_SETTINGS.screws, shank: 0.2 },
    });
  });

  it('changes what is given and leaves the rest', async () => {
    const settings = { ...DEFAULT_SETTINGS, backGap: 0.375 };
    const letterhead = { lines: ['Tidewater Tops', '3 Slipway Yard'], phone: '555 0142' };
    const { body } = await owner.patch('/shop', { settings, letterhead, units: 'mm', step: '1 mm' }).expect(200);

    expect(body).toEqual({
      id: server.shop.id,
      name: 'Tidewater Tops',
      currency: 'USD',
      units: 'mm',
      step: '1 mm',
      settings,
      letterhead,
    });
    expect((await owner.get('/shop').expect(200)).body).toEqual(body);
  });

  it('gives a new job the units and the tape of the shop', async () => {
    const tapeSd = { fixed: 0.05, perInch: 0.0003 };
    await owner.patch('/shop', { settings: { ...DEFAULT_SETTINGS, tapeSd }, units: 'mm', step: '1 mm' }).expect(200);
    const { body: job } = await owner.post('/jobs', { name: 'Metric' }).expect(201);
    const { body } = await owner.get(`/layouts/${job.layoutId as string}`).expect(200);

    expect([body.layout.units, body.layout.step, body.layout.room.tapeSd]).toEqual(['mm', '1 mm', tapeSd]);
  });

  it.each([
    [{ currency: 'dollars' }, 'body.currency'],
    [{ name: ' ' }, 'body.name'],
    [{ settings: { ...DEFAULT_SETTINGS, backGap: -1 } }, 'body.settings.backGap'],
    [{ letterhead: { lines: Array(7).fill('x') } }, 'body.letterhead.lines'],
  ])('refuses %j', async (change, path) => {
    const { body } = await owner.patch('/shop', change).expect(422);

    expect(body.issues[0].path).toBe(path);
  });
});

describe('/crew', () => {
  it('lists everybody in the order of joining', async () => {
    const { body } = await (await server.as('shop_hand')).get('/crew').expect(200);

    expect(body.members.map(({ role }: { role: string }) => role).sort()).toEqual([
      'designer',
      'installer',
      'owner',
      'shop_hand',
    ]);
    expect(Object.keys(body.members[0])).toEqual(['personId', 'name', 'email', 'role', 'joinedAt']);
  });

  it('refuses to invite somebody who is there already', async () => {
    const { email } = server.shop.people.designer;
    const { body } = await owner.post('/crew/invitations', { email, role: 'owner' }).expect(409);

    expect(body.code).toBe('already_in_crew');
  });

  it('answers not_found for an invitation that is gone', async () => {
    await owner.delete('/crew/invitations/0b9b3d52-8b69-4f58-9a53-0f6f7a2f9d01').expect(404);
  });

  it('keeps an owner: the last one stays and stays owner', async () => {
    const me = server.shop.people.owner.id;
    const other = server.shop.people.designer.id;
    const demoted = await owner.patch(`/crew/${me}`, { role: 'designer' }).expect(409);
    await owner.delete(`/crew/${me}`).expect(409);
    expect(demoted.body.code).toBe('last_owner');

    await owner.patch(`/crew/${other}`, { role: 'owner' }).expect(200);
    await owner.patch(`/crew/${other}`, { role: 'designer' }).expect(200);
  });

  it('keeps an owner when two owners demote each other at once', async () => {
    const { owner: one, designer: two } = server.shop.people;
    await owner.patch(`/crew/${two.id}`, { role: 'owner' }).expect(200);
    await Promise.all([
      owner.patch(`/crew/${one.id}`, { role: 'designer' }),
      owner.patch(`/crew/${two.id}`, { role: 'designer' }),
    ]);
    const owners = await server.db('memberships').where({ role: 'owner', left_at: null }).pluck('person_id');

    expect(owners.length).toBeGreaterThanOrEqual(1);
    await server.db('memberships').where({ person_id: one.id }).update({ role: 'owner' });
    await server.db('memberships').where({ person_id: two.id }).update({ role: 'designer' });
  });

  it('takes somebody out: their token opens nothing any more, their name stays on what they did', async () => {
    const shopHand = await server.as('shop_hand');
    await shopHand.get('/me').expect(200);
    await owner.delete(`/crew/${server.shop.people.shop_hand.id}`).expect(204);

    await shopHand.get('/me').expect(401);
    const { body } = await owner.get('/crew').expect(200);
    expect(body.members).toHaveLength(3);
    await owner.delete(`/crew/${server.shop.people.shop_hand.id}`).expect(404);
  });
});

describe('/me', () => {
  it('takes a new name', async () => {
    const designer = await server.as('designer');
    await designer.patch('/me', { name: 'Ilse' }).expect(200);

    expect((await designer.get('/me').expect(200)).body.name).toBe('Ilse');
    await designer.patch('/me', { name: '' }).expect(422);
  });
});
