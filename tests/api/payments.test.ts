import { Stripe } from 'stripe';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import type { Ctx } from '#api/ctx.ts';
import * as ledger from '#api/features/ledger/service.ts';
import * as settlements from '#api/features/settlements/service.ts';
import { minutesMs } from '#shared/time.ts';
import { file, givenRecorded } from '#tests/support/examinations.ts';
import { keptLog } from '#tests/support/log.ts';
import {
  act,
  arrange,
  bankDesk,
  cards,
  givenPaidOrder,
  givenPlacedOrder,
  noticesSent,
  payByCard,
  readOrder,
  runJob,
  setUpPayouts,
} from '#tests/support/orders.ts';
import type { Person, Trade } from '#tests/support/orders.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

let site: Site;
let office: Person;
const log = keptLog();
beforeAll(async () => {
  site = await givenSite({ log });
  office = await site.givenPerson('Idris Fenn', 'office');
});
afterAll(() => site.close());
beforeEach(() => bankDesk(site, 'mode/send'));

const reason = 'It has been sold to a friend';
const statusOf = async ({ orderId, buyer }: Trade) => (await readOrder(site, buyer, orderId)).status;
const stepsOf = async ({ orderId }: Trade) =>
  (await ledger.getEntriesOfOrder(site.ctxAs(), orderId)).map(({ what }) => what);
const paid = 'Paid by the buyer and held';
const earned = 'Fee earned by the surveyor, charge by Tubeplate';
const sent = 'Fee sent to the surveyor';
const returned = 'Returned to the buyer';

interface Delivery {
  eventId: string;
  type: string;
}
const deliveries = async (): Promise<Delivery[]> =>
  ((await (await fetch(`${site.bank.url}/control/state`)).json()) as { deliveries: Delivery[] }).deliveries;

/** The ledger and the processor agree to the penny. */
async function expectAgreement(): Promise<void> {
  const { body } = await site.as(office).get('/api/office/money').expect(200);
  expect(body).toMatchObject({ agrees: true });
}

async function inReview(terms: Parameters<typeof givenPaidOrder>[1] = {}): Promise<Trade> {
  const trade = await givenPaidOrder(site, terms);
  await arrange(site, trade);
  await act(site, trade.surveyor, trade.orderId, 'begin').expect(200);
  await file(site, trade.surveyor, await givenRecorded(site, trade)).expect(200);
  return trade;
}

describe('the card', () => {
  test('a card that is declined holds nothing, and another one pays', async () => {
    const trade = await givenPlacedOrder(site);
    expect(await payByCard(trade.checkoutUrl, cards.declined)).toBe(402);
    await noticesSent(site);
    expect(await statusOf(trade)).toBe('awaiting-payment');
    expect(await stepsOf(trade)).toEqual([]);
    const { body } = await act(site, trade.buyer, trade.orderId, 'checkout').expect(200);
    expect(body).toEqual({ checkoutUrl: trade.checkoutUrl });
    expect(await payByCard(trade.checkoutUrl)).toBe(303);
    await noticesSent(site);
    expect(await statusOf(trade)).toBe('awaiting-surveyor');
    await act(site, trade.buyer, trade.orderId, 'checkout').expect(409);
    await act(site, trade.surveyor, trade.orderId, 'checkout').expect(403);
  });
});

