import { describe, expect, it } from 'vitest';
import { canonicalJson } from '#shared/surveys/canonical.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { publishedSurveys } from './example.ts';

/**
 * Results of each version of the method as first published. A change here means that filed reports would no longer come out as they
 * were filed: publish a new version of the method instead.
 */
describe('every version still scores to the bytes it was published with', () => {
  it.each(publishedSurveys)('%s', async (name, survey) => {
    await expect(canonicalJson(scoreSurvey(survey)) + '\n').toMatchFileSnapshot(`published/${name}.txt`);
  });
});
