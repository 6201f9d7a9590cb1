import type { Knex } from 'knex';

import type { Layout } from '@/geometry/core/layout';
import type { ShopSettings } from '@/geometry/core/settings';
import type { NestPlan } from '@/geometry/nest/types';
import { makePlan } from '@/geometry/plan/make-plan';
import { ProblemError } from '../http/problem-error';
import { findLayoutOfJob } from '../repositories/layout-repository';
import { NestBusyError, type NestPool } from '../work/nest-pool';
import type { Actor } from './actor';
import { inShop } from './in-shop';
import { noSuchJob } from './job-service';
import { openLayout } from './open-layout';
import { readShop } from './read-shop';

/** A layout as it is stored now. */
export interface CurrentLayout {
  readonly seq: number;
  readonly layout: Layout;
  readonly settings: ShopSettings;
  readonly updatedAt: Date;
}

/** Searches for slabs on the server, for clients that cannot or do not want to. */
export class NestService {
  constructor(
    private readonly db: Knex,
    private readonly pool: NestPool,
  ) {}

  /**
   * @param limitMs - the search ends with its best plan after this time
   * @param signal - ends it when the caller has gone
   * @throws ProblemError not_found; plan_refused, when there are no pieces or they fit no slab; busy
   */
  async nestJob(
    actor: Actor,
    jobId: string,
    limitMs: number,
    signal: AbortSignal,
  ): Promise<{ seq: number; nest: NestPlan }> {
    const { seq, layout, settings } = await inShop(this.db, actor, 'plan.make', (trx) => readCurrent(trx, jobId));
    return { seq, nest: await this.search(layout, settings, limitMs, signal) };
  }

  /** Searches slabs for a layout. @throws ProblemError plan_refused; busy */
  async search(layout: Layout, settings: ShopSettings, limitMs: number, signal: AbortSignal): Promise<NestPlan> {
    const { instance, roomError } = makePlan({ layout, settings, nest: null });
    if (instance.parts.length === 0) {
      throw new ProblemError('plan_refused', roomError?.message ?? 'There are no pieces to plan yet. Lay a top first.');
    }
    const found = await this.pool.run(instance, limitMs, signal).catch((error: unknown) => {
      if (error instanceof NestBusyError) {
        throw new ProblemError('busy', 'The server is planning other jobs. Try again in a moment.');
      }
      throw error;
    });
    if ('error' in found) {
      throw new ProblemError('plan_refused', found.error.message, {
        issues: [{ path: found.error.path.join('.'), message: found.error.message }],
      });
    }
    return found;
  }
}

/** @throws ProblemError not_found */
export async function readCurrent(trx: Knex.Transaction, jobId: string): Promise<CurrentLayout> {
  const stored = await findLayoutOfJob(trx, jobId);
  if (!stored) throw noSuchJob();
  const { settings } = await readShop(trx);
  return { seq: stored.seq, layout: openLayout(stored.doc), settings, updatedAt: stored.updatedAt };
}
