import type { Knex } from 'knex';

export interface Act {
  readonly shopId: string;
  readonly personId: string | null;
  readonly jobId?: string;
  /** `area.what`, such as `job.stage_moved`. */
  readonly action: string;
  readonly data?: Readonly<Record<string, unknown>>;
}

export interface LoggedAct {
  readonly id: string;
  readonly at: Date;
  readonly personName: string | null;
  readonly action: string;
  readonly data: Record<string, unknown>;
}

/** Writes down who did what. The log has no way to change or delete. */
export async function logAct(trx: Knex.Transaction, act: Act): Promise<void> {
  await trx('audit_log').insert({
    shop_id: act.shopId,
    person_id: act.personId,
    job_id: act.jobId ?? null,
    action: act.action,
    data: JSON.stringify(act.data ?? {}),
  });
}

/** A job's acts, newest first, after the given one. */
export async function listActs(
  trx: Knex.Transaction,
  jobId: string,
  after: { readonly at: string; readonly id: string } | null,
  limit: number,
): Promise<LoggedAct[]> {
  return trx('audit_log as a')
    .leftJoin('people as p', 'p.id', 'a.person_id')
    .where('a.job_id', jobId)
    .modify((query) => {
      if (after) void query.whereRaw('(a.created_at, a.id) < (?, ?)', [after.at, after.id]);
    })
    .orderBy('a.created_at', 'desc')
    .orderBy('a.id', 'desc')
    .limit(limit)
    .select<LoggedAct[]>('a.id', 'a.created_at as at', 'p.name as personName', 'a.action', 'a.data');
}

/** Acts of one kind on a job, newest first. */
export async function listActsOf(
  trx: Knex.Transaction,
  jobId: string,
  action: string,
  limit: number,
): Promise<LoggedAct[]> {
  return trx('audit_log as a')
    .leftJoin('people as p', 'p.id', 'a.person_id')
    .where({ 'a.job_id': jobId, 'a.action': action })
    .orderBy('a.created_at', 'desc')
    .limit(limit)
    .select<LoggedAct[]>('a.id', 'a.created_at as at', 'p.name as personName', 'a.action', 'a.data');
}
