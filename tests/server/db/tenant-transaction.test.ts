import { asOwner, withLookup, withTenant } from '@/server/db/tenant-transaction';
import { freshDatabase, type TestDatabase } from '@/tests/helpers/database';

const OURS = { shopId: '11111111-1111-4111-8111-111111111111', personId: 'p1', role: 'installer' };
const THEIRS = { shopId: '22222222-2222-4222-8222-222222222222', personId: 'p2', role: 'owner' };

let database: TestDatabase;

beforeAll(async () => {
  database = await freshDatabase();
  await database.db.raw(`
    create table notes (shop_id uuid not null, text text not null);
    alter table notes enable row level security;
    create policy notes_own_shop on notes
      using (shop_id = nullif(current_setting('app.shop_id', true), '')::uuid)
      with check (shop_id = nullif(current_setting('app.shop_id', true), '')::uuid);
    grant select, insert on notes to offsquare_app;
    create table unshared (text text);
  `);
  await database.db('notes').insert([
    { shop_id: OURS.shopId, text: 'ours' },
    { shop_id: THEIRS.shopId, text: 'theirs' },
  ]);
});

afterAll(() => database.drop());

describe('withTenant', () => {
  it('sees the rows of its own shop although no query names the shop', async () => {
    const rows = await withTenant(database.db, OURS, (trx) => trx('notes').pluck('text'));
    expect(rows).toEqual(['ours']);
  });

  it('may not write a row for another shop', async () => {
    const write = withTenant(database.db, OURS, (trx) => trx('notes').insert({ shop_id: THEIRS.shopId, text: 'x' }));
    await expect(write).rejects.toMatchObject({ code: '42501' });
  });

  it('may not touch a table that was not granted', async () => {
    const read = withTenant(database.db, OURS, (trx) => trx('unshared').select());
    await expect(read).rejects.toMatchObject({ code: '42501' });
  });

  it('tells policies the person and the role', async () => {
    const said = await withTenant(database.db, THEIRS, async (trx) => {
      const { rows } = await trx.raw<{ rows: { person: string; role: string }[] }>(
        `select current_setting('app.person_id') as person, current_setting('app.role') as role`,
      );
      return rows;
    });
    expect(said).toEqual([{ person: 'p2', role: 'owner' }]);
  });

  it('rolls everything back when the work throws', async () => {
    const failing = withTenant(database.db, OURS, async (trx) => {
      await trx('notes').insert({ shop_id: OURS.shopId, text: 'lost' });
      throw new Error('the tape slipped');
    });
    await expect(failing).rejects.toThrow('the tape slipped');
    expect(await database.db('notes').where({ text: 'lost' })).toEqual([]);
  });

  it('leaves neither shop nor role behind on the connection it used', async () => {
    await withTenant(database.db, OURS, (trx) => trx('notes').select());
    const { rows } = await database.db.raw<{ rows: { shop: string | null; same: boolean }[] }>(
      `select nullif(current_setting('app.shop_id', true), '') as shop, current_user = session_user as same`,
    );
    expect(rows).toEqual([{ shop: null, same: true }]);
  });

  it('keeps the shops of transactions that run at the same time apart', async () => {
    const answers = await Promise.all(
      [OURS, THEIRS, OURS, THEIRS, OURS, THEIRS].map((tenant) =>
        withTenant(database.db, tenant, async (trx) => {
          await trx.raw('select pg_sleep(0.02)');
          return trx('notes').pluck('text');
        }),
      ),
    );
    expect(answers.map(String)).toEqual(['ours', 'theirs', 'ours', 'theirs', 'ours', 'theirs']);
  });
});

describe('withLookup', () => {
  it("sees no shop's rows", async () => {
    expect(await withLookup(database.db, (trx) => trx('notes').select())).toEqual([]);
  });
});

describe('asOwner', () => {
  it('sees the rows of all shops', async () => {
    const rows = await asOwner(database.db, (trx) => trx('notes').orderBy('text').pluck('text'));
    expect(rows).toEqual(['ours', 'theirs']);
  });
});
