import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import * as listings from '#api/features/listings/service.ts';
import type { Listing, OwnListing } from '#shared/listings/contract.ts';
import type { ProblemDetails } from '#shared/problem.ts';
import {
  completeDraft,
  givenListing,
  hebdenBridge,
  tinyPicture,
  uploadPhoto,
} from '#tests/support/factories.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';
import { statusesOf } from '#tests/support/statuses.ts';

let site: Site;
let seller: Awaited<ReturnType<Site['givenPerson']>>;
let stranger: typeof seller;
let office: typeof seller;
beforeAll(async () => {
  site = await givenSite();
  seller = await site.givenPerson('Harriet Vane');
  stranger = await site.givenPerson('Nobody Special');
  office = await site.givenPerson('Office Clerk', 'office');
});
afterAll(() => site.close());

const newDraft = async (): Promise<OwnListing> =>
  (await site.as(seller).post('/api/listings').expect(201)).body as OwnListing;
const save = (id: string, version: number, draft = completeDraft()) =>
  site.as(seller).put(`/api/my/listings/${id}`).send({ version, draft });
const move = (id: string, event: string, reason = '') =>
  site.as(seller).post(`/api/my/listings/${id}/moves`).send({ event, reason });
const problemOf = ({ body }: { body: unknown }) => body as ProblemDetails;
const pointersOf = (response: { body: unknown }) => problemOf(response).errors?.map((error) => error.pointer);
const slugOf = (response: { body: unknown }) => problemOf(response).type.split('/').at(-1);

describe('from draft to market and back', () => {
  test('a seller writes, photographs, lists, withdraws and lists again', async () => {
    const { id, slug, version } = await newDraft();
    expect(slug).toBe(id);
    const saved = (await save(id, version).expect(200)).body as OwnListing;
    expect(saved.version).toBe(version + 1);
    expect(saved.draft.address.line1).toBe('3 Cinder Lane');
    expect(saved.town?.id).toBe(hebdenBridge);

    for (const [index, view] of ['whole', 'fittings', 'mark'].entries()) {
      const content = await tinyPicture(60 + index);
      const { response } = await uploadPhoto(site, seller, {
        recordId: id,
        view,
        alt: `View ${view}`,
        content,
      });
      expect(response.status).toBe(204);
    }
    const listed = (await move(id, 'publish').expect(200)).body as OwnListing;
    expect(listed).toMatchObject({ status: 'published', events: ['withdraw'] });
    expect(listed.slug).toBe(`nine-tube-vertical-in-copper-${id.slice(0, 8)}`);

    const found = await site.as().get('/api/listings?type=vertical-multi-tube').expect(200);
    const line = (found.body as { items: { id: string }[] }).items.find((item) => item.id === id);
    expect(line).toMatchObject({
      slug: listed.slug,
      workingPressurePa: 551_580.6,
      waterCapacityL: 0.9,
      asking: { minor: 48_000, currency: 'GBP' },
      cover: { view: 'whole' },
      verdict: null,
    });

    await move(id, 'withdraw', 'Sold to a friend').expect(200);
    await site.as(stranger).get(`/api/listings/${listed.slug}`).expect(404);
    const again = (await move(id, 'relist').expect(200)).body as OwnListing;
    expect(again.slug).toBe(listed.slug);
    const page = (await site.as().get(`/api/listings/${listed.slug}`).expect(200)).body as Listing;
    expect(page.record.map(({ event, by, reason }) => [event, by, reason])).toEqual([
      ['publish', 'the seller', ''],
      ['withdraw', 'the seller', 'Sold to a friend'],
      ['relist', 'the seller', ''],
    ]);
    expect(page.seller.name).toBe('Harriet Vane');
    expect(page.reports).toEqual([]);
  });

  test('a title changed after listing leaves the address of the page as it was', async () => {
    const { id, slug, version } = await givenListing(site, seller);
    await save(id, version, completeDraft({ title: 'Quite another title' })).expect(200);
    const page = (await site.as().get(`/api/listings/${slug}`).expect(200)).body as Listing;
    expect(page.title).toBe('Quite another title');
  });

  test('who reads decides what they may do', async () => {
    const { slug } = await givenListing(site, seller);
    const viewer = async (person?: typeof seller) =>
      ((await site.as(person).get(`/api/listings/${slug}`).expect(200)).body as Listing).viewer;
    expect(await viewer()).toEqual({ isSeller: false, canCommission: true, events: [] });
    expect(await viewer(stranger)).toEqual({ isSeller: false, canCommission: true, events: [] });
    expect(await viewer(seller)).toEqual({ isSeller: true, canCommission: false, events: ['withdraw'] });
    expect(await viewer(office)).toEqual({ isSeller: false, canCommission: true, events: ['takeDown'] });
  });

  test('a draft thrown away is gone', async () => {
    const { id } = await newDraft();
    await move(id, 'discard').expect(200);
    await site.as(seller).get(`/api/my/listings/${id}`).expect(404);
    const own = await site.as(seller).get('/api/my/listings').expect(200);
    expect((own.body as { items: OwnListing[] }).items.map((item) => item.id)).not.toContain(id);
  });
});

