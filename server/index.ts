import path from 'node:path';

import type { Knex } from 'knex';
import { pino } from 'pino';

import { createApp } from './app';
import { type Config, ConfigError, readConfig } from './config';
import { connect } from './db/connect';
import { migrate, seedWhenEmpty } from './db/migrate';
import { DatabaseUnreachableError, reach } from './db/reach';
import { type DemoSignIn, presentDemoSignIns } from './demo-sign-ins';
import { close, listen, ListenError } from './listen';
import { startWork } from './work/start-work';

const WEB_ROOT = path.resolve(__dirname, '../dist');

async function main(): Promise<void> {
  const config = readConfig();
  const db = connect(config.databaseUrl);
  try {
    await reach(db, config.databaseUrl);
    if (process.argv.includes('--check')) await check(config);
    else await serve(config, db);
  } finally {
    await db.destroy();
  }
}

/** Takes the port and gives it back: `npm start` asks before it spends a minute on the build. */
async function check(config: Config): Promise<void> {
  const server = await listen(() => {}, config.port, config.host);
  await close(server);
}

async function serve(config: Config, db: Knex): Promise<void> {
  await prepare(config, db);
  const log = pino({ level: config.logLevel });
  const server = await listen(createApp({ config, db, log, webRoot: WEB_ROOT }), config.port, config.host);
  const work = startWork({ config, db, log });
  const stopped = stopSignal();
  console.log(greeting(config, await presentDemoSignIns(db)));
  console.log(`\n${await stopped}: closing.`);
  await Promise.all([close(server), work.stop()]);
}

async function prepare(config: Config, db: Knex): Promise<void> {
  const applied = await migrate(db);
  if (applied.length > 0) console.log(`Database: ${applied.length} migrations applied.`);
  if (config.seedDemo && (await seedWhenEmpty(db))) console.log('Database: filled with the demo shop.');
}

/** Resolves when somebody asks the server to stop, or when the program that started it is gone. */
function stopSignal(): Promise<string> {
  return new Promise((resolve) => {
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.once(signal, () => resolve('Stopping'));
    process.once('disconnect', () => resolve('npm start is gone'));
  });
}

function greeting(config: Config, signIns: readonly DemoSignIn[]): string {
  const lines = [`Offsquare is ready at ${config.publicUrl}`];
  if (signIns.length > 0) {
    const width = Math.max(...signIns.map(({ email }) => email.length));
    lines.push('Demo sign-ins (e-mail, password):');
    for (const { email, password, role } of signIns)
      lines.push(`  ${email.padEnd(width)}  ${password}  ${role.replaceAll('_', ' ')}`);
  }
  lines.push('Ctrl-C stops it.');
  return lines.join('\n');
}

/** System error and SQLSTATE of a full disk. */
const FULL_DISK = ['ENOSPC', '53100'];
const INSUFFICIENT_PRIVILEGE = '42501';

/** One sentence for what a person can put right; anything else with its stack. */
function told(error: unknown): unknown {
  if (error instanceof ConfigError || error instanceof ListenError || error instanceof DatabaseUnreachableError) {
    return error.message;
  }
  const { code = '' } = error as { code?: string };
  if (FULL_DISK.includes(code)) {
    return 'The disk that holds the database is full: free some space there, then run the same command again.';
  }
  if (code === INSUFFICIENT_PRIVILEGE) {
    // knex puts the whole statement before the server's own words.
    const reason = (error as Error).message.split(' - ').at(-1);
    return `The user in DATABASE_URL may not set the database up (${reason}): give it the database and the right to create roles.`;
  }
  return error;
}

main().then(
  // Timers of libraries must not keep a server alive that has closed everything.
  () => process.exit(0),
  (error: unknown) => {
    console.error(told(error));
    process.exit(1);
  },
);
