import { randomUUID } from 'node:crypto';

import type { Knex } from 'knex';

import { connect } from '@/server/db/connect';
import { migrate, MIGRATIONS, seedWhenEmpty } from '@/server/db/migrate';
import { withTenant } from '@/server/db/tenant-transaction';
import { freshDatabase, type TestDatabase } from '@/tests/helpers/database';
import { addShop, type TestShop } from '@/tests/helpers/test-server';
import { addOneOfEverything } from './one-of-everything';

let database: TestDatabase;
let db: Knex;

beforeAll(async () => {
  database = await freshDatabase();
  db = database.db;
});

afterAll(() => database.drop());

/** Everything the migrations make, as text that two databases can be compared by. */
async function describeSchema(of: Knex): Promise<Record<string, string[]>> {
  const list = async (sql: string): Promise<string[]> => {
    const { rows } = await of.raw<{ rows: { line: string }[] }>(sql);
    return rows.map(({ line }) => line).sort();
  };
  const mine = "table_schema = 'public' and table_name not like 'knex_%'";
  return {
    columns: await list(
      `select concat_ws(' ', table_name, column_name, data_type, is_nullable, column_default, datetime_precision) as line
       from information_schema.columns where ${mine}`,
    ),
    constraints: await list(
      `select concat_ws(' ', conrelid::regclass, conname, pg_get_constraintdef(oid)) as line from pg_constraint
       where connamespace = 'public'::regnamespace and conrelid::regclass::text not like 'knex_%'`,
    ),
    indexes: await list(
      `select indexdef as line from pg_indexes where schemaname = 'public' and tablename not like 'knex_%'`,
    ),
    policies: await list(
      `select concat_ws(' ', tablename, policyname, cmd, roles::text, qual, with_check) as line from pg_policies`,
    ),
    grants: await list(
      `select concat_ws(' ', table_name, column_name, privilege_type) as line
       from information_schema.column_privileges where grantee = 'offsquare_app'`,
    ),
    functions: await list(
      `select pg_get_functiondef(oid) as line from pg_proc where pronamespace = 'public'::regnamespace`,
    ),
  };
}

describe('migrations', () => {
  it('run up, down and up again to the same schema', async () => {
    const first = await describeSchema(db);

    await db.migrate.rollback(MIGRATIONS, true);
    const empty = await describeSchema(db);
    await migrate(db);
    const second = await describeSchema(db);

    expect(first['columns']?.length).toBeGreaterThan(200);
    expect(empty).toEqual({ columns: [], constraints: [], indexes: [], policies: [], grants: [], functions: [] });
    expect(second).toEqual(first);
  });

  it('run down and up one at a time', async () => {
    const before = await describeSchema(db);
    const { length } = await db('knex_migrations').pluck<string[]>('name');

    for (let n = 0; n < length; n++) await db.migrate.down(MIGRATIONS);
    expect(await db('knex_migrations').count('* as n').first()).toEqual({ n: 0 });
    for (let n = 0; n < length; n++) await db.migrate.up(MIGRATIONS);

    expect(await describeSchema(db)).toEqual(before);
  });

  it('apply nothing the second time', async () => {
    expect(await migrate(db)).toEqual([]);
  });

  it('give every foreign key an index that begins with its columns', async () => {
    const { rows } = await db.raw<{ rows: { name: string }[] }>(
      `select c.conname as name from pg_constraint c
       where c.contype = 'f' and c.connamespace = 'public'::regnamespace and not exists (
         select from pg_index i where i.indrelid = c.conrelid
         and (select array_agg(k order by k) from unnest((i.indkey::int2[])[0:cardinality(c.conkey) - 1]) as k)
           = (select array_agg(k order by k) from unnest(c.conkey) as k)
       )`,
    );
    // A shop's own key leads the unique index of every table, or is never searched by: deleting a shop is no request.
    const missing = rows.map(({ name }) => name).filter((name) => !name.endsWith('_shop_fkey'));

    expect(missing).toEqual([]);
  });

  it('store no time without its zone and name every CHECK', async () => {
    const naive = await db('information_schema.columns')
      .where({ table_schema: 'public', data_type: 'timestamp without time zone' })
      .pluck('column_name');
    const checks = await db('pg_constraint')
      .where({ contype: 'c' })
      .whereRaw("connamespace = 'public'::regnamespace")
      .pluck<string[]>('conname');

    expect(naive).toEqual([]);
    expect(checks.length).toBeGreaterThan(60);
    expect(checks.filter((name) => /_check\d*$/.test(name))).toEqual([]);
  });
});

