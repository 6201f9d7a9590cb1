import type { Knex } from 'knex';

import type { NestPlan } from '@/geometry/nest/types';
import { makePlan } from '@/geometry/plan/make-plan';
import type { Plan } from '@/geometry/plan/types';
import type { Layout } from '@/geometry/core/layout';
import type { SheetHead } from '@/geometry/scene/paper/sheet-head';
import type { CutSheetQuery } from '@/shared/contracts/sheets';
import { findMember } from '../repositories/crew-repository';
import { listRevisions } from '../repositories/revision-repository';
import { cutSheetPdf } from '../sheets/cut-sheet';
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
interface Printable {
  readonly plan: Plan;
  readonly layout: Layout;
  readonly head: SheetHead;
}

export interface PrintedSheet {
  readonly pdf: NodeJS.ReadableStream;
  readonly fileName: string;
}

/** Sheets for the shop. None is printed before the independent checker has looked the saw cuts over. */
export class SheetService {
  private readonly drafts = new Map<string, NestPlan>();

  constructor(
    private readonly db: Knex,
    private readonly nests: NestService,
  ) {}

  /**
   * The cut sheets of a revision, or of the layout as it is now with DRAFT across them.
   *
   * @param signal - ends the search for a draft's slabs when the caller has gone
   * @throws ProblemError not_found; plan_refused without slabs, or with cuts that cannot be sawn; busy
   */
  async cutSheet(actor: Actor, jobId: string, query: CutSheetQuery, signal: AbortSignal): Promise<PrintedSheet> {
    const printable =
      query.revision === 'draft'
        ? await this.draft(actor, jobId, signal)
        : await this.revision(actor, jobId, query.revision);
    mustBeSawable(printable.plan);
    const { jobNumber, draft, revision } = printable.head;
    const version = query.revision === 'draft' ? 'draft' : `revision-${revision}${draft ? '-draft' : ''}`;
    return {
      pdf: cutSheetPdf({ ...printable, paper: query.paper }),
      fileName: `cut-sheet-${jobNumber}-${version}.pdf`,
    };
  }

  private revision(actor: Actor, jobId: string, number: number): Promise<Printable> {
    return inShop(this.db, actor, 'sheet.print', async (trx) => {
      const job = await mustFindJob(trx, jobId);
      const { revision, seq } = await mustFindRevision(trx, jobId, number);
      return {
        plan: revision.plan,
        layout: openLayout(revision.doc),
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

  private async draft(actor: Actor, jobId: string, signal: AbortSignal): Promise<Printable> {
    const { layout, settings, head } = await inShop(this.db, actor, 'sheet.print', (trx) =>
      readDraft(trx, actor, jobId),
    );
    const { instance } = makePlan({ layout, settings, nest: null });
    const nest = this.drafts.get(instance.id) ?? (await this.nests.search(layout, settings, DRAFT_SEARCH_MS, signal));
    this.remember(nest);
    return { plan: makePlan({ layout, settings, nest }), layout, head };
  }

  private remember(nest: NestPlan): void {
    this.drafts.delete(nest.instance);
    this.drafts.set(nest.instance, nest);
    const [oldest] = this.drafts.keys();
    if (this.drafts.size > REMEMBERED_DRAFTS && oldest !== undefined) this.drafts.delete(oldest);
  }
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
