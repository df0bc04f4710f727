import { existsSync, rmSync } from 'node:fs';
import path from 'node:path';
import { lockFolder } from '../db/lock.ts';
import { readEnv } from '../env.ts';

const env = readEnv(process.env);
if (env.DATABASE_URL) {
  process.stderr.write(
    'This empties only the embedded database. A PostgreSQL server is emptied with its own tools.\n',
  );
  process.exit(1);
}
if (!existsSync(path.join(env.DATA_DIR, 'db'))) {
  process.stdout.write(`${env.DATA_DIR} holds no database.\n`);
  process.exit(0);
}
const unlock = await lockFolder(env.DATA_DIR);
await unlock();
for (const part of ['db', 'files', 'uploads', 'fakes'])
  rmSync(path.join(env.DATA_DIR, part), { recursive: true, force: true });
process.stdout.write(`Emptied ${env.DATA_DIR}. The next start seeds it again.\n`);
