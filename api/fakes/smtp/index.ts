import { randomUUID } from 'node:crypto';
import { mkdirSync, rename, writeFile } from 'node:fs';
import { readdir, readFile } from 'node:fs/promises';
import type { AddressInfo } from 'node:net';
import path from 'node:path';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import type { Letter } from '#shared/accounts/contract.ts';

interface Options {
  port: number;
  host: string;
  dataDir: string;
}

export interface SmtpFake {
  port: number;
  /** Newest first. */
  list: () => Promise<Letter[]>;
  close: () => Promise<void>;
}

const longest = 300;

/** Writes a letter whole, and tells the server's own callback, which knows nothing of promises. */
function keep(file: string, content: Buffer, done: (error?: Error) => void): void {
  writeFile(`${file}.part`, content, (fault) => {
    if (fault) {
      done(fault);
      return;
    }
    rename(`${file}.part`, file, (error) => {
      done(error ?? undefined);
    });
  });
}

async function readLetter(file: string): Promise<Letter> {
  const mail = await simpleParser(await readFile(file));
  const to = Array.isArray(mail.to) ? mail.to : mail.to ? [mail.to] : [];
  return {
    id: path.basename(file, '.eml'),
    to: to.map((part) => part.value.map(({ address }) => address).join(', ')).join(', '),
    from: mail.from?.text ?? '',
    subject: mail.subject ?? '',
    sentAt: (mail.date ?? new Date(0)).toISOString(),
    text: mail.text ?? '',
    attachments: mail.attachments.map(({ filename, contentType, size }) => ({
      filename: filename ?? 'attachment',
      contentType,
      bytes: size,
    })),
  };
}

/** A real SMTP server on loopback that delivers to a folder, each letter a file of its own. */
export async function startSmtpFake({ port, host, dataDir }: Options): Promise<SmtpFake> {
  mkdirSync(dataDir, { recursive: true, mode: 0o700 });
  const server = new SMTPServer({
    authOptional: true,
    // Only this machine connects; asking a name server who it is would cost every letter a wait.
    disableReverseLookup: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    size: 20 * 1024 * 1024,
    onData: (stream, _session, done) => {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.once('end', () => {
        // Names sort by time of arrival, so that newest first needs no reading.
        const name = `${String(Date.now()).padStart(15, '0')}-${randomUUID()}`;
        const file = path.join(dataDir, `${name}.eml`);
        keep(file, Buffer.concat(chunks), done);
      });
    },
  });
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, host, () => {
      server.off('error', reject);
      resolve();
    });
  });
  // A client that hangs up in the middle is no fault of the server's.
  server.on('error', () => undefined);
  return {
    port: (server.server.address() as AddressInfo).port,
    list: async () => {
      const names = (await readdir(dataDir))
        .filter((name) => name.endsWith('.eml'))
        .toSorted()
        .toReversed();
      return Promise.all(names.slice(0, longest).map((name) => readLetter(path.join(dataDir, name))));
    },
    close: () =>
      new Promise((resolve) => {
        server.close(resolve);
      }),
  };
}
