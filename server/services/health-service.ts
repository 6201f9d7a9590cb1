import type { Knex } from 'knex';

import { ProblemError } from '../http/problem-error';
import { databaseAnswers } from '../repositories/health-repository';

/** @throws ProblemError busy while the database does not answer */
export async function checkHealth(db: Knex): Promise<{ status: 'ok' }> {
  if (!(await databaseAnswers(db))) throw new ProblemError('busy', 'The database does not answer. Try again soon.');
  return { status: 'ok' };
}