describe('notices', () => {
  test('one that comes again, and again, changes nothing', async () => {
    const trade = await givenPaidOrder(site);
    const completed = (await deliveries()).findLast(({ type }) => type === 'checkout.session.completed')!;
    await Promise.all([1, 2, 3].map(() => bankDesk(site, `repeat/${completed.eventId}`)));
    expect(await stepsOf(trade)).toEqual([paid]);
    const { record } = await readOrder(site, trade.buyer, trade.orderId);
    expect(record.filter(({ event }) => event === 'pay')).toHaveLength(1);
  });

  test('late and in reverse order they come to the same', async () => {
    const trade = await givenPlacedOrder(site);
    await bankDesk(site, 'mode/hold');
    await payByCard(trade.checkoutUrl);
    expect(await statusOf(trade)).toBe('awaiting-payment');
    await bankDesk(site, 'release-reversed');
    expect(await statusOf(trade)).toBe('awaiting-surveyor');
    expect(await stepsOf(trade)).toEqual([paid]);
  });

  test('one that is lost is fetched when the buyer asks', async () => {
    const trade = await givenPlacedOrder(site);
    await bankDesk(site, 'mode/drop');
    await act(site, trade.buyer, trade.orderId, 'payment-check').expect(200);
    expect(await statusOf(trade)).toBe('awaiting-payment');
    await payByCard(trade.checkoutUrl);
    const asked = await Promise.all(
      [1, 2, 3, 4].map(async () => act(site, trade.buyer, trade.orderId, 'payment-check')),
    );
    expect(asked.map(({ status }) => status)).toEqual([200, 200, 200, 200]);
    expect(await statusOf(trade)).toBe('awaiting-surveyor');
    expect(await stepsOf(trade)).toEqual([paid]);
    await act(site, trade.surveyor, trade.orderId, 'payment-check').expect(403);
  });

  test('one that is lost is fetched by the reconciliation', async () => {
    const trade = await givenPlacedOrder(site);
    await bankDesk(site, 'mode/drop');
    await payByCard(trade.checkoutUrl);
    await runJob(site, { kind: 'reconcile-payments', data: {} });
    expect(await statusOf(trade)).toBe('awaiting-payment');
    site.clock.pass(3 * minutesMs);
    await runJob(site, { kind: 'reconcile-payments', data: {} });
    expect(await statusOf(trade)).toBe('awaiting-surveyor');
    await runJob(site, { kind: 'reconcile-payments', data: {} });
    expect(await stepsOf(trade)).toEqual([paid]);
  });

  const signed = (event: object, at = Math.floor(Date.now() / 1000), secret = 'whsec_for_tests_only') => {
    const payload = JSON.stringify(event);
    const header = Stripe.webhooks.generateTestHeaderString({ payload, secret, timestamp: at });
    return fetch(`${site.url}/api/payments/notices`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json', 'Stripe-Signature': header },
      body: payload,
    });
  };
  const event = (id: string, checkoutId: string) => ({
    id,
    object: 'event',
    type: 'checkout.session.completed',
    data: { object: { id: checkoutId, object: 'checkout.session' } },
  });

  // The window of five minutes is the SDK's own default tolerance (stripe-node, webhooks.constructEvent).
  test.each([
    ['with another secret', () => signed(event('evt_other', 'cs_x'), undefined, 'whsec_of_somebody_else')],
    ['ten minutes old', () => signed(event('evt_old', 'cs_x'), Math.floor(Date.now() / 1000) - 600)],
    ['about a checkout that is not ours', () => signed(event('evt_unknown', 'cs_nobody'))],
    [
      'without a signature',
      () => fetch(`${site.url}/api/payments/notices`, { method: 'POST', body: '{"id":"evt_none"}' }),
    ],
  ])('one %s is refused and logged', async (_name, send) => {
    const before = log.lines.length;
    expect((await send()).status).toBe(400);
    const logged = log.lines.slice(before).filter(({ message }) => message.startsWith('notice refused'));
    expect(logged).toHaveLength(1);
  });

  test('one that is none of our business is taken and forgotten', async () => {
    const answer = await signed({
      id: 'evt_idle',
      object: 'event',
      type: 'payout.paid',
      data: { object: {} },
    });
    expect(answer.status).toBe(200);
  });
});

describe('given up before it was paid', () => {
  test('the card page is closed, and nobody can pay it', async () => {
    const trade = await givenPlacedOrder(site);
    await act(site, trade.buyer, trade.orderId, 'cancel', { reason }).expect(200);
    expect(await statusOf(trade)).toBe('cancelled');
    expect(await payByCard(trade.checkoutUrl)).toBe(404);
    await noticesSent(site);
    expect(await stepsOf(trade)).toEqual([]);
  });

  test('paid in the same moment, with the notice still to come: it is cancelled and goes back', async () => {
    const trade = await givenPlacedOrder(site);
    await bankDesk(site, 'mode/hold');
    await payByCard(trade.checkoutUrl);
    await act(site, trade.buyer, trade.orderId, 'cancel', { reason }).expect(200);
    await site.drain();
    expect(await statusOf(trade)).toBe('refunded');
    await bankDesk(site, 'mode/send');
    await bankDesk(site, 'release');
    expect(await stepsOf(trade)).toEqual([paid, returned]);
    await expectAgreement();
  });

  /** The order is given up while the payment service does not answer, so that its page stays open. */
  const cancelledUnheard = async (): Promise<Trade> => {
    const trade = await givenPlacedOrder(site);
    const { deps } = site;
    const real = deps.payments;
    const deaf = { ...real, closeCheckout: () => Promise.reject(new Error('no answer')) };
    (deps as { payments: typeof real }).payments = deaf;
    await act(site, trade.buyer, trade.orderId, 'cancel', { reason }).expect(200);
    (deps as { payments: typeof real }).payments = real;
    return trade;
  };

  test('money that comes after that goes back at once', async () => {
    const trade = await cancelledUnheard();
    expect(await payByCard(trade.checkoutUrl)).toBe(303);
    await noticesSent(site);
    expect(await stepsOf(trade)).toEqual([paid]);
    await site.drain();
    expect(await statusOf(trade)).toBe('cancelled');
    expect(await stepsOf(trade)).toEqual([paid, returned]);
    const letters = (await site.post.list()).filter(({ to }) => to === trade.buyer.email);
    expect(letters[0]?.subject).toContain('Your payment came too late');
    await expectAgreement();
  });

  test('and the reconciliation closes the page, or finds that it was paid', async () => {
    const unpaid = await cancelledUnheard();
    const late = await cancelledUnheard();
    await bankDesk(site, 'mode/drop');
    await payByCard(late.checkoutUrl);
    await runJob(site, { kind: 'reconcile-payments', data: {} });
    await site.drain();
    expect(await payByCard(unpaid.checkoutUrl)).toBe(404);
    expect(await stepsOf(late)).toEqual([paid, returned]);
    await expectAgreement();
  });
});

