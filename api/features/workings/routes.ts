import { Router } from 'express';
import { describeCalculator, listWorkings, workings } from '#shared/workings/contract.ts';
import { perMinute } from '../../http/guards.ts';
import { route } from '../../http/route.ts';
import * as service from './service.ts';

/** @param rateFactor multiplies the limit on working things out, which costs more than reading. */
export function workingsRoutes(rateFactor: number): Router {
  const router = Router();

  route(router, listWorkings, () => ({
    items: workings.map(({ calculator }) => describeCalculator(calculator)),
  }));

  router.use('/api/workings/:id', perMinute(300 * rateFactor));
  for (const { calculator, endpoint } of workings)
    route(router, endpoint, (_ctx, { body }) => service.workCalculator(calculator, body));

  return router;
}
