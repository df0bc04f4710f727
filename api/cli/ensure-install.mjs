/**
 * Runs before anything is installed, so it is plain JavaScript for a bare Node: installs the packages of the lock
 * file when they are not there or the lock file has changed since, and does nothing otherwise.
 */
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

const root = path.resolve(import.meta.dirname, '../..');
const mark = path.join(root, 'node_modules/.tubeplate-lock');
const wanted = createHash('sha256')
  .update(readFileSync(path.join(root, 'package-lock.json')))
  .digest('hex');

if (!existsSync(mark) || readFileSync(mark, 'utf8') !== wanted) {
  process.stdout.write('Installing packages (once)…\n');
  const run = spawnSync('npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error'], {
    cwd: root,
    stdio: 'inherit',
  });
  if (run.status !== 0) {
    process.stderr.write(
      'The packages could not be installed. Check the network and run the command again.\n',
    );
    process.exit(run.status ?? 1);
  }
  writeFileSync(mark, wanted);
}
