import type { Knex } from 'knex';

import { belongsTo, byPerson, createTenantTable, TIMESTAMP } from './tables/tenant-table';

export async function up(knex: Knex): Promise<void> {
  await createTenantTable(knex, 'reservations', ['select', 'insert', 'update (released_at)'], (t) => {
    belongsTo(t, 'reservations', 'rack_piece_id', 'rack_pieces');
    belongsTo(t, 'reservations', 'job_id', 'jobs');
    byPerson(t, 'reservations', 'person_id');
    t.timestamp('released_at', TIMESTAMP);
  });
  // Two jobs cannot hold one piece.
  await knex.raw(
    'create unique index reservations_one_job_key on reservations (shop_id, rack_piece_id) where released_at is null',
  );

  await createTenantTable(knex, 'cut_marks', ['select', 'insert', 'delete'], (t) => {
    belongsTo(t, 'cut_marks', 'revision_id', 'revisions');
    t.integer('slab').notNullable().comment('Page of the cut sheet');
    t.integer('cut').notNullable().comment('Number of the cut on that page');
    byPerson(t, 'cut_marks', 'person_id');
    t.unique(['shop_id', 'revision_id', 'slab', 'cut'], { indexName: 'cut_marks_cut_key' });
    t.check('slab > 0 and cut > 0', {}, 'cut_marks_numbers_positive');
  });

  await createTenantTable(knex, 'glue_ups', ['select', 'insert', 'update (ended_at)'], (t) => {
    belongsTo(t, 'glue_ups', 'revision_id', 'revisions');
    t.text('joint').notNullable().comment('Key of the joint or seam within the plan');
    t.timestamp('cured_at', TIMESTAMP).notNullable();
    t.timestamp('ended_at', TIMESTAMP);
    byPerson(t, 'glue_ups', 'person_id');
    t.check('cured_at > created_at', {}, 'glue_ups_cure_takes_time');
  });
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('glue_ups');
  await knex.schema.dropTable('cut_marks');
  await knex.schema.dropTable('reservations');
}
