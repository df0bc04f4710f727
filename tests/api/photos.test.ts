import sharp from 'sharp';
import type { Response } from 'supertest';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Listing, OwnListing } from '#shared/listings/contract.ts';
import { photoFormats, photoPath } from '#shared/listings/pictures.ts';
import type { ProblemDetails } from '#shared/problem.ts';
import { givenListing, tinyPicture, uploadPhoto } from '#tests/support/factories.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site, TestPerson } from '#tests/support/site.ts';
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
const own = async (id: string): Promise<OwnListing> =>
  (await site.as(seller).get(`/api/my/listings/${id}`).expect(200)).body as OwnListing;
const fetchBytes = (path: string, person?: TestPerson): Promise<Response> =>
  site
    .as(person)
    .get(path)
    .buffer(true)
    .parse((response, done) => {
      const parts: Buffer[] = [];
      response.on('data', (part: Buffer) => parts.push(part));
      response.on('end', () => {
        done(null, Buffer.concat(parts));
      });
    });

/** Taken with the camera on its side at a place that could be found again: red on the left as stored, so red on top. */
async function telltalePicture(width = 2_400, height = 1_600): Promise<Buffer> {
  const half = await sharp({ create: { width: width / 2, height, channels: 3, background: '#c01010' } })
    .png()
    .toBuffer();
  return sharp({ create: { width, height, channels: 3, background: '#1010c0' } })
    .composite([{ input: half, left: 0, top: 0 }])
    .withExif({
      IFD0: { Make: 'Invented Camera Works', Copyright: 'Harriet Vane' },
      IFD3: {
        GPSLatitudeRef: 'N',
        GPSLatitude: '53/1 44/1 27/1',
        GPSLongitudeRef: 'W',
        GPSLongitude: '2/1 0/1 48/1',
      },
    })
    .withMetadata({ orientation: 6 })
    .jpeg()
    .toBuffer();
}

/** The colours of a strip across a picture; stats alone would look at the whole of it. */
const stripAt = async (bytes: Buffer, top: number) => {
  const { width } = await sharp(bytes).metadata();
  return sharp(await sharp(bytes).extract({ left: 0, top, width, height: 20 }).png().toBuffer()).stats();
};

describe('what the camera wrote', () => {
  test('is in no variant: neither place nor maker; and each stands upright', async () => {
    const content = await telltalePicture();
    const sent = await sharp(content).metadata();
    expect(sent.exif?.toString('latin1')).toContain('Invented Camera Works');
    expect(sent.orientation).toBe(6);

    const { id: listingId } = await newDraft();
    const { id } = await uploadPhoto(site, seller, { recordId: listingId, alt: 'On its side', content });
    const [photo] = (await own(listingId)).photos;
    expect(photo).toMatchObject({ width: 1_600, height: 2_400, widths: [480, 960, 1_600] });

    for (const width of photo!.widths) {
      for (const format of photoFormats) {
        const { body, headers, status } = await fetchBytes(photoPath(id, width, format), seller);
        const bytes = body as Buffer;
        expect(status).toBe(200);
        expect(headers['content-type']).toBe(`image/${format}`);
        const found = await sharp(bytes).metadata();
        expect(found.exif).toBeUndefined();
        expect(found.xmp).toBeUndefined();
        expect(found.iptc).toBeUndefined();
        expect(found.orientation ?? 1).toBe(1);
        expect([found.width, found.height]).toEqual([width, Math.round(width * 1.5)]);
        expect(bytes.toString('latin1')).not.toMatch(/Invented|GPS|Harriet/);
        const top = await stripAt(bytes, 10);
        const bottom = await stripAt(bytes, Math.round(width * 1.5) - 40);
        expect(top.dominant.r).toBeGreaterThan(top.dominant.b);
        expect(bottom.dominant.b).toBeGreaterThan(bottom.dominant.r);
      }
    }
  });

  test('the original is behind no address, and neither is a size that was not made', async () => {
    const { id: listingId } = await newDraft();
    const { id } = await uploadPhoto(site, seller, { recordId: listingId, content: await tinyPicture() });
    for (const name of [
      'original',
      'original.jpeg',
      '1920.jpeg',
      '640.png',
      '0640.jpeg',
      '..%2F..%2Foriginals%2F' + id,
    ]) {
      await site.as(seller).get(`/media/${id}/${name}`).expect(404);
    }
    await site
      .as(seller)
      .get(`/originals/${id}`)
      .expect((response) => {
        expect(response.headers['content-type']).not.toMatch(/^image/);
      });
    await site
      .as(seller)
      .get(photoPath(id, 640, 'jpeg'))
      .expect(200);
  });

  test('a picture of a paper sent as a document loses it too', async () => {
    const { id: listingId } = await newDraft();
    const content = await telltalePicture(600, 400);
    const { id, response } = await uploadPhoto(site, seller, {
      purpose: 'listing-document',
      recordId: listingId,
      filename: 'certificate.jpg',
      content,
    });
    expect(response.status).toBe(204);
    const { body } = await fetchBytes(`/api/documents/${id}`, seller);
    expect((body as Buffer).toString('latin1')).not.toMatch(/Invented|Harriet/);
    expect(await sharp(body as Buffer).metadata()).toMatchObject({ width: 400, height: 600 });
  });
});

