import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

const root = path.resolve(import.meta.dirname, '../..');
const mark = path.join(root, 'dist/web/.made-from');
const sources = ['web', 'shared', 'vite.config.ts', 'package-lock.json'];

function filesBelow(entry: string): string[] {
  const full = path.join(root, entry);
  if (path.extname(entry) !== '') return [full];
  return readdirSync(full, { recursive: true, withFileTypes: true })
    .filter((item) => item.isFile())
    .map((item) => path.join(item.parentPath, item.name));
}

function sourceHash(): string {
  const hash = createHash('sha256');
  for (const file of sources.flatMap(filesBelow).toSorted())
    hash.update(path.relative(root, file)).update(readFileSync(file));
  return hash.digest('hex');
}

/**
 * Builds the site for the browser unless what was built last still matches its sources.
 * @returns whether anything was built.
 */
export async function buildSite(): Promise<boolean> {
  const wanted = sourceHash();
  if (existsSync(mark) && readFileSync(mark, 'utf8') === wanted) return false;
  await new Promise<void>((resolve, reject) => {
    const vite = spawn(
      process.execPath,
      [path.join(root, 'node_modules/vite/bin/vite.js'), 'build', '--logLevel', 'warn'],
      {
        cwd: root,
        stdio: ['ignore', 'inherit', 'inherit'],
      },
    );
    vite.once('error', reject);
    vite.once('exit', (code) => {
      if (code === 0) resolve();
      else reject(new Error(`The site could not be built (vite ended with ${String(code)}).`));
    });
  });
  writeFileSync(mark, wanted);
  return true;
}
