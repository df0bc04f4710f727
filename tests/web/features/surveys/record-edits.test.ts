import { describe, expect, test } from 'vitest';
import { criterionOf, defectOf } from '#shared/surveys/rubric/index.ts';
import { emptyRecord } from '#shared/surveys/record.ts';
import {
  addPhoto,
  clearFinding,
  findingOf,
  setGrade,
  setReadings,
  toggleDefect,
  toggleWay,
} from '#web/features/surveys/record-edits.ts';
import { sectionsOf, stepsOf } from '#web/features/surveys/steps.ts';
import { goodSurvey } from '#tests/shared/surveys/example.ts';

const glass = criterionOf('safety.glass')!;
const sluggish = defectOf(glass, 'glass-sluggish')!;
const cloudy = defectOf(glass, 'glass-cloudy')!;
const start = emptyRecord('1.0.0');

describe('a defect chosen', () => {
  test('marks a better grade down to the one it calls for', () => {
    const sound = setGrade('safety.glass', 'sound')(start);
    expect(findingOf(toggleDefect('safety.glass', sluggish)(sound), 'safety.glass')?.grade).toBe('attention');
  });

  test('never marks a worse grade up', () => {
    const unfit = setGrade('safety.glass', 'unfit')(start);
    expect(findingOf(toggleDefect('safety.glass', cloudy)(unfit), 'safety.glass')?.grade).toBe('unfit');
  });

  test('is taken off by choosing it again, and the grade stands', () => {
    const twice = [toggleDefect('safety.glass', sluggish), toggleDefect('safety.glass', sluggish)];
    const record = twice.reduce((so, edit) => edit(so), start);
    expect(findingOf(record, 'safety.glass')).toMatchObject({ grade: 'attention', defects: [] });
  });
});

test('marked Not examined by a slip, nothing recorded is lost', () => {
  const before = [
    toggleDefect('safety.glass', sluggish),
    toggleWay('safety.glass', 'sight'),
    setReadings('safety.glass', 'visibleGlassMm', [40, 41]),
    addPhoto('safety.glass', '00000000-0000-4000-8000-000000000001'),
  ].reduce((so, edit) => edit(so), start);
  const after = setGrade('safety.glass', 'attention')(setGrade('safety.glass', 'notExamined')(before));
  expect(after).toEqual(before);
});

test('readings of one quantity replace only its own', () => {
  const record = [
    setReadings('safety.glass', 'visibleGlassMm', [40]),
    setReadings('safety.glass', 'lowestLevelAboveCrownMm', [6]),
    setReadings('safety.glass', 'visibleGlassMm', []),
  ].reduce((so, edit) => edit(so), start);
  expect(findingOf(record, 'safety.glass')?.measurements).toEqual([
    { quantity: 'lowestLevelAboveCrownMm', value: 6 },
  ]);
});

test('the screens follow the boiler and the scope', () => {
  const full = stepsOf(goodSurvey());
  expect(full.map(({ kind }) => kind)).toContain('steam');
  const cold = stepsOf({ ...goodSurvey(), scope: 'external' });
  expect(cold.some(({ kind }) => kind === 'hydraulic' || kind === 'steam')).toBe(false);
  expect(full.at(-1)?.kind).toBe('review');
});

test('a section counts what is recorded and not what is cleared', () => {
  const survey = goodSurvey();
  const steps = stepsOf(survey);
  const record = clearFinding('safety.glass')(survey.record);
  const safety = sectionsOf(steps, record).find(({ id }) => id === 'safety')!;
  expect(safety.done).toBe(safety.steps.length - 1);
});
