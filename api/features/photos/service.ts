import { randomUUID } from 'node:crypto';
import type { Readable } from 'node:stream';
import { uploadLimits } from '#shared/listings/pictures.ts';
import type { DocumentView, Photo, UploadMetadata } from '#shared/listings/pictures.ts';
import { photoFaults } from '#shared/listings/policy.ts';
import { Problem } from '#shared/problem.ts';
import { inTransaction, requireActor } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import * as surveys from '../surveys/service.ts';
import { makeDocument, makePhoto } from './pictures.ts';
import * as repo from './repo.ts';
import type { StoredPhoto } from './repo.ts';

const originalKey = (id: string) => `originals/${id}`;
const documentKey = (id: string) => `documents/${id}`;
const variantKey = (id: string, width: number, format: string) => `variants/${id}/${String(width)}.${format}`;

const megabytes = (bytes: number): string => (bytes / 1024 / 1024).toFixed(bytes < 10_485_760 ? 1 : 0);

/** The listing, if it is this seller's and not thrown away; held while a transaction is open. @throws Problem not-found. */
async function requireOwnListing(ctx: Ctx, id: string) {
  const listing = await repo.lockListing(ctx.db, id);
  if (!listing || listing.sellerId !== requireActor(ctx).id) throw new Problem('not-found');
  return listing;
}

async function requireRoom(ctx: Ctx, { purpose, recordId }: UploadMetadata): Promise<void> {
  if (purpose === 'listing-photo') {
    const held = await listPhotosOfListing(ctx, recordId);
    if (held.length >= uploadLimits.photosPerListing) {
      const detail = `A listing holds ${String(uploadLimits.photosPerListing)} photographs. Remove one to make room.`;
      throw new Problem('wrong-state', detail);
    }
  }
  if (purpose === 'listing-document') {
    const held = await listDocumentsOfListing(ctx, recordId);
    if (held.length >= uploadLimits.documentsPerListing) {
      const detail = `A listing holds ${String(uploadLimits.documentsPerListing)} documents. Remove one to make room.`;
      throw new Problem('wrong-state', detail);
    }
  }
}

function requireSize({ purpose }: UploadMetadata, bytes: number): void {
  const isDocument = purpose === 'listing-document';
  const most = isDocument ? uploadLimits.documentBytes : uploadLimits.photoBytes;
  const what = isDocument ? 'document' : 'picture';
  if (!(bytes > 0)) throw new Problem('wrong-kind', `That ${what} is an empty file. Choose another.`);
  if (bytes > most) {
    throw new Problem(
      'too-large',
      `That ${what} is ${megabytes(bytes)} MB; the most is ${megabytes(most)} MB. Save it smaller and send it again.`,
    );
  }
}

/**
 * Decides whether a file may be sent at all, before a byte of it is read.
 * @throws Problem not-signed-in, not-found, wrong-state, wrong-kind, too-large.
 */
export async function admitUpload(ctx: Ctx, metadata: UploadMetadata, bytes: number): Promise<void> {
  requireActor(ctx);
  if (metadata.purpose === 'survey-photo') await surveys.requireOpenSurvey(ctx, metadata.recordId);
  else await requireOwnListing(ctx, metadata.recordId);
  requireSize(metadata, bytes);
  await requireRoom(ctx, metadata);
}

export interface Arrival {
  id: string;
  metadata: UploadMetadata;
  content: Buffer<ArrayBuffer>;
}

/**
 * Takes in a file that has arrived whole, as a photograph or a document of the record it was sent for.
 *
 * May be called again with the same id: what is stored already is left as it is.
 * @throws Problem as `admitUpload`, and wrong-kind, too-large for what the file turns out to be.
 */
export async function receiveUpload(ctx: Ctx, { id, metadata, content }: Arrival): Promise<void> {
  const actor = requireActor(ctx);
  if (await isReceived(ctx, id)) return;
  await admitUpload(ctx, metadata, content.length);
  const { purpose, recordId, view, alt, filename } = metadata;
  if (purpose === 'listing-document') {
    await addDocumentFromBuffer(ctx, {
      id,
      ownerId: actor.id,
      listingId: recordId,
      filename,
      buffer: content,
    });
    return;
  }
  const owner = purpose === 'survey-photo' ? { orderId: recordId } : { listingId: recordId };
  await addPhotoFromBuffer(ctx, { id, ownerId: actor.id, ...owner, view, alt, filename, buffer: content });
}

