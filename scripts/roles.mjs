import { join } from 'node:path';
import { mustRun } from './run.mjs';

/** Runs SQL with psql over a connection URL; stops at the first error. */
function psql(bin, url, sql) {
  const { username, password, hostname, port, pathname } = new URL(url);
  const env = {
    ...process.env,
    ...{ PGHOST: hostname, PGPORT: port, PGDATABASE: pathname.slice(1) },
    ...{ PGUSER: username, PGPASSWORD: password, PGCONNECT_TIMEOUT: '10' },
  };
  const args = ['-X', '-q', '-v', 'ON_ERROR_STOP=1', '-f', '-'];
  return mustRun(join(bin, 'psql'), args, { env, input: sql, quiet: true });
}

/** The web process's role, which owns nothing: what it may do is granted by the migrations. */
export function ensureWebRole(cluster, password) {
  return psql(
    cluster.bin,
    cluster.url('postgres'),
    `SELECT 'CREATE ROLE stanchion_web' WHERE NOT EXISTS
       (SELECT FROM pg_roles WHERE rolname = 'stanchion_web') \\gexec
     ALTER ROLE stanchion_web LOGIN NOSUPERUSER NOCREATEDB NOCREATEROLE PASSWORD '${password}';`,
  );
}

/** The application's database, which only its owner and the web role may enter. */
export function ensureDatabase(cluster, name) {
  return psql(
    cluster.bin,
    cluster.url('postgres'),
    `SELECT 'CREATE DATABASE ${name}' WHERE NOT EXISTS
       (SELECT FROM pg_database WHERE datname = '${name}') \\gexec
     REVOKE ALL ON DATABASE ${name} FROM PUBLIC;
     GRANT CONNECT ON DATABASE ${name} TO stanchion_web;`,
  );
}

/** The same URL under the web role. */
export function asWebRole(url, password) {
  const web = new URL(url);
  web.username = 'stanchion_web';
  web.password = password;
  return web.href;
}
