import type { BodyOf } from '#shared/endpoint.ts';
import { Problem } from '#shared/problem.ts';
import { canonicalJson } from '#shared/surveys/canonical.ts';
import { missingForFiling } from '#shared/surveys/completeness.ts';
import type { Missing } from '#shared/surveys/completeness.ts';
import type { fileSurvey as fileContract, Report, Survey } from '#shared/surveys/contract.ts';
import type { SurveyRecord } from '#shared/surveys/record.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { unknownWords } from '#shared/surveys/vocabulary.ts';
import { inTransaction } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import * as listings from '../listings/service.ts';
import * as photos from '../photos/service.ts';
import * as reports from '../reports/service.ts';
import * as surveyOrders from '../survey-orders/service.ts';
import * as surveys from '../surveys/service.ts';
import type { StoredSurvey } from '../surveys/service.ts';

async function describe(ctx: Ctx, stored: StoredSurvey): Promise<Survey> {
  const { orderId, listing, facts, scope, extras, record, version, savedAt, isFiled, reportId, correction } =
    stored;
  return {
    orderId,
    listing: { ...listing, photos: await photos.listPhotosOfListing(ctx, listing.id) },
    facts,
    scope,
    extras,
    record,
    photos: await photos.listPhotosOfOrder(ctx, orderId),
    version,
    savedAt,
    isFiled,
    reportId,
    correction,
  };
}

export async function getSurvey(ctx: Ctx, orderId: string): Promise<Survey> {
  return describe(ctx, await surveys.getStoredSurvey(ctx, orderId));
}

interface Save {
  version: number;
  record: SurveyRecord;
}

/** @throws Problem stale-version, wrong-state, invalid-input with a pointer to each word that is not the method's. */
export async function saveSurvey(ctx: Ctx, orderId: string, { version, record }: Save): Promise<Survey> {
  const survey = await surveys.requireOpenSurvey(ctx, orderId);
  surveys.requireVersion(survey, version);
  if (record.rubricVersion !== survey.record.rubricVersion) {
    const detail = `This survey is made by version ${survey.record.rubricVersion} of the method.`;
    throw new Problem('invalid-input', detail, [{ detail, pointer: '#/record/rubricVersion' }]);
  }
  const held = await photos.listPhotosOfOrder(ctx, orderId);
  const unknown = unknownWords(record, new Set(held.map(({ id }) => id)));
  if (unknown.length > 0)
    throw new Problem('invalid-input', 'Some entries are not of this survey or its method.', unknown);
  await surveys.storeRecord(ctx, survey, record);
  return getSurvey(ctx, orderId);
}

/** Where a screen finds what is missing: by criterion, whatever the order of the findings; tests by their own field. */
const whereMissing = ({ criterionId, pointer, sentence }: Missing) => ({
  detail: sentence,
  pointer: criterionId === null ? `#/record${pointer.slice(1)}` : `#/record/findings/${criterionId}`,
});

/**
 * Signs and files: the result is computed here again and must be, to the byte, the one the surveyor was shown.
 * @throws Problem stale-version, wrong-state, not-complete, result-differs.
 */
export async function fileSurvey(
  ctx: Ctx,
  orderId: string,
  { version, signOff, result: shown }: BodyOf<typeof fileContract>,
): Promise<Report> {
  const survey = await surveys.requireOpenSurvey(ctx, orderId);
  surveys.requireVersion(survey, version);
  const { facts, record, scope, extras, listing, surveyorId } = survey;
  const held = await photos.listPhotosOfOrder(ctx, orderId);
  const missing = missingForFiling(facts, record, scope, { photoIds: held.map(({ id }) => id) });
  if (missing.length > 0)
    throw new Problem(
      'not-complete',
      missing.length === 1
        ? 'One thing is still missing.'
        : `${String(missing.length)} things are still missing.`,
      missing.map(whereMissing),
    );
  const result = scoreSurvey({ facts, record, scope });
  if (canonicalJson(result) !== canonicalJson(shown))
    throw new Problem(
      'result-differs',
      'The result computed here differs from the one on your screen. Load the page again, read the result, and sign that one.',
    );
  const reportId = await inTransaction(ctx, async (ctx) => {
    // Held first, as where a correction begins: two at once then wait for each other in the same order.
    const corrected = survey.correction && (await surveyOrders.holdCorrectable(ctx, orderId));
    const correction = survey.correction && {
      correctsReportId: survey.correction.reportId,
      version: survey.correction.version + 1,
      reason: survey.correction.reason,
    };
    await surveys.closeSurvey(ctx, survey);
    const { rubricVersion } = record;
    const id = await reports.keepReport(ctx, {
      orderId,
      listingId: listing.id,
      surveyorId,
      filed: {
        scope,
        extras,
        facts,
        record,
        result,
        signOff,
        rubricVersion,
        ...(correction && { correction }),
      },
      photos: held,
    });
    const [newest] = await surveys.listReportSummaries(ctx, listing.id);
    const { verdict, condition, evidence } = result;
    // A correction of an old report does not push a later survey off the listing.
    if (newest?.reportId === id)
      await listings.attachVerdict(ctx, listing.id, { verdict: verdict.id, condition, evidence });
    if (corrected && correction) await surveyOrders.reportCorrected(ctx, corrected, correction);
    else await surveyOrders.reportFiled(ctx, orderId);
    return id;
  });
  return reports.getReport(ctx, reportId);
}
