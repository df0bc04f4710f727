import { Router } from 'express';
import { createDocument } from 'zod-openapi';
import type { ZodOpenApiPathsObject } from 'zod-openapi';
import type { z } from 'zod';
import { problemDetails } from '#shared/problem.ts';
import { routeTable } from './route.ts';

const openApiPath = (path: string): string => path.replaceAll(/:(\w+)/g, '{$1}');

const isEmptyObject = (schema: z.ZodType): boolean => {
  const shape = (schema as unknown as { shape?: object }).shape;
  return shape !== undefined && Object.keys(shape).length === 0;
};

/** The OpenAPI 3.1 document, made from the same contracts that the routes check against. */
export function describeApi(publicUrl: string): object {
  const paths: ZodOpenApiPathsObject = {};
  for (const { endpoint } of routeTable) {
    if (!endpoint) continue;
    const path = (paths[openApiPath(endpoint.path)] ??= {});
    path[endpoint.method.toLowerCase() as 'get' | 'post'] = {
      operationId: endpoint.name,
      summary: endpoint.summary,
      requestParams: {
        ...(isEmptyObject(endpoint.params) ? {} : { path: endpoint.params as z.ZodObject }),
        ...(isEmptyObject(endpoint.query) ? {} : { query: endpoint.query as z.ZodObject }),
      },
      ...(isEmptyObject(endpoint.body) || endpoint.method === 'GET'
        ? {}
        : { requestBody: { content: { 'application/json': { schema: endpoint.body } } } }),
      responses: {
        [String(endpoint.status) as '200']: {
          description: 'As asked',
          content: { 'application/json': { schema: endpoint.response } },
        },
        default: {
          description: 'Problem details, RFC 9457',
          content: { 'application/problem+json': { schema: problemDetails } },
        },
      },
    };
  }
  return createDocument({
    openapi: '3.1.0',
    info: {
      title: 'Tubeplate',
      version: '1.0.0',
      description: 'Secondhand model boilers, surveyed. Tubeplate issues no certificate of safety.',
    },
    servers: [{ url: publicUrl }],
    paths,
  });
}

export function openApiRoute(publicUrl: string): Router {
  const router = Router();
  let made: object | undefined;
  router.get('/api/openapi.json', (_request, response) => {
    made ??= describeApi(publicUrl);
    response.json(made);
  });
  return router;
}
