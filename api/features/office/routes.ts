import { Router } from 'express';
import * as contract from '#shared/office/contract.ts';
import { route } from '../../http/route.ts';
import * as service from './service.ts';

export const officeRoutes = Router();

route(officeRoutes, contract.listOfficeOrders, async (ctx, { query }) => ({
  items: await service.listOfficeOrders(ctx, query.status),
}));
route(officeRoutes, contract.getOfficeMoney, (ctx) => service.getOfficeMoney(ctx));
route(officeRoutes, contract.listLedger, (ctx, { query }) => service.listLedger(ctx, query));
route(officeRoutes, contract.listAudit, (ctx, { query }) => service.listAudit(ctx, query));
route(officeRoutes, contract.listMembers, async (ctx, { query }) => ({
  items: await service.listMembers(ctx, query.q),
}));
route(officeRoutes, contract.changeRole, (ctx, { params, body }) =>
  service.changeRole(ctx, { userId: params.id, ...body }),
);
route(officeRoutes, contract.moveListingByOffice, (ctx, { params, body }) =>
  service.moveListingByOffice(ctx, params.id, body.event, body.reason),
);
