import type { Knex } from 'knex';

import type { Role } from '@/shared/roles/roles';

export interface CrewMember {
  readonly personId: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly joinedAt: Date;
}

interface CrewRow {
  person_id: string;
  name: string;
  email: string;
  role: Role;
  created_at: Date;
}

/** The person's role in the shop of the transaction, or null for somebody who is not, or no longer, in its crew. */
export async function findRole(trx: Knex.Transaction, personId: string): Promise<Role | null> {
  const row = await trx('memberships').where({ person_id: personId, left_at: null }).first<{ role: Role }>('role');
  return row?.role ?? null;
}

/** The crew in the order of joining. */
export async function listCrew(trx: Knex.Transaction): Promise<CrewMember[]> {
  const rows = await crew(trx).orderBy('m.created_at').orderBy('m.person_id');
  return rows.map(toMember);
}

export async function findMember(trx: Knex.Transaction, personId: string): Promise<CrewMember | null> {
  const row = await crew(trx).where('m.person_id', personId).first();
  return row ? toMember(row) : null;
}

/** Locks the crew until the transaction ends, so that two changes cannot leave the shop without an owner. */
export async function lockCrew(trx: Knex.Transaction): Promise<void> {
  await trx('memberships').forNoKeyUpdate().select('person_id');
}

export async function setRole(trx: Knex.Transaction, personId: string, role: Role): Promise<void> {
  await trx('memberships').where({ person_id: personId }).update({ role });
}

/** Takes a person out of the crew and ends their sign-ins in this shop. */
export async function removeFromCrew(trx: Knex.Transaction, personId: string): Promise<void> {
  await trx('memberships')
    .where({ person_id: personId })
    .update({ left_at: trx.fn.now(3) });
  await trx.raw('select close_sessions_of(?)', [personId]);
}

export async function renamePerson(trx: Knex.Transaction, personId: string, name: string): Promise<void> {
  await trx('people').where({ id: personId }).update({ name });
}

function crew(trx: Knex.Transaction) {
  return trx('memberships as m')
    .join('people as p', 'p.id', 'm.person_id')
    .whereNull('m.left_at')
    .select<CrewRow[]>('m.person_id', 'p.name', 'p.email', 'm.role', 'm.created_at');
}

function toMember(row: CrewRow): CrewMember {
  return { personId: row.person_id, name: row.name, email: row.email, role: row.role, joinedAt: row.created_at };
}
