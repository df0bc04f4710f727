import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { startSmtpFake } from '#api/fakes/smtp/index.ts';
import type { SmtpFake } from '#api/fakes/smtp/index.ts';
import { createMailer } from '#api/services/mail/index.ts';

const folder = mkdtempSync(path.join(tmpdir(), 'tubeplate-mail-'));
let post: SmtpFake;
beforeAll(async () => {
  post = await startSmtpFake({ port: 0, host: '127.0.0.1', dataDir: folder });
});
afterAll(async () => {
  await post.close();
  rmSync(folder, { recursive: true, force: true });
});

test('a letter arrives whole by SMTP, with its calendar file and the caution at its foot', async () => {
  const mailer = createMailer({
    host: '127.0.0.1',
    port: post.port,
    from: 'Tubeplate <desk@tubeplate.example>',
  });
  await mailer.send({
    to: 'somebody@example.test',
    subject: 'A time is agreed: Ludlow, ½ past ten',
    text: 'Come at half past ten.\n.\nA line with one dot above.',
    attachments: [
      { filename: 'visit.ics', contentType: 'text/calendar', content: Buffer.from('BEGIN:VCALENDAR') },
    ],
  });
  const [letter] = await post.list();
  expect(letter).toMatchObject({
    to: 'somebody@example.test',
    subject: 'A time is agreed: Ludlow, ½ past ten',
  });
  expect(letter!.text).toContain('A line with one dot above.');
  expect(letter!.text).toContain('no certificate of safety');
  expect(letter!.attachments).toEqual([{ filename: 'visit.ics', contentType: 'text/calendar', bytes: 15 }]);
});

test('a letter that cannot be handed over is not lost in silence', async () => {
  const mailer = createMailer({ host: '127.0.0.1', port: 1, from: 'desk@tubeplate.example' });
  await expect(mailer.send({ to: 'a@example.test', subject: 'x', text: 'y' })).rejects.toThrow(
    'ECONNREFUSED',
  );
});
