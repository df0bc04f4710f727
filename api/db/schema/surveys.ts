import { index, integer, jsonb, pgTable, text, timestamp, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import type { SignOff, SurveyRecord } from '#shared/surveys/record.ts';
import type { SurveyResult } from '#shared/surveys/result.ts';
import type { ExtraId, ScopeId } from '#shared/surveys/scopes.ts';
import { user } from './auth.ts';
import { listings } from './listings.ts';
import { surveyOrders } from './survey-orders.ts';

const at = () => timestamp({ withTimezone: true, mode: 'date' });

/** A survey while it is being made. */
export const surveys = pgTable('surveys', {
  orderId: uuid()
    .primaryKey()
    .references(() => surveyOrders.id),
  /** The seller's statement as it stood when the examination began. */
  facts: jsonb().$type<BoilerFacts>().notNull(),
  record: jsonb().$type<SurveyRecord>().notNull(),
  version: integer().notNull().default(1),
  savedAt: at().notNull(),
  filedAt: at(),
});

/** A filed report: written once, never changed. */
export const reports = pgTable(
  'reports',
  {
    id: uuid().primaryKey().defaultRandom(),
    orderId: uuid()
      .notNull()
      .references(() => surveyOrders.id),
    listingId: uuid()
      .notNull()
      .references(() => listings.id),
    surveyorId: text()
      .notNull()
      .references(() => user.id),
    scope: text().$type<ScopeId>().notNull(),
    extras: text().$type<ExtraId>().array().notNull(),
    facts: jsonb().$type<BoilerFacts>().notNull(),
    record: jsonb().$type<SurveyRecord>().notNull(),
    result: jsonb().$type<SurveyResult>().notNull(),
    signOff: jsonb().$type<SignOff>().notNull(),
    rubricVersion: text().notNull(),
    filedAt: at().notNull(),
    /** SHA-256, hex, over the canonical form of what was filed. */
    digest: text().notNull(),
    checkCode: text().notNull(),
  },
  (table) => [
    uniqueIndex('reports_check_code').on(table.checkCode),
    index('reports_listing').on(table.listingId, table.filedAt),
    uniqueIndex('reports_order').on(table.orderId),
  ],
);
