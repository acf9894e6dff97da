import type pg from 'pg';

const tables = ['projects', 'drawings', 'grants', 'calculations', 'members', 'audit'];

/** A text that changes with any row of the project's tables or of the audit log. */
export async function fingerprint(pool: pg.Pool): Promise<string> {
  const one = (table: string) =>
    `(select coalesce(md5(string_agg(t::text, ' ' order by t.id)), '') from ${table} t)`;
  const { rows } = await pool.query<{ print: string }>(
    `select ${tables.map(one).join(" || ' ' || ")} as print`,
  );
  return rows[0]?.print ?? '';
}
