import type { Request, RequestHandler, Response, Router } from 'express';
import type { z } from 'zod';
import type { AnyEndpoint, BodyOf, Method, ParamsOf, QueryOf, ResponseOf } from '#shared/endpoint.ts';
import { invalidInput, Problem } from '#shared/problem.ts';
import type { Ctx } from '../ctx.ts';

interface Input<E extends AnyEndpoint> {
  params: ParamsOf<E>;
  query: QueryOf<E>;
  body: BodyOf<E>;
}

export interface RouteEntry {
  name: string;
  method: Method | 'ALL';
  path: string;
  endpoint?: AnyEndpoint;
}

/** Every route there is, for the OpenAPI document and for the test that walks them all. */
export const routeTable: RouteEntry[] = [];

const ctxOf = (response: Response): Ctx => response.locals['ctx'] as Ctx;

function read<S extends z.ZodType>(schema: S, value: unknown): z.output<S> {
  const parsed = schema.safeParse(value);
  if (!parsed.success) throw invalidInput(parsed.error);
  return parsed.data;
}

const register = (router: Router, method: Method, path: string, handler: RequestHandler) => {
  const verb = method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
  router[verb](path, handler);
};

/** Binds one operation of a contract: what comes in and what goes out are both checked against it. */
export function route<E extends AnyEndpoint>(
  router: Router,
  endpoint: E,
  handle: (ctx: Ctx, input: Input<E>) => Promise<z.input<E['response']>> | z.input<E['response']>,
): void {
  routeTable.push({ name: endpoint.name, method: endpoint.method, path: endpoint.path, endpoint });
  register(router, endpoint.method, endpoint.path, async (request, response) => {
    // A malformed id in an address names nothing, so it is not there.
    const params = endpoint.params.safeParse(request.params);
    if (!params.success) throw new Problem('not-found');
    const input = {
      params: params.data,
      query: read(endpoint.query, request.query),
      body: read(endpoint.body, request.body ?? {}),
    } as Input<E>;
    const answer = await handle(ctxOf(response), input);
    const body = endpoint.response.parse(answer) as ResponseOf<E>;
    response.status(endpoint.status).json(body);
  });
}

/** Binds a route whose body is not JSON: pictures, files, notices. */
export function rawRoute(
  router: Router,
  entry: { name: string; method: Method; path: string },
  handle: (ctx: Ctx, request: Request, response: Response) => Promise<void> | void,
): void {
  routeTable.push(entry);
  register(router, entry.method, entry.path, (request, response) =>
    handle(ctxOf(response), request, response),
  );
}
