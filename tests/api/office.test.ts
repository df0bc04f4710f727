import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { z } from 'zod';
import type {
  getOfficeMoney,
  listAudit,
  listLedger,
  listMembers,
  listOfficeOrders,
} from '#shared/office/contract.ts';
import { act, givenPaidOrder } from '#tests/support/orders.ts';
import type { Person, Trade } from '#tests/support/orders.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

type Answer<E extends { response: z.ZodType }> = z.output<E['response']>;

let site: Site;
let office: Person;
let trade: Trade;
beforeAll(async () => {
  site = await givenSite();
  office = await site.givenPerson('Idris Fenn', 'office');
  trade = await givenPaidOrder(site);
  await act(site, trade.surveyor, trade.orderId, 'accept').expect(200);
});
afterAll(() => site.close());

const read = async <T>(path: string): Promise<T> => (await site.as(office).get(path).expect(200)).body as T;

test('the office is closed to everybody else', async () => {
  const paths = ['orders', 'money', 'ledger', 'audit', 'members'].map((room) => `/api/office/${room}`);
  for (const [person, status] of [
    [trade.surveyor, 403],
    [trade.buyer, 403],
    [undefined, 401],
  ] as const) {
    const answers = await Promise.all(paths.map(async (path) => site.as(person).get(path)));
    expect(answers.map((answer) => answer.status)).toEqual(paths.map(() => status));
  }
});

test('orders are shown with people and with what is held', async () => {
  const { items } = await read<Answer<typeof listOfficeOrders>>('/api/office/orders?status=arranging');
  expect(items).toMatchObject([
    {
      id: trade.orderId,
      buyer: trade.buyer.name,
      seller: trade.seller.name,
      surveyor: trade.surveyor.name,
      held: trade.quotation.total,
    },
  ]);
  const none = await read<Answer<typeof listOfficeOrders>>('/api/office/orders?status=settled');
  expect(none.items).toEqual([]);
});

test('balances add up to nothing, in words, and agree with the processor', async () => {
  const money = await read<Answer<typeof getOfficeMoney>>('/api/office/money');
  expect(money.balances.reduce((sum, { balance }) => sum + balance.minor, 0)).toBe(0);
  expect(money.balances.map(({ label }) => label)).toContain('With the card processor');
  expect(money).toMatchObject({
    held: trade.quotation.total,
    processorByLedger: trade.quotation.total,
    processorByItself: trade.quotation.total,
    agrees: true,
  });
});

test('a processor that does not answer is shown as such, not as a difference', async () => {
  const { deps } = site;
  const real = deps.payments;
  const silent = { ...real, getBalance: () => Promise.reject(new Error('no answer')) };
  (deps as { payments: typeof real }).payments = silent;
  const money = await read<Answer<typeof getOfficeMoney>>('/api/office/money');
  (deps as { payments: typeof real }).payments = real;
  expect(money).toMatchObject({ processorByItself: null, agrees: null });
});

test('the ledger is read page by page, newest first, and its end is an end', async () => {
  const { items, nextCursor } = await read<Answer<typeof listLedger>>('/api/office/ledger?limit=1');
  expect(items).toHaveLength(1);
  expect(nextCursor).toBeNull();
  await site.as(office).get('/api/office/ledger?cursor=nonsense').expect(400);
});

describe('the audit', () => {
  test('tells everything that moved, newest first, each thing once, page by page', async () => {
    const all: Answer<typeof listAudit>['items'] = [];
    for (let cursor: string | null = ''; cursor !== null;) {
      const place = cursor === '' ? '' : `&cursor=${encodeURIComponent(cursor)}`;
      const found: Answer<typeof listAudit> = await read(`/api/office/audit?limit=3${place}`);
      all.push(...found.items);
      cursor = found.nextCursor;
    }
    expect(new Set(all.map(({ id }) => id)).size).toBe(all.length);
    const times = all.map(({ at }) => at);
    expect(times).toEqual(times.toSorted().toReversed());
    const told = all.map(({ who, what }) => `${who}: ${what}`);
    expect(told).toContain(`${trade.surveyor.name}: Accepted by the surveyor`);
    expect(told).toContain(`${trade.buyer.name}: Survey commissioned`);
    expect(told).toContain(`${trade.seller.name}: Listed`);
    expect(told).toContain('Tubeplate: Money: held');
    expect(told).toContain('Tubeplate: Granted the role surveyor');
  });

  test('refuses a place that is none of ours', async () => {
    const answer = await site.as(office).get('/api/office/audit?cursor=bm90aGluZw');
    expect(answer.status).toBe(400);
  });
});

describe('members', () => {
  const members = async (text: string) =>
    (await read<Answer<typeof listMembers>>(`/api/office/members?q=${encodeURIComponent(text)}`)).items;

  test('a role is granted and withdrawn, with its reason in the audit, and counts at once', async () => {
    const member = await site.givenPerson('Walter Pike');
    const change = (body: object) =>
      site.as(office).post(`/api/office/members/${member.id}/roles`).send(body);
    const granted = { role: 'surveyor', change: 'grant', reason: 'Papers seen on 3 May' };
    await change(granted).expect(200);
    await change(granted).expect(409);
    expect(await members(member.email)).toMatchObject([{ name: 'Walter Pike', roles: ['surveyor'] }]);
    await site.as(member).get('/api/my/surveyor-terms').expect(200);
    await change({ role: 'surveyor', change: 'withdraw', reason: 'Asked for it himself' }).expect(200);
    await site.as(member).get('/api/my/surveyor-terms').expect(403);
    const { items } = await read<Answer<typeof listAudit>>('/api/office/audit?limit=2');
    expect(items).toMatchObject([
      { who: office.name, what: 'Withdrew the role surveyor', subject: 'Walter Pike' },
      { who: office.name, what: 'Granted the role surveyor', reason: 'Papers seen on 3 May' },
    ]);
  });

  test('nobody locks themselves out of the office', async () => {
    const { body } = await site
      .as(office)
      .post(`/api/office/members/${office.id}/roles`)
      .send({ role: 'office', change: 'withdraw', reason: 'A slip of the hand' })
      .expect(422);
    expect(body).toMatchObject({ errors: [{ pointer: '#/change' }] });
  });

  test('nobody else changes a role', async () => {
    const answer = await site
      .as(trade.buyer)
      .post(`/api/office/members/${trade.buyer.id}/roles`)
      .send({ role: 'office', change: 'grant', reason: 'I should like to' });
    expect(answer.status).toBe(403);
  });
});

test('a listing is taken down and put back, and only by the office', async () => {
  const path = `/api/office/listings/${trade.listing.id}/moves`;
  await site.as(trade.seller).post(path).send({ event: 'takeDown', reason: 'Not mine to do' }).expect(403);
  const down = await site
    .as(office)
    .post(path)
    .send({ event: 'takeDown', reason: 'Pictures of another boiler' });
  expect(down.body).toEqual({ status: 'taken-down' });
  await site.as().get(`/api/listings/${trade.listing.slug}`).expect(404);
  const { items } = await read<Answer<typeof listAudit>>('/api/office/audit?limit=1');
  expect(items).toMatchObject([{ who: office.name, reason: 'Pictures of another boiler' }]);
  const back = await site.as(office).post(path).send({ event: 'restore', reason: 'They have been changed' });
  expect(back.body).toEqual({ status: 'published' });
});
