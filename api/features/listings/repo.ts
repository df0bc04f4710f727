import { randomUUID } from 'node:crypto';
import { and, asc, desc, eq, gte, inArray, isNull, lte, ne, or, sql } from 'drizzle-orm';
import type { SQL } from 'drizzle-orm';
import type { BoilerTypeId } from '#shared/boilers/boiler-types.ts';
import type { MaterialId } from '#shared/boilers/boiler.ts';
import type { ListingSearch } from '#shared/listings/contract.ts';
import type { Address, ListingDraft } from '#shared/listings/draft.ts';
import type { ListingEvent, ListingStatus } from '#shared/listings/machine.ts';
import type { Photo } from '#shared/listings/pictures.ts';
import type { Currency } from '#shared/money.ts';
import type { VerdictId } from '#shared/surveys/verdicts.ts';
import type { Instant } from '#shared/time.ts';
import type { Db } from '../../db/client.ts';
import { listingAddresses, listingEvents, listings, photos, surveyOrders } from '../../db/schema/index.ts';
import type { Place } from './cursor.ts';

/** A draft without the address, which lives in a table of its own. */
export type PublicDraft = Omit<ListingDraft, 'address'>;

export interface StoredListing {
  id: string;
  slug: string;
  sellerId: string;
  status: ListingStatus;
  draft: PublicDraft;
  version: number;
  savedAt: Instant;
  publishedAt: Instant | null;
}

type Row = typeof listings.$inferSelect;

const fromRow = (row: Row): StoredListing => ({
  id: row.id,
  slug: row.slug,
  sellerId: row.sellerId,
  status: row.status,
  draft: row.draft,
  version: row.version,
  savedAt: row.savedAt.toISOString(),
  publishedAt: row.publishedAt?.toISOString() ?? null,
});

/** What search reads, copied out of the draft. */
const derived = (draft: PublicDraft) => ({
  type: draft.facts.type,
  material: draft.facts.material,
  firing: draft.facts.firing,
  workingPressurePa: draft.facts.workingPressurePa,
  waterCapacityL: draft.facts.waterCapacityL,
  askingMinor: draft.askingMinor,
  currency: draft.currency,
  townId: draft.townId,
});

/** Starts a draft. Until it is published its id stands for its slug. */
export async function insertListing(
  db: Db,
  { sellerId, draft, at }: { sellerId: string; draft: PublicDraft; at: Instant },
): Promise<StoredListing> {
  const id = randomUUID();
  const moment = new Date(at);
  const [row] = await db
    .insert(listings)
    .values({ id, slug: id, sellerId, draft, ...derived(draft), createdAt: moment, savedAt: moment })
    .returning();
  if (!row) throw new Error('The draft was not stored');
  return fromRow(row);
}

export async function findListing(db: Db, id: string): Promise<StoredListing | undefined> {
  const [row] = await db.select().from(listings).where(eq(listings.id, id));
  return row && fromRow(row);
}

/** As `findListing`, and nobody else changes it or its photographs until the transaction ends. */
export async function lockListing(db: Db, id: string): Promise<StoredListing | undefined> {
  const [row] = await db.select().from(listings).where(eq(listings.id, id)).for('update');
  return row && fromRow(row);
}

export async function findListingBySlug(db: Db, slug: string): Promise<StoredListing | undefined> {
  const [row] = await db.select().from(listings).where(eq(listings.slug, slug));
  return row && fromRow(row);
}

/** Last saved first; what was thrown away is left out. */
export async function listOwnListings(db: Db, sellerId: string): Promise<StoredListing[]> {
  const rows = await db
    .select()
    .from(listings)
    .where(and(eq(listings.sellerId, sellerId), ne(listings.status, 'discarded')))
    .orderBy(desc(listings.savedAt), desc(listings.id));
  return rows.map(fromRow);
}

interface Save {
  id: string;
  /** The version that was read. */
  version: number;
  draft: PublicDraft;
  at: Instant;
}

