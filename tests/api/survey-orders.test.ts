import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { LedgerEntry } from '#api/features/ledger/service.ts';
import * as ledger from '#api/features/ledger/service.ts';
import type { OrderSummary, SurveyOrder } from '#shared/survey-orders/contract.ts';
import { addDays, addHours, hoursMs } from '#shared/time.ts';
import { file, givenRecorded } from '#tests/support/examinations.ts';
import { givenListing } from '#tests/support/factories.ts';
import {
  act,
  arrange,
  commission,
  givenPaidOrder,
  givenPlacedOrder,
  givenSurveyor,
  noticesSent,
  payByCard,
  quotesFor,
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

const balanceOn = (entries: LedgerEntry[], account: string): number =>
  entries
    .flatMap(({ lines }) => lines)
    .filter((line) => line.account === account)
    .reduce((sum, line) => sum + line.amount.minor, 0);

const entriesOf = ({ orderId }: Trade) => ledger.getEntriesOfOrder(site.ctxAs(), orderId);
const lettersTo = async (email: string) => (await site.post.list()).filter((letter) => letter.to === email);

/** Examined and filed as the surveyor's own screen would. */
async function report(trade: Trade): Promise<void> {
  await act(site, trade.surveyor, trade.orderId, 'begin').expect(200);
  await file(site, trade.surveyor, await givenRecorded(site, trade)).expect(200);
}

describe('the whole line', () => {
  test('from quotation to released fee, with money, letters and record', async () => {
    const trade = await givenPlacedOrder(site);
    const { orderId, buyer, seller, surveyor, quotation, checkoutUrl } = trade;
    expect((await readOrder(site, buyer, orderId)).status).toBe('awaiting-payment');

    expect(await payByCard(checkoutUrl)).toBe(303);
    await noticesSent(site);
    expect((await readOrder(site, buyer, orderId)).status).toBe('awaiting-surveyor');
    expect(balanceOn(await entriesOf(trade), `held:${orderId}`)).toBe(-quotation.total.minor);

    const startsAt = await arrange(site, trade);
    const arranged = await readOrder(site, surveyor, orderId);
    expect(arranged).toMatchObject({
      status: 'arranged',
      appointmentAt: startsAt,
      address: { line1: '3 Cinder Lane' },
    });

    await report(trade);
    const inReview = await readOrder(site, buyer, orderId);
    expect(inReview.status).toBe('in-review');
    expect(inReview.reportId).not.toBeNull();
    expect(inReview.dueAt).not.toBeNull();

    await act(site, buyer, orderId, 'accept-report').expect(200);
    await site.drain();
    const settled = await readOrder(site, buyer, orderId);
    expect(settled.status).toBe('settled');
    expect(settled.record.map(({ event }) => event)).toEqual([
      'place',
      'pay',
      'accept',
      'proposeTimes',
      'agreeTime',
      'begin',
      'fileReport',
      'acceptReport',
      'release',
    ]);

    const entries = await entriesOf(trade);
    expect(balanceOn(entries, `held:${orderId}`)).toBe(0);
    expect(balanceOn(entries, `surveyor:${surveyor.id}`)).toBe(0);
    expect(balanceOn(entries, 'platform-charge')).toBe(-quotation.platformPart.minor);
    expect(balanceOn(entries, 'processor')).toBe(quotation.platformPart.minor);
    const sum = entries.flatMap(({ lines }) => lines).reduce((all, line) => all + line.amount.minor, 0);
    expect(sum).toBe(0);

    const subjects = async (email: string) =>
      (await lettersTo(email)).map(({ subject }) => subject.split(':')[0]).toReversed();
    expect(await subjects(buyer.email)).toEqual([
      'Confirm your e-mail address',
      'Paid and held',
      'The surveyor has accepted',
      'Time agreed for the survey',
      'The report is in',
    ]);
    expect(await subjects(seller.email)).toEqual([
      'Confirm your e-mail address',
      'A survey of your boiler',
      'Times for the survey',
      'Time agreed for the survey',
      'The report is in',
    ]);
    expect(await subjects(surveyor.email)).toEqual([
      'Confirm your e-mail address',
      'A survey for you to accept',
      'Time agreed for the survey',
      'Your fee has been sent',
    ]);
  });

  test('the address is in no letter but those of the seller and the surveyor', async () => {
    const trade = await givenPaidOrder(site);
    await arrange(site, trade);
    await site.drain();
    const naming = async (email: string) =>
      (await lettersTo(email)).filter(({ text }) => text.includes('3 Cinder Lane')).length;
    expect(await naming(trade.buyer.email)).toBe(0);
    expect(await naming(trade.seller.email)).toBe(1);
    expect(await naming(trade.surveyor.email)).toBe(1);
    const [agreed] = await lettersTo(trade.buyer.email);
    expect(agreed!.attachments).toMatchObject([{ filename: 'survey.ics' }]);
  });

  test('the calendar file names the place only to those who may know it', async () => {
    const trade = await givenPaidOrder(site);
    const path = `/api/survey-orders/${trade.orderId}/calendar.ics`;
    await site.as(trade.buyer).get(path).expect(409);
    const startsAt = await arrange(site, trade);
    const read = async (person: Trade['buyer']) => {
      const response = await site
        .as(person)
        .get(path)
        .expect(200)
        .expect('Content-Type', /^text\/calendar/);
      return response.text.replaceAll('\r\n\t', '');
    };
    // RFC 5545 §3.3.5, form 2: a time in UTC is written with a Z.
    const start = `${startsAt.slice(0, 19).replaceAll(/[-:]/g, '')}Z`;
    expect(await read(trade.buyer)).toContain(`DTSTART:${start}`);
    expect(await read(trade.buyer)).not.toContain('Cinder Lane');
    expect(await read(trade.surveyor)).toContain('Cinder Lane');
    await site
      .as(await site.givenPerson('A Stranger'))
      .get(path)
      .expect(404);
  });
});

describe('commissioning', () => {
  test('quotations come the least first, with distance, and leave out who may not take it', async () => {
    const seller = await site.givenPerson('Edna Marsh');
    const buyer = await site.givenPerson('Col Fettiplace');
    const listing = await givenListing(site, seller);
    const near = await givenSurveyor(site, { hasPayouts: false });
    const dear = await givenSurveyor(site, {
      hasPayouts: false,
      fees: {
        external: 9_000,
        hydraulic: 15_000,
        full: 30_000,
        thickness: 8_000,
        borescope: null,
        perKmMinor: 40,
      },
    });
    const brassOnly = await givenSurveyor(site, { hasPayouts: false, materials: ['brass'] });
    const offers = await quotesFor(site, buyer, listing.id);
    const ids = offers.map(({ surveyor }) => surveyor.id);
    expect(ids).toContain(near.id);
    expect(ids).not.toContain(brassOnly.id);
    expect(ids.indexOf(near.id)).toBeLessThan(ids.indexOf(dear.id));
    const totals = offers.map(({ quotation }) => quotation.total.minor);
    expect(totals).toEqual(totals.toSorted((a, b) => a - b));
    expect(offers.every(({ surveyor }) => /^\d{3}$/.test(surveyor.number))).toBe(true);
  });

  test('a surveyor who has dealt with one of them within the year is not offered', async () => {
    const { seller, surveyor, orderId } = await givenPaidOrder(site);
    const isOffered = async (person: Trade['buyer'], listingId: string) =>
      (await quotesFor(site, person, listingId)).some((offer) => offer.surveyor.id === surveyor.id);
    // Having surveyed for them before is no dealing.
    await act(site, surveyor, orderId, 'accept').expect(200);
    const stranger = await site.givenPerson('Nan Orme');
    const sellersOther = await givenListing(site, seller);
    expect(await isOffered(stranger, sellersOther.id)).toBe(true);

    // Looking to buy from the seller is one.
    await givenSurveyor(site, { hasPayouts: false });
    const [offer] = await quotesFor(site, surveyor, sellersOther.id);
    await site.as(surveyor).post('/api/survey-orders').send(commission(sellersOther.id, offer!)).expect(201);
    const sellersThird = await givenListing(site, seller);
    expect(await isOffered(stranger, sellersThird.id)).toBe(false);
    const somebodyElses = await givenListing(site, await site.givenPerson('Walter Pike'));
    expect(await isOffered(stranger, somebodyElses.id)).toBe(true);
  });

  test('another total than the one shown is refused, and the new one is named', async () => {
    const seller = await site.givenPerson('Edna Marsh');
    const buyer = await site.givenPerson('Col Fettiplace');
    const listing = await givenListing(site, seller);
    await givenSurveyor(site, { hasPayouts: false });
    const [offer] = await quotesFor(site, buyer, listing.id);
    const body = commission(listing.id, offer!);
    const { total } = offer!.quotation;
    const answer = await site
      .as(buyer)
      .post('/api/survey-orders')
      .send({ ...body, expectedTotal: { ...total, minor: total.minor - 1 } })
      .expect(422);
    expect(answer.body).toMatchObject({ errors: [{ pointer: '#/expectedTotal' }] });
    expect((answer.body as { detail: string }).detail).toContain(`£${(total.minor / 100).toFixed(2)}`);
    await site
      .as(buyer)
      .post('/api/survey-orders')
      .send({ ...body, expectedTotal: { ...total, currency: 'EUR' } })
      .expect(422);
  });

  test('a seller cannot commission the survey of their own boiler', async () => {
    const seller = await site.givenPerson('Edna Marsh');
    const listing = await givenListing(site, seller);
    const { body } = await site
      .as(seller)
      .post(`/api/listings/${listing.id}/survey-quotes`)
      .send({ scope: 'external', extras: [] })
      .expect(403);
    expect((body as { detail: string }).detail).toMatch(/their own boiler/);
  });

  test('pressing twice makes one order and one card page', async () => {
    const seller = await site.givenPerson('Edna Marsh');
    const buyer = await site.givenPerson('Col Fettiplace');
    const listing = await givenListing(site, seller);
    await givenSurveyor(site, { hasPayouts: false });
    const [offer] = await quotesFor(site, buyer, listing.id);
    const send = () => site.as(buyer).post('/api/survey-orders').send(commission(listing.id, offer!));
    const answers = await Promise.all(Array.from({ length: 6 }, send));
    expect(answers.map(({ status }) => status)).toEqual(Array.from({ length: 6 }, () => 201));
    const bodies = answers.map(({ body }) => body as { order: SurveyOrder; checkoutUrl: string });
    expect(new Set(bodies.map(({ order }) => order.id)).size).toBe(1);
    expect(new Set(bodies.map(({ checkoutUrl }) => checkoutUrl)).size).toBe(1);
    const other = { ...commission(listing.id, offer!), extras: [] };
    await site.as(buyer).post('/api/survey-orders').send(other).expect(409);
  });
});

describe('who sees what', () => {
  test('a stranger finds nothing, a visitor is asked to sign in', async () => {
    const { orderId } = await givenPaidOrder(site);
    const stranger = await site.givenPerson('A Stranger');
    const tries = [
      await site.as(stranger).get(`/api/survey-orders/${orderId}`),
      await act(site, stranger, orderId, 'accept'),
      await act(site, stranger, orderId, 'cancel', { reason: 'I should like to see it gone' }),
      await act(site, stranger, orderId, 'accept-report'),
      await act(site, stranger, orderId, 'payment-check'),
      await site.as(stranger).get('/api/survey-orders/not-an-id'),
    ];
    expect(tries.map(({ status }) => status)).toEqual(tries.map(() => 404));
    await site.as().get(`/api/survey-orders/${orderId}`).expect(401);
  });

  test('the seller sees no money; buyer and office see no address; the surveyor only once a time is agreed', async () => {
    const trade = await givenPaidOrder(site);
    const { orderId, seller, buyer, surveyor } = trade;
    const office = await site.givenPerson('Idris Fenn', 'office');
    const addressSeenBy = async (person: Trade['buyer']) => (await readOrder(site, person, orderId)).address;
    expect(await readOrder(site, seller, orderId)).toMatchObject({ quotation: null, total: null });
    expect(await addressSeenBy(seller)).not.toBeNull();
    await act(site, surveyor, orderId, 'accept').expect(200);
    expect(await addressSeenBy(surveyor)).toBeNull();
    const startsAt = addHours(site.clock.now(), 30);
    await act(site, surveyor, orderId, 'times', { times: [startsAt] }).expect(200);
    expect(await addressSeenBy(surveyor)).toBeNull();
    await act(site, seller, orderId, 'agree', { startsAt }).expect(200);
    expect(await addressSeenBy(surveyor)).toMatchObject({ postcode: 'HX7 0ZZ' });
    expect(await addressSeenBy(buyer)).toBeNull();
    expect(await addressSeenBy(office)).toBeNull();
    const list = (await site.as(seller).get('/api/survey-orders').expect(200)).body as {
      items: OrderSummary[];
    };
    expect(list.items.map(({ id, total }) => ({ id, total }))).toEqual([{ id: orderId, total: null }]);
    // New times take the address away again.
    await act(site, surveyor, orderId, 'times', { times: [addHours(startsAt, 24)] }).expect(200);
    expect(await addressSeenBy(surveyor)).toBeNull();
  });

  test('an order that is not paid does not trouble the seller or the surveyor', async () => {
    const { seller, surveyor } = await givenPlacedOrder(site);
    for (const person of [seller, surveyor]) {
      const { body } = await site.as(person).get('/api/survey-orders').expect(200);
      expect((body as { items: unknown[] }).items).toEqual([]);
    }
  });
});

describe('arranging', () => {
  test('times must be to come, within sixty days, each once, and each mistake is named', async () => {
    const { orderId, surveyor, seller } = await givenPaidOrder(site);
    await act(site, surveyor, orderId, 'accept').expect(200);
    const now = site.clock.now();
    const good = addHours(now, 20);
    const { body } = await act(site, surveyor, orderId, 'times', {
      times: [good, addHours(now, -1), addDays(now, 61), good],
    }).expect(422);
    expect(body).toMatchObject({
      errors: [{ pointer: '#/times/1' }, { pointer: '#/times/2' }, { pointer: '#/times/3' }],
    });
    await act(site, surveyor, orderId, 'times', { times: [] }).expect(422);
    await act(site, seller, orderId, 'agree', { startsAt: good }).expect(422);
    await act(site, surveyor, orderId, 'times', { times: [good] }).expect(200);
    await act(site, seller, orderId, 'agree', { startsAt: addHours(good, 1) }).expect(422);
    await act(site, surveyor, orderId, 'agree', { startsAt: good }).expect(403);
    await act(site, seller, orderId, 'agree', { startsAt: good }).expect(200);
  });

  test('a time that has passed meanwhile cannot be agreed', async () => {
    const { orderId, surveyor, seller } = await givenPaidOrder(site);
    await act(site, surveyor, orderId, 'accept').expect(200);
    const startsAt = addHours(site.clock.now(), 2);
    await act(site, surveyor, orderId, 'times', { times: [startsAt] }).expect(200);
    site.clock.pass(3 * hoursMs);
    const { body } = await act(site, seller, orderId, 'agree', { startsAt }).expect(422);
    expect(body).toMatchObject({ errors: [{ pointer: '#/startsAt' }] });
  });
});

describe('at once', () => {
  const twenty = async (send: () => Promise<{ status: number }>) => {
    const statuses = (await Promise.all(Array.from({ length: 20 }, send))).map(({ status }) => status);
    return { won: statuses.filter((status) => status === 200).length, statuses: new Set(statuses) };
  };

  test('of twenty acceptances one wins and the others are told', async () => {
    const { orderId, surveyor } = await givenPaidOrder(site);
    const { won, statuses } = await twenty(async () => act(site, surveyor, orderId, 'accept'));
    expect(won).toBe(1);
    expect(statuses).toEqual(new Set([200, 409]));
    const { record } = await readOrder(site, surveyor, orderId);
    expect(record.filter(({ event }) => event === 'accept')).toHaveLength(1);
  });

  test('of twenty acceptances of a report one wins, and one fee is sent', async () => {
    const trade = await givenPaidOrder(site);
    await arrange(site, trade);
    await report(trade);
    const { won, statuses } = await twenty(async () =>
      act(site, trade.buyer, trade.orderId, 'accept-report'),
    );
    expect(won).toBe(1);
    expect(statuses).toEqual(new Set([200, 409]));
    const job = { kind: 'release-fee', data: { orderId: trade.orderId } } as const;
    await runJob(site, job);
    await runJob(site, job);
    const keys = (await entriesOf(trade)).map(({ what }) => what);
    expect(keys).toEqual([
      'Paid by the buyer and held',
      'Fee earned by the surveyor, charge by Tubeplate',
      'Fee sent to the surveyor',
    ]);
  });
});