describe('who may look', () => {
  test('at a draft’s photograph: its owner and the office, and nothing keeps a copy', async () => {
    const { id: listingId } = await newDraft();
    const { id } = await uploadPhoto(site, seller, { recordId: listingId, content: await tinyPicture() });
    const path = photoPath(id, 480, 'avif');
    expect(await statusesOf(site.as().get(path), site.as(stranger).get(path))).toEqual([404, 404]);
    expect(await statusesOf(site.as(office).get(path))).toEqual([200]);
    const { status, headers } = await site.as(seller).get(path);
    expect([status, headers['cache-control']]).toEqual([200, 'private, no-store']);
  });

  test('at a listed boiler’s: anyone, for good; once withdrawn, no longer', async () => {
    const { id, photos } = await givenListing(site, seller);
    const path = photoPath(photos[0]!.id, 480, 'jpeg');
    const shown = await site.as().get(path);
    expect(shown.status).toBe(200);
    expect(shown.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    await site.as(seller).post(`/api/my/listings/${id}/moves`).send({ event: 'withdraw' }).expect(200);
    expect(await statusesOf(site.as().get(path), site.as(seller).get(path))).toEqual([404, 200]);
  });

  test('at documents: whoever is signed in while the boiler is listed; they are saved, not shown', async () => {
    const { id: listingId, slug } = await givenListing(site, seller);
    const pdf = Buffer.from('%PDF-1.7\n1 0 obj\n<< >>\nendobj\ntrailer\n<< >>\n%%EOF\n');
    const { id } = await uploadPhoto(site, seller, {
      purpose: 'listing-document',
      recordId: listingId,
      filename: 'Hydraulic test “1998”.pdf',
      content: pdf,
    });
    const path = `/api/documents/${id}`;
    await site.as().get(path).expect(401);
    const got = await fetchBytes(path, stranger);
    expect(got.status).toBe(200);
    expect((got.body as Buffer).equals(pdf)).toBe(true);
    expect(got.headers).toMatchObject({
      'content-type': 'application/pdf',
      'x-content-type-options': 'nosniff',
      'content-disposition': expect.stringMatching(/^attachment; filename/),
    });
    const page = (await site.as().get(`/api/listings/${slug}`).expect(200)).body as Listing;
    expect(page.documents).toMatchObject([{ id, filename: 'Hydraulic test “1998”.pdf', bytes: pdf.length }]);

    await site.as(seller).post(`/api/my/listings/${listingId}/moves`).send({ event: 'withdraw' }).expect(200);
    await site.as(stranger).get(path).expect(404);
    await site.as(stranger).delete(path).expect(404);
    await site.as(seller).delete(path).expect(200);
    await site.as(seller).get(path).expect(404);
  });
});

describe('tending photographs', () => {
  test('words are changed, the order is set, one is taken away', async () => {
    const { id, photos } = await givenListing(site, seller);
    const [first, second, third] = photos.map((photo) => photo.id);
    const changed = await site
      .as(seller)
      .patch(`/api/photos/${second!}`)
      .send({ alt: 'Gauge at 80 psi' })
      .expect(200);
    expect(changed.body).toMatchObject({ id: second, view: 'fittings', alt: 'Gauge at 80 psi' });

    const reordered = await site
      .as(seller)
      .put(`/api/my/listings/${id}/photo-order`)
      .send({ photoIds: [third, first] })
      .expect(200);
    expect((reordered.body as OwnListing).photos.map((photo) => photo.id)).toEqual([third, first, second]);
    const market = (await site.as().get('/api/listings')).body as {
      items: { id: string; cover: { id: string } }[];
    };
    expect(market.items.find((item) => item.id === id)?.cover.id).toBe(third);

    const { id: fourth } = await uploadPhoto(site, seller, {
      recordId: id,
      view: 'underside',
      alt: 'Underneath',
      content: await tinyPicture(9),
    });
    expect((await own(id)).photos.at(-1)?.id).toBe(fourth);
    await site.as(seller).delete(`/api/photos/${second!}`).expect(200);
    expect((await own(id)).photos.map((photo) => photo.id)).toEqual([third, first, fourth]);
    await site
      .as(seller)
      .get(photoPath(second!, 480, 'jpeg'))
      .expect(404);
    await site.as(seller).delete(`/api/photos/${second!}`).expect(404);
  });

  test('a stranger can tend nobody’s', async () => {
    const { id, photos } = await givenListing(site, seller);
    const photoId = photos[0]!.id;
    expect(
      await statusesOf(
        site.as(stranger).patch(`/api/photos/${photoId}`).send({ alt: 'Mine' }),
        site.as(stranger).delete(`/api/photos/${photoId}`),
        site.as(stranger).put(`/api/my/listings/${id}/photo-order`).send({ photoIds: [] }),
        site.as().delete(`/api/photos/${photoId}`),
      ),
    ).toEqual([404, 404, 404, 401]);
  });

  test('another listing’s photograph cannot be put in order', async () => {
    const one = await givenListing(site, seller);
    const two = await givenListing(site, seller);
    const refused = await site
      .as(seller)
      .put(`/api/my/listings/${one.id}/photo-order`)
      .send({ photoIds: [two.photos[0]!.id] });
    expect(refused.status).toBe(422);
    expect((refused.body as ProblemDetails).errors?.[0]?.pointer).toBe('#/photoIds');
  });
});
