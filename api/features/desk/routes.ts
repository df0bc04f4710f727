import { Router } from 'express';
import * as contract from '#shared/desk/contract.ts';
import { route } from '../../http/route.ts';
import * as service from './service.ts';

export const deskRoutes = Router();

route(deskRoutes, contract.getDesk, async (ctx) => ({ items: await service.getDesk(ctx) }));
