import { bigint, boolean, integer, pgTable, text, timestamp } from 'drizzle-orm/pg-core';

/** Tables that better-auth reads and writes; their names and columns are its own. */
const at = () => timestamp({ withTimezone: true, mode: 'date' });

export const user = pgTable('user', {
  id: text().primaryKey(),
  name: text().notNull(),
  email: text().notNull().unique(),
  emailVerified: boolean().notNull().default(false),
  image: text(),
  createdAt: at().notNull().defaultNow(),
  updatedAt: at().notNull().defaultNow(),
  twoFactorEnabled: boolean().default(false),
  units: text().notNull().default('imperial'),
});

const userId = () =>
  text()
    .notNull()
    .references(() => user.id, { onDelete: 'cascade' });

export const session = pgTable('session', {
  id: text().primaryKey(),
  expiresAt: at().notNull(),
  token: text().notNull().unique(),
  createdAt: at().notNull().defaultNow(),
  updatedAt: at().notNull().defaultNow(),
  ipAddress: text(),
  userAgent: text(),
  userId: userId(),
  /** Demonstration only: this session may use the office without a second factor. */
  enrolmentSkipped: boolean().notNull().default(false),
});

export const account = pgTable('account', {
  id: text().primaryKey(),
  accountId: text().notNull(),
  providerId: text().notNull(),
  userId: userId(),
  accessToken: text(),
  refreshToken: text(),
  idToken: text(),
  accessTokenExpiresAt: at(),
  refreshTokenExpiresAt: at(),
  scope: text(),
  password: text(),
  createdAt: at().notNull().defaultNow(),
  updatedAt: at().notNull().defaultNow(),
});

export const verification = pgTable('verification', {
  id: text().primaryKey(),
  identifier: text().notNull(),
  value: text().notNull(),
  expiresAt: at().notNull(),
  createdAt: at().notNull().defaultNow(),
  updatedAt: at().notNull().defaultNow(),
});

export const twoFactor = pgTable('two_factor', {
  id: text().primaryKey(),
  secret: text().notNull(),
  backupCodes: text().notNull(),
  userId: userId(),
  verified: boolean().default(true),
  failedVerificationCount: integer().default(0),
  lockedUntil: at(),
});

export const rateLimit = pgTable('rate_limit', {
  id: text().primaryKey(),
  key: text().notNull().unique(),
  count: integer().notNull(),
  lastRequest: bigint({ mode: 'number' }).notNull(),
});
