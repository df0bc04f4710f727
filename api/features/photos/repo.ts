import { and, asc, eq, exists, inArray, isNull, ne, or, sql } from 'drizzle-orm';
import type { SQL } from 'drizzle-orm';
import type { ListingStatus } from '#shared/listings/machine.ts';
import type { DocumentView, Photo } from '#shared/listings/pictures.ts';
import type { Instant } from '#shared/time.ts';
import type { Db } from '../../db/client.ts';
import { documents, listings, photos, reports, surveyOrders } from '../../db/schema/index.ts';

/** A photograph with whose it is and what it belongs to. */
export interface StoredPhoto extends Photo {
  ownerId: string;
  listingId: string | null;
  orderId: string | null;
  bytes: number;
}

export interface StoredDocument extends DocumentView {
  ownerId: string;
  listingId: string;
}

type PhotoRow = typeof photos.$inferSelect;

const toPhoto = (row: PhotoRow): Photo => ({
  id: row.id,
  view: row.view,
  alt: row.alt,
  width: row.width,
  height: row.height,
  widths: row.widths,
  sha256: row.sha256,
  uploadedAt: row.uploadedAt.toISOString(),
});

const toStored = (row: PhotoRow): StoredPhoto => ({
  ...toPhoto(row),
  ownerId: row.ownerId,
  listingId: row.listingId,
  orderId: row.orderId,
  bytes: row.bytes,
});

const toDocument = (row: typeof documents.$inferSelect): StoredDocument => ({
  id: row.id,
  filename: row.filename,
  mime: row.mime,
  bytes: row.bytes,
  uploadedAt: row.uploadedAt.toISOString(),
  ownerId: row.ownerId,
  listingId: row.listingId,
});

const kept = isNull(photos.removedAt);
const inOrder = [asc(photos.position), asc(photos.uploadedAt), asc(photos.id)];

export interface NewPhoto {
  id: string;
  ownerId: string;
  listingId: string | null;
  orderId: string | null;
  view: string;
  alt: string;
  filename: string;
  mime: string;
  bytes: number;
  sha256: string;
  width: number;
  height: number;
  widths: number[];
  uploadedAt: Instant;
}

const sameRecord = (listingId: string | null, orderId: string | null): SQL | undefined =>
  listingId === null ? eq(photos.orderId, orderId ?? '') : eq(photos.listingId, listingId);

/** Stores a photograph last among its fellows. Storing the same id again changes nothing. */
export async function insertPhoto(db: Db, photo: NewPhoto): Promise<void> {
  const [last] = await db
    .select({ position: sql<number>`coalesce(max(${photos.position}) + 1, 0)::int` })
    .from(photos)
    .where(and(sameRecord(photo.listingId, photo.orderId), kept));
  await db
    .insert(photos)
    .values({ ...photo, position: last?.position ?? 0, uploadedAt: new Date(photo.uploadedAt) })
    .onConflictDoNothing();
}

export async function findPhoto(db: Db, id: string): Promise<StoredPhoto | undefined> {
  const [row] = await db
    .select()
    .from(photos)
    .where(and(eq(photos.id, id), kept));
  return row && toStored(row);
}

/** In the seller's order, the cover first. */
export async function listPhotosOfListings(db: Db, ids: readonly string[]): Promise<Map<string, Photo[]>> {
  const found = new Map<string, Photo[]>(ids.map((id) => [id, []]));
  if (ids.length === 0) return found;
  const rows = await db
    .select()
    .from(photos)
    .where(and(inArray(photos.listingId, [...found.keys()]), kept))
    .orderBy(...inOrder);
  for (const row of rows) if (row.listingId) found.get(row.listingId)?.push(toPhoto(row));
  return found;
}

export async function listPhotosOfOrder(db: Db, orderId: string): Promise<Photo[]> {
  const rows = await db
    .select()
    .from(photos)
    .where(and(eq(photos.orderId, orderId), kept))
    .orderBy(...inOrder);
  return rows.map(toPhoto);
}

export async function updatePhoto(db: Db, id: string, change: { view?: string; alt?: string }) {
  if (Object.keys(change).length > 0) await db.update(photos).set(change).where(eq(photos.id, id));
}

export async function updatePhotoRemoved(db: Db, id: string, at: Instant): Promise<void> {
  await db
    .update(photos)
    .set({ removedAt: new Date(at) })
    .where(and(eq(photos.id, id), kept));
}

