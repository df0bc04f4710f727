import { Router } from 'express';
import { byId } from '#shared/endpoint.ts';
import { Problem } from '#shared/problem.ts';
import * as contract from '#shared/survey-orders/contract.ts';
import { rawRoute, route } from '../../http/route.ts';
import * as service from './service.ts';

export const surveyOrderRoutes = Router();
const router = surveyOrderRoutes;

route(router, contract.quoteSurvey, async (ctx, { params, body }) => ({
  items: await service.quoteSurvey(ctx, params.id, body),
}));
route(router, contract.placeSurveyOrder, (ctx, { body }) => service.placeSurveyOrder(ctx, body));
route(router, contract.listSurveyOrders, async (ctx) => ({ items: await service.listSurveyOrders(ctx) }));
route(router, contract.getSurveyOrder, (ctx, { params }) => service.getSurveyOrder(ctx, params.id));
route(router, contract.payForSurvey, (ctx, { params }) => service.payForSurvey(ctx, params.id));
route(router, contract.checkPayment, (ctx, { params }) => service.checkPayment(ctx, params.id));
route(router, contract.acceptSurveyOrder, (ctx, { params }) => service.acceptSurveyOrder(ctx, params.id));
route(router, contract.declineSurveyOrder, (ctx, { params, body }) =>
  service.declineSurveyOrder(ctx, params.id, body.reason),
);
route(router, contract.proposeTimes, (ctx, { params, body }) =>
  service.proposeTimes(ctx, params.id, body.times),
);
route(router, contract.agreeTime, (ctx, { params, body }) =>
  service.agreeTime(ctx, params.id, body.startsAt),
);
route(router, contract.cancelSurveyOrder, (ctx, { params, body }) =>
  service.cancelSurveyOrder(ctx, params.id, body.reason),
);
route(router, contract.beginSurvey, (ctx, { params }) => service.beginSurvey(ctx, params.id));
route(router, contract.abandonSurvey, (ctx, { params, body }) =>
  service.abandonSurvey(ctx, params.id, body.reason),
);
route(router, contract.acceptReport, (ctx, { params }) => service.acceptReport(ctx, params.id));

rawRoute(
  router,
  { name: 'getCalendarFile', method: 'GET', path: '/api/survey-orders/:id/calendar.ics' },
  async (ctx, request, response) => {
    const params = byId.safeParse(request.params);
    if (!params.success) throw new Problem('not-found');
    const file = await service.getCalendarFile(ctx, params.data.id);
    response
      .type('text/calendar; charset=utf-8')
      .attachment('survey.ics')
      .set('Cache-Control', 'private, no-store')
      .send(file);
  },
);
