import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import type {
  Listing,
  ListingSearch,
  ListingSummary,
  OwnListing,
  RecordEntry,
} from '#shared/listings/contract.ts';
import { address, completeListing, emptyDraft } from '#shared/listings/draft.ts';
import type { Address, CompleteListing, ListingDraft } from '#shared/listings/draft.ts';
import { listingEventLabels, listingMachine } from '#shared/listings/machine.ts';
import type { ListingEvent, ListingPart, ListingStatus } from '#shared/listings/machine.ts';
import type { DocumentView, Photo } from '#shared/listings/pictures.ts';
import type { Town } from '#shared/listings/places.ts';
import { photoFaults } from '#shared/listings/policy.ts';
import { invalidField, pointer, Problem } from '#shared/problem.ts';
import type { FieldError } from '#shared/problem.ts';
import type { VerdictId } from '#shared/surveys/verdicts.ts';
import { inTransaction, requireActor, requireConfirmedEmail, requireRole } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import * as accounts from '../accounts/service.ts';
import * as photos from '../photos/service.ts';
import { findTown, getTown } from '../places/service.ts';
import * as surveys from '../surveys/service.ts';
import { readCursor, writeCursor } from './cursor.ts';
import * as repo from './repo.ts';
import type { FoundListing, StoredListing } from './repo.ts';
import { slugOf } from './slug.ts';

const noAddress = emptyDraft().address;

/** History names only documents that are still there. */
const withDocuments = <H extends { documentIds: string[] }>(history: H[], held: DocumentView[]): H[] => {
  const ids = new Set(held.map(({ id }) => id));
  return history.map((entry) => ({
    ...entry,
    documentIds: entry.documentIds.filter((id) => ids.has(id)),
  }));
};

/** @param listings all of one seller: the person asking. */
async function describeOwn(ctx: Ctx, listings: readonly StoredListing[]): Promise<OwnListing[]> {
  const ids = listings.map(({ id }) => id);
  const addresses = await repo.listAddresses(ctx.db, ids);
  const pictures = await photos.listPhotosOfListings(ctx, ids);
  const documents = await photos.listDocumentsOfListings(ctx, ids);
  return listings.map(({ id, slug, status, draft, version, savedAt }) => ({
    id,
    slug,
    status,
    draft: {
      ...draft,
      history: withDocuments(draft.history, documents.get(id) ?? []),
      address: addresses.get(id) ?? noAddress,
    },
    town: findTown(draft.townId) ?? null,
    photos: pictures.get(id) ?? [],
    documents: documents.get(id) ?? [],
    version,
    savedAt,
    events: listingMachine.events(status, 'seller'),
  }));
}

async function describeOne(ctx: Ctx, listing: StoredListing): Promise<OwnListing> {
  const [own] = await describeOwn(ctx, [listing]);
  if (!own) throw new Problem('not-found');
  return own;
}

async function requireOwn(ctx: Ctx, id: string, find = repo.findListing): Promise<StoredListing> {
  const actor = requireActor(ctx);
  const listing = await find(ctx.db, id);
  if (!listing || listing.sellerId !== actor.id || listing.status === 'discarded')
    throw new Problem('not-found');
  return listing;
}

export async function createListing(ctx: Ctx): Promise<OwnListing> {
  const actor = requireActor(ctx);
  const { address: _none, ...draft } = emptyDraft();
  return describeOne(ctx, await repo.insertListing(ctx.db, { sellerId: actor.id, draft, at: ctx.now() }));
}

export async function listOwnListings(ctx: Ctx): Promise<OwnListing[]> {
  const actor = requireActor(ctx);
  return describeOwn(ctx, await repo.listOwnListings(ctx.db, actor.id));
}

export const getOwnListing = async (ctx: Ctx, id: string): Promise<OwnListing> =>
  describeOne(ctx, await requireOwn(ctx, id));

/** What keeps a draft off the market, each with where it is. */
function faultsOf(draft: ListingDraft, pictures: readonly Photo[]): FieldError[] {
  const parsed = completeListing.safeParse(draft);
  const faults = parsed.success
    ? []
    : parsed.error.issues.map(({ message, path }) => ({ detail: message, pointer: pointer(path) }));
  return [...faults, ...photoFaults(pictures)];
}

async function requireComplete(ctx: Ctx, id: string, draft: ListingDraft, sentence: string): Promise<void> {
  const faults = faultsOf(draft, await photos.listPhotosOfListing(ctx, id));
  if (faults.length > 0) throw new Problem('invalid-input', sentence, faults);
}

/**
 * Saves a draft as far as it has got. What has been published must stay complete.
 * @throws Problem not-found, stale-version, invalid-input.
 */
