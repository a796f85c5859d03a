import path from 'node:path';
import { z } from 'zod';

const port = z.coerce.number().int().min(0).max(65_535);
const blankIsAbsent = (value: unknown) => (value === '' ? undefined : value);

const environment = z.object({
  PORT: port.default(4370),
  HOST: z.string().default('127.0.0.1'),
  DATA_DIR: z.preprocess(blankIsAbsent, z.string().optional()),
  MODE: z.enum(['demo', 'shop']).default('demo'),
  PUBLIC_URL: z.preprocess(blankIsAbsent, z.url({ protocol: /^https?$/ }).optional()),
  SMTP_URL: z.preprocess(blankIsAbsent, z.url({ protocol: /^smtps?$/ }).optional()),
  TLS_CERT: z.preprocess(blankIsAbsent, z.string().optional()),
  TLS_KEY: z.preprocess(blankIsAbsent, z.string().optional()),
  /** Where the stand-in mailbox is read; the launcher sets it, in demo mode only. */
  MAILBOX_URL: z.preprocess(blankIsAbsent, z.url().optional()),
  DEMO_DAY: z.preprocess(blankIsAbsent, z.iso.date().optional()),
  SIGN_IN_LIMIT: z.coerce.number().int().min(1).max(100_000).default(10),
  LOG_LEVEL: z.enum(['trace', 'debug', 'info', 'warn', 'error', 'silent']).default('info'),
});

export interface Config {
  port: number;
  host: string;
  dataDir: string;
  mode: 'demo' | 'shop';
  publicUrl: string | undefined;
  smtpUrl: string | undefined;
  tls: { certFile: string; keyFile: string } | undefined;
  mailboxUrl: string | undefined;
  demoDay: string | undefined;
  signInLimit: number;
  logLevel: string;
}

/**
 * Reads the settings, which come from the environment alone.
 * @throws {Error} with one sentence for each setting that makes no sense
 */
export function readConfig(env: NodeJS.ProcessEnv): Config {
  const parsed = environment.safeParse(env);
  if (!parsed.success) {
    const faults = parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`Hidewright cannot start with these settings. ${faults.join('; ')}`);
  }
  const set = parsed.data;
  return {
    port: set.PORT,
    host: set.HOST,
    dataDir: path.resolve(set.DATA_DIR ?? (set.MODE === 'shop' ? 'data-shop' : 'data')),
    mode: set.MODE,
    publicUrl: set.PUBLIC_URL?.replace(/\/$/, ''),
    smtpUrl: set.SMTP_URL,
    tls: readTls(set.TLS_CERT, set.TLS_KEY),
    mailboxUrl: set.MODE === 'demo' ? set.MAILBOX_URL : undefined,
    demoDay: set.DEMO_DAY,
    signInLimit: set.SIGN_IN_LIMIT,
    logLevel: set.LOG_LEVEL,
  };
}

function readTls(certFile: string | undefined, keyFile: string | undefined): Config['tls'] {
  if (certFile === undefined && keyFile === undefined) return undefined;
  if (certFile === undefined || keyFile === undefined) {
    throw new Error('Hidewright needs both TLS_CERT and TLS_KEY, or neither of them.');
  }
  return { certFile, keyFile };
}

/** The database of a data folder. */
export const databaseFile = (dataDir: string): string => path.join(dataDir, 'hidewright.sqlite');
