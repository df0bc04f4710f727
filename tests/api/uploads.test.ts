import { createHash, randomUUID } from 'node:crypto';
import { readdir, stat } from 'node:fs/promises';
import { deflateSync } from 'node:zlib';
import sharp from 'sharp';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { OwnListing } from '#shared/listings/contract.ts';
import { uploadLimits } from '#shared/listings/pictures.ts';
import type { ProblemDetails } from '#shared/problem.ts';
import { sendPart, startUpload, tinyPicture, tusMetadata, uploadPhoto } from '#tests/support/factories.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';
import { statusesOf } from '#tests/support/statuses.ts';

let site: Site;
let seller: Awaited<ReturnType<Site['givenPerson']>>;
let stranger: typeof seller;
let draft: OwnListing;
beforeAll(async () => {
  site = await givenSite();
  seller = await site.givenPerson('Harriet Vane');
  stranger = await site.givenPerson('Nobody Special');
  draft = (await site.as(seller).post('/api/listings').expect(201)).body as OwnListing;
});
afterAll(() => site.close());

const own = async (): Promise<OwnListing> =>
  (await site.as(seller).get(`/api/my/listings/${draft.id}`).expect(200)).body as OwnListing;
const sha256 = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');
const noise = (width: number, height: number): Promise<Buffer> =>
  sharp({
    create: {
      width,
      height,
      channels: 3,
      background: '#888',
      noise: { type: 'gaussian', mean: 120, sigma: 40 },
    },
  })
    .jpeg({ quality: 90 })
    .toBuffer();
const head = (location: string, person = seller) =>
  supertest(site.url).head(location).set('Cookie', person.cookie).set('Tus-Resumable', '1.0.0');

