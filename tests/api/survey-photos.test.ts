import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { surveyOrders } from '#api/db/schema/index.ts';
import type { Photo } from '#shared/listings/pictures.ts';
import { photoPath } from '#shared/listings/pictures.ts';
import type { ProblemDetails } from '#shared/problem.ts';
import { file, givenExamination, givenRecorded, readSurvey } from '#tests/support/examinations.ts';
import { startUpload, tinyPicture, uploadPhoto } from '#tests/support/factories.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';
import { statusesOf } from '#tests/support/statuses.ts';

let site: Site;
beforeAll(async () => {
  site = await givenSite();
});
afterAll(() => site.close());

test('only the surveyor of an examination under way sends photographs of it', async () => {
  const { orderId, surveyor, buyer, seller } = await givenExamination(site);
  const other = await site.givenPerson('Another Surveyor', 'surveyor');
  const sent = {
    purpose: 'survey-photo',
    recordId: orderId,
    view: 'shell.plates',
    content: await tinyPicture(),
  } as const;
  const asked = [buyer, seller, other, surveyor].map((person) => startUpload(site, person, sent));
  expect(await statusesOf(...asked)).toEqual([404, 404, 404, 201]);

  await site.deps.database.db
    .update(surveyOrders)
    .set({ status: 'arranged' })
    .where(eq(surveyOrders.id, orderId));
  const early = await startUpload(site, surveyor, sent);
  expect(early.status).toBe(409);
  expect((early.body as ProblemDetails).detail).toMatch(/not under way/);
});

test('they are the surveyor’s alone until the report is filed, then everyone’s and nobody’s to change', async () => {
  const examination = await givenExamination(site);
  const { surveyor, buyer, seller, orderId } = examination;
  const survey = await givenRecorded(site, examination);
  const [photo] = survey.photos as [Photo];
  const path = photoPath(photo.id, 480, 'jpeg');
  expect(
    await statusesOf(...[undefined, buyer, seller, surveyor].map((person) => site.as(person).get(path))),
  ).toEqual([404, 404, 404, 200]);

  const spare = await uploadPhoto(site, surveyor, {
    purpose: 'survey-photo',
    recordId: orderId,
    view: 'shell.plates',
    content: await tinyPicture(3),
  });
  const described = await site
    .as(surveyor)
    .patch(`/api/photos/${spare.id}`)
    .send({ alt: 'Barrel, left side' });
  expect(described.body).toMatchObject({ alt: 'Barrel, left side', view: 'shell.plates' });
  expect(await statusesOf(site.as(surveyor).delete(`/api/photos/${spare.id}`))).toEqual([200]);
  expect((await readSurvey(site, examination)).photos.map(({ id }) => id)).toEqual([photo.id]);

  await file(site, surveyor, survey).expect(200);
  expect(
    await statusesOf(
      site.as().get(path),
      site.as(surveyor).patch(`/api/photos/${photo.id}`).send({ alt: 'Rewritten' }),
      site.as(surveyor).delete(`/api/photos/${photo.id}`),
      site.as(seller).delete(`/api/photos/${photo.id}`),
    ),
  ).toEqual([200, 409, 409, 404]);
});

test('the buyer and the surveyor still see the seller’s pictures when the boiler is withdrawn', async () => {
  const { listing, buyer, surveyor, seller } = await givenExamination(site);
  await site.as(seller).post(`/api/my/listings/${listing.id}/moves`).send({ event: 'withdraw' }).expect(200);
  const path = photoPath(listing.photos[0]!.id, 480, 'avif');
  const people = [undefined, await site.givenPerson('Nobody Special'), buyer, surveyor, seller];
  expect(await statusesOf(...people.map((person) => site.as(person).get(path)))).toEqual([
    404, 404, 200, 200, 200,
  ]);
  expect(
    await statusesOf(...people.map((person) => site.as(person).get(`/api/listings/${listing.slug}`))),
  ).toEqual([404, 404, 200, 200, 200]);
});
