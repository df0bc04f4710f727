import {
  bigint,
  check,
  index,
  integer,
  pgTable,
  text,
  timestamp,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import { sql } from 'drizzle-orm';
import type { PaymentEvent, PaymentStatus } from '#shared/payments/machine.ts';
import { surveyOrders } from './survey-orders.ts';

const at = () => timestamp({ withTimezone: true, mode: 'date' });

export const payments = pgTable(
  'payments',
  {
    id: uuid().primaryKey().defaultRandom(),
    orderId: uuid()
      .notNull()
      .references(() => surveyOrders.id),
    status: text().$type<PaymentStatus>().notNull().default('awaiting-card'),
    amountMinor: integer().notNull(),
    currency: text().notNull(),
    checkoutId: text(),
    checkoutUrl: text(),
    paymentIntentId: text(),
    chargeId: text(),
    transferId: text(),
    refundId: text(),
    createdAt: at().notNull(),
    movedAt: at().notNull(),
  },
  (table) => [
    uniqueIndex('payments_order').on(table.orderId),
    index('payments_checkout').on(table.checkoutId),
    index('payments_status').on(table.status, table.movedAt),
    check('payments_amount', sql`${table.amountMinor} > 0`),
  ],
);

export const paymentMoves = pgTable('payment_moves', {
  id: bigint({ mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
  paymentId: uuid()
    .notNull()
    .references(() => payments.id),
  event: text().$type<PaymentEvent>().notNull(),
  from: text().$type<PaymentStatus>().notNull(),
  to: text().$type<PaymentStatus>().notNull(),
  reason: text().notNull().default(''),
  at: at().notNull(),
});

/** Notices of the payment service: stored before they are acted on, each id once. */
export const paymentNotices = pgTable('payment_notices', {
  id: text().primaryKey(),
  kind: text().notNull(),
  receivedAt: at().notNull(),
  handledAt: at(),
  outcome: text(),
});

/** Double entry, append-only. Custom migration SQL refuses an unbalanced posting, an update and a deletion. */
export const ledgerPostings = pgTable(
  'ledger_postings',
  {
    id: bigint({ mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
    key: text().notNull(),
    what: text().notNull(),
    orderId: uuid()
      .notNull()
      .references(() => surveyOrders.id),
    at: at().notNull(),
  },
  (table) => [
    uniqueIndex('ledger_postings_key').on(table.key),
    index('ledger_postings_order').on(table.orderId),
  ],
);

export const ledgerLines = pgTable(
  'ledger_lines',
  {
    id: bigint({ mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
    postingId: bigint({ mode: 'number' })
      .notNull()
      .references(() => ledgerPostings.id),
    account: text().notNull(),
    amountMinor: bigint({ mode: 'number' }).notNull(),
    currency: text().notNull(),
  },
  (table) => [
    index('ledger_lines_account').on(table.account),
    index('ledger_lines_posting').on(table.postingId),
  ],
);
