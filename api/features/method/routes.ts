import { Router } from 'express';
import * as contract from '#shared/surveys/contract.ts';
import { perMinute } from '../../http/guards.ts';
import { route } from '../../http/route.ts';
import * as service from './service.ts';

/** @param rateFactor multiplies the limit on scoring, which costs more than reading. */
export function methodRoutes(rateFactor: number): Router {
  const router = Router();

  route(router, contract.getMethod, (_ctx, { query }) => service.getMethod(query.version));

  router.use(contract.scoreBySurveyMethod.path, perMinute(60 * rateFactor));
  route(router, contract.scoreBySurveyMethod, (_ctx, { body }) => service.scoreBySurvey(body));

  return router;
}
