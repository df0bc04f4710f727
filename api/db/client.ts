import { chmodSync, mkdirSync } from 'node:fs';
import path from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import { drizzle as drizzleNode } from 'drizzle-orm/node-postgres';
import { migrate as migrateNode } from 'drizzle-orm/node-postgres/migrator';
import type { PgDatabase, PgQueryResultHKT } from 'drizzle-orm/pg-core';
import { drizzle as drizzlePglite } from 'drizzle-orm/pglite';
import { migrate as migratePglite } from 'drizzle-orm/pglite/migrator';
import pg from 'pg';
import * as schema from './schema/index.ts';
import { lockFolder } from './lock.ts';

export type Db = PgDatabase<PgQueryResultHKT, typeof schema>;

/** Plain SQL, for the job queue, which brings its own statements. */
export interface RawSql {
  query: (text: string, values?: unknown[]) => Promise<{ rows: Record<string, unknown>[] }>;
}

export interface Database {
  db: Db;
  raw: RawSql;
  kind: 'pglite' | 'postgres';
  migrate: () => Promise<void>;
  close: () => Promise<void>;
}

const migrationsFolder = path.join(import.meta.dirname, 'migrations');
const options = { schema, casing: 'snake_case' } as const;

function rawPglite(client: Pick<PGlite, 'query' | 'exec'>): RawSql {
  return {
    query: async (text, values) => {
      // Statements without values may come several at a time, which only exec takes.
      if (values && values.length > 0) return client.query<Record<string, unknown>>(text, values);
      const results = await client.exec(text);
      const last = results.findLast((result) => result.fields.length > 0) ?? results.at(-1);
      return { rows: last?.rows ?? [] };
    },
  };
}

/** Wraps an open PGlite; the caller owns its folder. */
export function fromPglite(client: PGlite, beforeClose?: () => Promise<void>): Database {
  const db = drizzlePglite({ client, ...options });
  return {
    db,
    raw: rawPglite(client),
    kind: 'pglite',
    migrate: () => migratePglite(db, { migrationsFolder }),
    close: async () => {
      await client.close();
      await beforeClose?.();
    },
  };
}

/** A server by its address. */
export function fromPostgres(url: string): Database {
  const pool = new pg.Pool({ connectionString: url, max: 10 });
  // A connection that breaks while idle is dropped and replaced; without a listener it would end the process.
  pool.on('error', () => undefined);
  const db = drizzleNode({ client: pool, ...options });
  return {
    db,
    raw: { query: async (text, values) => pool.query<Record<string, unknown>>(text, values) },
    kind: 'postgres',
    migrate: () => migrateNode(db, { migrationsFolder }),
    close: () => pool.end(),
  };
}

/**
 * Opens the database of a data folder, or the server named by a URL.
 * @throws Error if another process holds the folder: PGlite itself would let both in and lose rows.
 */
export async function openDatabase(dataDir: string, url?: string): Promise<Database> {
  if (url) return fromPostgres(url);
  const folder = path.join(dataDir, 'db');
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  chmodSync(dataDir, 0o700);
  const unlock = await lockFolder(dataDir);
  const client = await PGlite.create(folder);
  return fromPglite(client, unlock);
}

/** The database's own error code and constraint, however deep it is wrapped. */
export function databaseFault(error: unknown): { code: string; constraint: string } | undefined {
  for (let at: unknown = error; at instanceof Error; at = at.cause) {
    const { code, constraint } = at as Error & { code?: unknown; constraint?: unknown };
    if (typeof code === 'string' && /^[0-9A-Z]{5}$/.test(code)) {
      return { code, constraint: typeof constraint === 'string' ? constraint : '' };
    }
  }
  return undefined;
}
