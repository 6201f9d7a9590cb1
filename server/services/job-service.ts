import type { Knex } from 'knex';
import type { Logger } from 'pino';

import type { BodyOf, ParsedQuery } from '@/shared/contracts/contract';
import type {
  Activity,
  createJob,
  Job,
  JobListItem,
  listJobs as listJobsContract,
  updateJob as updateJobContract,
} from '@/shared/contracts/jobs';
import type { Page } from '@/shared/contracts/paging';
import { stageMove, STAGE_NAMES, type Stage } from '@/shared/roles/stages';
import { ProblemError } from '../http/problem-error';
import { listActs, logAct } from '../repositories/audit-repository';
import { findRole } from '../repositories/crew-repository';
import { findJob, insertJob, listJobs, lockJob, updateJob, type JobFields } from '../repositories/job-repository';
import { insertLayout } from '../repositories/layout-repository';
import { takeJobNumber } from '../repositories/shop-repository';
import type { Actor } from './actor';
import { announce } from './event-hub';
import { inShop, inShopOnce, notAllowed } from './in-shop';
import { toJob, toListItem } from './job-view';
import { newLayout } from './new-layout';
import { pageOfRows, readPagingKey } from './paging-key';
import { readShop } from './read-shop';
import { drawThumbnail } from './thumbnail';

type JobChange = BodyOf<typeof updateJobContract>;

/** Jobs: the list, opening one, what is known of it, and its way through the stages. */
export class JobService {
  constructor(
    private readonly db: Knex,
    private readonly log: Logger,
  ) {}

  list(actor: Actor, query: ParsedQuery<typeof listJobsContract>): Promise<Page<JobListItem>> {
    return inShop(this.db, actor, 'job.see', async (trx) => {
      const rows = await listJobs(trx, {
        search: (query.search ?? '').split(/\s+/).filter(Boolean),
        ...(query.stage ? { stage: query.stage } : {}),
        ...(query.person ? { personId: query.person } : {}),
        after: readPagingKey(query.after),
        limit: query.limit + 1,
      });
      return pageOfRows(rows, query.limit, (row) => ({ at: row.updatedAt, id: row.id }), toListItem);
    });
  }

  /** Opens a job with an empty layout that holds the shop's usual choices and its stock. */
  create(actor: Actor, fields: BodyOf<typeof createJob>): Promise<Job> {
    return inShopOnce(this.db, actor, 'job.edit', async (trx) => {
      const shop = await readShop(trx);
      const doc = await newLayout(trx, shop);
      const number = await takeJobNumber(trx, shop.id);
      const jobId = await insertJob(trx, {
        shop_id: shop.id,
        number,
        name: fields.name,
        customer_name: fields.customerName ?? '',
        site_address: fields.siteAddress ?? '',
      });
      await insertLayout(trx, { shopId: shop.id, jobId, doc, thumbnail: drawThumbnail(doc, shop.settings, this.log) });
      return toJob(await this.changed(trx, actor, jobId, 'job.created', { number }));
    });
  }

  /** @throws ProblemError not_found */
  get(actor: Actor, jobId: string): Promise<Job> {
    return inShop(this.db, actor, 'job.see', async (trx) => toJob(await mustFindJob(trx, jobId)));
  }

  /** @throws ProblemError not_found; validation_failed for a person who is not in the crew */
  update(actor: Actor, jobId: string, change: JobChange): Promise<Job> {
    return inShop(this.db, actor, 'job.edit', async (trx) => {
      await mustFindJob(trx, jobId);
      await mustBeCrew(trx, change);
      await updateJob(trx, jobId, toFields(change));
      return toJob(await this.changed(trx, actor, jobId, 'job.changed', { fields: Object.keys(change) }));
    });
  }

