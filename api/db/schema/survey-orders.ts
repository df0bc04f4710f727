import { bigint, check, index, integer, jsonb, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import { sql } from 'drizzle-orm';
import type { OrderStatus, RecordedEvent } from '#shared/survey-orders/machine.ts';
import type { Quotation } from '#shared/survey-orders/pricing.ts';
import type { ExtraId, ScopeId } from '#shared/surveys/scopes.ts';
import { user } from './auth.ts';
import { listings } from './listings.ts';

const at = () => timestamp({ withTimezone: true, mode: 'date' });
const person = () =>
  text()
    .notNull()
    .references(() => user.id);

export const surveyOrders = pgTable(
  'survey_orders',
  {
    id: uuid().primaryKey().defaultRandom(),
    listingId: uuid()
      .notNull()
      .references(() => listings.id),
    buyerId: person(),
    sellerId: person(),
    surveyorId: person(),
    status: text().$type<OrderStatus>().notNull().default('awaiting-payment'),
    scope: text().$type<ScopeId>().notNull(),
    extras: text().$type<ExtraId>().array().notNull(),
    quotation: jsonb().$type<Quotation>().notNull(),
    totalMinor: integer().notNull(),
    currency: text().notNull(),
    proposedTimes: at().array().notNull().default([]),
    appointmentAt: at(),
    placedAt: at().notNull(),
    movedAt: at().notNull(),
    /** When the order moves by itself unless somebody acts first. */
    dueAt: at(),
    /** When the buyer asked that the work begin within the cancellation period. */
    earlyStartRequestedAt: at().notNull(),
  },
  (table) => [
    check('survey_orders_total', sql`${table.totalMinor} > 0`),
    index('survey_orders_buyer').on(table.buyerId),
    index('survey_orders_seller').on(table.sellerId),
    index('survey_orders_surveyor').on(table.surveyorId),
    index('survey_orders_listing').on(table.listingId),
    index('survey_orders_moved').on(table.status, table.movedAt),
  ],
);

export const surveyOrderEvents = pgTable(
  'survey_order_events',
  {
    id: bigint({ mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
    orderId: uuid()
      .notNull()
      .references(() => surveyOrders.id),
    event: text().$type<RecordedEvent>().notNull(),
    from: text().$type<OrderStatus>().notNull(),
    to: text().$type<OrderStatus>().notNull(),
    /** Null when the system moved it. */
    actorId: text().references(() => user.id),
    reason: text().notNull().default(''),
    at: at().notNull(),
  },
  (table) => [index('survey_order_events_order').on(table.orderId)],
);
