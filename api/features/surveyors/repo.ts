import { and, count, eq, gte, inArray, isNotNull, or } from 'drizzle-orm';
import type { MaterialId } from '#shared/boilers/boiler.ts';
import type { BoilerTypeId } from '#shared/boilers/boiler-types.ts';
import type { SurveyorTerms } from '#shared/surveyors/contract.ts';
import type { Instant } from '#shared/time.ts';
import type { Db } from '../../db/client.ts';
import { reports, surveyOrders, surveyors, user } from '../../db/schema/index.ts';

export interface StoredSurveyor {
  userId: string;
  name: string;
  /** Three digits. */
  number: string;
  terms: SurveyorTerms;
  payoutAccountId: string | null;
  payoutsReady: boolean;
}

const find = (db: Db) =>
  db
    .select({ row: surveyors, name: user.name })
    .from(surveyors)
    .innerJoin(user, eq(user.id, surveyors.userId));

const fromRow = ({ row, name }: Awaited<ReturnType<typeof find>>[number]): StoredSurveyor => ({
  userId: row.userId,
  name,
  number: String(row.number).padStart(3, '0'),
  terms: {
    townId: row.townId,
    rangeKm: row.rangeKm,
    types: row.types as BoilerTypeId[],
    materials: row.materials as MaterialId[],
    insuredUntilOn: row.insuredUntilOn,
    fees: row.fees,
    about: row.about,
    isTakingJobs: row.isTakingJobs,
  },
  payoutAccountId: row.payoutAccountId,
  payoutsReady: row.payoutsReady,
});

export async function findSurveyor(db: Db, userId: string): Promise<StoredSurveyor | undefined> {
  const [row] = await find(db).where(eq(surveyors.userId, userId));
  return row && fromRow(row);
}

export async function findSurveyorByAccount(db: Db, accountId: string): Promise<StoredSurveyor | undefined> {
  const [row] = await find(db).where(eq(surveyors.payoutAccountId, accountId));
  return row && fromRow(row);
}

export async function listSurveyors(db: Db): Promise<StoredSurveyor[]> {
  return (await find(db).orderBy(surveyors.number)).map(fromRow);
}

/** Those with an account at the payment service that cannot be paid to yet. */
export async function listUnready(db: Db): Promise<StoredSurveyor[]> {
  const rows = await find(db).where(
    and(isNotNull(surveyors.payoutAccountId), eq(surveyors.payoutsReady, false)),
  );
  return rows.map(fromRow);
}

export async function upsertTerms(db: Db, userId: string, terms: SurveyorTerms): Promise<void> {
  await db
    .insert(surveyors)
    .values({ userId, ...terms })
    .onConflictDoUpdate({ target: surveyors.userId, set: terms });
}

export async function updatePayoutAccount(db: Db, userId: string, payoutAccountId: string): Promise<void> {
  await db.update(surveyors).set({ payoutAccountId }).where(eq(surveyors.userId, userId));
}

export async function updatePayoutsReady(db: Db, accountId: string, payoutsReady: boolean): Promise<void> {
  await db.update(surveyors).set({ payoutsReady }).where(eq(surveyors.payoutAccountId, accountId));
}

export async function countReports(db: Db, userIds: readonly string[]): Promise<Map<string, number>> {
  if (userIds.length === 0) return new Map();
  const rows = await db
    .select({ userId: reports.surveyorId, filed: count() })
    .from(reports)
    .where(and(inArray(reports.surveyorId, [...userIds]), eq(reports.version, 1)))
    .groupBy(reports.surveyorId);
  return new Map(rows.map((row) => [row.userId, row.filed]));
}

/**
 * For each person who has bought or sold, those of the people named whom they faced across a sale since then. Having
 * surveyed for somebody before is no dealing: the fee came from the same side, and the method is the same.
 */
export async function listDealings(
  db: Db,
  people: readonly string[],
  since: Instant,
): Promise<Map<string, Set<string>>> {
  const rows = await db
    .select({ buyerId: surveyOrders.buyerId, sellerId: surveyOrders.sellerId })
    .from(surveyOrders)
    .where(
      and(
        gte(surveyOrders.placedAt, new Date(since)),
        or(inArray(surveyOrders.buyerId, [...people]), inArray(surveyOrders.sellerId, [...people])),
      ),
    );
  const dealings = new Map<string, Set<string>>();
  const note = (one: string, other: string) => dealings.set(one, (dealings.get(one) ?? new Set()).add(other));
  for (const { buyerId, sellerId } of rows) {
    note(buyerId, sellerId);
    note(sellerId, buyerId);
  }
  return dealings;
}
