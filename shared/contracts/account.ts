import { z } from 'zod';
import { firmRoles, roles } from '#shared/policy/permissions.ts';
import { anyone, contract, signedIn } from './contract.ts';
import { id, line, noParams } from './fields.ts';

export const passwordMinimum = 12;

/** A new password: its length is its only rule, at most what is hashed in reasonable time. */
export const newPassword = z
  .string()
  .min(passwordMinimum, `at least ${passwordMinimum} characters`)
  .max(200, 'at most 200 characters');

export const emailAddress = z.string().trim().toLowerCase().max(254).pipe(z.email());

export const person = z.object({
  id,
  name: z.string(),
  email: z.string(),
  firm: z.object({ id, name: z.string(), role: z.enum(firmRoles) }).nullable(),
});
export type Person = z.infer<typeof person>;

/** Accounts shown on the sign-in page; null outside demo mode. */
export const demoAccounts = z.object({
  password: z.string(),
  accounts: z.array(z.object({ name: z.string(), email: z.string(), role: z.enum(roles) })),
});

/** The browser's session. `csrfToken` goes into the header `x-csrf-token` of every change. */
export const sessionState = z.object({
  user: person.nullable(),
  csrfToken: z.string(),
  demo: demoAccounts.nullable(),
});
export type SessionState = z.infer<typeof sessionState>;

export const csrfHeader = 'x-csrf-token';

export const welcomeParams = z.object({ token: z.string().min(20).max(100) });

export const account = {
  showSession: contract({
    method: 'GET',
    path: '/api/session',
    access: anyone,
    params: noParams,
    body: null,
    answer: sessionState,
  }),
  signIn: contract({
    method: 'POST',
    path: '/api/session',
    access: anyone,
    params: noParams,
    body: z.object({ email: line(254), password: z.string().max(200) }),
    answer: sessionState,
  }),
  signOut: contract({
    method: 'DELETE',
    path: '/api/session',
    access: signedIn,
    params: noParams,
    body: null,
    answer: sessionState,
  }),
  /** Ends every other session of the person. */
  changePassword: contract({
    method: 'POST',
    path: '/api/account/password',
    access: signedIn,
    params: noParams,
    body: z.object({ current: z.string().max(200), next: newPassword }),
    answer: sessionState,
  }),
  /** The one-time link: who it is for. Not found once used or older than 72 hours. */
  showWelcome: contract({
    method: 'GET',
    path: '/api/welcome/:token',
    access: anyone,
    params: welcomeParams,
    body: null,
    answer: z.object({ name: z.string(), email: z.string(), firm: z.string().nullable() }),
  }),
  /** Sets the password and signs in. */
  acceptWelcome: contract({
    method: 'POST',
    path: '/api/welcome/:token',
    access: anyone,
    params: welcomeParams,
    body: z.object({ password: newPassword }),
    answer: sessionState,
  }),
};
