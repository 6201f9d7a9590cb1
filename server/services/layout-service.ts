import { isDeepStrictEqual } from 'node:util';

import type { Knex } from 'knex';
import type { Logger } from 'pino';

import type { Layout } from '@/geometry/core/layout';
import type { EditsOutcome, EditsSince, LoggedEdit } from '@/shared/contracts/layouts';
import { applyEdit, type ApplyResult, type Edit } from '@/shared/layout/apply-edit';
import { layoutSchema } from '@/shared/layout/layout-schema';
import { may } from '@/shared/roles/roles';
import { ProblemError } from '../http/problem-error';
import { updateJob } from '../repositories/job-repository';
import {
  findKnownEdits,
  findLayout,
  listEditsSince,
  lockLayout,
  storeEdits,
  type NewEdit,
  type StoredEdit,
  type StoredLayout,
} from '../repositories/layout-repository';
import type { Actor } from './actor';
import { announce } from './event-hub';
import { inShop } from './in-shop';
import { readShop } from './read-shop';
import { stockOfShop } from './stock-for-layout';
import { drawThumbnail } from './thumbnail';

/** Layouts and the edits that are the only way they change. */
export class LayoutService {
  constructor(
    private readonly db: Knex,
    private readonly log: Logger,
  ) {}

  /** @throws ProblemError not_found */
  get(actor: Actor, layoutId: string): Promise<StoredLayout> {
    return inShop(this.db, actor, 'job.see', async (trx) => found(await findLayout(trx, layoutId)));
  }

  /** @throws ProblemError not_found */
  listEdits(actor: Actor, layoutId: string, since: number): Promise<EditsSince> {
    return inShop(this.db, actor, 'job.see', async (trx) => {
      const { seq } = found(await findLayout(trx, layoutId));
      const edits = await listEditsSince(trx, layoutId, since);
      return { seq, edits: edits.map(toLogged) };
    });
  }

  /**
   * Applies edits in order, on top of whatever others did since. An edit that is in the log already counts as applied and
   * is not applied again. One that no longer fits is handed back with its values; the others are kept.
   *
   * @param base - sequence the edits were made on
   * @throws ProblemError not_found; validation_failed for a base that lies ahead; edits_refused, with the same outcome,
   *   when not one of them applies
   */
  async postEdits(actor: Actor, layoutId: string, base: number, edits: readonly Edit[]): Promise<EditsOutcome> {
    const outcome = await this.merge(actor, layoutId, base, () => Promise.resolve(edits));
    if (outcome.refused.length > 0 && outcome.applied.length === 0) throw allRefused(outcome);
    return outcome;
  }

  /**
   * Puts the shop's stock of the layout's wood into it, as an edit of the caller's; no edit when it is the same stock.
   *
   * @returns every edit after `base`, this one too
   * @throws ProblemError not_found; validation_failed for a base that lies ahead
   */
  async takeStock(actor: Actor, layoutId: string, base: number, editId: string): Promise<EditsSince> {
    await this.merge(actor, layoutId, base, async (trx, { doc }) => {
      const stock = await stockOfShop(trx, doc.material);
      const same = isDeepStrictEqual(stock, { slabs: doc.stock.slabs, rack: doc.stock.rack });
      return same ? [] : [{ id: editId, kind: 'setStock', value: stock }];
    });
    return this.listEdits(actor, layoutId, base);
  }