/** How many bytes this person's file had when it arrived; undefined if it has not. */
export async function findReceivedBytes(ctx: Ctx, id: string): Promise<number | undefined> {
  const found = (await repo.findPhoto(ctx.db, id)) ?? (await repo.findDocument(ctx.db, id));
  return found?.ownerId === ctx.actor?.id ? found?.bytes : undefined;
}

const isReceived = async (ctx: Ctx, id: string): Promise<boolean> =>
  (await findReceivedBytes(ctx, id)) !== undefined;

interface NewPhoto {
  id?: string;
  ownerId: string;
  listingId?: string;
  orderId?: string;
  view: string;
  alt: string;
  filename: string;
  buffer: Buffer<ArrayBuffer>;
}

/**
 * Makes and stores a photograph. The caller has made sure that its owner may add it.
 * @throws Problem wrong-kind, too-large.
 */
export async function addPhotoFromBuffer(ctx: Ctx, given: NewPhoto): Promise<Photo> {
  const { id = randomUUID(), buffer, listingId = null, orderId = null, ...words } = given;
  const { variants, ...made } = await makePhoto(buffer);
  await ctx.files.put(originalKey(id), buffer);
  for (const { width, format, content } of variants)
    await ctx.files.put(variantKey(id, width, format), content);
  return inTransaction(ctx, async (ctx) => {
    // Held, so that two pictures arriving together do not take the same place.
    if (listingId !== null) await repo.lockListing(ctx.db, listingId);
    await repo.insertPhoto(ctx.db, {
      ...words,
      ...made,
      id,
      listingId,
      orderId,
      bytes: buffer.length,
      uploadedAt: ctx.now(),
    });
    return getPhoto(ctx, id);
  });
}

interface NewDocument {
  id?: string;
  ownerId: string;
  listingId: string;
  filename: string;
  buffer: Buffer<ArrayBuffer>;
}

/**
 * Checks and stores a document of a listing. The caller has made sure that its owner may add it.
 * @throws Problem wrong-kind, too-large.
 */
export async function addDocumentFromBuffer(ctx: Ctx, given: NewDocument): Promise<DocumentView> {
  const { id = randomUUID(), buffer, ownerId, listingId, filename } = given;
  const { mime, content, sha256 } = await makeDocument(buffer);
  await ctx.files.put(documentKey(id), content);
  const view = { id, filename, mime, bytes: content.length, uploadedAt: ctx.now() };
  await repo.insertDocument(ctx.db, { ...view, ownerId, listingId, sha256 });
  return view;
}

/** @throws Problem not-found. */
async function getPhoto(ctx: Ctx, id: string): Promise<StoredPhoto> {
  const photo = await repo.findPhoto(ctx.db, id);
  if (!photo) throw new Problem('not-found');
  return photo;
}

/** A photograph that the person asking may change: theirs, of a listing still kept or of a survey still open. */
async function getOwnPhoto(ctx: Ctx, id: string) {
  const actor = requireActor(ctx);
  const photo = await getPhoto(ctx, id);
  if (photo.ownerId !== actor.id) throw new Problem('not-found');
  if (photo.orderId !== null) await surveys.requireUnfiledPhoto(ctx, photo.orderId, id);
  const listing = photo.listingId === null ? undefined : await requireOwnListing(ctx, photo.listingId);
  return { photo, listing };
}

/** What is on the market, or may be put back there as it is, keeps the photographs it needs. */
function requireEnough(status: string | undefined, held: readonly Photo[]): void {
  if (status === undefined || status === 'draft') return;
  const faults = photoFaults(held);
  if (faults.length > 0) {
    throw new Problem(
      'invalid-input',
      'A listing keeps at least three photographs, one of the whole boiler, each described. Add another before you change this one.',
      faults,
    );
  }
}

export async function updatePhoto(
  ctx: Ctx,
  id: string,
  change: { view?: string | undefined; alt?: string | undefined },
): Promise<Photo> {
  const given = {
    ...(change.view === undefined ? {} : { view: change.view }),
    ...(change.alt === undefined ? {} : { alt: change.alt }),
  };
  return inTransaction(ctx, async (ctx) => {
    const { photo, listing } = await getOwnPhoto(ctx, id);
    if (photo.listingId !== null) {
      const held = await listPhotosOfListing(ctx, photo.listingId);
      const after = held.map((each) => (each.id === id ? { ...each, ...given } : each));
      requireEnough(listing?.status, after);
    }
    await repo.updatePhoto(ctx.db, id, given);
    return getPhoto(ctx, id);
  });
}

