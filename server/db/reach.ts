import type { Knex } from 'knex';

/** The database does not answer; the message is one sentence with the way out, without the password. */
export class DatabaseUnreachableError extends Error {
  override readonly name = 'DatabaseUnreachableError';
}

/**
 * Asks the database for a sign of life.
 *
 * @param databaseUrl - the address `db` was opened with, to be named in the message
 * @throws DatabaseUnreachableError when it is off, refuses the sign-in, or has no such database
 */
export async function reach(db: Knex, databaseUrl: string): Promise<void> {
  try {
    await db.raw('select 1');
  } catch (error) {
    const { host, pathname } = new URL(databaseUrl);
    const code = (error as { code?: string }).code;
    const reason = code ?? (error instanceof Error ? error.message : String(error));
    throw new DatabaseUnreachableError(
      `The database ${pathname.slice(1)} at ${host} cannot be reached (${reason}): check DATABASE_URL and that the server runs, or leave DATABASE_URL out to use one of this program's own.`,
    );
  }
}
