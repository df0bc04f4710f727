import { Router } from 'express';
import * as contract from '#shared/surveys/contract.ts';
import { route } from '../../http/route.ts';
import * as service from './service.ts';

export const examinationRoutes = Router();

route(examinationRoutes, contract.getSurvey, (ctx, { params }) => service.getSurvey(ctx, params.id));

route(examinationRoutes, contract.saveSurvey, (ctx, { params, body }) =>
  service.saveSurvey(ctx, params.id, body),
);

route(examinationRoutes, contract.fileSurvey, (ctx, { params, body }) =>
  service.fileSurvey(ctx, params.id, body),
);