/** Takes a photograph away. Its files stay private: a report may rest on them. */
export async function deletePhoto(ctx: Ctx, id: string): Promise<void> {
  await inTransaction(ctx, async (ctx) => {
    const { photo, listing } = await getOwnPhoto(ctx, id);
    if (photo.listingId !== null) {
      const held = await listPhotosOfListing(ctx, photo.listingId);
      requireEnough(
        listing?.status,
        held.filter((each) => each.id !== id),
      );
    }
    await repo.updatePhotoRemoved(ctx.db, id, ctx.now());
  });
}

/**
 * Puts a listing's photographs in the order given; those not named follow as they stood.
 * @throws Problem not-found, invalid-input if one named is not of this listing.
 */
export async function orderPhotos(ctx: Ctx, listingId: string, photoIds: readonly string[]): Promise<void> {
  await inTransaction(ctx, async (ctx) => {
    await requireOwnListing(ctx, listingId);
    const held = (await listPhotosOfListing(ctx, listingId)).map(({ id }) => id);
    const wanted = [...new Set(photoIds)];
    if (wanted.some((id) => !held.includes(id))) {
      const detail = 'One of these photographs is no longer in the listing. Load the page again.';
      throw new Problem('invalid-input', detail, [{ detail, pointer: '#/photoIds' }]);
    }
    const rest = held.filter((id) => !wanted.includes(id));
    await repo.updatePositions(ctx.db, listingId, [...wanted, ...rest]);
  });
}

export async function deleteDocument(ctx: Ctx, id: string): Promise<void> {
  const actor = requireActor(ctx);
  const document = await repo.findDocument(ctx.db, id);
  if (document?.ownerId !== actor.id) throw new Problem('not-found');
  await repo.updateDocumentRemoved(ctx.db, id);
}

export interface Served {
  stream: Readable;
  bytes: number;
  mime: string;
}

async function open(ctx: Ctx, key: string, mime: string): Promise<Served> {
  const file = await ctx.files.open(key);
  if (!file) throw new Problem('not-found');
  return { ...file, mime };
}

const variantName = /^([1-9]\d{0,4})\.(avif|jpeg)$/;

/**
 * One variant of a photograph, for whoever may look: anyone, once it is of a listed boiler or a filed report;
 * before that its owner, the office and, if the seller took it, the parties to an order for the boiler.
 * @param name such as `960.avif`.
 * @throws Problem not-found.
 */
export async function openVariant(
  ctx: Ctx,
  id: string,
  name: string,
): Promise<Served & { isPublic: boolean }> {
  const [, width, format] = variantName.exec(name) ?? [];
  const found = await repo.findPhotoAccess(ctx.db, id, ctx.actor?.id ?? null);
  if (!found || format === undefined || !found.widths.includes(Number(width))) throw new Problem('not-found');
  const isPublic = found.isPublished || (found.isReported && !found.isTakenDown);
  const hasPart = ctx.actor !== null && (found.ownerId === ctx.actor.id || found.isParty);
  if (!isPublic && !hasPart && !ctx.actor?.roles.has('office')) throw new Problem('not-found');
  return { ...(await open(ctx, variantKey(id, Number(width), format), `image/${format}`)), isPublic };
}

/**
 * A document, for anyone signed in while its boiler is listed; else for its owner, the parties and the office.
 * @throws Problem not-signed-in, not-found.
 */
export async function openDocument(ctx: Ctx, id: string): Promise<Served & { filename: string }> {
  const actor = requireActor(ctx);
  const found = await repo.findDocumentAccess(ctx.db, id, actor.id);
  const mayRead =
    found && (found.isPublished || found.isParty || found.ownerId === actor.id || actor.roles.has('office'));
  if (!mayRead) throw new Problem('not-found');
  return { ...(await open(ctx, documentKey(id), found.mime)), filename: found.filename };
}

/** In the seller's order, the cover first. */
export const listPhotosOfListings = (ctx: Ctx, ids: readonly string[]): Promise<Map<string, Photo[]>> =>
  repo.listPhotosOfListings(ctx.db, ids);

export const listPhotosOfListing = async (ctx: Ctx, id: string): Promise<Photo[]> =>
  (await listPhotosOfListings(ctx, [id])).get(id) ?? [];

export const listPhotosOfOrder = (ctx: Ctx, orderId: string): Promise<Photo[]> =>
  repo.listPhotosOfOrder(ctx.db, orderId);

export const listDocumentsOfListings = (
  ctx: Ctx,
  ids: readonly string[],
): Promise<Map<string, DocumentView[]>> => repo.listDocumentsOfListings(ctx.db, ids);

export const listDocumentsOfListing = async (ctx: Ctx, id: string): Promise<DocumentView[]> =>
  (await listDocumentsOfListings(ctx, [id])).get(id) ?? [];
