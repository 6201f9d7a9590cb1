import type { Knex } from 'knex';

import type { ShopSettings } from '@/geometry/core/settings';
import type { NestPlan } from '@/geometry/nest/types';
import { makePlan } from '@/geometry/plan/make-plan';
import type { Plan } from '@/geometry/plan/types';
import type { Layout } from '@/geometry/core/layout';
import { usualGrid } from '@/geometry/scene/labels/label-grids';
import type { SheetHead } from '@/geometry/scene/paper/sheet-head';
import { sheetEntry, SHEET_KINDS, type SheetKind } from '@/geometry/scene/sheet-kinds';
import type { SheetPrint } from '@/shared/contracts/sheet-acts';
import type { SheetQuery } from '@/shared/contracts/sheets';
import { completeSettings } from '@/shared/contracts/shop-settings';
import { may } from '@/shared/roles/roles';
import { ProblemError } from '../http/problem-error';
import { sheetsMail } from '../mail/mail-texts';
import { listActsOf, logAct } from '../repositories/audit-repository';
import { findMember } from '../repositories/crew-repository';
import { addMail } from '../repositories/outbox-repository';
import { listRevisions } from '../repositories/revision-repository';
import { sheetBundle } from '../sheets/bundle';
import { qrRows } from '../sheets/qr-rows';
import { SheetError } from '../sheets/sheet-error';
import { sheetPdf } from '../sheets/sheet-pdf';
import type { Actor } from './actor';
import { inShop, inShopOnce } from './in-shop';
import { mustFindJob } from './job-service';
import { readCurrent, type NestService } from './nest-service';
import { openLayout } from './open-layout';
import { mustBeSawable, mustFindRevision } from './revision-service';

/** A draft's slabs are searched this long at most, ms: somebody stands at the printer. */
const DRAFT_SEARCH_MS = 5_000;
/** Drafts whose slabs are remembered, so that printing twice gives the same sheet. */
const REMEMBERED_DRAFTS = 40;

const PRINTED = 'sheet.printed';
const MOST_PRINTS = 100;

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
    if (query.revision !== 'draft') await this.printed(actor, jobId, query.revision, kinds);
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

  /** Everything of a revision, or of the draft, in one archive. @throws ProblemError as `print` */
  async bundle(actor: Actor, jobId: string, query: SheetQuery, signal: AbortSignal): Promise<PrintedSheet> {
    const { revision, paper } = query;
    const printable = await this.printable(actor, jobId, revision, SHEET_KINDS, signal);
    if (printable.plan.pieces.length === 0)
      throw new ProblemError('plan_refused', 'There are no pieces yet. Lay a top first.');
    if (revision !== 'draft') await this.printed(actor, jobId, revision, SHEET_KINDS);
    const version = revision === 'draft' ? 'draft' : `revision-${revision}`;
    return {
      pdf: sheetBundle({ ...printable, paper, prices: may(actor.role, 'price.see') }),
      fileName: `job-${printable.head.jobNumber}-${version}.zip`,
    };
  }

  /** What went to paper of a job's revisions, newest first. @throws ProblemError not_found */
  prints(actor: Actor, jobId: string): Promise<{ prints: SheetPrint[] }> {
    return inShop(this.db, actor, 'job.see', async (trx) => {
      await mustFindJob(trx, jobId);
      const acts = await listActsOf(trx, jobId, PRINTED, MOST_PRINTS);
      return {
        prints: acts.map(({ at, personName, data }) => ({
          revision: Number(data.revision),
          kinds: data.kinds as string[],
          at: at.toISOString(),
          by: personName ?? '',
        })),
      };
    });
  }

  /** Mails somebody of the crew the way to a revision's sheets. @throws ProblemError not_found */
  mail(actor: Actor, jobId: string, personId: string, revision: number, note: string): Promise<{ sentTo: string }> {
    return inShopOnce(this.db, actor, 'sheet.print', async (trx) => {
      const job = await mustFindJob(trx, jobId);
      await mustFindRevision(trx, jobId, revision);
      const [to, from] = [await findMember(trx, personId), await findMember(trx, actor.personId)];
      if (!to) throw new ProblemError('not_found', 'There is nobody like this in the crew.');
      const link = `${this.publicUrl}/jobs/${jobId}/sheets`;
      const text = sheetsMail(from?.name ?? '', job.name, revision, link, note);
      await addMail(trx, { shopId: actor.shopId, kind: 'sheets', to: to.email, ...text });
      const whose = { shopId: actor.shopId, personId: actor.personId, jobId };
      await logAct(trx, { ...whose, action: 'sheet.mailed', data: { revision, to: to.name } });
      return { sentTo: to.name };
    });
  }

  private printed(actor: Actor, jobId: string, revision: number, kinds: readonly SheetKind[]): Promise<void> {
    return inShop(this.db, actor, 'sheet.print', async (trx) => {
      const whose = { shopId: actor.shopId, personId: actor.personId, jobId };
      await logAct(trx, { ...whose, action: PRINTED, data: { revision, kinds } });
    });
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
