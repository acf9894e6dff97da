import type { Role } from '#shared/policy/permissions.ts';

interface DemoAccount {
  readonly name: string;
  readonly email: string;
  readonly role: Role;
}

/** Invented people, one per role. They exist in demo mode only. */
export const demoAccounts: readonly DemoAccount[] = [
  { name: 'Ines Marlow', email: 'ines.marlow@harrow-pike.example', role: 'engineer' },
  { name: 'Tomas Okoye', email: 'tomas.okoye@harrow-pike.example', role: 'reviewer' },
  { name: 'Greta Lindqvist', email: 'greta.lindqvist@harrow-pike.example', role: 'issuer' },
  { name: 'Samir Haddad', email: 'samir.haddad@ternquay-port.example', role: 'reader' },
];

export const isDemoAccount = (email: string) =>
  demoAccounts.some((account) => account.email === email);

/** Not a secret: the sign-in page shows it in demo mode. */
export const demoPassword = 'ferry hall columns';
