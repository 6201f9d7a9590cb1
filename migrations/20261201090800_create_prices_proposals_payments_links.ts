import type { Knex } from 'knex';

import { belongsTo, byPerson, createTenantTable, TIMESTAMP } from './tables/tenant-table';

export async function up(knex: Knex): Promise<void> {
  await createTenantTable(knex, 'prices', ['select', 'insert'], (t) => {
    belongsTo(t, 'prices', 'revision_id', 'revisions');
    t.jsonb('lines').notNullable();
    t.bigInteger('total_cents').notNullable();
    t.bigInteger('deposit_cents').notNullable();
    currency(t, 'prices');
    byPerson(t, 'prices', 'person_id');
    t.check('total_cents >= 0', {}, 'prices_total_not_negative');
    t.check('deposit_cents between 0 and total_cents', {}, 'prices_deposit_within_total');
  });

  await createTenantTable(
    knex,
    'proposals',
    ['select', 'insert', 'update (state, choices, approved_name, approved_at, updated_at)'],
    (t) => {
      belongsTo(t, 'proposals', 'price_id', 'prices');
      t.text('state').notNullable().defaultTo('draft');
      t.jsonb('choices').notNullable().defaultTo('{}').comment('Edge and finish the customer picked');
      t.text('approved_name');
      t.timestamp('approved_at', TIMESTAMP);
      byPerson(t, 'proposals', 'person_id');
      t.timestamp('updated_at', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
      t.check("state in ('draft', 'sent', 'approved', 'withdrawn')", {}, 'proposals_state_known');
      t.check(
        "(state = 'approved') = (approved_at is not null and approved_name is not null)",
        {},
        'proposals_approved_by_name',
      );
    },
  );

  await createTenantTable(knex, 'payments', ['select', 'insert', 'update (state, updated_at)'], (t) => {
    belongsTo(t, 'payments', 'proposal_id', 'proposals');
    t.bigInteger('amount_cents').notNullable();
    currency(t, 'payments');
    t.text('state').notNullable().defaultTo('pending');
    t.text('reference').notNullable().comment("The payment service's own number");
    t.timestamp('updated_at', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
    t.unique(['shop_id', 'reference'], { indexName: 'payments_reference_key' });
    t.check('amount_cents > 0', {}, 'payments_amount_positive');
    t.check("state in ('pending', 'paid', 'failed', 'refunded')", {}, 'payments_state_known');
  });

  await createTenantTable(knex, 'share_links', ['select', 'insert', 'update (revoked_at)'], (t) => {
    belongsTo(t, 'share_links', 'revision_id', 'revisions');
    t.specificType('token_hash', 'bytea').notNullable().unique({ indexName: 'share_links_token_hash_key' });
    t.timestamp('expires_at', TIMESTAMP).notNullable();
    t.timestamp('revoked_at', TIMESTAMP);
    byPerson(t, 'share_links', 'person_id');
    t.check('octet_length(token_hash) = 32', {}, 'share_links_token_hash_sha256');
    t.check('expires_at > created_at', {}, 'share_links_expire_later');
  });
}

function currency(t: Knex.CreateTableBuilder, table: string): void {
  t.text('currency').notNullable();
  t.check("currency ~ '^[A-Z]{3}$'", {}, `${table}_currency_iso`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('share_links');
  await knex.schema.dropTable('payments');
  await knex.schema.dropTable('proposals');
  await knex.schema.dropTable('prices');
}
