import type { Knex } from 'knex';

import type { Me } from '@/shared/contracts/auth';
import type { Crew } from '@/shared/contracts/crew';
import { listCrew, renamePerson } from '../repositories/crew-repository';
import { logAct } from '../repositories/audit-repository';
import type { Actor } from './actor';
import { readMe } from './auth-service';
import { announce } from './event-hub';
import { inShop } from './in-shop';

/** The people of a shop, and oneself. */
export class CrewService {
  constructor(private readonly db: Knex) {}

  me(actor: Actor): Promise<Me> {
    return inShop(this.db, actor, 'member', (trx) => readMe(trx, actor));
  }

  rename(actor: Actor, name: string): Promise<Me> {
    return inShop(this.db, actor, 'member', async (trx) => {
      await renamePerson(trx, actor.personId, name);
      await logAct(trx, { shopId: actor.shopId, personId: actor.personId, action: 'crew.renamed' });
      await announce(trx, actor.shopId, { kind: 'crew' });
      return readMe(trx, actor);
    });
  }

  list(actor: Actor): Promise<Crew> {
    return inShop(this.db, actor, 'crew.see', async (trx) => {
      const members = await listCrew(trx);
      return { members: members.map(({ joinedAt, ...member }) => ({ ...member, joinedAt: joinedAt.toISOString() })) };
    });
  }
}
