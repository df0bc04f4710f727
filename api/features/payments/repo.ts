import { and, asc, eq, gt, inArray, isNotNull, isNull, lt, or } from 'drizzle-orm';
import type { Currency, Money } from '#shared/money.ts';
import type { PaymentEvent, PaymentStatus } from '#shared/payments/machine.ts';
import type { Instant } from '#shared/time.ts';
import type { Db } from '../../db/client.ts';
import { paymentMoves, paymentNotices, payments } from '../../db/schema/index.ts';

export interface Payment {
  id: string;
  orderId: string;
  status: PaymentStatus;
  amount: Money;
  checkoutId: string | null;
  checkoutUrl: string | null;
  paymentIntentId: string | null;
  chargeId: string | null;
  createdAt: Instant;
  movedAt: Instant;
}

const fromRow = (row: typeof payments.$inferSelect): Payment => ({
  id: row.id,
  orderId: row.orderId,
  status: row.status,
  amount: { minor: row.amountMinor, currency: row.currency as Currency },
  checkoutId: row.checkoutId,
  checkoutUrl: row.checkoutUrl,
  paymentIntentId: row.paymentIntentId,
  chargeId: row.chargeId,
  createdAt: row.createdAt.toISOString(),
  movedAt: row.movedAt.toISOString(),
});

export async function insertPayment(
  db: Db,
  { orderId, amount, at }: { orderId: string; amount: Money; at: Instant },
): Promise<void> {
  const when = new Date(at);
  await db.insert(payments).values({
    orderId,
    amountMinor: amount.minor,
    currency: amount.currency,
    createdAt: when,
    movedAt: when,
  });
}

export async function findPaymentOfOrder(db: Db, orderId: string): Promise<Payment | undefined> {
  const [row] = await db.select().from(payments).where(eq(payments.orderId, orderId));
  return row && fromRow(row);
}

/** The same, held against others until the transaction ends. */
export async function findPaymentForUpdate(db: Db, orderId: string): Promise<Payment | undefined> {
  const [row] = await db.select().from(payments).where(eq(payments.orderId, orderId)).for('update');
  return row && fromRow(row);
}

export async function findPaymentByCheckout(db: Db, checkoutId: string): Promise<Payment | undefined> {
  const [row] = await db.select().from(payments).where(eq(payments.checkoutId, checkoutId));
  return row && fromRow(row);
}

export async function findPaymentByIntent(db: Db, paymentIntentId: string): Promise<Payment | undefined> {
  const [row] = await db.select().from(payments).where(eq(payments.paymentIntentId, paymentIntentId));
  return row && fromRow(row);
}

export async function listPaymentsIn(db: Db, statuses: readonly PaymentStatus[]): Promise<Payment[]> {
  const rows = await db
    .select()
    .from(payments)
    .where(inArray(payments.status, [...statuses]))
    .orderBy(asc(payments.movedAt));
  return rows.map(fromRow);
}

/** Checkouts that may have been paid without our hearing of it: waiting since before one time, or given up after another. */
export async function listUncertain(
  db: Db,
  { waitingSince, expiredAfter }: { waitingSince: Instant; expiredAfter: Instant },
): Promise<Payment[]> {
  const rows = await db
    .select()
    .from(payments)
    .where(
      and(
        isNotNull(payments.checkoutId),
        or(
          and(eq(payments.status, 'awaiting-card'), lt(payments.createdAt, new Date(waitingSince))),
          and(eq(payments.status, 'expired'), gt(payments.movedAt, new Date(expiredAfter))),
        ),
      ),
    )
    .orderBy(asc(payments.createdAt));
  return rows.map(fromRow);
}

/** Keeps the first checkout opened; a second answer of the same request changes nothing. */
export async function updateCheckout(
  db: Db,
  id: string,
  checkout: { checkoutId: string; checkoutUrl: string },
): Promise<void> {
  await db
    .update(payments)
    .set(checkout)
    .where(and(eq(payments.id, id), isNull(payments.checkoutId)));
}

export interface PaymentMove {
  event: PaymentEvent;
  to: PaymentStatus;
  reason: string;
  at: Instant;
  ids: Partial<Record<'paymentIntentId' | 'chargeId' | 'transferId' | 'refundId', string>>;
}

/** Moves a payment that is still where it was seen, and records the move. @returns false if somebody was first. */
export async function movePayment(
  db: Db,
  seen: Payment,
  { event, to, reason, at, ids }: PaymentMove,
): Promise<boolean> {
  const when = new Date(at);
  const rows = await db
    .update(payments)
    .set({ status: to, movedAt: when, ...ids })
    .where(and(eq(payments.id, seen.id), eq(payments.status, seen.status)))
    .returning({ id: payments.id });
  if (rows.length === 0) return false;
  await db
    .insert(paymentMoves)
    .values({ paymentId: seen.id, event, from: seen.status, to, reason, at: when });
  return true;
}

/** Stores that a notice came. One that came before is left as it is. */
export async function insertNotice(
  db: Db,
  { id, kind, at }: { id: string; kind: string; at: Instant },
): Promise<void> {
  await db
    .insert(paymentNotices)
    .values({ id, kind, receivedAt: new Date(at) })
    .onConflictDoNothing({ target: paymentNotices.id });
}

export async function updateNoticeHandled(
  db: Db,
  { id, outcome, at }: { id: string; outcome: string; at: Instant },
): Promise<void> {
  await db
    .update(paymentNotices)
    .set({ handledAt: new Date(at), outcome })
    .where(and(eq(paymentNotices.id, id), isNull(paymentNotices.handledAt)));
}

/** Writes beside a notice why it was not taken. */
export async function updateNoticeRefused(db: Db, id: string, outcome: string): Promise<void> {
  await db
    .update(paymentNotices)
    .set({ outcome })
    .where(and(eq(paymentNotices.id, id), isNull(paymentNotices.handledAt)));
}

export async function findNotice(
  db: Db,
  id: string,
): Promise<{ isHandled: boolean; outcome: string | null } | undefined> {
  const [row] = await db.select().from(paymentNotices).where(eq(paymentNotices.id, id));
  return row && { isHandled: row.handledAt !== null, outcome: row.outcome };
}
