import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import * as ledger from '#api/features/ledger/service.ts';
import * as settlements from '#api/features/settlements/service.ts';
import type { SurveyOrder } from '#shared/survey-orders/contract.ts';
import { file, givenRecorded } from '#tests/support/examinations.ts';
import { givenListing } from '#tests/support/factories.ts';
import {
  act,
  arrange,
  bankDesk,
  commission,
  givenPaidOrder,
  givenPlacedOrder,
  givenSurveyor,
  payByCard,
  quotesFor,
  readOrder,
} from '#tests/support/orders.ts';
import { hasPostgres, startPostgres } from '#tests/support/postgres.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

/**
 * PGlite has one connection, so that nothing there is ever truly at once. These are the races run where ten connections
 * meet; they are left out where the machine has no PostgreSQL.
 */
describe.skipIf(!hasPostgres)('on PostgreSQL, truly at once', () => {
  let site: Site;
  beforeAll(async () => {
    site = await givenSite({ database: await startPostgres() });
  });
  afterAll(() => site.close());

  const times = <T>(count: number, send: () => Promise<T>): Promise<T[]> =>
    Promise.all(Array.from({ length: count }, send));
  const oneOfTwenty = [200, ...Array.from({ length: 19 }, () => 409)];
  const stepsOf = async (orderId: string) =>
    (await ledger.getEntriesOfOrder(site.ctxAs(), orderId)).map(({ what }) => what);

  test('twenty presses place one order', async () => {
    const buyer = await site.givenPerson('Col Fettiplace');
    const listing = await givenListing(site, await site.givenPerson('Edna Marsh'));
    await givenSurveyor(site, { hasPayouts: false });
    const [offer] = await quotesFor(site, buyer, listing.id);
    const answers = await times(20, async () =>
      site.as(buyer).post('/api/survey-orders').send(commission(listing.id, offer!)),
    );
    const ids = answers.map(({ body }) => (body as { order: SurveyOrder }).order.id);
    expect(new Set(ids).size).toBe(1);
  });

  test('twenty who ask whether it is paid take the money in once', async () => {
    const { orderId, buyer, checkoutUrl } = await givenPlacedOrder(site, { hasPayouts: false });
    await bankDesk(site, 'mode/drop');
    await payByCard(checkoutUrl);
    await bankDesk(site, 'mode/send');
    const answers = await times(20, async () => act(site, buyer, orderId, 'payment-check'));
    expect(new Set(answers.map(({ status }) => status))).toEqual(new Set([200]));
    expect(await stepsOf(orderId)).toEqual(['Paid by the buyer and held']);
    const { record } = await readOrder(site, buyer, orderId);
    expect(record.map(({ event }) => event)).toEqual(['place', 'pay']);
  });

  test('of ten acceptances and ten cancellations one wins, and the others are told', async () => {
    const { orderId, buyer, surveyor } = await givenPaidOrder(site, { hasPayouts: false });
    const answers = await Promise.all([
      times(10, async () => act(site, surveyor, orderId, 'decline', { reason: 'Away that month' })),
      times(10, async () => act(site, buyer, orderId, 'cancel', { reason: 'Sold to a friend' })),
    ]);
    const statuses = answers.flat().map(({ status }) => status);
    expect(statuses.toSorted((a, b) => a - b)).toEqual(oneOfTwenty);
    await Promise.allSettled(Array.from({ length: 5 }, () => settlements.refundOrder(site.ctxAs(), orderId)));
    expect(await stepsOf(orderId)).toEqual(['Paid by the buyer and held', 'Returned to the buyer']);
    expect((await readOrder(site, buyer, orderId)).status).toBe('refunded');
  });

  test('of twenty acceptances of a report one wins, and of ten releases one fee is sent', async () => {
    const trade = await givenPaidOrder(site);
    const { orderId, buyer, surveyor } = trade;
    await arrange(site, trade);
    await act(site, surveyor, orderId, 'begin').expect(200);
    await file(site, surveyor, await givenRecorded(site, trade)).expect(200);
    const statuses = (await times(20, async () => act(site, buyer, orderId, 'accept-report'))).map(
      ({ status }) => status,
    );
    expect(statuses.toSorted((a, b) => a - b)).toEqual(oneOfTwenty);
    await Promise.allSettled(Array.from({ length: 10 }, () => settlements.releaseFee(site.ctxAs(), orderId)));
    await settlements.releaseFee(site.ctxAs(), orderId);
    expect(await stepsOf(orderId)).toEqual([
      'Paid by the buyer and held',
      'Fee earned by the surveyor, charge by Tubeplate',
      'Fee sent to the surveyor',
    ]);
    expect((await readOrder(site, buyer, orderId)).status).toBe('settled');
  });

  test('the office reads the same audit and ledger', async () => {
    const office = await site.givenPerson('Idris Fenn', 'office');
    const audit = await site.as(office).get('/api/office/audit?limit=5').expect(200);
    const { nextCursor } = audit.body as { nextCursor: string };
    await site
      .as(office)
      .get(`/api/office/audit?limit=5&cursor=${encodeURIComponent(nextCursor)}`)
      .expect(200);
    const money = await site.as(office).get('/api/office/money').expect(200);
    expect(money.body).toMatchObject({ agrees: true });
  });
});
