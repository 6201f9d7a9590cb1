import type { Knex } from 'knex';

import type { Layout } from '@/geometry/core/layout';
import type { Edit } from '@/shared/layout/apply-edit';

export interface StoredLayout {
  readonly id: string;
  readonly jobId: string;
  readonly doc: Layout;
  readonly seq: number;
  readonly updatedAt: Date;
}

export interface StoredEdit {
  readonly seq: number;
  readonly edit: Edit;
  readonly personId: string;
  readonly personName: string;
  readonly at: Date;
}

export interface NewEdit {
  readonly seq: number;
  readonly edit: Edit;
}

const COLUMNS = { id: 'id', jobId: 'job_id', doc: 'doc', seq: 'seq', updatedAt: 'updated_at' } as const;

export async function insertLayout(
  trx: Knex.Transaction,
  layout: { readonly shopId: string; readonly jobId: string; readonly doc: Layout; readonly thumbnail: unknown },
): Promise<void> {
  await trx('layouts').insert({
    shop_id: layout.shopId,
    job_id: layout.jobId,
    doc: JSON.stringify(layout.doc),
    thumbnail: asJson(layout.thumbnail),
  });
}

export async function findLayout(trx: Knex.Transaction, layoutId: string): Promise<StoredLayout | null> {
  return (await trx('layouts').where({ id: layoutId }).first<StoredLayout>(COLUMNS)) ?? null;
}

export async function findLayoutOfJob(trx: Knex.Transaction, jobId: string): Promise<StoredLayout | null> {
  return (await trx('layouts').where({ job_id: jobId }).first<StoredLayout>(COLUMNS)) ?? null;
}

/**
 * Locks the layout, so that writers queue and each one sees what the one before left. 'No key': rows that refer to it may
 * still be written, or two writers who refer to it already would wait for each other.
 */
export async function lockLayout(trx: Knex.Transaction, layoutId: string): Promise<StoredLayout | null> {
  return (await trx('layouts').where({ id: layoutId }).forNoKeyUpdate().first<StoredLayout>(COLUMNS)) ?? null;
}

/** Sequence numbers of those of these edits that are in the log already, by edit id. */
export async function findKnownEdits(
  trx: Knex.Transaction,
  layoutId: string,
  editIds: readonly string[],
): Promise<Map<string, number>> {
  const rows = await trx('layout_edits')
    .where({ layout_id: layoutId })
    .whereIn('id', editIds)
    .select<{ id: string; seq: number }[]>('id', 'seq');
  return new Map(rows.map((row) => [row.id, row.seq]));
}

/** Edits with a sequence number above `since`, in order. */
export function listEditsSince(trx: Knex.Transaction, layoutId: string, since: number): Promise<StoredEdit[]> {
  return trx('layout_edits as e')
    .join('people as p', 'p.id', 'e.person_id')
    .where('e.layout_id', layoutId)
    .where('e.seq', '>', since)
    .orderBy('e.seq')
    .select<StoredEdit[]>({
      seq: 'e.seq',
      edit: 'e.edit',
      personId: 'e.person_id',
      personName: 'p.name',
      at: 'e.created_at',
    });
}

/** Stores the layout that the edits led to, and the edits. Call it with the layout locked. */
export async function storeEdits(
  trx: Knex.Transaction,
  stored: {
    readonly shopId: string;
    readonly personId: string;
    readonly layoutId: string;
    readonly doc: Layout;
    readonly seq: number;
    readonly thumbnail: unknown;
    readonly edits: readonly NewEdit[];
  },
): Promise<void> {
  await trx('layouts')
    .where({ id: stored.layoutId })
    .update({
      doc: JSON.stringify(stored.doc),
      seq: stored.seq,
      thumbnail: asJson(stored.thumbnail),
      updated_at: trx.fn.now(3),
    });
  await trx('layout_edits').insert(
    stored.edits.map(({ seq, edit }) => ({
      layout_id: stored.layoutId,
      id: edit.id,
      shop_id: stored.shopId,
      seq,
      edit: JSON.stringify(edit),
      person_id: stored.personId,
    })),
  );
}

function asJson(value: unknown): string | null {
  return value === null || value === undefined ? null : JSON.stringify(value);
}
