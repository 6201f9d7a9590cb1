import type { Knex } from 'knex';
import type { Logger } from 'pino';

import type { Config } from '../config';
import { asOwner } from '../db/tenant-transaction';
import { loggable } from '../http/loggable';
import { outboxOnlyTransport, smtpTransport } from '../mail/mail-transport';
import { sweep } from '../repositories/sweep-repository';
import { deliverMail } from './deliver-mail';

const MAIL_EVERY_MS = 3_000;
const SWEEP_EVERY_MS = 3_600_000;

export interface Work {
  /** Starts nothing new and waits for what is under way. */
  stop(): Promise<void>;
}

/** Does what no request waits for: sends mail, sweeps up what has run out. */
export function startWork({ config, db, log }: { config: Config; db: Knex; log: Logger }): Work {
  const transport = config.smtpUrl
    ? smtpTransport(config.smtpUrl, config.mailFrom ?? senderAt(config.publicUrl))
    : outboxOnlyTransport();
  const jobs = [
    repeat('mail', MAIL_EVERY_MS, log, () => deliverMail(db, transport)),
    repeat('sweep', SWEEP_EVERY_MS, log, () => asOwner(db, sweep)),
  ];
  return {
    async stop() {
      await Promise.all(jobs.map((job) => job.stop()));
    },
  };
}

function senderAt(publicUrl: string): string {
  return `Offsquare <no-reply@${new URL(publicUrl).hostname}>`;
}

function repeat(name: string, everyMs: number, log: Logger, work: () => Promise<object>): Work {
  let underWay: Promise<void> | null = null;
  const timer = setInterval(() => {
    underWay ??= work()
      .then((done) => log.debug({ work: name, ...done }, 'work done'))
      // The next turn tries again: a database that is away for a minute must not end the server.
      .catch((error: unknown) => log.error({ work: name, failure: loggable(error) }, 'work failed'))
      .finally(() => {
        underWay = null;
      });
  }, everyMs);
  timer.unref();
  return {
    async stop() {
      clearInterval(timer);
      await underWay;
    },
  };
}
