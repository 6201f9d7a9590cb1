import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';

import type { Knex } from 'knex';
import { z } from 'zod';

/** Written for the seeds, which make these people. */
const FILE = path.resolve(__dirname, '../seeds/demo-sign-ins.json');

const demoSignIns = z.array(z.object({ role: z.string(), email: z.string(), password: z.string() }));

export type DemoSignIn = z.infer<typeof demoSignIns>[number];

/**
 * Lists how to sign in to the demo shop.
 *
 * @returns those of the seed's people who are in this database; none in a shop's own
 */
export async function presentDemoSignIns(db: Knex): Promise<readonly DemoSignIn[]> {
  if (!existsSync(FILE)) return [];
  const all = demoSignIns.parse(JSON.parse(readFileSync(FILE, 'utf8')));
  const present = await db('people')
    .whereIn(
      'email',
      all.map(({ email }) => email),
    )
    .pluck('email');
  return all.filter(({ email }) => present.includes(email));
}
