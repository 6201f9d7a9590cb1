import type { Knex } from 'knex';

/** True when the database answers and its tables are there. */
export async function databaseAnswers(db: Knex): Promise<boolean> {
  try {
    await db.raw('select 1 from shops limit 0');
    return true;
  } catch {
    return false;
  }
}
