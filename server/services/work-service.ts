import type { Knex } from 'knex';

import type { ParsedBody, ResponseOf } from '@/shared/contracts/contract';
import type { getWork, postWork } from '@/shared/contracts/work';
import { marksAfter } from '@/shared/work/work-marks';
import { findJob } from '../repositories/job-repository';
import { insertWorkActs, listWorkActs } from '../repositories/work-repository';
import type { Actor } from './actor';
import { announce } from './event-hub';
import { inShop } from './in-shop';
import { noSuchJob } from './job-service';

/** What was begun and ticked of the order of work, by whom and when. */
export class WorkService {
  constructor(
    private readonly db: Knex,
    private readonly now: () => number = Date.now,
  ) {}

  /** @throws ProblemError not_found */
  get(actor: Actor, jobId: string): Promise<ResponseOf<typeof getWork>> {
    return inShop(this.db, actor, 'job.see', async (trx) => {
      if (!(await findJob(trx, jobId))) throw noSuchJob();
      return marksOf(trx, jobId);
    });
  }

  /**
   * Keeps what was done, also hours ago without signal. A deed is dated by how long ago it was when it was sent, so that a
   * device whose clock is wrong sets no wrong time; it is never dated in the future.
   *
   * @throws ProblemError not_found
   */
  post(
    actor: Actor,
    jobId: string,
    { sentAt, acts }: ParsedBody<typeof postWork>,
  ): Promise<ResponseOf<typeof getWork>> {
    const behind = this.now() - Date.parse(sentAt);
    return inShop(this.db, actor, 'work.tick', async (trx) => {
      if (!(await findJob(trx, jobId))) throw noSuchJob();
      const dated = acts.map((act) => ({
        ...act,
        at: new Date(Math.min(Date.parse(act.at), Date.parse(sentAt)) + behind).toISOString(),
      }));
      const added = await insertWorkActs(trx, { shopId: actor.shopId, personId: actor.personId, jobId }, dated);
      if (added > 0) await announce(trx, actor.shopId, { kind: 'work', jobId });
      return marksOf(trx, jobId);
    });
  }
}

async function marksOf(trx: Knex.Transaction, jobId: string): Promise<ResponseOf<typeof getWork>> {
  return { marks: Object.values(marksAfter(await listWorkActs(trx, jobId))) };
}
