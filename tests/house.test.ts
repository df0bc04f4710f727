import { spawnSync } from 'node:child_process';
import { cpSync, existsSync, mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { routeTable } from '#api/http/route.ts';
import type { AnyEndpoint } from '#shared/endpoint.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

const root = path.resolve(import.meta.dirname, '..');
const read = (file: string) => readFileSync(path.join(root, file), 'utf8');
const tracked = spawnSync('git', ['ls-files'], { cwd: root, encoding: 'utf8' })
  .stdout.split('\n')
  .filter(Boolean);
const isText = (file: string) => /\.(ts|tsx|mjs|cjs|md|json|css|html|sql|py|csv|yml|svg)$/.test(file);

const isEndpoint = (value: unknown): value is AnyEndpoint =>
  typeof value === 'object' && value !== null && 'method' in value && 'path' in value && 'response' in value;

async function contracts(): Promise<AnyEndpoint[]> {
  const files = readdirSync(path.join(root, 'shared'), { recursive: true, encoding: 'utf8' }).filter((file) =>
    file.endsWith('contract.ts'),
  );
  const modules = await Promise.all(
    files.map((file) => import(path.join(root, 'shared', file)) as Promise<Record<string, unknown>>),
  );
  // Some contracts are lists: one operation for each of many alike.
  const listed = (value: unknown): unknown[] =>
    Array.isArray(value) ? value.map((each: { endpoint?: unknown }) => each.endpoint) : [value];
  return modules.flatMap((module) => Object.values(module).flatMap(listed)).filter(isEndpoint);
}

describe('the house', () => {
  test('holds at its top level only what the plan allows', () => {
    const allowed = new Set([
      'README.md',
      'DEVELOPERS.md',
      'package.json',
      'package-lock.json',
      'vite.config.ts',
      'tsconfig.json',
      'drizzle.config.ts',
      'web',
      'api',
      'shared',
      'e2e',
      'tests',
    ]);
    const top = new Set(tracked.map((file) => file.split('/')[0] ?? ''));
    expect([...top].filter((name) => !allowed.has(name) && !name.startsWith('.'))).toEqual([]);
  });

  test('has every path that DEVELOPERS.md and README.md name', () => {
    const named = ['DEVELOPERS.md', 'README.md']
      .flatMap((file) => [...read(file).matchAll(/`((?:shared|api|web|tests|e2e)\/[\w./<>-]*)`/g)])
      .map((match) => match[1] ?? '')
      .filter((name) => !name.includes('<'));
    expect(named.length).toBeGreaterThan(20);
    expect(named.filter((name) => !existsSync(path.join(root, name)))).toEqual([]);
  });

  test('names no package registry and no folder of the machine it was built on', () => {
    const words = [
      ['registry', 'npmjs'].join('.'),
      ['', 'tmp', ''].join('/') + 'brief',
      ['', 'work', ''].join('/'),
    ];
    const found = tracked
      .filter(isText)
      .filter((file) => existsSync(path.join(root, file)))
      .flatMap((file) => words.filter((word) => read(file).includes(word)).map((word) => `${file}: ${word}`));
    expect(found).toEqual([]);
  });

  test('never calls a boiler safe, nor certifies', () => {
    const claims =
      /\b(is|are|now|found) safe\b|\bsafe to (steam|light|use)\b|\bcertified (safe|boiler)\b|\bwe certify\b/i;
    const found = tracked
      .filter(
        (file) =>
          /^(web|shared|api)\//.test(file) &&
          /\.(ts|tsx|html)$/.test(file) &&
          existsSync(path.join(root, file)),
      )
      .filter((file) => claims.test(read(file)));
    expect(found).toEqual([]);
  });

  test('keeps its migrations level with its schema', () => {
    const folder = mkdtempSync(path.join(tmpdir(), 'tubeplate-schema-'));
    try {
      cpSync(path.join(root, 'api/db/migrations'), folder, { recursive: true });
      const before = readdirSync(folder).length;
      const run = spawnSync(
        'npx',
        [
          '--no-install',
          'drizzle-kit',
          'generate',
          '--dialect',
          'postgresql',
          '--schema',
          './api/db/schema/index.ts',
          '--casing',
          'snake_case',
          '--out',
          path.relative(root, folder),
          '--name',
          'drift',
        ],
        { cwd: root, encoding: 'utf8' },
      );
      expect(run.stderr).not.toMatch(/error/i);
      expect(run.status).toBe(0);
      expect(readdirSync(folder)).toHaveLength(before);
    } finally {
      rmSync(folder, { recursive: true, force: true });
    }
  });
});

describe('the contracts', () => {
  let site: Site;
  beforeAll(async () => {
    site = await givenSite();
  });
  afterAll(() => site.close());

  test('are each bound to exactly one route', async () => {
    const named = (await contracts()).map(({ name }) => name).toSorted();
    const bound = routeTable.filter(({ endpoint }) => endpoint).map(({ name }) => name);
    expect(new Set(named).size).toBe(named.length);
    expect([...new Set(bound)].toSorted()).toEqual(named);
  });

  test('make a valid OpenAPI 3.1 document that names every operation', async () => {
    const { body } = await site.as().get('/api/openapi.json').expect(200);
    const document = body as {
      openapi: string;
      paths: Record<string, Record<string, { operationId: string }>>;
    };
    expect(document.openapi).toMatch(/^3\.1\./);
    const operations = Object.values(document.paths).flatMap((methods) => Object.values(methods));
    const ids = operations.map(({ operationId }) => operationId).toSorted();
    expect(ids).toEqual((await contracts()).map(({ name }) => name).toSorted());
  });
});
