import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { lockFolder } from '#api/db/lock.ts';
import { readEnv } from '#api/env.ts';

const folder = mkdtempSync(path.join(tmpdir(), 'tubeplate-start-'));
afterAll(() => {
  rmSync(folder, { recursive: true, force: true });
});

describe('one process for each data folder', () => {
  test('a second owner is refused in words, and let in once the first has gone', async () => {
    const unlock = await lockFolder(folder);
    await expect(lockFolder(folder)).rejects.toThrow('in use by another Tubeplate');
    await unlock();
    await (
      await lockFolder(folder)
    )();
  });

  test('the lock of a process that was killed is taken over', async () => {
    const script = `import('${path.resolve('api/db/lock.ts')}').then((lock) => lock.lockFolder(${JSON.stringify(folder)})).then(() => { process.stdout.write('held'); setInterval(() => {}, 1000); })`;
    const owner = spawn(process.execPath, ['--import', 'tsx', '--input-type=module', '-e', script]);
    await new Promise((resolve) => {
      owner.stdout.once('data', resolve);
    });
    await expect(lockFolder(folder)).rejects.toThrow('in use');
    owner.kill('SIGKILL');
    await new Promise((resolve) => {
      owner.once('exit', resolve);
    });
    await (
      await lockFolder(folder)
    )();
  });
});

describe('the environment', () => {
  const base = { DATA_DIR: folder };

  test('a live site on stand-ins is refused, and told all that is missing', () => {
    const start = () => readEnv({ ...base, NODE_ENV: 'production' });
    expect(start).toThrow('AUTH_SECRET, PUBLIC_URL, STRIPE_SECRET_KEY, STRIPE_WEBHOOK_SECRET, SMTP_URL');
  });

  test('a demonstration may run anywhere, with a secret of its own that it keeps', () => {
    const env = readEnv({ ...base, NODE_ENV: 'production', DEMO: '1' });
    expect(env.isDemo).toBe(true);
    expect(env.authSecret).toHaveLength(64);
    expect(readEnv(base).authSecret).toBe(env.authSecret);
  });

  test('every fault is named at once', () => {
    const start = () => readEnv({ ...base, PORT: 'ninety', AUTH_SECRET: 'short' });
    expect(start).toThrow(/PORT: [^\n]+\n {2}AUTH_SECRET: AUTH_SECRET needs at least 32 characters/);
  });

  test('PORT and DATA_DIR are honoured, with 4600 and .data otherwise', () => {
    expect(readEnv({ ...base, PORT: '5123' })).toMatchObject({
      PORT: 5123,
      publicUrl: 'http://localhost:5123',
      DATA_DIR: folder,
    });
    expect(readEnv({ AUTH_SECRET: 'x'.repeat(32) })).toMatchObject({
      PORT: 4600,
      DATA_DIR: path.resolve('.data'),
    });
  });
});
