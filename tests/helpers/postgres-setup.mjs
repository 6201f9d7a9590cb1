import { startThrowaway } from '../../scripts/pg/throwaway.mjs';

/**
 * Jest runs this once for all projects that name it: one PostgreSQL for the whole run, deleted at the end. Its workers
 * inherit the environment, and so find it.
 */
export default async function startTestPostgres() {
  const { home, url } = await startThrowaway();
  process.env.TEST_POSTGRES_HOME = home;
  process.env.TEST_POSTGRES_URL = url;
}
