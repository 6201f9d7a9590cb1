import type { Knex } from 'knex';

import { belongsTo, byPerson, createTenantTable, TIMESTAMP } from './tables/tenant-table';

export async function up(knex: Knex): Promise<void> {
  await createRevisions(knex);
  await createChecks(knex);
  await createPhotos(knex);
  await createComments(knex);
}

async function createRevisions(knex: Knex): Promise<void> {
  // What a sheet was printed from never changes: only the act of signing is added later.
  const grants = [
    'select',
    'insert',
    'update (signed_off_by, signed_off_at, sent_back_by, sent_back_at, sent_back_note)',
  ];
  await createTenantTable(knex, 'revisions', grants, (t) => {
    belongsTo(t, 'revisions', 'job_id', 'jobs');
    t.integer('number').notNullable();
    t.integer('layout_seq').notNullable().comment('Edits in the layout when it was frozen');
    t.jsonb('doc').notNullable().comment('The layout');
    t.jsonb('settings').notNullable().comment('The shop settings');
    t.jsonb('nest').comment('The nest result the plan was made with');
    t.jsonb('plan').notNullable().comment('geometry/plan/types.ts');
    t.text('engine').notNullable();
    t.specificType('sha256', 'bytea')
      .notNullable()
      .comment('Of doc, settings, nest, plan and engine as canonical JSON');
    t.text('note').notNullable().defaultTo('');
    byPerson(t, 'revisions', 'person_id');
    byPerson(t, 'revisions', 'signed_off_by', 'optional');
    t.timestamp('signed_off_at', TIMESTAMP);
    byPerson(t, 'revisions', 'sent_back_by', 'optional');
    t.timestamp('sent_back_at', TIMESTAMP);
    t.text('sent_back_note').notNullable().defaultTo('');
    t.unique(['shop_id', 'job_id', 'number'], { indexName: 'revisions_number_key' });
    t.check('number > 0', {}, 'revisions_number_positive');
    t.check('octet_length(sha256) = 32', {}, 'revisions_sha256_length');
    t.check('(signed_off_at is null) = (signed_off_by is null)', {}, 'revisions_signed_off_by_somebody');
    t.check('(sent_back_at is null) = (sent_back_by is null)', {}, 'revisions_sent_back_by_somebody');
    t.check('signed_off_at is null or sent_back_at is null', {}, 'revisions_one_verdict');
  });
}

async function createChecks(knex: Knex): Promise<void> {
  await createTenantTable(
    knex,
    'checks',
    ['select', 'insert', 'update (verdict, note, person_id, updated_at)'],
    (t) => {
      belongsTo(t, 'checks', 'revision_id', 'revisions');
      t.text('kind').notNullable();
      t.text('subject').notNullable().comment('Key of the joint, seam or piece within the plan');
      t.text('verdict').notNullable();
      t.text('note').notNullable().defaultTo('');
      byPerson(t, 'checks', 'person_id');
      t.timestamp('updated_at', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
      t.unique(['shop_id', 'revision_id', 'kind', 'subject'], { indexName: 'checks_subject_key' });
      t.check("kind in ('joint', 'seam', 'grain')", {}, 'checks_kind_known');
      t.check("verdict in ('accepted', 'questioned')", {}, 'checks_verdict_known');
      t.check("verdict = 'accepted' or note <> ''", {}, 'checks_question_has_words');
    },
  );
}

async function createPhotos(knex: Knex): Promise<void> {
  await createTenantTable(knex, 'photos', ['select', 'insert', 'update (caption, place, removed_at)'], (t) => {
    belongsTo(t, 'photos', 'job_id', 'jobs');
    t.text('storage_key').notNullable();
    t.text('media_type').notNullable();
    t.integer('bytes').notNullable();
    t.integer('width_px').notNullable();
    t.integer('height_px').notNullable();
    t.specificType('sha256', 'bytea').notNullable();
    t.text('caption').notNullable().defaultTo('');
    t.jsonb('place').comment('Wall or point of the room it shows');
    byPerson(t, 'photos', 'person_id');
    t.timestamp('removed_at', TIMESTAMP);
    t.unique(['shop_id', 'storage_key'], { indexName: 'photos_storage_key_key' });
    t.check("media_type in ('image/jpeg', 'image/png', 'image/webp')", {}, 'photos_media_type_known');
    t.check('bytes > 0 and width_px > 0 and height_px > 0', {}, 'photos_sizes_positive');
    t.check('octet_length(sha256) = 32', {}, 'photos_sha256_length');
  });
}

async function createComments(knex: Knex): Promise<void> {
  await createTenantTable(knex, 'comments', ['select', 'insert', 'update (removed_at)'], (t) => {
    belongsTo(t, 'comments', 'job_id', 'jobs');
    belongsTo(t, 'comments', 'revision_id', 'revisions', 'optional');
    belongsTo(t, 'comments', 'photo_id', 'photos', 'optional');
    t.text('body').notNullable();
    t.jsonb('about').comment('Wall, piece, joint, seam or cutout it speaks of');
    byPerson(t, 'comments', 'person_id', 'optional');
    t.text('customer_name').comment('Typed by a customer, who has no account');
    t.timestamp('removed_at', TIMESTAMP);
    t.index(['shop_id', 'job_id', 'created_at', 'id'], 'comments_list_idx');
    t.check("body <> ''", {}, 'comments_body_given');
    t.check('(person_id is null) <> (customer_name is null)', {}, 'comments_one_author');
  });
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('comments');
  await knex.schema.dropTable('photos');
  await knex.schema.dropTable('checks');
  await knex.schema.dropTable('revisions');
}
