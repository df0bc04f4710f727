import { randomUUID } from 'node:crypto';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import supertest from 'supertest';
import { createApp } from '#api/app.ts';
import { createAuth } from '#api/auth/auth.ts';
import type { Actor, Ctx, Log } from '#api/ctx.ts';
import { ctxFrom } from '#api/deps.ts';
import type { Deps } from '#api/deps.ts';
import type { Database } from '#api/db/client.ts';
import { startSmtpFake } from '#api/fakes/smtp/index.ts';
import { startStripeFake } from '#api/fakes/stripe/index.ts';
import * as accounts from '#api/features/accounts/service.ts';
import { handleJob } from '#api/jobs/handlers.ts';
import { startQueue } from '#api/jobs/queue.ts';
import { createDiskFiles } from '#api/services/files/index.ts';
import { createMailer } from '#api/services/mail/index.ts';
import { createPayments } from '#api/services/payments/index.ts';
import type { Role } from '#shared/accounts/roles.ts';
import { openTemplate } from './db-template.ts';
import { testClock } from './clock.ts';
import { silentLog } from './log.ts';

export const testPassword = 'nine brass unions';

export interface TestPerson {
  id: string;
  name: string;
  email: string;
  cookie: string;
}

interface Options {
  database?: Database;
  log?: Log;
  isDemo?: boolean;
}

/** The whole product on loopback: real Express, real database, and the fakes of the hosted services. */
export async function givenSite({ database: given, log = silentLog, isDemo = true }: Options = {}) {
  const folder = mkdtempSync(path.join(tmpdir(), 'tubeplate-test-'));
  const database = given ?? (await openTemplate());
  const queue = await startQueue(database, log);
  let app: ReturnType<typeof createApp> | undefined;
  const server = createServer((request, response) => app?.(request, response));
  await new Promise<void>((resolve) => {
    server.listen(0, '127.0.0.1', resolve);
  });
  const url = `http://127.0.0.1:${String((server.address() as AddressInfo).port)}`;
  const post = await startSmtpFake({ port: 0, host: '127.0.0.1', dataDir: path.join(folder, 'mail') });
  const webhookSecret = 'whsec_for_tests_only';
  const bank = await startStripeFake({
    port: 0,
    host: '127.0.0.1',
    dataDir: path.join(folder, 'payments'),
    webhookUrl: `${url}/api/payments/notices`,
    webhookSecret,
    log,
  });
  const clock = testClock();
  const deps: Deps = {
    site: { publicUrl: url, isDemo },
    trustProxy: 0,
    rateFactor: 1000,
    database,
    auth: createAuth({
      db: database.db,
      publicUrl: url,
      secret: 'a secret for tests, thirty-two characters',
      rateFactor: 1000,
      sendLetter: (letter) => queue.enqueue({ db: database.db }, 'send-letter', letter),
    }),
    queue,
    payments: createPayments({ secretKey: bank.apiKey, webhookSecret, url: bank.url }),
    mail: createMailer({ host: '127.0.0.1', port: post.port, from: 'Tubeplate <desk@tubeplate.example>' }),
    files: createDiskFiles(path.join(folder, 'files')),
    uploadsDir: path.join(folder, 'uploads'),
    letters: post,
    fakePaymentsUrl: bank.url,
    log,
    now: clock.now,
  };
  app = createApp(deps);

  const ctxAs = (actor: Actor | null = null): Ctx => ctxFrom(deps, actor);

  return {
    url,
    deps,
    clock,
    bank,
    post,
    /** The context of the system itself, or of a person, for calling a service. */
    ctxAs,
    /** Sends one request, with a person's cookie if one is given, and the Origin a browser would send. */
    as: (person?: TestPerson) => {
      const send = (method: 'get' | 'post' | 'put' | 'patch' | 'delete') => (to: string) => {
        const request = supertest(url)[method](to).set('Origin', url);
        return person ? request.set('Cookie', person.cookie) : request;
      };
      return {
        get: send('get'),
        post: send('post'),
        put: send('put'),
        patch: send('patch'),
        delete: send('delete'),
      };
    },
    /** Joins a person, confirms the address, grants roles, signs in. */
    givenPerson: async (name: string, ...roles: Role[]): Promise<TestPerson & Actor> => {
      const email = `${name.toLowerCase().replaceAll(/\W+/g, '.')}.${randomUUID().slice(0, 8)}@example.test`;
      const signedUp = await deps.auth.api.signUpEmail({
        body: { name, email, password: testPassword },
        asResponse: true,
      });
      const cookie = signedUp.headers
        .getSetCookie()
        .map((line) => line.split(';')[0])
        .join('; ');
      const person = await accounts.confirmEmail(ctxAs(), email);
      for (const role of roles) {
        await accounts.changeRole(ctxAs(), {
          userId: person.id,
          role,
          change: 'grant',
          reason: 'For a test',
        });
      }
      if (roles.includes('office')) {
        await supertest(url)
          .post('/api/me/skip-enrolment')
          .set('Origin', url)
          .set('Cookie', cookie)
          .expect(200);
      }
      return {
        id: person.id,
        name,
        email,
        cookie,
        isEmailVerified: true,
        roles: new Set(roles),
        sessionId: 'test',
      };
    },
    /** Runs the jobs that are due, until none is left. */
    drain: () => queue.drain((job) => handleJob(ctxAs(), job)),
    close: async () => {
      await new Promise((resolve) => {
        server.close(resolve);
        server.closeAllConnections();
      });
      await queue.stop();
      await bank.close();
      await post.close();
      await database.close();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

export type Site = Awaited<ReturnType<typeof givenSite>>;
