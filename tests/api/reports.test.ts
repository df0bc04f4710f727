import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Listing } from '#shared/listings/contract.ts';
import type { SurveyOrder } from '#shared/survey-orders/contract.ts';
import type { Report } from '#shared/surveys/contract.ts';
import { canonicalJson } from '#shared/surveys/canonical.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { dayOf, daysBetween } from '#shared/time.ts';
import { file, givenExamination, givenRecorded } from '#tests/support/examinations.ts';
import type { Examination } from '#tests/support/examinations.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

let site: Site;
let examination: Examination;
let report: Report;
beforeAll(async () => {
  site = await givenSite();
  examination = await givenExamination(site);
  const survey = await givenRecorded(site, examination);
  report = (await file(site, examination.surveyor, survey).expect(200)).body as Report;
});
afterAll(() => site.close());

const check = async (code: string) =>
  (await site.as().get(`/api/checks/${code}`).expect(200)).body as unknown;

describe('a filed report', () => {
  test('is open to a visitor, who does not learn the parties’ names', async () => {
    const response = await site.as().get(`/api/reports/${report.id}`).expect(200);
    const read = response.body as Report;
    expect(read).toMatchObject({
      listing: { id: examination.listing.id, title: examination.listing.draft.title },
      surveyor: { name: examination.surveyor.name },
      result: { verdict: { id: 'repair-before-steaming' } },
      signOff: { name: 'Isobel Tarn' },
      viewer: { orderId: null, canAccept: false },
    });
    expect(read.photos).toHaveLength(1);
    expect(read.sellerPhotos).toHaveLength(3);
    expect(response.text).not.toContain(examination.buyer.name);
    expect(response.text).not.toContain(examination.seller.name);
  });

  test('can be scored again to the same bytes', () => {
    expect(canonicalJson(scoreSurvey(report))).toBe(canonicalJson(report.result));
  });

  test('tells each person their own part in it', async () => {
    const viewer = async (person: Examination['buyer']) =>
      ((await site.as(person).get(`/api/reports/${report.id}`).expect(200)).body as Report).viewer;
    const { buyer, seller, surveyor, orderId } = examination;
    expect(await viewer(buyer)).toEqual({ orderId, canAccept: true });
    expect(await viewer(seller)).toEqual({ orderId, canAccept: false });
    expect(await viewer(surveyor)).toEqual({ orderId, canAccept: false });
    expect(await viewer(await site.givenPerson('Nobody Special'))).toEqual({
      orderId: null,
      canAccept: false,
    });
  });

  test('puts its verdict on the listing, and moves the order into review', async () => {
    const { slug } = examination.listing;
    const listing = (await site.as().get(`/api/listings/${slug}`).expect(200)).body as Listing;
    expect(listing.reports).toEqual([
      {
        reportId: report.id,
        filedAt: report.filedAt,
        examinedOn: '2026-05-16',
        scope: 'full',
        verdict: 'repair-before-steaming',
        condition: report.result.condition,
        evidence: report.result.evidence,
        version: 1,
      },
    ]);
    const order = (
      await site.as(examination.buyer).get(`/api/survey-orders/${examination.orderId}`).expect(200)
    ).body as SurveyOrder;
    expect(order).toMatchObject({ status: 'in-review', reportId: report.id });
  });

  test('that does not exist is not found', async () => {
    for (const id of [randomUUID(), 'not-an-id']) {
      const { status } = await site.as().get(`/api/reports/${id}`);
      expect(status).toBe(404);
    }
  });
});

describe('the check code', () => {
  test('of a report that stands as filed is genuine, however it is typed', async () => {
    expect(report.checkCode).toMatch(/^[0-9A-HJKMNP-TV-Z]{4}-[0-9A-HJKMNP-TV-Z]{4}$/);
    const genuine = {
      status: 'genuine',
      reportId: report.id,
      version: 1,
      filedAt: report.filedAt,
      examinedOn: '2026-05-16',
      ageDays: daysBetween('2026-05-16', dayOf(site.clock.now())),
      isOld: false,
      newer: null,
    };
    expect(await check(report.checkCode)).toEqual(genuine);
    expect(await check(report.checkCode.toLowerCase().replace('-', ' '))).toEqual(genuine);
    expect(await check(report.checkCode.replace('-', '').replaceAll('0', 'o').replaceAll('1', 'l'))).toEqual(
      genuine,
    );
  });

  test('of nothing is unknown', async () => {
    const unknown = {
      status: 'unknown',
      reportId: null,
      version: null,
      filedAt: null,
      examinedOn: null,
      ageDays: null,
      isOld: false,
      newer: null,
    };
    expect(await check('0000-0000')).toEqual(unknown);
    expect(await check('not a code')).toEqual(unknown);
  });

  test('the database itself refuses to change a report', async () => {
    const change = site.deps.database.raw.query(`update reports set scope = 'external' where id = $1`, [
      report.id,
    ]);
    await expect(change).rejects.toThrow('reports is append-only');
  });

  test.each([
    ['the grade of a finding', `record = jsonb_set(record, '{findings,0,grade}', '"serviceable"')`],
    ['the result', `result = jsonb_set(result, '{condition}', '99')`],
    ['what the seller stated', `facts = jsonb_set(facts, '{workingPressurePa}', '700000')`],
    ['the signature', `sign_off = jsonb_set(sign_off, '{name}', '"Somebody Else"')`],
    ['the scope', `scope = 'external'`],
    ['the version', `version = 2`],
  ])('shows that %s was changed behind the product’s back', async (_what, assignment) => {
    const { query } = site.deps.database.raw;
    const other = await givenExamination(site);
    const filed = (await file(site, other.surveyor, await givenRecorded(site, other)).expect(200))
      .body as Report;
    await query('alter table reports disable trigger reports_append_only');
    await query(`update reports set ${assignment} where id = $1`, [filed.id]);
    await query('alter table reports enable trigger reports_append_only');
    expect(await check(filed.checkCode)).toMatchObject({ status: 'changed', reportId: filed.id });
  });

  test('shows that a photograph was swapped', async () => {
    const other = await givenExamination(site);
    const filed = (await file(site, other.surveyor, await givenRecorded(site, other)).expect(200))
      .body as Report;
    await site.deps.database.raw.query('update photos set sha256 = $1 where id = $2', [
      'f'.repeat(64),
      filed.photos[0]!.id,
    ]);
    expect(await check(filed.checkCode)).toMatchObject({ status: 'changed' });
  });
});
