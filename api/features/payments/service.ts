import type { Money } from '#shared/money.ts';
import { postEarned, postPaid, postRefunded, postTransferred } from '#shared/payments/ledger.ts';
import { paymentMachine } from '#shared/payments/machine.ts';
import type { PaymentEvent, PaymentStatus } from '#shared/payments/machine.ts';
import { Problem } from '#shared/problem.ts';
import { addDays, addMs, minutesMs } from '#shared/time.ts';
import { inTransaction } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import * as ledger from '../ledger/service.ts';
import * as repo from './repo.ts';
import type { Payment, PaymentMove } from './repo.ts';

export type { Payment } from './repo.ts';

/** Opens the money side of an order, in the transaction that places it. */
export const openPayment = (ctx: Ctx, orderId: string, amount: Money): Promise<void> =>
  repo.insertPayment(ctx.db, { orderId, amount, at: ctx.now() });

/** @throws Problem not-found. */
export async function getPayment(ctx: Ctx, orderId: string): Promise<Payment> {
  const payment = await repo.findPaymentOfOrder(ctx.db, orderId);
  if (!payment) throw new Problem('not-found');
  return payment;
}

export const findByCheckout = (ctx: Ctx, checkoutId: string): Promise<Payment | undefined> =>
  repo.findPaymentByCheckout(ctx.db, checkoutId);

export const findByIntent = (ctx: Ctx, paymentIntentId: string): Promise<Payment | undefined> =>
  repo.findPaymentByIntent(ctx.db, paymentIntentId);

export const listIn = (ctx: Ctx, ...statuses: readonly PaymentStatus[]): Promise<Payment[]> =>
  repo.listPaymentsIn(ctx.db, statuses);

/** Minutes that a notice may take before we ask ourselves. */
const noticeMinutes = 2;
/** Days after which the payment service no longer takes a card for a checkout given up. */
const checkoutDays = 2;

/** Checkouts that may have been paid without our hearing of it. */
export const listUncertain = (ctx: Ctx): Promise<Payment[]> =>
  repo.listUncertain(ctx.db, {
    waitingSince: addMs(ctx.now(), -noticeMinutes * minutesMs),
    expiredAfter: addDays(ctx.now(), -checkoutDays),
  });

interface CheckoutPage {
  title: string;
  email: string;
  returnPath: string;
}

/**
 * The address of the card page, opened once for an order however often it is asked for. Outside any transaction.
 * @throws Problem payment-service.
 */
export async function openCheckout(
  ctx: Ctx,
  orderId: string,
  { title, email, returnPath }: CheckoutPage,
): Promise<string> {
  const payment = await getPayment(ctx, orderId);
  if (payment.checkoutUrl) return payment.checkoutUrl;
  const back = `${ctx.site.publicUrl}${returnPath}`;
  const { checkoutId, url } = await ctx.payments.startCheckout({
    key: `checkout:${payment.id}`,
    orderId,
    title,
    amount: payment.amount,
    email,
    successUrl: `${back}?paid=yes`,
    cancelUrl: `${back}?paid=no`,
  });
  await repo.updateCheckout(ctx.db, payment.id, { checkoutId, checkoutUrl: url });
  return url;
}

/**
 * Closes the card page so that nobody pays for what has been given up. Outside any transaction.
 *
 * A service that does not answer is no reason to keep an order open: money that comes later is sent back.
 * @returns whether it turns out to have been paid.
 */
export async function closeCheckout(ctx: Ctx, payment: Payment): Promise<'closed' | 'paid'> {
  if (payment.checkoutId === null) return 'closed';
  try {
    return (await ctx.payments.closeCheckout(payment.checkoutId)) ? 'closed' : 'paid';
  } catch (error) {
    ctx.log.warn({ paymentId: payment.id, error: String(error) }, 'checkout not closed');
    return 'closed';
  }
}

async function move(
  ctx: Ctx,
  orderId: string,
  event: PaymentEvent,
  reason: string,
  ids: PaymentMove['ids'] = {},
): Promise<Payment> {
  const seen = await repo.findPaymentForUpdate(ctx.db, orderId);
  if (!seen) throw new Problem('not-found');
  const to = paymentMachine.next(seen.status, event, 'system');
  const hasMoved = await repo.movePayment(ctx.db, seen, { event, to, reason, at: ctx.now(), ids });
  if (!hasMoved) throw new Problem('changed-meanwhile');
  return { ...seen, status: to };
}

interface Charged {
  paymentIntentId: string;
  chargeId: string;
}

/** The card was charged: the money is held, or, where the order has been given up, on its way back. */
export const hold = (ctx: Ctx, orderId: string, charged: Charged): Promise<'held' | 'refunding'> =>
  inTransaction(ctx, async (ctx) => {
    const { status } = await getPayment(ctx, orderId);
    const isLate = status === 'expired';
    const { amount } = await move(
      ctx,
      orderId,
      isLate ? 'holdLate' : 'hold',
      isLate ? 'The card was charged after the order had been given up' : 'The card was charged',
      { ...charged },
    );
    await ledger.post(ctx, postPaid(orderId, amount));
    return isLate ? 'refunding' : 'held';
  });

/** Nobody will pay this any more. */
export const expire = (ctx: Ctx, orderId: string, reason: string): Promise<Payment> =>
  inTransaction(ctx, (ctx) => move(ctx, orderId, 'expire', reason));

/** From here on the money can only go to the surveyor: what was held is the fee and our charge. */
export const startRelease = (
  ctx: Ctx,
  orderId: string,
  parts: { surveyorId: string; surveyorPart: Money; platformPart: Money },
): Promise<void> =>
  inTransaction(ctx, async (ctx) => {
    await move(ctx, orderId, 'startRelease', 'The review is over');
    await ledger.post(ctx, postEarned(orderId, parts.surveyorId, parts.surveyorPart, parts.platformPart));
  });

export const release = (
  ctx: Ctx,
  orderId: string,
  { surveyorId, surveyorPart, transferId }: { surveyorId: string; surveyorPart: Money; transferId: string },
): Promise<void> =>
  inTransaction(ctx, async (ctx) => {
    await move(ctx, orderId, 'release', 'The transfer went through', { transferId });
    await ledger.post(ctx, postTransferred(orderId, surveyorId, surveyorPart));
  });

/** From here on the money can only go back to the buyer. */
export const startRefund = (ctx: Ctx, orderId: string, reason: string): Promise<Payment> =>
  inTransaction(ctx, (ctx) => move(ctx, orderId, 'startRefund', reason));

export const refund = (ctx: Ctx, orderId: string, refundId: string): Promise<void> =>
  inTransaction(ctx, async (ctx) => {
    const { amount } = await move(ctx, orderId, 'refund', 'The refund went through', { refundId });
    await ledger.post(ctx, postRefunded(orderId, amount));
  });

/** Stores that a notice came, before anything is done about it. */
export const storeNotice = (ctx: Ctx, id: string, kind: string): Promise<void> =>
  repo.insertNotice(ctx.db, { id, kind, at: ctx.now() });

export async function isNoticeHandled(ctx: Ctx, id: string): Promise<boolean> {
  return (await repo.findNotice(ctx.db, id))?.isHandled ?? false;
}

/** Marks a notice as handled. Acting on it twice does no harm, so this may come after. */
export const markNotice = (ctx: Ctx, id: string, outcome: string): Promise<void> =>
  repo.updateNoticeHandled(ctx.db, { id, outcome, at: ctx.now() });

export const refuseNotice = (ctx: Ctx, id: string, outcome: string): Promise<void> =>
  repo.updateNoticeRefused(ctx.db, id, outcome);
