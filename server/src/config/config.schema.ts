import { z } from 'zod';

const secret = z
  .string()
  .regex(/^[0-9a-f]{64,}$/, 'must be at least 32 random bytes in hexadecimal');

const SECRETS = ['SESSION_SECRET', 'DRAW_SECRET', 'SECOND_FACTOR_KEY'] as const;

/** Thirty-two random bytes hold some thirty different ones; a sample written by hand holds few. */
const looksRandom = (hex: string) => new Set(hex.match(/../g)).size >= 12;

/** What the environment must hold; the boot stops at the first thing missing. */
export const configSchema = z
  .object({
    NODE_ENV: z.enum(['production', 'development', 'test']).default('production'),
    DEMONSTRATION: z.enum(['0', '1']).default('0'),
    HOST: z.string().default('127.0.0.1'),
    PORT: z.coerce.number().int().min(0).max(65_535).default(4780),
    PUBLIC_URL: z.url(),
    TRUST_PROXY: z.string().default(''),
    DATABASE_URL: z.string().regex(/^postgres(ql)?:\/\//, 'must be a postgres:// address'),
    DATABASE_POOL: z.coerce.number().int().min(2).max(100).default(12),
    SESSION_SECRET: secret,
    DRAW_SECRET: secret,
    SECOND_FACTOR_KEY: secret,
    SMTP_URL: z.string().regex(/^smtps?:\/\//, 'must be an smtp:// or smtps:// address'),
    MAIL_FROM: z.string().min(3),
    MAIL_SINK_URL: z.string().default(''),
    KEYS_FOLDER: z.string().min(1),
    SITE_FOLDER: z.string().default(''),
    JOB_WORKERS: z.enum(['0', '1']).default('1'),
  })
  .superRefine((env, context) => {
    const address = new URL(env.PUBLIC_URL);
    const isLoopback = ['127.0.0.1', 'localhost', '[::1]'].includes(address.hostname);
    if (address.protocol === 'https:' || (isLoopback && env.DEMONSTRATION === '1')) return;
    if (env.NODE_ENV === 'test') return;
    context.addIssue({
      code: 'custom',
      path: ['PUBLIC_URL'],
      message: 'must be https; plain http serves only the demonstration on this machine',
    });
  })
  .superRefine((env, context) => {
    if (env.NODE_ENV === 'test') return;
    for (const name of SECRETS) {
      const isShared = SECRETS.some((other) => other !== name && env[other] === env[name]);
      if (looksRandom(env[name]) && !isShared) continue;
      context.addIssue({
        code: 'custom',
        path: [name],
        message: 'must be random and used for nothing else: run openssl rand -hex 32',
      });
    }
  });

export type Config = z.infer<typeof configSchema>;

/** Thrown at boot; names every variable that is missing or wrong. */
export class ConfigInvalid extends Error {
  constructor(problems: string[]) {
    super(`The settings are not complete:\n${problems.map((line) => `  ${line}`).join('\n')}`);
    this.name = 'ConfigInvalid';
  }
}

/** @throws {ConfigInvalid} when a variable is missing or wrong. */
export function readConfig(environment: NodeJS.ProcessEnv): Config {
  const result = configSchema.safeParse(environment);
  if (result.success) return result.data;
  throw new ConfigInvalid(
    result.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`),
  );
}
