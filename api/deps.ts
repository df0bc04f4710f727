import path from 'node:path';
import { pino } from 'pino';
import type { Letter } from '#shared/accounts/contract.ts';
import type { Instant } from '#shared/time.ts';
import { createAuth } from './auth/auth.ts';
import type { Auth } from './auth/auth.ts';
import type { Actor, Ctx, Log } from './ctx.ts';
import { openDatabase } from './db/client.ts';
import type { Database } from './db/client.ts';
import { demoWebhookSecret } from './env.ts';
import type { Env } from './env.ts';
import { startSmtpFake } from './fakes/smtp/index.ts';
import { startStripeFake } from './fakes/stripe/index.ts';
import { startQueue } from './jobs/queue.ts';
import type { Queue } from './jobs/queue.ts';
import { createDiskFiles } from './services/files/index.ts';
import type { FileStore } from './services/files/index.ts';
import { createMailer } from './services/mail/index.ts';
import type { Mailer } from './services/mail/index.ts';
import { createPayments } from './services/payments/index.ts';
import type { Payments } from './services/payments/index.ts';

/** The fake post office's letters, to be read in a demonstration. */
export interface Letters {
  list: () => Promise<Letter[]>;
}

/** What the product runs on. Tests build their own. */
export interface Deps {
  readonly site: { readonly publicUrl: string; readonly isDemo: boolean };
  readonly trustProxy: number;
  /** Multiplies every rate limit; 1 for people. */
  readonly rateFactor: number;
  readonly database: Database;
  readonly auth: Auth;
  readonly queue: Queue;
  readonly payments: Payments;
  readonly mail: Mailer;
  readonly files: FileStore;
  /** Folder of unfinished uploads. */
  readonly uploadsDir: string;
  readonly letters: Letters | undefined;
  /** Where the fake payment service listens, for the demonstration's notice desk. */
  readonly fakePaymentsUrl: string | undefined;
  readonly log: Log;
  readonly now: () => Instant;
}

export const systemClock = (): Instant => new Date().toISOString();

export const ctxFrom = (deps: Deps, actor: Actor | null = null): Ctx => ({
  db: deps.database.db,
  isInTransaction: false,
  actor,
  now: deps.now,
  queue: deps.queue,
  payments: deps.payments,
  mail: deps.mail,
  files: deps.files,
  site: deps.site,
  log: deps.log,
});

export const createLog = (level: string): Log =>
  pino({ level, base: null, timestamp: pino.stdTimeFunctions.isoTime });

/** Opens everything the environment names, with a stand-in on loopback for each hosted service it does not. */
export async function openDeps(env: Env, log: Log): Promise<{ deps: Deps; close: () => Promise<void> }> {
  const database = await openDatabase(env.DATA_DIR, env.DATABASE_URL);
  const closers: (() => Promise<void>)[] = [() => database.close()];
  const close = async () => {
    for (const step of closers.toReversed()) await step();
  };
  try {
    await database.migrate();
    const queue = await startQueue(database, log);
    closers.push(() => queue.stop());
    const fakesDir = path.join(env.DATA_DIR, 'fakes');

    const post = env.SMTP_URL
      ? undefined
      : await startSmtpFake({
          port: env.FAKE_MAIL_PORT,
          host: '127.0.0.1',
          dataDir: path.join(fakesDir, 'mail'),
        });
    if (post) closers.push(() => post.close());

    const webhookSecret = env.STRIPE_WEBHOOK_SECRET ?? demoWebhookSecret(env);
    const bank = env.STRIPE_SECRET_KEY
      ? undefined
      : await startStripeFake({
          port: env.FAKE_PAYMENTS_PORT,
          host: '127.0.0.1',
          dataDir: path.join(fakesDir, 'payments'),
          webhookUrl: `http://127.0.0.1:${String(env.PORT)}/api/payments/notices`,
          webhookSecret,
          log,
        });
    if (bank) closers.push(() => bank.close());

    const deps: Deps = {
      site: { publicUrl: env.publicUrl, isDemo: env.isDemo },
      trustProxy: env.TRUST_PROXY,
      rateFactor: env.RATE_FACTOR,
      database,
      auth: createAuth({
        db: database.db,
        publicUrl: env.publicUrl,
        secret: env.authSecret,
        rateFactor: env.RATE_FACTOR,
        sendLetter: (letter) => queue.enqueue({ db: database.db }, 'send-letter', letter),
      }),
      queue,
      payments: createPayments(
        bank
          ? { secretKey: bank.apiKey, webhookSecret, url: bank.url }
          : { secretKey: env.STRIPE_SECRET_KEY ?? '', webhookSecret },
      ),
      mail: createMailer(
        post
          ? { host: '127.0.0.1', port: post.port, from: env.MAIL_FROM }
          : { url: env.SMTP_URL ?? '', from: env.MAIL_FROM },
      ),
      files: createDiskFiles(path.join(env.DATA_DIR, 'files')),
      uploadsDir: path.join(env.DATA_DIR, 'uploads'),
      letters: post,
      fakePaymentsUrl: bank?.url,
      log,
      now: systemClock,
    };
    return { deps, close };
  } catch (error) {
    await close();
    throw error;
  }
}
