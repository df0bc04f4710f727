import { asc, desc, eq, inArray, like, lt, sql } from 'drizzle-orm';
import type { Currency, Money } from '#shared/money.ts';
import type { Posting } from '#shared/payments/ledger.ts';
import type { Instant } from '#shared/time.ts';
import type { Db } from '../../db/client.ts';
import { ledgerLines, ledgerPostings } from '../../db/schema/index.ts';

export interface LedgerEntry {
  id: number;
  at: Instant;
  what: string;
  orderId: string;
  lines: { account: string; amount: Money }[];
}

export interface Balance {
  account: string;
  /** Debits are positive. */
  balance: Money;
}

/** @returns false if the posting was there already: the step has been entered, and nothing is entered twice. */
export async function insertPosting(db: Db, posting: Posting, at: Instant): Promise<boolean> {
  const [row] = await db
    .insert(ledgerPostings)
    .values({ key: posting.key, what: posting.what, orderId: posting.orderId, at: new Date(at) })
    .onConflictDoNothing({ target: ledgerPostings.key })
    .returning({ id: ledgerPostings.id });
  if (!row) return false;
  await db.insert(ledgerLines).values(
    posting.lines.map(({ account, amount }) => ({
      postingId: row.id,
      account,
      amountMinor: amount.minor,
      currency: amount.currency,
    })),
  );
  return true;
}

const sumMinor = sql<string>`sum(${ledgerLines.amountMinor})`;

const toBalance = (row: { account: string; currency: string; sum: string }): Balance => ({
  account: row.account,
  balance: { minor: Number(row.sum), currency: row.currency as Currency },
});

/** Every account that has ever been posted to, by name; settled ones at zero among them. */
export async function listBalances(db: Db): Promise<Balance[]> {
  const rows = await db
    .select({ account: ledgerLines.account, currency: ledgerLines.currency, sum: sumMinor })
    .from(ledgerLines)
    .groupBy(ledgerLines.account, ledgerLines.currency)
    .orderBy(asc(ledgerLines.account));
  return rows.map(toBalance);
}

/** What is held on each order that has anything held, positive. */
export async function listHeld(db: Db): Promise<Map<string, Money>> {
  const rows = await db
    .select({ account: ledgerLines.account, currency: ledgerLines.currency, sum: sumMinor })
    .from(ledgerLines)
    .where(like(ledgerLines.account, 'held:%'))
    .groupBy(ledgerLines.account, ledgerLines.currency)
    .having(sql`sum(${ledgerLines.amountMinor}) <> 0`);
  return new Map(
    rows.map((row) => [
      row.account.slice('held:'.length),
      { minor: -Number(row.sum), currency: row.currency as Currency },
    ]),
  );
}

async function withLines(db: Db, postings: (typeof ledgerPostings.$inferSelect)[]): Promise<LedgerEntry[]> {
  if (postings.length === 0) return [];
  const lines = await db
    .select()
    .from(ledgerLines)
    .where(
      inArray(
        ledgerLines.postingId,
        postings.map(({ id }) => id),
      ),
    )
    .orderBy(asc(ledgerLines.id));
  return postings.map(({ id, at, what, orderId }) => ({
    id,
    at: at.toISOString(),
    what,
    orderId,
    lines: lines
      .filter(({ postingId }) => postingId === id)
      .map(({ account, amountMinor, currency }) => ({
        account,
        amount: { minor: amountMinor, currency: currency as Currency },
      })),
  }));
}

/** Newest first, before the entry of that number. */
export async function listEntries(db: Db, before: number | undefined, limit: number): Promise<LedgerEntry[]> {
  const postings = await db
    .select()
    .from(ledgerPostings)
    .where(before === undefined ? undefined : lt(ledgerPostings.id, before))
    .orderBy(desc(ledgerPostings.id))
    .limit(limit);
  return withLines(db, postings);
}

/** Oldest first. */
export async function listEntriesOfOrder(db: Db, orderId: string): Promise<LedgerEntry[]> {
  const postings = await db
    .select()
    .from(ledgerPostings)
    .where(eq(ledgerPostings.orderId, orderId))
    .orderBy(asc(ledgerPostings.id));
  return withLines(db, postings);
}
