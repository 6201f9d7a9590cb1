import { randomUUID } from 'node:crypto';

import type { Knex } from 'knex';

import { connect } from '@/server/db/connect';
import { migrate, seedWhenEmpty } from '@/server/db/migrate';

/** Any number will do, so long as all workers of a run use the same one. */
const TEMPLATE_LOCK = 4_710;

/** Kept from a template: 'schema' has every table and no row, 'demo' also the demo shop. */
export type Content = 'schema' | 'demo';

export interface TestDatabase {
  /** For a process that connects by itself. */
  readonly url: string;
  /** Connected as the owner. */
  readonly db: Knex;
  /** Closes `db` and deletes the database; call it in `afterAll`. */
  drop(): Promise<void>;
}

/**
 * Gives a test file a database of its own, copied from a template that the run migrates (and seeds) only once.
 *
 * @throws Error outside the jest projects that start PostgreSQL ('server' and 'browser')
 */
export async function freshDatabase(content: Content = 'schema'): Promise<TestDatabase> {
  const server = process.env.TEST_POSTGRES_URL;
  if (!server) throw new Error('no test PostgreSQL here: put this test into tests/server or tests/e2e');
  const name = `test_${randomUUID().replaceAll('-', '')}`;

  const owner = connect(databaseUrl(server, 'postgres'), 1);
  try {
    await underLock(owner, async () => {
      await ensureTemplate(owner, server, content);
      // The test cluster never waits for the disk, and there copying files is the quicker way.
      await owner.raw('create database ?? template ?? strategy file_copy', [name, templateName(content)]);
    });
  } finally {
    await owner.destroy();
  }

  const url = databaseUrl(server, name);
  const db = connect(url, 5);
  return {
    url,
    db,
    async drop() {
      await db.destroy();
      await dropDatabase(server, name);
    },
  };
}

async function ensureTemplate(owner: Knex, server: string, content: Content): Promise<void> {
  const name = templateName(content);
  const existing = await owner('pg_database').where({ datname: name }).first('datname');
  if (existing) return;
  if (content === 'demo') await ensureTemplate(owner, server, 'schema');

  const from = content === 'demo' ? templateName('schema') : 'template0';
  const unfinished = `${name}_unfinished`;
  await owner.raw('drop database if exists ?? with (force)', [unfinished]);
  await owner.raw('create database ?? template ?? strategy file_copy', [unfinished, from]);
  const db = connect(databaseUrl(server, unfinished), 1);
  try {
    if (content === 'demo') await seedWhenEmpty(db);
    else await migrate(db);
  } finally {
    await db.destroy();
  }
  // Renamed only now, so that a failed migration is told again to every file and never copied.
  await owner.raw('alter database ?? rename to ??', [unfinished, name]);
}

async function underLock(owner: Knex, work: () => Promise<void>): Promise<void> {
  await owner.raw('select pg_advisory_lock(?)', [TEMPLATE_LOCK]);
  try {
    await work();
  } finally {
    await owner.raw('select pg_advisory_unlock(?)', [TEMPLATE_LOCK]);
  }
}

async function dropDatabase(server: string, name: string): Promise<void> {
  const owner = connect(databaseUrl(server, 'postgres'), 1);
  try {
    await owner.raw('drop database ?? with (force)', [name]);
  } finally {
    await owner.destroy();
  }
}

function templateName(content: Content): string {
  return `template_${content}`;
}

function databaseUrl(server: string, name: string): string {
  const url = new URL(server);
  url.pathname = `/${name}`;
  return url.href;
}
