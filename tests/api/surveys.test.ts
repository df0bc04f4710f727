import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { ProblemDetails } from '#shared/problem.ts';
import type { Survey } from '#shared/surveys/contract.ts';
import { rubricVersion } from '#shared/surveys/rubric/index.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import {
  file,
  givenExamination,
  givenRecorded,
  readSurvey,
  saveRecord,
  signature,
} from '#tests/support/examinations.ts';
import type { Examination } from '#tests/support/examinations.ts';
import { tinyPicture, uploadPhoto } from '#tests/support/factories.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site, TestPerson } from '#tests/support/site.ts';

let site: Site;
let examination: Examination;
let office: TestPerson;
beforeAll(async () => {
  site = await givenSite();
  examination = await givenExamination(site);
  office = await site.givenPerson('Office Clerk', 'office');
});
afterAll(() => site.close());

const problemOf = ({ body }: { body: unknown }) => body as ProblemDetails;
const slugOf = (response: { body: unknown }) => problemOf(response).type.split('/').at(-1);
const sound = (criterionId: string, more: object = {}) => ({
  criterionId,
  grade: 'sound' as const,
  ways: [],
  defects: [],
  measurements: [],
  photoIds: [],
  note: '',
  reason: '',
  ...more,
});

describe('who may read a survey that is being made', () => {
  test('its surveyor gets the seller’s statement and an empty record', async () => {
    const survey = await readSurvey(site, examination);
    expect(survey).toMatchObject({
      orderId: examination.orderId,
      facts: { type: 'vertical-multi-tube', material: 'copper' },
      record: { rubricVersion, findings: [], hydraulic: null },
      version: 1,
      isFiled: false,
      reportId: null,
    });
    expect(survey.listing.photos).toHaveLength(3);
  });

  test('the office may read it; the parties, a stranger and a visitor may not', async () => {
    const path = `/api/survey-orders/${examination.orderId}/survey`;
    const other = await site.givenPerson('Another Surveyor', 'surveyor');
    const { buyer, seller } = examination;
    const answers = await Promise.all(
      [office, buyer, seller, other, undefined].map((person) => site.as(person).get(path)),
    );
    expect(answers.map(({ status }) => status)).toEqual([200, 404, 404, 404, 401]);
  });
});

describe('saving', () => {
  let open: Examination;
  let survey: Survey;
  beforeAll(async () => {
    open = await givenExamination(site);
    survey = await readSurvey(site, open);
  });
  const save = (findings: object[], version = survey.version, record: object = {}) =>
    saveRecord(site, open.surveyor, open.orderId, version, {
      ...survey.record,
      ...record,
      findings: findings as Survey['record']['findings'],
    });

  test('what is saved is read again, under the next version', async () => {
    const saved = (await save([sound('shell.barrel', { ways: ['sight'] })]).expect(200)).body as Survey;
    expect(saved.version).toBe(survey.version + 1);
    survey = await readSurvey(site, open);
    expect(survey).toEqual(saved);
  });

  test('an older version is refused and changes nothing', async () => {
    const response = await save([], survey.version - 1).expect(412);
    expect(slugOf(response)).toBe('stale-version');
    expect((await readSurvey(site, open)).record.findings).toHaveLength(1);
  });

  test('of two saves at once one is kept and the other told', async () => {
    const both = await Promise.all([
      save([sound('shell.barrel', { note: 'one' })]),
      save([sound('shell.barrel', { note: 'two' })]),
    ]);
    expect(new Set(both.map(({ status }) => status))).toEqual(new Set([200, 412]));
    survey = await readSurvey(site, open);
  });

  test.each([
    ['an item', sound('shell.chimneysweep'), 'criterionId'],
    ['a way', sound('shell.barrel', { ways: ['sight', 'dowsing'] }), 'ways/1'],
    [
      'a defect',
      sound('shell.barrel', {
        defects: [{ code: 'glass-cloudy', where: '', note: '', remedy: null, allowance: null }],
      }),
      'defects/0/code',
    ],
    [
      'a quantity',
      sound('shell.barrel', { measurements: [{ quantity: 'colour', value: 3 }] }),
      'measurements/0/quantity',
    ],
  ])('%s that the method does not have is refused, with where it stands', async (_what, finding, where) => {
    const response = await save([sound('shell.plates'), finding]).expect(422);
    expect(problemOf(response).errors?.map(({ pointer }) => pointer)).toEqual([
      `#/record/findings/1/${where}`,
    ]);
  });

  test('another version of the method is refused', async () => {
    const response = await save([], survey.version, { rubricVersion: '0.9.0' }).expect(422);
    expect(problemOf(response).errors?.[0]?.pointer).toBe('#/record/rubricVersion');
  });

  test('a photograph of another survey, or of nothing, is refused', async () => {
    const { id: foreign } = await uploadPhoto(site, examination.surveyor, {
      purpose: 'survey-photo',
      recordId: examination.orderId,
      view: 'shell.barrel',
      alt: 'Barrel',
      content: await tinyPicture(33),
    });
    for (const photoId of [foreign, randomUUID()]) {
      const response = await save([sound('shell.barrel', { photoIds: [photoId] })]).expect(422);
      expect(problemOf(response).errors?.[0]).toEqual({
        pointer: '#/record/findings/0/photoIds/0',
        detail: 'That photograph is not of this survey.',
      });
    }
  });

  test('nobody else may save it', async () => {
    const answers = await Promise.all(
      [open.buyer, open.seller, office, examination.surveyor].map((person) =>
        saveRecord(site, person, open.orderId, survey.version, survey.record),
      ),
    );
    expect(answers.map(({ status }) => status)).toEqual([404, 404, 404, 404]);
  });
});

