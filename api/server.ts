import { minutesMs } from '#shared/time.ts';
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

const reconcileMs = 10 * minutesMs;

/** Promises a reconciliation of the money now and every ten minutes: by a timer, so that one that fails breaks no chain. */
async function reconcileEvery(deps: Deps): Promise<() => void> {
  const promise = () => deps.queue.enqueue({ db: deps.database.db }, 'reconcile-payments', {});
  await promise();
  const timer = setInterval(() => {
    promise().catch((error: unknown) => {
      deps.log.error({ error: String(error) }, 'reconciliation not promised');
    });
  }, reconcileMs);
  return () => {
    clearInterval(timer);
  };
}

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
    const stopReconciling = await reconcileEvery(deps);
    const close = async () => {
      stopReconciling();
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
