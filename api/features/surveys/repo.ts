import { and, desc, eq, isNotNull, isNull, notExists, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import type { ListingDraft } from '#shared/listings/draft.ts';
import type { ReportSummary } from '#shared/listings/contract.ts';
import type { OrderStatus } from '#shared/survey-orders/machine.ts';
import type { SurveyRecord } from '#shared/surveys/record.ts';
import type { ExtraId, ScopeId } from '#shared/surveys/scopes.ts';
import type { Instant } from '#shared/time.ts';
import type { Db } from '../../db/client.ts';
import { listings, reports, surveyOrders, surveys } from '../../db/schema/index.ts';

/** A survey with what its order says of it. */
export interface StoredSurvey {
  orderId: string;
  orderStatus: OrderStatus;
  listing: { id: string; slug: string; title: string };
  buyerId: string;
  sellerId: string;
  surveyorId: string;
  scope: ScopeId;
  extras: ExtraId[];
  facts: BoilerFacts;
  record: SurveyRecord;
  version: number;
  savedAt: Instant;
  isFiled: boolean;
  /** The newest version of the report. */
  reportId: string | null;
  correction: { reportId: string; version: number; reason: string } | null;
}

export async function findSurvey(db: Db, orderId: string): Promise<StoredSurvey | undefined> {
  const [row] = await db
    .select({
      survey: surveys,
      order: surveyOrders,
      listing: listings,
      report: { id: reports.id, version: reports.version },
    })
    .from(surveys)
    .innerJoin(surveyOrders, eq(surveyOrders.id, surveys.orderId))
    .innerJoin(listings, eq(listings.id, surveyOrders.listingId))
    .leftJoin(reports, eq(reports.orderId, surveys.orderId))
    .where(eq(surveys.orderId, orderId))
    .orderBy(desc(reports.version))
    .limit(1);
  if (!row) return undefined;
  const { survey, order, listing, report } = row;
  return {
    orderId: survey.orderId,
    orderStatus: order.status,
    listing: { id: listing.id, slug: listing.slug, title: listing.draft.title },
    buyerId: order.buyerId,
    sellerId: order.sellerId,
    surveyorId: order.surveyorId,
    scope: order.scope,
    extras: order.extras as ExtraId[],
    facts: survey.facts,
    record: survey.record,
    version: survey.version,
    savedAt: survey.savedAt.toISOString(),
    isFiled: survey.filedAt !== null,
    reportId: report?.id ?? null,
    correction:
      survey.correctsReportId === null || report === null
        ? null
        : {
            reportId: survey.correctsReportId,
            version: report.version,
            reason: survey.correctionReason ?? '',
          },
  };
}

export async function findListedFacts(db: Db, listingId: string): Promise<ListingDraft['facts'] | undefined> {
  const [row] = await db.select({ draft: listings.draft }).from(listings).where(eq(listings.id, listingId));
  return row?.draft.facts;
}

interface NewSurvey {
  orderId: string;
  facts: BoilerFacts;
  record: SurveyRecord;
  at: Instant;
}

export async function insertSurvey(db: Db, { orderId, facts, record, at }: NewSurvey): Promise<void> {
  await db.insert(surveys).values({ orderId, facts, record, savedAt: new Date(at) });
}

interface Save {
  orderId: string;
  /** The version that was read; another one stored means somebody else saved. */
  version: number;
  record: SurveyRecord;
  at: Instant;
}

/** @returns false if the version had moved on, or the survey was filed. */
export async function updateRecord(db: Db, { orderId, version, record, at }: Save): Promise<boolean> {
  const rows = await db
    .update(surveys)
    .set({ record, version: version + 1, savedAt: new Date(at) })
    .where(and(eq(surveys.orderId, orderId), eq(surveys.version, version), isNull(surveys.filedAt)))
    .returning({ orderId: surveys.orderId });
  return rows.length > 0;
}

/** @returns false if the version had moved on, or the survey was filed already. */
export async function updateFiled(db: Db, { orderId, version, at }: Omit<Save, 'record'>): Promise<boolean> {
  const rows = await db
    .update(surveys)
    .set({ filedAt: new Date(at), correctsReportId: null, correctionReason: null })
    .where(and(eq(surveys.orderId, orderId), eq(surveys.version, version), isNull(surveys.filedAt)))
    .returning({ orderId: surveys.orderId });
  return rows.length > 0;
}

interface Reopening {
  orderId: string;
  reportId: string;
  reason: string;
  /** A copy of what was filed. */
  record: SurveyRecord;
  at: Instant;
}

/** @returns false if the survey is open already. */
export async function updateReopened(
  db: Db,
  { orderId, reportId, reason, record, at }: Reopening,
): Promise<boolean> {
  const rows = await db
    .update(surveys)
    .set({
      record,
      filedAt: null,
      savedAt: new Date(at),
      version: sql`${surveys.version} + 1`,
      correctsReportId: reportId,
      correctionReason: reason,
    })
    .where(and(eq(surveys.orderId, orderId), isNotNull(surveys.filedAt)))
    .returning({ orderId: surveys.orderId });
  return rows.length > 0;
}

/** Puts back what was filed and when. @returns false if no correction is open. */
export async function updateClosedAgain(
  db: Db,
  { orderId, record, at }: Pick<Reopening, 'orderId' | 'record' | 'at'>,
): Promise<boolean> {
  const rows = await db
    .update(surveys)
    .set({
      record,
      filedAt: new Date(at),
      version: sql`${surveys.version} + 1`,
      correctsReportId: null,
      correctionReason: null,
    })
    .where(and(eq(surveys.orderId, orderId), isNull(surveys.filedAt), isNotNull(surveys.correctsReportId)))
    .returning({ orderId: surveys.orderId });
  return rows.length > 0;
}

/** The photographs that some filed version of an order's report names. */
export async function listFiledPhotoIds(db: Db, orderId: string): Promise<Set<string>> {
  const rows = await db.select({ record: reports.record }).from(reports).where(eq(reports.orderId, orderId));
  return new Set(rows.flatMap(({ record }) => record.findings.flatMap(({ photoIds }) => photoIds)));
}

const summaryColumns = {
  id: reports.id,
  version: reports.version,
  filedAt: reports.filedAt,
  record: reports.record,
  scope: reports.scope,
  result: reports.result,
};

const toSummary = (row: Pick<typeof reports.$inferSelect, keyof typeof summaryColumns>): ReportSummary => ({
  reportId: row.id,
  filedAt: row.filedAt.toISOString(),
  examinedOn: row.record.examinedOn ?? row.filedAt.toISOString().slice(0, 10),
  scope: row.scope,
  verdict: row.result.verdict.id,
  condition: row.result.condition,
  evidence: row.result.evidence,
  version: row.version,
});

/** The newest version of each report, the last surveyed first: a correction does not make an old survey new. */
export async function listSummaries(db: Db, listingId: string): Promise<ReportSummary[]> {
  const newer = alias(reports, 'newer');
  const first = alias(reports, 'first');
  const rows = await db
    .select(summaryColumns)
    .from(reports)
    .innerJoin(first, and(eq(first.orderId, reports.orderId), eq(first.version, 1)))
    .where(
      and(
        eq(reports.listingId, listingId),
        notExists(db.select({ id: newer.id }).from(newer).where(eq(newer.correctsReportId, reports.id))),
      ),
    )
    .orderBy(desc(first.filedAt));
  return rows.map(toSummary);
}

export async function findSummaryOfOrder(db: Db, orderId: string): Promise<ReportSummary | undefined> {
  const [row] = await db
    .select(summaryColumns)
    .from(reports)
    .where(eq(reports.orderId, orderId))
    .orderBy(desc(reports.version))
    .limit(1);
  return row && toSummary(row);
}