  private merge(
    actor: Actor,
    layoutId: string,
    base: number,
    editsFor: (trx: Knex.Transaction, held: StoredLayout) => Promise<readonly Edit[]>,
  ): Promise<EditsOutcome> {
    return inShop(this.db, actor, 'layout.edit', async (trx) => {
      const held = found(await lockLayout(trx, layoutId));
      if (base > held.seq) throw baseAhead(base, held.seq);
      const edits = await editsFor(trx, held);
      const known = await findKnownEdits(
        trx,
        layoutId,
        edits.map((edit) => edit.id),
      );
      const others = (await listEditsSince(trx, layoutId, base)).filter(({ edit }) => !known.has(edit.id));
      const { doc, fresh, refused } = applyAll(actor, held, edits, known);
      const seq = held.seq + fresh.length;
      if (fresh.length > 0) await this.store(trx, actor, held, { doc, seq, edits: fresh });
      const applied = edits.flatMap(({ id }) => {
        const at = known.get(id) ?? fresh.find((one) => one.edit.id === id)?.seq;
        return at === undefined ? [] : [{ id, seq: at }];
      });
      return { seq, applied, refused, others: others.map(toLogged) };
    });
  }

  private async store(
    trx: Knex.Transaction,
    actor: Actor,
    held: StoredLayout,
    next: { readonly doc: Layout; readonly seq: number; readonly edits: readonly NewEdit[] },
  ): Promise<void> {
    const { settings } = await readShop(trx);
    await storeEdits(trx, {
      shopId: actor.shopId,
      personId: actor.personId,
      layoutId: held.id,
      ...next,
      thumbnail: drawThumbnail(next.doc, settings, this.log),
    });
    await updateJob(trx, held.jobId, {});
    await announce(trx, actor.shopId, { kind: 'layout', jobId: held.jobId, layoutId: held.id, seq: next.seq });
  }
}

interface Applied {
  readonly doc: Layout;
  readonly fresh: NewEdit[];
  readonly refused: { edit: Edit; reason: string }[];
}

function applyAll(
  actor: Actor,
  held: StoredLayout,
  edits: readonly Edit[],
  known: ReadonlyMap<string, number>,
): Applied {
  const fresh: NewEdit[] = [];
  const refused: { edit: Edit; reason: string }[] = [];
  const seen = new Set(known.keys());
  let { doc } = held;
  for (const edit of edits) {
    if (seen.has(edit.id)) continue;
    const result = applyChecked(actor, doc, edit);
    if (result.ok) {
      doc = result.layout;
      fresh.push({ seq: held.seq + fresh.length + 1, edit });
      seen.add(edit.id);
    } else {
      refused.push({ edit, reason: result.reason });
    }
  }
  return { doc, fresh, refused };
}

/** A layout that breaks its own schema could never be opened again, so the edit that would break it is refused. */
function applyChecked(actor: Actor, doc: Layout, edit: Edit): ApplyResult {
  const result = applyEdit(doc, edit);
  if (!result.ok) return result;
  if (!may(actor.role, 'revision.sign') && !isDeepStrictEqual(result.layout.accepted, doc.accepted)) {
    return { ok: false, reason: 'Only a designer or the owner accepts what was found.' };
  }
  const checked = layoutSchema.safeParse(result.layout);
  if (checked.success) return result;
  const place = checked.error.issues[0]?.path.join('.') ?? 'layout';
  return { ok: false, reason: `The layout cannot hold this: ${place} would go past its limit.` };
}

function found(layout: StoredLayout | null): StoredLayout {
  if (!layout) throw new ProblemError('not_found', 'There is no such layout in this shop.');
  return layout;
}

function baseAhead(base: number, seq: number): ProblemError {
  return new ProblemError('validation_failed', 'The layout on this device is ahead of the stored one. Load it again.', {
    issues: [{ path: 'body.base', message: `is ${base}, and the layout has ${seq} edits` }],
  });
}

function allRefused(outcome: EditsOutcome): ProblemError {
  const { length } = outcome.refused;
  const detail =
    length === 1
      ? `This change could not be kept: ${outcome.refused[0]?.reason ?? ''}`
      : `These ${length} changes could not be kept: what they belong to is gone or was changed.`;
  return new ProblemError('edits_refused', detail, { more: outcome });
}

function toLogged(stored: StoredEdit): LoggedEdit {
  return { ...stored, at: stored.at.toISOString() };
}
