import { bigint, index, pgTable, text, timestamp } from 'drizzle-orm/pg-core';
import { user } from './auth.ts';

/** What the office did, beside the moves that each record keeps of itself. Append-only. */
export const officeActs = pgTable(
  'office_acts',
  {
    id: bigint({ mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
    actorId: text()
      .notNull()
      .references(() => user.id),
    act: text().notNull(),
    subject: text().notNull(),
    subjectPath: text(),
    reason: text().notNull(),
    at: timestamp({ withTimezone: true, mode: 'date' }).notNull(),
  },
  (table) => [index('office_acts_at').on(table.at)],
);
