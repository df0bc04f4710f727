import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { z } from 'zod';

const flag = z.enum(['0', '1', 'true', 'false']).transform((text) => text === '1' || text === 'true');
const port = z.coerce.number().int().min(0).max(65_535);

const schema = z.object({
  NODE_ENV: z.enum(['development', 'production', 'test']).default('development'),
  PORT: port.default(4600),
  HOST: z.string().default('127.0.0.1'),
  DATA_DIR: z.string().min(1).default('.data'),
  PUBLIC_URL: z.url().optional(),
  /** Demonstration: one-press accounts, readable letters, fakes for hosted services. On unless NODE_ENV is production. */
  DEMO: flag.optional(),
  DATABASE_URL: z.url().optional(),
  AUTH_SECRET: z.string().min(32, 'AUTH_SECRET needs at least 32 characters').optional(),
  TRUST_PROXY: z.coerce.number().int().min(0).max(5).default(0),
  STRIPE_SECRET_KEY: z.string().min(1).optional(),
  STRIPE_WEBHOOK_SECRET: z.string().min(1).optional(),
  SMTP_URL: z.url().optional(),
  MAIL_FROM: z.string().default('Tubeplate <desk@tubeplate.example>'),
  LOG_LEVEL: z.enum(['debug', 'info', 'warn', 'error', 'silent']).default('info'),
  /** Loopback ports of the fakes; 0 takes a free one. */
  FAKE_PAYMENTS_PORT: port.default(0),
  FAKE_MAIL_PORT: port.default(0),
  /** Multiplies every rate limit; tests raise it. */
  RATE_FACTOR: z.coerce.number().min(1).max(1_000).default(1),
});

export type Env = Omit<z.infer<typeof schema>, 'DEMO' | 'AUTH_SECRET' | 'PUBLIC_URL'> & {
  isDemo: boolean;
  authSecret: string;
  publicUrl: string;
};

/** A secret made once and kept with the data, so that a demonstration survives restarts without one being set. */
function keptSecret(dataDir: string, name: string): string {
  const folder = path.join(dataDir, 'secrets');
  const file = path.join(folder, name);
  if (existsSync(file)) return readFileSync(file, 'utf8');
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const secret = randomBytes(32).toString('hex');
  writeFileSync(file, secret, { mode: 0o600 });
  return secret;
}

/**
 * Reads the environment once. Nobody else does.
 * @throws Error with every fault, one a line; and when a production site would run on fakes or a made-up secret.
 */
export function readEnv(source: NodeJS.ProcessEnv): Env {
  const parsed = schema.safeParse(source);
  if (!parsed.success) {
    const faults = parsed.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`The configuration needs mending:\n${faults.join('\n')}`);
  }
  const { DEMO, AUTH_SECRET, PUBLIC_URL, ...rest } = parsed.data;
  const isDemo = DEMO ?? rest.NODE_ENV !== 'production';
  if (!isDemo) {
    const wanted = {
      AUTH_SECRET,
      PUBLIC_URL,
      STRIPE_SECRET_KEY: rest.STRIPE_SECRET_KEY,
      STRIPE_WEBHOOK_SECRET: rest.STRIPE_WEBHOOK_SECRET,
      SMTP_URL: rest.SMTP_URL,
    };
    const missing = Object.entries(wanted)
      .filter(([, value]) => !value)
      .map(([name]) => name);
    if (missing.length > 0) {
      throw new Error(
        `A live site does not run on stand-ins. Set ${missing.join(', ')}, or set DEMO=1 for a demonstration.`,
      );
    }
  }
  const dataDir = path.resolve(rest.DATA_DIR);
  return {
    ...rest,
    DATA_DIR: dataDir,
    isDemo,
    authSecret: AUTH_SECRET ?? keptSecret(dataDir, 'auth'),
    publicUrl: (PUBLIC_URL ?? `http://localhost:${String(rest.PORT)}`).replace(/\/$/, ''),
  };
}

/** Secret that signs the fake payment service's notices in a demonstration. */
export const demoWebhookSecret = (env: Env): string => `whsec_${keptSecret(env.DATA_DIR, 'payment-notices')}`;
