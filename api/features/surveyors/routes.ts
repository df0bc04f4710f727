import { Router } from 'express';
import * as contract from '#shared/surveyors/contract.ts';
import { route } from '../../http/route.ts';
import * as service from './service.ts';

export const surveyorRoutes = Router();

route(surveyorRoutes, contract.getMySurveyorTerms, (ctx) => service.getMySurveyorTerms(ctx));
route(surveyorRoutes, contract.saveMySurveyorTerms, (ctx, { body }) =>
  service.saveMySurveyorTerms(ctx, body),
);
route(surveyorRoutes, contract.startPayoutSetUp, (ctx) => service.startPayoutSetUp(ctx));
