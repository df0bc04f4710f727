// @vitest-environment jsdom
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { canonicalJson } from '#shared/surveys/canonical.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { publishedSurveys } from './example.ts';

describe('in a browser’s globals', () => {
  it.each(publishedSurveys)('%s scores to the bytes the server gives', (name, survey) => {
    expect(typeof window).toBe('object');
    const published = readFileSync(`tests/shared/surveys/published/${name}.txt`, 'utf8');
    expect(`${canonicalJson(scoreSurvey(survey))}\n`).toBe(published);
  });
});
