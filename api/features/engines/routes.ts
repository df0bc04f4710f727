import { Router } from 'express';
import * as contract from '#shared/engines/contract.ts';
import { route } from '../../http/route.ts';
import * as service from './service.ts';

export const engineRoutes = Router();

route(engineRoutes, contract.listEngines, async (ctx) => ({ items: await service.listEngines(ctx) }));
route(engineRoutes, contract.keepEngine, (ctx, { body }) => service.keepEngine(ctx, body));
route(engineRoutes, contract.changeEngine, (ctx, { params, body }) =>
  service.changeEngine(ctx, params.id, body),
);
route(engineRoutes, contract.forgetEngine, async (ctx, { params }) => {
  await service.forgetEngine(ctx, params.id);
  return { done: true } as const;
});
