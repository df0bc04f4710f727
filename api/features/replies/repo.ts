import { asc, inArray } from 'drizzle-orm';
import { randomUUID } from 'node:crypto';
import type { Repair } from '#shared/surveys/replies-contract.ts';
import type { Day, Instant } from '#shared/time.ts';
import type { Db } from '../../db/client.ts';
import { reportRepairs, reportReplies } from '../../db/schema/index.ts';

export interface StoredReply {
  reportId: string;
  criterionId: string;
  text: string;
  at: Instant;
}

export async function listReplies(db: Db, reportIds: readonly string[]): Promise<StoredReply[]> {
  const rows = await db
    .select()
    .from(reportReplies)
    .where(inArray(reportReplies.reportId, [...reportIds]));
  return rows.map(({ reportId, criterionId, text, at }) => ({
    reportId,
    criterionId,
    text,
    at: at.toISOString(),
  }));
}

/** @returns false if the finding has been answered already. */
export async function insertReply(db: Db, { at, ...reply }: StoredReply): Promise<boolean> {
  const rows = await db
    .insert(reportReplies)
    .values({ id: randomUUID(), ...reply, at: new Date(at) })
    .onConflictDoNothing()
    .returning({ id: reportReplies.id });
  return rows.length > 0;
}

export async function listRepairs(db: Db, reportIds: readonly string[]): Promise<Repair[]> {
  const rows = await db
    .select()
    .from(reportRepairs)
    .where(inArray(reportRepairs.reportId, [...reportIds]))
    .orderBy(asc(reportRepairs.doneOn), asc(reportRepairs.at));
  return rows.map(({ id, text, doneOn, at }) => ({ id, text, doneOn, at: at.toISOString() }));
}

interface NewRepair {
  reportId: string;
  text: string;
  doneOn: Day;
  at: Instant;
}

export async function insertRepair(db: Db, { at, ...repair }: NewRepair): Promise<void> {
  await db.insert(reportRepairs).values({ id: randomUUID(), ...repair, at: new Date(at) });
}
