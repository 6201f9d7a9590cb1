import type { Knex } from 'knex';

import type { Me } from '@/shared/contracts/auth';
import type { Crew, CrewMember } from '@/shared/contracts/crew';
import type { Role } from '@/shared/roles/roles';
import { ProblemError } from '../http/problem-error';
import {
  findMember,
  listCrew,
  lockCrew,
  removeFromCrew,
  renamePerson,
  setRole,
  type CrewMember as CrewRecord,
} from '../repositories/crew-repository';
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
      await this.changed(trx, actor, 'crew.renamed');
      return readMe(trx, actor);
    });
  }

  list(actor: Actor): Promise<Crew> {
    return inShop(this.db, actor, 'crew.see', async (trx) => {
      return { members: (await listCrew(trx)).map(toContract) };
    });
  }

  /** @throws ProblemError not_found; last_owner */
  changeRole(actor: Actor, personId: string, role: Role): Promise<CrewMember> {
    return inShop(this.db, actor, 'crew.edit', async (trx) => {
      const before = await mustBeMember(trx, personId);
      if (role !== 'owner') await mustLeaveAnOwner(trx, before);
      await setRole(trx, personId, role);
      await this.changed(trx, actor, 'crew.role_changed', { personId, from: before.role, to: role });
      return toContract({ ...before, role });
    });
  }

  /** @throws ProblemError not_found; last_owner */
  remove(actor: Actor, personId: string): Promise<void> {
    return inShop(this.db, actor, 'crew.edit', async (trx) => {
      await mustLeaveAnOwner(trx, await mustBeMember(trx, personId));
      await removeFromCrew(trx, personId);
      await this.changed(trx, actor, 'crew.removed', { personId });
    });
  }

  private async changed(trx: Knex.Transaction, actor: Actor, action: string, data: object = {}): Promise<void> {
    await logAct(trx, { shopId: actor.shopId, personId: actor.personId, action, data: { ...data } });
    await announce(trx, actor.shopId, { kind: 'crew' });
  }
}

function toContract({ joinedAt, ...member }: CrewRecord): CrewMember {
  return { ...member, joinedAt: joinedAt.toISOString() };
}

async function mustBeMember(trx: Knex.Transaction, personId: string): Promise<CrewRecord> {
  await lockCrew(trx);
  const member = await findMember(trx, personId);
  if (!member) throw new ProblemError('not_found', 'This person is not in the crew.');
  return member;
}

async function mustLeaveAnOwner(trx: Knex.Transaction, member: CrewRecord): Promise<void> {
  if (member.role !== 'owner') return;
  const owners = (await listCrew(trx)).filter(({ role }) => role === 'owner');
  if (owners.length < 2) throw new ProblemError('last_owner', 'A shop needs an owner: make somebody else owner first.');
}
