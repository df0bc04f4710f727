import { boilerFacts } from '#shared/boilers/boiler.ts';
import type { ReportSummary } from '#shared/listings/contract.ts';
import { Problem } from '#shared/problem.ts';
import { mayCorrectReport } from '#shared/survey-orders/machine.ts';
import { emptyRecord } from '#shared/surveys/record.ts';
import type { SurveyRecord } from '#shared/surveys/record.ts';
import { rubricVersion } from '#shared/surveys/rubric/index.ts';
import type { Instant } from '#shared/time.ts';
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
  const isUnderWay =
    found.correction === null ? found.orderStatus === 'examining' : mayCorrectReport(found.orderStatus);
  if (!isUnderWay)
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

interface Correction {
  orderId: string;
  reportId: string;
  reason: string;
  record: SurveyRecord;
}

/** Opens a filed survey again on a copy of what was filed. @throws Problem changed-meanwhile if it is open already. */
export async function reopenSurvey(ctx: Ctx, correction: Correction): Promise<void> {
  const isReopened = await repo.updateReopened(ctx.db, { ...correction, at: ctx.now() });
  if (!isReopened)
    throw new Problem(
      'changed-meanwhile',
      'A correction of this report is open already, here or on another device. Go on with that one.',
    );
}

/** Closes a survey whose correction is given up, as it was filed. @throws Problem changed-meanwhile. */
export async function closeSurveyAgain(
  ctx: Ctx,
  filed: { orderId: string; record: SurveyRecord; at: Instant },
): Promise<void> {
  const isClosed = await repo.updateClosedAgain(ctx.db, filed);
  if (!isClosed) throw new Problem('changed-meanwhile');
}

/** The order of a report whose correction this person has open; null if there is none. */
export async function findOpenCorrection(ctx: Ctx, orderId: string): Promise<string | null> {
  const found = await repo.findSurvey(ctx.db, orderId);
  return found && found.correction !== null && found.surveyorId === ctx.actor?.id ? orderId : null;
}

/**
 * A photograph of an open survey may be changed unless a filed report rests on it.
 * @throws Problem not-signed-in, not-found, wrong-state.
 */
export async function requireUnfiledPhoto(ctx: Ctx, orderId: string, photoId: string): Promise<void> {
  await requireOpenSurvey(ctx, orderId);
  if ((await repo.listFiledPhotoIds(ctx.db, orderId)).has(photoId))
    throw new Problem(
      'wrong-state',
      'This photograph is part of a filed report, so it stays. Take it off the finding, or add another.',
    );
}

/** The newest version of each report of a listing, the last surveyed first. */
export const listReportSummaries = (ctx: Ctx, listingId: string): Promise<ReportSummary[]> =>
  repo.listSummaries(ctx.db, listingId);

export const findReportOfOrder = (ctx: Ctx, orderId: string): Promise<ReportSummary | undefined> =>
  repo.findSummaryOfOrder(ctx.db, orderId);
