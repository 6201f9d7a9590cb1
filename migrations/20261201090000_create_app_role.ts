import type { Knex } from 'knex';

import { APP_ROLE } from './tables/tenant-table';

export async function up(knex: Knex): Promise<void> {
  // Roles belong to the whole cluster: another database of it may have made this one already, or be making it now.
  await knex.raw(`
    do $$
    begin
      create role ${APP_ROLE} nologin nosuperuser nobypassrls nocreatedb nocreaterole noinherit;
    exception when duplicate_object or unique_violation then null;
    end
    $$;
    grant ${APP_ROLE} to current_user;
    grant usage on schema public to ${APP_ROLE};
  `);
}

export async function down(knex: Knex): Promise<void> {
  // The role itself stays, since other databases of the cluster may use it.
  await knex.raw(`revoke usage on schema public from ${APP_ROLE}`);
}
