import { Router } from 'express';
import * as contract from '#shared/listings/contract.ts';
import { route } from '../../http/route.ts';
import * as service from './service.ts';

export const listingRoutes = Router();

route(listingRoutes, contract.createListing, (ctx) => service.createListing(ctx));

route(listingRoutes, contract.listListings, (ctx, { query }) => service.listListings(ctx, query));

route(listingRoutes, contract.listOwnListings, async (ctx) => ({
  items: await service.listOwnListings(ctx),
}));

route(listingRoutes, contract.getListing, (ctx, { params }) => service.getListing(ctx, params.slug));

route(listingRoutes, contract.getOwnListing, (ctx, { params }) => service.getOwnListing(ctx, params.id));

route(listingRoutes, contract.saveListing, (ctx, { params, body }) =>
  service.saveListing(ctx, params.id, body),
);

route(listingRoutes, contract.moveListing, (ctx, { params, body }) =>
  service.moveListing(ctx, params.id, body),
);

route(listingRoutes, contract.orderPhotos, (ctx, { params, body }) =>
  service.orderPhotos(ctx, params.id, body.photoIds),
);
