import { Router } from 'express';
import * as contract from '#shared/surveys/contract.ts';
import * as correcting from '#shared/surveys/corrections-contract.ts';
import { route } from '../../http/route.ts';
import * as corrections from './corrections.ts';
import * as service from './service.ts';

export const examinationRoutes = Router();

route(examinationRoutes, contract.getSurvey, (ctx, { params }) => service.getSurvey(ctx, params.id));

route(examinationRoutes, contract.saveSurvey, (ctx, { params, body }) =>
  service.saveSurvey(ctx, params.id, body),
);

route(examinationRoutes, contract.fileSurvey, (ctx, { params, body }) =>
  service.fileSurvey(ctx, params.id, body),
);

route(examinationRoutes, correcting.getReportVersions, (ctx, { params }) =>
  corrections.getReportVersions(ctx, params.id),
);

route(examinationRoutes, correcting.startCorrection, async (ctx, { params, body }) => {
  const orderId = await corrections.startCorrection(ctx, params.id, body.reason);
  return service.getSurvey(ctx, orderId);
});

route(examinationRoutes, correcting.giveUpCorrection, async (ctx, { params }) => {
  await corrections.giveUpCorrection(ctx, params.id);
  return { done: true } as const;
});
