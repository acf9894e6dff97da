import { z } from 'zod';

const environment = z.object({
  NODE_ENV: z.enum(['development', 'test', 'production']).default('development'),
  HOST: z.string().min(1).default('127.0.0.1'),
  PORT: z.coerce.number().int().min(0).max(65535).default(4310),
  DATABASE_URL: z.string().min(1),
  /** The role that owns the tables; migrations run as it. */
  DATABASE_OWNER_URL: z.string().min(1).optional(),
  SESSION_SECRET: z.string().min(32, 'at least 32 characters'),
  /** The address people use, such as https://stanchion.example.org; else the request's own. */
  PUBLIC_ORIGIN: z.url().optional(),
  /** Express's `trust proxy`: addresses whose X-Forwarded headers are believed. */
  TRUSTED_PROXIES: z.string().default('loopback'),
  /** Requests are logged at `info`: the default, except on this machine only. */
  LOG_LEVEL: z.enum(['silent', 'error', 'warn', 'info', 'debug']).optional(),
});

export interface Env {
  readonly host: string;
  readonly port: number;
  readonly production: boolean;
  readonly databaseUrl: string;
  readonly ownerUrl: string;
  readonly sessionSecret: string;
  readonly publicOrigin: string | null;
  readonly trustedProxies: string;
  readonly logLevel: string;
  /** Served on this machine only; cookies are then sent without TLS. */
  readonly loopback: boolean;
}

const isLoopback = (host: string) => /^(127\.\d+\.\d+\.\d+|::1|localhost)$/.test(host);

/** Parses the environment; an empty variable is none. Throws one error that lists all that is wrong. */
export function parseEnv(variables: NodeJS.ProcessEnv): Env {
  const given = Object.entries(variables).filter(([, value]) => value !== '');
  const parsed = environment.safeParse(Object.fromEntries(given));
  if (!parsed.success) throw new Error(`Environment:\n${z.prettifyError(parsed.error)}`);
  const env = parsed.data;
  const loopback = isLoopback(env.HOST);
  return {
    host: env.HOST,
    port: env.PORT,
    production: env.NODE_ENV === 'production',
    databaseUrl: env.DATABASE_URL,
    ownerUrl: env.DATABASE_OWNER_URL ?? env.DATABASE_URL,
    sessionSecret: env.SESSION_SECRET,
    publicOrigin: env.PUBLIC_ORIGIN ? new URL(env.PUBLIC_ORIGIN).origin : null,
    trustedProxies: env.TRUSTED_PROXIES,
    logLevel: env.LOG_LEVEL ?? (loopback ? 'warn' : 'info'),
    loopback,
  };
}
