import { z } from 'zod';

import { ROLES } from '../roles/roles';
import { contract } from './contract';
import { email, given, newPassword, token, uuid } from './fields';

export const meSchema = z.strictObject({
  personId: uuid,
  name: z.string(),
  email: z.string(),
  role: z.enum(ROLES),
  shop: z.strictObject({ id: uuid, name: z.string() }),
});

export type Me = z.infer<typeof meSchema>;

/** The access token is kept in memory only; the refresh token travels in a cookie that scripts cannot read. */
export const sessionSchema = z.strictObject({
  accessToken: z.string(),
  expiresInSeconds: z.number().int().positive(),
  me: meSchema,
});

export type Session = z.infer<typeof sessionSchema>;

export const signIn = contract({
  method: 'post',
  path: '/auth/sign-in',
  summary: 'Sign in with e-mail and password; sets the refresh cookie.',
  may: 'public',
  body: z.strictObject({
    email,
    password: z.string().min(1).max(200),
    /** Which shop, for somebody who works in several; else the first joined. */
    shopId: uuid.optional(),
  }),
  response: sessionSchema,
  problems: ['wrong_sign_in'],
});

export const refresh = contract({
  method: 'post',
  path: '/auth/refresh',
  summary: 'Exchange the refresh cookie for a new access token; the cookie changes each time.',
  may: 'public',
  response: sessionSchema,
  problems: ['session_ended'],
});

export const signOut = contract({
  method: 'post',
  path: '/auth/sign-out',
  summary: 'End this sign-in on every tab; always succeeds.',
  may: 'public',
  response: null,
  problems: [],
});

export const requestReset = contract({
  method: 'post',
  path: '/auth/reset-requests',
  summary: 'Ask for a mail with a link to a new password; the answer is the same for an unknown address.',
  may: 'public',
  body: z.strictObject({ email }),
  response: null,
  problems: [],
});

export const resetPassword = contract({
  method: 'post',
  path: '/auth/resets',
  summary: 'Set a new password with the token from the mail; ends every sign-in of the person.',
  may: 'public',
  body: z.strictObject({ token, password: newPassword }),
  response: null,
  problems: ['link_ended'],
});

export const findInvitation = contract({
  method: 'post',
  path: '/auth/invitations',
  summary: 'What an invitation is for, by the token from the mail.',
  may: 'public',
  body: z.strictObject({ token }),
  response: z.strictObject({
    shopName: z.string(),
    email: z.string(),
    role: z.enum(ROLES),
    /** The address has an account already: joining takes its password and keeps its name. */
    known: z.boolean(),
  }),
  problems: ['link_ended'],
});

export const join = contract({
  method: 'post',
  path: '/auth/join',
  summary: 'Accept an invitation and sign in.',
  may: 'public',
  body: z.strictObject({ token, name: given(80), password: newPassword }),
  response: sessionSchema,
  problems: ['link_ended', 'wrong_sign_in'],
});

export const getMe = contract({
  method: 'get',
  path: '/me',
  summary: 'Who is signed in, with role and shop.',
  may: 'member',
  response: meSchema,
  problems: [],
});

export const updateMe = contract({
  method: 'patch',
  path: '/me',
  summary: 'Change the own name.',
  may: 'member',
  body: z.strictObject({ name: given(80) }),
  response: meSchema,
  problems: [],
});
