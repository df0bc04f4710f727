import type { Ctx } from '../ctx.ts';
import * as printedReports from '../features/printed-reports/service.ts';
import * as settlements from '../features/settlements/service.ts';
import * as surveyOrders from '../features/survey-orders/service.ts';
import type { Job } from './jobs.ts';

/** Does a promised job. Every one may run twice: each looks first whether it still needs doing. */
export async function handleJob(ctx: Ctx, job: Job): Promise<void> {
  switch (job.kind) {
    case 'send-letter': {
      const { attachments = [], withReportOfOrder, ...letter } = job.data;
      const report =
        withReportOfOrder === undefined ? [] : await printedReports.printForLetter(ctx, withReportOfOrder);
      await ctx.mail.send({
        ...letter,
        attachments: [
          ...attachments.map(({ base64, ...rest }) => ({ ...rest, content: Buffer.from(base64, 'base64') })),
          ...report,
        ],
      });
      return;
    }
    case 'lapse-order':
      return surveyOrders.lapseOrder(ctx, job.data.orderId);
    case 'end-review':
      return surveyOrders.endReview(ctx, job.data.orderId);
    case 'release-fee':
      return settlements.releaseFee(ctx, job.data.orderId);
    case 'refund-order':
      return settlements.refundOrder(ctx, job.data.orderId);
    case 'reconcile-payments':
      return settlements.reconcile(ctx);
  }
}
