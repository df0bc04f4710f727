import { randomUUID } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import type { IncomingMessage, ServerResponse } from 'node:http';
import path from 'node:path';
import { FileStore } from '@tus/file-store';
import { Metadata, Server } from '@tus/server';
import type { Upload } from '@tus/server';
import { z } from 'zod';
import { uploadLimits, uploadMetadata } from '#shared/listings/pictures.ts';
import type { UploadMetadata } from '#shared/listings/pictures.ts';
import { invalidInput, Problem } from '#shared/problem.ts';
import { hoursMs } from '#shared/time.ts';
import { requireActor } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import * as service from './service.ts';

export const uploadsPath = '/api/files';
const keepUnfinishedMs = 24 * hoursMs;
const sweepEveryMs = 1 * hoursMs;

/** How a refusal is written into the protocol's own answer. */
export type WriteProblem = (problem: Problem, response: ServerResponse) => { status: number; body: string };

interface Exchange {
  ctx: Ctx;
  response: ServerResponse;
}

const unexpected = () =>
  new Problem(
    'unexpected',
    'The file arrived but could not be taken in just now. It is kept: send it again and only the last step is repeated.',
  );

/** An empty value travels as a name without one, so it is the same as none. */
const withoutNulls = (fields: Record<string, string | null> = {}): Record<string, string> =>
  Object.fromEntries(
    Object.entries(fields).flatMap(([name, value]) => (value === null ? [] : [[name, value]])),
  );

function readMetadata(header: string | undefined): UploadMetadata {
  let fields: Record<string, string | null> = {};
  try {
    fields = Metadata.parse(header);
  } catch {
    throw new Problem('bad-request', 'Say what the file is for in Upload-Metadata.');
  }
  const parsed = uploadMetadata.safeParse(withoutNulls(fields));
  if (!parsed.success) throw invalidInput(parsed.error);
  return parsed.data;
}

const ownerOf = (upload: Upload): string | undefined => upload.metadata?.['ownerId'] ?? undefined;

async function admit(ctx: Ctx, request: IncomingMessage): Promise<void> {
  if (request.headers['content-type'] === 'application/offset+octet-stream')
    throw new Problem('bad-request', 'Start the upload first, then send the file to the address given.');
  const length = z.coerce.number().int().safeParse(request.headers['upload-length']);
  if (!length.success) throw new Problem('bad-request', 'Say how long the file is in Upload-Length.');
  const metadata = readMetadata(request.headers['upload-metadata']?.toString());
  await service.admitUpload(ctx, metadata, length.data);
}

/**
 * Resumable uploads by the tus 1.0 protocol: creation, termination and expiration.
 *
 * Everything is decided here before the protocol's own server sees a request, which by itself would hand
 * unprocessed files, and where they were taken, to anyone.
 */
export function createUploads(folder: string, writeProblem: WriteProblem) {
  const exchanges = new WeakMap<object, Exchange>();
  const store = new FileStore({ directory: folder, expirationPeriodInMilliseconds: keepUnfinishedMs });
  // Without creation-with-upload: the server asks after a finished upload that has been moved away by then.
  store.extensions = ['creation', 'termination', 'expiration'];
  let sweptAt = 0;

  const findUpload = (id: string): Promise<Upload | undefined> => store.getUpload(id).catch(() => undefined);

  /** Takes in a whole upload; what is refused is thrown away with its bytes. */
  async function finish(ctx: Ctx, upload: Upload): Promise<void> {
    try {
      const content = await readFile(path.join(folder, upload.id));
      await service.receiveUpload(ctx, {
        id: upload.id,
        metadata: uploadMetadata.parse(withoutNulls(upload.metadata)),
        content,
      });
    } catch (error) {
      if (error instanceof Problem) await store.remove(upload.id);
      throw error;
    }
    await store.remove(upload.id);
  }

  const server = new Server({
    path: uploadsPath,
    datastore: store,
    relativeLocation: true,
    allowedOrigins: [],
    maxSize: uploadLimits.photoBytes,
    namingFunction: () => randomUUID(),
    onUploadCreate: async (request, upload) => {
      const { ctx } = exchangeOf(request.runtime?.node?.req);
      return { metadata: { ...upload.metadata, ownerId: requireActor(ctx).id } };
    },
    onUploadFinish: async (request, upload) => {
      const { ctx, response } = exchangeOf(request.runtime?.node?.req);
      try {
        await finish(ctx, upload);
        return {};
      } catch (error) {
        if (!(error instanceof Problem)) {
          const fault = error instanceof Error ? error.message : String(error);
          ctx.log.error({ upload: upload.id, error: fault }, 'upload not taken in');
        }
        const problem = error instanceof Problem ? error : unexpected();
        const { status, body } = writeProblem(problem, response);
        return { status_code: status, headers: { 'Content-Type': 'application/problem+json' }, body };
      }
    },
  });

  function exchangeOf(request: object | undefined): Exchange {
    const exchange = request && exchanges.get(request);
    if (!exchange) throw new Error('An upload was handled outside its request');
    return exchange;
  }

  /** @returns true if the request has been answered in full. */
  async function resume(ctx: Ctx, id: string, request: IncomingMessage, response: ServerResponse) {
    const actor = requireActor(ctx);
    const upload = await findUpload(id);
    if (upload && ownerOf(upload) !== actor.id) throw new Problem('not-found');
    if (request.method !== 'HEAD') {
      if (!upload) throw new Problem('not-found');
      return false;
    }
    // The answer to the last part may have been lost on its way: a client that asks again learns that all is well.
    if (upload && upload.offset === upload.size) await finish(ctx, upload);
    else if (upload) return false;
    const bytes = upload?.size ?? (await service.findReceivedBytes(ctx, id));
    if (bytes === undefined) throw new Problem('not-found');
    response
      .writeHead(200, {
        'Tus-Resumable': '1.0.0',
        'Upload-Offset': bytes,
        'Upload-Length': bytes,
        'Cache-Control': 'no-store',
      })
      .end();
    return true;
  }

  /** Throws away what was begun and never finished, at most once an hour. */
  async function sweep(ctx: Ctx): Promise<void> {
    if (Date.now() - sweptAt < sweepEveryMs) return;
    sweptAt = Date.now();
    await server.cleanUpExpiredUploads().catch((error: unknown) => {
      ctx.log.warn({ error: String(error) }, 'unfinished uploads not swept');
    });
  }

  return {
    handle: async (ctx: Ctx, request: IncomingMessage, response: ServerResponse): Promise<void> => {
      if (request.method === 'GET') throw new Problem('not-found');
      if (request.method !== 'OPTIONS') {
        requireActor(ctx);
        const { pathname } = new URL(request.url ?? '', 'http://localhost');
        const id = pathname.slice(uploadsPath.length + 1);
        if (request.method === 'POST') {
          if (id !== '') throw new Problem('not-found');
          await sweep(ctx);
          await admit(ctx, request);
        } else {
          if (!z.uuid().safeParse(id).success) throw new Problem('not-found');
          if (await resume(ctx, id, request, response)) return;
        }
      }
      exchanges.set(request, { ctx, response });
      await server.handle(request, response);
    },
  };
}
