import { createLog, openDeps } from '../deps.ts';
import { readEnv } from '../env.ts';
import { seedIfEmpty } from '../seed/demo.ts';

const { deps, close } = await openDeps(readEnv(process.env), createLog('warn'));
try {
  await seedIfEmpty(deps, (line) => process.stdout.write(`${line}\n`));
} finally {
  await close();
}
