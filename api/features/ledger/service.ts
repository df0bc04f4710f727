import type { Money } from '#shared/money.ts';
import { imbalanceMinor } from '#shared/payments/ledger.ts';
import type { Posting } from '#shared/payments/ledger.ts';
import { inTransaction } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import * as repo from './repo.ts';
import type { Balance, LedgerEntry } from './repo.ts';

export type { Balance, LedgerEntry } from './repo.ts';

/**
 * Enters a posting with the caller's own change, or not at all. One that is there already is left as it is.
 * @throws RangeError if it does not add up to nothing; the database refuses it too.
 */
export async function post(ctx: Ctx, posting: Posting): Promise<void> {
  if (imbalanceMinor(posting.lines) !== 0)
    throw new RangeError(`The posting ${posting.key} does not balance`);
  await inTransaction(ctx, (ctx) => repo.insertPosting(ctx.db, posting, ctx.now()));
}

export const getBalances = (ctx: Ctx): Promise<Balance[]> => repo.listBalances(ctx.db);

/** What is held on each order that has anything held. */
export const getHeld = (ctx: Ctx): Promise<Map<string, Money>> => repo.listHeld(ctx.db);

/** Newest first, before the entry of that number. */
export const getEntries = (ctx: Ctx, before: number | undefined, limit: number): Promise<LedgerEntry[]> =>
  repo.listEntries(ctx.db, before, limit);

/** Oldest first. */
export const getEntriesOfOrder = (ctx: Ctx, orderId: string): Promise<LedgerEntry[]> =>
  repo.listEntriesOfOrder(ctx.db, orderId);
