import { freshDatabase, type TestDatabase } from '@/tests/helpers/database';

let database: TestDatabase;

beforeAll(async () => {
  database = await freshDatabase();
});

afterAll(() => database.drop());

async function valueOf(expression: string): Promise<unknown> {
  const { rows } = await database.db.raw<{ rows: { value: unknown }[] }>(`select ${expression} as value`);
  return rows[0]?.value;
}

describe('connect', () => {
  it('gives numeric and bigint columns as numbers', async () => {
    expect(await valueOf('96.25::numeric')).toBe(96.25);
    expect(await valueOf('75800::bigint')).toBe(75800);
    expect(await valueOf('(select sum(x) from (values (1), (2)) as t(x))')).toBe(3);
  });

  it('refuses a whole number that a double cannot carry instead of rounding it', async () => {
    await expect(valueOf('9007199254740993::bigint')).rejects.toThrow('9007199254740993');
  });

  it('gives timestamps as dates and jsonb as values', async () => {
    expect(await valueOf(`'2026-03-01T10:00:00Z'::timestamptz`)).toEqual(new Date('2026-03-01T10:00:00Z'));
    expect(await valueOf(`'{"a":[1,2.5]}'::jsonb`)).toEqual({ a: [1, 2.5] });
  });
});