describe('filing', () => {
  test('what is missing is listed by item, and nothing is filed', async () => {
    const open = await givenExamination(site);
    const survey = await readSurvey(site, open);
    const response = await file(site, open.surveyor, survey).expect(409);
    expect(slugOf(response)).toBe('not-complete');
    const pointers = problemOf(response).errors?.map(({ pointer }) => pointer);
    expect(pointers).toContain('#/record/examinedOn');
    expect(pointers).toContain('#/record/findings/safety.glass');
    expect(pointers).toContain('#/record/hydraulic');
    expect((await readSurvey(site, open)).isFiled).toBe(false);
  });

  test('a result other than the one computed here is refused', async () => {
    const open = await givenExamination(site);
    const survey = await givenRecorded(site, open);
    const result = scoreSurvey(survey);
    const doctored = { ...result, condition: 99 };
    const response = await site
      .as(open.surveyor)
      .post(`/api/survey-orders/${open.orderId}/survey/file`)
      .send({ version: survey.version, signOff: signature, result: doctored })
      .expect(409);
    expect(slugOf(response)).toBe('result-differs');
    expect((await readSurvey(site, open)).isFiled).toBe(false);
  });

  test('an unsigned report is refused with a sentence for each declaration', async () => {
    const open = await givenExamination(site);
    const survey = await givenRecorded(site, open);
    const response = await site
      .as(open.surveyor)
      .post(`/api/survey-orders/${open.orderId}/survey/file`)
      .send({
        version: survey.version,
        signOff: { ...signature, name: '', independent: false },
        result: scoreSurvey(survey),
      })
      .expect(422);
    expect(problemOf(response).errors?.map(({ pointer }) => pointer)).toEqual([
      '#/signOff/name',
      '#/signOff/independent',
    ]);
  });

  test('once filed it cannot be saved, filed again or photographed', async () => {
    const open = await givenExamination(site);
    const survey = await givenRecorded(site, open);
    const twice = await Promise.all([file(site, open.surveyor, survey), file(site, open.surveyor, survey)]);
    expect(twice.filter(({ status }) => status === 200)).toHaveLength(1);

    expect(slugOf(await saveRecord(site, open.surveyor, open.orderId, survey.version, survey.record))).toBe(
      'wrong-state',
    );
    const { reportId } = await readSurvey(site, open);
    expect(reportId).not.toBeNull();
    await site.as(open.surveyor).delete(`/api/photos/${survey.photos[0]!.id}`).expect(409);
    // The parties may now read what was filed.
    await site.as(open.buyer).get(`/api/survey-orders/${open.orderId}/survey`).expect(200);
  });
});