describe('migrations run by an owner who is no superuser', () => {
  it('give the same rows to a request, and the seed and the sign-in functions work', async () => {
    const name = `owner_${randomUUID().replaceAll('-', '')}`;
    // A role's password cannot be a bound value.
    await db.raw(`create role ?? login createrole password 'owner of one database'`, [name]);
    const other = await freshDatabase();
    const ownerUrl = new URL(other.url);
    ownerUrl.username = name;
    ownerUrl.password = encodeURIComponent('owner of one database');
    await other.db.migrate.rollback(MIGRATIONS, true);
    await other.db.raw('grant all on schema public to ??', [name]);
    await other.db.raw('drop table knex_migrations, knex_migrations_lock');
    const plain = connect(ownerUrl.href, 2);
    try {
      expect(await plain('pg_roles').where({ rolname: name }).first('rolsuper')).toEqual({ rolsuper: false });
      await migrate(plain);
      expect(await seedWhenEmpty(plain)).toBe(true);
      const shop = await plain('shops').first('id');
      const person = await plain('people').first('id', 'email');
      const tenant = { shopId: String(shop?.id), personId: String(person?.id), role: 'owner' };
      const jobs = await withTenant(plain, tenant, (trx) => trx('jobs').count('* as n').first());
      const found = await withTenant(plain, { ...tenant, shopId: '' }, (trx) =>
        trx.raw<{ rows: object[] }>('select * from find_sign_in(?)', [person?.email]),
      );
      const nobodys = await withTenant(plain, { ...tenant, shopId: randomUUID() }, (trx) => trx('jobs').select('id'));

      expect(jobs).toEqual({ n: 4 });
      expect(found.rows).toHaveLength(1);
      expect(nobodys).toEqual([]);
    } finally {
      await plain.destroy();
      await other.drop();
      await db.raw('drop role ??', [name]);
    }
  });
});

describe('CHECK constraints', () => {
  let shop: TestShop;

  beforeAll(async () => {
    shop = await addShop(db, 'Tidewater Tops');
    await addOneOfEverything(db, shop);
  });

  it.each<[string, string, Record<string, unknown>]>([
    ['shops_currency_iso', 'shops', { currency: 'dollars' }],
    ['shops_units_known', 'shops', { units: 'ells' }],
    ['people_email_lower', 'people', { email: 'Maren@carrowquay.example' }],
    ['people_name_given', 'people', { name: '' }],
    ['memberships_role_known', 'memberships', { role: 'customer' }],
    ['jobs_stage_known', 'jobs', { stage: 'ordered' }],
    ['jobs_number_positive', 'jobs', { number: 0 }],
    ['layouts_seq_counts_up', 'layouts', { seq: -1 }],
    ['layout_edits_seq_positive', 'layout_edits', { seq: 0 }],
    ['stock_slabs_price_not_negative', 'stock_slabs', { price_cents: -1 }],
    ['stock_slabs_sizes_positive', 'stock_slabs', { depth: 0 }],
    ['stock_slabs_trim_leaves_wood', 'stock_slabs', { trim: 48 }],
    ['stock_slabs_straightening_leaves_wood', 'stock_slabs', { straightening: 25 }],
    ['rack_pieces_left_angle_possible', 'rack_pieces', { left_angle_deg: 180 }],
    ['rack_pieces_taken_by_a_job', 'rack_pieces', { taken_at: new Date(0) }],
    ['revisions_sha256_length', 'revisions', { sha256: Buffer.alloc(31) }],
    ['revisions_signed_off_by_somebody', 'revisions', { signed_off_at: new Date(0) }],
    ['checks_question_has_words', 'checks', { verdict: 'questioned', note: '' }],
    ['photos_media_type_known', 'photos', { media_type: 'image/gif' }],
    ['comments_one_author', 'comments', { customer_name: 'Petra' }],
    ['glue_ups_cure_takes_time', 'glue_ups', { cured_at: new Date(0) }],
    ['prices_deposit_within_total', 'prices', { deposit_cents: 400_001 }],
    ['proposals_approved_by_name', 'proposals', { state: 'approved' }],
    ['payments_amount_positive', 'payments', { amount_cents: 0 }],
    ['share_links_expire_later', 'share_links', { expires_at: new Date(0) }],
    ['outbox_one_end', 'outbox', { sent_at: new Date(0), given_up_at: new Date(0) }],
    ['idempotency_keys_key_length', 'idempotency_keys', { key: 'short' }],
  ])('%s refuses the row', async (constraint, table, change) => {
    await expect(db(table).update(change)).rejects.toMatchObject({ code: '23514', constraint });
  });

  it('reservations_one_job_key refuses a second job for one piece, until the first lets go', async () => {
    const held = await db('reservations').where({ shop_id: shop.id }).first();
    const { id: _id, created_at: _at, ...again } = held as Record<string, unknown>;

    await expect(db('reservations').insert(again)).rejects.toMatchObject({
      code: '23505',
      constraint: 'reservations_one_job_key',
    });
    await db('reservations').where({ shop_id: shop.id }).update({ released_at: new Date() });
    await db('reservations').insert(again);
  });
});
