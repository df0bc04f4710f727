import { execFileSync, spawn } from 'node:child_process';
import { chownSync, existsSync, mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import pg from 'pg';
import { vi } from 'vitest';
import { fromPostgres } from '#api/db/client.ts';
import type { Database } from '#api/db/client.ts';

const roots = ['/usr/lib/postgresql', '/opt/homebrew/opt', '/usr/pgsql'];

/** Where this machine keeps PostgreSQL's programs, if it has them. */
function findBin(): string | undefined {
  const candidates = roots
    .filter((root) => existsSync(root))
    .flatMap((root) => readdirSync(root).map((version) => path.join(root, version, 'bin')));
  return candidates.find((bin) => existsSync(path.join(bin, 'initdb')));
}

const bin = findBin();
export const hasPostgres = bin !== undefined;

/** The server refuses to run as root, so root runs it as the account its package made. */
function owner(): { uid?: number; gid?: number } {
  if (process.getuid?.() !== 0) return {};
  const line = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((entry) => entry.startsWith('postgres:'));
  const [, , uid, gid] = line?.split(':') ?? [];
  return { uid: Number(uid), gid: Number(gid) };
}

const freePort = (): Promise<number> =>
  new Promise((resolve) => {
    const server = createServer().listen(0, '127.0.0.1', () => {
      const { port } = server.address() as AddressInfo;
      server.close(() => {
        resolve(port);
      });
    });
  });

/** A PostgreSQL server of its own on loopback, empty and migrated; gone when closed. */
export async function startPostgres(): Promise<Database> {
  if (bin === undefined) throw new Error('This machine has no PostgreSQL');
  const account = owner();
  const folder = mkdtempSync(path.join(tmpdir(), 'tubeplate-postgres-'));
  if (account.uid !== undefined && account.gid !== undefined) chownSync(folder, account.uid, account.gid);
  const data = path.join(folder, 'data');
  const initdb = ['-D', data, '-U', 'tubeplate', '-A', 'trust', '-E', 'UTF8', '--no-sync', '--locale=C'];
  execFileSync(path.join(bin, 'initdb'), initdb, { ...account, stdio: 'ignore', cwd: folder });
  const port = await freePort();
  const server = spawn(
    path.join(bin, 'postgres'),
    ['-D', data, '-p', String(port), '-h', '127.0.0.1', '-k', folder, '-c', 'fsync=off'],
    { ...account, stdio: 'ignore', cwd: folder },
  );
  const hasEnded = new Promise<void>((resolve) => {
    server.once('exit', () => {
      resolve();
    });
  });
  const url = `postgresql://tubeplate@127.0.0.1:${String(port)}/postgres`;
  await vi.waitFor(
    async () => {
      const client = new pg.Client({ connectionString: url });
      await client.connect();
      await client.end();
    },
    { timeout: 30_000, interval: 100 },
  );
  const database = fromPostgres(url);
  await database.migrate();
  return {
    ...database,
    close: async () => {
      await database.close();
      server.kill('SIGTERM');
      await hasEnded;
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
