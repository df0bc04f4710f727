import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { ProblemDetails } from '#shared/problem.ts';
import { canonicalJson } from '#shared/surveys/canonical.ts';
import { methodData } from '#shared/surveys/method.ts';
import type { MethodData } from '#shared/surveys/method.ts';
import { rubricVersion, rubricVersions } from '#shared/surveys/rubric/index.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { publishedSurveys, withFinding } from '#tests/shared/surveys/example.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

let site: Site;
beforeAll(async () => {
  site = await givenSite();
});
afterAll(() => site.close());

describe('the published method', () => {
  test('a visitor reads it, and it is the one the product scores by', async () => {
    const { body } = await site.as().get('/api/method').expect(200);
    expect(body).toEqual(methodData());
  });

  test.each(rubricVersions.map(({ version }) => version))(
    'a visitor reads version %s as it was published',
    async (version) => {
      const { body } = await site.as().get(`/api/method?version=${version}`).expect(200);
      expect(body).toEqual(methodData(version));
      expect((body as MethodData).rubric.version).toBe(version);
      expect((body as MethodData).current).toBe(rubricVersion);
    },
  );

  test('a version that was never published is not found', async () => {
    const { body } = await site.as().get('/api/method?version=0.0.1').expect(404);
    expect((body as ProblemDetails).detail).toBe('There is no version 0.0.1 of the method.');
  });

  test.each(publishedSurveys)('a visitor’s score of “%s” is ours to the byte', async (_name, survey) => {
    const { body } = await site.as().post('/api/method/score').send(survey).expect(200);
    expect(canonicalJson(body)).toBe(canonicalJson(scoreSurvey(survey)));
  });

  test('a word that the method does not have is refused, with where it stands', async () => {
    const survey = withFinding('shell.bushes', { ways: ['dowsing'] });
    const at = survey.record.findings.findIndex(({ criterionId }) => criterionId === 'shell.bushes');
    const response = await site.as().post('/api/method/score').send(survey).expect(422);
    const problem = response.body as ProblemDetails;
    expect(problem.errors).toEqual([
      {
        pointer: `#/record/findings/${String(at)}/ways/0`,
        detail: '“dowsing” is not a way of examining “Bushes and threads”.',
      },
    ]);
  });

  test('scoring by a version that was never published is refused', async () => {
    const survey = withFinding('shell.bushes', {});
    const record = { ...survey.record, rubricVersion: '0.0.1' };
    const response = await site
      .as()
      .post('/api/method/score')
      .send({ ...survey, record })
      .expect(422);
    expect((response.body as ProblemDetails).errors?.[0]?.pointer).toBe('#/record/rubricVersion');
  });

  test('another site may not post in a visitor’s name', async () => {
    const { body } = await site
      .as()
      .post('/api/method/score')
      .set('Origin', 'https://elsewhere.example')
      .expect(403);
    expect((body as ProblemDetails).type).toMatch(/wrong-origin$/);
  });
});
