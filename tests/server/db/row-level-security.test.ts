import type { Knex } from 'knex';

import { withLookup, withTenant, type Tenant } from '@/server/db/tenant-transaction';
import { freshDatabase, type TestDatabase } from '@/tests/helpers/database';
import { addShop, type TestShop } from '@/tests/helpers/test-server';
import { addOneOfEverything } from './one-of-everything';

/** Of nobody's shop: people work in several, sign-ins are theirs, and the last two are the migrations' own. */
const NOT_OF_A_SHOP = ['knex_migrations', 'knex_migrations_lock', 'people', 'sign_ins'];

let database: TestDatabase;
let db: Knex;
let ours: TestShop;
let theirs: TestShop;
let tables: string[];
let rowsOfTheirs: Readonly<Record<string, Record<string, unknown>>>;

beforeAll(async () => {
  database = await freshDatabase();
  db = database.db;
  ours = await addShop(db, 'Tidewater Tops');
  theirs = await addShop(db, 'Breakwater Benches');
  await addOneOfEverything(db, ours);
  rowsOfTheirs = await addOneOfEverything(db, theirs);
  tables = await db('pg_class as c')
    .join('pg_namespace as n', 'n.oid', 'c.relnamespace')
    .where({ 'n.nspname': 'public' })
    .whereIn('c.relkind', ['r', 'p'])
    .orderBy('c.relname')
    .pluck<string[]>('c.relname');
});

afterAll(() => database.drop());

const shopTables = (): string[] => tables.filter((table) => !NOT_OF_A_SHOP.includes(table));
const shopColumn = (table: string): string => (table === 'shops' ? 'id' : 'shop_id');
const us = (): Tenant => ({ shopId: ours.id, personId: ours.people.owner.id, role: 'owner' });

async function denied(work: Promise<unknown>): Promise<boolean> {
  return work.then(
    () => false,
    (error: { code?: string }) => {
      if (error.code === '42501') return true;
      throw error;
    },
  );
}

