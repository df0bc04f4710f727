import { Router } from 'express';
import { z } from 'zod';
import { byId } from '#shared/endpoint.ts';
import { invalidInput, Problem } from '#shared/problem.ts';
import { papers } from '../../print/sheets.ts';
import { perMinute } from '../../http/guards.ts';
import { rawRoute } from '../../http/route.ts';
import * as service from './service.ts';

const asked = z.strictObject({
  paper: z.enum(papers, 'Paper is a4 or letter').default('a4'),
  units: z.enum(['imperial', 'metric'], 'Units are imperial or metric').default('imperial'),
});

/** @param rateFactor multiplies the limit on printing, which costs more than reading. */
export function printedReportRoutes(rateFactor: number): Router {
  const router = Router();
  const path = '/api/reports/:id/pdf';

  router.use(path, perMinute(30 * rateFactor));
  rawRoute(router, { name: 'printReport', method: 'GET', path }, async (ctx, request, response) => {
    const params = byId.safeParse(request.params);
    if (!params.success) throw new Problem('not-found');
    const query = asked.safeParse(request.query);
    if (!query.success) throw invalidInput(query.error);
    const { filename, content } = await service.printFiledReport(ctx, params.data.id, query.data);
    response.setHeader('Content-Disposition', `inline; filename="${filename}"`);
    response.type('application/pdf').send(content);
  });

  return router;
}
