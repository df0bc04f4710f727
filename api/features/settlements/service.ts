import type { Money } from '#shared/money.ts';
import { Problem } from '#shared/problem.ts';
import { addMs, isBefore, minutesMs } from '#shared/time.ts';
import { inTransaction } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import type { Notice } from '../../services/payments/index.ts';
import * as ledger from '../ledger/service.ts';
import * as payments from '../payments/service.ts';
import * as surveyOrders from '../survey-orders/service.ts';
import * as surveyors from '../surveyors/service.ts';

/** @returns what became of it, in a few words; undefined if it speaks of nothing of ours. */
async function actOn(ctx: Ctx, notice: Notice): Promise<string | undefined> {
  switch (notice.kind) {
    case 'checkout-paid':
      return surveyOrders.receivePayment(ctx, notice.checkoutId);
    case 'checkout-lapsed': {
      const payment = await payments.findByCheckout(ctx, notice.checkoutId);
      if (!payment) return undefined;
      await surveyOrders.lapseUnpaid(ctx, payment.orderId);
      return 'lapsed';
    }
    case 'account-changed':
      // Notices come in any order: what the account is now is asked, not read off the notice.
      return checkPayouts(ctx, notice.accountId);
    case 'charged-back': {
      const payment = await payments.findByIntent(ctx, notice.paymentIntentId);
      if (!payment) return undefined;
      ctx.log.error({ orderId: payment.orderId, paymentId: payment.id }, 'payment charged back');
      return 'charged back';
    }
    case 'other':
      break;
  }
  return 'not for us';
}

/**
 * Takes a notice of the payment service: stored first, then acted on once, whether it comes late, twice or out of order.
 * @throws Problem bad-request if it is not signed by the service, is too old, or speaks of nothing of ours; payment-service.
 */
export async function takeNotice(ctx: Ctx, body: Buffer, signature: string): Promise<void> {
  let notice: Notice;
  try {
    notice = ctx.payments.readNotice(body, signature);
  } catch (error) {
    ctx.log.warn({ bytes: body.length }, 'notice refused: signature');
    throw error;
  }
  const { id, kind } = notice;
  await payments.storeNotice(ctx, id, kind);
  if (await payments.isNoticeHandled(ctx, id)) return;
  const outcome = await actOn(ctx, notice);
  if (outcome === undefined) {
    await payments.refuseNotice(ctx, id, 'speaks of nothing of ours');
    ctx.log.warn({ notice: id, kind }, 'notice refused: unknown object');
    throw new Problem('bad-request', 'This notice speaks of nothing of ours.');
  }
  await payments.markNotice(ctx, id, outcome);
}

/** Asks whether a surveyor's account can be paid to, and promises the fees that waited for it. */
async function checkPayouts(ctx: Ctx, accountId: string): Promise<string | undefined> {
  const isReady = await ctx.payments.isAccountReady(accountId);
  return inTransaction(ctx, async (ctx) => {
    const surveyorId = await surveyors.setPayoutsReady(ctx, accountId, isReady);
    if (surveyorId === undefined) return undefined;
    if (!isReady) return 'account not ready';
    for (const order of await surveyOrders.listOrdersIn(ctx, 'settling')) {
      if (order.surveyorId === surveyorId) await ctx.queue.enqueue(ctx, 'release-fee', { orderId: order.id });
    }
    return 'account ready';
  });
}

/**
 * The job of an order whose review is over. The fee is earned at once; it is sent when the surveyor's account can take it,
 * and until then it stays owed. May stop between any two steps and be run again: each is done once.
 */
export async function releaseFee(ctx: Ctx, orderId: string): Promise<void> {
  const { status, surveyorId, quotation } = await surveyOrders.getStoredOrder(ctx, orderId);
  if (status !== 'settling') return;
  const { surveyorPart, platformPart } = quotation;
  const payment = await payments.getPayment(ctx, orderId);
  if (payment.status === 'held') {
    await payments.startRelease(ctx, orderId, { surveyorId, surveyorPart, platformPart });
  }
  const surveyor = await surveyors.findSurveyor(ctx, surveyorId);
  if (!surveyor?.payoutAccountId || !surveyor.payoutsReady) {
    ctx.log.info({ orderId }, 'fee waits for a payout account');
    return;
  }
  if (payment.chargeId === null) throw new RangeError('A payment that is held has a charge');
  const { transferId } = await ctx.payments.transfer({
    key: `transfer:${orderId}`,
    amount: surveyorPart,
    accountId: surveyor.payoutAccountId,
    orderId,
    chargeId: payment.chargeId,
  });
  await inTransaction(ctx, async (ctx) => {
    if (await surveyOrders.settleOrder(ctx, orderId))
      await payments.release(ctx, orderId, { surveyorId, surveyorPart, transferId });
  });
}

