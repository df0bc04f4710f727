import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Report, Survey } from '#shared/surveys/contract.ts';
import type { ReportReplies } from '#shared/surveys/replies-contract.ts';
import { addDays, dayOf } from '#shared/time.ts';
import { file, givenExamination, givenRecorded, saveRecord } from '#tests/support/examinations.ts';
import type { Examination } from '#tests/support/examinations.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site, TestPerson } from '#tests/support/site.ts';

let site: Site;
let examination: Examination;
let report: Report;
beforeAll(async () => {
  site = await givenSite();
});
afterAll(() => site.close());

async function givenReport(): Promise<void> {
  examination = await givenExamination(site);
  const survey = await givenRecorded(site, examination);
  report = (await file(site, examination.surveyor, survey).expect(200)).body as Report;
}

const read = async (id: string, person?: TestPerson) =>
  (await site.as(person).get(`/api/reports/${id}/replies`).expect(200)).body as ReportReplies;
const answer = (
  person: TestPerson | undefined,
  text = 'The cock was dirty. I have cleaned it.',
  criterionId = 'safety.glass',
  id = report.id,
) => site.as(person).post(`/api/reports/${id}/replies`).send({ criterionId, text });
const listRepair = (person: TestPerson, doneOn: string, text = 'Gauge glass renewed.') =>
  site.as(person).post(`/api/reports/${report.id}/repairs`).send({ text, doneOn });

describe('the seller’s answer to a finding', () => {
  beforeAll(givenReport);

  test('stands beside it for everyone, with its date; the grade stays', async () => {
    await answer(examination.seller).expect(200);
    const { replies, viewer } = await read(report.id);
    expect(replies).toMatchObject([
      { criterionId: 'safety.glass', text: 'The cock was dirty. I have cleaned it.', version: 1 },
    ]);
    expect(viewer.canReply).toBe(false);
    const after = (await site.as().get(`/api/reports/${report.id}`)).body as Report;
    expect(after.record).toEqual(report.record);
    expect(after.result).toEqual(report.result);
  });

  test('is given once', async () => {
    await answer(examination.seller, 'Another thought.').expect(409);
    expect((await read(report.id)).replies).toHaveLength(1);
  });

  test('sent twice at once is kept once', async () => {
    const other = report.record.findings.find(({ criterionId }) => criterionId !== 'safety.glass')!;
    const sent = await Promise.all(
      ['One.', 'Two.'].map((text) => answer(examination.seller, text, other.criterionId)),
    );
    expect(sent.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([200, 409]);
  });

  test('is refused where it is empty, too long or about nothing found', async () => {
    const { seller } = examination;
    expect((await answer(seller, ' ')).status).toBe(422);
    expect((await answer(seller, 'x'.repeat(601))).status).toBe(422);
    expect((await answer(seller, 'Quite so.', 'no.such-item')).status).toBe(422);
  });

  test('is the seller’s alone', async () => {
    expect((await answer(undefined)).status).toBe(401);
    for (const person of [examination.buyer, examination.surveyor])
      expect((await answer(person)).status).toBe(403);
  });

  test('is never changed, even in the database', async () => {
    const { query } = site.deps.database.raw;
    await expect(query(`update report_replies set text = 'Otherwise'`)).rejects.toThrow('append-only');
    await expect(query(`delete from report_replies`)).rejects.toThrow('append-only');
  });
});

describe('an answer, once the report is corrected,', () => {
  test('follows a finding that has not changed, and leaves one that has open to a new answer', async () => {
    await givenReport();
    const { seller, surveyor, orderId } = examination;
    const same = report.record.findings.find(
      ({ criterionId }) => criterionId !== 'safety.glass',
    )!.criterionId;
    await answer(seller, 'As it left the works.', same).expect(200);
    await answer(seller).expect(200);
    const opened = await site
      .as(surveyor)
      .post(`/api/reports/${report.id}/corrections`)
      .send({ reason: 'The note on the water gauge was wrong.' })
      .expect(200);
    const { version, record } = opened.body as Survey;
    const findings = record.findings.map((finding) =>
      finding.criterionId === 'safety.glass' ? { ...finding, note: 'Slow at first, then free.' } : finding,
    );
    const saved = await saveRecord(site, surveyor, orderId, version, { ...record, findings }).expect(200);
    const second = (await file(site, surveyor, saved.body as Survey).expect(200)).body as Report;

    expect((await read(second.id)).replies).toMatchObject([{ criterionId: same, version: 1 }]);
    expect((await read(report.id)).replies).toHaveLength(2);
    expect((await read(report.id, seller)).viewer.canReply).toBe(false);
    await answer(seller, 'To the old one.', 'safety.glass', report.id).expect(409);
    await answer(seller, 'Again.', same, second.id).expect(409);
    await answer(seller, 'Agreed.', 'safety.glass', second.id).expect(200);
    expect((await read(second.id, seller)).replies).toHaveLength(2);
  });
});

describe('repairs since', () => {
  beforeAll(givenReport);

  test('are listed by the seller, with the day they were done', async () => {
    const today = dayOf(site.clock.now());
    await listRepair(examination.seller, today).expect(200);
    await listRepair(examination.seller, report.record.examinedOn!, 'Lagging put back.').expect(200);
    expect((await read(report.id)).repairs).toMatchObject([
      { text: 'Lagging put back.', doneOn: report.record.examinedOn },
      { text: 'Gauge glass renewed.', doneOn: today },
    ]);
  });

  test('lie between the examination and today', async () => {
    const tooLate = dayOf(addDays(site.clock.now(), 3));
    for (const doneOn of ['2026-05-15', tooLate])
      expect((await listRepair(examination.seller, doneOn)).status).toBe(422);
  });

  test('are not for the others to list', async () => {
    const { status } = await listRepair(examination.buyer, dayOf(site.clock.now()));
    expect(status).toBe(403);
  });
});
