import type { Knex } from 'knex';

import type { NestPlan } from '@/geometry/nest/types';
import { makePlan } from '@/geometry/plan/make-plan';
import type { Plan } from '@/geometry/plan/types';
import type { Revision, RevisionSummary } from '@/shared/contracts/revisions';
import { completeSettings } from '@/shared/contracts/shop-settings';
import { checkPlan } from '@/shared/nest-check/check-plan';
import { STAGE_NAMES, type Stage } from '@/shared/roles/stages';
import { ProblemError } from '../http/problem-error';
import { logAct } from '../repositories/audit-repository';
import { lockJob, updateJob } from '../repositories/job-repository';
import { findLayoutOfJob, lockLayout } from '../repositories/layout-repository';
import {
  findRevision,
  insertRevision,
  listRevisions,
  markSentBack,
  markSignedOff,
  type FrozenRevision,
} from '../repositories/revision-repository';
import type { Actor } from './actor';
import { sha256Of } from './canonical-json';
import { announce } from './event-hub';
import { inShop, inShopOnce } from './in-shop';
import { noSuchJob } from './job-service';
import { openLayout } from './open-layout';
import { readShop } from './read-shop';
import { toSummary } from './revision-view';

/** Stages in which a revision can be signed off; after Cut it is a change order. */
const SIGNABLE: readonly Stage[] = ['drawn', 'signed_off', 'cut', 'fitted'];

/** Revisions: what sheets, sign-off and orders name, and nothing changes any more. */
export class RevisionService {
  constructor(private readonly db: Knex) {}

  /** @throws ProblemError not_found */
  list(actor: Actor, jobId: string): Promise<{ revisions: RevisionSummary[] }> {
    return inShop(this.db, actor, 'job.see', async (trx) => {
      const layout = await findLayoutOfJob(trx, jobId);
      if (!layout) throw noSuchJob();
      const rows = await listRevisions(trx, jobId);
      return { revisions: rows.map((row) => toSummary(row, layout.seq)) };
    });
  }

  /** @throws ProblemError not_found */
  get(actor: Actor, jobId: string, number: number): Promise<Revision> {
    return inShop(this.db, actor, 'job.see', async (trx) => {
      const { revision, seq } = await mustFindRevision(trx, jobId, number);
      return {
        ...toSummary(revision, seq),
        layout: openLayout(revision.doc),
        settings: completeSettings(revision.settings),
        plan: revision.plan,
      };
    });
  }

  /**
   * Freezes the layout with the shop's settings, its stock and the plan, which is computed here and not taken from anybody.
   *
   * @param seq - the layout that the person saw
   * @param nest - nest result for this layout, or null
   * @throws ProblemError not_found; layout_moved_on; plan_refused, when the nest result is of other pieces or could not
   *   be sawn
   */
  freeze(actor: Actor, jobId: string, seq: number, nest: NestPlan | null, note: string): Promise<RevisionSummary> {
    return inShopOnce(this.db, actor, 'revision.freeze', async (trx) => {
      // Layout before job, as whoever edits does: the other way round two requests could wait for each other for ever.
      const found = await findLayoutOfJob(trx, jobId);
      const layout = found && (await lockLayout(trx, found.id));
      const job = layout && (await lockJob(trx, jobId));
      if (!layout || !job) throw noSuchJob();
      if (layout.seq !== seq) {
        throw new ProblemError('layout_moved_on', `The layout has ${layout.seq} edits by now, and you saw ${seq}.`);
      }
      const doc = openLayout(layout.doc);
      const { settings } = await readShop(trx);
      const plan = makePlan({ layout: doc, settings, nest });
      if (nest) mustBeSawable(plan);
      const sha256 = sha256Of({ doc, settings, nest, plan, engine: plan.engine });
      const whose = { shopId: actor.shopId, personId: actor.personId, jobId, jobName: job.name };
      const number = await insertRevision(trx, { ...whose, layoutSeq: seq, doc, settings, nest, plan, sha256, note });
      await this.acted(trx, actor, jobId, number, 'revision.frozen');
      return toSummary((await mustFindRevision(trx, jobId, number)).revision, seq);
    });
  }

