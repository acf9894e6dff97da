import pg from 'pg';

/** The same server and role, another database. */
export function databaseUrl(url: string, name: string): string {
  const other = new URL(url);
  other.pathname = `/${name}`;
  return other.href;
}

/** Runs SQL over a connection of its own and gives the rows. */
export async function runSql<Row extends pg.QueryResultRow>(
  url: string,
  sql: string,
): Promise<Row[]> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return (await client.query<Row>(sql)).rows;
  } finally {
    await client.end();
  }
}
