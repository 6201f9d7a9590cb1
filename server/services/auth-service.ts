import { randomUUID } from 'node:crypto';

import type { Knex } from 'knex';

import type { Me, Session } from '@/shared/contracts/auth';
import type { Role } from '@/shared/roles/roles';
import { withLookup, withTenant } from '../db/tenant-transaction';
import { ProblemError } from '../http/problem-error';
import { resetMail } from '../mail/mail-texts';
import { findMember } from '../repositories/crew-repository';
import { addMail } from '../repositories/outbox-repository';
import { findShop } from '../repositories/shop-repository';
import {
  acceptInvitation,
  closeSession,
  findInvitation,
  findSignIn,
  openReset,
  openSession,
  rotateSession,
  useReset,
  type Rotation,
} from '../repositories/sign-in-repository';
import { ACCESS_SECONDS, type AccessTokens } from './access-tokens';
import { hashPassword, passwordFits } from './passwords';
import { createSecretToken, hashToken } from './secret-token';

/** A sign-in lasts this long after it was last used. */
export const REFRESH_DAYS = 30;
/** A refresh token may come twice within this time: two tabs, or an answer lost on a weak signal. */
const REFRESH_GRACE_SECONDS = 30;
const RESET_MINUTES = 60;

/** A session and the refresh token for its cookie. */
export interface Opened {
  readonly session: Session;
  readonly refreshToken: string;
}

interface Whose {
  readonly personId: string;
  readonly shopId: string;
  readonly role: Role;
}

/** Sign-in, sign-out, forgotten passwords and joining by invitation. */
export class AuthService {
  constructor(
    private readonly db: Knex,
    private readonly tokens: AccessTokens,
    private readonly publicUrl: string,
  ) {}

  /** @throws ProblemError wrong_sign_in; the same for an unknown address, a wrong password and a shop left */
  async signIn(email: string, password: string, shopId?: string): Promise<Opened> {
    const rows = await withLookup(this.db, (trx) => findSignIn(trx, email));
    const fits = await passwordFits(password, rows[0]?.passwordHash ?? null);
    const row = rows.find((one) => one.shopId !== null && (shopId === undefined || one.shopId === shopId));
    if (!fits || !row?.shopId || !row.role) {
      throw new ProblemError('wrong_sign_in', 'This e-mail address and password do not go together.');
    }
    return this.open({ personId: row.personId, shopId: row.shopId, role: row.role });
  }

  /** @throws ProblemError session_ended, when there is no token or it is unknown, old, ended or a copy */
  async refresh(refreshToken: string | null): Promise<Opened> {
    const ended = new ProblemError('session_ended', 'The sign-in has run out. Sign in again; nothing typed is lost.');
    if (!refreshToken) throw ended;
    const next = createSecretToken();
    // Its own transaction: ending a copied sign-in has to stay done although the request fails.
    const turned = await withLookup(this.db, (trx) =>
      rotateSession(
        trx,
        hashToken(refreshToken),
        { tokenHash: next.tokenHash, expiresAt: refreshExpiry() },
        REFRESH_GRACE_SECONDS,
      ),
    );
    const whose = rotatedFor(turned);
    if (!whose) throw ended;
    return { session: await this.session(whose), refreshToken: next.token };
  }

  async signOut(refreshToken: string | null): Promise<void> {
    if (!refreshToken) return;
    await withLookup(this.db, (trx) => closeSession(trx, hashToken(refreshToken)));
  }

  /** Sends a link to a new password, if the address is known; the caller cannot tell. */
  async requestReset(email: string): Promise<void> {
    const { token, tokenHash } = createSecretToken();
    const expiresAt = new Date(Date.now() + RESET_MINUTES * 60_000);
    const found = await withLookup(this.db, (trx) => openReset(trx, email, tokenHash, expiresAt));
    if (!found) return;
    const text = resetMail(found.name, `${this.publicUrl}/reset?token=${token}`, RESET_MINUTES);
    await withTenant(this.db, { shopId: found.shopId, personId: found.personId, role: '' }, (trx) =>
      addMail(trx, { shopId: found.shopId, kind: 'reset', to: email, ...text }),
    );
  }

  /** @throws ProblemError link_ended */
  async resetPassword(token: string, password: string): Promise<void> {
    const passwordHash = await hashPassword(password);
    const used = await withLookup(this.db, (trx) => useReset(trx, hashToken(token), passwordHash));
    if (!used) throw linkEnded();
  }

  /** @throws ProblemError link_ended */
  async findInvitation(token: string): Promise<{ shopName: string; email: string; role: Role; known: boolean }> {
    const found = await withLookup(this.db, (trx) => findInvitation(trx, hashToken(token)));
    if (!found) throw linkEnded();
    return { shopName: found.shopName, email: found.email, role: found.role, known: found.passwordHash !== null };
  }

  /**
   * Joins a shop. Somebody with an account proves it with its password and keeps its name.
   *
   * @throws ProblemError link_ended; wrong_sign_in
   */
  async join(token: string, name: string, password: string): Promise<Opened> {
    const tokenHash = hashToken(token);
    const found = await withLookup(this.db, (trx) => findInvitation(trx, tokenHash));
    if (!found) throw linkEnded();
    if (found.passwordHash !== null && !(await passwordFits(password, found.passwordHash))) {
      throw new ProblemError(
        'wrong_sign_in',
        'This address has an account already. Type the password of that account.',
      );
    }
    const passwordHash = found.passwordHash ?? (await hashPassword(password));
    const joined = await withLookup(this.db, (trx) => acceptInvitation(trx, tokenHash, name, passwordHash));
    if (!joined) throw linkEnded();
    return this.open(joined);
  }

  private async open(whose: Whose): Promise<Opened> {
    const { token, tokenHash } = createSecretToken();
    await withLookup(this.db, (trx) =>
      openSession(trx, {
        personId: whose.personId,
        shopId: whose.shopId,
        family: randomUUID(),
        tokenHash,
        expiresAt: refreshExpiry(),
      }),
    );
    return { session: await this.session(whose), refreshToken: token };
  }

  private async session(whose: Whose): Promise<Session> {
    const me = await withTenant(this.db, whose, (trx) => readMe(trx, whose));
    return { accessToken: await this.tokens.sign(whose), expiresInSeconds: ACCESS_SECONDS, me };
  }
}

/** Who somebody is in the shop of the transaction. */
export async function readMe(trx: Knex.Transaction, whose: { readonly personId: string }): Promise<Me> {
  const member = await findMember(trx, whose.personId);
  if (!member) throw new ProblemError('session_ended', 'You are no longer in the crew of this shop.');
  const { id, name } = await findShop(trx);
  return {
    personId: member.personId,
    name: member.name,
    email: member.email,
    role: member.role,
    shop: { id, name },
  };
}

function rotatedFor({ outcome, personId, shopId, role }: Rotation): Whose | null {
  return outcome === 'rotated' && personId && shopId && role ? { personId, shopId, role } : null;
}

function refreshExpiry(): Date {
  return new Date(Date.now() + REFRESH_DAYS * 24 * 3600 * 1000);
}

function linkEnded(): ProblemError {
  return new ProblemError('link_ended', 'This link was used already or has run out. Ask for a new one.');
}
