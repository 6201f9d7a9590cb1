import type { Knex } from 'knex';

import { createLookupFunction } from './tables/lookup-function';

export async function up(knex: Knex): Promise<void> {
  await createLookupFunction(
    knex,
    'find_share_link(p_token_hash bytea)',
    'table (id uuid, shop_id uuid, revision_id uuid, expires_at timestamptz)',
    `begin
       return query
         select l.id, l.shop_id, l.revision_id, l.expires_at from share_links l
         where l.token_hash = p_token_hash and l.revoked_at is null and l.expires_at > now();
     end`,
  );
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop function find_share_link(bytea)');
}
