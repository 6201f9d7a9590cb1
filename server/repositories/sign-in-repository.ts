import type { Knex } from 'knex';

import type { Role } from '@/shared/roles/roles';

/** One row for each shop that the person works in; one with `shopId` null for somebody in no shop. */
export interface SignInRow {
  readonly personId: string;
  readonly name: string;
  readonly passwordHash: string;
  readonly shopId: string | null;
  readonly shopName: string | null;
  readonly role: Role | null;
}

export interface Rotation {
  readonly outcome: 'rotated' | 'unknown' | 'ended' | 'reused';
  readonly personId: string | null;
  readonly shopId: string | null;
  readonly role: Role | null;
}

export interface FoundInvitation {
  readonly shopId: string;
  readonly shopName: string;
  readonly email: string;
  readonly role: Role;
  /** Of somebody who has an account already. */
  readonly passwordHash: string | null;
}

export interface Joined {
  readonly personId: string;
  readonly shopId: string;
  readonly role: Role;
}

/** The person with this address and the shops they work in; empty for nobody. */
export function findSignIn(trx: Knex.Transaction, email: string): Promise<SignInRow[]> {
  return ask<SignInRow>(
    trx,
    `select person_id as "personId", name, password_hash as "passwordHash", shop_id as "shopId",
            shop_name as "shopName", role
     from find_sign_in(?)`,
    [email],
  );
}

export async function openSession(
  trx: Knex.Transaction,
  session: { personId: string; shopId: string; family: string; tokenHash: Buffer; expiresAt: Date },
): Promise<void> {
  const { personId, shopId, family, tokenHash, expiresAt } = session;
  await ask(trx, 'select open_session(?, ?, ?, ?, ?)', [personId, shopId, family, tokenHash, expiresAt]);
}

/**
 * Exchanges one refresh token for the next. 'reused': the token was exchanged before, longer ago than the grace, and the
 * whole sign-in has been ended for it; the caller has to let the transaction commit.
 */
export async function rotateSession(
  trx: Knex.Transaction,
  tokenHash: Buffer,
  next: { readonly tokenHash: Buffer; readonly expiresAt: Date },
  graceSeconds: number,
): Promise<Rotation> {
  const [row] = await ask<Rotation>(
    trx,
    `select outcome, person_id as "personId", shop_id as "shopId", role
     from rotate_session(?, ?, ?, make_interval(secs => ?))`,
    [tokenHash, next.tokenHash, next.expiresAt, graceSeconds],
  );
  if (!row) throw new Error('rotate_session gave no row');
  return row;
}

export async function closeSession(trx: Knex.Transaction, tokenHash: Buffer): Promise<void> {
  await ask(trx, 'select close_session(?)', [tokenHash]);
}

/** Null for an unknown address, or for somebody in no shop. Earlier links of the same person stop working. */
export async function openReset(
  trx: Knex.Transaction,
  email: string,
  tokenHash: Buffer,
  expiresAt: Date,
): Promise<{ personId: string; name: string; shopId: string } | null> {
  const rows = await ask<{ personId: string; name: string; shopId: string }>(
    trx,
    'select person_id as "personId", name, shop_id as "shopId" from open_reset(?, ?, ?)',
    [email, tokenHash, expiresAt],
  );
  return rows[0] ?? null;
}

/** False when the link was used, replaced or has run out. */
export async function useReset(trx: Knex.Transaction, tokenHash: Buffer, passwordHash: string): Promise<boolean> {
  const [row] = await ask<{ used: boolean }>(trx, 'select use_reset(?, ?) as used', [tokenHash, passwordHash]);
  return row?.used ?? false;
}

export async function findInvitation(trx: Knex.Transaction, tokenHash: Buffer): Promise<FoundInvitation | null> {
  const rows = await ask<FoundInvitation>(
    trx,
    `select shop_id as "shopId", shop_name as "shopName", email, role, password_hash as "passwordHash"
     from find_invitation(?)`,
    [tokenHash],
  );
  return rows[0] ?? null;
}

/** Null when the link was used, taken back or has run out since it was looked at. */
export async function acceptInvitation(
  trx: Knex.Transaction,
  tokenHash: Buffer,
  name: string,
  passwordHash: string,
): Promise<Joined | null> {
  const rows = await ask<Joined>(
    trx,
    'select person_id as "personId", shop_id as "shopId", role from accept_invitation(?, ?, ?)',
    [tokenHash, name, passwordHash],
  );
  return rows[0] ?? null;
}

async function ask<Row>(trx: Knex.Transaction, sql: string, values: readonly Knex.RawBinding[]): Promise<Row[]> {
  const { rows } = await trx.raw<{ rows: Row[] }>(sql, values);
  return rows;
}
