import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import { fromPglite } from '#api/db/client.ts';
import type { Database } from '#api/db/client.ts';
import { startQueue } from '#api/jobs/queue.ts';
import { silentLog } from './log.ts';

const folder = path.resolve('node_modules/.cache/tubeplate');
const migrations = path.resolve('api/db/migrations');

/** The template's file; its name follows the migrations, so a changed one is never mistaken for the old. */
function templateFile(): string {
  const hash = createHash('sha256');
  for (const name of readdirSync(migrations)
    .filter((file) => file.endsWith('.sql'))
    .toSorted()) {
    hash.update(readFileSync(path.join(migrations, name)));
  }
  return path.join(folder, `template-${hash.digest('hex').slice(0, 16)}.tar`);
}

/** Makes a migrated database once for a run of the tests; each test file then opens a copy, which takes under a second. */
export async function makeTemplate(): Promise<void> {
  const file = templateFile();
  if (existsSync(file)) return;
  rmSync(folder, { recursive: true, force: true });
  mkdirSync(folder, { recursive: true });
  const client = await PGlite.create('memory://');
  const database = fromPglite(client);
  await database.migrate();
  const queue = await startQueue(database, silentLog);
  await queue.stop();
  const dump = await client.dumpDataDir('none');
  writeFileSync(file, Buffer.from(await dump.arrayBuffer()));
  await database.close();
}

/** A fresh migrated database in memory. */
export async function openTemplate(): Promise<Database> {
  const client = await PGlite.create('memory://', { loadDataDir: new Blob([readFileSync(templateFile())]) });
  return fromPglite(client);
}
