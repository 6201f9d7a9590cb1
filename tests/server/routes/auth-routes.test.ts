import { createHash } from 'node:crypto';

import { SignJWT } from 'jose';
import { pino } from 'pino';
import request, { type Response } from 'supertest';

import { createApp } from '@/server/app';
import { createAccessTokens } from '@/server/services/access-tokens';
import { API_ROOT } from '@/shared/contracts/contract';
import { addShop, openTestServer, TEST_CONFIG, TEST_PASSWORD, type TestServer } from '@/tests/helpers/test-server';

let server: TestServer;

beforeAll(async () => {
  server = await openTestServer();
});

afterAll(() => server.close());

/** The limits of one app count for all its callers: whoever makes many mistakes gets an app of their own. */
const freshApp = () => createApp({ config: TEST_CONFIG, db: server.db, log: pino({ level: 'silent' }) });

const post = (path: string, body: object, cookie = '', app = server.app) =>
  request(app).post(`${API_ROOT}/auth/${path}`).set('Cookie', cookie).send(body);

const signIn = (email = server.shop.people.installer.email, password = TEST_PASSWORD, app = server.app) =>
  post('sign-in', { email, password }, '', app);

/** The refresh cookie as a browser sends it back. */
function cookieOf(response: Response): string {
  const [line] = (response.headers['set-cookie'] ?? []) as unknown as string[];
  return line?.split(';', 1)[0] ?? '';
}

const hashOf = (cookie: string) =>
  createHash('sha256')
    .update(cookie.split('=')[1] ?? '')
    .digest();

/** Moves the exchange of a token into the past, beyond the time in which it may come twice. */
const ageUse = (cookie: string, seconds: number) =>
  server
    .db('sign_ins')
    .where({ token_hash: hashOf(cookie) })
    .update({ used_at: new Date(Date.now() - seconds * 1000) });

async function mailTo(address: string): Promise<{ kind: string; body: string; token: string }[]> {
  const rows = await server.db('outbox').where({ to_address: address }).orderBy('created_at');
  return rows.map(({ kind, body }: { kind: string; body: string }) => ({
    kind,
    body,
    token: /token=([\w-]+)/.exec(body)?.[1] ?? '',
  }));
}

