import type { Knex } from 'knex';

import { byPerson, createTenantTable, TIMESTAMP } from './tables/tenant-table';

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('sign_ins', (t) => {
    t.uuid('id').primary({ constraintName: 'sign_ins_pkey' }).defaultTo(knex.raw('gen_random_uuid()'));
    t.uuid('person_id').notNullable().references('id').inTable('people').withKeyName('sign_ins_person_fkey');
    t.uuid('shop_id').references('id').inTable('shops').withKeyName('sign_ins_shop_fkey');
    t.text('purpose').notNullable();
    t.uuid('family').notNullable().comment('One for all tokens that follow from one sign-in');
    t.specificType('token_hash', 'bytea').notNullable().unique({ indexName: 'sign_ins_token_hash_key' });
    t.timestamp('created_at', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
    t.timestamp('expires_at', TIMESTAMP).notNullable();
    t.timestamp('used_at', TIMESTAMP).comment('When it was exchanged for the next one');
    t.timestamp('revoked_at', TIMESTAMP);
    t.index(['family'], 'sign_ins_family_idx');
    t.index(['person_id'], 'sign_ins_person_idx');
    t.index(['shop_id'], 'sign_ins_shop_idx');
    t.index(['expires_at'], 'sign_ins_expires_idx');
    t.check("purpose in ('session', 'reset')", {}, 'sign_ins_purpose_known');
    t.check("purpose <> 'session' or shop_id is not null", {}, 'sign_ins_session_has_shop');
    t.check('octet_length(token_hash) = 32', {}, 'sign_ins_token_hash_sha256');
  });
  // No grant at all: a request reaches this table through the sign-in functions only.
  await knex.raw('alter table sign_ins enable row level security');

  await createTenantTable(knex, 'invitations', ['select', 'insert', 'update (revoked_at)'], (t) => {
    t.text('email').notNullable();
    t.text('role').notNullable();
    t.specificType('token_hash', 'bytea').notNullable().unique({ indexName: 'invitations_token_hash_key' });
    t.timestamp('expires_at', TIMESTAMP).notNullable();
    t.timestamp('accepted_at', TIMESTAMP);
    t.timestamp('revoked_at', TIMESTAMP);
    byPerson(t, 'invitations', 'invited_by');
    t.check('email = lower(email)', {}, 'invitations_email_lower');
    t.check("role in ('owner', 'designer', 'installer', 'shop_hand')", {}, 'invitations_role_known');
    t.check('octet_length(token_hash) = 32', {}, 'invitations_token_hash_sha256');
  });
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('invitations');
  await knex.schema.dropTable('sign_ins');
}
