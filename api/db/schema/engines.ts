import { doublePrecision, index, integer, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import type { Action } from '#shared/engines/engine.ts';
import { user } from './auth.ts';

/** Engines that members keep, private to each. */
export const engines = pgTable(
  'engines',
  {
    id: uuid().primaryKey(),
    ownerId: text()
      .notNull()
      .references(() => user.id),
    name: text().notNull(),
    boreMm: doublePrecision().notNull(),
    strokeMm: doublePrecision().notNull(),
    cylinders: integer().notNull(),
    action: text().$type<Action>().notNull(),
    speedRpm: doublePrecision().notNull(),
    cutOffPercent: doublePrecision().notNull(),
    pressurePa: doublePrecision().notNull(),
    keptAt: timestamp({ withTimezone: true, mode: 'date' }).notNull(),
  },
  (table) => [index().on(table.ownerId, table.keptAt)],
);
