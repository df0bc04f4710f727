import { and, asc, count, eq } from 'drizzle-orm';
import type { Engine } from '#shared/engines/contract.ts';
import type { EngineDraft } from '#shared/engines/engine.ts';
import type { Instant } from '#shared/time.ts';
import type { Db } from '../../db/client.ts';
import { engines, user } from '../../db/schema/index.ts';

const columns = {
  id: engines.id,
  name: engines.name,
  boreMm: engines.boreMm,
  strokeMm: engines.strokeMm,
  cylinders: engines.cylinders,
  action: engines.action,
  speedRpm: engines.speedRpm,
  cutOffPercent: engines.cutOffPercent,
  pressurePa: engines.pressurePa,
};

const own = (ownerId: string, id: string) => and(eq(engines.ownerId, ownerId), eq(engines.id, id));

export const listEngines = (db: Db, ownerId: string): Promise<Engine[]> =>
  db
    .select(columns)
    .from(engines)
    .where(eq(engines.ownerId, ownerId))
    .orderBy(asc(engines.keptAt), asc(engines.id));

/** How many a member keeps; holds their others off until the transaction ends, so that two at once are both counted. */
export async function countEngines(db: Db, ownerId: string): Promise<number> {
  await db.select({ id: user.id }).from(user).where(eq(user.id, ownerId)).for('update');
  const [row] = await db.select({ kept: count() }).from(engines).where(eq(engines.ownerId, ownerId));
  return row?.kept ?? 0;
}

export async function insertEngine(
  db: Db,
  { id, ownerId, at, draft }: { id: string; ownerId: string; at: Instant; draft: EngineDraft },
): Promise<Engine> {
  await db.insert(engines).values({ ...draft, id, ownerId, keptAt: new Date(at) });
  return { ...draft, id };
}

/** Undefined where the member keeps no such engine. */
export async function updateEngine(
  db: Db,
  ownerId: string,
  id: string,
  draft: EngineDraft,
): Promise<Engine | undefined> {
  const [row] = await db.update(engines).set(draft).where(own(ownerId, id)).returning(columns);
  return row;
}

/** Whether the member kept it. */
export async function deleteEngine(db: Db, ownerId: string, id: string): Promise<boolean> {
  const rows = await db.delete(engines).where(own(ownerId, id)).returning({ id: engines.id });
  return rows.length > 0;
}