export async function saveListing(
  ctx: Ctx,
  id: string,
  { version, draft }: { version: number; draft: ListingDraft },
): Promise<OwnListing> {
  if (draft.townId !== null && !findTown(draft.townId))
    throw invalidField(['townId'], 'Choose the nearest town from the list');
  return inTransaction(ctx, async (ctx) => {
    const listing = await requireOwn(ctx, id, repo.lockListing);
    if (listing.version !== version)
      throw new Problem(
        'stale-version',
        'This listing was saved from another device or tab after you opened it here. Load that version, or keep yours.',
      );
    if (listing.status !== 'draft')
      await requireComplete(
        ctx,
        id,
        draft,
        'A boiler that has been listed stays complete; mend these first.',
      );
    const { address: where, ...rest } = draft;
    const saved = await repo.updateDraft(ctx.db, { id, version, draft: rest, at: ctx.now() });
    if (!saved) throw new Problem('changed-meanwhile');
    await repo.updateAddress(ctx.db, id, where);
    return describeOne(ctx, saved);
  });
}

interface Move {
  event: ListingEvent;
  part: ListingPart;
  reason: string;
}

async function move(ctx: Ctx, seen: StoredListing, { event, part, reason }: Move): Promise<StoredListing> {
  const to = listingMachine.next(seen.status, event, part);
  const isFirst = to === 'published' && seen.publishedAt === null;
  const moved = await repo.moveListing(ctx.db, seen, {
    event,
    to,
    reason,
    actorId: ctx.actor?.id ?? null,
    at: ctx.now(),
    ...(isFirst ? { slug: slugOf(seen.draft.title, seen.id) } : {}),
  });
  if (!moved) throw new Problem('changed-meanwhile');
  return moved;
}

/**
 * Publishes, withdraws, relists or throws away one's own listing.
 * @throws Problem not-found, wrong-state, not-permitted until the e-mail address is confirmed, invalid-input with all
 * that is missing.
 */
export async function moveListing(
  ctx: Ctx,
  id: string,
  { event, reason }: { event: 'publish' | 'withdraw' | 'relist' | 'discard'; reason: string },
): Promise<OwnListing> {
  return inTransaction(ctx, async (ctx) => {
    const actor = requireActor(ctx);
    const listing = await requireOwn(ctx, id, repo.lockListing);
    if (listingMachine.next(listing.status, event, 'seller') === 'published') {
      requireConfirmedEmail(actor);
      const { draft } = await describeOne(ctx, listing);
      await requireComplete(ctx, id, draft, 'Some things are still needed before this can be listed.');
    }
    return describeOne(ctx, await move(ctx, listing, { event, part: 'seller', reason }));
  });
}

/** Takes a listing down, or puts it back. @throws Problem not-permitted, not-found, wrong-state. */
export async function moveListingByOffice(
  ctx: Ctx,
  id: string,
  event: 'takeDown' | 'restore',
  reason: string,
): Promise<{ id: string; slug: string; title: string; status: ListingStatus }> {
  requireRole(ctx, 'office');
  return inTransaction(ctx, async (ctx) => {
    const listing = await repo.lockListing(ctx.db, id);
    if (!listing) throw new Problem('not-found');
    const { slug, draft, status } = await move(ctx, listing, { event, part: 'office', reason });
    return { id, slug, title: draft.title, status };
  });
}

/** Puts a listing's photographs in order; the first is the cover. */
export async function orderPhotos(ctx: Ctx, id: string, photoIds: readonly string[]): Promise<OwnListing> {
  await photos.orderPhotos(ctx, id, photoIds);
  return getOwnListing(ctx, id);
}

const by: Record<ListingPart, string> = { seller: 'the seller', office: 'the office', system: 'Tubeplate' };

const toEntry = ({ event, from, at, reason }: repo.StoredEvent): RecordEntry => {
  const steps: Partial<Record<string, { by: readonly ListingPart[] }>> = listingMachine.table[from];
  const [part = 'system'] = steps[event]?.by ?? [];
  return { event, label: listingEventLabels[event], at, by: by[part], reason };
};

const publicPart = completeListing.omit({ address: true });
/** What a reader may be shown at all; a draft has no public form. */
const isShowable = ({ status }: StoredListing): boolean => status !== 'draft' && status !== 'discarded';

async function mayRead(ctx: Ctx, listing: StoredListing): Promise<boolean> {
  if (!isShowable(listing)) return false;
  if (listing.status === 'published') return true;
  const { actor } = ctx;
  if (!actor) return false;
  return (
    actor.id === listing.sellerId ||
    actor.roles.has('office') ||
    (await repo.isPartyToListing(ctx.db, listing.id, actor.id))
  );
}

