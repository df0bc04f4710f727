import { Router } from 'express';
import * as contract from '#shared/listings/contract.ts';
import { route } from '../../http/route.ts';
import * as service from './service.ts';

export const placeRoutes = Router();

route(placeRoutes, contract.searchTowns, (_ctx, { query }) => ({ items: service.searchTowns(query.q) }));
