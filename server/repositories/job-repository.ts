import type { Knex } from 'knex';

import type { Stage } from '@/shared/roles/stages';

export interface PersonOnJob {
  readonly id: string;
  readonly name: string;
}

/** A job with what the list and the header of every screen show of its layout and revisions. Dates are `yyyy-mm-dd`. */
export interface JobRecord {
  readonly id: string;
  readonly number: number;
  readonly name: string;
  readonly customerName: string;
  readonly customerEmail: string;
  readonly customerPhone: string;
  readonly siteAddress: string;
  readonly stage: Stage;
  readonly sentForCheckAt: Date | null;
  readonly measureOn: string | null;
  readonly cutOn: string | null;
  readonly fitOn: string | null;
  readonly installer: PersonOnJob | null;
  readonly designer: PersonOnJob | null;
  readonly shopHand: PersonOnJob | null;
  readonly createdAt: Date;
  readonly updatedAt: Date;
  readonly layoutId: string;
  readonly layoutSeq: number;
  readonly thumbnail: unknown;
  readonly revision: number | null;
  readonly revisionSeq: number | null;
  readonly signedOff: boolean;
}

export interface JobFilter {
  /** Words that all have to be found. */
  readonly search: readonly string[];
  readonly stage?: Stage;
  readonly personId?: string;
  /** Paging key: the job after which the page begins. */
  readonly after: { readonly at: string; readonly id: string } | null;
  readonly limit: number;
}

/** Columns a person may set. */
export interface JobFields {
  name?: string;
  customer_name?: string;
  customer_email?: string;
  customer_phone?: string;
  site_address?: string;
  measure_on?: string | null;
  cut_on?: string | null;
  fit_on?: string | null;
  installer_id?: string | null;
  designer_id?: string | null;
  shop_hand_id?: string | null;
  stage?: Stage;
  sent_for_check_at?: Date | null;
}

/** Jobs that are not put away, last touched first. */
export function listJobs(trx: Knex.Transaction, filter: JobFilter): Promise<JobRecord[]> {
  return jobs(trx)
    .whereNull('j.archived_at')
    .modify((query) => {
      for (const word of filter.search) void query.whereRaw(`${SEARCHED} ilike ?`, [`%${escapeLike(word)}%`]);
      if (filter.stage) void query.where('j.stage', filter.stage);
      const { personId, after } = filter;
      if (personId) void query.whereRaw('? in (j.installer_id, j.designer_id, j.shop_hand_id)', [personId]);
      if (after) void query.whereRaw('(j.updated_at, j.id) < (?, ?)', [after.at, after.id]);
    })
    .orderBy('j.updated_at', 'desc')
    .orderBy('j.id', 'desc')
    .limit(filter.limit);
}

export async function findJob(trx: Knex.Transaction, jobId: string): Promise<JobRecord | null> {
  return (await jobs(trx).where('j.id', jobId).first()) ?? null;
}

/** Locks the job until the transaction ends; null when the shop has none of this id. */
export async function lockJob(
  trx: Knex.Transaction,
  jobId: string,
): Promise<{ id: string; name: string; stage: Stage } | null> {
  const query = trx('jobs').where({ id: jobId }).forNoKeyUpdate();
  return (await query.first<{ id: string; name: string; stage: Stage }>('id', 'name', 'stage')) ?? null;
}

export async function insertJob(
  trx: Knex.Transaction,
  job: JobFields & { readonly shop_id: string; readonly number: number },
): Promise<string> {
  const [row] = await trx('jobs').insert(job).returning<{ id: string }[]>('id');
  if (!row) throw new Error('insert into jobs returned no row');
  return row.id;
}

/** Sets what is given and moves the job to the top of the list. */
export async function updateJob(trx: Knex.Transaction, jobId: string, fields: JobFields): Promise<void> {
  await trx('jobs')
    .where({ id: jobId })
    .update({ ...fields, updated_at: trx.fn.now(3) });
}

const SEARCHED = "concat_ws(' ', j.name, j.customer_name, j.site_address, '#' || j.number)";

/** % and _ are what was typed, not wild cards. */
function escapeLike(text: string): string {
  return text.replaceAll(/[\\%_]/g, '\\$&');
}

function jobs(trx: Knex.Transaction) {
  const person = (column: string, people: string, name: string) =>
    trx.raw(`case when ${column} is null then null
             else jsonb_build_object('id', ${column}, 'name', ${people}.name) end as "${name}"`);
  return trx('jobs as j')
    .join('layouts as l', (on) => on.on('l.shop_id', 'j.shop_id').andOn('l.job_id', 'j.id'))
    .leftJoin('people as pi', 'pi.id', 'j.installer_id')
    .leftJoin('people as pd', 'pd.id', 'j.designer_id')
    .leftJoin('people as ps', 'ps.id', 'j.shop_hand_id')
    .joinRaw(
      `left join lateral (
         select number, layout_seq, signed_off_at from revisions
         where shop_id = j.shop_id and job_id = j.id order by number desc limit 1
       ) as r on true`,
    )
    .select<JobRecord[]>(
      'j.id',
      'j.number',
      'j.name',
      'j.customer_name as customerName',
      'j.customer_email as customerEmail',
      'j.customer_phone as customerPhone',
      'j.site_address as siteAddress',
      'j.stage',
      'j.sent_for_check_at as sentForCheckAt',
      // As text: a date has no time zone, and a JavaScript Date would give it one.
      trx.raw('j.measure_on::text as "measureOn"'),
      trx.raw('j.cut_on::text as "cutOn"'),
      trx.raw('j.fit_on::text as "fitOn"'),
      person('j.installer_id', 'pi', 'installer'),
      person('j.designer_id', 'pd', 'designer'),
      person('j.shop_hand_id', 'ps', 'shopHand'),
      'j.created_at as createdAt',
      'j.updated_at as updatedAt',
      'l.id as layoutId',
      'l.seq as layoutSeq',
      'l.thumbnail',
      'r.number as revision',
      'r.layout_seq as revisionSeq',
      trx.raw('r.signed_off_at is not null as "signedOff"'),
    );
}
