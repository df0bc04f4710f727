import { Router } from 'express';
import * as contract from '#shared/surveys/replies-contract.ts';
import { route } from '../../http/route.ts';
import * as service from './service.ts';

export const replyRoutes = Router();

route(replyRoutes, contract.getReportReplies, (ctx, { params }) => service.getReportReplies(ctx, params.id));

route(replyRoutes, contract.replyToFinding, (ctx, { params, body }) =>
  service.replyToFinding(ctx, params.id, body),
);

route(replyRoutes, contract.listRepair, (ctx, { params, body }) => service.listRepair(ctx, params.id, body));
