import { Router } from 'express';
import type { Database } from '../db/client.ts';
import type { Metrics } from './request-log.ts';

/** Live, ready, and metrics: for whoever runs the site. */
export function healthRoutes(database: Database, metrics: Metrics): Router {
  const router = Router();
  router.get('/api/health', (_request, response) => {
    response.json({ status: 'live' });
  });
  router.get('/api/ready', async (_request, response) => {
    const isReady = await database.raw.query('select 1').then(
      () => true,
      () => false,
    );
    response.status(isReady ? 200 : 503).json({ status: isReady ? 'ready' : 'database does not answer' });
  });
  router.get('/api/metrics', (_request, response) => {
    response.type('text/plain; version=0.0.4').send(metrics.text());
  });
  return router;
}
