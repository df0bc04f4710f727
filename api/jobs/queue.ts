import { sql } from 'drizzle-orm';
import PgBoss from 'pg-boss';
import type { Instant } from '#shared/time.ts';
import type { Log } from '../log.ts';
import type { Database, Db } from '../db/client.ts';
import type { Job, JobKind, Jobs } from './jobs.ts';

const queueName = 'work';
const failedName = 'failed-work';
/** Long enough that a clock set before a long stop still strikes. */
const keepDays = 400;

export interface Queue {
  /** Promises a job in the caller's own transaction: it exists if and only if the transaction commits. */
  enqueue: <K extends JobKind>(ctx: { db: Db }, kind: K, data: Jobs[K], runAt?: Instant) => Promise<void>;
  /** Runs jobs as they fall due, until `stop`. */
  work: (handle: (job: Job) => Promise<void>) => Promise<void>;
  /** Runs what is due now, once each, until nothing is left. For tests and the seed. */
  drain: (handle: (job: Job) => Promise<void>) => Promise<number>;
  listFailed: () => Promise<{ id: string; kind: string; error: string; at: string }[]>;
  stop: () => Promise<void>;
}

/** Lets the queue speak over a drizzle transaction, so that a promise is kept or forgotten with it. */
const through = (db: Db) => ({
  executeSql: async (text: string, values: unknown[] = []) => {
    const parts = text.split(/\$(\d+)/);
    const chunks = parts.map((part, index) =>
      index % 2 === 0 ? sql.raw(part) : sql`${sql.param(values[Number(part) - 1] ?? null)}`,
    );
    // Both drivers answer with rows; the type they share says nothing of them.
    const result: unknown = await db.execute(sql.join(chunks));
    return result as { rows: Record<string, unknown>[] };
  },
});

/** Starts the durable queue on either driver; it makes its own tables in a schema of its own. */
export async function startQueue(database: Database, log: Log, pollSeconds = 0.5): Promise<Queue> {
  const boss = new PgBoss({
    db: { executeSql: (text: string, values?: unknown[]) => database.raw.query(text, values) },
    supervise: true,
    schedule: false,
    maintenanceIntervalSeconds: 300,
  });
  boss.on('error', (error) => {
    log.error({ error: error.message }, 'queue');
  });
  await boss.start();
  const limits = {
    retryLimit: 8,
    retryDelay: 2,
    retryBackoff: true,
    expireInSeconds: 120,
    retentionDays: keepDays,
  };
  await boss.createQueue(failedName, { name: failedName, retentionDays: keepDays });
  await boss.createQueue(queueName, { name: queueName, ...limits, deadLetter: failedName });

  const run = async (handle: (job: Job) => Promise<void>, { id, data }: PgBoss.Job<Job>) => {
    try {
      await handle(data);
    } catch (error) {
      log.warn(
        { job: id, kind: data.kind, error: error instanceof Error ? error.message : String(error) },
        'job failed',
      );
      throw error;
    }
  };

  return {
    enqueue: async ({ db }, kind, data, runAt) => {
      await boss.send(
        queueName,
        { kind, data },
        { db: through(db), ...(runAt ? { startAfter: runAt } : {}) },
      );
    },
    work: async (handle) => {
      await boss.work<Job>(
        queueName,
        { pollingIntervalSeconds: pollSeconds, batchSize: 1 },
        async ([job]) => {
          if (job) await run(handle, job);
        },
      );
    },
    drain: async (handle) => {
      for (let count = 0; ; count += 1) {
        const [job] = await boss.fetch<Job>(queueName, { batchSize: 1 });
        if (!job) return count;
        try {
          await run(handle, job);
          await boss.complete(queueName, job.id);
        } catch (error) {
          await boss.fail(queueName, job.id, {
            message: error instanceof Error ? error.message : String(error),
          });
          throw error;
        }
      }
    },
    listFailed: async () => {
      const { rows } = await database.raw.query(
        `select id, data->>'kind' as kind, coalesce(output->>'message', '') as error, created_on as at
         from pgboss.job where name = $1 order by created_on desc limit 100`,
        [failedName],
      );
      return rows.map((row) => ({
        id: String(row['id']),
        kind: String(row['kind']),
        error: String(row['error']),
        at: row['at'] instanceof Date ? row['at'].toISOString() : String(row['at']),
      }));
    },
    stop: () => boss.stop({ graceful: true, wait: true, close: false, timeout: 5_000 }),
  };
}
