import { createApp } from './app.ts';
import { createLog, ctxFrom, openDeps } from './deps.ts';
import type { Deps } from './deps.ts';
import type { Env } from './env.ts';
import { handleJob } from './jobs/handlers.ts';

export interface RunningServer {
  url: string;
  deps: Deps;
  /** Stops taking requests, finishes those under way, and closes the database. */
  close: () => Promise<void>;
}

/** Seconds that requests under way have to finish after a stop is asked for. */
const drainMs = 10_000;

/** Opens everything and listens; jobs start when the address is open. */
export async function startServer(env: Env, prepare?: (deps: Deps) => Promise<void>): Promise<RunningServer> {
  const log = createLog(env.LOG_LEVEL);
  const { deps, close: closeDeps } = await openDeps(env, log);
  try {
    await prepare?.(deps);
    const server = createApp(deps).listen(env.PORT, env.HOST);
    await new Promise<void>((resolve, reject) => {
      server.once('listening', resolve);
      server.once('error', reject);
    });
    await deps.queue.work((job) => handleJob(ctxFrom(deps), job));
    const close = async () => {
      const forced = setTimeout(() => {
        server.closeAllConnections();
      }, drainMs);
      await new Promise((resolve) => {
        server.close(resolve);
        server.closeIdleConnections();
      });
      clearTimeout(forced);
      await closeDeps();
    };
    return { url: env.publicUrl, deps, close };
  } catch (error) {
    await closeDeps();
    throw error;
  }
}
