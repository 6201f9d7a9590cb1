import type { Knex } from 'knex';

import { asOwner } from '../db/tenant-transaction';
import type { MailTransport } from '../mail/mail-transport';
import { markFailed, markSent, takeWaitingMail } from '../repositories/outbox-repository';

const AT_ONCE = 10;
/** Wait after each failed try, seconds: a minute, ten, an hour, six hours; then the mail is given up. */
const WAITS_SECONDS = [60, 600, 3600, 21_600] as const;

/**
 * Sends mail that is due. Several processes may do this at once: each one takes mails that no other holds.
 *
 * @returns how many were sent and how many failed
 */
export function deliverMail(db: Knex, transport: MailTransport): Promise<{ sent: number; failed: number }> {
  return asOwner(db, async (trx) => {
    const result = { sent: 0, failed: 0 };
    for (const mail of await takeWaitingMail(trx, AT_ONCE)) {
      const failure = await transport.send(mail).then(
        () => null,
        (error: unknown) => error,
      );
      if (failure === null) {
        await markSent(trx, mail.id, transport.forgets);
        result.sent++;
      } else {
        await markFailed(trx, mail.id, reasonOf(failure), WAITS_SECONDS[mail.attempts] ?? null);
        result.failed++;
      }
    }
    return result;
  });
}

/** A code such as ECONNREFUSED or EAUTH; the message may hold the address it went to. */
function reasonOf(failure: unknown): string {
  const { code } = failure as { readonly code?: unknown };
  return typeof code === 'string' ? code : 'unknown';
}
