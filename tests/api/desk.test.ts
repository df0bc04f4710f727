import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { DeskItem } from '#shared/desk/contract.ts';
import { addHours, hoursMs, minutesMs } from '#shared/time.ts';
import { file, givenRecorded } from '#tests/support/examinations.ts';
import { act, arrange, givenPaidOrder, givenPlacedOrder, surveyorTerms } from '#tests/support/orders.ts';
import type { Person } from '#tests/support/orders.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

let site: Site;
beforeAll(async () => {
  site = await givenSite();
});
afterAll(() => site.close());

const deskOf = async (person: Person): Promise<DeskItem[]> =>
  ((await site.as(person).get('/api/desk').expect(200)).body as { items: DeskItem[] }).items;
const todosOf = async (person: Person) => (await deskOf(person)).map(({ todo }) => todo);

test('a visitor has no desk', async () => {
  const answer = await site.as().get('/api/desk');
  expect(answer.status).toBe(401);
});

test('each stage of an order is on the desk of those who have to do something, and of nobody else', async () => {
  const trade = await givenPlacedOrder(site);
  const { seller, buyer, surveyor, orderId, checkoutUrl } = trade;
  const desks = async () => ({
    buyer: await todosOf(buyer),
    seller: await todosOf(seller),
    surveyor: await todosOf(surveyor),
  });
  expect(await desks()).toEqual({ buyer: ['Pay for the survey'], seller: [], surveyor: [] });

  await fetch(checkoutUrl, {
    method: 'POST',
    redirect: 'manual',
    body: new URLSearchParams({ number: '4242424242424242', expiry: '08/99', cvc: '123' }),
  });
  await act(site, buyer, orderId, 'payment-check').expect(200);
  expect(await desks()).toEqual({ buyer: [], seller: [], surveyor: ['Accept or decline a survey'] });
  const [toAccept] = await deskOf(surveyor);
  expect(toAccept).toMatchObject({ path: `/surveys/${orderId}` });
  expect(toAccept!.dueAt).not.toBeNull();

  await act(site, surveyor, orderId, 'accept').expect(200);
  expect(await desks()).toEqual({ buyer: [], seller: [], surveyor: ['Propose times for the visit'] });

  const startsAt = addHours(site.clock.now(), 3);
  await act(site, surveyor, orderId, 'times', { times: [startsAt] }).expect(200);
  expect(await desks()).toEqual({ buyer: [], seller: ['Agree a time for the survey'], surveyor: [] });

  site.clock.pass(4 * hoursMs);
  expect(await desks()).toEqual({ buyer: [], seller: [], surveyor: ['Propose new times'] });

  const later = addHours(site.clock.now(), 3);
  await act(site, surveyor, orderId, 'times', { times: [later] }).expect(200);
  await act(site, seller, orderId, 'agree', { startsAt: later }).expect(200);
  expect(await desks()).toEqual({ buyer: [], seller: [], surveyor: ['Examine the boiler'] });

  await act(site, surveyor, orderId, 'begin').expect(200);
  expect(await desks()).toEqual({ buyer: [], seller: [], surveyor: ['Go on with the survey'] });

  await file(site, surveyor, await givenRecorded(site, trade)).expect(200);
  expect(await desks()).toEqual({
    buyer: ['Read the report'],
    seller: ['Read the report on your boiler'],
    surveyor: [],
  });
  expect((await deskOf(buyer))[0]!.path).toMatch(/^\/reports\//);

  await act(site, buyer, orderId, 'accept-report').expect(200);
  await site.drain();
  expect(await desks()).toEqual({ buyer: [], seller: [], surveyor: [] });
});

test('an unfinished draft waits for its seller', async () => {
  const seller = await site.givenPerson('Edna Marsh');
  await site.as(seller).post('/api/listings').expect(201);
  expect(await deskOf(seller)).toMatchObject([
    { todo: 'Finish your listing', about: 'A boiler without a title yet', dueAt: null },
  ]);
});

test('what has a clock comes first, the nearest on top', async () => {
  const { buyer, surveyor, orderId, seller } = await givenPaidOrder(site);
  await site.as(surveyor).post('/api/listings').expect(201);
  await arrange(site, { buyer, surveyor, orderId, seller } as Parameters<typeof arrange>[1]);
  const desk = await deskOf(surveyor);
  expect(desk.map(({ todo }) => todo)).toEqual(['Examine the boiler', 'Finish your listing']);
});

describe('a surveyor', () => {
  test('is asked for particulars, then for payouts, then to renew insurance', async () => {
    const surveyor = await site.givenPerson('Ida Rowan', 'surveyor');
    expect(await todosOf(surveyor)).toEqual(['Say where, what and for how much you survey']);
    const soon = addHours(site.clock.now(), 24 * 10).slice(0, 10);
    await site
      .as(surveyor)
      .put('/api/my/surveyor-terms')
      .send(surveyorTerms({ insuredUntilOn: soon }))
      .expect(200);
    expect(await todosOf(surveyor)).toEqual(['Renew your insurance', 'Set up where your fees are paid']);
  });
});

describe('the office', () => {
  test('sees refunds that are stuck and fees that wait for an account', async () => {
    const office = await site.givenPerson('Idris Fenn', 'office');
    const stuck = await givenPaidOrder(site);
    await act(site, stuck.surveyor, stuck.orderId, 'decline', { reason: 'Away that month' }).expect(200);
    const owed = await givenPaidOrder(site, { hasPayouts: false });
    await arrange(site, owed);
    await act(site, owed.surveyor, owed.orderId, 'begin').expect(200);
    await file(site, owed.surveyor, await givenRecorded(site, owed)).expect(200);
    await act(site, owed.buyer, owed.orderId, 'accept-report').expect(200);
    site.clock.pass(15 * minutesMs);
    const ids = (await deskOf(office)).map(({ id }) => id);
    expect(ids).toEqual(expect.arrayContaining([`stuck-${stuck.orderId}`, `owed-${owed.orderId}`]));
    const why = (await deskOf(owed.surveyor)).find(({ id }) => id === 'payouts')?.why;
    expect(why).toContain('A fee you have earned');
    await site.drain();
    expect((await deskOf(office)).map(({ id }) => id)).not.toContain(`stuck-${stuck.orderId}`);
  });

  test('is asked for a second factor before it opens', async () => {
    const member = await site.givenPerson('Nan Orme');
    const office = await site.givenPerson('Idris Fenn', 'office');
    await site
      .as(office)
      .post(`/api/office/members/${member.id}/roles`)
      .send({ role: 'office', change: 'grant', reason: 'Joins the office' })
      .expect(200);
    expect(await todosOf(member)).toEqual(['Set up a second factor']);
  });
});
