import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import * as ledger from '#api/features/ledger/service.ts';
import { daysMs, hoursMs } from '#shared/time.ts';
import { file, givenRecorded } from '#tests/support/examinations.ts';
import {
  act,
  arrange,
  givenPaidOrder,
  givenPlacedOrder,
  payByCard,
  readOrder,
  runJob,
} from '#tests/support/orders.ts';
import type { Trade } from '#tests/support/orders.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

let site: Site;
beforeAll(async () => {
  site = await givenSite();
});
afterAll(() => site.close());

const reason = 'Something has come up';
/** Runs the refund alone: draining would send every letter first. */
const refund = ({ orderId }: Trade) => runJob(site, { kind: 'refund-order', data: { orderId } });
const statusOf = async ({ orderId, buyer }: Trade) => (await readOrder(site, buyer, orderId)).status;
const heldOn = async ({ orderId }: Trade) => (await ledger.getHeld(site.ctxAs())).get(orderId)?.minor ?? 0;

const accepted = async (): Promise<Trade> => {
  const trade = await givenPaidOrder(site);
  await act(site, trade.surveyor, trade.orderId, 'accept').expect(200);
  return trade;
};
const arranged = async (): Promise<Trade> => {
  const trade = await givenPaidOrder(site);
  await arrange(site, trade);
  return trade;
};
const examining = async (): Promise<Trade> => {
  const trade = await arranged();
  await act(site, trade.surveyor, trade.orderId, 'begin').expect(200);
  return trade;
};
const inReview = async (): Promise<Trade> => {
  const trade = await examining();
  await file(site, trade.surveyor, await givenRecorded(site, trade)).expect(200);
  return trade;
};

describe('cancelling', () => {
  type Outcomes = Record<'buyer' | 'seller' | 'surveyor', 'cancelled' | 'refunded' | 403 | 409>;
  const all = <T>(outcome: T) => ({ buyer: outcome, seller: outcome, surveyor: outcome });
  const cases: [string, () => Promise<Trade>, Outcomes][] = [
    ['not paid', () => givenPlacedOrder(site), { buyer: 'cancelled', seller: 403, surveyor: 403 }],
    [
      'waiting for the surveyor',
      () => givenPaidOrder(site),
      { buyer: 'refunded', seller: 403, surveyor: 403 },
    ],
    ['a time is being agreed', accepted, all('refunded' as const)],
    ['arranged', arranged, all('refunded' as const)],
    ['examining', examining, all(409 as const)],
    ['in review', inReview, all(409 as const)],
  ];

  test.each(cases)(
    'while %s, each party can do what the table says and no more',
    async (_name, given, outcomes) => {
      const found: Record<string, unknown> = {};
      let trade = await given();
      // Those who may not come first: the order is then still there for one who may.
      const rank = (part: keyof Outcomes) => (typeof outcomes[part] === 'number' ? 0 : 1);
      for (const part of (['seller', 'surveyor', 'buyer'] as const).toSorted((a, b) => rank(a) - rank(b))) {
        if (Object.values(found).some((outcome) => typeof outcome === 'string')) trade = await given();
        const before = await statusOf(trade);
        const { status } = await act(site, trade[part], trade.orderId, 'cancel', { reason });
        await refund(trade);
        const after = await statusOf(trade);
        found[part] = status === 200 ? after : after === before && status;
      }
      expect(found).toEqual(outcomes);
      const { record, status } = await readOrder(site, trade.buyer, trade.orderId);
      const cancelled = record
        .filter(({ event }) => event === 'cancel')
        .map(({ by, reason }) => ({ by, reason }));
      const isCancelled = status === 'cancelled' || status === 'refunded';
      expect(cancelled).toEqual(isCancelled ? [{ by: trade.buyer.name, reason }] : []);
      expect((await heldOn(trade)) > 0).toBe(!isCancelled);
    },
  );

  test('wants a reason, and says so beside it', async () => {
    const trade = await givenPaidOrder(site);
    const { body } = await act(site, trade.buyer, trade.orderId, 'cancel', { reason: ' ' }).expect(422);
    expect(body).toMatchObject({ errors: [{ pointer: '#/reason', detail: 'Give a reason in a few words' }] });
  });

  test('everybody concerned is told, with the reason', async () => {
    const trade = await arranged();
    await act(site, trade.seller, trade.orderId, 'cancel', { reason }).expect(200);
    await site.drain();
    const letters = await site.post.list();
    for (const person of [trade.buyer, trade.seller, trade.surveyor]) {
      const told = letters.filter(({ to, subject }) => to === person.email && /is cancelled/.test(subject));
      expect(told).toHaveLength(1);
      expect(told[0]!.text).toContain(reason);
    }
  });
});

