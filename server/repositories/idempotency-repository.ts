import type { Knex } from 'knex';

interface Whose {
  readonly shopId: string;
  readonly personId: string;
}

interface Request {
  readonly key: string;
  readonly requestHash: Buffer;
}

export type Claim =
  | { readonly kind: 'new' }
  | { readonly kind: 'answered'; readonly answer: unknown }
  | { readonly kind: 'other_request' };

/**
 * Claims a key for this request. A second request with the same key waits here until the first one is committed or
 * rolled back, so that two that arrive together still make one thing.
 */
export async function claimKey(trx: Knex.Transaction, whose: Whose, request: Request): Promise<Claim> {
  const claimed = await trx('idempotency_keys')
    .insert({
      shop_id: whose.shopId,
      person_id: whose.personId,
      key: request.key,
      request_hash: request.requestHash,
    })
    .onConflict(['shop_id', 'person_id', 'key'])
    .ignore()
    .returning('key');
  if (claimed.length > 0) return { kind: 'new' };

  const earlier = await trx('idempotency_keys')
    .where({ person_id: whose.personId, key: request.key })
    .first<{ request_hash: Buffer; answer: unknown }>('request_hash', 'answer');
  if (!earlier?.request_hash.equals(request.requestHash)) return { kind: 'other_request' };
  return { kind: 'answered', answer: earlier.answer };
}

/** Stores what the request was answered, in the transaction that did its work. */
export async function keepAnswer(trx: Knex.Transaction, whose: Whose, request: Request, answer: object): Promise<void> {
  await trx('idempotency_keys')
    .where({ person_id: whose.personId, key: request.key })
    .update({ answer: JSON.stringify(answer) });
}
