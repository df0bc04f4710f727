import { z } from 'zod';

export type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

/** One HTTP operation, described once: the router, the browser client, the forms and the OpenAPI document all read it. */
export interface Endpoint<
  Params extends z.ZodType = z.ZodType,
  Query extends z.ZodType = z.ZodType,
  Body extends z.ZodType = z.ZodType,
  Response extends z.ZodType = z.ZodType,
> {
  readonly name: string;
  readonly summary: string;
  readonly method: Method;
  /** Express path, `/api/…/:id`. */
  readonly path: string;
  readonly params: Params;
  readonly query: Query;
  readonly body: Body;
  readonly response: Response;
  readonly status: number;
}

export type AnyEndpoint = Endpoint;
export type ParamsOf<E> = E extends Endpoint<infer P> ? z.output<P> : never;
export type QueryOf<E> = E extends Endpoint<z.ZodType, infer Q> ? z.output<Q> : never;
export type BodyOf<E> = E extends Endpoint<z.ZodType, z.ZodType, infer B> ? z.output<B> : never;
export type ResponseOf<E> =
  E extends Endpoint<z.ZodType, z.ZodType, z.ZodType, infer R> ? z.output<R> : never;

/** What a caller passes, before defaults are filled in. */
export interface CallInput<E extends AnyEndpoint> {
  params?: z.input<E['params']>;
  query?: z.input<E['query']>;
  body?: z.input<E['body']>;
}

const nothing = z.strictObject({});

interface Description<P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType, R extends z.ZodType> {
  name: string;
  summary: string;
  method: Method;
  path: string;
  params?: P;
  query?: Q;
  body?: B;
  response: R;
  status?: number;
}

/** Describes one operation. What is left out takes nothing: extra keys are refused. */
export function endpoint<
  R extends z.ZodType,
  P extends z.ZodType = typeof nothing,
  Q extends z.ZodType = typeof nothing,
  B extends z.ZodType = typeof nothing,
>(description: Description<P, Q, B, R>): Endpoint<P, Q, B, R> {
  const empty = nothing as z.ZodType;
  return {
    name: description.name,
    summary: description.summary,
    method: description.method,
    path: description.path,
    params: description.params ?? (empty as P),
    query: description.query ?? (empty as Q),
    body: description.body ?? (empty as B),
    response: description.response,
    status: description.status ?? 200,
  };
}

/** Answer of an operation that has nothing to say. */
export const done = z.object({ done: z.literal(true) });
export const byId = z.strictObject({ id: z.uuid('That is not an id of ours') });