/** @returns undefined if the version had moved on. */
export async function updateDraft(
  db: Db,
  { id, version, draft, at }: Save,
): Promise<StoredListing | undefined> {
  const [row] = await db
    .update(listings)
    .set({ draft, ...derived(draft), version: version + 1, savedAt: new Date(at) })
    .where(and(eq(listings.id, id), eq(listings.version, version)))
    .returning();
  return row && fromRow(row);
}

export async function listAddresses(db: Db, ids: readonly string[]): Promise<Map<string, Address>> {
  if (ids.length === 0) return new Map();
  const rows = await db
    .select()
    .from(listingAddresses)
    .where(inArray(listingAddresses.listingId, [...ids]));
  return new Map(rows.map(({ listingId, ...address }) => [listingId, address]));
}

export async function updateAddress(db: Db, listingId: string, address: Address): Promise<void> {
  await db
    .insert(listingAddresses)
    .values({ listingId, ...address })
    .onConflictDoUpdate({ target: listingAddresses.listingId, set: address });
}

interface Move {
  event: ListingEvent;
  to: ListingStatus;
  actorId: string | null;
  reason: string;
  at: Instant;
  /** Given at the first publication only. */
  slug?: string;
}

/** Moves a listing if it is still where it was seen, and records the move. @returns undefined if it is not. */
export async function moveListing(
  db: Db,
  seen: StoredListing,
  move: Move,
): Promise<StoredListing | undefined> {
  const { event, to, actorId, reason, at, slug } = move;
  const [row] = await db
    .update(listings)
    .set({ status: to, ...(slug === undefined ? {} : { slug, publishedAt: new Date(at) }) })
    .where(and(eq(listings.id, seen.id), eq(listings.status, seen.status)))
    .returning();
  if (!row) return undefined;
  await db
    .insert(listingEvents)
    .values({ listingId: seen.id, event, from: seen.status, to, actorId, reason, at: new Date(at) });
  return fromRow(row);
}

export interface StoredEvent {
  event: ListingEvent;
  from: ListingStatus;
  reason: string;
  at: Instant;
}

/** Oldest first. */
export async function listEvents(db: Db, listingId: string): Promise<StoredEvent[]> {
  const rows = await db
    .select()
    .from(listingEvents)
    .where(eq(listingEvents.listingId, listingId))
    .orderBy(asc(listingEvents.id));
  return rows.map(({ event, from, reason, at }) => ({ event, from, reason, at: at.toISOString() }));
}

/** Whether a person is the buyer or the surveyor of an order for this boiler. */
export async function isPartyToListing(db: Db, listingId: string, personId: string): Promise<boolean> {
  const [row] = await db
    .select({ id: surveyOrders.id })
    .from(surveyOrders)
    .where(
      and(
        eq(surveyOrders.listingId, listingId),
        or(eq(surveyOrders.buyerId, personId), eq(surveyOrders.surveyorId, personId)),
      ),
    )
    .limit(1);
  return row !== undefined;
}

export async function updateVerdict(
  db: Db,
  id: string,
  figures: { verdict: VerdictId; condition: number | null; evidence: number },
): Promise<boolean> {
  const rows = await db
    .update(listings)
    .set(figures)
    .where(eq(listings.id, id))
    .returning({ id: listings.id });
  return rows.length > 0;
}

/** One line of a list, with a town still to be looked up. */
export interface FoundListing {
  id: string;
  slug: string;
  status: ListingStatus;
  title: string;
  type: BoilerTypeId;
  material: MaterialId;
  workingPressurePa: number;
  waterCapacityL: number;
  askingMinor: number;
  currency: Currency;
  townId: number | null;
  cover: Photo | null;
  verdict: VerdictId | null;
  condition: number | null;
  evidence: number | null;
  publishedAt: Instant | null;
}

function matching(search: ListingSearch): SQL | undefined {
  const { type, verdict, priceMinMinor, priceMaxMinor } = search;
  return and(
    eq(listings.status, 'published'),
    type && eq(listings.type, type),
    verdict && (verdict === 'not-surveyed' ? isNull(listings.verdict) : eq(listings.verdict, verdict)),
    priceMinMinor === undefined ? undefined : gte(listings.askingMinor, priceMinMinor),
    priceMaxMinor === undefined ? undefined : lte(listings.askingMinor, priceMaxMinor),
  );
}

