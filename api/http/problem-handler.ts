import type { ErrorRequestHandler, RequestHandler, Response } from 'express';
import { Problem } from '#shared/problem.ts';
import type { Log } from '../ctx.ts';
import { databaseFault } from '../db/client.ts';

/** Faults of a request that its parser finds before any of our code. */
function fromParser(error: unknown): Problem | undefined {
  if (!(error instanceof Error) || !('status' in error) || typeof error.status !== 'number') return undefined;
  if (error.status === 413) return new Problem('too-large');
  if (error.status === 415) return new Problem('wrong-kind');
  if (error.status >= 400 && error.status < 500) return new Problem('bad-request');
  return undefined;
}

function fromDatabase(error: unknown): Problem | undefined {
  const fault = databaseFault(error);
  // Unique violation, serialization failure, deadlock: somebody else was first.
  if (fault && ['23505', '40001', '40P01'].includes(fault.code)) return new Problem('changed-meanwhile');
  return undefined;
}

/** Sends a problem as RFC 9457 problem details. */
export function sendProblem(response: Response, problem: Problem, publicUrl: string, instance: string): void {
  response
    .status(problem.status)
    .type('application/problem+json')
    .send(JSON.stringify(problem.toDetails(`${publicUrl}/problems/`, instance)));
}

/** Turns whatever was thrown into problem details. What we did not expect is logged once and told to nobody. */
export function problemHandler(log: Log, publicUrl: string): ErrorRequestHandler {
  return (error: unknown, _request, response, next) => {
    if (response.headersSent) {
      next(error);
      return;
    }
    const instance = String(response.locals['requestId'] ?? '');
    const known = error instanceof Problem ? error : (fromParser(error) ?? fromDatabase(error));
    if (!known) {
      const fault =
        error instanceof Error ? { error: error.message, stack: error.stack } : { error: String(error) };
      log.error({ requestId: instance, ...fault }, 'unexpected');
    }
    const problem =
      known ??
      new Problem(
        'unexpected',
        'The server met a fault of its own. Nothing was changed. Try again, or quote the number.',
      );
    if (problem.slug === 'too-many') response.setHeader('Retry-After', '60');
    sendProblem(response, problem, publicUrl, instance);
  };
}

/** What is under /api and nowhere else is not found. */
export const nothingHere: RequestHandler = () => {
  throw new Problem('not-found');
};
