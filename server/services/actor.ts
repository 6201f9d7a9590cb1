import type { Role } from '@/shared/roles/roles';

/** Whose request it is. */
export interface Actor {
  readonly personId: string;
  readonly shopId: string;
  readonly role: Role;
  /** When the access token runs out; a stream opened with it ends then. */
  readonly until: Date;
  /** Given where the request creates something. */
  readonly once?: Once;
}

/** Tells a resend from a new request. */
export interface Once {
  readonly key: string;
  /** SHA-256 of what was asked. */
  readonly requestHash: Buffer;
}
