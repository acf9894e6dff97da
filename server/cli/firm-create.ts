import pg from 'pg';
import { z } from 'zod';
import { transaction } from '#server/db/transaction.ts';
import { uniqueViolation } from '#server/db/unique-violation.ts';
import { createAccount } from '#server/features/account/create-account.ts';
import { createFirm } from '#server/features/account/create-firm.ts';
import { makeWelcomeToken } from '#server/features/account/welcome-token.ts';
import { emailAddress } from '#shared/contracts/account.ts';
import { name } from '#shared/contracts/fields.ts';

/*
 * npm run firm:create -- NAME EMAIL
 * Makes a firm and its administrator, and prints the one-time link that sets the password.
 */

const given = z.tuple([name(160), emailAddress]).safeParse(process.argv.slice(2));
if (!given.success) {
  console.error('Usage: npm run firm:create -- NAME EMAIL');
  console.error(z.prettifyError(given.error));
  process.exit(2);
}
const [firmName, email] = given.data;
const { DATABASE_URL, PUBLIC_ORIGIN, HOST, PORT } = process.env;
const origin = PUBLIC_ORIGIN
  ? new URL(PUBLIC_ORIGIN).origin
  : `http://${HOST || '127.0.0.1'}:${PORT || 4310}`;
const pool = new pg.Pool({ connectionString: DATABASE_URL, max: 1 });
try {
  const now = new Date();
  const token = await transaction(pool, async (tx) => {
    const firmId = await createFirm(tx, firmName, now);
    const administrator = {
      name: email.slice(0, email.indexOf('@')),
      email,
      firm: { firmId, role: 'administrator' },
      passwordHash: null,
    } as const;
    return makeWelcomeToken(tx, await createAccount(tx, administrator, now), now);
  });
  process.stdout.write(
    `${firmName} is made. Its administrator sets a password within 72 hours at\n` +
      `${origin}/welcome/${token}\n`,
  );
} catch (error) {
  console.error(reasonOf(error));
  process.exitCode = 1;
} finally {
  await pool.end();
}

function reasonOf(error: unknown): string {
  if (uniqueViolation(error) === 'users_email') return `${email} has an account already.`;
  const { code } = ((error as Error).cause ?? error) as { code?: unknown };
  // PostgreSQL: undefined table.
  if (code === '42P01') return 'The database is empty: start Stanchion once, which fills it.';
  throw error;
}