  /**
   * Signs the newest revision off and moves the job to Signed off.
   *
   * @throws ProblemError not_found; already_decided; stage_refused before Drawn; plan_refused with findings to fix first
   */
  signOff(actor: Actor, jobId: string, number: number): Promise<RevisionSummary> {
    return inShop(this.db, actor, 'revision.sign', async (trx) => {
      const job = await lockJob(trx, jobId);
      if (!job) throw noSuchJob();
      const { revision } = await mustFindRevision(trx, jobId, number);
      await mustBeUndecidedAndNewest(trx, jobId, revision);
      if (!SIGNABLE.includes(job.stage)) {
        throw new ProblemError('stage_refused', `The job is in ${STAGE_NAMES[job.stage]}; set it to Drawn first.`);
      }
      mustBeSignable(revision.plan);
      await markSignedOff(trx, revision.id, actor.personId);
      await updateJob(trx, jobId, { stage: 'signed_off', sent_for_check_at: null });
      await this.acted(trx, actor, jobId, number, 'revision.signed_off', { from: job.stage, to: 'signed_off' });
      const decided = await mustFindRevision(trx, jobId, number);
      return toSummary(decided.revision, decided.seq);
    });
  }

  /** @throws ProblemError not_found; already_decided */
  sendBack(actor: Actor, jobId: string, number: number, note: string): Promise<RevisionSummary> {
    return inShop(this.db, actor, 'revision.sign', async (trx) => {
      if (!(await lockJob(trx, jobId))) throw noSuchJob();
      const { revision } = await mustFindRevision(trx, jobId, number);
      await mustBeUndecidedAndNewest(trx, jobId, revision);
      await markSentBack(trx, revision.id, actor.personId, note);
      await updateJob(trx, jobId, { sent_for_check_at: null });
      await this.acted(trx, actor, jobId, number, 'revision.sent_back', { note });
      const decided = await mustFindRevision(trx, jobId, number);
      return toSummary(decided.revision, decided.seq);
    });
  }

  private async acted(
    trx: Knex.Transaction,
    actor: Actor,
    jobId: string,
    number: number,
    action: string,
    data: Readonly<Record<string, unknown>> = {},
  ): Promise<void> {
    await logAct(trx, {
      shopId: actor.shopId,
      personId: actor.personId,
      jobId,
      action,
      data: { revision: number, ...data },
    });
    await announce(trx, actor.shopId, { kind: 'revision', jobId, number });
    await announce(trx, actor.shopId, { kind: 'job', jobId });
  }
}

/** @throws ProblemError not_found */
export async function mustFindRevision(
  trx: Knex.Transaction,
  jobId: string,
  number: number,
): Promise<{ revision: FrozenRevision; seq: number }> {
  const layout = await findLayoutOfJob(trx, jobId);
  const revision = layout && (await findRevision(trx, jobId, number));
  if (!layout || !revision) throw new ProblemError('not_found', `This job has no revision ${number}.`);
  return { revision, seq: layout.seq };
}

async function mustBeUndecidedAndNewest(trx: Knex.Transaction, jobId: string, revision: FrozenRevision): Promise<void> {
  if (revision.signedOffAt)
    throw new ProblemError('already_decided', `Revision ${revision.number} is signed off already.`);
  if (revision.sentBackAt) throw new ProblemError('already_decided', `Revision ${revision.number} was sent back.`);
  const [newest] = await listRevisions(trx, jobId);
  if (newest && newest.number !== revision.number) {
    throw new ProblemError('already_decided', `Revision ${newest.number} is newer; decide on that one.`);
  }
}

/** @throws ProblemError plan_refused, when the nest result is of other pieces or breaks a rule of the independent checker */
export function mustBeSawable(plan: Plan): NestPlan {
  if (!plan.nest) {
    throw new ProblemError(
      'plan_refused',
      'The slabs were planned for other pieces or another stock. Plan them again.',
    );
  }
  const wrong = checkPlan(plan.instance, plan.nest);
  if (wrong.length > 0) {
    throw new ProblemError('plan_refused', `This plan cannot be sawn: ${wrong[0]?.text ?? ''}`, {
      issues: wrong.map(({ code, text }) => ({ path: `nest.${code}`, message: text })),
    });
  }
  return plan.nest;
}

function mustBeSignable(plan: Plan): void {
  if (plan.roomError) throw new ProblemError('plan_refused', `The room is not known yet: ${plan.roomError.message}`);
  if (plan.pieces.length === 0) throw new ProblemError('plan_refused', 'There is no top in this revision.');
  const stops = plan.findings.filter(({ severity }) => severity === 'stop');
  if (stops.length > 0) {
    throw new ProblemError('plan_refused', `${stops[0]?.text ?? ''} ${stops[0]?.action ?? ''}`.trim(), {
      issues: stops.map(({ key, text }) => ({ path: `findings.${key}`, message: text })),
    });
  }
  if (!plan.nest) throw new ProblemError('plan_refused', 'The pieces of this revision are not planned on slabs yet.');
}
