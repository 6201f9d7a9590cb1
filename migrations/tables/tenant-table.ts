import type { Knex } from 'knex';

/** The role of a request's transaction. It owns nothing and bypasses nothing. */
export const APP_ROLE = 'offsquare_app';

/** What the request role may do with a table, as in a GRANT: `select`, `insert`, `update (signed_off_at)`, `delete`. */
export type Grants = readonly string[];

/** Timestamps keep milliseconds, as JavaScript does, so that one read back as a paging key finds its own row. */
export const TIMESTAMP = { useTz: true, precision: 3 } as const;

/**
 * Creates a table whose rows belong to a shop, with row-level security on from the start: key `id`, `shop_id`,
 * `created_at` and the columns that `columns` adds.
 */
export async function createTenantTable(
  knex: Knex,
  table: string,
  grants: Grants,
  columns: (t: Knex.CreateTableBuilder) => void,
): Promise<void> {
  await knex.schema.createTable(table, (t) => {
    t.uuid('id')
      .primary({ constraintName: `${table}_pkey` })
      .defaultTo(knex.raw('gen_random_uuid()'));
    t.uuid('shop_id').notNullable().references('id').inTable('shops').withKeyName(`${table}_shop_fkey`);
    t.timestamp('created_at', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
    columns(t);
    // Children point at both columns, so no row can hang on another shop's parent.
    t.unique(['shop_id', 'id'], { indexName: `${table}_shop_id_id_key` });
  });
  await protectTenantTable(knex, table, grants, 'shop_id');
}

/**
 * Turns row-level security on: the request role reaches only rows whose `shopColumn` is `app.shop_id`, and none while
 * that is unset. The owner, who migrates, seeds and sweeps, keeps access by a policy of its own, so that it needs no
 * superuser; whoever else comes to own the table gets nothing.
 */
export async function protectTenantTable(knex: Knex, table: string, grants: Grants, shopColumn: string): Promise<void> {
  const own = `${shopColumn} = nullif(current_setting('app.shop_id', true), '')::uuid`;
  await knex.raw(`
    alter table ${table} enable row level security;
    alter table ${table} force row level security;
    create policy ${table}_tenant on ${table} to ${APP_ROLE} using (${own}) with check (${own});
    create policy ${table}_owner on ${table} to current_user using (true) with check (true);
    grant ${grants.join(', ')} on ${table} to ${APP_ROLE};
  `);
}

/** Adds `column`, a reference to a row of the same shop in `table`, with the index that PostgreSQL does not make. */
export function belongsTo(
  t: Knex.CreateTableBuilder,
  owner: string,
  column: string,
  table: string,
  need: 'required' | 'optional' = 'required',
): void {
  if (need === 'required') t.uuid(column).notNullable();
  else t.uuid(column);
  t.foreign(['shop_id', column], `${owner}_${column}_fkey`).references(['shop_id', 'id']).inTable(table);
  t.index(['shop_id', column], `${owner}_${column}_idx`);
}

/** Adds `column`, a person who is or was in the shop's crew. */
export function byPerson(
  t: Knex.CreateTableBuilder,
  owner: string,
  column: string,
  need: 'required' | 'optional' = 'required',
): void {
  if (need === 'required') t.uuid(column).notNullable();
  else t.uuid(column);
  t.foreign(['shop_id', column], `${owner}_${column}_fkey`).references(['shop_id', 'person_id']).inTable('memberships');
  t.index(['shop_id', column], `${owner}_${column}_idx`);
}
