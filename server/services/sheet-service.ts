import type { Knex } from 'knex';

import type { ShopSettings } from '@/geometry/core/settings';
import type { NestPlan } from '@/geometry/nest/types';
import { makePlan } from '@/geometry/plan/make-plan';
import type { Plan } from '@/geometry/plan/types';
import type { Layout } from '@/geometry/core/layout';
import { usualGrid } from '@/geometry/scene/labels/label-grids';
import type { SheetHead } from '@/geometry/scene/paper/sheet-head';
import { sheetEntry, type SheetKind } from '@/geometry/scene/sheet-kinds';
import type { SheetQuery } from '@/shared/contracts/sheets';
import { completeSettings } from '@/shared/contracts/shop-settings';
import { may } from '@/shared/roles/roles';
import { ProblemError } from '../http/problem-error';
import { findMember } from '../repositories/crew-repository';
import { listRevisions } from '../repositories/revision-repository';
import { qrRows } from '../sheets/qr-rows';
import { SheetError } from '../sheets/sheet-error';
import { sheetPdf } from '../sheets/sheet-pdf';
import type { Actor } from './actor';
import { inShop } from './in-shop';
import { mustFindJob } from './job-service';
import { readCurrent, type NestService } from './nest-service';
import { openLayout } from './open-layout';
import { mustBeSawable, mustFindRevision } from './revision-service';

/** A draft's slabs are searched this long at most, ms: somebody stands at the printer. */
const DRAFT_SEARCH_MS = 5_000;
/** Drafts whose slabs are remembered, so that printing twice gives the same sheet. */
const REMEMBERED_DRAFTS = 40;

/** What a sheet is printed from. */
export interface Printable {
  readonly plan: Plan;
  readonly layout: Layout;
  readonly settings: ShopSettings;
  readonly head: SheetHead;
}

export interface PrintedSheet {
  readonly pdf: NodeJS.ReadableStream;
  readonly fileName: string;
}

/** Sheets of a job. None is printed before the independent checker has looked the saw cuts over. */
export class SheetService {
  private readonly drafts = new Map<string, NestPlan>();

  constructor(
    private readonly db: Knex,
    private readonly nests: NestService,
    private readonly publicUrl: string,
  ) {}

  /**
   * Sheets of a revision, or of the layout as it is now with DRAFT across them.
   *
   * @param signal - ends the search for a draft's slabs when the caller has gone
   * @throws ProblemError not_found; plan_refused without slabs where they are needed, with cuts that cannot be sawn, or
   *   where the job has nothing for these sheets; busy
   */
  async print(
    actor: Actor,
    jobId: string,
    kinds: readonly SheetKind[],
    query: SheetQuery,
    signal: AbortSignal,
  ): Promise<PrintedSheet> {
    const printable = await this.printable(actor, jobId, query.revision, kinds, signal);
    const { jobNumber, draft, revision } = printable.head;
    const version = query.revision === 'draft' ? 'draft' : `revision-${revision}${draft ? '-draft' : ''}`;
    const name = kinds.length === 1 ? sheetEntry(kinds[0]!).name.toLowerCase().replaceAll(' ', '-') : 'sheets';
    const { paper, pages, grid, start } = query;
    const labels = { grid: grid ?? usualGrid(paper), start };
    const prices = may(actor.role, 'price.see');
    try {
      return {
        pdf: sheetPdf({ ...printable, kinds, paper, prices, labels, ...(pages && { only: pages }) }),
        fileName: `${name}-${jobNumber}-${version}.pdf`,
      };
    } catch (error) {
      if (error instanceof SheetError) throw new ProblemError('plan_refused', error.message);
      throw error;
    }
  }

  /**
   * What the sheets of a revision or of the draft are drawn from; its slabs, where there are any, can be sawn.
   *
   * @throws ProblemError not_found; plan_refused; busy
   */
  async printable(
    actor: Actor,
    jobId: string,
    which: number | 'draft',
    kinds: readonly SheetKind[],
    signal: AbortSignal,
  ): Promise<Printable> {
    const needsSlabs = kinds.every((kind) => sheetEntry(kind).needsSlabs);
    const printable =
      which === 'draft' ? await this.draft(actor, jobId, needsSlabs, signal) : await this.revision(actor, jobId, which);
    if (needsSlabs || printable.plan.nest) mustBeSawable(printable.plan);
    const qr = qrRows(`${this.publicUrl}/jobs/${jobId}/sheets`);
    return { ...printable, head: { ...printable.head, qr } };
  }

  private revision(actor: Actor, jobId: string, number: number): Promise<Printable> {
    return inShop(this.db, actor, 'sheet.print', async (trx) => {
      const job = await mustFindJob(trx, jobId);
      const { revision, seq } = await mustFindRevision(trx, jobId, number);
      return {
        plan: revision.plan,
        layout: openLayout(revision.doc),
        settings: completeSettings(revision.settings),
        head: {
          jobNumber: jobNumberText(job.number),
          jobName: revision.jobName,
          revision: number,
          revisionDate: revision.createdAt.toISOString(),
          drawnBy: revision.createdBy.name,
          signedBy: revision.signedOffBy?.name ?? null,
          draft: revision.signedOffAt === null,
          ...(seq > revision.layoutSeq ? { changedSince: number } : {}),
        },
      };
    });
  }

  private async draft(actor: Actor, jobId: string, needsSlabs: boolean, signal: AbortSignal): Promise<Printable> {
    const { layout, settings, head } = await inShop(this.db, actor, 'sheet.print', (trx) =>
      readDraft(trx, actor, jobId),
    );
    const { instance } = makePlan({ layout, settings, nest: null });
    const known = this.drafts.get(instance.id);
    const search = () => this.nests.search(layout, settings, DRAFT_SEARCH_MS, signal);
    // A sheet that says nothing of slabs does not wait for a search that may find none.
    const nest = known ?? (needsSlabs ? await search() : await search().catch(refusedAsNone));
    if (nest) this.remember(nest);
    return { plan: makePlan({ layout, settings, nest }), layout, settings, head };
  }

  private remember(nest: NestPlan): void {
    this.drafts.delete(nest.instance);
    this.drafts.set(nest.instance, nest);
    const [oldest] = this.drafts.keys();
    if (this.drafts.size > REMEMBERED_DRAFTS && oldest !== undefined) this.drafts.delete(oldest);
  }
}

/** Pieces that cannot be nested are no reason against the other sheets. */
function refusedAsNone(error: unknown): null {
  if (error instanceof ProblemError && error.code === 'plan_refused') return null;
  throw error;
}

async function readDraft(trx: Knex.Transaction, actor: Actor, jobId: string) {
  const job = await mustFindJob(trx, jobId);
  const { layout, settings, updatedAt } = await readCurrent(trx, jobId);
  const [newest] = await listRevisions(trx, jobId);
  const printer = await findMember(trx, actor.personId);
  const head: SheetHead = {
    jobNumber: jobNumberText(job.number),
    jobName: job.name,
    revision: newest?.number ?? 0,
    revisionDate: updatedAt.toISOString(),
    drawnBy: job.installer?.name ?? printer?.name ?? '',
    signedBy: null,
    draft: true,
    ...(newest ? { changedSince: newest.number } : {}),
  };
  return { layout, settings, head };
}

/** Four digits, as it is written on wood and paper. */
function jobNumberText(number: number): string {
  return String(number).padStart(4, '0');
}