/** The job of a payment that goes back to the buyer. May stop between any two steps and be run again. */
export async function refundOrder(ctx: Ctx, orderId: string): Promise<void> {
  const { status, paymentIntentId, amount } = await payments.getPayment(ctx, orderId);
  if (status !== 'refunding') return;
  if (paymentIntentId === null) throw new RangeError('A payment that is refunded has been made');
  const { refundId } = await ctx.payments.refund({ key: `refund:${orderId}`, paymentIntentId, amount });
  await inTransaction(ctx, async (ctx) => {
    await surveyOrders.refundOrder(ctx, orderId);
    if ((await payments.getPayment(ctx, orderId)).status === 'refunding')
      await payments.refund(ctx, orderId, refundId);
  });
}

/** Minutes after which money that should be moving is looked at again. */
const stuckMinutes = 10;

/** Payments and fees that should have moved and have not. A fee that waits for its surveyor's account is not among them. */
export async function listStuck(
  ctx: Ctx,
): Promise<{ job: 'refund-order' | 'release-fee'; orderId: string; since: string }[]> {
  const before = addMs(ctx.now(), -stuckMinutes * minutesMs);
  const refunds = (await payments.listIn(ctx, 'refunding'))
    .filter(({ movedAt }) => isBefore(movedAt, before))
    .map(({ orderId, movedAt }) => ({ job: 'refund-order' as const, orderId, since: movedAt }));
  const waiting = (await surveyOrders.listOrdersIn(ctx, 'settling')).filter(({ movedAt }) =>
    isBefore(movedAt, before),
  );
  const releases = [];
  for (const { id, surveyorId, movedAt } of waiting) {
    if ((await surveyors.findSurveyor(ctx, surveyorId))?.payoutsReady)
      releases.push({ job: 'release-fee' as const, orderId: id, since: movedAt });
  }
  return [...refunds, ...releases];
}

/** Fees earned that wait for their surveyor to set up an account. */
export async function listOwed(ctx: Ctx): Promise<{ orderId: string; surveyorId: string; since: string }[]> {
  const waiting = await surveyOrders.listOrdersIn(ctx, 'settling');
  const unready = [];
  for (const { id, surveyorId, movedAt } of waiting) {
    if (!(await surveyors.findSurveyor(ctx, surveyorId))?.payoutsReady)
      unready.push({ orderId: id, surveyorId, since: movedAt });
  }
  return unready;
}

/** What the processor says it holds for us; null if it does not answer. */
export async function askProcessor(ctx: Ctx): Promise<Money | null> {
  try {
    return await ctx.payments.getBalance('GBP');
  } catch (error) {
    ctx.log.warn({ error: String(error) }, 'the processor did not say what it holds');
    return null;
  }
}

/** What the ledger says the processor holds for us. */
export async function heldByLedger(ctx: Ctx): Promise<Money> {
  const found = (await ledger.getBalances(ctx)).find(
    ({ account, balance }) => account === 'processor' && balance.currency === 'GBP',
  );
  return found?.balance ?? { minor: 0, currency: 'GBP' };
}

/** The job that finds what no notice told us: checkouts paid, accounts ready, money that stopped half way. */
export async function reconcile(ctx: Ctx): Promise<void> {
  const trying = async (what: object, step: () => Promise<unknown>): Promise<void> => {
    try {
      await step();
    } catch (error) {
      // One that fails must not keep the others waiting; it is tried again next time.
      ctx.log.error({ ...what, error: String(error) }, 'not reconciled');
    }
  };
  for (const payment of await payments.listUncertain(ctx)) {
    const { orderId, checkoutId, status } = payment;
    if (checkoutId === null) continue;
    await trying({ orderId }, async () => {
      const receipt = await surveyOrders.receivePayment(ctx, checkoutId);
      if (receipt === 'not-paid' && status === 'expired') await payments.closeCheckout(ctx, payment);
    });
  }
  for (const { userId, payoutAccountId } of await surveyors.listUnready(ctx)) {
    if (payoutAccountId !== null)
      await trying({ surveyor: userId }, () => checkPayouts(ctx, payoutAccountId));
  }
  for (const { job, orderId } of await listStuck(ctx)) await ctx.queue.enqueue(ctx, job, { orderId });
  const itself = await askProcessor(ctx);
  const ours = await heldByLedger(ctx);
  if (itself && itself.minor !== ours.minor)
    ctx.log.error({ ledger: ours.minor, processor: itself.minor }, 'ledger and processor differ');
}
