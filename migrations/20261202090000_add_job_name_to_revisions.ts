import type { Knex } from 'knex';

/** A sheet names its job: the name is frozen with the revision, so that renaming the job changes no printed sheet. */
export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('revisions', (t) => {
    t.text('job_name').notNullable().defaultTo('');
  });
  await knex.raw(
    'update revisions set job_name = j.name from jobs j where j.shop_id = revisions.shop_id and j.id = revisions.job_id',
  );
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('revisions', (t) => {
    t.dropColumn('job_name');
  });
}
