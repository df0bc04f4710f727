import { createHash } from 'node:crypto';
import { rmSync } from 'node:fs';
import { createConnection, createServer } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';

/** Where the lock of a data folder listens. A socket's path is limited to about 100 bytes, so a deep folder's lock lives elsewhere. */
function socketPath(folder: string): string {
  const inside = path.join(folder, 'owner.sock');
  if (Buffer.byteLength(inside) < 100) return inside;
  const name = createHash('sha256').update(path.resolve(folder)).digest('hex').slice(0, 24);
  return path.join(tmpdir(), `tubeplate-${name}.sock`);
}

const answers = (socket: string): Promise<boolean> =>
  new Promise((resolve) => {
    const probe = createConnection(socket);
    probe.once('connect', () => {
      probe.destroy();
      resolve(true);
    });
    probe.once('error', () => {
      resolve(false);
    });
  });

const listen = (socket: string): Promise<() => Promise<void>> =>
  new Promise((resolve, reject) => {
    const server = createServer((peer) => peer.end());
    server.once('error', reject);
    server.listen(socket, () => {
      server.unref();
      resolve(
        () =>
          new Promise((closed) => {
            server.close(() => {
              closed();
            });
          }),
      );
    });
  });

const isTaken = (error: unknown): boolean =>
  error instanceof Error && 'code' in error && error.code === 'EADDRINUSE';

/**
 * Holds a data folder for this process. A lock left by a process that died is taken over.
 * @returns lets the folder go.
 * @throws Error if a living process holds it.
 */
export async function lockFolder(folder: string): Promise<() => Promise<void>> {
  const socket = socketPath(folder);
  try {
    return await listen(socket);
  } catch (error) {
    if (!isTaken(error)) throw error;
  }
  if (await answers(socket)) {
    throw new Error(
      `The data folder ${folder} is in use by another Tubeplate. Stop that one first, or set DATA_DIR to another folder.`,
    );
  }
  rmSync(socket, { force: true });
  return listen(socket);
}
