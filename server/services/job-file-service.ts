import type { Knex } from 'knex';
import type { Logger } from 'pino';

import type { ParsedBody } from '@/shared/contracts/contract';
import type { importJob } from '@/shared/contracts/job-files';
import type { Job } from '@/shared/contracts/jobs';
import { parseJobFile } from '@/shared/layout/parse-job-file';
import { toJobFile } from '@/shared/layout/to-job-file';
import { ProblemError } from '../http/problem-error';
import { logAct } from '../repositories/audit-repository';
import { findJob, insertJob } from '../repositories/job-repository';
import { findLayoutOfJob, insertLayout } from '../repositories/layout-repository';
import { takeJobNumber } from '../repositories/shop-repository';
import type { Actor } from './actor';
import { announce } from './event-hub';
import { inShop, inShopOnce } from './in-shop';
import { mustFindJob, noSuchJob } from './job-service';
import { toJob } from './job-view';
import { openLayout } from './open-layout';
import { readShop } from './read-shop';
import { stockOfShop } from './stock-for-layout';
import { drawThumbnail } from './thumbnail';

/** Jobs as files, out and in. */
export class JobFileService {
  constructor(
    private readonly db: Knex,
    private readonly log: Logger,
  ) {}

  /** @throws ProblemError not_found */
  export(actor: Actor, jobId: string): Promise<{ name: string; file: Record<string, unknown> }> {
    return inShop(this.db, actor, 'job.see', async (trx) => {
      const job = await findJob(trx, jobId);
      const layout = await findLayoutOfJob(trx, jobId);
      if (!job || !layout) throw noSuchJob();
      return { name: job.name, file: toJobFile(openLayout(layout.doc), job.name) };
    });
  }

  /**
   * Opens a job from a file; what the file leaves out comes from the shop's settings, and its stock too.
   *
   * @throws ProblemError job_file_refused, naming every place that is not right
   */
  import(actor: Actor, { file, customerName, siteAddress }: ParsedBody<typeof importJob>): Promise<Job> {
    return inShopOnce(this.db, actor, 'job.edit', async (trx) => {
      const shop = await readShop(trx);
      const parsed = parseJobFile(file, shop.settings);
      if (!parsed.ok) {
        throw new ProblemError('job_file_refused', `The job file cannot be read: ${parsed.errors[0]?.message ?? ''}`, {
          issues: parsed.errors.map(({ path, message }) => ({
            path: path ? `body.file.${path}` : 'body.file',
            message,
          })),
        });
      }
      const { name, layout } = parsed;
      const bare = layout.stock.slabs.length === 0 && layout.stock.rack.length === 0;
      const doc = bare
        ? { ...layout, stock: { ...layout.stock, ...(await stockOfShop(trx, layout.material)) } }
        : layout;
      const number = await takeJobNumber(trx, shop.id);
      const fields = {
        name: name.trim() || 'Job without a name',
        customer_name: customerName,
        site_address: siteAddress,
      };
      const jobId = await insertJob(trx, { shop_id: shop.id, number, ...fields });
      await insertLayout(trx, { shopId: shop.id, jobId, doc, thumbnail: drawThumbnail(doc, shop.settings, this.log) });
      const data = { number };
      await logAct(trx, { shopId: shop.id, personId: actor.personId, jobId, action: 'job.imported', data });
      await announce(trx, shop.id, { kind: 'job', jobId });
      return toJob(await mustFindJob(trx, jobId));
    });
  }
}
