import { z } from 'zod';

const flagOrHops = z
  .string()
  .optional()
  .transform((value) => {
    if (value === undefined || value === '' || value === 'false' || value === '0') return 0;
    const hops = Number(value);
    // `true` means one proxy: trusting every hop would let a client choose its own address.
    return Number.isInteger(hops) && hops > 0 ? hops : 1;
  });

const optionalUrl = z.preprocess((value) => (value === '' ? undefined : value), z.url().optional());

const envSchema = z.object({
  NODE_ENV: z.enum(['development', 'test', 'production']).default('development'),
  HOST: z.string().default('127.0.0.1'),
  PORT: z.coerce.number().int().min(0).max(65_535).default(3000),
  PUBLIC_URL: optionalUrl,
  /** The runtime role: reads and writes rows, owns nothing. */
  DATABASE_URL: z.string().min(1),
  /** The owner: migrations, queues, verify, backup. */
  DATABASE_OWNER_URL: z.string().optional(),
  DATABASE_POOL: z.coerce.number().int().min(1).default(10),
  SMTP_URL: z.string().default('smtp://127.0.0.1:2525'),
  MAIL_FROM: z.string().default('Wideberth <wideberth@wideberth.example>'),
  S3_ENDPOINT: optionalUrl,
  S3_BUCKET: z.string().default('wideberth'),
  S3_REGION: z.string().default('us-east-1'),
  SESSION_SECRET: z.string().min(32),
  TRUST_PROXY: flagOrHops,
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('info'),
  /** A file for the log lines; standard output without one. */
  LOG_FILE: z.string().optional(),
  /** Cost of argon2id. Only tests lower it; the defaults are the library's own. */
  ARGON2_MEMORY_KIB: z.coerce.number().int().min(8).default(19_456),
  ARGON2_PASSES: z.coerce.number().int().min(1).default(2),
  /** Where the exported web app lies. */
  WEB_FOLDER: z.string().default('dist'),
});

export type Env = z.infer<typeof envSchema>;

/** The settings of this process, read once; a wrong one stops the start with its name. */
export const env: Env = readEnv(process.env);

function readEnv(source: NodeJS.ProcessEnv): Env {
  const result = envSchema.safeParse(source);
  if (result.success) return result.data;
  const faults = result.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
  throw new Error(`The environment is not right. ${faults.join('; ')}`);
}

/** The address that people use; links in mail are built from it, never from the Host header. */
export function publicUrl(): string {
  return (env.PUBLIC_URL ?? `http://${env.HOST}:${env.PORT}`).replace(/\/+$/, '');
}
