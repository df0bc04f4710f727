import { describe, expect, test } from 'vitest';
import type { SurveyInput } from '#shared/surveys/examined.ts';
import type { Finding } from '#shared/surveys/record.ts';
import { criteriaFor } from '#shared/surveys/rubric/index.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { groupFound } from '#shared/surveys/found.ts';
import { goodSurvey, withFinding } from '#tests/shared/surveys/example.ts';

const grouped = (survey: SurveyInput) => groupFound({ ...survey, result: scoreSurvey(survey) });

const where = (survey: SurveyInput, criterionId: string) =>
  [...grouped(survey)].find(([, items]) => items.some(({ criterion }) => criterion.id === criterionId))?.[0];

const found = (code: string): Finding['defects'] => [
  { code, where: '', note: '', remedy: null, allowance: null },
];

describe('an item stands under the most pressing thing found of it', () => {
  test.each<[string, string, Partial<Finding>]>([
    ['must', 'safety.glass', { grade: 'attention', defects: found('glass-sluggish') }],
    ['must', 'safety.glass', { grade: 'unfit' }],
    ['should', 'safety.glass', { grade: 'serviceable', defects: found('glass-cloudy') }],
    ['should', 'casing.mount', { grade: 'attention' }],
    ['looks', 'safety.gauge', { grade: 'serviceable', defects: found('gauge-dull') }],
    ['well', 'safety.gauge', { grade: 'serviceable' }],
    ['notExamined', 'casing.lagging', { grade: 'notExamined', reason: 'It may hold asbestos' }],
    ['notFitted', 'casing.lagging', { grade: 'notFitted' }],
  ])('%s: %s', (group, criterionId, change) => {
    expect(where(withFinding(criterionId, change), criterionId)).toBe(group);
  });
});

test('every item that applies is shown once', () => {
  const survey = goodSurvey();
  const ids = [...grouped(survey).values()].flat().map(({ criterion }) => criterion.id);
  expect(ids.toSorted()).toEqual(
    criteriaFor(survey.facts)
      .map(({ id }) => id)
      .toSorted(),
  );
});
