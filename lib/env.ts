import { z } from 'zod';

const postgresUrl = z.string().regex(/^postgres(ql)?:\/\//, 'must begin with postgres:// or postgresql://');

/** Every variable the application reads, with its rule. Nothing else in the project reads `process.env` for settings. */
const rules = {
  /** Role `witnessmark_app`: owns nothing and cannot bypass row-level security. */
  APP_DATABASE_URL: postgresUrl,
  /** Role `witnessmark_owner`: migrations, the queue's own tables, the demo scenario. Never given to the web server. */
  OWNER_DATABASE_URL: postgresUrl,
  PORT: z.coerce.number().int().min(1).max(65_535).default(3000),
  WITNESSMARK_DEMO: z.enum(['0', '1']).default('1'),
  NEXTAUTH_SECRET: z.string().min(32),
  NEXTAUTH_URL: z.url({ protocol: /^https?$/ }),
  S3_ENDPOINT: z.url({ protocol: /^https?$/ }),
  S3_BUCKET: z.string().min(3),
  S3_ACCESS_KEY_ID: z.string().min(1),
  S3_SECRET_ACCESS_KEY: z.string().min(1),
  S3_REGION: z.string().min(1).default('eu-central-1'),
  SMTP_URL: z.url({ protocol: /^smtps?$/ }),
  /** Longest time that one large evaluation may be computed. */
  EVALUATION_TIME_LIMIT_MS: z.coerce.number().int().min(1).max(600_000).default(10_000),
  MAIL_FROM: z.string().min(3).default('Witnessmark <no-reply@witnessmark.example>'),
};

type Rules = typeof rules;
export type Env = { readonly [Key in keyof Rules]: z.output<Rules[Key]> };

function read<Key extends keyof Rules>(key: Key): Env[Key] {
  const parsed = rules[key].safeParse(process.env[key] || undefined);
  if (!parsed.success) throw new Error(`${key}: ${parsed.error.issues.map((issue) => issue.message).join('; ')}`);
  return parsed.data as Env[Key];
}

/**
 * The settings, each checked when it is first read: a build, a test or a script needs only those it uses.
 * Throws an error naming the variable when it is missing or malformed.
 */
export const env: Env = Object.defineProperties(
  {},
  Object.fromEntries(
    (Object.keys(rules) as (keyof Rules)[]).map((key) => [key, { enumerable: true, get: () => read(key) }]),
  ),
) as Env;
