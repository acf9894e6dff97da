import pg from 'pg';

/**
 * Gives the role that serves the web what it needs: reading and writing everything, except that
 * the audit log can only be read and added to. Does nothing where the role does not exist or is
 * itself the owner.
 */
export async function grantWebRights(client: pg.Client, webRole: string): Promise<void> {
  const found = await client.query<{ owner: boolean }>(
    'select rolname = current_user as owner from pg_roles where rolname = $1',
    [webRole],
  );
  if (found.rows[0]?.owner !== false) return;
  const role = pg.escapeIdentifier(webRole);
  await client.query(`
    grant usage on schema public to ${role};
    grant select, insert, update, delete on all tables in schema public to ${role};
    grant usage on all sequences in schema public to ${role};
    revoke all on audit from ${role};
    grant select, insert on audit to ${role};
  `);
}
