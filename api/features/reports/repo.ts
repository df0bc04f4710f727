import { and, asc, desc, eq, notExists } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { OrderStatus } from '#shared/survey-orders/machine.ts';
import type { ExtraId } from '#shared/surveys/scopes.ts';
import type { Instant } from '#shared/time.ts';
import type { Db } from '../../db/client.ts';
import { listings, reports, surveyOrders, surveyors, user } from '../../db/schema/index.ts';
import type { Filed } from './digest.ts';

export interface StoredReport extends Filed {
  id: string;
  order: { id: string; status: OrderStatus; buyerId: string; sellerId: string };
  listing: { id: string; slug: string; title: string };
  surveyor: { id: string; name: string; number: string };
  filedAt: Instant;
  digest: string;
  checkCode: string;
  version: number;
}

export interface NewReport extends Filed {
  orderId: string;
  listingId: string;
  surveyorId: string;
  filedAt: Instant;
  digest: string;
  checkCode: string;
}

export async function insertReport(db: Db, { correction, ...report }: NewReport): Promise<string> {
  const [row] = await db
    .insert(reports)
    .values({
      ...report,
      extras: [...report.extras],
      filedAt: new Date(report.filedAt),
      version: correction?.version ?? 1,
      correctsReportId: correction?.correctsReportId ?? null,
      correctionReason: correction?.reason ?? null,
    })
    .returning({ id: reports.id });
  if (!row) throw new Error('The report was not stored');
  return row.id;
}

const find = (db: Db) =>
  db
    .select({
      report: reports,
      order: {
        id: surveyOrders.id,
        status: surveyOrders.status,
        buyerId: surveyOrders.buyerId,
        sellerId: surveyOrders.sellerId,
      },
      listing: { id: listings.id, slug: listings.slug, draft: listings.draft },
      surveyorName: user.name,
      surveyorNumber: surveyors.number,
    })
    .from(reports)
    .innerJoin(surveyOrders, eq(surveyOrders.id, reports.orderId))
    .innerJoin(listings, eq(listings.id, reports.listingId))
    .innerJoin(user, eq(user.id, reports.surveyorId))
    .leftJoin(surveyors, eq(surveyors.userId, reports.surveyorId));

type Row = Awaited<ReturnType<typeof find>>[number];

const fromRow = ({ report, order, listing, surveyorName, surveyorNumber }: Row): StoredReport => ({
  id: report.id,
  order,
  listing: { id: listing.id, slug: listing.slug, title: listing.draft.title },
  surveyor: {
    id: report.surveyorId,
    name: surveyorName,
    number: surveyorNumber === null ? '' : String(surveyorNumber).padStart(3, '0'),
  },
  scope: report.scope,
  extras: report.extras as ExtraId[],
  facts: report.facts,
  record: report.record,
  result: report.result,
  signOff: report.signOff,
  rubricVersion: report.rubricVersion,
  filedAt: report.filedAt.toISOString(),
  digest: report.digest,
  checkCode: report.checkCode,
  version: report.version,
  correction:
    report.correctsReportId === null && report.correctionReason === null && report.version === 1
      ? undefined
      : {
          correctsReportId: report.correctsReportId ?? '',
          version: report.version,
          reason: report.correctionReason ?? '',
        },
});

export async function findReportIdOfOrder(db: Db, orderId: string): Promise<string | undefined> {
  const [row] = await db
    .select({ id: reports.id })
    .from(reports)
    .where(eq(reports.orderId, orderId))
    .orderBy(desc(reports.version))
    .limit(1);
  return row?.id;
}

/** Every version of the report of an order, oldest first. */
export async function listVersionsOfOrder(db: Db, orderId: string): Promise<StoredReport[]> {
  const rows = await find(db).where(eq(reports.orderId, orderId)).orderBy(asc(reports.version));
  return rows.map(fromRow);
}

export async function findReport(db: Db, id: string): Promise<StoredReport | undefined> {
  const [row] = await find(db).where(eq(reports.id, id));
  return row && fromRow(row);
}

export async function findReportByCode(db: Db, checkCode: string): Promise<StoredReport | undefined> {
  const [row] = await find(db).where(eq(reports.checkCode, checkCode));
  return row && fromRow(row);
}

/** The newest version of every report filed on a boiler, newest first. */
export async function listReportsOfListing(db: Db, listingId: string): Promise<StoredReport[]> {
  const newer = alias(reports, 'newer');
  const corrected = db.select({ id: newer.id }).from(newer).where(eq(newer.correctsReportId, reports.id));
  const rows = await find(db)
    .where(and(eq(reports.listingId, listingId), notExists(corrected)))
    .orderBy(desc(reports.filedAt), reports.id);
  return rows.map(fromRow);
}
