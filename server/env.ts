import { z } from 'zod';

const url = (protocol: RegExp) => z.url({ protocol });

/** All of the environment, checked once at start. */
export const envSchema = z.object({
  NODE_ENV: z.enum(['development', 'test', 'production']).default('production'),
  HOST: z.string().default('127.0.0.1'),
  PORT: z.coerce.number().int().min(0).max(65535).default(8080),
  /** Where people reach the application; links in letters begin with it. */
  APP_ORIGIN: url(/^https?$/).default('http://127.0.0.1:8080'),
  DATABASE_URL: url(/^postgres(ql)?$/),
  S3_ENDPOINT: url(/^https?$/),
  S3_REGION: z.string().default('us-east-1'),
  S3_BUCKET: z.string().min(3).default('scantling'),
  S3_ACCESS_KEY: z.string().min(1).default('S3RVER'),
  S3_SECRET_KEY: z.string().min(1).default('S3RVER'),
  /** Another origin than the application's; signed addresses point at it. Default: the store itself. */
  MEDIA_ORIGIN: url(/^https?$/).optional(),
  SMTP_URL: url(/^smtps?$/),
  MAIL_FROM: z.string().default('Scantling <post@scantling.example>'),
  SESSION_SECRET: z.string().min(16, 'at least 16 characters'),
  /** Folder of the built web app; without it only the API is served. */
  WEB_DIR: z.string().optional(),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('info'),
  /** 1: bring the database up to date at start. */
  MIGRATE: z.enum(['0', '1']).default('0'),
  /** Multiplies every rate limit; tests and load benchmarks raise it. */
  RATE_FACTOR: z.coerce.number().min(1).max(100_000).default(1),
});
export type Env = z.infer<typeof envSchema>;

/** Reads the environment; throws one message that lists every fault. */
export function readEnv(source: Record<string, string | undefined>): Env {
  const given = Object.fromEntries(Object.entries(source).filter(([, value]) => value !== ''));
  const parsed = envSchema.safeParse(given);
  if (parsed.success) return parsed.data;
  const lines = parsed.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
  throw new Error(`The environment is not right:\n${lines.join('\n')}`);
}
