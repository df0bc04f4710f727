import { Problem } from '#shared/problem.ts';
import { isBefore } from '#shared/time.ts';
import { inTransaction } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import type { Checkout } from '../../services/payments/index.ts';
import * as payments from '../payments/service.ts';
import type { Payment } from '../payments/service.ts';
import { latePaymentLetter } from './letters.ts';
import { move } from './moves.ts';
import { getParties } from './parties.ts';
import * as repo from './repo.ts';
import type { StoredOrder } from './repo.ts';

const isOpen = ({ status }: Payment): boolean => status === 'awaiting-card' || status === 'expired';

/** What was charged, if it is what we asked for. */
function chargedOf(ctx: Ctx, payment: Payment, { amount, paymentIntentId, chargeId }: Checkout) {
  const isAsAsked = amount.minor === payment.amount.minor && amount.currency === payment.amount.currency;
  if (!isAsAsked || !paymentIntentId || !chargeId) {
    ctx.log.error({ paymentId: payment.id, asked: payment.amount, paid: amount }, 'payment is not as asked');
    throw new Problem('payment-service', 'What was paid is not what was asked. The office has been told.');
  }
  return { paymentIntentId, chargeId };
}

export type Receipt = 'held' | 'sent-back' | 'known' | 'not-paid';

/**
 * Asks the payment service about a checkout and, if it has been paid, takes the money in: once, however often it is called.
 * Money for an order that has been given up goes straight back. Outside any transaction.
 * @returns undefined if the checkout is none of ours.
 * @throws Problem payment-service.
 */
export async function receivePayment(ctx: Ctx, checkoutId: string): Promise<Receipt | undefined> {
  const payment = await payments.findByCheckout(ctx, checkoutId);
  if (!payment) return undefined;
  if (!isOpen(payment)) return 'known';
  const checkout = await ctx.payments.getCheckout(checkoutId);
  if (checkout.status !== 'paid') return 'not-paid';
  const charged = chargedOf(ctx, payment, checkout);
  return inTransaction(ctx, async (ctx) => {
    const order = await repo.findOrderForUpdate(ctx.db, payment.orderId);
    if (!order) throw new Problem('not-found');
    // Another notice may have come while the service was answering.
    if (!isOpen(await payments.getPayment(ctx, order.id))) return 'known';
    if ((await payments.hold(ctx, order.id, charged)) === 'held') {
      await move(ctx, order, 'pay', 'system');
      return 'held';
    }
    await ctx.queue.enqueue(ctx, 'refund-order', { orderId: order.id });
    const parties = await getParties(ctx, order);
    const letter = latePaymentLetter({ order, parties, reason: '', publicUrl: ctx.site.publicUrl });
    await ctx.queue.enqueue(ctx, 'send-letter', letter);
    return 'sent-back';
  });
}

/** Closes the card page of an order that is being given up. If it has been paid after all, the money is taken in first. */
export async function closeCheckout(ctx: Ctx, orderId: string): Promise<void> {
  const payment = await payments.getPayment(ctx, orderId);
  if (payment.checkoutId === null || payment.status !== 'awaiting-card') return;
  if ((await payments.closeCheckout(ctx, payment)) === 'paid') await receivePayment(ctx, payment.checkoutId);
}

/** Whether an order's clock has run out; if it has not, the clock is set again, so that a job that came early loses nothing. */
async function hasRunOut(ctx: Ctx, order: StoredOrder, job: 'lapse-order' | 'end-review'): Promise<boolean> {
  if (order.dueAt === null) return false;
  if (!isBefore(ctx.now(), order.dueAt)) return true;
  await ctx.queue.enqueue(ctx, job, { orderId: order.id }, order.dueAt);
  return false;
}

const lapses = new Set(['awaiting-payment', 'awaiting-surveyor']);

/** The job of an order nobody has paid or answered in time. Does nothing where it is no longer so. */
export async function lapseOrder(ctx: Ctx, orderId: string): Promise<void> {
  const seen = await repo.findOrder(ctx.db, orderId);
  if (!seen || !lapses.has(seen.status) || !(await hasRunOut(ctx, seen, 'lapse-order'))) return;
  if (seen.status === 'awaiting-payment') await closeCheckout(ctx, orderId);
  await inTransaction(ctx, async (ctx) => {
    const order = await repo.findOrderForUpdate(ctx.db, orderId);
    if (order?.status !== seen.status) return;
    await move(ctx, order, 'lapse', 'system', {
      reason: order.status === 'awaiting-payment' ? 'Not paid in time' : 'Not answered in time',
    });
  });
}

/** The payment service has closed an order's card page by itself: it can no longer be paid. */
export async function lapseUnpaid(ctx: Ctx, orderId: string): Promise<void> {
  await inTransaction(ctx, async (ctx) => {
    const order = await repo.findOrderForUpdate(ctx.db, orderId);
    if (order?.status !== 'awaiting-payment') return;
    await move(ctx, order, 'lapse', 'system', { reason: 'The card page was closed unpaid' });
  });
}

/** The job of a report that the buyer has had long enough. Does nothing where it is no longer in review. */
export async function endReview(ctx: Ctx, orderId: string): Promise<void> {
  await inTransaction(ctx, async (ctx) => {
    const order = await repo.findOrderForUpdate(ctx.db, orderId);
    if (order?.status !== 'in-review' || !(await hasRunOut(ctx, order, 'end-review'))) return;
    await move(ctx, order, 'endReview', 'system', { reason: 'The time to read the report is over' });
  });
}

/** The fee has gone to the surveyor. In the transaction that says so of the money. @returns false if it had been done. */
export async function settleOrder(ctx: Ctx, orderId: string): Promise<boolean> {
  const order = await repo.findOrderForUpdate(ctx.db, orderId);
  if (order?.status !== 'settling') return false;
  await move(ctx, order, 'release', 'system');
  return true;
}

/** The money has gone back to the buyer. In the transaction that says so of the money. */
export async function refundOrder(ctx: Ctx, orderId: string): Promise<void> {
  const order = await repo.findOrderForUpdate(ctx.db, orderId);
  if (order?.status === 'refund-due') await move(ctx, order, 'refund', 'system');
}
