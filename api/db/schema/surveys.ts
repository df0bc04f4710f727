import {
  date,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  timestamp,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import type { AnyPgColumn } from 'drizzle-orm/pg-core';
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
  /** The filed report that is being corrected; null in a first examination, and once the correction is filed. */
  correctsReportId: uuid().references((): AnyPgColumn => reports.id),
  correctionReason: text(),
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
    /** 1 as first filed; each correction is the next. */
    version: integer().notNull().default(1),
    /** The version before, and why it was corrected; both null in the first. */
    correctsReportId: uuid().references((): AnyPgColumn => reports.id),
    correctionReason: text(),
  },
  (table) => [
    uniqueIndex('reports_check_code').on(table.checkCode),
    index('reports_listing').on(table.listingId, table.filedAt),
    uniqueIndex('reports_order_version').on(table.orderId, table.version),
    uniqueIndex('reports_corrects').on(table.correctsReportId),
  ],
);

/** What the seller answered to a finding of a filed report: once, and never changed. */
export const reportReplies = pgTable(
  'report_replies',
  {
    id: uuid().primaryKey(),
    reportId: uuid()
      .notNull()
      .references(() => reports.id),
    criterionId: text().notNull(),
    text: text().notNull(),
    at: at().notNull(),
  },
  (table) => [uniqueIndex('report_replies_finding').on(table.reportId, table.criterionId)],
);

/** What the seller says has been done to the boiler since a report was filed. */
export const reportRepairs = pgTable(
  'report_repairs',
  {
    id: uuid().primaryKey(),
    reportId: uuid()
      .notNull()
      .references(() => reports.id),
    text: text().notNull(),
    doneOn: date().notNull(),
    at: at().notNull(),
  },
  (table) => [index('report_repairs_report').on(table.reportId)],
);
