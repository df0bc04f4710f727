import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import { Problem } from '#shared/problem.ts';
import { emptyRecord } from '#shared/surveys/record.ts';
import type { SurveyRecord } from '#shared/surveys/record.ts';
import { createDraftStore } from '#web/features/surveys/draft-store.ts';
import { setGrade } from '#web/features/surveys/record-edits.ts';

/** A server that keeps one survey, and can be cut off or overtaken. */
function server() {
  const kept = { version: 1, record: emptyRecord('1.0.0'), requests: 0, isDown: false };
  const save = async (body: { version: number; record: SurveyRecord }) => {
    await Promise.resolve();
    kept.requests += 1;
    if (kept.isDown) throw new Problem('unexpected', 'The server could not be reached.');
    if (body.version !== kept.version) throw new Problem('stale-version');
    kept.version += 1;
    kept.record = body.record;
    return { version: kept.version, savedAt: '2026-05-16T10:00:00Z' };
  };
  return { kept, save };
}

const open = (save: ReturnType<typeof server>['save']) =>
  createDraftStore({
    record: emptyRecord('1.0.0'),
    version: 1,
    savedAt: '2026-05-16T09:00:00Z',
    save,
    delayMs: 1_000,
    retryMs: 5_000,
  });

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});

test('several quick changes are sent once, together', async () => {
  const { kept, save } = server();
  const draft = open(save);
  draft.edit(setGrade('shell.barrel', 'sound'));
  draft.edit(setGrade('shell.plates', 'unfit'));
  expect(draft.getState().phase).toBe('unsaved');
  await vi.advanceTimersByTimeAsync(1_000);
  expect(kept.requests).toBe(1);
  expect(kept.record.findings.map(({ grade }) => grade)).toEqual(['sound', 'unfit']);
  expect(draft.getState()).toMatchObject({ phase: 'saved', version: 2 });
});

test('a change made while saving is sent after it', async () => {
  const { kept, save } = server();
  const draft = open(save);
  draft.edit(setGrade('shell.barrel', 'sound'));
  const first = draft.flush();
  draft.edit(setGrade('shell.barrel', 'attention'));
  expect(await first).toBe(false);
  await vi.advanceTimersByTimeAsync(1_000);
  expect(kept.record.findings[0]?.grade).toBe('attention');
  expect(draft.getState()).toMatchObject({ phase: 'saved', version: 3 });
});

test('with the server away the record stays here, is tried again, and arrives', async () => {
  const { kept, save } = server();
  const draft = open(save);
  kept.isDown = true;
  draft.edit(setGrade('shell.barrel', 'sound'));
  await vi.advanceTimersByTimeAsync(1_000);
  expect(draft.getState().phase).toBe('failed');
  expect(draft.getState().record.findings).toHaveLength(1);
  kept.isDown = false;
  await vi.advanceTimersByTimeAsync(5_000);
  expect(draft.getState().phase).toBe('saved');
  expect(kept.record.findings).toHaveLength(1);
});

test('overtaken by another device, nothing is sent until a version is chosen', async () => {
  const { kept, save } = server();
  const draft = open(save);
  kept.version = 7;
  draft.edit(setGrade('shell.barrel', 'sound'));
  await vi.advanceTimersByTimeAsync(1_000);
  expect(draft.getState().phase).toBe('stale');
  draft.edit(setGrade('shell.plates', 'sound'));
  await vi.advanceTimersByTimeAsync(60_000);
  expect(kept.requests).toBe(1);

  expect(await draft.keepMine({ version: 7, savedAt: '2026-05-16T09:30:00Z' })).toBe(true);
  expect(kept.record.findings).toHaveLength(2);
  expect(draft.getState()).toMatchObject({ phase: 'saved', version: 8 });
});

test('the other version can be taken instead', async () => {
  const { kept, save } = server();
  const draft = open(save);
  kept.version = 7;
  draft.edit(setGrade('shell.barrel', 'sound'));
  await draft.flush();
  draft.takeTheirs({ record: kept.record, version: 7, savedAt: '2026-05-16T09:30:00Z' });
  expect(draft.getState()).toMatchObject({ phase: 'saved', version: 7, problem: null });
  expect(draft.getState().record.findings).toEqual([]);
});
