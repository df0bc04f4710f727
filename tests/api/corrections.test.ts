import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Listing } from '#shared/listings/contract.ts';
import type { SurveyOrder } from '#shared/survey-orders/contract.ts';
import type { CheckedReport, Report, Survey } from '#shared/surveys/contract.ts';
import type { ReportVersions } from '#shared/surveys/corrections-contract.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { daysMs } from '#shared/time.ts';
import {
  file,
  givenExamination,
  givenRecorded,
  readSurvey,
  saveRecord,
} from '#tests/support/examinations.ts';
import type { Examination } from '#tests/support/examinations.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site, TestPerson } from '#tests/support/site.ts';

let site: Site;
beforeAll(async () => {
  site = await givenSite();
});
afterAll(() => site.close());

const reason = 'The water gauge was examined again: it is unfit, not sluggish.';

interface Filed extends Examination {
  report: Report;
}

async function givenFiled(earlier?: Filed): Promise<Filed> {
  const examination = await givenExamination(site, 'full', earlier);
  const survey = await givenRecorded(site, examination);
  const report = (await file(site, examination.surveyor, survey).expect(200)).body as Report;
  return { ...examination, report };
}

const start = (person: TestPerson, reportId: string, why = reason) =>
  site.as(person).post(`/api/reports/${reportId}/corrections`).send({ reason: why });

/** Opens a correction and records that the water gauge is unfit. */
async function givenCorrected({ surveyor, orderId, report }: Filed): Promise<Survey> {
  const { version, record } = (await start(surveyor, report.id).expect(200)).body as Survey;
  const findings = record.findings.map((finding) =>
    finding.criterionId === 'safety.glass' ? { ...finding, grade: 'unfit' as const } : finding,
  );
  return (await saveRecord(site, surveyor, orderId, version, { ...record, findings }).expect(200))
    .body as Survey;
}

const correct = async (filed: Filed): Promise<Report> =>
  (await file(site, filed.surveyor, await givenCorrected(filed)).expect(200)).body as Report;

const versionsOf = async (id: string, person?: TestPerson) =>
  (await site.as(person).get(`/api/reports/${id}/versions`).expect(200)).body as ReportVersions;
const check = async (code: string) =>
  (await site.as().get(`/api/checks/${code}`).expect(200)).body as CheckedReport;
const listingOf = async ({ listing }: Filed) =>
  (await site.as().get(`/api/listings/${listing.slug}`).expect(200)).body as Listing;

