/** The only reader of the environment: parses it, or refuses to start with every reason. */
import { z } from 'zod';

const environment = z.object({
  NODE_ENV: z.enum(['production', 'development', 'test']).default('development'),
  DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }),
  PORT: z.coerce.number().int().min(0).max(65535).default(4310),
  HOST: z.string().default('127.0.0.1'),
  /** Where people reach this server: mail links use it, never a request's Host header. */
  BASE_URL: z.url({ protocol: /^https?$/ }).default('http://localhost:4310'),
  SESSION_SECRET: z.string().min(32, 'must have 32 characters or more'),
  SMTP_URL: z.url({ protocol: /^smtps?$/ }),
  MAIL_FROM: z.string().default('Coldloop <coldloop@localhost>'),
  /** Folder of the local mail fake; its page is served only when this is set and never in production. */
  DEV_MAIL_FOLDER: z.string().optional(),
  TRUST_PROXY: z.coerce.number().int().min(0).default(0),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('info'),
});

export interface Config {
  production: boolean;
  databaseUrl: string;
  port: number;
  host: string;
  baseUrl: string;
  sessionSecret: string;
  smtpUrl: string;
  mailFrom: string;
  devMailFolder: string | null;
  trustProxy: number;
  logLevel: string;
}

/** @throws Error listing every setting that is missing or wrong. */
export function readConfig(env: Record<string, string | undefined> = process.env): Config {
  const parsed = environment.safeParse(env);
  if (!parsed.success) {
    const reasons = parsed.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`These settings stop the start:\n${reasons.join('\n')}`);
  }
  const value = parsed.data;
  const production = value.NODE_ENV === 'production';
  return {
    production,
    databaseUrl: value.DATABASE_URL,
    port: value.PORT,
    host: value.HOST,
    baseUrl: value.BASE_URL.replace(/\/$/, ''),
    sessionSecret: value.SESSION_SECRET,
    smtpUrl: value.SMTP_URL,
    mailFrom: value.MAIL_FROM,
    devMailFolder: production ? null : (value.DEV_MAIL_FOLDER ?? null),
    trustProxy: value.TRUST_PROXY,
    logLevel: value.LOG_LEVEL,
  };
}
