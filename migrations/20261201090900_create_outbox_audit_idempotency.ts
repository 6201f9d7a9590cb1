import type { Knex } from 'knex';

import { belongsTo, byPerson, createTenantTable, protectTenantTable, TIMESTAMP } from './tables/tenant-table';

export async function up(knex: Knex): Promise<void> {
  await createTenantTable(knex, 'outbox', ['select', 'insert'], (t) => {
    t.text('kind').notNullable();
    t.text('to_address').notNullable();
    t.text('subject').notNullable();
    t.text('body').notNullable();
    t.integer('attempts').notNullable().defaultTo(0);
    t.text('last_error');
    t.timestamp('send_after', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
    t.timestamp('sent_at', TIMESTAMP);
    t.timestamp('given_up_at', TIMESTAMP);
    t.check('attempts >= 0', {}, 'outbox_attempts_count_up');
    t.check('sent_at is null or given_up_at is null', {}, 'outbox_one_end');
  });
  await knex.raw(
    'create index outbox_waiting_idx on outbox (send_after) where sent_at is null and given_up_at is null',
  );

  await createTenantTable(knex, 'audit_log', ['select', 'insert'], (t) => {
    byPerson(t, 'audit_log', 'person_id', 'optional');
    belongsTo(t, 'audit_log', 'job_id', 'jobs', 'optional');
    t.text('action').notNullable();
    t.jsonb('data').notNullable().defaultTo('{}');
    t.index(['shop_id', 'job_id', 'created_at', 'id'], 'audit_log_list_idx');
  });

  await createIdempotencyKeys(knex);
}

async function createIdempotencyKeys(knex: Knex): Promise<void> {
  await knex.schema.createTable('idempotency_keys', (t) => {
    t.uuid('shop_id').notNullable().references('id').inTable('shops').withKeyName('idempotency_keys_shop_fkey');
    byPerson(t, 'idempotency_keys', 'person_id');
    t.text('key').notNullable();
    t.specificType('request_hash', 'bytea').notNullable().comment('Of method, path and body');
    t.jsonb('answer').comment('Null only inside the transaction that is making it');
    t.timestamp('created_at', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
    t.primary(['shop_id', 'person_id', 'key'], { constraintName: 'idempotency_keys_pkey' });
    t.index(['created_at'], 'idempotency_keys_age_idx');
    t.check('char_length(key) between 8 and 200', {}, 'idempotency_keys_key_length');
    t.check('octet_length(request_hash) = 32', {}, 'idempotency_keys_request_hash_sha256');
  });
  await protectTenantTable(knex, 'idempotency_keys', ['select', 'insert', 'update (answer)'], 'shop_id');
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('idempotency_keys');
  await knex.schema.dropTable('audit_log');
  await knex.schema.dropTable('outbox');
}
