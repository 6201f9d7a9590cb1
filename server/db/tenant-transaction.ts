import type { Knex } from 'knex';

/** Owns nothing and passes no row-level policy by itself; made by the first migration. */
const APP_ROLE = 'offsquare_app';

/** Whose request a transaction serves. */
export interface Tenant {
  readonly shopId: string;
  readonly personId: string;
  /** As in the membership; policies may read it as `app.role`. */
  readonly role: string;
}

/**
 * Runs `work` in a transaction that sees the rows of one shop only: it acts as a role that owns nothing, with
 * `app.shop_id`, `app.person_id` and `app.role` set until the transaction ends.
 *
 * @returns what `work` gives; when `work` throws, everything is rolled back and the error goes on
 */
export function withTenant<T>(db: Knex, tenant: Tenant, work: (trx: Knex.Transaction) => Promise<T>): Promise<T> {
  return db.transaction(async (trx) => {
    await actAs(trx, tenant);
    return work(trx);
  });
}

/**
 * Runs `work` in a transaction that sees no shop's rows at all. What a sign-in, an invitation or a customer's link
 * needs before a shop is known comes from the narrow security-definer functions that the same role may call.
 */
export function withLookup<T>(db: Knex, work: (trx: Knex.Transaction) => Promise<T>): Promise<T> {
  return withTenant(db, { shopId: '', personId: '', role: '' }, work);
}

/**
 * Runs `work` in a transaction with the rights of the database's owner, past row-level security. For seeds and
 * housekeeping over all shops; a request never gets here.
 */
export function asOwner<T>(db: Knex, work: (trx: Knex.Transaction) => Promise<T>): Promise<T> {
  return db.transaction(work);
}

async function actAs(trx: Knex.Transaction, tenant: Tenant): Promise<void> {
  // Setting `role` is what `set local role` does; one statement saves a round trip in every request.
  await trx.raw(
    `select set_config('app.shop_id', ?, true), set_config('app.person_id', ?, true), set_config('app.role', ?, true),
            set_config('role', ?, true)`,
    [tenant.shopId, tenant.personId, tenant.role, APP_ROLE],
  );
}
