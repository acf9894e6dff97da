import { randomUUID } from 'node:crypto';
import { hashPassword } from '#server/auth/password.ts';
import { grants } from '#server/db/schema/grants.ts';
import { transaction } from '#server/db/transaction.ts';
import { createAccount } from '#server/features/account/create-account.ts';
import { createFirm } from '#server/features/account/create-firm.ts';
import type { FirmRole, Role } from '#shared/policy/permissions.ts';
import type { ApiClient } from './api-client.ts';
import type { Api } from './start-api.ts';

export const password = 'a long enough password';
let passwordHash: Promise<string> | undefined;

export const addFirm = (api: Api, name: string) =>
  transaction(api.deps.pool, (tx) => createFirm(tx, name, api.deps.now()));

export interface Somebody {
  readonly id: string;
  readonly email: string;
  readonly client: ApiClient;
}

type Firm = { firmId: string; role: FirmRole } | null;

/** Adds a person. */
export async function addAccount(api: Api, name: string, firm: Firm) {
  passwordHash ??= hashPassword(password);
  const email = `${name.toLowerCase().replaceAll(' ', '.')}@people.example`;
  const account = { name, email, firm, passwordHash: await passwordHash };
  const id = await transaction(api.deps.pool, (tx) => createAccount(tx, account, api.deps.now()));
  return { id, email };
}

/** Adds a person and signs them in. */
export async function addPerson(api: Api, name: string, firm: Firm): Promise<Somebody> {
  const { id, email } = await addAccount(api, name, firm);
  const client = api.client();
  const answer = await client.signIn(email, password);
  if (answer.status !== 200) throw new Error(`${name} could not sign in: ${answer.text}`);
  return { id, email, client };
}

/** Gives a person roles in a project, or in one calculation of it. */
export async function grant(
  api: Api,
  userId: string,
  where: { projectId: string; calculationId?: string },
  roles: Role[],
): Promise<void> {
  await api.deps.db.insert(grants).values({ id: randomUUID(), userId, ...where, roles });
}
