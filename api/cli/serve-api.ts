/** The API alone, for `npm run dev`: Vite serves the site. */
import { readEnv } from '../env.ts';
import { seedIfEmpty } from '../seed/demo.ts';
import { startServer } from '../server.ts';

const say = (line: string) => process.stdout.write(`${line}\n`);
const env = readEnv(process.env);
const server = await startServer(env, (deps) => seedIfEmpty(deps, say));
say(`API on http://localhost:${String(env.PORT)}`);
const stop = () => void server.close().then(() => process.exit(0));
process.once('SIGTERM', stop);
process.once('SIGINT', stop);
