import type { Knex } from 'knex';

import type { Layout } from '@/geometry/core/layout';
import type { ShopSettings } from '@/geometry/core/settings';
import type { NestPlan } from '@/geometry/nest/types';
import type { Plan } from '@/geometry/plan/types';

export interface RevisionPerson {
  readonly id: string;
  readonly name: string;
}

/** What a revision froze, and what was decided on it. */
export interface RevisionRecord {
  readonly id: string;
  readonly number: number;
  readonly layoutSeq: number;
  readonly engine: string;
  readonly sha256: Buffer;
  readonly note: string;
  readonly createdAt: Date;
  readonly createdBy: RevisionPerson;
  readonly signedOffAt: Date | null;
  readonly signedOffBy: RevisionPerson | null;
  readonly sentBackAt: Date | null;
  readonly sentBackBy: RevisionPerson | null;
  readonly sentBackNote: string;
}

export interface FrozenRevision extends RevisionRecord {
  readonly jobName: string;
  readonly doc: unknown;
  readonly settings: Readonly<Record<string, unknown>>;
  readonly plan: Plan;
}

export interface NewRevision {
  readonly shopId: string;
  readonly personId: string;
  readonly jobId: string;
  readonly jobName: string;
  readonly layoutSeq: number;
  readonly doc: Layout;
  readonly settings: ShopSettings;
  readonly nest: NestPlan | null;
  readonly plan: Plan;
  readonly sha256: Buffer;
  readonly note: string;
}

/** A job's revisions, newest first. */
export function listRevisions(trx: Knex.Transaction, jobId: string): Promise<RevisionRecord[]> {
  return revisions(trx).where('r.job_id', jobId).orderBy('r.number', 'desc');
}

export async function findRevision(
  trx: Knex.Transaction,
  jobId: string,
  number: number,
): Promise<FrozenRevision | null> {
  const row = await revisions(trx)
    .where({ 'r.job_id': jobId, 'r.number': number })
    .select<FrozenRevision[]>('r.job_name as jobName', 'r.doc', 'r.settings', 'r.plan')
    .first();
  return (row as FrozenRevision | undefined) ?? null;
}

/** Freezes under the next number. Call it with the job locked, so that two cannot get the same one. */
export async function insertRevision(trx: Knex.Transaction, revision: NewRevision): Promise<number> {
  const newest = await trx('revisions')
    .where({ job_id: revision.jobId })
    .max<{ number: number | null }>('number as number')
    .first();
  const number = ((newest as { number: number | null } | undefined)?.number ?? 0) + 1;
  await trx('revisions').insert({
    shop_id: revision.shopId,
    person_id: revision.personId,
    job_id: revision.jobId,
    job_name: revision.jobName,
    number,
    layout_seq: revision.layoutSeq,
    doc: JSON.stringify(revision.doc),
    settings: JSON.stringify(revision.settings),
    nest: revision.nest === null ? null : JSON.stringify(revision.nest),
    plan: JSON.stringify(revision.plan),
    engine: revision.plan.engine,
    sha256: revision.sha256,
    note: revision.note,
  });
  return number;
}

export async function markSignedOff(trx: Knex.Transaction, revisionId: string, personId: string): Promise<void> {
  await trx('revisions')
    .where({ id: revisionId })
    .update({ signed_off_by: personId, signed_off_at: trx.fn.now(3) });
}

export async function markSentBack(
  trx: Knex.Transaction,
  revisionId: string,
  personId: string,
  note: string,
): Promise<void> {
  await trx('revisions')
    .where({ id: revisionId })
    .update({ sent_back_by: personId, sent_back_at: trx.fn.now(3), sent_back_note: note });
}

function revisions(trx: Knex.Transaction) {
  const person = (column: string, people: string, name: string) =>
    trx.raw(`case when r.${column} is null then null
             else jsonb_build_object('id', r.${column}, 'name', ${people}.name) end as "${name}"`);
  return trx('revisions as r')
    .leftJoin('people as pc', 'pc.id', 'r.person_id')
    .leftJoin('people as ps', 'ps.id', 'r.signed_off_by')
    .leftJoin('people as pb', 'pb.id', 'r.sent_back_by')
    .select<RevisionRecord[]>(
      'r.id',
      'r.number',
      'r.layout_seq as layoutSeq',
      'r.engine',
      'r.sha256',
      'r.note',
      'r.created_at as createdAt',
      person('person_id', 'pc', 'createdBy'),
      'r.signed_off_at as signedOffAt',
      person('signed_off_by', 'ps', 'signedOffBy'),
      'r.sent_back_at as sentBackAt',
      person('sent_back_by', 'pb', 'sentBackBy'),
      'r.sent_back_note as sentBackNote',
    );
}
