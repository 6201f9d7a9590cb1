import type { Knex } from 'knex';

import { APP_ROLE, protectTenantTable, TIMESTAMP } from './tables/tenant-table';

export async function up(knex: Knex): Promise<void> {
  await createShops(knex);
  await createPeople(knex);
  await createMemberships(knex);

  await protectTenantTable(
    knex,
    'shops',
    ['select', 'update (name, currency, units, step, settings, letterhead, next_job_number, updated_at)'],
    'id',
  );
  await protectTenantTable(knex, 'memberships', ['select', 'update (role, left_at)'], 'shop_id');
  await protectPeople(knex);
}

async function createShops(knex: Knex): Promise<void> {
  await knex.schema.createTable('shops', (t) => {
    t.uuid('id').primary({ constraintName: 'shops_pkey' }).defaultTo(knex.raw('gen_random_uuid()'));
    t.text('name').notNullable();
    t.text('currency').notNullable().defaultTo('USD').comment('ISO 4217; every price of the shop is in it');
    t.text('units').notNullable().defaultTo('in');
    t.text('step').notNullable().defaultTo('1/16');
    t.jsonb('settings').notNullable().comment('geometry/core/settings.ts');
    t.jsonb('letterhead').notNullable().defaultTo('{}');
    t.integer('next_job_number').notNullable().defaultTo(1);
    t.timestamp('created_at', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
    t.timestamp('updated_at', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
    t.check("name <> ''", {}, 'shops_name_given');
    t.check("currency ~ '^[A-Z]{3}$'", {}, 'shops_currency_iso');
    t.check("units in ('in', 'mm')", {}, 'shops_units_known');
    t.check("step in ('1/16', '1/32', '1 mm', '0.5 mm')", {}, 'shops_step_known');
    t.check('next_job_number > 0', {}, 'shops_next_job_number_positive');
  });
}

async function createPeople(knex: Knex): Promise<void> {
  await knex.schema.createTable('people', (t) => {
    t.uuid('id').primary({ constraintName: 'people_pkey' }).defaultTo(knex.raw('gen_random_uuid()'));
    t.text('email').notNullable().unique({ indexName: 'people_email_key' });
    t.text('name').notNullable();
    t.text('password_hash').notNullable();
    t.timestamp('created_at', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
    t.check('email = lower(email)', {}, 'people_email_lower');
    t.check("email like '%_@_%'", {}, 'people_email_shape');
    t.check("name <> ''", {}, 'people_name_given');
  });
}

async function createMemberships(knex: Knex): Promise<void> {
  await knex.schema.createTable('memberships', (t) => {
    t.uuid('shop_id').notNullable().references('id').inTable('shops').withKeyName('memberships_shop_fkey');
    t.uuid('person_id').notNullable().references('id').inTable('people').withKeyName('memberships_person_fkey');
    t.text('role').notNullable();
    t.timestamp('created_at', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
    t.timestamp('left_at', TIMESTAMP).comment('Set instead of deleting: what the person did stays theirs');
    t.primary(['shop_id', 'person_id'], { constraintName: 'memberships_pkey' });
    t.index(['person_id'], 'memberships_person_idx');
    t.check("role in ('owner', 'designer', 'installer', 'shop_hand')", {}, 'memberships_role_known');
  });
}

/** Crew see each other's name and address; nobody reads a password hash but the sign-in functions. */
async function protectPeople(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table people enable row level security;
    alter table people force row level security;
    create policy people_crew on people for select to ${APP_ROLE}
      using (exists (select from memberships m where m.person_id = people.id));
    create policy people_self on people for update to ${APP_ROLE}
      using (id = nullif(current_setting('app.person_id', true), '')::uuid);
    create policy people_owner on people to current_user using (true) with check (true);
    grant select (id, email, name, created_at), update (name) on people to ${APP_ROLE};
  `);
}

export async function down(knex: Knex): Promise<void> {
  // The policy on people reads memberships.
  await knex.raw('drop policy people_crew on people');
  await knex.schema.dropTable('memberships');
  await knex.schema.dropTable('people');
  await knex.schema.dropTable('shops');
}
