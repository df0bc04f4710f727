import type { Actor } from '#api/ctx.ts';
import { handleJob } from '#api/jobs/handlers.ts';
import type { Job } from '#api/jobs/jobs.ts';
import * as surveyorService from '#api/features/surveyors/service.ts';
import type { OwnListing } from '#shared/listings/contract.ts';
import type { SurveyOrder } from '#shared/survey-orders/contract.ts';
import type { Quotation } from '#shared/survey-orders/pricing.ts';
import type { Surveyor, SurveyorTerms } from '#shared/surveyors/contract.ts';
import { boilerTypeIds } from '#shared/boilers/boiler-types.ts';
import { addHours } from '#shared/time.ts';
import { expect, vi } from 'vitest';
import { givenListing, hebdenBridge } from './factories.ts';
import type { Site, TestPerson } from './site.ts';

export type Person = TestPerson & Actor;

/** Public test numbers of the payment service. */
export const cards = {
  pays: '4242424242424242',
  declined: '4000000000000002',
  authenticate: '4000002500003155',
} as const;

export const surveyorTerms = (overrides: Partial<SurveyorTerms> = {}): SurveyorTerms => ({
  townId: hebdenBridge,
  rangeKm: 200,
  types: [...boilerTypeIds],
  materials: ['copper', 'copper-brass', 'brass', 'steel', 'stainless'],
  insuredUntilOn: '2099-12-31',
  fees: {
    external: 6_000,
    hydraulic: 11_000,
    full: 18_500,
    thickness: 2_500,
    borescope: null,
    perKmMinor: 40,
  },
  about: 'Second boiler tester of a club in the hills since 2015, and a toolmaker before that.',
  isTakingJobs: true,
  ...overrides,
});

/** Everything the stand-in for the payment service had to say has been said. */
export async function noticesSent(site: Site): Promise<void> {
  await vi.waitFor(async () => {
    const state = (await (await fetch(`${site.bank.url}/control/state`)).json()) as {
      deliveries: { state: string }[];
    };
    expect(state.deliveries.filter((delivery) => delivery.state === 'waiting')).toEqual([]);
  });
}

export const bankDesk = async (site: Site, path: string): Promise<void> => {
  await fetch(`${site.bank.url}/control/${path}`, { method: 'POST', redirect: 'manual' });
};

/** Finishes the payment service's own set-up page. */
export async function setUpPayouts(site: Site, surveyor: Person): Promise<void> {
  const { body } = await site.as(surveyor).post('/api/my/payout-set-up').expect(200);
  await fetch((body as { url: string }).url, { method: 'POST', redirect: 'manual' });
  await noticesSent(site);
}

/** A surveyor who takes jobs; with an account to be paid to unless told otherwise. */
export async function givenSurveyor(
  site: Site,
  { hasPayouts = true, ...overrides }: Partial<SurveyorTerms> & { hasPayouts?: boolean } = {},
): Promise<Person> {
  const surveyor = await site.givenPerson('Ida Rowan', 'surveyor');
  await surveyorService.saveMySurveyorTerms(site.ctxAs(surveyor), surveyorTerms(overrides));
  if (hasPayouts) await setUpPayouts(site, surveyor);
  return surveyor;
}

/** Fills in the hosted card page. @returns the status of its answer: 303 leads back, 402 is a refusal. */
export async function payByCard(checkoutUrl: string, number: string = cards.pays): Promise<number> {
  const answer = await fetch(checkoutUrl, {
    method: 'POST',
    redirect: 'manual',
    body: new URLSearchParams({ number, expiry: '08/99', cvc: '123' }),
  });
  return answer.status;
}

export interface Trade {
  seller: Person;
  buyer: Person;
  surveyor: Person;
  listing: OwnListing;
  orderId: string;
  checkoutUrl: string;
  quotation: Quotation;
}

interface Offer {
  surveyor: Surveyor;
  quotation: Quotation;
}

export async function quotesFor(site: Site, buyer: Person, listingId: string): Promise<Offer[]> {
  const { body } = await site
    .as(buyer)
    .post(`/api/listings/${listingId}/survey-quotes`)
    .send({ scope: 'full', extras: ['thickness'] })
    .expect(200);
  return (body as { items: Offer[] }).items;
}

export const commission = (listingId: string, { surveyor, quotation }: Offer) => ({
  listingId,
  surveyorId: surveyor.id,
  scope: 'full',
  extras: ['thickness'],
  expectedTotal: quotation.total,
  beginsWithinCancellationPeriod: true,
});

/** A seller, a buyer and a surveyor of their own, and an order placed and not paid. */
export async function givenPlacedOrder(
  site: Site,
  terms: Parameters<typeof givenSurveyor>[1] = {},
): Promise<Trade> {
  const seller = await site.givenPerson('Edna Marsh');
  const buyer = await site.givenPerson('Col Fettiplace');
  const surveyor = await givenSurveyor(site, terms);
  const listing = await givenListing(site, seller);
  const offer = (await quotesFor(site, buyer, listing.id)).find((one) => one.surveyor.id === surveyor.id)!;
  const { body } = await site
    .as(buyer)
    .post('/api/survey-orders')
    .send(commission(listing.id, offer))
    .expect(201);
  const { order, checkoutUrl } = body as { order: SurveyOrder; checkoutUrl: string };
  return { seller, buyer, surveyor, listing, orderId: order.id, checkoutUrl, quotation: offer.quotation };
}

/** The same, paid by card and heard of. */
export async function givenPaidOrder(
  site: Site,
  terms: Parameters<typeof givenSurveyor>[1] = {},
): Promise<Trade> {
  const trade = await givenPlacedOrder(site, terms);
  expect(await payByCard(trade.checkoutUrl)).toBe(303);
  await noticesSent(site);
  return trade;
}

/** What a person does to an order. */
export const act = (site: Site, person: TestPerson, orderId: string, what: string, body: object = {}) =>
  site.as(person).post(`/api/survey-orders/${orderId}/${what}`).send(body);

export const readOrder = async (site: Site, person: TestPerson, orderId: string): Promise<SurveyOrder> =>
  (await site.as(person).get(`/api/survey-orders/${orderId}`).expect(200)).body as SurveyOrder;

/** Accepted, times proposed, one agreed. */
export async function arrange(site: Site, { orderId, surveyor, seller }: Trade): Promise<string> {
  const startsAt = addHours(site.clock.now(), 48);
  await act(site, surveyor, orderId, 'accept').expect(200);
  await act(site, surveyor, orderId, 'times', { times: [addHours(startsAt, 5), startsAt] }).expect(200);
  await act(site, seller, orderId, 'agree', { startsAt }).expect(200);
  return startsAt;
}

/** Runs one job now, as the queue would when it falls due. */
export const runJob = (site: Site, job: Job): Promise<void> => handleJob(site.ctxAs(), job);
