import { stopThrowaway } from '../../scripts/pg/throwaway.mjs';

export default async function stopTestPostgres() {
  if (process.env.TEST_POSTGRES_HOME) await stopThrowaway(process.env.TEST_POSTGRES_HOME);
}
