import { Problem } from '#shared/problem.ts';
import type { ReportVersions } from '#shared/surveys/corrections-contract.ts';
import { mayCorrectReport } from '#shared/survey-orders/machine.ts';
import { inTransaction, requireActor } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import * as reports from '../reports/service.ts';
import * as surveyOrders from '../survey-orders/service.ts';
import * as surveys from '../surveys/service.ts';

/** Every version of a report, and whether the person asking may correct it. @throws Problem not-found. */
export async function getReportVersions(ctx: Ctx, id: string): Promise<ReportVersions> {
  const { order, surveyor } = await reports.getStoredReport(ctx, id);
  const versions = await reports.listStoredVersions(ctx, order.id);
  const correctingOrderId = await surveys.findOpenCorrection(ctx, order.id);
  return {
    items: versions.map((each) => ({
      reportId: each.id,
      version: each.version,
      filedAt: each.filedAt,
      reason: each.correction?.reason ?? null,
    })),
    viewer: {
      canCorrect:
        ctx.actor?.id === surveyor.id &&
        versions.at(-1)?.id === id &&
        correctingOrderId === null &&
        mayCorrectReport(order.status),
      correctingOrderId,
    },
  };
}

/**
 * Opens the survey of a filed report again, on a copy of what was filed.
 * @returns the order whose survey is open again.
 * @throws Problem not-signed-in, not-found, not-permitted, wrong-state, changed-meanwhile.
 */
export async function startCorrection(ctx: Ctx, reportId: string, reason: string): Promise<string> {
  const actor = requireActor(ctx);
  const { order, surveyor, record } = await reports.getStoredReport(ctx, reportId);
  if (actor.id !== surveyor.id)
    throw new Problem('not-permitted', 'Only the surveyor who filed it may correct it.');
  await inTransaction(ctx, async (ctx) => {
    await surveyOrders.holdCorrectable(ctx, order.id);
    const newest = (await reports.listStoredVersions(ctx, order.id)).at(-1);
    if (newest?.id !== reportId)
      throw new Problem('changed-meanwhile', 'This version has been superseded. Correct the newest one.');
    await surveys.reopenSurvey(ctx, { orderId: order.id, reportId, reason, record });
  });
  return order.id;
}

/** Gives up a correction that is open: the survey is closed again as it was filed. */
export async function giveUpCorrection(ctx: Ctx, orderId: string): Promise<void> {
  const { correction } = await surveys.requireOpenSurvey(ctx, orderId);
  if (correction === null) throw new Problem('wrong-state', 'No correction is open here.');
  const { record, filedAt } = await reports.getStoredReport(ctx, correction.reportId);
  await surveys.closeSurveyAgain(ctx, { orderId, record, at: filedAt });
}