describe('POST /auth/sign-in', () => {
  it('gives a token that opens the API, who it is, and a cookie that scripts cannot read', async () => {
    const answer = await signIn().expect(200);

    expect(answer.body.expiresInSeconds).toBe(600);
    expect(answer.body.me).toEqual({
      personId: server.shop.people.installer.id,
      name: 'installer of Tidewater Tops',
      email: 'installer@tidewater-tops.example',
      role: 'installer',
      shop: { id: server.shop.id, name: 'Tidewater Tops' },
    });
    expect(answer.headers['set-cookie']?.[0]).toMatch(
      /^offsquare_session=[\w-]{43}; Max-Age=2592000; Path=\/api\/v1\/auth; Expires=[^;]+; HttpOnly; SameSite=Strict$/,
    );
    await request(server.app)
      .get(`${API_ROOT}/me`)
      .set('Authorization', `Bearer ${answer.body.accessToken as string}`)
      .expect(200, answer.body.me);
  });

  it('marks the cookie for HTTPS only where people type an https address', async () => {
    const config = { ...TEST_CONFIG, publicUrl: 'https://tops.example' };
    const app = createApp({ config, db: server.db, log: pino({ level: 'silent' }) });

    const answer = await signIn(undefined, undefined, app).expect(200);

    expect(answer.headers['set-cookie']?.[0]).toMatch(/; Secure;/);
  });

  it('takes the address in any case and with blanks around it', async () => {
    await signIn(' Installer@Tidewater-Tops.example ').expect(200);
  });

  it('answers alike to a wrong password and to an unknown address', async () => {
    const app = freshApp();
    const wrong = await signIn(undefined, 'nothing like it', app).expect(401);
    const unknown = await signIn('nobody@tidewater-tops.example', TEST_PASSWORD, app).expect(401);

    expect(wrong.body.code).toBe('wrong_sign_in');
    expect(unknown.body).toEqual(wrong.body);
  });

  it('opens the shop asked for, for somebody who works in two', async () => {
    const other = await addShop(server.db, 'Lockgate Larders');
    const { id, email } = server.shop.people.designer;
    await server.db('memberships').insert({ shop_id: other.id, person_id: id, role: 'shop_hand' });

    const usual = await post('sign-in', { email, password: TEST_PASSWORD }).expect(200);
    const asked = await post('sign-in', { email, password: TEST_PASSWORD, shopId: other.id }).expect(200);

    expect([usual.body.me.role, usual.body.me.shop.name]).toEqual(['designer', 'Tidewater Tops']);
    expect([asked.body.me.role, asked.body.me.shop.name]).toEqual(['shop_hand', 'Lockgate Larders']);
  });

  it('lets nobody in who has left the shop', async () => {
    const shop = await addShop(server.db, 'Ebb Lane Joinery');
    const { id, email } = shop.people.installer;
    await server.db('memberships').where({ person_id: id }).update({ left_at: new Date() });

    await signIn(email, TEST_PASSWORD, freshApp()).expect(401);
  });

  it('stores no token that could be used from the database', async () => {
    const answer = await signIn().expect(200);
    const token = cookieOf(answer).split('=')[1] ?? '';
    const stored = await server
      .db('sign_ins')
      .where({ token_hash: hashOf(cookieOf(answer)) })
      .first();

    expect(stored).toMatchObject({ purpose: 'session', person_id: server.shop.people.installer.id });
    expect(JSON.stringify(stored)).not.toContain(token);
  });

  it('refuses the 11th try after 10 wrong passwords, for this address alone', async () => {
    const app = freshApp();
    const { installer, owner } = server.shop.people;
    for (let n = 0; n < 10; n++) await signIn(installer.email, `wrong ${n}`, app).expect(401);

    const refused = await signIn(installer.email, TEST_PASSWORD, app).expect(429);

    expect(refused.body.code).toBe('too_many_requests');
    expect(refused.headers['retry-after']).toMatch(/^\d+$/);
    await signIn(owner.email, TEST_PASSWORD, app).expect(200);
  });

  it('does not count sign-ins that succeed', async () => {
    const app = freshApp();
    for (let n = 0; n < 12; n++) await signIn(undefined, undefined, app).expect(200);
  });

  it('refuses the 61st try after 60 wrong ones with ever other addresses', async () => {
    const app = freshApp();
    for (let n = 0; n < 60; n++) await post('resets', { token: `${n}`.padStart(20, '0'), password: 'x' }, '', app);

    await signIn(undefined, undefined, app).expect(429);
  });
});

describe('the access token', () => {
  const me = (token: string) => request(server.app).get(`${API_ROOT}/me`).set('Authorization', `Bearer ${token}`);
  const person = () => ({ personId: server.shop.people.owner.id, shopId: server.shop.id, role: 'owner' as const });

  it('opens nothing when there is none, when it is not ours, or when it has run out', async () => {
    const key = new TextEncoder().encode(TEST_CONFIG.tokenSecret);
    const old = await new SignJWT({ shop: server.shop.id, role: 'owner' })
      .setProtectedHeader({ alg: 'HS256' })
      .setSubject(person().personId)
      .setIssuer('offsquare')
      .setExpirationTime(Math.floor(Date.now() / 1000) - 1)
      .sign(key);
    const forged = await createAccessTokens('another secret, of thirty-two letters').sign(person());

    for (const token of ['', 'abc', forged, old]) {
      const { body } = await me(token).expect(401);
      expect(body.code).toBe('not_signed_in');
    }
  });

  it('opens nothing when it was signed by nobody (alg none)', async () => {
    const part = (value: object) => Buffer.from(JSON.stringify(value)).toString('base64url');
    const claims = {
      sub: person().personId,
      shop: server.shop.id,
      role: 'owner',
      iss: 'offsquare',
      exp: 4_000_000_000,
    };

    await me(`${part({ alg: 'none' })}.${part(claims)}.`).expect(401);
  });

  it('opens nothing once the person has another role', async () => {
    const shop = await addShop(server.db, 'Sluice Works');
    const tokens = createAccessTokens(TEST_CONFIG.tokenSecret);
    const token = await tokens.sign({ personId: shop.people.designer.id, shopId: shop.id, role: 'designer' });
    await me(token).expect(200);
    await server.db('memberships').where({ person_id: shop.people.designer.id }).update({ role: 'shop_hand' });

    const { body } = await me(token).expect(401);

    expect(body.code).toBe('session_ended');
  });
});

