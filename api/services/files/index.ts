import { createReadStream, mkdirSync } from 'node:fs';
import { mkdir, readFile, rename, rm, stat, writeFile } from 'node:fs/promises';
import path from 'node:path';
import type { Readable } from 'node:stream';

/** Private storage of pictures and documents by key. Nothing in it is served but through a route that asks who you are. */
export interface FileStore {
  /** Stores the whole of it or nothing. */
  put: (key: string, content: Buffer) => Promise<void>;
  read: (key: string) => Promise<Buffer>;
  /** @returns undefined if there is no such key. */
  open: (key: string) => Promise<{ bytes: number; stream: Readable } | undefined>;
  remove: (key: string) => Promise<void>;
}

const isMissing = (error: unknown): boolean =>
  error instanceof Error && 'code' in error && error.code === 'ENOENT';

/** Storage on the local disk, below one folder that only this user may read. */
export function createDiskFiles(folder: string): FileStore {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const at = (key: string): string => {
    if (!/^[\w-]+(\/[\w.-]+)*$/.test(key) || key.includes('..'))
      throw new RangeError(`Not a storage key: ${key}`);
    return path.join(folder, key);
  };
  return {
    put: async (key, content) => {
      const file = at(key);
      await mkdir(path.dirname(file), { recursive: true, mode: 0o700 });
      await writeFile(`${file}.part`, content, { mode: 0o600 });
      await rename(`${file}.part`, file);
    },
    read: (key) => readFile(at(key)),
    open: async (key) => {
      try {
        const { size } = await stat(at(key));
        return { bytes: size, stream: createReadStream(at(key)) };
      } catch (error) {
        if (isMissing(error)) return undefined;
        throw error;
      }
    },
    remove: (key) => rm(at(key), { force: true }),
  };
}
