import type { Knex } from 'knex';

import type { Role } from '@/shared/roles/roles';

export interface InvitationRecord {
  readonly id: string;
  readonly email: string;
  readonly role: Role;
  readonly createdAt: Date;
  readonly expiresAt: Date;
}

const COLUMNS = { id: 'id', email: 'email', role: 'role', createdAt: 'created_at', expiresAt: 'expires_at' } as const;

/** Invitations that can still be accepted, newest first. */
export function listOpenInvitations(trx: Knex.Transaction): Promise<InvitationRecord[]> {
  return open(trx).select<InvitationRecord[]>(COLUMNS).orderBy('created_at', 'desc').orderBy('id');
}

/** Makes an invitation; an earlier one to the same address stops working. */
export async function insertInvitation(
  trx: Knex.Transaction,
  invitation: {
    readonly shopId: string;
    readonly invitedBy: string;
    readonly email: string;
    readonly role: Role;
    readonly tokenHash: Buffer;
    readonly expiresAt: Date;
  },
): Promise<InvitationRecord> {
  await open(trx)
    .where({ email: invitation.email })
    .update({ revoked_at: trx.fn.now(3) });
  const [row] = await trx('invitations')
    .insert({
      shop_id: invitation.shopId,
      invited_by: invitation.invitedBy,
      email: invitation.email,
      role: invitation.role,
      token_hash: invitation.tokenHash,
      expires_at: invitation.expiresAt,
    })
    .returning<{ id: string }[]>('id');
  const made = row && (await trx('invitations').where({ id: row.id }).first<InvitationRecord>(COLUMNS));
  if (!made) throw new Error('insert into invitations returned no row');
  return made;
}

/** @returns false when there is no open invitation of this id */
export async function revokeInvitation(trx: Knex.Transaction, id: string): Promise<boolean> {
  return (
    (await open(trx)
      .where({ id })
      .update({ revoked_at: trx.fn.now(3) })) > 0
  );
}

function open(trx: Knex.Transaction) {
  return trx('invitations').whereNull('accepted_at').whereNull('revoked_at').where('expires_at', '>', trx.fn.now());
}
