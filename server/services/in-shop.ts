import type { Knex } from 'knex';

import { may, ROLE_NAMES, type Permission } from '@/shared/roles/roles';
import { withTenant } from '../db/tenant-transaction';
import { ProblemError } from '../http/problem-error';
import { findRole } from '../repositories/crew-repository';
import { claimKey, keepAnswer } from '../repositories/idempotency-repository';
import type { Actor } from './actor';

/**
 * Runs `work` in a transaction that sees only the actor's shop.
 *
 * @param permission - what the work takes; 'member' for anybody of the shop
 * @throws ProblemError not_allowed; session_ended when the role has changed since the access token was made
 */
export function inShop<T>(
  db: Knex,
  actor: Actor,
  permission: Permission | 'member',
  work: (trx: Knex.Transaction) => Promise<T>,
): Promise<T> {
  if (permission !== 'member' && !may(actor.role, permission)) throw notAllowed(actor);
  return withTenant(db, actor, async (trx) => {
    // A token outlives a change of the crew by minutes; the membership decides.
    const role = await findRole(trx, actor.personId);
    if (role !== actor.role)
      throw new ProblemError('session_ended', 'Your part in the shop has changed. Sign in again.');
    return work(trx);
  });
}

/**
 * As `inShop`, for work that creates something: a resend of the same request gets the first answer again.
 *
 * @throws ProblemError idempotency_key_reused when the key came with another request before
 */
export function inShopOnce<T extends object>(
  db: Knex,
  actor: Actor,
  permission: Permission | 'member',
  work: (trx: Knex.Transaction) => Promise<T>,
): Promise<T> {
  const { once } = actor;
  if (!once) throw new TypeError('the contract of this route has to say that it creates something');
  return inShop(db, actor, permission, async (trx) => {
    const claim = await claimKey(trx, actor, once);
    if (claim.kind === 'other_request') {
      throw new ProblemError('idempotency_key_reused', 'This Idempotency-Key was sent with another request before.');
    }
    if (claim.kind === 'answered') return claim.answer as T;
    const answer = await work(trx);
    await keepAnswer(trx, actor, once, answer);
    return answer;
  });
}

export function notAllowed(actor: Actor): ProblemError {
  return new ProblemError('not_allowed', `${ROLE_NAMES[actor.role]}s cannot do this. Ask the owner of the shop.`);
}
