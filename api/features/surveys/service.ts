import { boilerFacts } from '#shared/boilers/boiler.ts';
import type { ReportSummary } from '#shared/listings/contract.ts';
import { Problem } from '#shared/problem.ts';
import { emptyRecord } from '#shared/surveys/record.ts';
import type { SurveyRecord } from '#shared/surveys/record.ts';
import { rubricVersion } from '#shared/surveys/rubric/index.ts';
import { requireActor } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import * as repo from './repo.ts';
import type { StoredSurvey } from './repo.ts';

export type { StoredSurvey } from './repo.ts';

/** Opens the survey of an order whose examination begins: the seller's statement is copied as it stands now. */
export async function openSurvey(ctx: Ctx, order: { id: string; listingId: string }): Promise<void> {
  const facts = await repo.findListedFacts(ctx.db, order.listingId);
  if (!facts) throw new Problem('not-found');
  await repo.insertSurvey(ctx.db, {
    orderId: order.id,
    facts: boilerFacts.parse(facts),
    record: emptyRecord(rubricVersion),
    at: ctx.now(),
  });
}

/**
 * A survey as the person asking may read it: its surveyor and the office at any time, the parties once it is filed.
 * @throws Problem not-signed-in, not-found.
 */
export async function getStoredSurvey(ctx: Ctx, orderId: string): Promise<StoredSurvey> {
  const actor = requireActor(ctx);
  const found = await repo.findSurvey(ctx.db, orderId);
  if (!found) throw new Problem('not-found');
  const isParty = actor.id === found.buyerId || actor.id === found.sellerId;
  const mayRead = actor.id === found.surveyorId || actor.roles.has('office') || (isParty && found.isFiled);
  if (!mayRead) throw new Problem('not-found');
  return found;
}

/**
 * The survey that the person asking is making now.
 * @throws Problem not-signed-in, not-found unless it is theirs, wrong-state once it is filed or given up.
 */
export async function requireOpenSurvey(ctx: Ctx, orderId: string): Promise<StoredSurvey> {
  const actor = requireActor(ctx);
  const found = await repo.findSurvey(ctx.db, orderId);
  if (found?.surveyorId !== actor.id) throw new Problem('not-found');
  if (found.isFiled) throw new Problem('wrong-state', 'The report has been filed; it cannot be changed.');
  if (found.orderStatus !== 'examining')
    throw new Problem('wrong-state', 'This examination is not under way, so nothing can be recorded in it.');
  return found;
}

const stale = () =>
  new Problem(
    'stale-version',
    'This survey was saved from another device or tab after you opened it here. Load that version, or keep yours.',
  );

/** @throws Problem stale-version unless the survey is still the one that was read. */
export function requireVersion(survey: StoredSurvey, version: number): void {
  if (survey.version !== version) throw stale();
}

/** Stores a record that has been checked. @throws Problem stale-version. */
export async function storeRecord(ctx: Ctx, survey: StoredSurvey, record: SurveyRecord): Promise<void> {
  const { orderId, version } = survey;
  const isSaved = await repo.updateRecord(ctx.db, { orderId, version, record, at: ctx.now() });
  if (!isSaved) throw stale();
}

/** Closes a survey for good. @throws Problem stale-version if it changed since it was read. */
export async function closeSurvey(ctx: Ctx, survey: StoredSurvey): Promise<void> {
  const { orderId, version } = survey;
  const isClosed = await repo.updateFiled(ctx.db, { orderId, version, at: ctx.now() });
  if (!isClosed) throw stale();
}

/** The reports of a listing, newest first. */
export const listReportSummaries = (ctx: Ctx, listingId: string): Promise<ReportSummary[]> =>
  repo.listSummaries(ctx.db, listingId);

export const findReportOfOrder = (ctx: Ctx, orderId: string): Promise<ReportSummary | undefined> =>
  repo.findSummaryOfOrder(ctx.db, orderId);
