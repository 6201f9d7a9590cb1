import type { Knex } from 'knex';

import { belongsTo, byPerson, createTenantTable, protectTenantTable, TIMESTAMP } from './tables/tenant-table';

export async function up(knex: Knex): Promise<void> {
  await createJobs(knex);
  await createLayouts(knex);
  await createLayoutEdits(knex);
}

async function createJobs(knex: Knex): Promise<void> {
  await createTenantTable(knex, 'jobs', ['select', 'insert', 'update'], (t) => {
    t.integer('number').notNullable().comment('Counts within the shop; written on paper');
    t.text('name').notNullable();
    t.text('customer_name').notNullable().defaultTo('');
    t.text('customer_email').notNullable().defaultTo('');
    t.text('customer_phone').notNullable().defaultTo('');
    t.text('site_address').notNullable().defaultTo('');
    t.text('stage').notNullable().defaultTo('new');
    t.timestamp('sent_for_check_at', TIMESTAMP);
    t.date('measure_on');
    t.date('cut_on');
    t.date('fit_on');
    byPerson(t, 'jobs', 'installer_id', 'optional');
    byPerson(t, 'jobs', 'designer_id', 'optional');
    byPerson(t, 'jobs', 'shop_hand_id', 'optional');
    t.timestamp('updated_at', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
    t.timestamp('archived_at', TIMESTAMP);
    t.unique(['shop_id', 'number'], { indexName: 'jobs_shop_id_number_key' });
    // The list's order and its paging key.
    t.index(['shop_id', 'updated_at', 'id'], 'jobs_list_idx');
    t.check('number > 0', {}, 'jobs_number_positive');
    t.check("name <> ''", {}, 'jobs_name_given');
    t.check("stage in ('new', 'measured', 'drawn', 'signed_off', 'cut', 'fitted')", {}, 'jobs_stage_known');
  });
}

async function createLayouts(knex: Knex): Promise<void> {
  const columns = ['select', 'insert', 'update (doc, seq, thumbnail, updated_at)'];
  await createTenantTable(knex, 'layouts', columns, (t) => {
    belongsTo(t, 'layouts', 'job_id', 'jobs');
    t.jsonb('doc').notNullable().comment('shared/layout/layout-schema.ts');
    t.integer('seq').notNullable().defaultTo(0).comment('Edits applied so far');
    t.jsonb('thumbnail').comment('Outlines for the jobs list, inches');
    t.timestamp('updated_at', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
    t.unique(['shop_id', 'job_id'], { indexName: 'layouts_job_key' });
    t.check('seq >= 0', {}, 'layouts_seq_counts_up');
    t.check("jsonb_typeof(doc) = 'object'", {}, 'layouts_doc_object');
  });
}

async function createLayoutEdits(knex: Knex): Promise<void> {
  await knex.schema.createTable('layout_edits', (t) => {
    t.uuid('layout_id').notNullable();
    t.uuid('id').notNullable().comment('Made by the client, so that sending again does no harm');
    t.uuid('shop_id').notNullable().references('id').inTable('shops').withKeyName('layout_edits_shop_fkey');
    t.integer('seq').notNullable();
    t.jsonb('edit').notNullable().comment('shared/layout/edit-schema.ts');
    byPerson(t, 'layout_edits', 'person_id');
    t.timestamp('created_at', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
    t.primary(['layout_id', 'id'], { constraintName: 'layout_edits_pkey' });
    // Serves 'what others did since' as well.
    t.unique(['layout_id', 'seq'], { indexName: 'layout_edits_seq_key' });
    t.foreign(['shop_id', 'layout_id'], 'layout_edits_layout_fkey').references(['shop_id', 'id']).inTable('layouts');
    t.index(['shop_id', 'layout_id'], 'layout_edits_layout_idx');
    t.check('seq > 0', {}, 'layout_edits_seq_positive');
  });
  // An edit log is never rewritten: no update, no delete.
  await protectTenantTable(knex, 'layout_edits', ['select', 'insert'], 'shop_id');
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('layout_edits');
  await knex.schema.dropTable('layouts');
  await knex.schema.dropTable('jobs');
}
