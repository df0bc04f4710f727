import { z } from 'zod';
import { boilerFacts, materialId } from '../boilers/boiler.ts';
import { boilerTypeId } from '../boilers/boiler-types.ts';
import { byId, done, endpoint } from '../endpoint.ts';
import { money } from '../money.ts';
import { page, pageQuery } from '../paging.ts';
import { verdictId } from '../surveys/verdicts.ts';
import { instant } from '../time.ts';
import { completeListing, historyEntry, listingDraft } from './draft.ts';
import { listingMachine } from './machine.ts';
import { documentView, photo } from './pictures.ts';
import { town } from './places.ts';

export const listingStatus = z.enum(
  listingMachine.states as ['draft', ...(typeof listingMachine.states)[number][]],
);

export const reportSummary = z.object({
  reportId: z.uuid(),
  filedAt: instant,
  examinedOn: z.iso.date(),
  scope: z.string(),
  verdict: verdictId,
  condition: z.int().nullable(),
  evidence: z.int(),
  /** 1 as first filed; more where it was corrected. */
  version: z.int(),
});
export type ReportSummary = z.infer<typeof reportSummary>;

export const listingSummary = z.object({
  id: z.uuid(),
  slug: z.string(),
  status: listingStatus,
  title: z.string(),
  type: boilerTypeId,
  material: materialId,
  workingPressurePa: z.number(),
  waterCapacityL: z.number(),
  asking: money,
  town: town,
  cover: photo.nullable(),
  verdict: verdictId.nullable(),
  condition: z.int().nullable(),
  evidence: z.int().nullable(),
  publishedAt: instant.nullable(),
});
export type ListingSummary = z.infer<typeof listingSummary>;

export const recordEntry = z.object({
  event: z.string(),
  label: z.string(),
  at: instant,
  by: z.string(),
  reason: z.string(),
});
export type RecordEntry = z.infer<typeof recordEntry>;

export const listing = z.object({
  id: z.uuid(),
  slug: z.string(),
  status: listingStatus,
  title: z.string(),
  description: z.string(),
  facts: boilerFacts,
  history: z.array(historyEntry),
  documents: z.array(documentView),
  declaration: completeListing.shape.declaration.pick({
    knownDefects: true,
    knownRepairs: true,
    lagging: true,
  }),
  town,
  asking: money,
  terms: z.object({
    canCollect: z.boolean(),
    canCarry: z.boolean(),
    carriageNote: z.string(),
    takesOffers: z.boolean(),
  }),
  photos: z.array(photo),
  seller: z.object({ name: z.string(), memberSince: instant }),
  reports: z.array(reportSummary),
  publishedAt: instant.nullable(),
  record: z.array(recordEntry),
  /** What the person reading may do. */
  viewer: z.object({ isSeller: z.boolean(), canCommission: z.boolean(), events: z.array(z.string()) }),
});
export type Listing = z.infer<typeof listing>;

export const ownListing = z.object({
  id: z.uuid(),
  slug: z.string(),
  status: listingStatus,
  draft: listingDraft,
  town: town.nullable(),
  photos: z.array(photo),
  documents: z.array(documentView),
  version: z.int(),
  savedAt: instant,
  events: z.array(z.string()),
});
export type OwnListing = z.infer<typeof ownListing>;

export const sorts = {
  newest: 'Newest first',
  'price-low': 'Lowest price first',
  'price-high': 'Highest price first',
} as const;
export const listingSearch = pageQuery.extend({
  type: boilerTypeId.optional(),
  verdict: z.union([verdictId, z.literal('not-surveyed')]).optional(),
  priceMinMinor: z.coerce.number().int().min(0, 'A price cannot be negative').max(100_000_000).optional(),
  priceMaxMinor: z.coerce.number().int().min(0, 'A price cannot be negative').max(100_000_000).optional(),
  sort: z.enum(Object.keys(sorts) as [keyof typeof sorts]).default('newest'),
});
export type ListingSearch = z.infer<typeof listingSearch>;

export const createListing = endpoint({
  name: 'createListing',
  summary: 'Start a draft',
  method: 'POST',
  path: '/api/listings',
  response: ownListing,
  status: 201,
});

export const listListings = endpoint({
  name: 'listListings',
  summary: 'Boilers on the market',
  method: 'GET',
  path: '/api/listings',
  query: listingSearch,
  response: page(listingSummary).extend({ total: z.int() }),
});

export const listOwnListings = endpoint({
  name: 'listOwnListings',
  summary: 'My listings and drafts',
  method: 'GET',
  path: '/api/my/listings',
  response: z.object({ items: z.array(ownListing) }),
});

export const getListing = endpoint({
  name: 'getListing',
  summary: 'One boiler, by its slug',
  method: 'GET',
  path: '/api/listings/:slug',
  params: z.strictObject({ slug: z.string().min(1).max(160) }),
  response: listing,
});

export const getOwnListing = endpoint({
  name: 'getOwnListing',
  summary: 'My draft or listing, to work on',
  method: 'GET',
  path: '/api/my/listings/:id',
  params: byId,
  response: ownListing,
});

export const saveListing = endpoint({
  name: 'saveListing',
  summary: 'Save my draft as far as it has got',
  method: 'PUT',
  path: '/api/my/listings/:id',
  params: byId,
  body: z.strictObject({ version: z.int(), draft: listingDraft }),
  response: ownListing,
});

export const moveListing = endpoint({
  name: 'moveListing',
  summary: 'Publish, withdraw, relist or throw away my listing',
  method: 'POST',
  path: '/api/my/listings/:id/moves',
  params: byId,
  body: z.strictObject({
    event: z.enum(['publish', 'withdraw', 'relist', 'discard']),
    reason: z.string().trim().max(400, 'Keep it under 400 characters').default(''),
  }),
  response: ownListing,
});

export const searchTowns = endpoint({
  name: 'searchTowns',
  summary: 'Towns by the beginning of their name',
  method: 'GET',
  path: '/api/towns',
  query: z.strictObject({ q: z.string().trim().min(2, 'Type at least two letters').max(60) }),
  response: z.object({ items: z.array(town) }),
});

export const updatePhoto = endpoint({
  name: 'updatePhoto',
  summary: 'Change a photograph’s view or its description',
  method: 'PATCH',
  path: '/api/photos/:id',
  params: byId,
  body: z.strictObject({
    view: z.string().max(40).optional(),
    alt: z.string().trim().max(300, 'Keep it under 300 characters').optional(),
  }),
  response: photo,
});

export const deletePhoto = endpoint({
  name: 'deletePhoto',
  summary: 'Remove a photograph from my draft, listing or survey',
  method: 'DELETE',
  path: '/api/photos/:id',
  params: byId,
  response: done,
});

export const orderPhotos = endpoint({
  name: 'orderPhotos',
  summary: 'Put my listing’s photographs in order; the first is the cover',
  method: 'PUT',
  path: '/api/my/listings/:id/photo-order',
  params: byId,
  body: z.strictObject({ photoIds: z.array(z.uuid()).max(60) }),
  response: ownListing,
});

export const deleteDocument = endpoint({
  name: 'deleteDocument',
  summary: 'Remove a document from my listing',
  method: 'DELETE',
  path: '/api/documents/:id',
  params: byId,
  response: done,
});
