import type { Knex } from 'knex';

import { APP_ROLE } from './tenant-table';

/**
 * Creates a function that the request role may call before a shop is known. It runs with the owner's rights, so each
 * one answers a single question about a single token or address and nothing more.
 *
 * @param signature - `name(argument type, …)`
 * @param returns - the RETURNS clause
 * @param body - PL/pgSQL from DECLARE or BEGIN to END
 */
export async function createLookupFunction(
  knex: Knex,
  signature: string,
  returns: string,
  body: string,
): Promise<void> {
  // Column names win over output names of the same spelling; pg_temp last, so that no temporary table is taken for ours.
  await knex.raw(`
    create function ${signature} returns ${returns}
    language plpgsql security definer set search_path = public, pg_temp
    as $body$
    #variable_conflict use_column
    ${body}
    $body$
  `);
  const named = signature.replace(/\s+/g, ' ');
  await knex.raw(`revoke all on function ${withoutNames(named)} from public`);
  await knex.raw(`grant execute on function ${withoutNames(named)} to ${APP_ROLE}`);
}

/** `f(p_id uuid, p_at timestamptz)` to `f(uuid, timestamptz)`, as GRANT wants it. */
function withoutNames(signature: string): string {
  const open = signature.indexOf('(');
  const types = signature
    .slice(open + 1, -1)
    .split(',')
    .map((argument) => argument.trim().replace(/^\S+\s+/, ''))
    .filter((type) => type !== '');
  return `${signature.slice(0, open)}(${types.join(', ')})`;
}