  /** @throws ProblemError not_found; not_allowed; stage_refused, with the reason in a sentence */
  moveStage(actor: Actor, jobId: string, to: Stage, note: string): Promise<Job> {
    return inShop(this.db, actor, 'member', async (trx) => {
      const job = await lockJob(trx, jobId);
      if (!job) throw noSuchJob();
      const move = stageMove(actor.role, job.stage, to);
      if (move.kind === 'not_allowed') throw notAllowed(actor);
      if (move.kind === 'refused') throw new ProblemError('stage_refused', move.reason);
      await updateJob(trx, jobId, { stage: to, sent_for_check_at: null });
      const data = { from: job.stage, to, ...(note ? { note } : {}) };
      return toJob(await this.changed(trx, actor, jobId, 'job.stage_moved', data));
    });
  }

  /** @throws ProblemError not_found; stage_refused for a job that is not drawn */
  sendForCheck(actor: Actor, jobId: string): Promise<Job> {
    return inShop(this.db, actor, 'layout.edit', async (trx) => {
      const job = await lockJob(trx, jobId);
      if (!job) throw noSuchJob();
      if (job.stage !== 'drawn') {
        throw new ProblemError(
          'stage_refused',
          `A drawn job is sent for check; this one is in ${STAGE_NAMES[job.stage]}.`,
        );
      }
      await updateJob(trx, jobId, { sent_for_check_at: new Date() });
      return toJob(await this.changed(trx, actor, jobId, 'job.sent_for_check', {}));
    });
  }

  /** @throws ProblemError not_found */
  listActivity(actor: Actor, jobId: string, after: string | undefined, limit: number): Promise<Page<Activity>> {
    return inShop(this.db, actor, 'job.see', async (trx) => {
      await mustFindJob(trx, jobId);
      const rows = await listActs(trx, jobId, readPagingKey(after), limit + 1);
      return pageOfRows(
        rows,
        limit,
        (row) => row,
        (row) => ({ ...row, at: row.at.toISOString() }),
      );
    });
  }

  private async changed(
    trx: Knex.Transaction,
    actor: Actor,
    jobId: string,
    action: string,
    data: Readonly<Record<string, unknown>>,
  ) {
    await logAct(trx, { shopId: actor.shopId, personId: actor.personId, jobId, action, data });
    await announce(trx, actor.shopId, { kind: 'job', jobId });
    return mustFindJob(trx, jobId);
  }
}

/** @throws ProblemError not_found */
export async function mustFindJob(trx: Knex.Transaction, jobId: string) {
  const job = await findJob(trx, jobId);
  if (!job) throw noSuchJob();
  return job;
}

export function noSuchJob(): ProblemError {
  return new ProblemError('not_found', 'There is no such job in this shop.');
}

async function mustBeCrew(trx: Knex.Transaction, change: JobChange): Promise<void> {
  for (const field of ['installerId', 'designerId', 'shopHandId'] as const) {
    const personId = change[field];
    if (!personId || (await findRole(trx, personId))) continue;
    throw new ProblemError('validation_failed', 'This person is not in the crew of the shop.', {
      issues: [{ path: `body.${field}`, message: 'somebody of the crew, please' }],
    });
  }
}

function toFields(change: JobChange): JobFields {
  const fields: JobFields = {};
  if (change.name !== undefined) fields.name = change.name;
  if (change.customerName !== undefined) fields.customer_name = change.customerName;
  if (change.customerEmail !== undefined) fields.customer_email = change.customerEmail;
  if (change.customerPhone !== undefined) fields.customer_phone = change.customerPhone;
  if (change.siteAddress !== undefined) fields.site_address = change.siteAddress;
  if (change.measureOn !== undefined) fields.measure_on = change.measureOn;
  if (change.cutOn !== undefined) fields.cut_on = change.cutOn;
  if (change.fitOn !== undefined) fields.fit_on = change.fitOn;
  if (change.installerId !== undefined) fields.installer_id = change.installerId;
  if (change.designerId !== undefined) fields.designer_id = change.designerId;
  if (change.shopHandId !== undefined) fields.shop_hand_id = change.shopHandId;
  return fields;
}
