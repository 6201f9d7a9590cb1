import type { Knex } from 'knex';

import { readDatabaseUrl } from './server/config';
import { MIGRATIONS, SEEDS } from './server/db/migrate';

/** For the knex command line: `NODE_OPTIONS="--import tsx" npx knex migrate:status`, with DATABASE_URL set. */
const config: Knex.Config = {
  client: 'pg',
  connection: readDatabaseUrl(),
  migrations: MIGRATIONS,
  seeds: SEEDS,
};

export default config;
