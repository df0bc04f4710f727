import { boolean, date, integer, jsonb, pgTable, primaryKey, text, timestamp } from 'drizzle-orm/pg-core';
import type { SurveyorFees } from '#shared/survey-orders/pricing.ts';
import { user } from './auth.ts';

/** Roles granted and withdrawn; the one in force has no `withdrawnAt`. Rows are never deleted: they are the record. */
export const roleGrants = pgTable(
  'role_grants',
  {
    userId: text()
      .notNull()
      .references(() => user.id),
    role: text().$type<'surveyor' | 'office'>().notNull(),
    grantedAt: timestamp({ withTimezone: true, mode: 'date' }).notNull(),
    grantedBy: text().references(() => user.id),
    reason: text().notNull(),
    withdrawnAt: timestamp({ withTimezone: true, mode: 'date' }),
    withdrawnBy: text().references(() => user.id),
    withdrawnReason: text(),
  },
  (table) => [primaryKey({ columns: [table.userId, table.role, table.grantedAt] })],
);

export const surveyors = pgTable('surveyors', {
  userId: text()
    .primaryKey()
    .references(() => user.id),
  number: integer().notNull().unique().generatedAlwaysAsIdentity({ startWith: 11 }),
  townId: integer().notNull(),
  rangeKm: integer().notNull(),
  types: text().array().notNull(),
  materials: text().array().notNull(),
  insuredUntilOn: date({ mode: 'string' }).notNull(),
  fees: jsonb().$type<SurveyorFees>().notNull(),
  about: text().notNull(),
  isTakingJobs: boolean().notNull(),
  payoutAccountId: text(),
  payoutsReady: boolean().notNull().default(false),
});
