import { randomUUID } from 'node:crypto';

import { hash } from 'bcryptjs';
import type { Express } from 'express';
import type { Knex } from 'knex';
import { pino } from 'pino';
import request from 'supertest';

import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { createApp } from '@/server/app';
import type { Config } from '@/server/config';
import { createAccessTokens } from '@/server/services/access-tokens';
import { API_ROOT } from '@/shared/contracts/contract';
import { ROLES, type Role } from '@/shared/roles/roles';
import { freshDatabase } from './database';

export const TEST_CONFIG: Config = {
  databaseUrl: 'postgres://unused.invalid/offsquare',
  host: '127.0.0.1',
  port: 8080,
  publicUrl: 'http://localhost:8080',
  tokenSecret: 'a secret of thirty-two characters, for tests',
  logLevel: 'silent',
  seedDemo: false,
  smtpUrl: null,
  mailFrom: null,
};

export const TEST_PASSWORD = 'quayside lantern 7';

export interface TestShop {
  readonly id: string;
  readonly people: Readonly<Record<Role, { readonly id: string; readonly email: string; readonly name: string }>>;
}

export interface TestServer {
  readonly app: Express;
  readonly db: Knex;
  readonly shop: TestShop;
  /** Requests of somebody of the shop (or of another one), signed in. */
  as(role: Role, shop?: TestShop): Promise<Caller>;
  /** Requests of nobody. */
  readonly nobody: Caller;
  close(): Promise<void>;
}

/** One shop with a person of each role, an app on a database of its own. */
export async function openTestServer(): Promise<TestServer> {
  const { db, drop } = await freshDatabase();
  const app = createApp({ config: TEST_CONFIG, db, log: pino({ level: 'silent' }) });
  const shop = await addShop(db, 'Tidewater Tops');
  const tokens = createAccessTokens(TEST_CONFIG.tokenSecret);
  return {
    app,
    db,
    shop,
    nobody: caller(app, null),
    as: async (role, of = shop) =>
      caller(app, await tokens.sign({ personId: of.people[role].id, shopId: of.id, role })),
    close: drop,
  };
}

/** Adds a shop with a person of each role; their address is `role@<shop>.example`. */
export async function addShop(db: Knex, name: string): Promise<TestShop> {
  const id = randomUUID();
  const domain = `${name.toLowerCase().replaceAll(/[^a-z]+/g, '-')}.example`;
  // The lowest cost bcrypt takes: the tests are about everything else.
  const passwordHash = await hash(TEST_PASSWORD, 4);
  await db('shops').insert({ id, name, settings: JSON.stringify(DEFAULT_SETTINGS) });
  const people = {} as Record<Role, { id: string; email: string; name: string }>;
  for (const role of ROLES) {
    const person = { id: randomUUID(), email: `${role.replace('_', '-')}@${domain}`, name: `${role} of ${name}` };
    await db('people').insert({ ...person, password_hash: passwordHash });
    await db('memberships').insert({ shop_id: id, person_id: person.id, role });
    people[role] = person;
  }
  return { id, people };
}

type Method = 'get' | 'post' | 'patch' | 'delete';

/** Sends requests below the API's root; whatever creates something gets an Idempotency-Key of its own. */
export type Caller = Readonly<Record<Method, (path: string, body?: object) => request.Test>>;

function caller(app: Express, token: string | null): Caller {
  const send = (method: Method) => (path: string, body?: object) => {
    const sent = request(app)[method](`${API_ROOT}${path}`).set('Idempotency-Key', randomUUID());
    if (token) void sent.set('Authorization', `Bearer ${token}`);
    return body === undefined ? sent : sent.send(body);
  };
  return { get: send('get'), post: send('post'), patch: send('patch'), delete: send('delete') };
}