describe('other ends', () => {
  test('a surveyor who declines sends the money back', async () => {
    const trade = await givenPaidOrder(site);
    await act(site, trade.surveyor, trade.orderId, 'decline', { reason }).expect(200);
    await refund(trade);
    expect(await statusOf(trade)).toBe('refunded');
    expect(await heldOn(trade)).toBe(0);
  });

  test('an examination given up sends the money back', async () => {
    const trade = await examining();
    await act(site, trade.buyer, trade.orderId, 'abandon', { reason }).expect(403);
    await act(site, trade.surveyor, trade.orderId, 'abandon', { reason }).expect(200);
    await refund(trade);
    expect(await statusOf(trade)).toBe('refunded');
  });

  test('a final order can be moved by nobody', async () => {
    const trade = await givenPlacedOrder(site);
    await act(site, trade.buyer, trade.orderId, 'cancel', { reason }).expect(200);
    const { events } = await readOrder(site, trade.buyer, trade.orderId);
    expect(events).toEqual([]);
    await act(site, trade.buyer, trade.orderId, 'cancel', { reason }).expect(409);
  });
});

describe('clocks', () => {
  const lapse = ({ orderId }: Trade) => runJob(site, { kind: 'lapse-order', data: { orderId } });

  test('unpaid for a day, an order lapses and its card page is closed', async () => {
    const trade = await givenPlacedOrder(site);
    await lapse(trade);
    expect(await statusOf(trade)).toBe('awaiting-payment');
    site.clock.pass(24 * hoursMs);
    await lapse(trade);
    await lapse(trade);
    expect(await statusOf(trade)).toBe('cancelled');
    expect(await payByCard(trade.checkoutUrl)).toBe(404);
  });

  test('paid at the last moment, it is not lapsed but held', async () => {
    const trade = await givenPlacedOrder(site);
    site.clock.pass(24 * hoursMs);
    await fetch(`${site.bank.url}/control/mode/drop`, { method: 'POST', redirect: 'manual' });
    await payByCard(trade.checkoutUrl);
    await fetch(`${site.bank.url}/control/mode/send`, { method: 'POST', redirect: 'manual' });
    await lapse(trade);
    expect(await statusOf(trade)).toBe('awaiting-surveyor');
  });

  test('unanswered for two days, a paid order lapses and the money goes back', async () => {
    const trade = await givenPaidOrder(site);
    site.clock.pass(25 * hoursMs);
    await lapse(trade);
    expect(await statusOf(trade)).toBe('awaiting-surveyor');
    site.clock.pass(24 * hoursMs);
    await lapse(trade);
    await refund(trade);
    expect(await statusOf(trade)).toBe('refunded');
    expect(await heldOn(trade)).toBe(0);
    await act(site, trade.surveyor, trade.orderId, 'accept').expect(409);
  });

  test('a report nobody speaks against for five days releases the fee', async () => {
    const trade = await inReview();
    const end = () => runJob(site, { kind: 'end-review', data: { orderId: trade.orderId } });
    site.clock.pass(4 * daysMs);
    await end();
    expect(await statusOf(trade)).toBe('in-review');
    site.clock.pass(1.1 * daysMs);
    await end();
    await end();
    await runJob(site, { kind: 'release-fee', data: { orderId: trade.orderId } });
    expect(await statusOf(trade)).toBe('settled');
    const { record } = await readOrder(site, trade.buyer, trade.orderId);
    expect(record.filter(({ event }) => event === 'endReview')).toMatchObject([{ by: 'Tubeplate' }]);
  });
});
