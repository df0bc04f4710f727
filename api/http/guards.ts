import type { RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';
import helmet from 'helmet';
import { Problem } from '#shared/problem.ts';

/** Headers of every answer: a content policy with no inline script or style, and no framing. */
export const securityHeaders = (isHttps: boolean): RequestHandler =>
  helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'"],
        imgSrc: ["'self'", 'blob:', 'data:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        workerSrc: ["'self'"],
        manifestSrc: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        ...(isHttps ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    crossOriginEmbedderPolicy: false,
    hsts: isHttps ? { maxAge: 31_536_000, includeSubDomains: true } : false,
    referrerPolicy: { policy: 'strict-origin-when-cross-origin' },
  });

const changes = new Set(['POST', 'PUT', 'PATCH', 'DELETE']);

/** Refuses a change that comes from another site's page. Requests without an Origin are refused too: browsers send one. */
export function sameOriginOnly(publicUrl: string): RequestHandler {
  const origin = new URL(publicUrl).origin;
  return (request, _response, next) => {
    if (changes.has(request.method) && request.get('origin') !== origin) throw new Problem('wrong-origin');
    next();
  };
}

/** So many requests a minute from one client address. */
export const perMinute = (limit: number): RequestHandler =>
  rateLimit({
    windowMs: 60_000,
    limit,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: () => {
      throw new Problem('too-many', 'You have asked too often. Wait a minute and try again.');
    },
  });