/** A PNG of one colour that claims to be as large as we like, in a few kilobytes. */
function hugePng(side: number): Buffer {
  const crcTable = Array.from({ length: 256 }, (_, n) => {
    let c = n;
    for (let k = 0; k < 8; k += 1) c = c & 1 ? 0xed_b8_83_20 ^ (c >>> 1) : c >>> 1;
    return c >>> 0;
  });
  const crc = (bytes: Buffer) =>
    (bytes.reduce((sum, byte) => crcTable[(sum ^ byte) & 0xff]! ^ (sum >>> 8), 0xff_ff_ff_ff) ^
      0xff_ff_ff_ff) >>>
    0;
  const chunk = (name: string, data: Buffer) => {
    const body = Buffer.concat([Buffer.from(name), data]);
    const ends = Buffer.alloc(8);
    ends.writeUInt32BE(data.length, 0);
    ends.writeUInt32BE(crc(body), 4);
    return Buffer.concat([ends.subarray(0, 4), body, ends.subarray(4)]);
  };
  const header = Buffer.alloc(13);
  header.writeUInt32BE(side, 0);
  header.writeUInt32BE(side, 4);
  header.set([1, 0, 0, 0, 0], 8);
  return Buffer.concat([
    Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]),
    chunk('IHDR', header),
    chunk('IDAT', deflateSync(Buffer.alloc(1_000))),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

describe('resuming', () => {
  test('a picture cut off half way goes on from there and arrives byte for byte', async () => {
    const content = await noise(1_300, 900);
    const half = Math.floor(content.length / 2);
    const { headers } = await startUpload(site, seller, {
      recordId: draft.id,
      alt: 'Cut and resumed',
      content,
    }).expect(201);
    const location = headers['location'] ?? '';
    expect(location).toMatch(/^\/api\/files\/[0-9a-f-]{36}$/);
    await sendPart(site, seller, location, 0, content.subarray(0, half)).expect(204);
    const stood = await head(location).expect(200);
    expect(stood.headers['upload-offset']).toBe(String(half));
    await sendPart(site, seller, location, 0, content.subarray(0, half)).expect(409);
    await sendPart(site, seller, location, half, content.subarray(half)).expect(204);

    const photo = (await own()).photos.find(({ id }) => location.endsWith(id));
    expect(photo).toMatchObject({
      alt: 'Cut and resumed',
      view: 'whole',
      width: 1_300,
      height: 900,
      widths: [480, 960, 1_300],
      sha256: sha256(content),
    });
    expect(sha256(await site.deps.files.read(`originals/${photo!.id}`))).toBe(photo!.sha256);
    expect(await readdir(site.deps.uploadsDir)).toEqual([]);
  });

  test('one who missed the last answer asks again and learns that all is well', async () => {
    const content = await tinyPicture(33);
    const { location, id } = await uploadPhoto(site, seller, { recordId: draft.id, content });
    const asked = await head(location).expect(200);
    expect(asked.headers).toMatchObject({
      'upload-offset': String(content.length),
      'upload-length': String(content.length),
    });
    expect((await own()).photos.filter((photo) => photo.id === id)).toHaveLength(1);
    await head(location, stranger).expect(404);
  });

  test('many at once each keep a place of their own', async () => {
    const before = (await own()).photos.length;
    const pictures = await Promise.all([41, 42, 43, 44].map((shade) => tinyPicture(shade)));
    const sent = await Promise.all(
      pictures.map((content) => uploadPhoto(site, seller, { recordId: draft.id, content })),
    );
    expect(sent.map(({ response }) => response.status)).toEqual([204, 204, 204, 204]);
    expect((await own()).photos).toHaveLength(before + 4);
    const positions = await site.deps.database.raw.query(
      'select count(distinct position)::int as n from photos where listing_id = $1',
      [draft.id],
    );
    expect(positions.rows[0]?.['n']).toBe(before + 4);
  });
});

describe('who may send', () => {
  test('nobody who is not signed in, and nobody to a stranger’s listing', async () => {
    const content = await tinyPicture();
    expect(
      await statusesOf(
        startUpload(site, undefined, { recordId: draft.id, content }),
        startUpload(site, stranger, { recordId: draft.id, content }),
        startUpload(site, seller, { recordId: randomUUID(), content }),
        startUpload(site, seller, { purpose: 'survey-photo', recordId: randomUUID(), content }),
      ),
    ).toEqual([401, 404, 404, 404]);
  });

  test('a stranger can neither look at, add to nor throw away somebody’s upload', async () => {
    const content = await tinyPicture();
    const { headers } = await startUpload(site, seller, { recordId: draft.id, content }).expect(201);
    const location = headers['location'] ?? '';
    const remove = (person: typeof seller) => site.as(person).delete(location).set('Tus-Resumable', '1.0.0');
    expect(
      await statusesOf(
        head(location, stranger),
        sendPart(site, stranger, location, 0, content),
        remove(stranger),
        remove(seller),
        head(location),
      ),
    ).toEqual([404, 404, 404, 204, 404]);
  });

  test('a raw upload is never handed out, to its owner either', async () => {
    const content = await tinyPicture();
    const { headers } = await startUpload(site, seller, { recordId: draft.id, content }).expect(201);
    await sendPart(site, seller, headers['location'] ?? '', 0, content.subarray(0, 200)).expect(204);
    const location = headers['location'] ?? '';
    const { get } = site.as(seller);
    expect(await statusesOf(get(location), get(`${location}.json`), get('/api/files'))).toEqual([
      404, 404, 404,
    ]);
  });

  test('another site’s page cannot send for a person', async () => {
    const content = await tinyPicture();
    const elsewhere = 'https://elsewhere.example';
    const { headers } = await startUpload(site, seller, { recordId: draft.id, content }).expect(201);
    expect(
      await statusesOf(
        startUpload(site, seller, { recordId: draft.id, content }).set('Origin', elsewhere),
        sendPart(site, seller, headers['location'] ?? '', 0, content).set('Origin', elsewhere),
      ),
    ).toEqual([403, 403]);
  });

  test('an owner claimed in the metadata is not believed', async () => {
    const content = await tinyPicture();
    const { headers } = await site
      .as(seller)
      .post('/api/files')
      .set('Tus-Resumable', '1.0.0')
      .set('Upload-Length', String(content.length))
      .set(
        'Upload-Metadata',
        tusMetadata({ purpose: 'listing-photo', recordId: draft.id, ownerId: stranger.id }),
      )
      .expect(201);
    const location = headers['location'] ?? '';
    expect(await statusesOf(head(location, stranger), head(location))).toEqual([404, 200]);
  });
});

describe('files that cannot be used are refused in a sentence, and the rest stays', () => {
  const refusalOf = async (
    content: Buffer,
    purpose: 'listing-photo' | 'listing-document' = 'listing-photo',
  ) => {
    const before = await own();
    const { response, location } = await uploadPhoto(site, seller, { purpose, recordId: draft.id, content });
    expect(response.headers['content-type']).toContain('application/problem+json');
    const after = await own();
    expect(after.photos).toEqual(before.photos);
    expect(after.documents).toEqual(before.documents);
    await head(location).expect(404);
    return response.body as ProblemDetails;
  };

  test('a text file called .jpg', async () => {
    const problem = await refusalOf(Buffer.from('Dear sir, enclosed please find a picture.'));
    expect(problem).toMatchObject({
      status: 415,
      detail: expect.stringMatching(/is not a picture, whatever its name/),
    });
  });

  test('a drawing in SVG, which could carry more than a picture', async () => {
    const svg = Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"/>');
    expect(await refusalOf(svg)).toMatchObject({ status: 415 });
  });

  test('a picture cut short', async () => {
    const whole = await noise(800, 600);
    const problem = await refusalOf(whole.subarray(0, Math.floor(whole.length * 0.6)));
    expect(problem).toMatchObject({ status: 415, detail: expect.stringMatching(/damaged or was cut off/) });
  });

  test('a small file that would unfold into a thousand million pixels', async () => {
    const problem = await refusalOf(hugePng(32_000));
    expect(problem).toMatchObject({
      status: 413,
      detail: expect.stringMatching(/claims 1024 million pixels; the most is 120 million/),
    });
  });

  test('a moving picture', async () => {
    const frames = await sharp(await Promise.all([10, 200].map((shade) => tinyPicture(shade))), {
      join: { animated: true },
    })
      .webp()
      .toBuffer();
    expect(await refusalOf(frames)).toMatchObject({
      status: 415,
      detail: expect.stringMatching(/several pictures or moves/),
    });
  });

  test('an HEIC, with how to send it instead', async () => {
    const heic = Buffer.concat([
      Buffer.from([0, 0, 0, 24]),
      Buffer.from('ftypheic\0\0\0\0mif1heic'),
      Buffer.alloc(64),
    ]);
    expect(await refusalOf(heic)).toMatchObject({
      status: 415,
      detail: expect.stringMatching(/HEIC.*Most compatible.*JPEG/),
    });
  });

  test('a PDF that lost its end', async () => {
    const cut = Buffer.from('%PDF-1.7\n1 0 obj\n<< >>\nendobj\n');
    expect(await refusalOf(cut, 'listing-document')).toMatchObject({
      status: 415,
      detail: expect.stringMatching(/its end is missing/),
    });
  });

  test('60 MB, before a byte of it is sent', async () => {
    const refused = await site
      .as(seller)
      .post('/api/files')
      .set('Tus-Resumable', '1.0.0')
      .set('Upload-Length', String(60 * 1024 * 1024))
      .set('Upload-Metadata', tusMetadata({ purpose: 'listing-photo', recordId: draft.id }))
      .expect(413);
    expect((refused.body as ProblemDetails).detail).toBe(
      'That picture is 60 MB; the most is 40 MB. Save it smaller and send it again.',
    );
    expect(uploadLimits.photoBytes).toBe(40 * 1024 * 1024);
  });

  test.each([
    ['an empty file', { 'Upload-Length': '0' }, 415],
    ['no length', {}, 400],
    ['a length that is none', { 'Upload-Length': 'long' }, 400],
    ['a length to be told later', { 'Upload-Defer-Length': '1' }, 400],
  ])('%s', async (_name, headers, status) => {
    const request = site
      .as(seller)
      .post('/api/files')
      .set('Tus-Resumable', '1.0.0')
      .set('Upload-Metadata', tusMetadata({ purpose: 'listing-photo', recordId: draft.id }));
    for (const [name, value] of Object.entries(headers)) void request.set(name, value);
    expect((await request).status).toBe(status);
  });

  test('more bytes than were announced', async () => {
    const content = await tinyPicture();
    const { headers } = await startUpload(site, seller, {
      recordId: draft.id,
      content: content.subarray(0, 100),
    }).expect(201);
    const location = headers['location'] ?? '';
    const { status } = await sendPart(site, seller, location, 0, content);
    expect(status).toBeGreaterThanOrEqual(400);
    const { size } = await stat(`${site.deps.uploadsDir}/${location.split('/').at(-1) ?? ''}`);
    expect(size).toBeLessThanOrEqual(100);
  });
});