describe('a correction', () => {
  test('is a new signed version, scored by the same method; both can be read', async () => {
    const filed = await givenFiled();
    const second = await correct(filed);
    expect(second.id).not.toBe(filed.report.id);
    expect(second.checkCode).not.toBe(filed.report.checkCode);
    expect(second.record.rubricVersion).toBe(filed.report.record.rubricVersion);
    expect(second.result).toEqual(scoreSurvey(second));
    expect(second.result).not.toEqual(filed.report.result);
    const first = (await site.as().get(`/api/reports/${filed.report.id}`).expect(200)).body as Report;
    expect(first.record).toEqual(filed.report.record);
    expect((await versionsOf(first.id)).items).toEqual([
      { reportId: first.id, version: 1, filedAt: first.filedAt, reason: null },
      { reportId: second.id, version: 2, filedAt: second.filedAt, reason },
    ]);
  });

  test('opens on a copy of what was filed', async () => {
    const filed = await givenFiled();
    const survey = (await start(filed.surveyor, filed.report.id).expect(200)).body as Survey;
    expect(survey).toMatchObject({
      record: filed.report.record,
      isFiled: false,
      reportId: filed.report.id,
      correction: { reportId: filed.report.id, version: 1, reason },
    });
  });

  test('makes the earlier check code answer superseded, and the newer genuine', async () => {
    const filed = await givenFiled();
    const second = await correct(filed);
    expect(await check(filed.report.checkCode)).toMatchObject({
      status: 'superseded',
      reportId: filed.report.id,
      version: 1,
      newer: { reportId: second.id, version: 2, filedAt: second.filedAt, reason },
    });
    expect(await check(second.checkCode)).toMatchObject({ status: 'genuine', version: 2, newer: null });
  });

  test.each([
    ['its reason', `correction_reason = 'Nothing of note'`],
    ['its version', `version = 7`],
    ['which it corrects', `corrects_report_id = null`],
  ])('shows that %s was changed behind the product’s back', async (_what, assignment) => {
    const second = await correct(await givenFiled());
    const { query } = site.deps.database.raw;
    await query('alter table reports disable trigger reports_append_only');
    await query(`update reports set ${assignment} where id = $1`, [second.id]);
    await query('alter table reports enable trigger reports_append_only');
    expect((await check(second.checkCode)).status).toBe('changed');
  });

  test('takes the place of the earlier version in the listing and in the order', async () => {
    const filed = await givenFiled();
    const second = await correct(filed);
    const { reports } = await listingOf(filed);
    expect(reports).toMatchObject([{ reportId: second.id, version: 2, verdict: second.result.verdict.id }]);
    const order = (await site.as(filed.buyer).get(`/api/survey-orders/${filed.orderId}`).expect(200))
      .body as SurveyOrder;
    expect(order).toMatchObject({ status: 'in-review', reportId: second.id });
    expect(order.record.at(-1)).toMatchObject({ event: 'correctReport', by: filed.surveyor.name, reason });
  });

  test('of an old report leaves a later survey in front', async () => {
    const filed = await givenFiled();
    const later = await givenFiled(filed);
    const second = await correct(filed);
    const { reports } = await listingOf(filed);
    expect(reports.map(({ reportId }) => reportId)).toEqual([later.report.id, second.id]);
    expect((await check(later.report.checkCode)).status).toBe('genuine');
  });

  test('is told to the buyer and the seller, with the reason and the new report', async () => {
    const filed = await givenFiled();
    const second = await correct(filed);
    await site.drain();
    const letters = (await site.post.list()).filter(({ subject }) => subject.includes('has been corrected'));
    for (const { email } of [filed.buyer, filed.seller]) {
      const letter = letters.find(({ to }) => to === email);
      expect(letter?.text).toContain(reason);
      expect(letter?.attachments.map(({ filename }) => filename)).toEqual([
        `survey-report-${second.checkCode}.pdf`,
      ]);
    }
  });

  test('can itself be corrected, but only the newest version', async () => {
    const filed = await givenFiled();
    const second = await correct(filed);
    const stale = await start(filed.surveyor, filed.report.id).expect(409);
    expect((stale.body as { type: string }).type).toContain('changed-meanwhile');
    await start(filed.surveyor, second.id).expect(200);
    const third = (await file(site, filed.surveyor, await readSurvey(site, filed)).expect(200))
      .body as Report;
    expect(await check(filed.report.checkCode)).toMatchObject({ newer: { reportId: third.id, version: 3 } });
    expect((await versionsOf(third.id, filed.surveyor)).viewer.canCorrect).toBe(true);
    expect((await versionsOf(second.id, filed.surveyor)).viewer.canCorrect).toBe(false);
  });

  test('of two begun at once, one wins', async () => {
    const filed = await givenFiled();
    const answers = await Promise.all([1, 2].map(() => start(filed.surveyor, filed.report.id)));
    expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([200, 409]);
    const refused = answers.find(({ status }) => status === 409)!;
    expect((refused.body as { type: string }).type).toContain('changed-meanwhile');
  });

  test('wants a reason', async () => {
    const filed = await givenFiled();
    for (const why of ['Wrong', 'x'.repeat(601)])
      expect((await start(filed.surveyor, filed.report.id, why)).status).toBe(422);
  });

  test('may still be made once the order is settled, not once its money went back', async () => {
    const filed = await givenFiled();
    const setStatus = (status: string) =>
      site.deps.database.raw.query('update survey_orders set status = $1 where id = $2', [
        status,
        filed.orderId,
      ]);
    await setStatus('refunded');
    await start(filed.surveyor, filed.report.id).expect(409);
    await setStatus('settled');
    const survey = await givenCorrected(filed);
    await file(site, filed.surveyor, survey).expect(200);
    const order = (await site.as(filed.buyer).get(`/api/survey-orders/${filed.orderId}`)).body as SurveyOrder;
    expect(order.status).toBe('settled');
  });

  test('can be given up: the report stands as it was', async () => {
    const filed = await givenFiled();
    await givenCorrected(filed);
    const address = `/api/survey-orders/${filed.orderId}/survey/correction`;
    await site.as(filed.surveyor).delete(address).expect(200);
    expect(await readSurvey(site, filed)).toMatchObject({
      isFiled: true,
      correction: null,
      record: filed.report.record,
    });
    expect((await check(filed.report.checkCode)).status).toBe('genuine');
    await site.as(filed.surveyor).delete(address).expect(409);
  });

  test('cannot take away or reword a photograph that a filed version rests on', async () => {
    const filed = await givenFiled();
    await start(filed.surveyor, filed.report.id).expect(200);
    const address = `/api/photos/${filed.report.photos[0]!.id}`;
    await site.as(filed.surveyor).delete(address).expect(409);
    await site.as(filed.surveyor).patch(address).send({ alt: 'Something else' }).expect(409);
    expect((await check(filed.report.checkCode)).status).toBe('genuine');
  });

  test('is its surveyor’s alone until it is filed', async () => {
    const filed = await givenFiled();
    await start(filed.surveyor, filed.report.id).expect(200);
    await site.as(filed.buyer).get(`/api/survey-orders/${filed.orderId}/survey`).expect(404);
    expect((await versionsOf(filed.report.id, filed.surveyor)).viewer).toEqual({
      canCorrect: false,
      correctingOrderId: filed.orderId,
    });
    expect((await versionsOf(filed.report.id, filed.seller)).viewer).toEqual({
      canCorrect: false,
      correctingOrderId: null,
    });
  });

  test('cannot be put in behind the product’s back as a version of another report', async () => {
    const [filed, other] = [await givenFiled(), await givenFiled()];
    const columns =
      'listing_id, surveyor_id, scope, extras, facts, record, result, sign_off, rubric_version, filed_at, digest';
    const forge = site.deps.database.raw.query(
      `insert into reports (order_id, ${columns}, check_code, version, corrects_report_id, correction_reason)
       select order_id, ${columns}, 'FORG-ED00', 2, $2, 'Forged' from reports where id = $1`,
      [filed.report.id, other.report.id],
    );
    await expect(forge).rejects.toThrow('no next version');
  });
});

test('a check says how old a report is, and that it is old after fourteen months', async () => {
  const own = await givenSite();
  try {
    const examination = await givenExamination(own);
    const survey = await givenRecorded(own, examination);
    const report = (await file(own, examination.surveyor, survey).expect(200)).body as Report;
    const ask = async () => (await own.as().get(`/api/checks/${report.checkCode}`)).body as CheckedReport;
    const before = await ask();
    own.clock.pass(440 * daysMs);
    const after = await ask();
    expect(after.isOld).toBe(true);
    expect(after.ageDays).toBe((before.ageDays ?? 0) + 440);
    expect(after.status).toBe('genuine');
  } finally {
    await own.close();
  }
});
