import { existsSync } from 'node:fs';
import path from 'node:path';
import { fromNodeHeaders, toNodeHandler } from 'better-auth/node';
import express from 'express';
import type { Express, RequestHandler } from 'express';
import { Problem } from '#shared/problem.ts';
import { addressHeader } from './auth/auth.ts';
import { authenticate } from './auth/authenticate.ts';
import { ctxFrom } from './deps.ts';
import type { Deps } from './deps.ts';
import { accountRoutes } from './features/accounts/routes.ts';
import { examinationRoutes } from './features/examinations/routes.ts';
import { deskRoutes } from './features/desk/routes.ts';
import { listingRoutes } from './features/listings/routes.ts';
import { engineRoutes } from './features/engines/routes.ts';
import { methodRoutes } from './features/method/routes.ts';
import { workingsRoutes } from './features/workings/routes.ts';
import { officeRoutes } from './features/office/routes.ts';
import { photoRoutes } from './features/photos/routes.ts';
import { placeRoutes } from './features/places/routes.ts';
import { replyRoutes } from './features/replies/routes.ts';
import { reportRoutes } from './features/reports/routes.ts';
import { paymentNoticeRoutes } from './features/settlements/routes.ts';
import { surveyOrderRoutes } from './features/survey-orders/routes.ts';
import { printedReportRoutes } from './features/printed-reports/routes.ts';
import { surveyorRoutes } from './features/surveyors/routes.ts';
import { perMinute, sameOriginOnly, securityHeaders } from './http/guards.ts';
import { healthRoutes } from './http/health.ts';
import { openApiRoute } from './http/openapi.ts';
import { nothingHere, problemHandler } from './http/problem-handler.ts';
import { createMetrics, requestLog } from './http/request-log.ts';

const webDir = path.resolve(import.meta.dirname, '../dist/web');

/** PostgreSQL keeps no NUL in a text; nobody types one. @throws SyntaxError, which is answered as a bad request. */
const refuseNul = (_key: string, value: unknown): unknown => {
  if (typeof value === 'string' && value.includes('\0')) throw new SyntaxError('NUL in a text');
  return value;
};

/** Every request carries the context its handler works in, with the person who sent it. */
const attachCtx =
  (deps: Deps): RequestHandler =>
  async (request, response, next) => {
    const actor = await authenticate(
      deps.auth,
      deps.database.db,
      deps.site.isDemo,
      fromNodeHeaders(request.headers),
    );
    response.locals['ctx'] = ctxFrom(deps, actor);
    next();
  };

/** What comes from a machine has no person behind it. */
const attachSystemCtx =
  (deps: Deps): RequestHandler =>
  (_request, response, next) => {
    response.locals['ctx'] = ctxFrom(deps);
    next();
  };

/** Rate limits go by the socket's address (or a trusted proxy's word), never by what a client claims. */
const stampAddress: RequestHandler = (request, _response, next) => {
  request.headers[addressHeader] = request.ip ?? 'unknown';
  next();
};

function serveSite(app: Express): void {
  if (!existsSync(webDir)) return;
  app.use(
    express.static(webDir, {
      index: false,
      setHeaders: (response, file) => {
        const isHashed = file.includes(`${path.sep}assets${path.sep}`);
        response.setHeader('Cache-Control', isHashed ? 'public, max-age=31536000, immutable' : 'no-cache');
      },
    }),
  );
  app.get('/{*page}', (request, response) => {
    if (path.extname(request.path) !== '') throw new Problem('not-found');
    response.setHeader('Cache-Control', 'no-cache');
    response.sendFile(path.join(webDir, 'index.html'));
  });
}

/** The whole API and the built site, not listening. */
export function createApp(deps: Deps): Express {
  const app = express();
  const metrics = createMetrics();
  const { publicUrl } = deps.site;
  app.disable('x-powered-by');
  app.set('trust proxy', deps.trustProxy);
  app.use(requestLog(deps.log, metrics));
  app.use(securityHeaders(publicUrl.startsWith('https:')));
  app.use(healthRoutes(deps.database, metrics));

  app.use('/api', perMinute(900 * deps.rateFactor), stampAddress);
  // Ahead of the JSON parser: better-auth reads its own bodies.
  app.all('/api/auth/{*any}', toNodeHandler(deps.auth));

  // Likewise the payment service's notices, whose signature is over the bytes; no browser sends them.
  app.use('/api/payments/notices', express.raw({ type: () => true, limit: '512kb' }), attachSystemCtx(deps));
  app.use(paymentNoticeRoutes);

  app.use(
    '/api',
    sameOriginOnly(publicUrl),
    express.json({ limit: '1mb', reviver: refuseNul }),
    attachCtx(deps),
  );
  app.use('/media', attachCtx(deps));
  app.use(accountRoutes(deps.letters), placeRoutes, listingRoutes, photoRoutes(deps.uploadsDir));
  app.use(examinationRoutes, reportRoutes, replyRoutes, printedReportRoutes(deps.rateFactor));
  app.use(methodRoutes(deps.rateFactor), workingsRoutes(deps.rateFactor));
  app.use(surveyorRoutes, surveyOrderRoutes, engineRoutes, deskRoutes, officeRoutes);
  app.use(openApiRoute(publicUrl));
  app.use('/api', nothingHere);

  serveSite(app);
  app.use(problemHandler(deps.log, publicUrl));
  return app;
}
