import { jwtVerify, SignJWT } from 'jose';
import { z } from 'zod';

import { ROLES } from '@/shared/roles/roles';
import type { Actor } from './actor';

const ISSUER = 'offsquare';
const ALGORITHM = 'HS256';

/** Short, since a stolen access token cannot be taken back. */
export const ACCESS_SECONDS = 600;

const claimsSchema = z.object({
  sub: z.uuid(),
  shop: z.uuid(),
  role: z.enum(ROLES),
  exp: z.number(),
});

export interface AccessTokens {
  sign(actor: Pick<Actor, 'personId' | 'shopId' | 'role'>): Promise<string>;
  /** Null when the token is not ours, was changed or has run out. */
  read(token: string): Promise<Actor | null>;
}

/** Signs and reads access tokens (JWT, HS256). @param secret - 32 characters or more */
export function createAccessTokens(secret: string): AccessTokens {
  const key = new TextEncoder().encode(secret);
  return {
    sign: ({ personId, shopId, role }) =>
      new SignJWT({ shop: shopId, role })
        .setProtectedHeader({ alg: ALGORITHM })
        .setSubject(personId)
        .setIssuer(ISSUER)
        .setIssuedAt()
        .setExpirationTime(`${ACCESS_SECONDS}s`)
        .sign(key),

    async read(token) {
      const verified = await jwtVerify(token, key, { issuer: ISSUER, algorithms: [ALGORITHM] }).catch(() => null);
      const claims = claimsSchema.safeParse(verified?.payload);
      if (!claims.success) return null;
      const { sub, shop, role, exp } = claims.data;
      return { personId: sub, shopId: shop, role, until: new Date(exp * 1000) };
    },
  };
}