describe('refusals', () => {
  test('an old version does not overwrite a newer one', async () => {
    const { id, version } = await newDraft();
    await save(id, version).expect(200);
    const refused = await save(id, version, completeDraft({ title: 'Written in another tab' })).expect(412);
    expect(slugOf(refused)).toBe('stale-version');
    const kept = (await site.as(seller).get(`/api/my/listings/${id}`)).body as OwnListing;
    expect(kept.draft.title).toBe('Nine-tube vertical in copper');
  });

  test('an empty draft is told everything that is missing, each with its place', async () => {
    const { id } = await newDraft();
    const refused = await move(id, 'publish').expect(422);
    expect(pointersOf(refused)).toEqual(
      expect.arrayContaining([
        '#/title',
        '#/description',
        '#/facts/workingPressurePa',
        '#/facts/dimensions/barrelLengthMm',
        '#/declaration/ownsIt',
        '#/townId',
        '#/address/line1',
        '#/askingMinor',
        '#/photos',
      ]),
    );
  });

  test('photographs: three are needed, one of the whole boiler, each described', async () => {
    const { id, version } = await newDraft();
    await save(id, version).expect(200);
    for (const alt of ['', 'The gauge'])
      await uploadPhoto(site, seller, { recordId: id, view: 'fittings', alt, content: await tinyPicture() });
    const refused = await move(id, 'publish').expect(422);
    expect(problemOf(refused).errors).toEqual([
      { pointer: '#/photos', detail: 'Add 1 more: at least 3 photographs are needed' },
      { pointer: '#/photos', detail: 'Add a view of the whole boiler' },
      {
        pointer: '#/photos',
        detail: 'One photograph has no description: say what it shows, for those who cannot see it',
      },
    ]);
  });

  test('what is listed stays complete', async () => {
    const { id, version, photos } = await givenListing(site, seller);
    const refused = await save(id, version, completeDraft({ description: 'Short' })).expect(422);
    expect(pointersOf(refused)).toEqual(['#/description']);
    await site.as(seller).delete(`/api/photos/${photos[0]!.id}`).expect(422);
    await site.as(seller).patch(`/api/photos/${photos[0]!.id}`).send({ alt: '' }).expect(422);
  });

  test('an e-mail address must be confirmed before listing', async () => {
    const { id } = await newDraft();
    const ctx = site.ctxAs({ ...seller, isEmailVerified: false });
    await expect(listings.moveListing(ctx, id, { event: 'publish', reason: '' })).rejects.toMatchObject({
      slug: 'not-permitted',
    });
  });

  test('a town that is not in the gazetteer is refused', async () => {
    const { id, version } = await newDraft();
    const refused = await save(id, version, completeDraft({ townId: 999_999_999 })).expect(422);
    expect(pointersOf(refused)).toEqual(['#/townId']);
  });

  test.each(['withdraw', 'relist'])('a draft cannot %s', async (event) => {
    const { id } = await newDraft();
    expect(slugOf(await move(id, event).expect(409))).toBe('wrong-state');
  });

  test('two moves at once: one is made', async () => {
    const { id } = await givenListing(site, seller);
    const answers = await Promise.all([move(id, 'withdraw'), move(id, 'withdraw')]);
    expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([200, 409]);
  });

  test('a stranger finds no draft, by any door', async () => {
    const { id, version } = await newDraft();
    const as = site.as(stranger);
    expect(
      await statusesOf(
        as.get(`/api/my/listings/${id}`),
        as.get(`/api/listings/${id}`),
        as.put(`/api/my/listings/${id}`).send({ version, draft: completeDraft() }),
        as.post(`/api/my/listings/${id}/moves`).send({ event: 'publish' }),
        as.put(`/api/my/listings/${id}/photo-order`).send({ photoIds: [] }),
        site.as(seller).get(`/api/listings/${id}`),
      ),
    ).toEqual([404, 404, 404, 404, 404, 404]);
    expect(await statusesOf(site.as().get(`/api/my/listings/${id}`))).toEqual([401]);
  });
});

describe('the office', () => {
  test('takes a listing down with a reason and puts it back; only the office may', async () => {
    const { id, slug } = await givenListing(site, seller);
    await expect(
      listings.moveListingByOffice(site.ctxAs(seller), id, 'takeDown', 'No'),
    ).rejects.toMatchObject({ slug: 'not-permitted' });
    await listings.moveListingByOffice(site.ctxAs(office), id, 'takeDown', 'Two people claim it');
    await site.as().get(`/api/listings/${slug}`).expect(404);
    await site.as(stranger).get(`/api/listings/${slug}`).expect(404);
    const page = (await site.as(seller).get(`/api/listings/${slug}`).expect(200)).body as Listing;
    expect(page.record.at(-1)).toMatchObject({ by: 'the office', reason: 'Two people claim it' });
    expect(page.viewer.events).toEqual([]);
    expect(slugOf(await move(id, 'relist').expect(409))).toBe('wrong-state');
    await listings.moveListingByOffice(site.ctxAs(office), id, 'restore', 'Settled between them');
    await site.as().get(`/api/listings/${slug}`).expect(200);
  });
});

test('the address is in no answer that anyone but the seller can ask for', async () => {
  const { id, slug } = await givenListing(site, seller);
  const answers = await Promise.all([
    site.as().get('/api/listings?limit=60'),
    site.as(stranger).get(`/api/listings/${slug}`),
    site.as(office).get(`/api/listings/${slug}`),
    site.as(seller).get(`/api/listings/${slug}`),
  ]);
  for (const answer of answers) {
    expect(answer.status).toBe(200);
    expect(answer.text).not.toMatch(/Cinder Lane|Pattern Shop|HX7 0ZZ|postcode|line1/);
  }
  expect(await listings.getAddress(site.ctxAs(), id)).toMatchObject({ line1: '3 Cinder Lane' });
  const briefs = await listings.listListingBriefs(site.ctxAs(), [id]);
  expect(JSON.stringify([...briefs.values()])).not.toContain('Cinder');
  expect(briefs.get(id)).toMatchObject({ slug, cover: { view: 'whole' } });
});
