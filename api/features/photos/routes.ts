import { pipeline } from 'node:stream/promises';
import { Router } from 'express';
import type { RequestHandler, Response } from 'express';
import * as contract from '#shared/listings/contract.ts';
import { Problem } from '#shared/problem.ts';
import { z } from 'zod';
import type { Ctx } from '../../ctx.ts';
import { rawRoute, route, routeTable } from '../../http/route.ts';
import * as service from './service.ts';
import type { Served } from './service.ts';
import { createUploads, uploadsPath } from './uploads.ts';

const yearSeconds = 31_536_000;

const idFrom = (value: unknown): string => {
  const parsed = z.uuid().safeParse(value);
  if (!parsed.success) throw new Problem('not-found');
  return parsed.data;
};

async function send(response: Response, { stream, bytes, mime }: Served): Promise<void> {
  response.setHeader('Content-Type', mime);
  response.setHeader('Content-Length', bytes);
  await pipeline(stream, response).catch((error: unknown) => {
    // A reader who has gone away is no fault of ours.
    if (!response.destroyed) throw error;
  });
}

/** @param uploadsDir folder of unfinished uploads. */
export function photoRoutes(uploadsDir: string): Router {
  const router = Router();

  const uploads = createUploads(uploadsDir, (problem, response) => {
    const { locals } = response as Response;
    const { site } = locals['ctx'] as Ctx;
    const details = problem.toDetails(`${site.publicUrl}/problems/`, String(locals['requestId'] ?? ''));
    return { status: problem.status, body: JSON.stringify(details) };
  });
  const handleUpload: RequestHandler = (request, response) =>
    uploads.handle(response.locals['ctx'] as Ctx, request, response);
  routeTable.push({ name: 'uploadFile', method: 'ALL', path: uploadsPath });
  router.all([uploadsPath, `${uploadsPath}/{*rest}`], handleUpload);

  rawRoute(
    router,
    { name: 'getPhotoVariant', method: 'GET', path: '/media/:id/:name' },
    async (ctx, request, response) => {
      const { isPublic, ...file } = await service.openVariant(
        ctx,
        idFrom(request.params['id']),
        String(request.params['name']),
      );
      response.setHeader(
        'Cache-Control',
        isPublic ? `public, max-age=${String(yearSeconds)}, immutable` : 'private, no-store',
      );
      await send(response, file);
    },
  );

  rawRoute(
    router,
    { name: 'getDocument', method: 'GET', path: '/api/documents/:id' },
    async (ctx, request, response) => {
      const { filename, ...file } = await service.openDocument(ctx, idFrom(request.params['id']));
      response.attachment(filename);
      response.setHeader('X-Content-Type-Options', 'nosniff');
      response.setHeader('Cache-Control', 'private, no-store');
      await send(response, file);
    },
  );

  route(router, contract.updatePhoto, (ctx, { params, body }) => service.updatePhoto(ctx, params.id, body));

  route(router, contract.deletePhoto, async (ctx, { params }) => {
    await service.deletePhoto(ctx, params.id);
    return { done: true as const };
  });

  route(router, contract.deleteDocument, async (ctx, { params }) => {
    await service.deleteDocument(ctx, params.id);
    return { done: true as const };
  });

  return router;
}
