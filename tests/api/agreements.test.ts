import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Report, ReportAgreement } from '#shared/surveys/contract.ts';
import { agreementOf } from '#shared/surveys/agreement.ts';
import { file, givenExamination, givenRecorded } from '#tests/support/examinations.ts';
import type { Examination } from '#tests/support/examinations.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

let site: Site;
let first: Examination;
let one: Report;
let other: Report;

const agreementsOf = async (id: string): Promise<ReportAgreement[]> => {
  const { body } = await site.as().get(`/api/reports/${id}/agreements`).expect(200);
  return (body as { items: ReportAgreement[] }).items;
};

beforeAll(async () => {
  site = await givenSite();
  first = await givenExamination(site);
  one = (await file(site, first.surveyor, await givenRecorded(site, first)).expect(200)).body as Report;
});
afterAll(() => site.close());

describe('a boiler surveyed once', () => {
  test('has nothing to be set against', async () => {
    expect(await agreementsOf(one.id)).toEqual([]);
  });

  test('a report that does not exist is not found', async () => {
    const { status } = await site.as().get(`/api/reports/${randomUUID()}/agreements`);
    expect(status).toBe(404);
  });
});

describe('a boiler surveyed twice', () => {
  beforeAll(async () => {
    site.clock.pass(3_600_000);
    const second = await givenExamination(site, 'full', first);
    const recorded = await givenRecorded(site, second, {
      'casing.finish': { grade: 'serviceable' },
      'safety.glass': { grade: 'sound', defects: [] },
    });
    other = (await file(site, second.surveyor, recorded).expect(200)).body as Report;
  });

  test('shows a visitor what the two differ on, the report that is read standing first', async () => {
    const [agreement, ...more] = await agreementsOf(one.id);
    expect(more).toEqual([]);
    expect(agreement).toEqual({
      id: other.id,
      filedAt: other.filedAt,
      surveyor: { name: 'Percy Lomas' },
      verdict: other.result.verdict.id,
      agreement: agreementOf(one, other),
    });
    expect(
      agreement?.agreement.differences.map((each) => [each.criterionId, each.first, each.second, each.steps]),
    ).toEqual([
      ['safety.glass', 'attention', 'sound', 2],
      ['casing.finish', 'sound', 'serviceable', 1],
    ]);
  });

  test('reads the other way round from the other report, with the same kappa', async () => {
    const [forth] = await agreementsOf(one.id);
    const [back] = await agreementsOf(other.id);
    expect(back?.id).toBe(one.id);
    expect(back?.agreement.kappa).toBe(forth?.agreement.kappa);
    expect(back?.agreement.differences[0]).toMatchObject({ first: 'sound', second: 'attention' });
  });

  test('is not set against a report on another boiler', async () => {
    const elsewhere = await givenExamination(site);
    const filed = (await file(site, elsewhere.surveyor, await givenRecorded(site, elsewhere)).expect(200))
      .body as Report;
    expect(await agreementsOf(filed.id)).toEqual([]);
    expect(await agreementsOf(one.id)).toHaveLength(1);
  });
});
