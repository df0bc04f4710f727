import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { problemDetails } from '#shared/problem.ts';
import { keptLog } from '#tests/support/log.ts';
import { givenSite, testPassword } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

const log = keptLog();
let site: Site;
beforeAll(async () => {
  site = await givenSite({ log });
});
afterAll(() => site.close());

describe('the house as its keeper sees it', () => {
  test('is live, ready, and counts its requests', async () => {
    expect((await site.as().get('/api/health')).body).toEqual({ status: 'live' });
    expect((await site.as().get('/api/ready')).body).toEqual({ status: 'ready' });
    expect((await site.as().get('/api/metrics')).text).toContain('tubeplate_requests_total{method="GET"');
  });

  test('logs one line a request, with no name, address or query in any', async () => {
    const person = await site.givenPerson('Quillon Featherstonehaugh');
    await site.as(person).get('/api/towns?q=whitby');
    const lines = JSON.stringify(log.lines);
    expect(log.lines.some(({ fields }) => 'route' in fields && fields.route === '/api/towns')).toBe(true);
    for (const secret of [person.email, 'Featherstonehaugh', 'whitby', testPassword, '127.0.0.1'])
      expect(lines).not.toContain(secret);
  });

  test('sends a policy that allows no inline script or style, and no framing', async () => {
    const { headers } = await site.as().get('/api/health');
    const policy = headers['content-security-policy'] ?? '';
    expect(policy).toContain("script-src 'self'");
    expect(policy).toContain("style-src 'self'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toContain('unsafe');
    expect(headers['x-powered-by']).toBeUndefined();
    expect(headers['x-content-type-options']).toBe('nosniff');
  });
});

describe('what goes wrong', () => {
  test.each([
    ['not JSON', '{"a":', 400],
    ['a NUL in a text', String.raw`{"name":"Nan\u0000"}`, 400],
    ['too much', JSON.stringify({ name: 'x'.repeat(1_200_000) }), 413],
    ['an unknown field', JSON.stringify({ nme: 'Nan' }), 422],
  ])('%s is answered with problem details', async (_what, body, status) => {
    const person = await site.givenPerson('Nan Ridley');
    const answer = await site.as(person).patch('/api/me').set('Content-Type', 'application/json').send(body);
    expect(answer.status).toBe(status);
    expect(answer.type).toBe('application/problem+json');
    expect(problemDetails.safeParse(answer.body).success).toBe(true);
    expect(JSON.stringify(answer.body)).not.toMatch(/at .*\.ts|SELECT|stack/i);
  });

  test('every mistake is named, each with a pointer to its field', async () => {
    const person = await site.givenPerson('Nan Ridley');
    const { body } = await site.as(person).patch('/api/me').send({ name: 'N', units: 'furlongs' });
    expect(
      (body as { errors: { pointer: string }[] }).errors.map(({ pointer }) => pointer).toSorted(),
    ).toEqual(['#/name', '#/units']);
  });

  test('an address that is none answers not found, as details under /api', async () => {
    const { status, type } = await site.as().get('/api/nothing-of-the-kind');
    expect({ status, type }).toEqual({ status: 404, type: 'application/problem+json' });
  });
});

describe('passwords', () => {
  const join = (password: string) =>
    site
      .as()
      .post('/api/auth/sign-up/email')
      .send({ name: 'Nell Garth', email: `nell.${String(password.length)}@example.test`, password });

  test.each(['short', 'passwordpassword', 'aaaaaaaaaaaaaaaa'])('%s is refused', async (password) => {
    expect((await join(password)).status).toBe(400);
  });

  test('a few words in a row will do', async () => {
    expect((await join('three brass unions and a tee')).status).toBe(200);
  });

  test('a reset signs every device out, and its letter works once', async () => {
    const person = await site.givenPerson('Una Brook');
    await site.as().post('/api/auth/request-password-reset').send({ email: person.email });
    await site.drain();
    const letter = (await site.post.list()).find(
      ({ to, subject }) => to === person.email && subject === 'Set a new password',
    );
    const token = new URL(/https?:\S+/.exec(letter!.text)![0]).searchParams.get('token');
    const set = (newPassword: string) =>
      site.as().post('/api/auth/reset-password').send({ newPassword, token });
    expect((await set('four brass unions then')).status).toBe(200);
    expect((await site.as(person).get('/api/me')).body).toEqual({ me: null });
    expect((await set('five brass unions then')).status).toBe(400);
  });
});