describe('row-level security', () => {
  it('covers the 23 tables of a shop, and there are no others', () => {
    expect(tables).toHaveLength(23 + NOT_OF_A_SHOP.length);
    expect(tables).toEqual(expect.arrayContaining(NOT_OF_A_SHOP));
  });

  it('is on and forced for every table of a shop, and on for people and sign-ins', async () => {
    const flags = await db('pg_class')
      .whereIn('relname', tables)
      .whereRaw("relnamespace = 'public'::regnamespace")
      .select<{ relname: string; relrowsecurity: boolean; relforcerowsecurity: boolean }[]>(
        'relname',
        'relrowsecurity',
        'relforcerowsecurity',
      );
    const off = flags.filter(({ relrowsecurity }) => !relrowsecurity).map(({ relname }) => relname);
    const notForced = flags.filter(({ relforcerowsecurity }) => !relforcerowsecurity).map(({ relname }) => relname);

    expect(off.sort()).toEqual(['knex_migrations', 'knex_migrations_lock']);
    expect(notForced.sort()).toEqual(['knex_migrations', 'knex_migrations_lock', 'sign_ins']);
  });

  it('has rows of both shops in every table, so that the checks below can fail', async () => {
    for (const table of shopTables()) {
      const shops = await db(table).distinct(shopColumn(table)).pluck(shopColumn(table));
      expect([table, shops.sort()]).toEqual([table, [ours.id, theirs.id].sort()]);
    }
  });

  it('gives a query without a where the rows of one shop only, in every table', async () => {
    for (const table of shopTables()) {
      const seen = await withTenant(db, us(), (trx) => trx(table).pluck<string[]>(shopColumn(table)));
      expect([table, new Set(seen)]).toEqual([table, new Set([ours.id])]);
    }
  });

  it('gives nothing at all while no shop is set, in every table', async () => {
    for (const table of shopTables()) {
      const seen = await withLookup(db, (trx) => trx(table).pluck<string[]>(shopColumn(table)));
      expect([table, seen]).toEqual([table, []]);
    }
  });

  it("leaves another shop's row alone when an update or a delete has no where, in every table", async () => {
    for (const table of shopTables()) {
      await denied(withTenant(db, us(), (trx) => trx(table).update({ [shopColumn(table)]: ours.id })));
      await denied(
        withTenant(db, us(), async (trx) => {
          await trx.raw('set constraints all deferred');
          return trx(table).delete();
        }).catch((error: { code?: string }) => {
          // Rows that others hang on may not go, which is as good.
          if (error.code !== '23503') throw error;
        }),
      );
      const left = await db(table).where(shopColumn(table), theirs.id).count('* as n').first();
      expect([table, Number((left as { n: number }).n) > 0]).toEqual([table, true]);
    }
  });

  it('refuses a row written for another shop, in every table', async () => {
    for (const table of shopTables()) {
      const {
        id: _id,
        created_at: _at,
        ...row
      } = (await db(table).where(shopColumn(table), theirs.id).first()) as Record<string, unknown>;
      const written = Object.fromEntries(
        Object.entries(row).map(([name, value]) => [
          name,
          value !== null && typeof value === 'object' && !(value instanceof Date) && !Buffer.isBuffer(value)
            ? JSON.stringify(value)
            : value,
        ]),
      );
      const refused = await denied(withTenant(db, us(), (trx) => trx(table).insert(written)));
      expect([table, refused]).toEqual([table, true]);
    }
  });

  it("refuses a row of one's own that hangs on another shop's parent", async () => {
    const job = rowsOfTheirs['jobs'];
    const write = withTenant(db, us(), (trx) =>
      trx('comments').insert({
        shop_id: ours.id,
        job_id: job?.['id'],
        body: 'Mind the pipe.',
        person_id: ours.people.owner.id,
      }),
    );

    await expect(write).rejects.toMatchObject({ code: '23503', constraint: 'comments_job_id_fkey' });
  });

  it('shows people of the own crew and no password', async () => {
    const seen = await withTenant(db, us(), (trx) => trx('people').pluck<string[]>('email'));
    const own = Object.values(ours.people).map(({ email }) => email);

    expect(seen.sort()).toEqual(own.sort());
    expect(await denied(withTenant(db, us(), (trx) => trx('people').select('password_hash')))).toBe(true);
  });

  it("changes nobody's name but one's own", async () => {
    const changed = await withTenant(db, us(), (trx) => trx('people').update({ name: 'Somebody' }).returning('id'));

    expect(changed).toEqual([{ id: ours.people.owner.id }]);
  });

  it('keeps sign-ins and migrations out of reach', async () => {
    for (const table of ['sign_ins', 'knex_migrations', 'knex_migrations_lock']) {
      expect([table, await denied(withTenant(db, us(), (trx) => trx(table).select()))]).toEqual([table, true]);
    }
  });

  it('never rewrites what is a record: edits, revisions, the log of acts', async () => {
    const rewrites: [string, Record<string, unknown>][] = [
      ['layout_edits', { seq: 9 }],
      ['revisions', { plan: '{}' }],
      ['revisions', { sha256: Buffer.alloc(32) }],
      ['audit_log', { action: 'nothing' }],
    ];
    for (const [table, change] of rewrites) {
      expect([table, await denied(withTenant(db, us(), (trx) => trx(table).update(change)))]).toEqual([table, true]);
      expect([table, await denied(withTenant(db, us(), (trx) => trx(table).delete()))]).toEqual([table, true]);
    }
  });
});

describe('the role of a request', () => {
  it('owns nothing and bypasses nothing', async () => {
    const role = await db('pg_roles').where({ rolname: 'offsquare_app' }).first();
    const owned = await db('pg_class as c')
      .join('pg_roles as r', 'r.oid', 'c.relowner')
      .where({ 'r.rolname': 'offsquare_app' })
      .pluck('c.relname');

    expect(role).toMatchObject({
      rolsuper: false,
      rolbypassrls: false,
      rolcreaterole: false,
      rolcreatedb: false,
      rolcanlogin: false,
    });
    expect(owned).toEqual([]);
  });

  it('may call no function of ours but the ten that answer before a shop is known', async () => {
    const { rows } = await db.raw<{ rows: { name: string; definer: boolean }[] }>(
      `select p.proname as name, p.prosecdef as definer from pg_proc p
       where p.pronamespace = 'public'::regnamespace and has_function_privilege('offsquare_app', p.oid, 'execute')
       order by 1`,
    );

    expect(rows.map(({ name }) => name)).toEqual([
      'accept_invitation',
      'close_session',
      'close_sessions_of',
      'find_invitation',
      'find_share_link',
      'find_sign_in',
      'open_reset',
      'open_session',
      'rotate_session',
      'use_reset',
    ]);
    expect(rows.every(({ definer }) => definer)).toBe(true);
  });
});
