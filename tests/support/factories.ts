import { randomUUID } from 'node:crypto';
import sharp from 'sharp';
import supertest from 'supertest';
import * as listingService from '#api/features/listings/service.ts';
import * as photoService from '#api/features/photos/service.ts';
import { searchTowns } from '#api/features/places/service.ts';
import type { Actor } from '#api/ctx.ts';
import { listingDraft } from '#shared/listings/draft.ts';
import type { ListingDraft } from '#shared/listings/draft.ts';
import type { OwnListing } from '#shared/listings/contract.ts';
import type { UploadMetadata } from '#shared/listings/pictures.ts';
import type { Site, TestPerson } from './site.ts';

/** A town of the gazetteer; its id is looked up, for the file may be made anew. */
export const hebdenBridge = searchTowns('Hebden Bridge')[0]!.id;

/** A draft that lacks nothing but photographs. Parts given replace whole parts. */
export const completeDraft = (overrides: Partial<ListingDraft> = {}): ListingDraft =>
  listingDraft.parse({
    title: 'Nine-tube vertical in copper',
    description: 'Built by a club member for a small winch, steamed most summers and dry stored since.',
    facts: {
      type: 'vertical-multi-tube',
      material: 'copper',
      construction: 'silver-brazed',
      builder: 'A club member',
      builtYear: 1998,
      builtYearSureness: 'known',
      dimensions: { barrelOutsideDiameterMm: 101.6, barrelLengthMm: 203.2, barrelThicknessMm: 2.03 },
      workingPressurePa: 551_580.6,
      pressureEvidence: 'stamped-plate',
      waterCapacityL: 0.9,
      fittings: ['safety-valve', 'pressure-gauge', 'water-gauge'],
      firing: 'gas',
      papers: [],
    },
    history: [{ id: randomUUID(), when: '1998', text: 'Built in the club workshop.' }],
    declaration: {
      ownsIt: true,
      isTruthful: true,
      knownDefects: 'none known',
      knownRepairs: 'none known',
      lagging: 'none',
    },
    townId: hebdenBridge,
    address: { line1: '3 Cinder Lane', line2: 'The Old Pattern Shop', postcode: 'HX7 0ZZ' },
    askingMinor: 48_000,
    ...overrides,
  });

/** A plain picture, each shade a different file. */
export const tinyPicture = (shade = 120): Promise<Buffer<ArrayBuffer>> =>
  sharp({ create: { width: 640, height: 480, channels: 3, background: { r: shade, g: 90, b: 60 } } })
    .jpeg()
    .toBuffer();

/** A listed boiler, complete, with three pictures of its own. */
export async function givenListing(
  site: Site,
  seller: Actor,
  overrides: Partial<ListingDraft> = {},
): Promise<OwnListing> {
  const ctx = site.ctxAs(seller);
  const { id, version } = await listingService.createListing(ctx);
  await listingService.saveListing(ctx, id, { version, draft: completeDraft(overrides) });
  for (const [index, view] of ['whole', 'fittings', 'mark'].entries()) {
    await photoService.addPhotoFromBuffer(ctx, {
      ownerId: seller.id,
      listingId: id,
      view,
      alt: `The boiler, view ${String(index + 1)}`,
      filename: `${view}.jpg`,
      buffer: await tinyPicture(100 + index * 20),
    });
  }
  return listingService.moveListing(ctx, id, { event: 'publish', reason: '' });
}

export const tusMetadata = (fields: Record<string, string>): string =>
  Object.entries(fields)
    .map(([key, value]) => `${key} ${Buffer.from(value).toString('base64')}`)
    .join(',');

interface Sent {
  purpose?: UploadMetadata['purpose'];
  recordId: string;
  view?: string;
  alt?: string;
  filename?: string;
  content: Buffer;
}

/** Starts an upload by the tus protocol, sending nothing yet. */
export function startUpload(
  site: Site,
  person: TestPerson | undefined,
  { content, purpose = 'listing-photo', ...fields }: Sent,
) {
  return site
    .as(person)
    .post('/api/files')
    .set('Tus-Resumable', '1.0.0')
    .set('Upload-Length', String(content.length))
    .set('Upload-Metadata', tusMetadata({ purpose, ...fields }));
}

/** Sends a part of a started upload from where it stands. */
export function sendPart(site: Site, person: TestPerson, location: string, offset: number, part: Buffer) {
  return supertest(site.url)
    .patch(location)
    .set('Origin', site.url)
    .set('Cookie', person.cookie)
    .set('Tus-Resumable', '1.0.0')
    .set('Upload-Offset', String(offset))
    .set('Content-Type', 'application/offset+octet-stream')
    .send(part);
}

/** Uploads a file as a browser would; answers with the last answer of the server and the file's id. */
export async function uploadPhoto(site: Site, person: TestPerson, sent: Sent) {
  const started = await startUpload(site, person, sent).expect(201);
  const location = started.headers['location'] ?? '';
  const response = await sendPart(site, person, location, 0, sent.content);
  return { id: location.split('/').at(-1) ?? '', location, response };
}
