import { Router } from 'express';
import * as contract from '#shared/surveys/contract.ts';
import { route } from '../../http/route.ts';
import * as service from './service.ts';

export const reportRoutes = Router();

route(reportRoutes, contract.getReport, (ctx, { params }) => service.getReport(ctx, params.id));

route(reportRoutes, contract.getReportAgreements, (ctx, { params }) =>
  service.getReportAgreements(ctx, params.id),
);

route(reportRoutes, contract.checkReport, (ctx, { params }) => service.checkReport(ctx, params.code));
