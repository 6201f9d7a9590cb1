import type { Knex } from 'knex';

import type { WorkAct } from '@/shared/work/work-marks';

interface Row extends Omit<WorkAct, 'at'> {
  readonly at: Date;
}

/** Everything done with the steps of a job, in the order in which it happened. */
export async function listWorkActs(trx: Knex.Transaction, jobId: string): Promise<WorkAct[]> {
  const rows = await trx('work_acts as a')
    .join('people as p', 'p.id', 'a.person_id')
    .where('a.job_id', jobId)
    .orderBy(['a.acted_at', 'a.created_at', 'a.id'])
    .select<Row[]>({
      id: 'a.id',
      step: 'a.step',
      act: 'a.act',
      at: 'a.acted_at',
      waitHours: 'a.wait_hours',
      by: 'p.name',
    });
  return rows.map((row) => ({ ...row, at: row.at.toISOString() }));
}

/** Adds deeds; one that is there already, by its id, stays as it was. Gives the number that was new. */
export async function insertWorkActs(
  trx: Knex.Transaction,
  whose: { readonly shopId: string; readonly personId: string; readonly jobId: string },
  acts: readonly Omit<WorkAct, 'by'>[],
): Promise<number> {
  if (acts.length === 0) return 0;
  const rows = acts.map(({ id, step, act, at, waitHours }) => ({
    id,
    shop_id: whose.shopId,
    job_id: whose.jobId,
    person_id: whose.personId,
    step,
    act,
    acted_at: at,
    wait_hours: waitHours,
  }));
  const added = await trx('work_acts').insert(rows).onConflict('id').ignore().returning<{ id: string }[]>('id');
  return added.length;
}