export async function updatePositions(db: Db, listingId: string, ids: readonly string[]): Promise<void> {
  for (const [position, id] of ids.entries()) {
    await db
      .update(photos)
      .set({ position })
      .where(and(eq(photos.id, id), eq(photos.listingId, listingId)));
  }
}

/** The listing that pictures are added to or taken from, held until the transaction ends. */
export async function lockListing(
  db: Db,
  id: string,
): Promise<{ sellerId: string; status: ListingStatus } | undefined> {
  const [row] = await db
    .select({ sellerId: listings.sellerId, status: listings.status })
    .from(listings)
    .where(and(eq(listings.id, id), ne(listings.status, 'discarded')))
    .for('update');
  return row;
}

/** What decides who may look: how open the record is, and whether this person has a part in it. */
export interface Access {
  isPublished: boolean;
  isTakenDown: boolean;
  isReported: boolean;
  isParty: boolean;
}

const isTrue = (condition: SQL | undefined) => sql<boolean>`coalesce(${condition ?? sql`false`}, false)`;

const partOf = (personId: string): SQL | undefined =>
  or(
    eq(surveyOrders.buyerId, personId),
    eq(surveyOrders.sellerId, personId),
    eq(surveyOrders.surveyorId, personId),
  );

export async function findPhotoAccess(
  db: Db,
  id: string,
  personId: string | null,
): Promise<(Access & Pick<StoredPhoto, 'ownerId' | 'widths' | 'listingId'>) | undefined> {
  const sameReport = or(eq(reports.listingId, photos.listingId), eq(reports.orderId, photos.orderId));
  // A survey's photographs are its surveyor's alone until the report is filed, and everyone's after that.
  const sameOrder = eq(surveyOrders.listingId, photos.listingId);
  const [row] = await db
    .select({
      ownerId: photos.ownerId,
      listingId: photos.listingId,
      widths: photos.widths,
      isPublished: isTrue(eq(listings.status, 'published')),
      isTakenDown: isTrue(eq(listings.status, 'taken-down')),
      isReported: isTrue(exists(db.select({ id: reports.id }).from(reports).where(sameReport))),
      isParty: isTrue(
        personId === null
          ? undefined
          : exists(
              db
                .select({ id: surveyOrders.id })
                .from(surveyOrders)
                .where(and(sameOrder, partOf(personId))),
            ),
      ),
    })
    .from(photos)
    .leftJoin(listings, eq(listings.id, photos.listingId))
    .where(and(eq(photos.id, id), kept));
  return row;
}

export async function findDocumentAccess(
  db: Db,
  id: string,
  personId: string,
): Promise<(StoredDocument & Pick<Access, 'isPublished' | 'isParty'>) | undefined> {
  const [row] = await db
    .select({
      document: documents,
      isPublished: isTrue(eq(listings.status, 'published')),
      isParty: isTrue(
        exists(
          db
            .select({ id: surveyOrders.id })
            .from(surveyOrders)
            .where(and(eq(surveyOrders.listingId, documents.listingId), partOf(personId))),
        ),
      ),
    })
    .from(documents)
    .innerJoin(listings, eq(listings.id, documents.listingId))
    .where(and(eq(documents.id, id), eq(documents.isRemoved, false)));
  return row && { ...toDocument(row.document), isPublished: row.isPublished, isParty: row.isParty };
}

export async function insertDocument(db: Db, document: StoredDocument & { sha256: string }): Promise<void> {
  await db
    .insert(documents)
    .values({ ...document, uploadedAt: new Date(document.uploadedAt) })
    .onConflictDoNothing();
}

export async function findDocument(db: Db, id: string): Promise<StoredDocument | undefined> {
  const [row] = await db
    .select()
    .from(documents)
    .where(and(eq(documents.id, id), eq(documents.isRemoved, false)));
  return row && toDocument(row);
}

export async function listDocumentsOfListings(
  db: Db,
  ids: readonly string[],
): Promise<Map<string, DocumentView[]>> {
  const found = new Map<string, DocumentView[]>(ids.map((id) => [id, []]));
  if (ids.length === 0) return found;
  const rows = await db
    .select()
    .from(documents)
    .where(and(inArray(documents.listingId, [...found.keys()]), eq(documents.isRemoved, false)))
    .orderBy(asc(documents.uploadedAt), asc(documents.id));
  for (const row of rows) {
    const { ownerId: _owner, listingId, ...view } = toDocument(row);
    found.get(listingId)?.push(view);
  }
  return found;
}

export async function updateDocumentRemoved(db: Db, id: string): Promise<void> {
  await db.update(documents).set({ isRemoved: true }).where(eq(documents.id, id));
}
