import { randomUUID } from 'node:crypto';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';

import { pino } from 'pino';

import { createApp } from '@/server/app';
import { createAccessTokens } from '@/server/services/access-tokens';
import { SignJWT } from 'jose';
import { addShop, openTestServer, TEST_CONFIG, type TestServer } from '@/tests/helpers/test-server';

let server: TestServer;
/** Two processes that share one database. */
let here: Server;
let there: Server;

beforeAll(async () => {
  server = await openTestServer();
  const listen = async (): Promise<Server> => {
    const http = createServer(createApp({ config: TEST_CONFIG, db: server.db, log: pino({ level: 'silent' }) }));
    await new Promise<void>((resolve) => http.listen(0, '127.0.0.1', resolve));
    return http;
  };
  here = await listen();
  there = await listen();
});

afterAll(async () => {
  for (const http of [here, there]) {
    http.closeAllConnections();
    await new Promise((resolve) => http.close(resolve));
  }
  await server.close();
});

const url = (http: Server, path: string) => `http://127.0.0.1:${(http.address() as AddressInfo).port}/api/v1${path}`;

interface Stream {
  readonly events: { kind: string }[];
  /** Resolves when so many events have come. */
  has(count: number): Promise<{ kind: string }[]>;
  readonly ended: Promise<void>;
  close(): void;
}

async function listenAt(http: Server, token: string): Promise<Stream> {
  const abort = new AbortController();
  const response = await fetch(url(http, '/events'), {
    headers: { authorization: `Bearer ${token}` },
    signal: abort.signal,
  });
  expect(response.headers.get('content-type')).toBe('text/event-stream; charset=utf-8');
  const events: { kind: string }[] = [];
  const waiting: (() => void)[] = [];
  let open: () => void = () => {};
  const opened = new Promise<void>((resolve) => (open = resolve));
  const read = async (): Promise<void> => {
    const decoder = new TextDecoder();
    let rest = '';
    for await (const chunk of response.body as unknown as AsyncIterable<Uint8Array>) {
      rest += decoder.decode(chunk, { stream: true });
      const blocks = rest.split('\n\n');
      rest = blocks.pop() ?? '';
      for (const block of blocks) {
        if (block === ': listening') open();
        const data = /^event: change\ndata: (.*)$/.exec(block)?.[1];
        if (data) events.push(JSON.parse(data) as { kind: string });
      }
      for (const wake of waiting.splice(0)) wake();
    }
  };
  const ended = read().catch(() => {});
  await opened;
  return {
    events,
    ended,
    async has(count) {
      while (events.length < count) await new Promise<void>((resolve) => waiting.push(resolve));
      return events;
    },
    close: () => abort.abort(),
  };
}

const tokenOf = (role: 'owner' | 'installer', shop = server.shop) =>
  createAccessTokens(TEST_CONFIG.tokenSecret).sign({ personId: shop.people[role].id, shopId: shop.id, role });

describe('GET /events', () => {
  it('tells of an edit, whichever process took it, when it is stored', async () => {
    const token = await tokenOf('installer');
    const [one, two] = [await listenAt(here, token), await listenAt(there, token)];
    const send = (http: Server, path: string, body: object) =>
      fetch(url(http, path), {
        method: 'POST',
        headers: {
          authorization: `Bearer ${token}`,
          'content-type': 'application/json',
          'idempotency-key': randomUUID(),
        },
        body: JSON.stringify(body),
      });

    const job = (await (await send(here, '/jobs', { name: 'Told' })).json()) as { id: string; layoutId: string };
    const edits = [{ id: randomUUID(), kind: 'setFinish', value: { coats: 2 } }];
    await send(there, `/layouts/${job.layoutId}/edits`, { base: 0, edits });

    const expected = [
      { kind: 'job', jobId: job.id },
      { kind: 'layout', jobId: job.id, layoutId: job.layoutId, seq: 1 },
    ];
    expect(await one.has(2)).toEqual(expected);
    expect(await two.has(2)).toEqual(expected);
    one.close();
    two.close();
  });

  it("tells nothing of another shop's, nor of what was rolled back", async () => {
    const other = await addShop(server.db, 'Breakwater Benches');
    const stream = await listenAt(here, await tokenOf('owner'));
    const theirs = await server.as('owner', other);
    const ours = await server.as('owner');
    await theirs.post('/jobs', { name: 'Theirs' }).expect(201);
    const refused = { currency: 'EUR', name: 'x'.repeat(121) };
    await ours.patch('/shop', refused).expect(422);
    await ours.patch('/me', { name: 'Somebody' }).expect(200);

    expect(await stream.has(1)).toEqual([{ kind: 'crew' }]);
    stream.close();
  });

  it('ends when the access token runs out', async () => {
    const { owner } = server.shop.people;
    const token = await new SignJWT({ shop: server.shop.id, role: 'owner' })
      .setProtectedHeader({ alg: 'HS256' })
      .setSubject(owner.id)
      .setIssuer('offsquare')
      .setExpirationTime(Math.floor(Date.now() / 1000) + 2)
      .sign(new TextEncoder().encode(TEST_CONFIG.tokenSecret));
    const stream = await listenAt(here, token);

    await stream.ended;
    expect(stream.events).toEqual([]);
  });

  it('ends when announcements may have been missed', async () => {
    const stream = await listenAt(here, await tokenOf('owner'));
    await server.db.raw(
      `select pg_terminate_backend(pid) from pg_stat_activity
       where datname = current_database() and query like 'listen %'`,
    );

    await stream.ended;
  });

  it('holds one connection while anybody listens and none afterwards', async () => {
    const listening = async () => {
      const row = await server
        .db('pg_stat_activity')
        .whereRaw("datname = current_database() and query like 'listen %'")
        .count<{ n: number }[]>('* as n')
        .first();
      return Number(row?.n);
    };
    const settles = async (count: number) => {
      while ((await listening()) !== count) await new Promise((resolve) => setTimeout(resolve, 10));
      return count;
    };
    expect(await settles(0)).toBe(0);
    const token = await tokenOf('owner');
    const streams = [await listenAt(here, token), await listenAt(here, token)];
    expect(await listening()).toBe(1);
    for (const stream of streams) stream.close();

    expect(await settles(0)).toBe(0);
  });

  it('needs a sign-in', async () => {
    const response = await fetch(url(here, '/events'));

    expect(response.status).toBe(401);
    expect(((await response.json()) as { code: string }).code).toBe('not_signed_in');
  });
});
