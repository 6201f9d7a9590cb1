import type { Knex } from 'knex';

export interface Mail {
  readonly shopId: string;
  /** What it is for: `reset`, `invitation`. */
  readonly kind: string;
  readonly to: string;
  readonly subject: string;
  readonly body: string;
}

export interface WaitingMail extends Mail {
  readonly id: string;
  readonly attempts: number;
}

/** Puts a mail into the outbox, in the transaction of what it is about: either both happen or neither. */
export async function addMail(trx: Knex.Transaction, mail: Mail): Promise<void> {
  await trx('outbox').insert({
    shop_id: mail.shopId,
    kind: mail.kind,
    to_address: mail.to,
    subject: mail.subject,
    body: mail.body,
  });
}

/** Locks mails that are due, of all shops; those that another process holds are passed over. Owner's rights. */
export async function takeWaitingMail(trx: Knex.Transaction, limit: number): Promise<WaitingMail[]> {
  return trx('outbox')
    .whereNull('sent_at')
    .whereNull('given_up_at')
    .where('send_after', '<=', trx.fn.now())
    .orderBy('send_after')
    .limit(limit)
    .forUpdate()
    .skipLocked()
    .select<WaitingMail[]>('id', 'shop_id as shopId', 'kind', 'to_address as to', 'subject', 'body', 'attempts');
}

/** @param forget - wipe what was sent */
export async function markSent(trx: Knex.Transaction, id: string, forget: boolean): Promise<void> {
  const wiped = forget ? { body: '' } : {};
  await trx('outbox')
    .where({ id })
    .increment('attempts', 1)
    .update({ sent_at: trx.fn.now(3), last_error: null, ...wiped });
}

/** Notes a failed try: again after `waitSeconds`, or never when null. */
export async function markFailed(
  trx: Knex.Transaction,
  id: string,
  reason: string,
  waitSeconds: number | null,
): Promise<void> {
  const next =
    waitSeconds === null
      ? { given_up_at: trx.fn.now(3) }
      : { send_after: trx.raw('now() + make_interval(secs => ?)', [waitSeconds]) };
  await trx('outbox')
    .where({ id })
    .increment('attempts', 1)
    .update({ last_error: reason, ...next });
}
