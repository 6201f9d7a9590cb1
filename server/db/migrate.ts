import path from 'node:path';

import type { Knex } from 'knex';

const ROOT = path.resolve(__dirname, '../..');

export const MIGRATIONS: Knex.MigratorConfig = {
  directory: path.join(ROOT, 'migrations'),
  extension: 'ts',
  loadExtensions: ['.ts'],
};

export const SEEDS: Knex.SeederConfig = {
  directory: path.join(ROOT, 'seeds'),
  extension: 'ts',
  loadExtensions: ['.ts'],
};

/**
 * Brings the database to the newest schema.
 *
 * @returns file names of the migrations that were applied now; none when it was up to date
 */
export async function migrate(db: Knex): Promise<readonly string[]> {
  const [, applied] = (await db.migrate.latest(MIGRATIONS)) as [number, string[]];
  return applied;
}

/**
 * Fills a database that has no shop with the demo shop.
 *
 * @returns true when it was filled now
 */
export async function seedWhenEmpty(db: Knex): Promise<boolean> {
  const shop = await db('shops').first('id');
  if (shop) return false;
  await db.seed.run(SEEDS);
  return true;
}