describe('POST /auth/refresh', () => {
  it('exchanges the cookie for a new token and a new cookie', async () => {
    const first = cookieOf(await signIn());
    const answer = await post('refresh', {}, first).expect(200);

    expect(answer.body.me.role).toBe('installer');
    expect(cookieOf(answer)).toMatch(/^offsquare_session=[\w-]{43}$/);
    expect(cookieOf(answer)).not.toBe(first);
    await post('refresh', {}, cookieOf(answer)).expect(200);
  });

  it('answers session_ended without a cookie and with one of nobody', async () => {
    for (const cookie of ['', 'offsquare_session=abc', 'other=1']) {
      const { body } = await post('refresh', {}, cookie).expect(401);
      expect(body.code).toBe('session_ended');
    }
  });

  it('takes one cookie twice within seconds: two tabs, or an answer that was lost', async () => {
    const first = cookieOf(await signIn());
    const [one, two] = await Promise.all([post('refresh', {}, first), post('refresh', {}, first)]);

    expect([one.status, two.status]).toEqual([200, 200]);
    await post('refresh', {}, cookieOf(one)).expect(200);
    await post('refresh', {}, cookieOf(two)).expect(200);
  });

  it('ends the whole sign-in when an exchanged cookie comes again a minute later', async () => {
    const stolen = cookieOf(await signIn());
    const next = cookieOf(await post('refresh', {}, stolen).expect(200));
    await ageUse(stolen, 60);

    const { body } = await post('refresh', {}, stolen).expect(401);

    expect(body.code).toBe('session_ended');
    // Whoever holds the newest one, thief or owner, has to sign in again.
    const last = await post('refresh', {}, next).expect(401);
    expect(last.headers['set-cookie']?.[0]).toMatch(/^offsquare_session=;/);
  });

  it("leaves the person's other sign-ins alone when one is ended", async () => {
    const elsewhere = cookieOf(await signIn());
    const stolen = cookieOf(await signIn());
    await post('refresh', {}, stolen).expect(200);
    await ageUse(stolen, 60);
    await post('refresh', {}, stolen).expect(401);

    await post('refresh', {}, elsewhere).expect(200);
  });

  it('ends after 30 days without use', async () => {
    const cookie = cookieOf(await signIn());
    const stored = server.db('sign_ins').where({ token_hash: hashOf(cookie) });
    const { expires_at: expiresAt } = await stored.clone().first<{ expires_at: Date }>('expires_at');
    expect((expiresAt.getTime() - Date.now()) / 86_400_000).toBeCloseTo(30, 2);
    await stored.clone().update({ expires_at: new Date(Date.now() - 1000) });

    await post('refresh', {}, cookie).expect(401);
  });
});

describe('POST /auth/sign-out', () => {
  it('ends the sign-in and takes the cookie away', async () => {
    const cookie = cookieOf(await signIn());
    const answer = await post('sign-out', {}, cookie).expect(204);

    expect(answer.headers['set-cookie']?.[0]).toMatch(
      /^offsquare_session=; Path=\/api\/v1\/auth; Expires=Thu, 01 Jan 1970/,
    );
    await post('refresh', {}, cookie).expect(401);
  });

  it('succeeds without a cookie', async () => {
    await post('sign-out', {}).expect(204);
  });
});

