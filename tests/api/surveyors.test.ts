import { afterAll, beforeAll, expect, test } from 'vitest';
import { bankDesk, givenSurveyor, noticesSent, setUpPayouts, surveyorTerms } from '#tests/support/orders.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

let site: Site;
beforeAll(async () => {
  site = await givenSite();
});
afterAll(() => site.close());

const path = '/api/my/surveyor-terms';

test('a surveyor gives particulars, is numbered in three digits, and changes them', async () => {
  const surveyor = await site.givenPerson('Ida Rowan', 'surveyor');
  const empty = await site.as(surveyor).get(path).expect(200);
  expect(empty.body).toEqual({ terms: null, town: null, number: null, payoutsReady: false });
  await site.as(surveyor).post('/api/my/payout-set-up').expect(409);

  const first = await site.as(surveyor).put(path).send(surveyorTerms()).expect(200);
  const { number } = first.body as { number: string };
  expect(number).toMatch(/^\d{3}$/);
  const changed = surveyorTerms({ rangeKm: 80, isTakingJobs: false });
  await site.as(surveyor).put(path).send(changed).expect(200);
  const now = await site.as(surveyor).get(path).expect(200);
  expect(now.body).toMatchObject({ terms: changed, number, town: { name: 'Hebden Bridge' } });
});

test('only a surveyor has particulars', async () => {
  const member = await site.givenPerson('Edna Marsh');
  const answers = [
    await site.as(member).get(path),
    await site.as(member).put(path).send(surveyorTerms()),
    await site.as(member).post('/api/my/payout-set-up'),
    await site.as().get(path),
  ];
  expect(answers.map(({ status }) => status)).toEqual([403, 403, 403, 401]);
});

test.each([
  ['a town that is not in the gazetteer', { townId: 99_999_999 }, '#/townId'],
  ['insurance that has run out', { insuredUntilOn: '2020-01-01' }, '#/insuredUntilOn'],
  ['no type at all', { types: [] }, '#/types'],
  ['a fee above the band', { fees: { ...surveyorTerms().fees, full: 99_999 } }, '#/fees/full'],
  ['a range of nothing', { rangeKm: 0 }, '#/rangeKm'],
])('%s is refused beside the field', async (_name, overrides, pointer) => {
  const surveyor = await site.givenPerson('Ida Rowan', 'surveyor');
  const { body } = await site
    .as(surveyor)
    .put(path)
    .send({ ...surveyorTerms(), ...overrides })
    .expect(422);
  expect(body).toMatchObject({ errors: [{ pointer }] });
});

test('who takes no jobs may let insurance run out', async () => {
  const surveyor = await site.givenPerson('Ida Rowan', 'surveyor');
  const terms = surveyorTerms({ insuredUntilOn: '2020-01-01', isTakingJobs: false });
  const { body } = await site.as(surveyor).put(path).send(terms).expect(200);
  expect(body).toMatchObject({ terms });
});

test('payouts are ready once the payment service’s page is finished, and one account is opened however often it is begun', async () => {
  const surveyor = await givenSurveyor(site, { hasPayouts: false });
  const begin = async () =>
    ((await site.as(surveyor).post('/api/my/payout-set-up').expect(200)).body as { url: string }).url;
  const urls = await Promise.all([begin(), begin(), begin()]);
  expect(new Set(urls).size).toBe(1);
  await bankDesk(site, 'mode/hold');
  await setUpPayouts(site, surveyor);
  expect((await site.as(surveyor).get(path)).body).toMatchObject({ payoutsReady: false });
  await bankDesk(site, 'mode/send');
  await bankDesk(site, 'release');
  await noticesSent(site);
  expect((await site.as(surveyor).get(path)).body).toMatchObject({ payoutsReady: true });
});
