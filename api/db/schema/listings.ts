import {
  bigint,
  boolean,
  index,
  integer,
  jsonb,
  pgTable,
  real,
  text,
  timestamp,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import type { ListingDraft } from '#shared/listings/draft.ts';
import type { ListingEvent, ListingStatus } from '#shared/listings/machine.ts';
import type { VerdictId } from '#shared/surveys/verdicts.ts';
import { user } from './auth.ts';

const at = () => timestamp({ withTimezone: true, mode: 'date' });

export const listings = pgTable(
  'listings',
  {
    id: uuid().primaryKey().defaultRandom(),
    slug: text().notNull(),
    sellerId: text()
      .notNull()
      .references(() => user.id),
    status: text().$type<ListingStatus>().notNull().default('draft'),
    /** Everything but the address, which lives apart so that it cannot be selected by accident. */
    draft: jsonb().$type<Omit<ListingDraft, 'address'>>().notNull(),
    version: integer().notNull().default(1),
    /** Copied out of the draft when it is saved, for search. */
    type: text(),
    material: text(),
    firing: text(),
    workingPressurePa: real(),
    waterCapacityL: real(),
    askingMinor: bigint({ mode: 'number' }),
    currency: text().notNull().default('GBP'),
    townId: integer(),
    /** Of the newest report. */
    verdict: text().$type<VerdictId>(),
    condition: integer(),
    evidence: integer(),
    createdAt: at().notNull(),
    savedAt: at().notNull(),
    publishedAt: at(),
  },
  (table) => [
    uniqueIndex('listings_slug').on(table.slug),
    index('listings_seller').on(table.sellerId),
    index('listings_newest').on(table.status, table.publishedAt, table.id),
    index('listings_price').on(table.status, table.askingMinor, table.id),
    index('listings_type').on(table.status, table.type, table.publishedAt, table.id),
  ],
);

export const listingAddresses = pgTable('listing_addresses', {
  listingId: uuid()
    .primaryKey()
    .references(() => listings.id),
  line1: text().notNull(),
  line2: text().notNull(),
  postcode: text().notNull(),
  accessNotes: text().notNull(),
});

export const listingEvents = pgTable(
  'listing_events',
  {
    id: bigint({ mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
    listingId: uuid()
      .notNull()
      .references(() => listings.id),
    event: text().$type<ListingEvent>().notNull(),
    from: text().$type<ListingStatus>().notNull(),
    to: text().$type<ListingStatus>().notNull(),
    actorId: text().references(() => user.id),
    reason: text().notNull().default(''),
    at: at().notNull(),
  },
  (table) => [index('listing_events_listing').on(table.listingId)],
);

export const photos = pgTable(
  'photos',
  {
    id: uuid().primaryKey(),
    ownerId: text()
      .notNull()
      .references(() => user.id),
    listingId: uuid().references(() => listings.id),
    orderId: uuid(),
    view: text().notNull(),
    alt: text().notNull(),
    position: integer().notNull().default(0),
    filename: text().notNull(),
    mime: text().notNull(),
    bytes: integer().notNull(),
    sha256: text().notNull(),
    width: integer().notNull(),
    height: integer().notNull(),
    widths: integer().array().notNull(),
    uploadedAt: at().notNull(),
    removedAt: at(),
  },
  (table) => [
    index('photos_listing').on(table.listingId, table.position),
    index('photos_order').on(table.orderId),
  ],
);

export const documents = pgTable(
  'documents',
  {
    id: uuid().primaryKey(),
    ownerId: text()
      .notNull()
      .references(() => user.id),
    listingId: uuid()
      .notNull()
      .references(() => listings.id),
    filename: text().notNull(),
    mime: text().notNull(),
    bytes: integer().notNull(),
    sha256: text().notNull(),
    uploadedAt: at().notNull(),
    isRemoved: boolean().notNull().default(false),
  },
  (table) => [index('documents_listing').on(table.listingId)],
);
