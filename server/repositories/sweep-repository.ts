import type { Knex } from 'knex';

const SIGN_IN_DAYS = 7;
const IDEMPOTENCY_DAYS = 3;

/** Deletes sign-ins that ran out some days ago and keys of requests that nobody sends again. Owner's rights. */
export async function sweep(trx: Knex.Transaction): Promise<{ signIns: number; keys: number }> {
  const signIns = await trx('sign_ins')
    .where('expires_at', '<', trx.raw('now() - make_interval(days => ?)', [SIGN_IN_DAYS]))
    .delete();
  const keys = await trx('idempotency_keys')
    .where('created_at', '<', trx.raw('now() - make_interval(days => ?)', [IDEMPOTENCY_DAYS]))
    .delete();
  return { signIns, keys };
}
