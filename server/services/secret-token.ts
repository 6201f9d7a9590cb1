import { createHash, randomBytes } from 'node:crypto';

const TOKEN_BYTES = 32;

export interface SecretToken {
  /** For the person; never stored. */
  readonly token: string;
  /** For the database: whoever reads it there cannot use it. */
  readonly tokenHash: Buffer;
}

export function createSecretToken(): SecretToken {
  const token = randomBytes(TOKEN_BYTES).toString('base64url');
  return { token, tokenHash: hashToken(token) };
}

/** SHA-256; a random token of 256 bits needs no salt and no slow hash. */
export function hashToken(token: string): Buffer {
  return createHash('sha256').update(token).digest();
}