describe('a fee', () => {
  test('waits, earned and owed, until the surveyor has set up where it goes', async () => {
    const trade = await inReview({ hasPayouts: false });
    const { orderId, buyer, surveyor, quotation } = trade;
    await act(site, buyer, orderId, 'accept-report').expect(200);
    await site.drain();
    expect(await statusOf(trade)).toBe('settling');
    expect(await stepsOf(trade)).toEqual([paid, earned]);
    expect((await readOrder(site, surveyor, orderId)).record.at(-1)?.label).toMatch(
      /waits until the surveyor/,
    );
    const owed = (await ledger.getBalances(site.ctxAs())).find(
      ({ account }) => account === `surveyor:${surveyor.id}`,
    );
    expect(owed?.balance.minor).toBe(-quotation.surveyorPart.minor);

    await setUpPayouts(site, surveyor);
    await site.drain();
    expect(await statusOf(trade)).toBe('settled');
    expect(await stepsOf(trade)).toEqual([paid, earned, sent]);
    await expectAgreement();
  });

  test('goes out when the notice of the account was lost, by the reconciliation', async () => {
    const trade = await inReview({ hasPayouts: false });
    await act(site, trade.buyer, trade.orderId, 'accept-report').expect(200);
    await site.drain();
    await bankDesk(site, 'mode/drop');
    await setUpPayouts(site, trade.surveyor);
    await runJob(site, { kind: 'reconcile-payments', data: {} });
    await site.drain();
    expect(await stepsOf(trade)).toEqual([paid, earned, sent]);
  });

  test('is sent once, though the process dies after each step and the job is run again and again', async () => {
    const trade = await inReview();
    const { orderId } = trade;
    await act(site, trade.buyer, orderId, 'accept-report').expect(200);
    const ctx = site.ctxAs();
    const dies = (when: 'before' | 'after'): Ctx => ({
      ...ctx,
      payments: {
        ...ctx.payments,
        transfer: async (transfer) => {
          if (when === 'after') await ctx.payments.transfer(transfer);
          throw new Error('killed');
        },
      },
    });
    await expect(settlements.releaseFee(dies('before'), orderId)).rejects.toThrow('killed');
    expect(await stepsOf(trade)).toEqual([paid, earned]);
    await expect(settlements.releaseFee(dies('after'), orderId)).rejects.toThrow('killed');
    expect(await stepsOf(trade)).toEqual([paid, earned]);
    await settlements.releaseFee(ctx, orderId);
    await settlements.releaseFee(ctx, orderId);
    await site.drain();
    expect(await stepsOf(trade)).toEqual([paid, earned, sent]);
    await expectAgreement();
  });
});

describe('a refund', () => {
  test('is made once, though the process dies after each step and the job is run again and again', async () => {
    const trade = await givenPaidOrder(site);
    const { orderId } = trade;
    await act(site, trade.surveyor, orderId, 'decline', { reason: 'Away that month' }).expect(200);
    const ctx = site.ctxAs();
    const dying: Ctx = {
      ...ctx,
      payments: {
        ...ctx.payments,
        refund: async (refund) => {
          await ctx.payments.refund(refund);
          throw new Error('killed');
        },
      },
    };
    await expect(settlements.refundOrder(dying, orderId)).rejects.toThrow('killed');
    expect(await stepsOf(trade)).toEqual([paid]);
    expect(await statusOf(trade)).toBe('refund-due');
    await Promise.allSettled([1, 2, 3].map(() => settlements.refundOrder(ctx, orderId)));
    await site.drain();
    expect(await stepsOf(trade)).toEqual([paid, returned]);
    expect(await statusOf(trade)).toBe('refunded');
    await expectAgreement();
  });

  test('that never began is promised again by the reconciliation', async () => {
    const trade = await givenPaidOrder(site);
    await act(site, trade.surveyor, trade.orderId, 'decline', { reason: 'Away that month' }).expect(200);
    site.clock.pass(15 * minutesMs);
    expect(await settlements.listStuck(site.ctxAs())).toMatchObject([
      { job: 'refund-order', orderId: trade.orderId },
    ]);
    await runJob(site, { kind: 'reconcile-payments', data: {} });
    await site.drain();
    expect(await stepsOf(trade)).toEqual([paid, returned]);
  });
});
