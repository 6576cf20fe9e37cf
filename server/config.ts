import { z } from 'zod';

/** Everything the server is told from outside, read once at start. */
const environment = z.object({
  DATABASE_URL: z.string().min(1),
  HOST: z.string().default('127.0.0.1'),
  PORT: z.coerce.number().int().min(0).max(65_535).default(3000),
  PUBLIC_URL: z.url().optional(),
  TLS_CERT: z.string().optional(),
  TLS_KEY: z.string().optional(),
  JWT_SECRET: z.string().min(32),
  COOKIE_SECRET: z.string().min(32),
  STORE_FOLDER: z.string().default('.data/store'),
  CLIENT_FOLDER: z.string().default('dist'),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('info'),
});

export interface RateLimits {
  windowMs: number;
  /** Wrong sign-ins within the window from one address, and for one mail. */
  signInPerAddress: number;
  signInPerMail: number;
  /** Requests a minute from one address. */
  requestsPerMinute: number;
}

export interface ServerConfig {
  databaseUrl: string;
  host: string;
  port: number;
  publicUrl?: string;
  tls?: { cert: string; key: string };
  jwtSecret: string;
  cookieSecret: string;
  storeFolder: string;
  clientFolder: string;
  logLevel: string;
  bcryptRounds: number;
  /** Milliseconds. */
  accessLife: number;
  refreshLife: number;
  /** A refresh token that was just replaced still answers this long: two tabs ask at the same moment. */
  refreshGrace: number;
  rateLimits: RateLimits;
  /** Cookies are sent over https only. */
  secureCookies: boolean;
}

const MINUTE = 60_000;
const DAY = 24 * 60 * MINUTE;

export const usualRateLimits: RateLimits = {
  windowMs: 15 * MINUTE,
  signInPerAddress: 60,
  signInPerMail: 10,
  requestsPerMinute: 1200,
};

/** Reads the environment. Throws with every wrong or missing name in one sentence. */
export function serverConfig(env: NodeJS.ProcessEnv = process.env): ServerConfig {
  // An empty variable is one that is not set.
  const given = Object.fromEntries(Object.entries(env).filter(([, value]) => value !== ''));
  const read = environment.safeParse(given);
  if (!read.success) {
    const names = read.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`The server's settings are not complete. ${names.join('; ')}`);
  }
  const e = read.data;
  if ((e.TLS_CERT === undefined) !== (e.TLS_KEY === undefined)) {
    throw new Error('TLS_CERT and TLS_KEY belong together: give both, or neither for plain http.');
  }
  return {
    databaseUrl: e.DATABASE_URL,
    host: e.HOST,
    port: e.PORT,
    publicUrl: e.PUBLIC_URL,
    tls: e.TLS_CERT && e.TLS_KEY ? { cert: e.TLS_CERT, key: e.TLS_KEY } : undefined,
    jwtSecret: e.JWT_SECRET,
    cookieSecret: e.COOKIE_SECRET,
    storeFolder: e.STORE_FOLDER,
    clientFolder: e.CLIENT_FOLDER,
    logLevel: e.LOG_LEVEL,
    bcryptRounds: 12,
    accessLife: 10 * MINUTE,
    refreshLife: 30 * DAY,
    refreshGrace: 10_000,
    rateLimits: usualRateLimits,
    secureCookies: e.TLS_CERT !== undefined || (e.PUBLIC_URL?.startsWith('https:') ?? false),
  };
}