function after(place: Place): SQL {
  if (place.sort === 'newest')
    return sql`(${listings.publishedAt}, ${listings.id}) < (${place.publishedAt}::timestamptz, ${place.id}::uuid)`;
  const here = sql`(${place.askingMinor}::bigint, ${place.id}::uuid)`;
  const there = sql`(${listings.askingMinor}, ${listings.id})`;
  return place.sort === 'price-low' ? sql`${there} > ${here}` : sql`${there} < ${here}`;
}

const orders = {
  newest: [desc(listings.publishedAt), desc(listings.id)],
  'price-low': [asc(listings.askingMinor), asc(listings.id)],
  'price-high': [desc(listings.askingMinor), desc(listings.id)],
} as const satisfies Record<ListingSearch['sort'], SQL[]>;

const coverOf = (db: Db) =>
  db
    .select({
      id: photos.id,
      view: photos.view,
      alt: photos.alt,
      width: photos.width,
      height: photos.height,
      widths: photos.widths,
      sha256: photos.sha256,
      uploadedAt: photos.uploadedAt,
    })
    .from(photos)
    .where(and(eq(photos.listingId, listings.id), isNull(photos.removedAt)))
    .orderBy(asc(photos.position), asc(photos.uploadedAt), asc(photos.id))
    .limit(1)
    .as('cover');

type Cover = Pick<typeof photos.$inferSelect, Exclude<keyof Photo, 'uploadedAt'> | 'uploadedAt'>;
const toCover = (row: Cover | null): Photo | null =>
  row?.id ? { ...row, uploadedAt: row.uploadedAt.toISOString() } : null;

const fact = (name: keyof ListingDraft['facts']): SQL =>
  sql`${listings.draft}->'facts'->>${sql.raw(`'${name}'`)}`;

/**
 * One page of the market in one statement: the rows, their covers and how many match in all.
 * @param place where the page before ended.
 */
export async function searchListings(
  db: Db,
  search: ListingSearch,
  place: Place | undefined,
): Promise<{ found: FoundListing[]; total: number }> {
  const filters = matching(search);
  const cover = coverOf(db);
  const rows = await db
    .select({
      id: listings.id,
      slug: listings.slug,
      status: listings.status,
      title: sql<string>`${listings.draft}->>'title'`,
      type: sql<BoilerTypeId>`${listings.type}`,
      material: sql<MaterialId>`${listings.material}`,
      // From the draft: the columns beside it are single precision, enough to search by but not to show.
      workingPressurePa: sql<number>`(${fact('workingPressurePa')})::float8`,
      waterCapacityL: sql<number>`(${fact('waterCapacityL')})::float8`,
      askingMinor: sql<number>`${listings.askingMinor}::float8`,
      currency: sql<Currency>`${listings.currency}`,
      townId: listings.townId,
      verdict: listings.verdict,
      condition: listings.condition,
      evidence: listings.evidence,
      publishedAt: listings.publishedAt,
      cover: {
        id: cover.id,
        view: cover.view,
        alt: cover.alt,
        width: cover.width,
        height: cover.height,
        widths: cover.widths,
        sha256: cover.sha256,
        uploadedAt: cover.uploadedAt,
      },
      total: sql<number>`(select count(*)::int from ${listings} where ${filters})`,
    })
    .from(listings)
    .leftJoinLateral(cover, sql`true`)
    .where(and(filters, place && after(place)))
    .orderBy(...orders[search.sort])
    .limit(search.limit + 1);
  const found = rows.map(({ total: _total, cover, publishedAt, ...row }) => ({
    ...row,
    cover: toCover(cover),
    publishedAt: publishedAt?.toISOString() ?? null,
  }));
  return { found, total: rows[0]?.total ?? (place ? await db.$count(listings, filters) : 0) };
}

export async function listListings(db: Db, ids: readonly string[]): Promise<StoredListing[]> {
  if (ids.length === 0) return [];
  const rows = await db
    .select()
    .from(listings)
    .where(inArray(listings.id, [...new Set(ids)]));
  return rows.map(fromRow);
}
