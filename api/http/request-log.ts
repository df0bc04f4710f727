import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';
import type { Log } from '../ctx.ts';

export interface Metrics {
  count: (method: string, route: string, status: number, seconds: number) => void;
  text: () => string;
}

/** Counts requests for the metrics page, in the Prometheus text format. */
export function createMetrics(): Metrics {
  const counts = new Map<string, { count: number; seconds: number }>();
  return {
    count: (method, route, status, seconds) => {
      const key = `method="${method}",route="${route}",status="${String(status)}"`;
      const seen = counts.get(key) ?? { count: 0, seconds: 0 };
      counts.set(key, { count: seen.count + 1, seconds: seen.seconds + seconds });
    },
    text: () => {
      const lines = [...counts].flatMap(([key, { count, seconds }]) => [
        `tubeplate_requests_total{${key}} ${String(count)}`,
        `tubeplate_request_seconds_sum{${key}} ${seconds.toFixed(4)}`,
      ]);
      const memory = `tubeplate_resident_bytes ${String(process.memoryUsage.rss())}`;
      return [...lines, memory, ''].join('\n');
    },
  };
}

/** One line a request: id, method, route pattern, status, time. Never an address, a name or a query. */
export function requestLog(log: Log, metrics: Metrics): RequestHandler {
  return (request, response, next) => {
    const requestId = randomUUID();
    const startedAt = process.hrtime.bigint();
    response.locals['requestId'] = requestId;
    response.setHeader('X-Request-Id', requestId);
    response.once('finish', () => {
      const ms = Number(process.hrtime.bigint() - startedAt) / 1e6;
      const route = (request.route as { path?: unknown } | undefined)?.path;
      const pattern = typeof route === 'string' ? route : request.baseUrl || 'static';
      metrics.count(request.method, pattern, response.statusCode, ms / 1000);
      log.info(
        {
          requestId,
          method: request.method,
          route: pattern,
          status: response.statusCode,
          ms: Math.round(ms),
        },
        'request',
      );
    });
    next();
  };
}
