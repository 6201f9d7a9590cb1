import type { Knex } from 'knex';

import type { Invitation } from '@/shared/contracts/crew';
import type { Role } from '@/shared/roles/roles';
import { ProblemError } from '../http/problem-error';
import { invitationMail } from '../mail/mail-texts';
import { logAct } from '../repositories/audit-repository';
import { findMember, listCrew } from '../repositories/crew-repository';
import {
  insertInvitation,
  listOpenInvitations,
  revokeInvitation,
  type InvitationRecord,
} from '../repositories/invitation-repository';
import { addMail } from '../repositories/outbox-repository';
import type { Actor } from './actor';
import { announce } from './event-hub';
import { inShop, inShopOnce } from './in-shop';
import { readShop } from './read-shop';
import { createSecretToken } from './secret-token';

const INVITATION_DAYS = 7;

/** Asking people into the crew. */
export class InvitationService {
  constructor(
    private readonly db: Knex,
    private readonly publicUrl: string,
  ) {}

  list(actor: Actor): Promise<{ invitations: Invitation[] }> {
    return inShop(this.db, actor, 'crew.edit', async (trx) => ({
      invitations: (await listOpenInvitations(trx)).map(toInvitation),
    }));
  }

  /** Sends a mail with a link; an earlier link to the same address stops working. @throws ProblemError already_in_crew */
  invite(actor: Actor, email: string, role: Role): Promise<Invitation> {
    return inShopOnce(this.db, actor, 'crew.edit', async (trx) => {
      if ((await listCrew(trx)).some((member) => member.email === email)) {
        throw new ProblemError('already_in_crew', 'Somebody with this address is in the crew already.');
      }
      const { token, tokenHash } = createSecretToken();
      const expiresAt = new Date(Date.now() + INVITATION_DAYS * 24 * 3600 * 1000);
      const whose = { shopId: actor.shopId, invitedBy: actor.personId };
      const made = await insertInvitation(trx, { ...whose, email, role, tokenHash, expiresAt });
      const [shop, inviter] = [await readShop(trx), await findMember(trx, actor.personId)];
      const link = `${this.publicUrl}/join?token=${token}`;
      const text = invitationMail(shop.name, inviter?.name ?? shop.name, role, link, INVITATION_DAYS);
      await addMail(trx, { shopId: actor.shopId, kind: 'invitation', to: email, ...text });
      await this.changed(trx, actor, 'crew.invited', { role });
      return toInvitation(made);
    });
  }

  /** @throws ProblemError not_found */
  revoke(actor: Actor, invitationId: string): Promise<void> {
    return inShop(this.db, actor, 'crew.edit', async (trx) => {
      if (!(await revokeInvitation(trx, invitationId))) {
        throw new ProblemError('not_found', 'This invitation was accepted, taken back or has run out.');
      }
      await this.changed(trx, actor, 'crew.invitation_revoked', {});
    });
  }

  private async changed(trx: Knex.Transaction, actor: Actor, action: string, data: object): Promise<void> {
    await logAct(trx, { shopId: actor.shopId, personId: actor.personId, action, data: { ...data } });
    await announce(trx, actor.shopId, { kind: 'crew' });
  }
}

function toInvitation({ id, email, role, createdAt, expiresAt }: InvitationRecord): Invitation {
  return { id, email, role, createdAt: createdAt.toISOString(), expiresAt: expiresAt.toISOString() };
}