describe('a forgotten password', () => {
  it('is replaced by the link from the mail, once, and every sign-in of the person ends', async () => {
    const app = freshApp();
    const { email } = server.shop.people.owner;
    const cookie = cookieOf(await signIn(email));
    await post('reset-requests', { email }, '', app).expect(204);
    const [mail] = await mailTo(email);
    expect(mail?.body).toContain(`http://localhost:8080/reset?token=${mail?.token ?? '?'}`);

    await post('resets', { token: mail?.token, password: 'a new one, quite long' }, '', app).expect(204);

    await signIn(email, TEST_PASSWORD, app).expect(401);
    await signIn(email, 'a new one, quite long', app).expect(200);
    await post('refresh', {}, cookie, app).expect(401);
    const again = await post('resets', { token: mail?.token, password: 'and another one' }, '', app).expect(410);
    expect(again.body.code).toBe('link_ended');
  });

  it('is not replaced by a link that a later one took the place of, or that is an hour old', async () => {
    const app = freshApp();
    const { email } = server.shop.people.designer;
    await post('reset-requests', { email }, '', app).expect(204);
    await post('reset-requests', { email }, '', app).expect(204);
    const [first, second] = await mailTo(email);
    await post('resets', { token: first?.token, password: 'a new one, quite long' }, '', app).expect(410);

    await server
      .db('sign_ins')
      .where({ purpose: 'reset' })
      .update({ expires_at: new Date(Date.now() - 1) });
    await post('resets', { token: second?.token, password: 'a new one, quite long' }, '', app).expect(410);
  });

  it('sends nothing to an unknown address and answers alike', async () => {
    await post('reset-requests', { email: 'nobody@tidewater-tops.example' }, '', freshApp()).expect(204);

    expect(await mailTo('nobody@tidewater-tops.example')).toEqual([]);
  });

  it('sends 5 mails an hour to one place', async () => {
    const app = freshApp();
    const ask = () => post('reset-requests', { email: 'nobody@tidewater-tops.example' }, '', app);
    for (let n = 0; n < 5; n++) await ask().expect(204);

    await ask().expect(429);
  });

  it.each([
    ['nine char', 'ten characters or more'],
    ['é'.repeat(37), 'at most 72 characters'],
  ])('is not replaced by %p', async (password, message) => {
    const { body } = await post('resets', { token: 'x'.repeat(43), password }, '', freshApp()).expect(422);

    expect(body.issues).toEqual([{ path: 'body.password', message }]);
  });
});

describe('an invitation', () => {
  const invite = async (email: string, role = 'installer') => {
    const owner = await server.as('owner');
    await owner.post('/crew/invitations', { email, role }).expect(201);
    return (await mailTo(email)).at(-1)?.token ?? '';
  };

  it('lets a new person join with a name and a password, once', async () => {
    const email = 'bertil@tidewater-tops.example';
    const token = await invite(email, 'shop_hand');
    await post('invitations', { token }).expect(200, {
      shopName: 'Tidewater Tops',
      email,
      role: 'shop_hand',
      known: false,
    });

    const joined = await post('join', { token, name: 'Bertil Osk', password: 'saw at the quay' }).expect(201);

    expect([joined.body.me.name, joined.body.me.role]).toEqual(['Bertil Osk', 'shop_hand']);
    await post('refresh', {}, cookieOf(joined)).expect(200);
    await signIn(email, 'saw at the quay').expect(200);
    await post('join', { token, name: 'Bertil Osk', password: 'saw at the quay' }, '', freshApp()).expect(410);
  });

  it('lets somebody of another shop join with the password they have, and with no other', async () => {
    const app = freshApp();
    const other = await addShop(server.db, 'Weir Row Worktops');
    const { email, name } = other.people.installer;
    const token = await invite(email);
    const found = await post('invitations', { token }, '', app).expect(200);
    expect(found.body.known).toBe(true);

    const wrong = await post('join', { token, name: 'New Name', password: 'not the right one' }, '', app).expect(401);
    expect(wrong.body.code).toBe('wrong_sign_in');
    const joined = await post('join', { token, name: 'New Name', password: TEST_PASSWORD }, '', app).expect(201);

    expect([joined.body.me.name, joined.body.me.shop.name]).toEqual([name, 'Tidewater Tops']);
  });

  it('ends when it is taken back, replaced or a week old', async () => {
    const app = freshApp();
    const owner = await server.as('owner');
    const find = (token: string) => post('invitations', { token }, '', app);

    const revoked = await invite('first@tidewater-tops.example');
    const { body } = await owner.get('/crew/invitations').expect(200);
    const listed = body.invitations.find((one: { email: string }) => one.email === 'first@tidewater-tops.example');
    await owner.delete(`/crew/invitations/${listed.id as string}`).expect(204);
    await find(revoked).expect(410);

    const replaced = await invite('second@tidewater-tops.example');
    const old = await invite('second@tidewater-tops.example');
    await find(replaced).expect(410);
    await server.db('invitations').where({ email: 'second@tidewater-tops.example' }).update({ expires_at: new Date() });
    await find(old).expect(410);
  });
});
