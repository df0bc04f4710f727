import type { Role } from '#shared/accounts/roles.ts';
import { Problem } from '#shared/problem.ts';
import type { Instant } from '#shared/time.ts';
import type { Db } from './db/client.ts';
import type { Queue } from './jobs/queue.ts';
import type { FileStore } from './services/files/index.ts';
import type { Log } from './log.ts';
import type { Mailer } from './services/mail/index.ts';
import type { Payments } from './services/payments/index.ts';

/** Who is asking. The office role is absent until its second factor is set up. */
export interface Actor {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly isEmailVerified: boolean;
  readonly roles: ReadonlySet<Role>;
  readonly sessionId: string;
}

export type { Log } from './log.ts';

/** Everything a service may reach, handed in: nothing is imported that has a state of its own. */
export interface Ctx {
  readonly db: Db;
  readonly isInTransaction: boolean;
  readonly actor: Actor | null;
  readonly now: () => Instant;
  readonly queue: Queue;
  readonly payments: Payments;
  readonly mail: Mailer;
  readonly files: FileStore;
  readonly site: { readonly publicUrl: string; readonly isDemo: boolean };
  readonly log: Log;
}

/** @throws Problem not-signed-in. */
export function requireActor(ctx: Ctx): Actor {
  if (!ctx.actor) throw new Problem('not-signed-in');
  return ctx.actor;
}

/** @throws Problem not-signed-in, not-permitted. */
export function requireRole(ctx: Ctx, role: Role): Actor {
  const actor = requireActor(ctx);
  if (!actor.roles.has(role)) throw new Problem('not-permitted');
  return actor;
}

/** @throws Problem not-permitted while the e-mail address has not been confirmed. */
export function requireConfirmedEmail(actor: Actor): void {
  if (!actor.isEmailVerified) {
    throw new Problem(
      'not-permitted',
      'Confirm your e-mail address first: open the letter we sent you when you joined.',
    );
  }
}

/**
 * Runs in one transaction, joining the one that is open.
 *
 * Name the argument `ctx` too: the outer one then cannot be used by mistake, which on PGlite would wait for ever.
 */
export function inTransaction<T>(ctx: Ctx, work: (ctx: Ctx) => Promise<T>): Promise<T> {
  if (ctx.isInTransaction) return work(ctx);
  return ctx.db.transaction((tx) => work({ ...ctx, db: tx, isInTransaction: true }));
}
