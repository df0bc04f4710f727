import { createHash } from 'node:crypto';
import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import express from 'express';
import type { ErrorRequestHandler, RequestHandler } from 'express';
import type { Log } from '../../ctx.ts';
import { control } from './control.ts';
import { ServiceError } from './errors.ts';
import { Notices } from './notices.ts';
import { pages } from './pages.ts';
import { resources } from './resources.ts';
import { Store } from './store.ts';

interface Options {
  port: number;
  host: string;
  dataDir: string;
  /** Where notices go. */
  webhookUrl: string;
  webhookSecret: string;
  log: Log;
}

export interface StripeFake {
  url: string;
  apiKey: string;
  close: () => Promise<void>;
}

const knowsKey =
  (store: Store): RequestHandler =>
  (request, _response, next) => {
    if (request.get('authorization') !== `Bearer ${store.state.secretKey}`) {
      throw new ServiceError(401, 'invalid_request_error', 'Invalid API Key provided.');
    }
    next();
  };

/** Answers a repeated request as it answered the first, and refuses one key for two different requests. */
const repeatsAnswers =
  (store: Store): RequestHandler =>
  (request, response, next) => {
    const key = request.get('idempotency-key');
    if (request.method !== 'POST') {
      next();
      return;
    }
    const fingerprint = createHash('sha256')
      .update(`${request.path}\n${JSON.stringify(request.body)}`)
      .digest('hex');
    const seen = key === undefined ? undefined : store.state.answered[key];
    if (seen) {
      if (seen.fingerprint !== fingerprint) {
        throw new ServiceError(
          400,
          'idempotency_error',
          `Keys for idempotent requests can only be used with the same parameters they were first used with. Try using a key other than '${String(key)}' if you meant to execute a different request.`,
        );
      }
      response.setHeader('Idempotent-Replayed', 'true');
      response.status(seen.status).json(seen.body);
      return;
    }
    const answer = response.json.bind(response);
    response.json = (body: unknown) => {
      if (key !== undefined && response.statusCode < 500) {
        store.state.answered[key] = { fingerprint, status: response.statusCode, body: structuredClone(body) };
      }
      store.save();
      return answer(body);
    };
    next();
  };

const inServiceShape: ErrorRequestHandler = (error: unknown, _request, response, next) => {
  if (response.headersSent) {
    next(error);
    return;
  }
  const known =
    error instanceof ServiceError
      ? error
      : new ServiceError(500, 'api_error', error instanceof Error ? error.message : 'Unknown');
  response.status(known.status).json({ error: known.body });
};

/** Starts the stand-in for the card payment service on loopback; its state outlives it in `dataDir`. */
export async function startStripeFake(options: Options): Promise<StripeFake> {
  const store = new Store(options.dataDir);
  const notices = new Notices({
    store,
    url: options.webhookUrl,
    secret: options.webhookSecret,
    log: options.log,
  });
  const app = express();
  app.disable('x-powered-by');
  app.set('query parser', 'extended');
  let url = '';
  app.use(pages(store, notices), control(store, notices));
  app.use('/v1', express.urlencoded({ extended: true, limit: '100kb' }));
  app.use('/v1', knowsKey(store), (request, response, next) => {
    repeatsAnswers(store)(request, response, next);
  });
  app.use(resources({ store, notices, pagesUrl: () => url }));
  app.use((request) => {
    throw new ServiceError(
      404,
      'invalid_request_error',
      `Unrecognized request URL (${request.method}: ${request.path}).`,
    );
  });
  app.use(inServiceShape);
  const server = await new Promise<Server>((resolve, reject) => {
    const listening = app.listen(options.port, options.host, () => {
      resolve(listening);
    });
    listening.once('error', reject);
  });
  url = `http://${options.host}:${String((server.address() as AddressInfo).port)}`;
  return {
    url,
    apiKey: store.state.secretKey,
    close: async () => {
      await notices.close();
      await new Promise((resolve) => {
        server.close(resolve);
        server.closeAllConnections();
      });
      store.save();
    },
  };
}
