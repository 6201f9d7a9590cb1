import type { Knex } from 'knex';

import { belongsTo, byPerson, createTenantTable, TIMESTAMP } from './tables/tenant-table';

/** What was done of the order of work. Rows are only added: undoing is a row too, so who ticked what stays readable. */
export async function up(knex: Knex): Promise<void> {
  await createTenantTable(knex, 'work_acts', ['select', 'insert'], (t) => {
    belongsTo(t, 'work_acts', 'job_id', 'jobs');
    t.text('step').notNullable().comment('Name of the step in the plan, or id of an added one');
    t.text('act').notNullable();
    t.timestamp('acted_at', TIMESTAMP).notNullable().comment('By the clock of the server');
    t.specificType('wait_hours', 'double precision').notNullable().defaultTo(0);
    byPerson(t, 'work_acts', 'person_id');
    t.index(['shop_id', 'job_id', 'acted_at', 'created_at'], 'work_acts_order_idx');
    t.check("act in ('start', 'done', 'undo')", {}, 'work_acts_act_known');
    t.check("step <> ''", {}, 'work_acts_step_given');
    t.check('wait_hours >= 0', {}, 'work_acts_wait_not_negative');
  });
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('work_acts');
}