/** One boiler: open to everyone while it is listed, then to its seller, the parties to its orders and the office. */
export async function getListing(ctx: Ctx, slug: string): Promise<Listing> {
  const found = await repo.findListingBySlug(ctx.db, slug);
  if (!found || !(await mayRead(ctx, found))) throw new Problem('not-found');
  const { id, status, sellerId, publishedAt } = found;
  const shown = publicPart.parse(found.draft);
  const seller = await accounts.getPerson(ctx, sellerId);
  const documents = await photos.listDocumentsOfListing(ctx, id);
  const isSeller = ctx.actor?.id === sellerId;
  const office = ctx.actor?.roles.has('office') ? listingMachine.events(status, 'office') : [];
  const { knownDefects, knownRepairs, lagging } = shown.declaration;
  return {
    id,
    slug,
    status,
    title: shown.title,
    description: shown.description,
    facts: shown.facts,
    history: withDocuments(shown.history, documents),
    documents,
    declaration: { knownDefects, knownRepairs, lagging },
    town: getTown(shown.townId),
    asking: { minor: shown.askingMinor, currency: shown.currency },
    terms: shown.terms,
    photos: await photos.listPhotosOfListing(ctx, id),
    seller: { name: seller.name, memberSince: seller.joinedAt },
    reports: await surveys.listReportSummaries(ctx, id),
    publishedAt,
    record: (await repo.listEvents(ctx.db, id)).map(toEntry),
    viewer: {
      isSeller,
      canCommission: status === 'published' && !isSeller,
      events: isSeller ? listingMachine.events(status, 'seller') : office,
    },
  };
}

const toSummary = ({ askingMinor, currency, townId, ...row }: FoundListing): ListingSummary => ({
  ...row,
  asking: { minor: askingMinor, currency },
  town: getTown(townId ?? 0),
});

const cursorAfter = (last: FoundListing, sort: ListingSearch['sort']): string =>
  sort === 'newest'
    ? writeCursor({ sort, publishedAt: last.publishedAt ?? '', id: last.id })
    : writeCursor({ sort, askingMinor: last.askingMinor, id: last.id });

/** A page of the market. @throws Problem invalid-input if the cursor is not of this list. */
export async function listListings(
  ctx: Ctx,
  search: ListingSearch,
): Promise<{ items: ListingSummary[]; nextCursor: string | null; total: number }> {
  const place = search.cursor === undefined ? undefined : readCursor(search.cursor, search.sort);
  const { found, total } = await repo.searchListings(ctx.db, search, place);
  const items = found.slice(0, search.limit);
  const last = items.at(-1);
  const nextCursor = found.length > search.limit && last ? cursorAfter(last, search.sort) : null;
  return { items: items.map(toSummary), nextCursor, total };
}

export interface ListingForOrder {
  id: string;
  slug: string;
  title: string;
  sellerId: string;
  facts: BoilerFacts;
  town: Town;
  declaration: CompleteListing['declaration'];
}

/** A listed boiler, as an order for its survey needs it. @throws Problem not-found unless it is on the market. */
export async function getListingForOrder(ctx: Ctx, id: string): Promise<ListingForOrder> {
  const found = await repo.findListing(ctx.db, id);
  if (found?.status !== 'published') throw new Problem('not-found');
  const { title, facts, townId, declaration } = publicPart.parse(found.draft);
  return { id, slug: found.slug, title, sellerId: found.sellerId, facts, town: getTown(townId), declaration };
}

export interface ListingBrief {
  id: string;
  slug: string;
  title: string;
  town: Town;
  cover: Photo | null;
}

/** Listings by id, whatever their state, as lists of orders name them. Drafts without a town are left out. */
export async function listListingBriefs(
  ctx: Ctx,
  ids: readonly string[],
): Promise<Map<string, ListingBrief>> {
  const found = await repo.listListings(ctx.db, ids);
  const pictures = await photos.listPhotosOfListings(
    ctx,
    found.map(({ id }) => id),
  );
  const briefs = new Map<string, ListingBrief>();
  for (const { id, slug, draft } of found) {
    const town = findTown(draft.townId);
    if (town) briefs.set(id, { id, slug, title: draft.title, town, cover: pictures.get(id)?.[0] ?? null });
  }
  return briefs;
}

/** Where the boiler stands. Checks nothing: the caller decides who may know. */
export async function getAddress(ctx: Ctx, listingId: string): Promise<Address | null> {
  const held = (await repo.listAddresses(ctx.db, [listingId])).get(listingId);
  return held ? address.parse(held) : null;
}

/** Puts the newest report's figures on its listing. The caller has made sure that it may. */
export async function attachVerdict(
  ctx: Ctx,
  listingId: string,
  figures: { verdict: VerdictId; condition: number | null; evidence: number },
): Promise<void> {
  if (!(await repo.updateVerdict(ctx.db, listingId, figures))) throw new Problem('not-found');
}
